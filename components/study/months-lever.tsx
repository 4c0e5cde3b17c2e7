'use client';

import { useId, useRef } from 'react';
import type { KeyboardEvent } from 'react';
import { MONTHS } from '@/components/mosaic/calendar';

interface MonthsLeverProps {
  mounted: readonly boolean[];
  saved: readonly boolean[];
  /** months in the order of the mosaic */
  order: readonly number[];
  onChange(mounted: boolean[]): void;
}

/** Months in which the array hangs: twelve stones that are laid or lifted. Arrow keys go from month to month. */
export function MonthsLever({ mounted, saved, order, onChange }: MonthsLeverProps) {
  const id = useId();
  const cells = useRef<(HTMLButtonElement | null)[]>([]);
  const changed = mounted.some((is, month) => is !== saved[month]);
  const count = mounted.filter(Boolean).length;

  function onKeyDown(event: KeyboardEvent, place: number) {
    const step = { ArrowLeft: -1, ArrowUp: -1, ArrowRight: 1, ArrowDown: 1 }[event.key];
    if (step === undefined) return;
    event.preventDefault();
    cells.current[(place + step + 12) % 12]?.focus();
  }

  return (
    <div
      role="group"
      aria-labelledby={id}
      className="grid grid-cols-1 gap-x-4 py-2 rule-hair sm:grid-cols-[9.5rem_1fr]"
    >
      <span id={id} className="leading-6">
        Months mounted
      </span>
      <div className="grid grid-cols-12 gap-px">
        {order.map((month, place) => (
          <button
            key={month}
            type="button"
            ref={(cell) => {
              cells.current[place] = cell;
            }}
            aria-pressed={mounted[month]}
            aria-label={MONTHS[month]}
            tabIndex={place === 0 ? 0 : -1}
            onKeyDown={(event) => onKeyDown(event, place)}
            onClick={() => onChange(mounted.map((is, index) => (index === month ? !is : is)))}
            className="flex h-7 items-center justify-center border border-line text-note aria-pressed:border-ink aria-pressed:bg-ink aria-pressed:text-paper pointer-coarse:h-11"
          >
            {MONTHS[month]!.slice(0, 1)}
          </button>
        ))}
      </div>
      <p className="text-note text-muted sm:col-start-2">
        {count === 12 ? 'Stands all year.' : count === 0 ? 'Never mounted.' : `Mounted in ${count} months.`}
        {changed && ` Saved: ${saved.filter(Boolean).length} months.`}
      </p>
    </div>
  );
}
