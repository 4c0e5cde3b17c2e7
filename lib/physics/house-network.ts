import { SECONDS_PER_HOUR } from '@/lib/units/constants';

/**
 * Simple hourly network of ISO 13790:2008 (five resistances, one capacity), with one slab node added for
 * heated floors. The coefficients, the node equations and the split of gains stand here once and are used
 * twice: by the standard's own hourly calculation (`hourly-need.ts`) and by the year loop.
 *
 * Air and surface nodes carry no capacity and are eliminated; mass and slab follow from a 2×2 system of the
 * trapezoidal rule, inverted in closed form whenever a coefficient changes.
 */

export type CapacityClass = 'very light' | 'light' | 'medium' | 'heavy' | 'very heavy';

/** A_m/A_f [-] and C_m/A_f [J/(m²K)] by class of heaviness (ISO 13790:2008, clause 12.3.1.2, table 12). */
export const CAPACITY_CLASSES: Record<CapacityClass, { massAreaRatio: number; capacityJPerM2K: number }> = {
  'very light': { massAreaRatio: 2.5, capacityJPerM2K: 80_000 },
  light: { massAreaRatio: 2.5, capacityJPerM2K: 110_000 },
  medium: { massAreaRatio: 2.5, capacityJPerM2K: 165_000 },
  heavy: { massAreaRatio: 3, capacityJPerM2K: 260_000 },
  'very heavy': { massAreaRatio: 3.5, capacityJPerM2K: 370_000 },
};

/** A_tot / A_f [-], h_is and h_ms [W/(m²K)] (ISO 13790:2008, clauses 7.2.2.2 and 12.2.2). */
const INTERNAL_AREA_RATIO = 4.5;
const SURFACE_TO_AIR_WPER_M2K = 3.45;
const MASS_TO_SURFACE_W_PER_M2K = 9.1;

/** Inputs that fix the coupling coefficients of a house. */
export interface NetworkInput {
  floorAreaM2: number;
  capacityClass: CapacityClass;
  /** opaque transmission H_op [W/K], below H_ms */
  opaqueWPerK: number;
  /** windows and doors H_w [W/K] */
  windowWPerK: number;
  /** heat capacity of the heated slab [J/K]; 0 without one */
  slabCapacityJPerK: number;
}

/** The network with its state; all temperatures in °C, conductances in W/K, heat flows in W. */
export class HouseNetwork {
  readonly hIs: number;
  readonly hMs: number;
  readonly hEm: number;
  readonly hW: number;
  readonly massCapacityJPerK: number;
  readonly slabCapacityJPerK: number;
  readonly gainToMass: number;
  readonly gainToSurface: number;
  readonly gainLost: number;

  /** state: temperature of mass and slab at the end of the last step */
  massC = 20.5;
  slabC = 20.5;
  /** mean of the last step */
  airC = 20.5;
  surfaceC = 20.5;
  massMeanC = 20.5;
  slabMeanC = 20.5;

  hVe = 0.5;
  private hFilm = 0.5;
  private airShare = 0.5;
  private h1 = 0.5;
  private surfaceSum = 0.5;
  private massTerm = 0.5;
  private slabTerm = 0.5;
  private m11 = 0.5;
  private m12 = 0.5;
  private m22 = 0.5;
  private massToSurface = 0.5;
  private slabToSurface = 0.5;
  private perAir = 0.5;
  private shared = 0.5;
  private toMass = 0.5;
  private toSlab = 0.5;
  private toAir = 0.5;
  private massRise = 0.5;
  private slabRise = 0.5;
  private surfaceRise = 0.5;
  private rise = 0.5;

  /**
   * Coupling coefficients of a house.
   *
   * `H_is = h_is A_tot`, `H_ms = h_ms A_m`, `H_em = 1/(1/H_op − 1/H_ms)`
   *
   * @param input areas [m²], conductances [W/K], capacity class
   * @see ISO 13790:2008, clauses 12.2.1 and 12.2.2, formulas (9), (63), (64)
   */
  constructor(input: NetworkInput) {
    const { massAreaRatio, capacityJPerM2K } = CAPACITY_CLASSES[input.capacityClass];
    const totalAreaM2 = INTERNAL_AREA_RATIO * input.floorAreaM2;
    const massAreaM2 = massAreaRatio * input.floorAreaM2;
    this.hIs = SURFACE_TO_AIR_WPER_M2K * totalAreaM2;
    this.hMs = MASS_TO_SURFACE_W_PER_M2K * massAreaM2;
    this.hEm = input.opaqueWPerK > 0 ? 1 / (1 / input.opaqueWPerK - 1 / this.hMs) : 0;
    this.hW = input.windowWPerK;
    this.massCapacityJPerK = capacityJPerM2K * input.floorAreaM2;
    this.slabCapacityJPerK = input.slabCapacityJPerK;
    this.gainToMass = massAreaM2 / totalAreaM2;
    this.gainLost = this.hW / (MASS_TO_SURFACE_W_PER_M2K * totalAreaM2);
    this.gainToSurface = 1 - this.gainToMass - this.gainLost;
  }

  /** Puts all nodes at one temperature [°C]. */
  reset(temperatureC: number): void {
    this.massC = this.slabC = this.airC = this.surfaceC = temperatureC;
    this.massMeanC = this.slabMeanC = temperatureC;
  }

  /**
   * Fixes what holds for the coming steps and inverts the 2×2 system.
   * @param ventilationWPerK H_ve [W/K] ≥ 0
   * @param filmWPerK slab surface to the surface node [W/K]; 0 without a heated floor
   * @param stepS step [s]
   * @see ISO 13790:2008, annex C, formulas (C.3) to (C.9), in the equivalent form of node equations
   */
  prepare(ventilationWPerK: number, filmWPerK: number, stepS: number): void {
    this.hVe = ventilationWPerK;
    this.hFilm = filmWPerK;
    this.airShare = this.hIs / (ventilationWPerK + this.hIs);
    this.h1 = this.airShare * ventilationWPerK;
    this.surfaceSum = this.h1 + this.hW + this.hMs + filmWPerK;
    this.massToSurface = this.hMs / this.surfaceSum;
    this.slabToSurface = filmWPerK / this.surfaceSum;
    this.perAir = 1 / (ventilationWPerK + this.hIs);
    this.massTerm = (2 * this.massCapacityJPerK) / stepS;
    this.slabTerm = filmWPerK > 0 ? (2 * this.slabCapacityJPerK) / stepS : 1;
    const a11 = this.massTerm + this.hMs - (this.hMs * this.hMs) / this.surfaceSum + this.hEm;
    const a12 = (-this.hMs * filmWPerK) / this.surfaceSum;
    const a22 = this.slabTerm + filmWPerK - (filmWPerK * filmWPerK) / this.surfaceSum;
    const determinant = a11 * a22 - a12 * a12;
    this.m11 = a22 / determinant;
    this.m12 = -a12 / determinant;
    this.m22 = a11 / determinant;
  }

  /**
   * Fixes outdoor air and the heat flows that do not come from the emitters, for the steps until the next call.
   * @param outdoorC θe [°C]
   * @param airSupplyC θsup [°C]
   * @param toAirW heat into the air node [W]
   * @param toSurfaceW heat into the surface node [W]
   * @param toMassW heat into the mass node [W]
   * @param toSlabW heat into the slab [W]
   */
  drive(
    outdoorC: number,
    airSupplyC: number,
    toAirW: number,
    toSurfaceW: number,
    toMassW: number,
    toSlabW = 0,
  ): void {
    const heat = this.h1 * airSupplyC + this.hW * outdoorC + this.airShare * toAirW + toSurfaceW;
    this.shared = heat / this.surfaceSum;
    this.toMass = this.hMs * this.shared + this.hEm * outdoorC + toMassW;
    this.toSlab = this.hFilm * this.shared + toSlabW;
    this.toAir = this.hVe * airSupplyC + toAirW;
  }

  /** Mean nodes of the coming step under what `drive` has fixed; leaves the state alone. */
  solve(): void {
    const right1 = this.massTerm * this.massC + this.toMass;
    const right2 = this.slabTerm * this.slabC + this.toSlab;
    const mass = this.m11 * right1 + this.m12 * right2;
    const slab = this.m12 * right1 + this.m22 * right2;
    const surface = this.shared + this.massToSurface * mass + this.slabToSurface * slab;
    this.massMeanC = mass;
    this.slabMeanC = slab;
    this.surfaceC = surface;
    this.airC = (this.toAir + this.hIs * surface) * this.perAir;
  }

  /**
   * Rise of the mean nodes of a step under added heat, kept for `add`.
   * @param toAirW [W]
   * @param toSurfaceW [W]
   * @param toSlabW [W]
   * @returns rise of the air [K]
   */
  airRise(toAirW: number, toSurfaceW: number, toSlabW: number): number {
    const shared = (this.airShare * toAirW + toSurfaceW) / this.surfaceSum;
    const right1 = this.hMs * shared;
    const right2 = this.hFilm * shared + toSlabW;
    const mass = this.m11 * right1 + this.m12 * right2;
    const slab = this.m12 * right1 + this.m22 * right2;
    const surface = shared + this.massToSurface * mass + this.slabToSurface * slab;
    const air = (this.hIs * surface + toAirW) * this.perAir;
    this.massRise = mass;
    this.slabRise = slab;
    this.surfaceRise = surface;
    this.rise = air;
    return air;
  }

  /** Adds a share of the heat last given to `airRise` to the step that `solve` has described; the network is linear. */
  add(share: number): void {
    this.massMeanC += share * this.massRise;
    this.slabMeanC += share * this.slabRise;
    this.surfaceC += share * this.surfaceRise;
    this.airC += share * this.rise;
  }

  /** Moves mass and slab to the end of the step that `solve` has just described. */
  advance(): void {
    this.massC = 2 * this.massMeanC - this.massC;
    this.slabC = 2 * this.slabMeanC - this.slabC;
  }

  /** Heat held by mass and slab above 0 °C [J]. */
  heatJ(): number {
    return this.massCapacityJPerK * this.massC + this.slabCapacityJPerK * this.slabC;
  }
}

/** One hour of the standard's own calculation. */
export interface HourlyNeedHour {
  outdoorC: number;
  internalW: number;
  solarW: number;
}

/**
 * The standard's own hourly calculation with ideal set point: heat goes straight to the air node, air is held
 * at the set point with at most `maximumW`. Offered in the app as such and used to check the year loop.
 *
 * @param input the house
 * @param ventilationWPerK H_ve [W/K]
 * @param hours any number of hours
 * @param setC set point of the air [°C]
 * @param maximumW available power [W]
 * @param startC temperature of the mass before the first hour [°C]
 * @returns need per hour [W], air temperature per hour [°C]
 * @see ISO 13790:2008, clause 7.2 and annex C.4
 */
export function hourlyNeed(
  input: NetworkInput,
  ventilationWPerK: number,
  hours: readonly HourlyNeedHour[],
  setC: number,
  maximumW = Infinity,
  startC = 20,
): { needW: Float64Array; airC: Float64Array; network: HouseNetwork } {
  const network = new HouseNetwork({ ...input, slabCapacityJPerK: 0 });
  network.reset(startC);
  network.prepare(ventilationWPerK, 0, SECONDS_PER_HOUR);
  const needW = new Float64Array(hours.length);
  const airC = new Float64Array(hours.length);
  const risePerW = network.airRise(1, 0, 0);
  for (let h = 0; h < hours.length; h++) {
    const { outdoorC, internalW, solarW } = hours[h]!;
    const shared = 0.5 * internalW + solarW;
    const toAir = 0.5 * internalW;
    const toSurface = network.gainToSurface * shared;
    const toMass = network.gainToMass * shared;
    network.drive(outdoorC, outdoorC, toAir, toSurface, toMass);
    network.solve();
    const need = Math.min(maximumW, Math.max(0, (setC - network.airC) / risePerW));
    if (need > 0) network.add(need);
    network.advance();
    needW[h] = need;
    airC[h] = network.airC;
  }
  return { needW, airC, network };
}
