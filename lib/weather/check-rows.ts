import { HOURS_PER_YEAR } from '@/lib/units/constants';
import { hourRuns, MAX_GAP_H } from '@/lib/weather/hour-runs';
import { type HourTable, hourWords } from '@/lib/weather/hour-table';
import { withThousands } from '@/lib/weather/with-thousands';
import type { ReadOptions, RowProblem, WeatherRefusal } from '@/lib/weather/weather-result';
import type { WeatherNote } from '@/lib/weather/weather-year';

/** A refusal lists at most so many rows. */
export const MAX_LISTED_ROWS = 100;
/** More hours standing twice than this are no slip of an editor. */
const MAX_TWICE = 24;

/**
 * Whether every hour of the year has exactly one row.
 * @param table the rows in their places
 * @param notes takes what was left out or repaired
 * @param options `repair: true` leaves hours missing for interpolation and drops rows that stand twice
 * @returns null when the year is complete or can be completed, else the refusal
 * @see EN ISO 15927-4:2005 (a reference year has 8,760 hours; from memory)
 */
export function checkRows(
  table: HourTable,
  notes: WeatherNote[],
  options: ReadOptions,
): WeatherRefusal | null {
  if (table.rows === 0) {
    return { ok: false, code: 'empty', message: 'The file has a header but no hourly rows.' };
  }
  if (table.badStamps.length > 0) return badStamps(table.badStamps);
  noteStamps(table, notes);
  const hours = table.rows - table.leapLines.length;
  if (hours > 1.5 * HOURS_PER_YEAR) return notHourly(hours);
  if (!table.lineOfHour.includes(0) && table.twice.length === 0) return null;
  const missing = missingRows(table);
  const found = `The file has ${withThousands(hours)} hours; a year needs 8,760.`;
  const refusal = missing.rows.length > 0 ? rowsMissing(found, table, missing) : rowsTwice(found, table);
  if (!options.repair || refusal.repair === undefined) return refusal;
  if (table.twice.length > 0) {
    const rows = table.twice.map((row) => row.line);
    notes.push({ kind: 'repair', message: 'Rows whose hour stood before were left out.', rows });
  }
  return null;
}

function noteStamps(table: HourTable, notes: WeatherNote[]): void {
  if (table.leapLines.length > 0) {
    const message = '29 February was left out: every year has 8,760 hours here.';
    notes.push({ kind: 'assumption', message, rows: table.leapLines });
  }
  if (table.zeroBased) {
    const message = 'Hours are numbered 0–23; they were taken as the start of the hour they name.';
    notes.push({ kind: 'caution', message });
  }
}

interface MissingRows {
  rows: RowProblem[];
  longest: number;
  total: number;
}

function missingRows(table: HourTable): MissingRows {
  const runs = hourRuns((hour) => table.lineOfHour[hour] === 0);
  const rows = runs.map(({ start, length }) => {
    const before = table.lineOfHour[(start + HOURS_PER_YEAR - 1) % HOURS_PER_YEAR]!;
    const what = length === 1 ? `${hourWords(start)} is` : `${length} hours from ${hourWords(start)} on are`;
    return { row: before, problem: `${what} missing after this row` };
  });
  const lengths = runs.map((run) => run.length);
  return { rows, longest: Math.max(0, ...lengths), total: lengths.reduce((a, b) => a + b, 0) };
}

function rowsMissing(found: string, table: HourTable, missing: MissingRows): WeatherRefusal {
  const first = missing.rows[0]!;
  const where = `After row ${first.row}: ${first.problem.replace(' after this row', '')}.`;
  const refusal = {
    ok: false,
    code: 'rows-missing',
    rows: [...missing.rows, ...twiceProblems(table)].slice(0, MAX_LISTED_ROWS),
  } as const;
  if (missing.total === 1 && table.twice.length === 1) {
    const advice =
      'One hour is missing and one stands twice, as with daylight saving time: export the file in standard time.';
    return { ...refusal, message: `${found} ${where} ${advice}` };
  }
  if (missing.longest > MAX_GAP_H || table.twice.length > MAX_TWICE) {
    const advice = `Gaps longer than ${MAX_GAP_H} hours cannot be interpolated: fill them, then upload again.`;
    return { ...refusal, message: `${found} ${where} ${advice}` };
  }
  return {
    ...refusal,
    message: `${found} ${where}`,
    repair: `Interpolate the ${missing.total} missing ${missing.total === 1 ? 'hour' : 'hours'} between the hours before and after.`,
  };
}

function rowsTwice(found: string, table: HourTable): WeatherRefusal {
  const rows = twiceProblems(table);
  const refusal = { ok: false, code: 'rows-twice', rows: rows.slice(0, MAX_LISTED_ROWS) } as const;
  const where = `Row ${rows[0]!.row}: ${rows[0]!.problem}.`;
  if (rows.length > MAX_TWICE) {
    return { ...refusal, message: `${found} ${where} ${rows.length} rows stand twice: export it again.` };
  }
  return {
    ...refusal,
    message: `${found} ${where}`,
    repair: 'Keep the first row of each hour, drop the later.',
  };
}

function twiceProblems(table: HourTable): RowProblem[] {
  return table.twice.map(({ line, hour }) => ({
    row: line,
    problem: `${hourWords(hour)} stands already in row ${table.lineOfHour[hour]}`,
  }));
}

function badStamps(problems: readonly RowProblem[]): WeatherRefusal {
  const first = problems[0]!;
  return {
    ok: false,
    code: 'bad-stamp',
    message: `Row ${first.row} has ${first.problem}. Mend or remove ${problems.length === 1 ? 'the row' : `these ${problems.length} rows`}, then upload again.`,
    rows: problems.slice(0, MAX_LISTED_ROWS),
  };
}

function notHourly(hours: number): WeatherRefusal {
  return {
    ok: false,
    code: 'not-hourly',
    message: `The file has ${withThousands(hours)} rows; a year of hours has 8,760. Export it with hourly values for one year.`,
  };
}
