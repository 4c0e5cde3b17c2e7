import { DAYS_PER_YEAR, HOURS_PER_DAY, J_PER_KWH } from '@/lib/units/constants';
import { WATER_SPECIFIC_HEAT_J_PER_KG_K } from './water';

/** Load profiles of the European label for water heaters. */
export type TappingProfile = 'S' | 'M' | 'L' | 'XL';

/** Heat tapped in each hour of the day [kWh], hour 0 first; cold water at 10 °C. */
// prettier-ignore
const HOURLY_KWH: Record<TappingProfile, readonly number[]> = {
  S: [0, 0, 0, 0, 0, 0, 0, 0.21, 0.105, 0.105, 0, 0.21, 0.315, 0, 0, 0, 0, 0, 0.21, 0, 0.42, 0.525, 0, 0],
  M: [0, 0, 0, 0, 0, 0, 0, 1.61, 0.42, 0.21, 0.105, 0.21, 0.315, 0, 0.105, 0.105, 0.105, 0, 0.315, 0.105, 0.735, 1.505, 0, 0],
  L: [0, 0, 0, 0, 0, 0, 0, 1.715, 3.92, 0.21, 0.105, 0.21, 0.315, 0, 0.105, 0.105, 0.105, 0, 0.315, 0.105, 0.735, 3.71, 0, 0],
  XL: [0, 0, 0, 0, 0, 0, 0, 6.45, 0.42, 0.21, 0.21, 0.315, 0.735, 0, 0.105, 0.21, 0.21, 0.105, 0.315, 0.105, 5.155, 4.525, 0, 0],
};

/**
 * Heat tapped in each hour of a day of the load profile.
 * @param profile S, M, L or XL
 * @returns 24 hourly sums [kWh], hour 0 first
 * @see Regulation (EU) 814/2013, Annex III, table 1 (schedule from memory; sums equal the published Q_ref)
 */
export function tappingHeatKwh(profile: TappingProfile): readonly number[] {
  return HOURLY_KWH[profile];
}

/**
 * Share of the day's hot water in each hour.
 * @param profile S, M, L or XL
 * @returns 24 shares [-], sum 1
 * @see Regulation (EU) 814/2013, Annex III, table 1 (schedule from memory)
 */
export function tappingShares(profile: TappingProfile): Float64Array {
  const hours = HOURLY_KWH[profile];
  const day = hours.reduce((sum, kwh) => sum + kwh, 0);
  return Float64Array.from({ length: HOURS_PER_DAY }, (_, hour) => hours[hour]! / day);
}

/**
 * Heat to warm tapped water: Q = m cp (θ_tap − θ_cold).
 * @param massKg m [kg] from 0
 * @param tapC θ_tap [°C]
 * @param coldC θ_cold [°C]
 * @returns heat [kWh]
 * @see energy balance; EN 12831-3
 */
export function tapHeatKwh(massKg: number, tapC: number, coldC: number): number {
  return (massKg * WATER_SPECIFIC_HEAT_J_PER_KG_K * (tapC - coldC)) / J_PER_KWH;
}

/**
 * Water that a heat warms: m = Q/(cp (θ_tap − θ_cold)).
 * @param heatKwh Q [kWh] from 0
 * @param tapC θ_tap [°C] above cold
 * @param coldC θ_cold [°C]
 * @returns mass [kg]
 * @see energy balance; EN 12831-3
 */
export function tappedMassKg(heatKwh: number, tapC: number, coldC: number): number {
  return (heatKwh * J_PER_KWH) / (WATER_SPECIFIC_HEAT_J_PER_KG_K * (tapC - coldC));
}

/**
 * Share of hot water in mixed water: (θ_mix − θ_cold)/(θ_hot − θ_cold), held to 0–1.
 * @param mixedC θ_mix [°C]
 * @param hotC θ_hot [°C]
 * @param coldC θ_cold [°C]
 * @returns share [-]
 * @see energy balance of a mixing valve; EN 1111
 */
export function hotShare(mixedC: number, hotC: number, coldC: number): number {
  if (!(hotC > coldC)) return 1;
  return Math.min(1, Math.max(0, (mixedC - coldC) / (hotC - coldC)));
}

/**
 * Cold water of the mains over the year: θ = θ_mean + Δ sin(2π (d − 137)/365).
 * @param meanC yearly mean θ_mean [°C] 3–30
 * @param amplitudeK Δ [K] 0–12
 * @param dayOfYear d [-] 1–365
 * @param southern whether the seasons are those of the southern half of the Earth
 * @returns temperature [°C]; warmest about day 228 in the north
 * @see EN 12976-2, Annex B, reference conditions (from memory)
 */
export function mainsC(meanC: number, amplitudeK: number, dayOfYear: number, southern = false): number {
  const season = southern ? DAYS_PER_YEAR / 2 : 0;
  return meanC + amplitudeK * Math.sin((2 * Math.PI * (dayOfYear - 137 - season)) / DAYS_PER_YEAR);
}
