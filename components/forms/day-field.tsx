'use client';

import { useFormContext, useWatch } from 'react-hook-form';
import type { z } from 'zod';
import { dayNumber, dayWords } from '@/lib/calibration/day-number';
import { readDate } from '@/lib/calibration/read-date';
import type { FieldProps } from './field';
import { metaOf } from './field-meta';
import { useFieldError } from './use-field-error';

const inWords = (iso: string) => dayWords(dayNumber(iso)!);

/** What is wrong with a day; one that can be read in two ways is asked, not guessed. */
export function DayError({ path, id }: { path: string; id: string }) {
  const { control, setValue, setFocus } = useFormContext();
  const typed: unknown = useWatch({ control, name: path });
  const message = useFieldError(path);
  if (!message) return null;
  const read = readDate(String(typed ?? ''));
  const take = (iso: string) => () => {
    setValue(path, iso, { shouldValidate: true, shouldDirty: true });
    setFocus(path);
  };
  return (
    <p id={id} role="alert" className="text-note text-hot-text">
      {read.kind === 'either' ? (
        <>
          “{String(typed)}” can be two days. Is it{' '}
          <button type="button" className="word" onClick={take(read.dayFirst)}>
            {inWords(read.dayFirst)}
          </button>{' '}
          or{' '}
          <button type="button" className="word" onClick={take(read.monthFirst)}>
            {inWords(read.monthFirst)}
          </button>
          ?
        </>
      ) : (
        message
      )}
    </p>
  );
}

/** A calendar day, typed as people write it and kept as 2024-03-01. */
export function DayField({ path, schema, inTable = false, name }: FieldProps & { schema: z.ZodType }) {
  const { register, setValue } = useFormContext();
  const { label } = metaOf(schema);
  const inError = useFieldError(path) !== undefined;
  const id = `field-${path}`;
  const { onBlur, ...field } = register(path);
  return (
    <div className="min-w-0">
      <label htmlFor={id} className={inTable ? 'sr-only' : 'mb-1 block'}>
        {name ?? label}
      </label>
      <input
        id={id}
        {...field}
        onBlur={(event) => {
          const read = readDate(event.target.value);
          if (read.kind === 'day') setValue(path, read.iso, { shouldValidate: true, shouldDirty: true });
          void onBlur(event);
        }}
        autoComplete="off"
        spellCheck={false}
        placeholder="2024-03-01"
        aria-invalid={inError}
        aria-describedby={`${id}-error`}
        className="field w-full"
      />
      {!inTable && <DayError path={path} id={`${id}-error`} />}
    </div>
  );
}
