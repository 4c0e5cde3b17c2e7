import { describe, expect, it } from 'vitest';
import { planeYear } from '@/lib/sun/plane-year';
import { type SunYear, sunYear } from '@/lib/sun/sun-year';
import { MONTH_START_HOUR } from '@/lib/units/constants';
import { readWeather } from '@/lib/weather/read-weather';
import type { WeatherYear } from '@/lib/weather/weather-year';
import { sharedWeather } from './shared-weather';

const kwh = (values: Float64Array): number => values.reduce((a, b) => a + b, 0) / 1000;
const mean = (values: Float64Array): number => values.reduce((a, b) => a + b, 0) / values.length;

/** Root mean square of G − (D + B cos θz) for zenith angles below 80°. */
function closureRms(year: WeatherYear, sun: SunYear): number {
  let squares = 0;
  let n = 0;
  for (let h = 0; h < 8760; h++) {
    if (sun.zenithDeg[h]! >= 80 || year.globalWm2[h]! <= 0) continue;
    const sum = year.diffuseWm2[h]! + year.beamNormalWm2[h]! * sun.cosZenith[h]!;
    squares += (year.globalWm2[h]! - sum) ** 2;
    n++;
  }
  return Math.sqrt(squares / n);
}

if (!sharedWeather.present) {
  it.skip(sharedWeather.absentLine);
} else {
  // figures of ../shared/weather/expected.json, computed independently of the product
  describe.each(['USA_IL_Chicago_TMY3.epw', '724666TYA.CSV'])('%s', (file) => {
    const result = readWeather(sharedWeather.bytes(file));
    if (!result.ok) throw new Error(result.message);
    const { year } = result;
    const expected = sharedWeather.expected(file);
    const sun = sunYear(year, year.sunShiftH);

    it('has the place, sums, means and extremes', () => {
      expect(year.latitudeDeg).toBe(expected.lat);
      expect(year.longitudeDeg).toBe(expected.lon);
      expect(year.timeZoneH).toBe(expected.tz_h);
      expect(year.elevationM).toBe(expected.elev_m);
      expect(kwh(year.globalWm2)).toBeCloseTo(expected.ghi_kwh, 1);
      expect(kwh(year.diffuseWm2)).toBeCloseTo(expected.dhi_kwh, 1);
      expect(kwh(year.beamNormalWm2)).toBeCloseTo(expected.dni_kwh, 1);
      expect(mean(year.dryBulbC)).toBeCloseTo(expected.t_mean, 2);
      expect(Math.min(...year.dryBulbC)).toBe(expected.t_min);
      expect(Math.max(...year.dryBulbC)).toBe(expected.t_max);
      const degreeHours = year.dryBulbC.reduce((sum, air) => sum + Math.max(0, 15 - air), 0);
      expect(Math.abs(degreeHours - expected.hdh15_Kh)).toBeLessThan(0.1);
    });

    it('has the twelve months', () => {
      expected.monthly.forEach((month, i) => {
        const [from, to] = [MONTH_START_HOUR[i]!, MONTH_START_HOUR[i + 1]!];
        expect(Math.abs(kwh(year.globalWm2.subarray(from, to)) - month.ghi_kwh)).toBeLessThan(0.006);
        expect(Math.abs(mean(year.dryBulbC.subarray(from, to)) - month.t_mean)).toBeLessThan(0.006);
      });
    });

    it('closes at its nominal shift and nowhere near as well half an hour off', () => {
      const rms = closureRms(year, sun);
      // the sun moves by 2025 here and by each row's own year there: a quarter of a day of declination apart
      expect(Math.abs(rms - expected.closure.rms)).toBeLessThan(0.7);
      expect(closureRms(year, sunYear(year, 0))).toBeGreaterThan(9 * rms);
      expect(closureRms(year, sunYear(year, -1))).toBeGreaterThan(9 * rms);
    });

    it('gives the irradiation on a plane of 60° within 0.3 %, HDKR between Hay-Davies and Perez', () => {
      const plane = { tiltDeg: 60, azimuthDeg: expected.poa60_kwh.surface_azimuth_from_north };
      const on = (model: Parameters<typeof planeYear>[3]): number =>
        kwh(planeYear(year, sun, plane, model, 0.2).totalWm2);
      const relative = (found: number, wanted: number): number => Math.abs(found / wanted - 1);
      expect(relative(on('isotropic'), expected.poa60_kwh.isotropic)).toBeLessThan(0.003);
      expect(relative(on('hay-davies'), expected.poa60_kwh.hay_davies)).toBeLessThan(0.003);
      expect(relative(on('perez'), expected.poa60_kwh.perez1990)).toBeLessThan(0.003);
      expect(on('hdkr')).toBeGreaterThan(on('hay-davies'));
      expect(on('hdkr')).toBeLessThan(on('perez'));
    });
  });
}
