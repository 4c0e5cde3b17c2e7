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

/**
 * Flow at which a pump's curve H = H0 (1 − (Q/Q0)²) meets the head of the loop, by bisection.
 * @param shutOffHeadM H0, head at no flow [m] above 0
 * @param greatestKgPerS Q0, flow at no head [kg/s] above 0
 * @param loopHeadM head of the loop over its flow [kg/s] → [m], rising
 * @returns flow [kg/s]; 0 when the pump cannot lift the water
 * @see running point of a centrifugal pump, ISO 17769-1 (terms); parabola through both ends: common practice, no source
 */
export function runningFlowKgPerS(
  shutOffHeadM: number,
  greatestKgPerS: number,
  loopHeadM: (flowKgPerS: number) => number,
): number {
  const surplusM = (flow: number) => shutOffHeadM * (1 - (flow / greatestKgPerS) ** 2) - loopHeadM(flow);
  if (surplusM(0) <= 0) return 0;
  let low = 0;
  let high = greatestKgPerS;
  for (let round = 0; round < 60; round++) {
    const middle = 0.5 * (low + high);
    if (surplusM(middle) > 0) low = middle;
    else high = middle;
  }
  return low;
}
