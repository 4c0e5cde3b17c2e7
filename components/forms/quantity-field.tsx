'use client';

import { useFormContext, useWatch } from 'react-hook-form';
import type { QuantityMeta } from '@/lib/schemas/quantity';
import { formatTyped, unitInCurrency } from '@/lib/units/display';
import type { FieldProps } from './field';
import { useFormKnowledge } from './form-context';
import { errorWords, offeredCorrection } from './offered-correction';
import { OriginMark, originOf } from './origin-mark';
import { typedNumber } from './typed-values';
import { useFieldError } from './use-field-error';

interface QuantityFieldProps extends FieldProps {
  meta: QuantityMeta;
}

/** What is wrong with a number, what to type instead, and what was probably meant. */
export function QuantityError({ path, meta, id }: { path: string; meta: QuantityMeta; id: string }) {
  const { control, setValue, setFocus } = useFormContext();
  const typed: unknown = useWatch({ control, name: path });
  const message = useFieldError(path);
  if (!message) return null;
  const text = String(typed ?? '');
  const offered = offeredCorrection(text, meta);
  return (
    <p id={id} role="alert" className="text-note text-hot-text">
      {errorWords(text, meta, message)}
      {offered && (
        <>
          {' '}
          Did you mean{' '}
          <button
            type="button"
            className="word"
            onClick={() => {
              setValue(path, typedNumber(offered.value), { shouldValidate: true, shouldDirty: true });
              setFocus(path);
            }}
          >
            {offered.word}
          </button>
          ?
        </>
      )}
    </p>
  );
}

/** A number: label above, unit inside at the right, below it where the value comes from and its range. */
export function QuantityField({ path, meta, inTable = false, name }: QuantityFieldProps) {
  const { register, control } = useFormContext();
  const { currency, focused } = useFormKnowledge();
  const typed: unknown = useWatch({ control, name: path });
  const inError = useFieldError(path) !== undefined;
  const unit = inTable ? '' : unitInCurrency(meta.unit, currency);
  const id = `field-${path}`;
  return (
    <div className="min-w-0">
      <label htmlFor={id} className={inTable ? 'sr-only' : 'mb-1 block'}>
        {name ?? meta.label}
      </label>
      <div className="relative">
        <input
          id={id}
          {...register(path)}
          inputMode="decimal"
          autoComplete="off"
          spellCheck={false}
          aria-invalid={inError}
          aria-describedby={`${id}-error ${id}-origin ${id}-help`}
          className="field w-full text-right"
          style={{ paddingRight: unit ? `calc(${unit.length}ch + 1.2rem)` : undefined }}
        />
        <span className="pointer-events-none absolute inset-y-0 right-2 flex items-center unit">{unit}</span>
      </div>
      <p
        id={`${id}-origin`}
        className={inTable ? 'sr-only' : 'mt-0.5 flex flex-wrap gap-x-2 text-note text-muted'}
      >
        <OriginMark origin={originOf(meta, String(typed ?? ''))} />
        <span>
          {formatTyped(meta.min)} to {formatTyped(meta.max)}
        </span>
      </p>
      {!inTable && <QuantityError path={path} meta={meta} id={`${id}-error`} />}
      <p
        id={`${id}-help`}
        className={focused === path && !inTable ? 'text-note text-muted xl:sr-only' : 'sr-only'}
      >
        {meta.help}
      </p>
    </div>
  );
}
