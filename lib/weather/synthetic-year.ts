import { splitGlobal } from '@/lib/sun/diffuse-fraction';
import { skyLongwaveWm2, skyTemperatureC } from '@/lib/sun/sky-temperature';
import { type SunYear, sunYear } from '@/lib/sun/sun-year';
import { HOURS_PER_DAY, HOURS_PER_YEAR } from '@/lib/units/constants';
import { standardPressurePa } from '@/lib/weather/air-pressure';
import { DEFAULT_ALBEDO } from '@/lib/weather/complete-year';
import { dewPointFromDailyMinimum } from '@/lib/weather/dew-point';
import { checkMonthlyClimate, type MonthlyClimate } from '@/lib/weather/monthly-climate';
import { seededRandom } from '@/lib/weather/seeded-random';
import { syntheticGlobal } from '@/lib/weather/synthetic-irradiance';
import { syntheticTemperature } from '@/lib/weather/synthetic-temperature';
import { syntheticWind } from '@/lib/weather/synthetic-wind';
import type { WeatherResult } from '@/lib/weather/weather-result';
import type { WeatherYear } from '@/lib/weather/weather-year';

/** Irradiance stands for the hour from the row's start to its end. */
const SUN_SHIFT_H = -0.5;

/**
 * A year of 8,760 hours from twelve monthly means: the means are met exactly, days and hours are drawn with the
 * climate's seed. The same climate gives the same bytes.
 * @param climate monthly means of global irradiation, air temperature and wind, with the seed
 * @returns the year, always marked synthetic, or a refusal that names the month to correct
 * @see lib/weather/synthetic-irradiance.ts, synthetic-temperature.ts, synthetic-wind.ts; Erbs, Klein & Duffie 1982 (split)
 */
export function syntheticYear(climate: MonthlyClimate): WeatherResult {
  const refusal = checkMonthlyClimate(climate);
  if (refusal) return refusal;
  const sun = sunYear(climate, SUN_SHIFT_H);
  const random = seededRandom(climate.seed);
  const globalWm2 = syntheticGlobal(climate, sun, random);
  const dryBulbC = syntheticTemperature(climate, random);
  const windMPerS = syntheticWind(climate, random);
  const dewPointC = dryBulbC.map((_, h) => dewPointFromDailyMinimum(dryBulbC, h));
  const year: WeatherYear = {
    name: climate.name,
    source: 'synthetic',
    synthetic: true,
    latitudeDeg: climate.latitudeDeg,
    longitudeDeg: climate.longitudeDeg,
    timeZoneH: climate.timeZoneH,
    elevationM: climate.elevationM,
    sunShiftH: SUN_SHIFT_H,
    pointValues: 'interval',
    dryBulbC,
    globalWm2,
    ...splitYear(globalWm2, sun),
    windMPerS,
    dewPointC,
    skyLongwaveWm2: dryBulbC.map((air, h) =>
      skyLongwaveWm2(skyTemperatureC(air, dewPointC[h]!, (h % HOURS_PER_DAY) + 0.5)),
    ),
    pressurePa: new Float64Array(HOURS_PER_YEAR).fill(standardPressurePa(climate.elevationM)),
    albedo: new Float64Array(HOURS_PER_YEAR).fill(DEFAULT_ALBEDO),
    notes: [
      {
        kind: 'assumption',
        message:
          'Synthetic year: twelve monthly means are met exactly, days and hours are drawn. It is no measured weather and knows no real cold spell.',
      },
      {
        kind: 'assumption',
        message: `Beam and diffuse split by Erbs; dew point from the lowest temperature of the day; clear sky in the long-wave; ground reflectance ${DEFAULT_ALBEDO}.`,
      },
    ],
  };
  return { ok: true, year };
}

function splitYear(globalWm2: Float64Array, sun: SunYear): Pick<WeatherYear, 'beamNormalWm2' | 'diffuseWm2'> {
  const beamNormalWm2 = new Float64Array(HOURS_PER_YEAR);
  const diffuseWm2 = new Float64Array(HOURS_PER_YEAR);
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    const outside = sun.extraterrestrialNormalWm2[h]! * sun.sunlitFraction[h]!;
    const split = splitGlobal(globalWm2[h]!, sun.cosZenith[h]!, outside);
    beamNormalWm2[h] = split.beamNormalWm2;
    diffuseWm2[h] = split.diffuseWm2;
  }
  return { beamNormalWm2, diffuseWm2 };
}
