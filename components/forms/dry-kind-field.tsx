'use client';

import { useFormContext } from 'react-hook-form';

const KINDS = [
  { value: 'balance', label: 'heat balance of the build' },
  { value: 'declared', label: 'declared on a certificate' },
];

/** How the temperature of the empty collector is found; the figures of the other way stay as typed. */
export function DryKindField({ path }: { path: string }) {
  const { register } = useFormContext();
  const id = `field-${path}`;
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="mb-1 block">
        Dry temperature by
      </label>
      <select id={id} {...register(path)} aria-describedby={`${id}-help`} className="field w-full">
        {KINDS.map(({ value, label }) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </select>
      <p id={`${id}-help`} className="mt-0.5 text-note text-muted">
        A certificate’s value, where there is one, beats the balance.
      </p>
    </div>
  );
}
