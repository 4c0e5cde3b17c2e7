'use client';

import { useFormContext } from 'react-hook-form';
import type { z } from 'zod';
import type { FieldProps } from './field';
import { metaOf } from './field-meta';
import { useFieldError } from './use-field-error';

/** A short text, such as a name. */
export function TextField({ path, schema, inTable = false, name }: FieldProps & { schema: z.ZodType }) {
  const { register } = useFormContext();
  const { label, help } = metaOf(schema);
  const message = useFieldError(path);
  const id = `field-${path}`;
  return (
    <div className="min-w-0">
      <label htmlFor={id} className={inTable ? 'sr-only' : 'mb-1 block'}>
        {name ?? label}
      </label>
      <input
        id={id}
        {...register(path)}
        autoComplete="off"
        aria-invalid={message !== undefined}
        aria-describedby={`${id}-error ${id}-help`}
        className="field w-full"
      />
      {message && (
        <p id={`${id}-error`} role="alert" className="text-note text-hot-text">
          {message}
        </p>
      )}
      {help && (
        <p id={`${id}-help`} className={inTable ? 'sr-only' : 'mt-0.5 text-note text-muted'}>
          {help}
        </p>
      )}
    </div>
  );
}
