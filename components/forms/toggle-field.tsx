'use client';

import { useFormContext } from 'react-hook-form';
import type { z } from 'zod';
import type { FieldProps } from './field';
import { metaOf } from './field-meta';

/** Yes or no. */
export function ToggleField({ path, schema, inTable = false, name }: FieldProps & { schema: z.ZodType }) {
  const { register } = useFormContext();
  const { label, help } = metaOf(schema);
  const id = `field-${path}`;
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="flex min-h-7 items-center gap-2 pointer-coarse:min-h-11">
        <input
          id={id}
          type="checkbox"
          {...register(path)}
          aria-describedby={`${id}-help`}
          className="size-4 accent-ink"
        />
        <span className={inTable ? 'sr-only' : ''}>{name ?? label}</span>
      </label>
      <p id={`${id}-help`} className={inTable ? 'sr-only' : 'text-note text-muted'}>
        {help}
      </p>
    </div>
  );
}
