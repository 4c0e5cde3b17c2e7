import { completeYear } from '@/lib/weather/complete-year';
import { HourTable } from '@/lib/weather/hour-table';
import { ByteScanner, splitFields } from '@/lib/weather/scan-bytes';
import type { ReadOptions, WeatherRefusal, WeatherResult } from '@/lib/weather/weather-result';

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
  if (location.length < 10 || ![latitudeDeg, longitudeDeg, timeZoneH, elevationM].every(Number.isFinite)) {
    return noLocation();
  }
  while (!scanner.atEnd && startsHeader(scanner.peek())) {
    const header = splitFields(scanner.textLine());
    const perHour = Number(header[2]);
    if (header[0]?.toUpperCase() === 'DATA PERIODS' && perHour > 1)
      return notHourly(perHour, scanner.line - 1);
  }
  const table = new HourTable();
  while (!scanner.atEnd) {
    if (!scanner.blankLine()) readRow(scanner, table);
    scanner.nextLine();
  }
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

/** 35 fields: 1–3 month, day, hour; 6–9 air; 12 long-wave; 13–15 irradiance; 21 wind; 32 albedo. */
function readRow(scanner: ByteScanner, table: HourTable): void {
  scanner.skipFields(1);
  const month = scanner.number();
  const day = scanner.number();
  const hour = scanner.number();
  const at = table.place(month, day, hour, scanner.line);
  if (at < 0) return;
  const { columns } = table;
  scanner.skipFields(2);
  columns.dryBulbC[at] = below(scanner.number(), 99.9);
  columns.dewPointC[at] = below(scanner.number(), 99.9);
  columns.relativeHumidity[at] = below(scanner.number(), 999);
  columns.pressurePa[at] = below(scanner.number(), 999_999);
  scanner.skipFields(2);
  columns.skyLongwaveWm2[at] = below(scanner.number(), 9999);
  columns.globalWm2[at] = below(scanner.number(), 9999);
  columns.beamNormalWm2[at] = below(scanner.number(), 9999);
  columns.diffuseWm2[at] = below(scanner.number(), 9999);
  scanner.skipFields(5);
  columns.windMPerS[at] = below(scanner.number(), 999);
  scanner.skipFields(10);
  columns.albedo[at] = below(scanner.number(), 999);
}

/** Values from the missing code upwards are unknown. */
function below(value: number, missingCode: number): number {
  return value < missingCode ? value : NaN;
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
