import { memo } from 'react';
import type { ReactNode } from 'react';
import type { YearResult } from '@/lib/simulation/results';
import { formatFixed, formatTyped, withUnit } from '@/lib/units/display';
import { BandSwatch, StoneSwatch } from './stone-swatch';
import { BAND_READINGS, countStones, packBands } from './stones';
import type { BandReading, ReadingId } from './stones';

interface LegendRow {
  key: string;
  swatches: ReactNode;
  name: string;
  /** where there is little room */
  short?: string;
  hours: number | undefined;
}

const CARRIER_ROWS: readonly { name: string; short: string; carriers: readonly number[] }[] = [
  { name: 'sun, straight in', short: 'straight in', carriers: [1] },
  { name: 'sun from the store', short: 'from the store', carriers: [2] },
  { name: 'sun and backup', short: 'sun, backup', carriers: [3, 4] },
  { name: 'backup', short: 'backup', carriers: [5] },
  { name: 'nothing needed', short: 'not needed', carriers: [0] },
];
const NOT_MET = 6;

function carrierRows(result: YearResult | undefined): LegendRow[] {
  const hours = result?.year.carrierHours;
  const row = (name: string, short: string, carriers: readonly number[]): LegendRow => ({
    key: name,
    short,
    swatches: carriers.map((carrier) => <StoneSwatch key={carrier} stone={carrier} />),
    name,
    hours: hours && carriers.reduce((sum, carrier) => sum + (hours[carrier] ?? 0), 0),
  });
  const rows = CARRIER_ROWS.map(({ name, short, carriers }) => row(name, short, carriers));
  if (hours?.[NOT_MET]) rows.push(row('not warm enough', 'too cold', [NOT_MET]));
  rows.push({
    key: 'hot',
    swatches: <StoneSwatch stone={7} />,
    name: 'empty, too hot',
    short: 'too hot, dry',
    hours: result?.year.overLimitHours,
  });
  return rows;
}

function bandRows(reading: BandReading, result: YearResult | undefined): LegendRow[] {
  const { edges, unit, token } = reading;
  const stones = new Uint8Array(result ? result.columns.carrier.length : 0);
  if (result) packBands(reading, result.columns, stones);
  const hours = countStones(stones, edges.length + 1);
  return hours
    .map((count, band) => ({
      key: String(band),
      swatches: <BandSwatch band={band} bands={edges.length} token={token} />,
      name: withUnit(bandName(edges, band), unit),
      hours: result && count,
    }))
    .reverse();
}

function bandName(edges: readonly number[], band: number): string {
  const from = edges[band - 1];
  const to = edges[band];
  if (from === undefined) return `below ${formatTyped(to!)}`;
  return to === undefined ? `from ${formatTyped(from)}` : `${formatTyped(from)} to ${formatTyped(to)}`;
}

/** What the stones mean, each with its cut and its hours of the year. */
export const Legend = memo(function Legend({
  reading,
  result,
}: {
  reading: ReadingId;
  result: YearResult | undefined;
}) {
  const bands = BAND_READINGS.find((one) => one.id === reading);
  const rows = bands ? bandRows(bands, result) : carrierRows(result);
  const noUnmet = !bands && result && !result.year.carrierHours[NOT_MET];
  return (
    <div>
      <ul className="grid-cols-2 gap-x-4 max-lg:grid" aria-label="Stones and their hours">
        {rows.map((row) => (
          <li key={row.key} className="flex items-center gap-x-1 py-0.5 rule-hair">
            <span className="flex w-7.5 shrink-0 gap-px">{row.swatches}</span>
            <span className="grow max-sm:hidden">{row.name}</span>
            <span className="grow sm:hidden">{row.short ?? row.name}</span>
            <span className="whitespace-nowrap tabular-nums">
              {row.hours === undefined ? '–' : withUnit(formatFixed(row.hours), 'h')}
            </span>
          </li>
        ))}
      </ul>
      <p className="mt-3 text-note text-muted">
        {bands
          ? bands.sentence
          : `${noUnmet ? 'Not warm enough: no hour. ' : ''}Curved lines: sunrise and sunset.`}
      </p>
    </div>
  );
});

/** The legend as one line of words under a picture. */
export function LegendLine() {
  return (
    <ul className="flex flex-wrap gap-x-6 gap-y-1" aria-label="Stones">
      {carrierRows(undefined).map((row) => (
        <li key={row.key} className="flex items-center gap-x-2">
          <span className="flex gap-px">{row.swatches}</span>
          {row.name}
        </li>
      ))}
    </ul>
  );
}
