'use client';

import type { ReactNode } from 'react';
import { NumberField } from '@/components/ui/number-field';
import { Slider, placeOf } from '@/components/ui/slider';
import { quantityHint } from '@/lib/schemas/quantity';
import { formatTyped, withUnit } from '@/lib/units/display';
import { LeverTrace } from './lever-trace';
import type { Lever } from './levers';
import { flatStretch } from './use-traces';
import type { TracePoint } from './use-traces';

interface LeverRowProps {
  lever: Lever;
  value: number;
  saved: number;
  trace?:
    | { points: readonly TracePoint[] | undefined; range: readonly [number, number]; nowKwh: number }
    | undefined;
  onChange(value: number): void;
}

/** One lever: its name, a typed field, and the rule with the stone. */
export function LeverRow({ lever, value, saved, trace, onChange }: LeverRowProps) {
  const { meta, from, to, logarithmic } = lever;
  const place = (at: number) => placeOf(at, from, to, logarithmic);
  const spoken = withUnit(formatTyped(value), meta.unit);
  return (
    <LeverFrame
      name={meta.label}
      change={value === saved ? undefined : `saved: ${withUnit(formatTyped(saved), meta.unit)}`}
      field={
        <NumberField
          label={`${meta.label}, typed`}
          labelHidden
          value={value}
          unit={meta.unit}
          min={meta.min}
          max={meta.max}
          hint={quantityHint(meta)}
          help={meta.help}
          onChange={onChange}
        />
      }
    >
      <Slider
        label={meta.label}
        value={value}
        min={from}
        max={to}
        step={meta.step}
        logarithmic={logarithmic}
        ticks={lever.ticks.map((tick) => ({ value: tick, label: formatTyped(tick) }))}
        spoken={spoken}
        saved={saved}
        flat={lever.hasOptimum ? flatStretch(trace?.points) : undefined}
        trace={
          trace && (
            <LeverTrace
              points={(trace.points ?? []).map((point) => ({ ...point, place: place(point.value) }))}
              range={trace.range}
              now={{ place: place(value), kwh: trace.nowKwh }}
            />
          )
        }
        onChange={onChange}
      />
    </LeverFrame>
  );
}

/** Name and field on the left, the rule on the right; stacked on a phone. */
export function LeverFrame(props: {
  name: string;
  change?: string | undefined;
  field: ReactNode;
  children: ReactNode;
}) {
  return (
    <div className="grid grid-cols-[1fr_8.5rem] items-center gap-x-4 py-2 rule-hair sm:grid-cols-[9.5rem_1fr] sm:items-start">
      <span className="leading-6 sm:col-start-1">{props.name}</span>
      <div className="sm:col-start-1">
        {props.field}
        <span className="block text-note text-muted max-sm:hidden">{props.change}</span>
      </div>
      <div className="col-span-2 sm:col-span-1 sm:col-start-2 sm:row-span-2 sm:row-start-1">
        {props.children}
      </div>
    </div>
  );
}
