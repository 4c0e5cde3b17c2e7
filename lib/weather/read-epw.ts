import { completeYear } from '@/lib/weather/complete-year';
import { type HourColumn, HourTable } from '@/lib/weather/hour-table';
import { ByteScanner, splitFields } from '@/lib/weather/scan-bytes';
import type { ReadOptions, WeatherRefusal, WeatherResult } from '@/lib/weather/weather-result';

/** Fields of a row that are read: month, day, hour first; values from the missing code upwards are unknown. */
const STAMP_FIELDS = [1, 2, 3] as const;
const VALUE_FIELDS: readonly (readonly [field: number, column: HourColumn, missingCode: number])[] = [
  [6, 'dryBulbC', 99.9],
  [7, 'dewPointC', 99.9],
  [8, 'relativeHumidity', 999],
  [9, 'pressurePa', 999_999],
  [12, 'skyLongwaveWm2', 9999],
  [13, 'globalWm2', 9999],
  [14, 'beamNormalWm2', 9999],
  [15, 'diffuseWm2', 9999],
  [21, 'windMPerS', 999],
  [32, 'albedo', 999],
];
const FIELDS_READ = 33;

/** Header lines begin with a word, perhaps quoted, data rows with a year. */
function startsHeader(byte: number): boolean {
  const letter = (byte >= 65 && byte <= 90) || (byte >= 97 && byte <= 122);
  return letter || byte === 34 || byte === 10 || byte === 13;
}

/**
 * Reads an EPW file. Columns are taken by position; hours 1–24 name their end in local standard time, irradiance
 * is the sum of that hour [Wh/m²] and so its mean [W/m²], temperature and wind stand at the stamp.
 * @param bytes the file
 * @param options `repair: true` does what a refusal offered
 * @returns the year, or a refusal with row numbers of the file
 * @remarks header lines may be fewer than eight; only LOCATION is needed
 * @see EPW data dictionary published with the format (read as restated
 *   in two public field tables)
 */
export function readEpw(bytes: Uint8Array, options: ReadOptions = {}): WeatherResult {
  const scanner = new ByteScanner(bytes);
  const location = splitFields(scanner.textLine());
  const [latitudeDeg, longitudeDeg, timeZoneH, elevationM] = location.slice(6, 10).map(Number);
  const numbers = [latitudeDeg, longitudeDeg, timeZoneH, elevationM];
  const named = location[0]?.toUpperCase() === 'LOCATION' && location.length >= 10;
  if (!named || !numbers.every(Number.isFinite)) {
    return noLocation();
  }
  while (!scanner.atEnd && startsHeader(scanner.peek())) {
    const header = splitFields(scanner.textLine());
    const perHour = Number(header[2]);
    if (header[0]?.toUpperCase() === 'DATA PERIODS' && perHour > 1)
      return notHourly(perHour, scanner.line - 1);
  }
  const table = new HourTable();
  readRows(scanner, table);
  return completeYear(
    {
      name: location[1] || 'Unnamed place',
      source: 'epw',
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

function readRows(scanner: ByteScanner, table: HourTable): void {
  const wanted = new Uint8Array(FIELDS_READ);
  for (const field of [...STAMP_FIELDS, ...VALUE_FIELDS.map(([field]) => field)]) wanted[field] = 1;
  const targets = VALUE_FIELDS.map(([field, column, missingCode]) => ({
    field,
    values: table.columns[column],
    missingCode,
  }));
  const row = new Float64Array(FIELDS_READ);
  const [month, day, hour] = STAMP_FIELDS;
  for (; !scanner.atEnd; scanner.nextLine()) {
    if (scanner.blankLine()) continue;
    scanner.numbers(wanted, row);
    const at = table.place(row[month]!, row[day]!, row[hour]!, scanner.line);
    if (at < 0) continue;
    for (const { field, values, missingCode } of targets) {
      values[at] = row[field]! < missingCode ? row[field]! : NaN;
    }
  }
}

function noLocation(): WeatherRefusal {
  return {
    ok: false,
    code: 'no-header',
    message:
      'Row 1 should be the LOCATION line with latitude, longitude, time zone and altitude as its 7th to 10th field. Put it back, then upload again.',
    rows: [{ row: 1, problem: 'no LOCATION line with four numbers' }],
  };
}

function notHourly(perHour: number, row: number): WeatherRefusal {
  return {
    ok: false,
    code: 'not-hourly',
    message: `The file has ${perHour} records per hour; a weather year has one. Export it with hourly values.`,
    rows: [{ row, problem: `DATA PERIODS names ${perHour} records per hour` }],
  };
}
