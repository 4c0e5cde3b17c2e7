import { GRAVITY_M_PER_S2, WH_PER_KWH } from '@/lib/units/constants';

/**
 * Electric power to lift water: P = ṁ g H/η.
 * @param flowKgPerS mass flow ṁ [kg/s] from 0
 * @param headM head H, lift and friction together [m] from 0
 * @param efficiency hydraulic power/electric power η [-] 0.02–0.8
 * @returns electric power [W]
 * @see definition of pump efficiency, ISO 9906:2012, 3.2
 */
export function liftPowerW(flowKgPerS: number, headM: number, efficiency: number): number {
  return (flowKgPerS * GRAVITY_M_PER_S2 * headM) / efficiency;
}

/**
 * Head of friction: H = Δp/(ρ g).
 * @param pressurePa Δp [Pa] from 0
 * @param density of the water [kg/m³]
 * @returns head [m]
 * @see hydrostatics; ISO 9906:2012
 */
export function frictionHeadM(pressurePa: number, density: number): number {
  return pressurePa / (density * GRAVITY_M_PER_S2);
}

/**
 * Head while the array runs: with a vented top the whole lift is paid for ever, a siphon return gives it back.
 * @param liftM from the water level of the store to the top of the array [m] from 0
 * @param frictionM head of friction [m] from 0
 * @param siphonReturn whether the return runs full and closed
 * @returns head [m]
 * @see hydrostatics of an open drain-back loop; common practice, no source
 */
export function runningHeadM(liftM: number, frictionM: number, siphonReturn: boolean): number {
  return siphonReturn ? frictionM : liftM + frictionM;
}

/**
 * Electric energy of a pump: W = P t.
 * @param powerW electric power [W]
 * @param hours running time [h]
 * @returns energy [kWh]
 * @see definition of energy, ISO 80000-4:2019
 */
export function pumpEnergyKwh(powerW: number, hours: number): number {
  return (powerW * hours) / WH_PER_KWH;
}
