import { L_PER_M3, SECONDS_PER_HOUR } from '@/lib/units/constants';

/** A store as far as its loss goes. */
export interface StoreShell {
  volumeL: number;
  heightM: number;
  layers: number;
  insulationM: number;
  /** [W/(m K)] */
  conductivity: number;
  /** upright cylinder or box on a square */
  shape: 'cylinder' | 'box';
}

/** Energy classes of hot-water stores: standing loss S = a + b V^0.4 [W]. */
export const STORE_CLASSES = {
  'A+': [5.5, 3.16],
  A: [8.5, 4.25],
  B: [12, 5.93],
  C: [16.66, 8.33],
  D: [21, 10.33],
  E: [26, 13.66],
  F: [31, 16.66],
} as const;

/** Store 65 °C in a room of 20 °C [K]. */
const CLASS_DIFFERENCE_K = 45;
/** Film at the outside of the insulation, convection and radiation in a room [W/(m²K)]. */
const OUTER_FILM_W_PER_M2K = 10;

/**
 * Loss of each layer by its surface, end caps on the first and last: side of a cylinder
 * 2πλh/(ln(D/d) + 2λ/(α D)), flat parts A/(s/λ + 1/α).
 * @param shell volume [L], height and insulation [m], conductivity [W/(m K)], shape
 * @returns loss of each layer, top first [W/K]
 * @remarks connections and heat bridges are left out; real stores lose up to twice as much
 * @see ISO 12241:2008, 4.1 (from memory)
 */
export function layerLossesWPerK(shell: StoreShell): Float64Array {
  const { layers, insulationM, conductivity, heightM } = shell;
  const baseM2 = shell.volumeL / L_PER_M3 / heightM;
  const flat = 1 / (insulationM / conductivity + 1 / OUTER_FILM_W_PER_M2K);
  const side = (heightM * sideLossPerM(shell.shape, baseM2, insulationM, conductivity, flat)) / layers;
  const losses = new Float64Array(layers).fill(side);
  losses[0]! += baseM2 * flat;
  losses[layers - 1]! += baseM2 * flat;
  return losses;
}

function sideLossPerM(
  shape: StoreShell['shape'],
  baseM2: number,
  insulationM: number,
  conductivity: number,
  flat: number,
): number {
  if (shape === 'box') return 4 * Math.sqrt(baseM2) * flat;
  const inner = 2 * Math.sqrt(baseM2 / Math.PI);
  const outer = inner + 2 * insulationM;
  return (2 * Math.PI) / (Math.log(outer / inner) / conductivity + 2 / (OUTER_FILM_W_PER_M2K * outer));
}

/**
 * Loss of a solar store of which nothing else is known: UA = 0.16 √V.
 * @param volumeL volume [L] 50–5000
 * @returns loss [W/K]
 * @see EN 15316-4-3; EN 12977-3 default (from memory)
 */
export function defaultStoreLossWPerK(volumeL: number): number {
  return 0.16 * Math.sqrt(volumeL);
}

/**
 * Greatest standing loss of an energy class: S = a + b V^0.4.
 * @param energyClass class of the label, A+ to F
 * @param volumeL volume [L] above 0
 * @returns standing loss at 65 °C in 20 °C [W]
 * @see Regulation (EU) 812/2013, Annex II
 */
export function classStandingLossW(energyClass: keyof typeof STORE_CLASSES, volumeL: number): number {
  const [constant, factor] = STORE_CLASSES[energyClass];
  return constant + factor * volumeL ** 0.4;
}

/**
 * Loss coefficient from a standing loss of the label: UA = S/45 K.
 * @param standingLossW S at 65 °C in 20 °C [W]
 * @returns loss [W/K]
 * @see Regulation (EU) 812/2013, Annex II
 */
export function lossFromStandingW(standingLossW: number): number {
  return standingLossW / CLASS_DIFFERENCE_K;
}

/**
 * Temperature of a mixed store left alone: T = Tr + (T0 − Tr) e^(−t/τ), τ = C/UA.
 * @param startC T0 [°C]
 * @param roomC Tr [°C]
 * @param capacityJPerK C of water and store [J/K] above 0
 * @param lossWPerK UA [W/K] from 0
 * @param hours t [h] from 0
 * @returns temperature [°C]
 * @see Newton's law of cooling, closed form
 */
export function cooledC(
  startC: number,
  roomC: number,
  capacityJPerK: number,
  lossWPerK: number,
  hours: number,
): number {
  return roomC + (startC - roomC) * Math.exp((-lossWPerK * hours * SECONDS_PER_HOUR) / capacityJPerK);
}

/**
 * Loss coefficient from a measured cool-down: UA = C ln((T0 − Tr)/(T1 − Tr))/t.
 * @param capacityJPerK C of water and store [J/K] above 0
 * @param startC T0 [°C]
 * @param endC T1 [°C] between room and start
 * @param roomC Tr [°C]
 * @param hours t [h] above 0
 * @returns loss [W/K]
 * @see Newton's law of cooling, closed form
 */
export function lossFromCoolDownWPerK(
  capacityJPerK: number,
  startC: number,
  endC: number,
  roomC: number,
  hours: number,
): number {
  return (capacityJPerK * Math.log((startC - roomC) / (endC - roomC))) / (hours * SECONDS_PER_HOUR);
}
