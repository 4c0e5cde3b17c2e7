import { GRAVITY_M_PER_S2 } from '@/lib/units/constants';

/** Water in motion. */
export interface Fluid {
  /** [kg/m³] */
  density: number;
  /** dynamic viscosity [Pa s] */
  viscosity: number;
}

const LAMINAR_BELOW = 2300;
const TURBULENT_ABOVE = 4000;
const MOST_ROUNDS = 50;

/**
 * Mean velocity in a round bore: v = Q/(π d²/4).
 * @param flowM3PerS volume flow [m³/s] from 0
 * @param boreM inner diameter [m] above 0
 * @returns velocity [m/s]
 * @see continuity; ISO 80000-4:2019
 */
export function flowVelocity(flowM3PerS: number, boreM: number): number {
  return (4 * flowM3PerS) / (Math.PI * boreM * boreM);
}

/**
 * Reynolds number: Re = ρ v d/μ.
 * @param velocityMPerS mean velocity [m/s] from 0
 * @param boreM inner diameter [m] above 0
 * @param fluid density [kg/m³] and viscosity [Pa s]
 * @returns Reynolds number [-]
 * @see ISO 80000-11:2019, Reynolds number
 */
export function reynoldsNumber(velocityMPerS: number, boreM: number, fluid: Fluid): number {
  return (fluid.density * velocityMPerS * boreM) / fluid.viscosity;
}

/**
 * Darcy friction factor: 64/Re below 2300; above 4000 Colebrook, 1/√f = −2 lg(ε/(3.7 d) + 2.51/(Re √f)), by
 * Newton's rule on 1/√f; a straight line between.
 * @param reynolds Reynolds number [-] above 0
 * @param relativeRoughness ε/d [-] 0–0.05
 * @returns Darcy friction factor [-]
 * @see Colebrook, J. Inst. Civil Eng. 11 (1939) 133; Hagen–Poiseuille for laminar flow
 */
export function frictionFactor(reynolds: number, relativeRoughness: number): number {
  if (reynolds < LAMINAR_BELOW) return 64 / reynolds;
  if (reynolds < TURBULENT_ABOVE) {
    const share = (reynolds - LAMINAR_BELOW) / (TURBULENT_ABOVE - LAMINAR_BELOW);
    return (1 - share) * (64 / LAMINAR_BELOW) + share * frictionFactor(TURBULENT_ABOVE, relativeRoughness);
  }
  const rough = relativeRoughness / 3.7;
  const smooth = 2.51 / reynolds;
  let x = 7;
  for (let round = 0; round < MOST_ROUNDS; round++) {
    const inner = rough + smooth * x;
    const change = (x + 2 * Math.log10(inner)) / (1 + (2 * smooth) / (inner * Math.LN10));
    x -= change;
    if (Math.abs(change) < 1e-12) break;
  }
  return 1 / (x * x);
}

/** A run of pipe with its fittings. */
export interface PipeRun {
  lengthM: number;
  boreM: number;
  /** roughness of the wall ε [m]; drawn copper and plastic 1.5e-6 */
  roughnessM: number;
  /** sum of the loss coefficients of fittings ΣK [-] */
  fittings: number;
}

/**
 * Pressure lost in a pipe: Δp = (f L/d + ΣK) ½ρv².
 * @param run length and bore [m], roughness [m], fittings [-]
 * @param flowM3PerS volume flow [m³/s] from 0
 * @param fluid density [kg/m³] and viscosity [Pa s]
 * @returns pressure difference [Pa]
 * @see Darcy–Weisbach equation
 */
export function pressureDropPa(run: PipeRun, flowM3PerS: number, fluid: Fluid): number {
  if (!(flowM3PerS > 0)) return 0;
  const velocity = flowVelocity(flowM3PerS, run.boreM);
  const friction = frictionFactor(reynoldsNumber(velocity, run.boreM, fluid), run.roughnessM / run.boreM);
  return ((friction * run.lengthM) / run.boreM + run.fittings) * 0.5 * fluid.density * velocity * velocity;
}

/**
 * Velocity at which a full pipe drains by its fall: v = √(2 g d S/f), friction equal to the fall.
 * @param boreM inner diameter d [m] above 0
 * @param slope fall per length S [-] 0.005–1
 * @param fluid density [kg/m³] and viscosity [Pa s]
 * @param roughnessM roughness of the wall [m]
 * @returns velocity [m/s]
 * @see Darcy–Weisbach equation with the friction factor of Colebrook
 */
export function drainVelocity(boreM: number, slope: number, fluid: Fluid, roughnessM = 0): number {
  let velocity = 0.5;
  for (let round = 0; round < MOST_ROUNDS; round++) {
    const friction = frictionFactor(reynoldsNumber(velocity, boreM, fluid), roughnessM / boreM);
    const next = Math.sqrt((2 * GRAVITY_M_PER_S2 * boreM * slope) / friction);
    const settled = Math.abs(next - velocity) < 1e-10;
    velocity = next;
    if (settled) break;
  }
  return velocity;
}
