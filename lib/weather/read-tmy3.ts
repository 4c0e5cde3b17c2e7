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

/** One column to read: its field after date and time, and where its values go. */
interface Target {
  field: number;
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
  const targets = findColumns(names.slice(2), table);
  if (!Array.isArray(targets)) return targets;
  readRows(scanner, table, targets);
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

function findColumns(names: readonly string[], table: HourTable): Target[] | WeatherRefusal {
  const targets: Target[] = [];
  for (const [prefix, column, required] of COLUMN_PREFIXES) {
    const field = names.findIndex((name) => name.startsWith(prefix));
    if (field < 0 && required) return noHeader(2, `no column whose name begins with "${prefix}"`);
    const factor = column === 'pressurePa' ? PA_PER_MBAR : 1;
    if (field >= 0) targets.push({ field, values: table.columns[column], factor });
  }
  return targets;
}

/** MM/DD/YYYY,HH:MM, then the fields of the columns. */
function readRows(scanner: ByteScanner, table: HourTable, targets: readonly Target[]): void {
  const wanted = new Uint8Array(Math.max(...targets.map(({ field }) => field)) + 1);
  for (const { field } of targets) wanted[field] = 1;
  const row = new Float64Array(wanted.length);
  for (; !scanner.atEnd; scanner.nextLine()) {
    if (scanner.blankLine()) continue;
    const month = scanner.digits();
    const day = scanner.digits();
    scanner.digits();
    const hour = scanner.digits();
    scanner.digits();
    scanner.numbers(wanted, row);
    const at = table.place(month, day, hour, scanner.line);
    if (at < 0) continue;
    for (const { field, values, factor } of targets) {
      values[at] = row[field]! > MISSING_CODE ? row[field]! * factor : NaN;
    }
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
