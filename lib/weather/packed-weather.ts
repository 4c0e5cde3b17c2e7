import { WEATHER_COLUMNS, weatherFacts } from './weather-header';
import type { WeatherColumn, WeatherFacts } from './weather-header';
import type { WeatherYear } from './weather-year';

const HOURS = 8760;
const LENGTH_BYTES = 4;

/**
 * Packs a weather year for the wire: the length of a JSON header as a little-endian uint32, the header (UTF-8),
 * then the columns of `WEATHER_COLUMNS` one after another as little-endian float64.
 * @param year weather year [8760 rows]
 * @returns packed bytes [-]
 */
export function encodeWeatherYear(year: WeatherYear): Uint8Array<ArrayBuffer> {
  const header = new TextEncoder().encode(JSON.stringify(weatherFacts(year)));
  const columnBytes = HOURS * Float64Array.BYTES_PER_ELEMENT;
  const start = LENGTH_BYTES + header.byteLength;
  const packed = new Uint8Array(start + WEATHER_COLUMNS.length * columnBytes);
  new DataView(packed.buffer).setUint32(0, header.byteLength, true);
  packed.set(header, LENGTH_BYTES);
  WEATHER_COLUMNS.forEach((name, i) => {
    const column = year[name];
    packed.set(new Uint8Array(column.buffer, column.byteOffset, column.byteLength), start + i * columnBytes);
  });
  return packed;
}

/**
 * Reads what `encodeWeatherYear` packed.
 * @param packed bytes as they came over the wire [-]
 * @returns weather year, or undefined when the bytes are cut short or not of this form [-]
 */
export function decodeWeatherYear(packed: ArrayBuffer): WeatherYear | undefined {
  if (packed.byteLength < LENGTH_BYTES) return undefined;
  const columnBytes = HOURS * Float64Array.BYTES_PER_ELEMENT;
  const start = LENGTH_BYTES + new DataView(packed).getUint32(0, true);
  if (packed.byteLength !== start + WEATHER_COLUMNS.length * columnBytes) return undefined;
  const facts = JSON.parse(
    new TextDecoder().decode(new Uint8Array(packed, LENGTH_BYTES, start - LENGTH_BYTES)),
  ) as WeatherFacts;
  const columns = WEATHER_COLUMNS.map((name, i) => {
    const from = start + i * columnBytes;
    return [name, new Float64Array(packed.slice(from, from + columnBytes))] as const;
  });
  return { ...facts, ...(Object.fromEntries(columns) as Record<WeatherColumn, Float64Array>) };
}
