'use client';

import { quantityMeta, type QuantityMeta } from '@/lib/schemas/quantity';
import { formatTyped, unitInCurrency, withUnit } from '@/lib/units/display';
import { useFormKnowledge } from './form-context';
import { OriginLegend } from './origin-mark';
import { schemaAt } from './typed-values';
import { findMeta } from './field-meta';

function QuantityNote({ meta, currency }: { meta: QuantityMeta; currency: string }) {
  const unit = unitInCurrency(meta.unit, currency);
  return (
    <>
      <p>{meta.help}</p>
      <p>
        {formatTyped(meta.min)} to {withUnit(formatTyped(meta.max), unit)}. Starts at{' '}
        {withUnit(formatTyped(meta.default), unit)}: {meta.origin}, {meta.source}.
      </p>
    </>
  );
}

/** Behind a hairline: help for the field in hand, and what the marks mean. */
export function MarginNotes() {
  const { schema, focused, currency } = useFormKnowledge();
  const field = focused ? schemaAt(schema, focused) : undefined;
  const meta = field && quantityMeta(field);
  const words = field && findMeta(field);
  return (
    <aside
      aria-label="Notes to the form"
      className="text-note text-muted lg:col-start-2 xl:sticky xl:top-16 xl:col-start-3 xl:self-start xl:border-l xl:border-hair xl:pl-5"
    >
      <div className="max-xl:hidden" aria-hidden={!words}>
        {words && (
          <>
            <h3 className="text-ink">{words.label}</h3>
            <div className="mb-4 space-y-2">
              {meta ? <QuantityNote meta={meta} currency={currency} /> : <p>{words.help}</p>}
            </div>
          </>
        )}
      </div>
      <h3 className="text-ink">Held</h3>
      <p className="mb-4">
        A field in error keeps its last good value in every result until it is mended. Nothing typed is lost:
        it stays in this tab until it is saved.
      </p>
      <h3 className="pt-3 pb-2 text-ink rule-ink">How well a value is known</h3>
      <OriginLegend />
      <p className="mt-4">
        A comma or a point may stand before the decimals. <kbd className="font-text font-strong">Ctrl S</kbd>{' '}
        saves; in a table <kbd className="font-text font-strong">Enter</kbd> goes down a row.
      </p>
    </aside>
  );
}
