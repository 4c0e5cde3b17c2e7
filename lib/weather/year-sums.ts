import { WH_PER_KWH } from '@/lib/units/constants';
import type { WeatherYear } from './weather-year';

export interface YearSums {
  /** [kWh/m²] on the horizontal */
  globalKwhPerM2: number;
  meanOutdoorC: number;
  coldestC: number;
  hottestC: number;
  meanWindMPerS: number;
}

function mean(column: Float64Array): number {
  return column.reduce((sum, value) => sum + value, 0) / column.length;
}

/**
 * Sums and extremes by which people see at once whether a year is that of their place.
 * @param year weather year [8760 rows]
 * @returns irradiation [kWh/m²], temperatures [°C], wind [m/s]
 * @remarks Sums of the rows as read; no model.
 * @see plain sums, no source needed
 */
export function yearSums(year: WeatherYear): YearSums {
  return {
    globalKwhPerM2: year.globalWm2.reduce((sum, value) => sum + value, 0) / WH_PER_KWH,
    meanOutdoorC: mean(year.dryBulbC),
    coldestC: year.dryBulbC.reduce((least, value) => Math.min(least, value), Infinity),
    hottestC: year.dryBulbC.reduce((most, value) => Math.max(most, value), -Infinity),
    meanWindMPerS: mean(year.windMPerS),
  };
}
