'use client';

import { useFormContext } from 'react-hook-form';
import { useFormKnowledge } from './form-context';
import { metaOf } from './field-meta';
import { schemaAt } from './typed-values';

const MONTHS = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
];

/** Twelve months to be put in or left out, each a stone with its name. */
export function MonthsField({ path }: { path: string }) {
  const { register } = useFormContext();
  const { schema } = useFormKnowledge();
  const { label, help } = metaOf(schemaAt(schema, path));
  return (
    <fieldset aria-describedby={`field-${path}-help`}>
      <legend className="mb-1">{label}</legend>
      <div className="grid grid-cols-4 border-t border-l border-line sm:grid-cols-6 md:grid-cols-12">
        {MONTHS.map((month, i) => (
          <label
            key={month}
            className="relative flex min-h-8 items-center justify-center border-r border-b border-line bg-field text-muted has-checked:bg-ink has-checked:text-paper has-focus-visible:z-10 has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-ink pointer-coarse:min-h-11"
          >
            <input
              type="checkbox"
              {...register(`${path}.${i}`)}
              aria-label={month}
              className="absolute inset-0 cursor-pointer opacity-0"
            />
            <span aria-hidden="true" className="font-display italic">
              {month.slice(0, 3)}
            </span>
          </label>
        ))}
      </div>
      <p id={`field-${path}-help`} className="mt-0.5 text-note text-muted">
        {help}
      </p>
    </fieldset>
  );
}
