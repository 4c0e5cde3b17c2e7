import { GRAVITY_M_PER_S2, STANDARD_PRESSURE_PA, toRadians } from '@/lib/units/constants';
import {
  AIR_GAS_CONSTANT_J_PER_KG_K,
  AIR_SPECIFIC_HEAT_J_PER_KG_K,
  airConductivity,
  airViscosity,
} from './air';

/** Tilt up to which the correlation was measured; steeper gaps keep the value of 75° [°]. */
const STEEPEST_DEG = 75;
const CRITICAL_RAYLEIGH = 1708;

/** The two terms of the tilt in the correlation, taken out of the hour's loop. */
export interface GapTilt {
  cosine: number;
  /** sin^1.6(1.8 β) */
  sine: number;
}

/**
 * Terms of the tilt: cos β and sin^1.6(1.8 β).
 * @param tiltDeg tilt from the horizontal, hot side below [°] 0–90
 * @returns both terms [-]
 * @see Hollands, Unny, Raithby & Konicek, J. Heat Transfer 98 (1976) 189
 */
export function gapTilt(tiltDeg: number): GapTilt {
  const tilt = toRadians(Math.min(Math.max(tiltDeg, 0), STEEPEST_DEG));
  return { cosine: Math.cos(tilt), sine: Math.sin(1.8 * tilt) ** 1.6 };
}

/**
 * Nusselt number of an inclined air gap heated from below:
 * Nu = 1 + 1.44 (1 − 1708 sin^1.6(1.8 β)/R)(1 − 1708/R)⁺ + ((R/5830)^⅓ − 1)⁺, R = Ra cos β.
 * @param rayleigh Rayleigh number of the gap [-] up to 1e5
 * @param tilt terms of the tilt [-]
 * @returns Nusselt number [-] from 1
 * @remarks above 75° the value at 75° is held; heated from above the gap only conducts
 * @see Hollands, Unny, Raithby & Konicek, J. Heat Transfer 98 (1976) 189; Duffie & Beckman, 4th ed. 2013, eq. 3.11.4
 */
export function gapNusselt(rayleigh: number, tilt: GapTilt): number {
  const r = rayleigh * tilt.cosine;
  if (!(r > CRITICAL_RAYLEIGH)) return 1;
  const onset = 1.44 * (1 - (CRITICAL_RAYLEIGH * tilt.sine) / r) * (1 - CRITICAL_RAYLEIGH / r);
  const rolls = r > 5830 ? Math.cbrt(r / 5830) - 1 : 0;
  return 1 + onset + rolls;
}

/**
 * Convection across the gap per kelvin: h = Nu k/L, Ra = g ΔT L³/(T ν α) at the mean temperature.
 * @param lowerK temperature of the lower side, the absorber [K] 220–500
 * @param upperK temperature of the upper side, the cover [K] 220–500
 * @param gapM distance of both sides [m] 0.005–0.15
 * @param tilt terms of the tilt [-]
 * @param pressurePa pressure of the air in the gap [Pa]
 * @returns coefficient [W/(m²K)]
 * @see Hollands et al. (1976) as in `gapNusselt`; Duffie & Beckman, 4th ed. 2013, eq. 3.11.1–3.11.4
 */
export function gapConvection(
  lowerK: number,
  upperK: number,
  gapM: number,
  tilt: GapTilt,
  pressurePa = STANDARD_PRESSURE_PA,
): number {
  const meanK = (lowerK + upperK) / 2;
  const conductivity = airConductivity(meanK);
  const density = pressurePa / (AIR_GAS_CONSTANT_J_PER_KG_K * meanK);
  const perKelvin =
    (GRAVITY_M_PER_S2 * gapM ** 3 * density * density * AIR_SPECIFIC_HEAT_J_PER_KG_K) /
    (meanK * airViscosity(meanK) * conductivity);
  return (gapNusselt(perKelvin * (lowerK - upperK), tilt) * conductivity) / gapM;
}
