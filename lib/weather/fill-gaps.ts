import { HOURS_PER_YEAR } from '@/lib/units/constants';
import { MAX_LISTED_ROWS } from '@/lib/weather/check-rows';
import { type HourRun, hourRuns, MAX_GAP_H } from '@/lib/weather/hour-runs';
import { type HourColumn, type HourTable, hourWords } from '@/lib/weather/hour-table';
import type { ReadOptions, RowProblem, WeatherRefusal } from '@/lib/weather/weather-result';
import type { WeatherNote } from '@/lib/weather/weather-year';

/** Columns that a year cannot do without, in the user's words. */
const REQUIRED: readonly (readonly [column: HourColumn, words: string])[] = [
  ['dryBulbC', 'air temperature'],
  ['globalWm2', 'global irradiance'],
  ['beamNormalWm2', 'beam irradiance'],
  ['diffuseWm2', 'diffuse irradiance'],
  ['windMPerS', 'wind speed'],
];

interface Gap extends HourRun {
  column: HourColumn;
  words: string;
  row: number;
}

/**
 * Closes gaps of up to three hours in the needed columns on request, straight between the hours before and after.
 * @param table hours in their places; its columns are filled
 * @param notes takes one note for each column that was repaired
 * @param options `repair: true` interpolates
 * @returns null when nothing is missing any more, else the refusal with the rows
 * @see common practice, no source (limit of three hours)
 */
export function fillGaps(
  table: HourTable,
  notes: WeatherNote[],
  options: ReadOptions,
): WeatherRefusal | null {
  const gaps = REQUIRED.flatMap(([column, words]) => gapsOf(table, column, words));
  if (gaps.length === 0) return null;
  const long = gaps.filter((gap) => gap.length > MAX_GAP_H);
  if (long.length > 0) return refuse(long, 'long');
  if (!options.repair) return refuse(gaps, 'short');
  for (const gap of gaps) interpolate(table.columns[gap.column], gap);
  for (const [column, words] of REQUIRED) {
    const mended = gaps.filter((gap) => gap.column === column);
    if (mended.length === 0) continue;
    const hours = mended.reduce((sum, gap) => sum + gap.length, 0);
    const message = `${hours} missing ${hours === 1 ? 'value' : 'values'} of ${words} interpolated.`;
    notes.push({ kind: 'repair', message, rows: mended.map((gap) => gap.row) });
  }
  return null;
}

function gapsOf(table: HourTable, column: HourColumn, words: string): Gap[] {
  const values = table.columns[column];
  if (!values.includes(NaN)) return [];
  return hourRuns((hour) => Number.isNaN(values[hour]!)).map((run) => {
    const before = (run.start + HOURS_PER_YEAR - 1) % HOURS_PER_YEAR;
    return { ...run, column, words, row: table.lineOfHour[run.start]! || table.lineOfHour[before]! };
  });
}

function interpolate(values: Float64Array, { start, length }: HourRun): void {
  const before = values[(start + HOURS_PER_YEAR - 1) % HOURS_PER_YEAR]!;
  const after = values[(start + length) % HOURS_PER_YEAR]!;
  for (let i = 0; i < length; i++) {
    values[(start + i) % HOURS_PER_YEAR] = before + ((after - before) * (i + 1)) / (length + 1);
  }
}

function refuse(gaps: readonly Gap[], kind: 'long' | 'short'): WeatherRefusal {
  const rows = gaps.map(problemOf).slice(0, MAX_LISTED_ROWS);
  const first = `Row ${rows[0]!.row}: ${rows[0]!.problem}.`;
  const refusal = { ok: false, code: 'values-missing', rows } as const;
  if (kind === 'long') {
    const advice = `Gaps longer than ${MAX_GAP_H} hours cannot be interpolated: fill them, then upload again.`;
    return { ...refusal, message: `Values are missing. ${first} ${advice}` };
  }
  const hours = gaps.reduce((sum, gap) => sum + gap.length, 0);
  return {
    ...refusal,
    message: `${hours} ${hours === 1 ? 'value is' : 'values are'} missing. ${first}`,
    repair: 'Interpolate between the hours before and after.',
  };
}

function problemOf(gap: Gap): RowProblem {
  if (gap.length === HOURS_PER_YEAR) return { row: gap.row, problem: `no ${gap.words} in the whole file` };
  const hours =
    gap.length === 1 ? hourWords(gap.start) : `${gap.length} hours from ${hourWords(gap.start)} on`;
  return { row: gap.row, problem: `${gap.words} missing at ${hours}` };
}
