import { PA_PER_MBAR } from '@/lib/units/constants';
import { completeYear } from '@/lib/weather/complete-year';
import { type HourColumn, HourTable } from '@/lib/weather/hour-table';
import { ByteScanner, splitFields } from '@/lib/weather/scan-bytes';
import type { ReadOptions, WeatherRefusal, WeatherResult } from '@/lib/weather/weather-result';

const MISSING_CODE = -9900;

/** Columns by the beginning of their names: publishers differ in what follows. */
const COLUMN_PREFIXES: readonly (readonly [prefix: string, column: HourColumn, required: boolean])[] = [
  ['ghi (', 'globalWm2', true],
  ['dni (', 'beamNormalWm2', true],
  ['dhi (', 'diffuseWm2', true],
  ['dry-bulb (', 'dryBulbC', true],
  ['wspd (', 'windMPerS', true],
  ['dew-point (', 'dewPointC', false],
  ['rhum (', 'relativeHumidity', false],
  ['pressure (', 'pressurePa', false],
  ['alb (', 'albedo', false],
];

/** One column to read: how many fields stand between it and the one before. */
interface Pick {
  skip: number;
  values: Float64Array;
  factor: number;
}

/**
 * Reads a TMY3 file. Stamps 01:00–24:00 (or 00:00 for midnight) name the end of the hour in local standard time;
 * irradiance is the mean of the 60 minutes before, temperature and wind stand at the stamp.
 * @param bytes the file
 * @param options `repair: true` does what a refusal offered
 * @returns the year, or a refusal with row numbers of the file
 * @see S. Wilcox & W. Marion, Users Manual for TMY3 Data Sets, NREL/TP-581-43156, rev. May 2008
 */
export function readTmy3(bytes: Uint8Array, options: ReadOptions = {}): WeatherResult {
  const scanner = new ByteScanner(bytes);
  const station = splitFields(scanner.textLine());
  const [timeZoneH, latitudeDeg, longitudeDeg, elevationM] = station.slice(3, 7).map(Number);
  if (station.length < 7 || ![timeZoneH, latitudeDeg, longitudeDeg, elevationM].every(Number.isFinite)) {
    return noHeader(1, 'no station line with number, name, state, time zone, latitude, longitude, altitude');
  }
  const names = splitFields(scanner.textLine()).map((name) => name.toLowerCase());
  if (!names[0]?.startsWith('date') || !names[1]?.startsWith('time')) {
    return noHeader(2, 'no line of column names that begins with Date and Time');
  }
  const table = new HourTable();
  const picks = pickColumns(names, table);
  if (!Array.isArray(picks)) return picks;
  while (!scanner.atEnd) {
    if (!scanner.blankLine()) readRow(scanner, table, picks);
    scanner.nextLine();
  }
  return completeYear(
    {
      name: station[1] || 'Unnamed place',
      source: 'tmy3',
      latitudeDeg: latitudeDeg!,
      longitudeDeg: longitudeDeg!,
      timeZoneH: timeZoneH!,
      elevationM: elevationM!,
      sunShiftH: -0.5,
      pointValues: 'stamp',
    },
    table,
    options,
  );
}

function pickColumns(names: readonly string[], table: HourTable): Pick[] | WeatherRefusal {
  const found: { at: number; column: HourColumn }[] = [];
  for (const [prefix, column, required] of COLUMN_PREFIXES) {
    const at = names.findIndex((name) => name.startsWith(prefix));
    if (at >= 0) found.push({ at, column });
    else if (required) return noHeader(2, `no column whose name begins with "${prefix}"`);
  }
  found.sort((a, b) => a.at - b.at);
  return found.map(({ at, column }, i) => ({
    skip: at - (i === 0 ? 1 : found[i - 1]!.at) - 1,
    values: table.columns[column],
    factor: column === 'pressurePa' ? PA_PER_MBAR : 1,
  }));
}

/** MM/DD/YYYY,HH:MM, then the picked columns. */
function readRow(scanner: ByteScanner, table: HourTable, picks: readonly Pick[]): void {
  const month = scanner.digits();
  const day = scanner.digits();
  scanner.digits();
  const hour = scanner.digits();
  scanner.digits();
  const at = table.place(month, day, hour, scanner.line);
  if (at < 0) return;
  for (const pick of picks) {
    scanner.skipFields(pick.skip);
    const value = scanner.number();
    pick.values[at] = value > MISSING_CODE ? value * pick.factor : NaN;
  }
}

function noHeader(row: number, problem: string): WeatherRefusal {
  return {
    ok: false,
    code: 'no-header',
    message: `Row ${row} of a TMY3 file is missing or incomplete: ${problem}. Put it back, then upload again.`,
    rows: [{ row, problem }],
  };
}
