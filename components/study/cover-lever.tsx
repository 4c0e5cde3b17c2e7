'use client';

import { useId } from 'react';
import { Slider, placeOf } from '@/components/ui/slider';
import type { CollectorRecord } from '@/lib/schemas/collector';
import { LeverFrame } from './lever-row';
import { LeverTrace } from './lever-trace';
import { COVER_LABELS } from './levers';
import type { TracePoint } from './use-traces';

interface CoverLeverProps {
  choices: readonly CollectorRecord[];
  value: CollectorRecord;
  saved: CollectorRecord;
  trace?:
    | { points: readonly TracePoint[] | undefined; range: readonly [number, number]; nowKwh: number }
    | undefined;
  onChange(collector: CollectorRecord): void;
}

/** Which collector: a lever with a stop for each cover. */
export function CoverLever({ choices, value, saved, trace, onChange }: CoverLeverProps) {
  const id = useId();
  const last = choices.length - 1;
  const at = Math.max(
    0,
    choices.findIndex((choice) => choice.cover === value.cover),
  );
  const savedAt = choices.findIndex((choice) => choice.cover === saved.cover);
  const label = COVER_LABELS[value.cover].long;
  const choose = (index: number) => onChange(choices[index]!);
  return (
    <LeverFrame
      name="Collector cover"
      change={at === savedAt ? undefined : `saved: ${COVER_LABELS[saved.cover].long}`}
      field={
        <>
          <label htmlFor={id} className="sr-only">
            Collector cover, chosen
          </label>
          <select
            id={id}
            className="field w-full appearance-none"
            value={at}
            onChange={(event) => choose(Number(event.target.value))}
          >
            {choices.map((choice, index) => (
              <option key={choice.cover} value={index}>
                {COVER_LABELS[choice.cover].long}
              </option>
            ))}
          </select>
        </>
      }
    >
      <Slider
        label="Collector cover"
        value={at}
        min={0}
        max={last}
        step={1}
        ticks={choices.map((choice, index) => ({ value: index, label: COVER_LABELS[choice.cover].short }))}
        spoken={label}
        saved={savedAt}
        trace={
          trace && (
            <LeverTrace
              separate
              points={(trace.points ?? [])
                .filter((point) => point.value !== at)
                .map((point) => ({ ...point, place: placeOf(point.value, 0, last, false) }))}
              range={trace.range}
              now={{ place: placeOf(at, 0, last, false), kwh: trace.nowKwh }}
            />
          )
        }
        onChange={choose}
      />
    </LeverFrame>
  );
}
