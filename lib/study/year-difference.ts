import type { StoredYear } from '@/lib/schemas/run-summary';
import type { YearTotals } from '@/lib/simulation/results';

/** One figure of a year, as an older and as the present engine found it. */
export interface YearDifference {
  label: string;
  unit: '%' | 'kWh' | 'h' | '°C';
  /** null where the older run did not store it */
  before: number | null;
  after: number;
}

interface Figure {
  label: string;
  unit: YearDifference['unit'];
  /** undefined or not a number where a field is missing */
  read(year: StoredYear): number | undefined;
}

const PERCENT = 100;

const FIGURES: readonly Figure[] = [
  { label: 'solar fraction', unit: '%', read: (year) => year.fractions.solar * PERCENT },
  { label: 'thermal savings', unit: '%', read: (year) => year.fractions.savedThermal * PERCENT },
  { label: 'store to the heating', unit: 'kWh', read: (year) => year.solarHeatingKwh },
  { label: 'store to hot water', unit: 'kWh', read: (year) => year.solarTapKwh },
  { label: 'backup to the heating', unit: 'kWh', read: (year) => year.backupHeatingKwh },
  { label: 'backup to hot water', unit: 'kWh', read: (year) => year.backupTapKwh },
  { label: 'bought energy', unit: 'kWh', read: (year) => year.boughtKwh },
  { label: 'unmet heat', unit: 'kWh', read: (year) => year.unmetKwh },
  { label: 'lost from the store', unit: 'kWh', read: (year) => year.storeLossKwh },
  { label: 'pump, electricity', unit: 'kWh', read: (year) => year.pumpKwh },
  { label: 'hottest store', unit: '°C', read: (year) => year.storeMaxC },
  { label: 'coldest room', unit: '°C', read: (year) => year.roomMinC },
  { label: 'empty and too hot', unit: 'h', read: (year) => year.overLimitHours },
];

/**
 * The figures of a year side by side.
 * @param before as stored by an older engine; fields of later engines may be missing
 * @param after as the present engine finds them
 */
export function yearDifferences(before: StoredYear, after: YearTotals): YearDifference[] {
  return FIGURES.map(({ label, unit, read }) => {
    const known = read(before);
    const isKnown = typeof known === 'number' && Number.isFinite(known);
    return { label, unit, before: isKnown ? known : null, after: read(after) ?? NaN };
  });
}
