import type { ReactNode } from 'react';
import { formatFixed, formatTyped, NO_VALUE } from '@/lib/units/display';
import type { ComparedDesign } from './compared-design';
import type { Terms } from './differences';
import { hundredthsOf, ownHoursRow, receiptRows } from './receipt';

const cents = (perKwh: number | undefined) =>
  perKwh === undefined || !Number.isFinite(perKwh) ? NO_VALUE : formatFixed(perKwh * 100, 2);

function Leader({ children }: { children: ReactNode }) {
  return (
    <span className="flex items-baseline gap-2">
      {children}
      <span aria-hidden="true" className="min-w-4 flex-1 border-b border-dotted border-line max-sm:hidden" />
    </span>
  );
}

function ownHoursWords(designs: readonly ComparedDesign[]): string {
  const hours = designs.map(({ ownHours }) => formatTyped(ownHours));
  return new Set(hours).size === 1 ? `${hours[0]} hours each` : `${hours.join(', ')} hours`;
}

interface ReceiptTableProps {
  designs: readonly ComparedDesign[];
  terms: Terms;
  fuel: string;
  /** where an hourly rate can be set */
  rateLink?: ReactNode;
}

/** What a kilowatt hour of sun heat is made of, in hundredths of the currency. */
export function ReceiptTable({ designs, terms, fuel, rateLink }: ReceiptTableProps) {
  const own = ownHoursRow(designs);
  const unpriced =
    own.every((perKwh) => perKwh === undefined) && designs.some(({ ownHours }) => ownHours > 0);
  const unit = hundredthsOf(terms.currency);
  const rows = receiptRows(designs);
  return (
    <section aria-labelledby="receipt-title">
      <h2 id="receipt-title" className="sm:-mb-6 sm:max-w-[50%]">
        What a kilowatt-hour costs
      </h2>
      <table className="w-full">
        <thead>
          <tr>
            <th scope="col">
              <span className="sr-only">Part of the cost</span>
            </th>
            {designs.map(({ id, name }) => (
              <th key={id} scope="col" data-number className="w-16 sm:w-24">
                {name}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ label, perKwh }) => (
            <tr key={label} className="border-none">
              <th scope="row" className="py-px font-normal">
                <Leader>{label}</Leader>
              </th>
              {perKwh.map((value, i) => (
                <td key={designs[i]!.id} data-number className="py-px">
                  {cents(value)}
                </td>
              ))}
            </tr>
          ))}
          <tr className="rule-double">
            <th scope="row" className="py-px font-normal">
              <Leader>your own hours{unpriced ? ' †' : ''}</Leader>
            </th>
            {own.map((value, i) => (
              <td key={designs[i]!.id} data-number className="py-px">
                {cents(value)}
              </td>
            ))}
          </tr>
        </tbody>
        <tfoot>
          <tr className="font-strong">
            <th scope="row">{unit} per kWh</th>
            {designs.map(({ id, costPerKwh }) => (
              <td key={id} data-number>
                {cents(costPerKwh)}
              </td>
            ))}
          </tr>
        </tfoot>
      </table>
      <p className="text-note text-muted">
        {formatTyped(terms.realRate)} % real over {terms.years} years. Heat from {fuel} costs{' '}
        {cents(designs[0]?.backupPerKwh)} {unit}.{' '}
        {unpriced && (
          <>
            † {ownHoursWords(designs)}, not priced
            {rateLink ? <>: {rateLink}</> : '.'}
          </>
        )}
      </p>
    </section>
  );
}
