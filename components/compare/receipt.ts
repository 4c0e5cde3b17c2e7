import type { ComparedDesign } from './compared-design';

/** A line of the receipt, one figure per design; undefined where a design has no such line. */
export interface ReceiptRow {
  label: string;
  perKwh: (number | undefined)[];
}

/** Hundredths of a currency, by the names that they have. */
const HUNDREDTHS: Readonly<Record<string, string>> = {
  EUR: 'cents',
  USD: 'cents',
  CAD: 'cents',
  AUD: 'cents',
  NZD: 'cents',
  GBP: 'pence',
  CHF: 'centimes',
};

/** What a hundredth of the project's currency is called. */
export function hundredthsOf(currency: string): string {
  return HUNDREDTHS[currency] ?? `hundredths of ${currency}`;
}

/**
 * Sets the receipts side by side: one row per kind of cost, replacements of all kinds in one row, own hours apart.
 * The rows of a design add up to its cost of heat.
 */
export function receiptRows(designs: readonly ComparedDesign[]): ReceiptRow[] {
  const rows: ReceiptRow[] = [];
  const replaced = new Set<string>();
  designs.forEach((design, place) => {
    for (const { kind, label, perKwh } of design.receipt) {
      if (perKwh === 0 || label === 'own hours') continue;
      if (kind === 'replacement') replaced.add(label);
      const key = kind === 'replacement' ? 'replacements' : label;
      let row = rows.find((one) => one.label === key);
      if (!row) rows.push((row = { label: key, perKwh: designs.map(() => undefined) }));
      row.perKwh[place] = (row.perKwh[place] ?? 0) + perKwh;
    }
  });
  const list = [...replaced].map((label, i) => (i === 0 ? label : label.replace(/^new /, ''))).join(', ');
  return rows.map((row) => (row.label === 'replacements' ? { ...row, label: list } : row));
}

/** Own hours of each design in the cost of a kilowatt hour; undefined while they are not priced. */
export function ownHoursRow(designs: readonly ComparedDesign[]): (number | undefined)[] {
  return designs.map(({ receipt }) => receipt.find(({ label }) => label === 'own hours')?.perKwh);
}
