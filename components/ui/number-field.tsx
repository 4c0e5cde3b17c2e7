'use client';

import { useId, useState } from 'react';
import { formatTyped, readNumber } from '@/lib/units/display';

interface NumberFieldProps {
  label: string;
  /** hide the label where one stands beside the field already */
  labelHidden?: boolean;
  value: number;
  unit: string;
  min: number;
  max: number;
  /** what to type instead, said when the typed text does not fit */
  hint: string;
  help?: string;
  className?: string;
  onChange(value: number): void;
}

/** A number that is typed; what was typed stays, and an unfit value says below what to type instead. */
export function NumberField(props: NumberFieldProps) {
  const { label, labelHidden = false, value, unit, min, max, hint, help, className = '' } = props;
  const id = useId();
  const [draft, setDraft] = useState<string>();
  const typed = draft === undefined ? value : readNumber(draft);
  const unfit = typed === undefined || typed < min || typed > max;

  function onType(text: string) {
    setDraft(text);
    const next = readNumber(text);
    if (next !== undefined && next >= min && next <= max && next !== value) props.onChange(next);
  }

  return (
    <div className={className}>
      <label htmlFor={id} className={labelHidden ? 'sr-only' : 'mb-1 block'}>
        {label}
      </label>
      <div className="relative">
        <input
          id={id}
          inputMode="decimal"
          autoComplete="off"
          value={draft ?? formatTyped(value)}
          title={help}
          aria-invalid={unfit}
          aria-describedby={unfit ? `${id}-hint` : `${id}-unit`}
          onChange={(event) => onType(event.target.value)}
          onBlur={() => {
            if (!unfit) setDraft(undefined);
          }}
          className="field w-full text-right"
          style={{ paddingRight: unit ? `calc(${unit.length}ch + 1rem)` : undefined }}
        />
        <span
          id={`${id}-unit`}
          className="pointer-events-none absolute inset-y-0 right-2 flex items-center unit"
        >
          {unit}
        </span>
      </div>
      {unfit && (
        <p id={`${id}-hint`} role="alert" className="mt-1 text-note text-hot-text">
          {hint}
        </p>
      )}
    </div>
  );
}
