import { CP, radiatorFullW, type Coefficients } from './coefficients';

/*
 * The balances of array, store, house, emitters and taps as ordinary differential equations. Sources: collector
 * ISO 9806:2017, clause 23; layered store Duffie & Beckman 2013, sec. 8.4; house ISO 13790:2008, annex C, with a
 * slab node; emitters EN 1264-2 and EN 442-2. What moves between the layers is fixed by `Decisions`.
 */

/** Heat flows whose sums are compared. */
export const FLOWS = [
  'sun on the array',
  'lost by the array',
  'lost by the pipes',
  'into the store',
  'lost by the store',
  'store to rooms',
  'store to taps',
  'backup to rooms',
  'backup to taps',
  'transmission',
  'ventilation',
  'window re-loss',
  'floor downwards',
] as const;
export type Flow = (typeof FLOWS)[number];

/** What an hour brings. */
export interface Hour {
  outdoorC: number;
  /** sun that the optics accept, per square metre of the array [W/m²] */
  sunWm2: number;
  /** linear loss [W/(m²K)] */
  a1: number;
  windowSunW: number;
  roomSetC: number;
  supplyC: number;
  tapKgPerS: number;
  coldC: number;
}

/** What the controller and the places of entry are, until they are looked at again. */
export interface Decisions {
  full: boolean;
  chargeLayer: number;
  returnLayer: number;
  draws: boolean;
  taps: boolean;
  /** once per hour: film of the floor [W/K], radiators [W per K of supply over room] */
  filmWPerK: number;
  radiatorWPerK: number;
  ventilationWPerK: number;
}

/** Places in the vector of the state: array, wall of the pipes, layers from the top, mass, slab, sums [kWh]. */
export const ARRAY = 0;
export const WALL = 1;
export const TOP = 2;
export const massAt = (layers: number) => TOP + layers;
export const slabAt = (layers: number) => TOP + layers + 1;
export const sumsAt = (layers: number) => TOP + layers + 2;

const KWH = 1 / 3.6e6;
/** Share of the radiators that goes to the air; half of the band of the thermostat, on whose lower end duty is 1. */
const TO_AIR = 0.7;
const HALF_BAND_K = 0.5;

/** Air and surface node for given mass and slab, and their rise per watt of the radiators. */
function rooms(c: Coefficients, hour: Hour, d: Decisions, massC: number, slabC: number, storeLossW: number) {
  const { hIs, hW, hMs, toMass, toSurface, internalW } = c.house;
  const gains = 0.5 * internalW + hour.windowSunW;
  const ofAir = d.ventilationWPerK + hIs;
  const ofSurface = hIs + hW + hMs + d.filmWPerK;
  const solve = (airW: number, surfaceW: number) => {
    const determinant = ofAir * ofSurface - hIs * hIs;
    return {
      airC: (airW * ofSurface + hIs * surfaceW) / determinant,
      surfaceC: (ofAir * surfaceW + hIs * airW) / determinant,
    };
  };
  const free = solve(
    d.ventilationWPerK * hour.outdoorC + 0.5 * internalW + (c.store.inside ? storeLossW : 0),
    hW * hour.outdoorC + hMs * massC + d.filmWPerK * slabC + toSurface * gains,
  );
  return { free, perW: solve(TO_AIR, 1 - TO_AIR), toMassW: toMass * gains, lostW: c.house.lost * gains };
}

/** Room air and surface, duty of the thermostat, and what the emitters give at full flow. */
export function heating(
  c: Coefficients,
  hour: Hour,
  d: Decisions,
  massC: number,
  slabC: number,
  storeLossW: number,
) {
  const { free, perW, toMassW, lostW } = rooms(c, hour, d, massC, slabC, storeLossW);
  const allowed = hour.outdoorC < hour.roomSetC;
  // duty u = wish − air and air = free + u k (supply − air) together: k u² + (1 + k (supply − wish)) u = wish − free
  const k = d.radiatorWPerK * perW.airC;
  const shortK = allowed ? Math.max(0, hour.roomSetC + HALF_BAND_K - free.airC) : 0;
  const b = 1 + k * (hour.supplyC - hour.roomSetC - HALF_BAND_K);
  const duty = Math.min(1, (2 * shortK) / (b + Math.sqrt(b * b + 4 * k * shortK)));
  const airC = (free.airC + duty * k * hour.supplyC) / (1 + duty * k);
  const radiatorW = d.radiatorWPerK * Math.max(0, hour.supplyC - airC);
  const floorW = c.emitters.toSlabWPerK * Math.max(0, hour.supplyC - slabC);
  const fullW = floorW / (1 - c.emitters.downward) + radiatorW;
  return {
    airC,
    surfaceC: free.surfaceC + duty * radiatorW * perW.surfaceC,
    duty,
    floorW,
    fullW,
    returnC: hour.supplyC - fullW / c.emitters.loopWPerK,
    toMassW,
    lostW,
  };
}

/** Inlet and outlet of the running array and the water that comes home to the store [°C]. */
export function runningWater(c: Coefficients, outdoorC: number, arrayC: number, bottomC: number) {
  const inletC = outdoorC + (bottomC - outdoorC) * c.array.kept;
  const outletC = 2 * arrayC - inletC;
  return { inletC, outletC, homeC: outdoorC + (outletC - outdoorC) * c.array.kept };
}

export function storeLossOf(c: Coefficients, y: readonly number[]): number {
  return c.store.lossWPerK.reduce((sum, loss, i) => sum + loss * (y[TOP + i]! - c.store.roomC), 0);
}

/** Rates of change of the whole state [K/s], [kWh/s]. */
export function rates(
  c: Coefficients,
  hour: Hour,
  d: Decisions,
  tap: { setC: number; effectiveness: number },
  y: readonly number[],
): number[] {
  const { layers, layerKg, conductionWPerK, lossWPerK, roomC } = c.store;
  const { array, emitters, house } = c;
  const out = new Array<number>(y.length).fill(0);
  const last = layers - 1;
  const bottomKg = d.full ? layerKg : layerKg + array.waterKg;
  const [arrayC, wallC] = [y[ARRAY]!, y[WALL]!];
  const topC = y[TOP]!;
  const bottomC = y[TOP + last]!;
  const massC = y[massAt(layers)]!;
  const slabC = y[slabAt(layers)]!;

  const storeLossW = storeLossOf(c, y);
  const heat = heating(c, hour, d, massC, slabC, storeLossW);

  // array and pipes
  const excess = arrayC - hour.outdoorC;
  const sunW = array.areaM2 * hour.sunWm2;
  const arrayLossW = array.areaM2 * (hour.a1 * excess + array.a2 * excess * Math.abs(excess));
  let [homeC, givenW, pipeLossW] = [0, 0, 0];
  if (d.full) {
    const water = runningWater(c, hour.outdoorC, arrayC, bottomC);
    homeC = water.homeC;
    givenW = array.flowWPerK * (homeC - bottomC);
    const taken = array.flowWPerK * (water.outletC - water.inletC);
    pipeLossW = taken - givenW;
    out[ARRAY] = (sunW - arrayLossW - taken) / array.fullJPerK;
  } else {
    out[ARRAY] = (sunW - arrayLossW) / array.dryJPerK;
    pipeLossW = array.wallLossWPerK * (wallC - hour.outdoorC);
    out[WALL] = array.wallJPerK > 0 ? -pipeLossW / array.wallJPerK : 0;
  }

  // draws
  const mixed = topC > hour.supplyC ? (hour.supplyC - heat.returnC) / (topC - heat.returnC) : 1;
  const heatingKg = d.draws ? (heat.duty * emitters.loopWPerK * mixed) / CP : 0;
  const preheatK = tap.effectiveness * (topC - hour.coldC);
  const wantedK = tap.setC - hour.coldC;
  const tapKg = d.taps ? hour.tapKgPerS * Math.min(1, wantedK / preheatK) : 0;
  const storeW = heatingKg * CP * (topC - heat.returnC);
  const tapW = tapKg * CP * preheatK;
  const demandW = heat.duty * heat.fullW;
  const tapLoadW = hour.tapKgPerS * CP * Math.max(0, wantedK);

  // layers: net flow down through each interface, upwind
  const kg = (i: number) => (i === last ? bottomKg : layerKg);
  const chargeKg = d.full ? array.flowWPerK / CP : 0;
  for (let i = 0; i < layers; i++) {
    out[TOP + i]! -= (lossWPerK[i]! * (y[TOP + i]! - roomC)) / (kg(i) * CP);
    if (i === last) continue;
    let down = -tapKg;
    if (i >= d.chargeLayer) down += chargeKg;
    if (i < d.returnLayer) down -= heatingKg;
    const [here, below] = [y[TOP + i]!, y[TOP + i + 1]!];
    const carriedW = CP * down * (down > 0 ? here : below) + conductionWPerK * (here - below);
    out[TOP + i]! -= carriedW / (kg(i) * CP);
    out[TOP + i + 1]! += carriedW / (kg(i + 1) * CP);
  }
  const enter = (i: number, flowKg: number, waterC: number) => {
    out[TOP + i]! += (flowKg * waterC) / kg(i);
  };
  enter(0, -(heatingKg + tapKg), topC);
  enter(last, tapKg, topC - preheatK);
  enter(d.returnLayer, heatingKg, heat.returnC);
  enter(d.chargeLayer, chargeKg, homeC);
  enter(last, -chargeKg, bottomC);

  // house
  out[massAt(layers)] =
    (house.hMs * (heat.surfaceC - massC) + house.hEm * (hour.outdoorC - massC) + heat.toMassW) /
    house.massJPerK;
  out[slabAt(layers)] = emitters.hasFloor
    ? (d.filmWPerK * (heat.surfaceC - slabC) + heat.duty * heat.floorW) / emitters.slabJPerK
    : 0;

  const flows: Record<Flow, number> = {
    'sun on the array': sunW,
    'lost by the array': arrayLossW,
    'lost by the pipes': pipeLossW,
    'into the store': givenW,
    'lost by the store': storeLossW,
    'store to rooms': storeW,
    'store to taps': tapW,
    'backup to rooms': demandW - storeW,
    'backup to taps': tapLoadW - tapW,
    transmission: house.hW * (heat.surfaceC - hour.outdoorC) + house.hEm * (massC - hour.outdoorC),
    ventilation: d.ventilationWPerK * (heat.airC - hour.outdoorC),
    'window re-loss': heat.lostW,
    'floor downwards': (heat.duty * heat.floorW * emitters.downward) / (1 - emitters.downward),
  };
  FLOWS.forEach((flow, i) => (out[sumsAt(layers) + i] = flows[flow] * KWH));
  return out;
}

/** Radiators at the start of an hour [W per K of supply over room]. */
export function radiatorAtHour(c: Coefficients, supplyC: number, airC: number): number {
  const { ratedW, exponent, radiatorFlowWPerK } = c.emitters;
  const excess = supplyC - airC;
  return excess > 0 ? radiatorFullW(ratedW, exponent, radiatorFlowWPerK, excess) / excess : 0;
}

/** Film between floor and room at the start of an hour [W/K]: 8.92 max(|ΔT|, 0.5 K)^0.1 (EN 1264-2). */
export function filmAtHour(c: Coefficients, slabC: number, surfaceC: number): number {
  if (!c.emitters.hasFloor) return 0;
  return c.emitters.floorAreaM2 * 8.92 * Math.max(Math.abs(slabC - surfaceC), 0.5) ** 0.1;
}
