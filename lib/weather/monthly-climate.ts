import { dailyExtraterrestrialWhPerM2 } from '@/lib/sun/extraterrestrial';
import { DAYS_IN_MONTH, WH_PER_KWH } from '@/lib/units/constants';
import { MONTH_NAMES } from '@/lib/weather/month-names';
import type { WeatherRefusal } from '@/lib/weather/weather-result';

/** Twelve monthly means that a synthetic year is made from. */
export interface MonthlyClimate {
  id: string;
  name: string;
  /** north positive [°] */
  latitudeDeg: number;
  /** east positive [°] */
  longitudeDeg: number;
  /** local standard time − UTC [h] */
  timeZoneH: number;
  elevationM: number;
  /** mean daily global irradiation on the horizontal of each month [kWh/(m² d)] */
  globalKwhPerM2Day: readonly number[];
  /** mean air temperature of each month [°C] */
  dryBulbC: readonly number[];
  /** mean wind speed of each month at 10 m [m/s] */
  windMPerS: readonly number[];
  /** the same seed gives the same year */
  seed: number;
}

/** Clearness of a month that the daily distribution is defined for [-]. */
const MIN_MONTHLY_CLEARNESS = 0.1;
const MAX_MONTHLY_CLEARNESS = 0.8;
/** Less than this outside the atmosphere is polar night [Wh/m²]. */
const POLAR_NIGHT_WH = 100;

/**
 * Mean daily irradiation outside the atmosphere in a month, day by day.
 * @param latitudeDeg φ [°] −90…90
 * @param month 0 = January … 11
 * @returns H̄0 [Wh/m²]
 * @see J. A. Duffie & W. A. Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, sec. 1.10
 */
export function monthlyExtraterrestrialWhPerM2(latitudeDeg: number, month: number): number {
  const firstDay = DAYS_IN_MONTH.slice(0, month).reduce((a, b) => a + b, 1);
  const days = DAYS_IN_MONTH[month]!;
  let sum = 0;
  for (let day = firstDay; day < firstDay + days; day++)
    sum += dailyExtraterrestrialWhPerM2(latitudeDeg, day);
  return sum / days;
}

/**
 * Clearness of a month: K̄ = H̄/H̄0.
 * @param climate the monthly means
 * @param month 0 = January … 11
 * @returns K̄ [-]; 0 in the polar night
 * @see J. A. Duffie & W. A. Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, eq. 2.9.1
 */
export function monthlyClearness(climate: MonthlyClimate, month: number): number {
  const outside = monthlyExtraterrestrialWhPerM2(climate.latitudeDeg, month);
  return outside < POLAR_NIGHT_WH ? 0 : (climate.globalKwhPerM2Day[month]! * WH_PER_KWH) / outside;
}

/**
 * Whether a year can be made from the means.
 * @param climate the monthly means
 * @returns null, or a refusal that names the month and what it may be
 * @see lib/weather/daily-clearness.ts (range of K̄)
 */
export function checkMonthlyClimate(climate: MonthlyClimate): WeatherRefusal | null {
  const refuse = (message: string): WeatherRefusal => ({ ok: false, code: 'monthly-means', message });
  if (Math.abs(climate.latitudeDeg) > 90) return refuse('Latitude must lie between −90 and 90 degrees.');
  for (let month = 0; month < 12; month++) {
    const name = MONTH_NAMES[month]!;
    const global = climate.globalKwhPerM2Day[month] ?? NaN;
    const air = climate.dryBulbC[month] ?? NaN;
    const wind = climate.windMPerS[month] ?? NaN;
    if (!(air >= -60 && air <= 45)) return refuse(`${name}: type a mean air temperature from −60 to 45 °C.`);
    if (!(wind >= 0 && wind <= 20)) return refuse(`${name}: type a mean wind speed from 0 to 20 m/s.`);
    const outside = monthlyExtraterrestrialWhPerM2(climate.latitudeDeg, month) / WH_PER_KWH;
    if (outside * WH_PER_KWH < POLAR_NIGHT_WH && global >= 0) continue;
    const least = MIN_MONTHLY_CLEARNESS * outside;
    const most = MAX_MONTHLY_CLEARNESS * outside;
    if (!(global >= least && global <= most)) {
      return refuse(
        `${name}: type a mean daily global irradiation from ${least.toFixed(1)} to ${most.toFixed(1)} kWh/m² for latitude ${climate.latitudeDeg}°.`,
      );
    }
  }
  return null;
}
