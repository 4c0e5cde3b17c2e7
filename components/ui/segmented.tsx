'use client';

import { useId } from 'react';

interface SegmentedProps<T extends string> {
  label: string;
  options: readonly { value: T; label: string }[];
  value: T;
  onChange(value: T): void;
}

/** One of a few words, the chosen one ruled underneath: a row of radio buttons. */
export function Segmented<T extends string>({ label, options, value, onChange }: SegmentedProps<T>) {
  const name = useId();
  return (
    <fieldset className="flex flex-wrap gap-x-6 gap-y-1">
      <legend className="sr-only">{label}</legend>
      {options.map((option) => (
        <label
          key={option.value}
          className="segment relative flex min-h-7 cursor-pointer items-center border-b-2 border-transparent has-checked:border-ink has-checked:font-strong has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-ink pointer-coarse:min-h-11"
        >
          <input
            type="radio"
            className="absolute inset-0 cursor-pointer opacity-0"
            name={name}
            checked={option.value === value}
            onChange={() => onChange(option.value)}
          />
          {option.label}
        </label>
      ))}
    </fieldset>
  );
}
