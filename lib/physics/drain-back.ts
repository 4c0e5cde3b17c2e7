import { GRAVITY_M_PER_S2 } from '@/lib/units/constants';
import { airPressureAtAltitude } from './air';
import {
  HOT_WATER_DENSITY_KG_PER_M3,
  boilingTemperatureC,
  waterDensity,
  waterSaturationPressure,
} from './water';

/** Return velocity from which water sweeps the air along and a siphon forms: 2 ft/s [m/s]. */
export const SIPHON_VELOCITY_M_PER_S = 0.6096;

/** Least fall of outdoor pipes and headers: 1/4 inch per foot, rounded down [-]. */
export const LEAST_FALL = 0.02;

/**
 * Greatest height of a full siphon return above the water level before the water at the top boils:
 * H = (p_air + Δp − p_v)/(ρ g).
 * @param waterC temperature at the outlet of the array [°C] 0.5–99.5
 * @param altitudeM height of the site above the sea [m] −400–5000
 * @param extraPressurePa pressure of a closed air space above that of the air [Pa]
 * @returns height [m]; negative when the water boils at the level itself
 * @remarks friction in the return adds a margin that is left out
 * @see hydrostatics with IAPWS-IF97 vapour pressure; ISO 2533 air pressure
 */
export function siphonLimitM(waterC: number, altitudeM = 0, extraPressurePa = 0): number {
  const pressure = airPressureAtAltitude(altitudeM) + extraPressurePa - waterSaturationPressure(waterC);
  return pressure / (waterDensity(waterC) * GRAVITY_M_PER_S2);
}

/**
 * Boiling temperature at the top of a full siphon return: T_sat(p_air − ρ g h).
 * @param heightM height above the water level of the store [m] 0–8
 * @param altitudeM height of the site above the sea [m] −400–5000
 * @param density of the hanging water [kg/m³]
 * @returns temperature [°C]
 * @see hydrostatics with IAPWS-IF97 saturation temperature; ISO 2533 air pressure
 */
export function siphonBoilingC(
  heightM: number,
  altitudeM = 0,
  density = HOT_WATER_DENSITY_KG_PER_M3,
): number {
  return boilingTemperatureC(airPressureAtAltitude(altitudeM) - density * GRAVITY_M_PER_S2 * heightM);
}

/**
 * Air space that the store or vessel needs above its running level:
 * V = (V_array + V_pipe + V_total (ρ_cold/ρ_hot − 1)) (1 + margin).
 * @param arrayL water of the array [L]
 * @param outdoorPipeL water of the pipes above the level [L]
 * @param totalL all water of the loop and store [L]
 * @param coldC temperature of filling [°C] 0.5–99.5
 * @param hotC highest temperature [°C] 0.5–99.5
 * @param margin share on top [-] 0–0.5
 * @returns air space [L]
 * @see volume balance with IAPWS-IF97 densities; margin 0.15 is common practice, no source
 */
export function airSpaceL(
  arrayL: number,
  outdoorPipeL: number,
  totalL: number,
  coldC: number,
  hotC: number,
  margin = 0.15,
): number {
  const expansion = totalL * (waterDensity(coldC) / waterDensity(hotC) - 1);
  return (arrayL + outdoorPipeL + expansion) * (1 + margin);
}

/**
 * Stop difference below which a running array hunts: ΔT_off ≤ ΔT_on A FR UL/(ε ṁ cp).
 * @param startK start difference ΔT_on [K] above 0
 * @param lossWPerM2K FR UL [W/(m²K)] above 0
 * @param capacityFlowWPerM2K ṁ cp per area [W/(m²K)] above 0
 * @param effectiveness of an exchanger in the loop, 1 without one [-]
 * @returns greatest stop difference without hunting [K]
 * @remarks stricter than practice, which relies on a minimum run time: short runs at dawn are expected
 * @see Duffie & Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, eq. 10.4.4 (from memory)
 */
export function steadyStopDifferenceK(
  startK: number,
  lossWPerM2K: number,
  capacityFlowWPerM2K: number,
  effectiveness = 1,
): number {
  return (startK * lossWPerM2K) / (effectiveness * capacityFlowWPerM2K);
}
