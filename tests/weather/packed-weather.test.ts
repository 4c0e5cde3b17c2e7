import { describe, expect, it } from 'vitest';
import { decodeWeatherYear, encodeWeatherYear } from '@/lib/weather/packed-weather';
import { WEATHER_COLUMNS, weatherFacts } from '@/lib/weather/weather-header';
import { readWeather } from '@/lib/weather/read-weather';
import { epwText } from '@/tests/fakes/epw-text';

const read = readWeather(new TextEncoder().encode(epwText()));

describe('packed weather year', () => {
  it('comes back as it went', () => {
    if (!read.ok) throw new Error(read.message);
    const back = decodeWeatherYear(encodeWeatherYear(read.year).buffer);
    expect(back && weatherFacts(back)).toEqual(weatherFacts(read.year));
    for (const column of WEATHER_COLUMNS) {
      expect(
        Buffer.compare(Buffer.from(back![column].buffer), Buffer.from(read.year[column].buffer)),
        column,
      ).toBe(0);
    }
  });

  it('is refused when cut short or something else', () => {
    if (!read.ok) throw new Error(read.message);
    const packed = encodeWeatherYear(read.year).buffer;
    expect(decodeWeatherYear(packed.slice(0, packed.byteLength - 8))).toBeUndefined();
    expect(decodeWeatherYear(new ArrayBuffer(2))).toBeUndefined();
    expect(decodeWeatherYear(new ArrayBuffer(100))).toBeUndefined();
  });
});
