'use client';

import { useFormContext } from 'react-hook-form';
import type { z } from 'zod';
import type { FieldProps } from './field';
import { metaOf } from './field-meta';

interface ChoiceFieldProps extends FieldProps {
  schema: z.ZodType;
  choices: readonly string[];
}

/** One of a few words. */
export function ChoiceField({ path, schema, choices, inTable = false, name }: ChoiceFieldProps) {
  const { register } = useFormContext();
  const { label, help } = metaOf(schema);
  const id = `field-${path}`;
  return (
    <div className="min-w-0">
      <label htmlFor={id} className={inTable ? 'sr-only' : 'mb-1 block'}>
        {name ?? label}
      </label>
      <select id={id} {...register(path)} aria-describedby={`${id}-help`} className="field w-full">
        {choices.map((choice) => (
          <option key={choice} value={choice}>
            {choice}
          </option>
        ))}
      </select>
      <p id={`${id}-help`} className={inTable ? 'sr-only' : 'mt-0.5 text-note text-muted'}>
        {help}
      </p>
    </div>
  );
}
