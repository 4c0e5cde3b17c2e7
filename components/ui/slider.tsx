'use client';

import type { KeyboardEvent, ReactNode } from 'react';
import styles from './slider.module.css';

export interface SliderTick {
  value: number;
  label: string;
}

interface SliderProps {
  label: string;
  value: number;
  min: number;
  max: number;
  step: number;
  /** equal ratios instead of equal differences along the rule */
  logarithmic?: boolean;
  ticks: readonly SliderTick[];
  /** what a screen reader says instead of the bare number */
  spoken: string;
  /** the value that is stored: a hollow mark on the rule */
  saved?: number | undefined;
  /** a stretch of the rule where the answer hardly changes */
  flat?: readonly [number, number] | undefined;
  /** drawn above the rule, over its whole length */
  trace?: ReactNode;
  disabled?: boolean;
  onChange(value: number): void;
}

const POSITIONS = 1000;

/** A value to its place on the rule, 0 to 1. */
export function placeOf(value: number, min: number, max: number, logarithmic: boolean): number {
  const place = logarithmic ? Math.log(value / min) / Math.log(max / min) : (value - min) / (max - min);
  return Math.min(1, Math.max(0, place));
}

/** A place on the rule to a value that somebody would also have typed: on a step, or with two figures. */
export function valueAt(place: number, min: number, max: number, step: number, logarithmic: boolean): number {
  const raw = logarithmic ? min * (max / min) ** place : min + (max - min) * place;
  const round = logarithmic
    ? Number(raw.toPrecision(2))
    : Number((min + Math.round((raw - min) / step) * step).toFixed(6));
  return Math.min(max, Math.max(min, round));
}

/** The next value for an arrow key. */
export function nextValue(
  value: number,
  steps: number,
  props: Pick<SliderProps, 'min' | 'max' | 'step' | 'logarithmic'>,
): number {
  const { min, max, step, logarithmic } = props;
  if (!logarithmic) return Math.min(max, Math.max(min, Number((value + steps * step).toFixed(6))));
  const figure = 10 ** (Math.floor(Math.log10(value * (steps < 0 ? 0.9999 : 1))) - 1);
  return Math.min(max, Math.max(min, Math.round(value / figure + steps) * figure));
}

const KEY_STEPS: Record<string, number> = {
  ArrowLeft: -1,
  ArrowDown: -1,
  ArrowRight: 1,
  ArrowUp: 1,
  PageDown: -5,
  PageUp: 5,
};

/** A ruled line with ticks and a dark upright stone: the platform's own range input underneath. */
export function Slider(props: SliderProps) {
  const {
    label,
    value,
    min,
    max,
    step,
    logarithmic = false,
    ticks,
    spoken,
    saved,
    flat,
    trace,
    disabled,
  } = props;
  const place = (at: number) => placeOf(at, min, max, logarithmic);

  function onKeyDown(event: KeyboardEvent) {
    const steps = KEY_STEPS[event.key];
    if (steps === undefined) return;
    event.preventDefault();
    const next = nextValue(value, steps, { min, max, step, logarithmic });
    if (next !== value) props.onChange(next);
  }

  return (
    <div className={`${styles.slider} relative`}>
      {trace}
      <div className="relative h-(--range-height)">
        <div className={styles.rule} aria-hidden="true">
          <span className="absolute inset-x-0 top-1/2 h-px bg-ink" />
          {flat && (
            <span
              className="absolute top-1/2 h-1 -translate-y-1/2 bg-savings"
              style={{ left: `${place(flat[0]) * 100}%`, right: `${(1 - place(flat[1])) * 100}%` }}
            />
          )}
          {ticks.map((tick) => (
            <span
              key={tick.value}
              className="absolute top-1/2 h-1.5 w-px bg-ink"
              style={{ left: `${place(tick.value) * 100}%` }}
            />
          ))}
          {saved !== undefined && saved !== value && (
            <span
              className="absolute top-1/2 size-2 -translate-1/2 border border-ink bg-paper"
              style={{ left: `${place(saved) * 100}%` }}
            />
          )}
        </div>
        <input
          type="range"
          aria-label={label}
          aria-valuetext={spoken}
          min={0}
          max={POSITIONS}
          step="any"
          value={place(value) * POSITIONS}
          disabled={disabled}
          onKeyDown={onKeyDown}
          onChange={(event) => {
            const next = valueAt(Number(event.target.value) / POSITIONS, min, max, step, logarithmic);
            if (next !== value) props.onChange(next);
          }}
          className={`${styles.range} absolute inset-0 w-full`}
        />
      </div>
      <div className="relative h-[1.125rem] text-note text-muted" aria-hidden="true">
        <div className={styles.rule}>
          {ticks.map((tick) => (
            <span
              key={tick.value}
              className="absolute whitespace-nowrap"
              style={{
                left: `${place(tick.value) * 100}%`,
                transform: `translateX(${tickShift(place(tick.value))})`,
              }}
            >
              {tick.label}
            </span>
          ))}
        </div>
      </div>
    </div>
  );
}

/** Labels at the ends stay within the rule. */
function tickShift(place: number): string {
  if (place < 0.02) return '-4px';
  return place > 0.98 ? 'calc(-100% + 4px)' : '-50%';
}
