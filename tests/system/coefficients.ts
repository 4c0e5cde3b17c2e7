import { CAPACITY_CLASSES } from '@/lib/physics/house-network';
import { WATER_SPECIFIC_HEAT_J_PER_KG_K } from '@/lib/physics/water';
import type { Design, House } from '@/lib/simulation/design';

/*
 * House and design once more as the coefficients of their equations, written from the sources and not from the
 * engine: of the product only types and constants are used.
 */

export const CP = WATER_SPECIFIC_HEAT_J_PER_KG_K;

/** EN 1264-2: floor film in K_H and its B; a_T at R = 0, 0.05, 0.10, 0.15 m²K/W (from memory). */
const FLOOR_FILM = 10.8;
const FLOOR_B = 6.7;
const SPACING_FACTOR = [1.23, 1.188, 1.156, 1.134];
/** Regulation (EU) 814/2013, Annex III, profile M: kWh by the hour of the day (from memory). */
// prettier-ignore
const PROFILE_M = [0, 0, 0, 0, 0, 0, 0, 1.61, 0.42, 0.21, 0.105, 0.21, 0.315, 0, 0.105, 0.105, 0.105, 0, 0.315, 0.105, 0.735, 1.505, 0, 0];

export type Coefficients = ReturnType<typeof coefficients>;

/** The array: capacities, water, flow and the pipes each way. */
function arrayOf({ collector, array, controller }: Design) {
  const areaM2 = array.areaM2 * collector.widthFactor;
  const boreM = array.pipeBoreMm / 1000;
  const waterKg =
    collector.curve.waterContentLPerM2 * areaM2 + 2 * array.pipeLengthM * 250 * Math.PI * boreM ** 2;
  const flowWPerK = array.flowKgPerSM2 * array.areaM2 * CP;
  const dryJPerK = collector.curve.dryCapacityJPerM2K * areaM2;
  return {
    areaM2,
    a2: collector.curve.a2,
    dryJPerK,
    waterKg: array.areaM2 > 0 ? waterKg : 0,
    fullJPerK: dryJPerK + waterKg * CP,
    flowWPerK,
    /** share of the excess that a pipe leaves to its water */
    kept: Math.exp((-array.pipeLengthM * array.pipeLossWPerMK) / flowWPerK),
    wallJPerK: 2 * array.pipeLengthM * array.pipeCapacityJPerMK,
    wallLossWPerK: 2 * array.pipeLengthM * array.pipeLossWPerMK,
    startK: controller.startK,
    stopK: controller.stopK,
    minimumRunS: controller.minimumRunS,
  };
}

/** The store: surfaces of a box or an upright cylinder by ISO 12241, conduction of 1 W/(m K). */
function storeOf({ store }: Design) {
  const baseM2 = store.volumeL / 1000 / store.heightM;
  const insulationM = store.insulationMm / 1000;
  const plane = 1 / (insulationM / store.insulationConductivity + 0.1);
  const innerM = Math.sqrt((4 * baseM2) / Math.PI);
  const outerM = innerM + 2 * insulationM;
  const round =
    Math.PI / (Math.log(outerM / innerM) / (2 * store.insulationConductivity) + 1 / (10 * outerM));
  const side = store.heightM * (store.shape === 'box' ? 4 * Math.sqrt(baseM2) * plane : round);
  const loss = Array.from({ length: store.layers }, () => side / store.layers);
  loss[0]! += baseM2 * plane;
  loss[store.layers - 1]! += baseM2 * plane;
  return {
    layers: store.layers,
    layerKg: store.volumeL / store.layers,
    lossWPerK: loss,
    conductionWPerK: baseM2 / (store.heightM / store.layers),
    roomC: store.roomC,
    inside: store.insideHouse,
  };
}

/** The network of ISO 13790:2008, clause 12.2 and annex C, and the design heat load of EN 12831-1. */
function houseOf(house: House) {
  const glazed = (kind: string) => kind === 'window' || kind === 'door';
  const loss = (which: boolean) =>
    house.shell
      .filter(({ kind }) => glazed(kind) === which)
      .reduce((sum, { areaM2, uWPerM2K, factor }) => sum + areaM2 * uWPerM2K * factor, 0);
  const { massAreaRatio, capacityJPerM2K } = CAPACITY_CLASSES[house.capacityClass];
  const hW = loss(true);
  const hMs = 9.1 * massAreaRatio * house.floorAreaM2;
  const hVe = 0.34 * house.airChangePerH * house.volumeM3;
  const totalM2 = 4.5 * house.floorAreaM2;
  const toMass = (massAreaRatio * house.floorAreaM2) / totalM2;
  const lost = hW / (9.1 * totalM2);
  return {
    hVe,
    hW,
    hMs,
    hIs: 3.45 * totalM2,
    hEm: 1 / (1 / loss(false) - 1 / hMs),
    massJPerK: capacityJPerM2K * house.floorAreaM2,
    toMass,
    lost,
    toSurface: 1 - toMass - lost,
    internalW: house.internalGainsW,
    designLoadW: (hW + loss(false) + hVe) * (house.roomSetC - house.designOutdoorC),
  };
}

/** Floor by EN 1264-2, radiators by EN 442-2, and their share of a loop that carries the design load. */
function emittersOf(house: House, design: Design, designLoadW: number) {
  const { floor, radiators } = house.emitters;
  const { designSupplyC, designSpreadK } = design.supply;
  const excessK = designSupplyC - designSpreadK / 2 - house.roomSetC;
  const kH = floorConductance(floor);
  const floorW = (kH * floor.areaM2 * excessK) / (1 - floor.downwardLoss);
  const radiatorW = radiators.ratedW * (excessK / 50) ** radiators.exponent;
  const loopWPerK = designLoadW / designSpreadK;
  const floorWPerK = (loopWPerK * floorW) / (floorW + radiatorW);
  const upWPerK = (1 - floor.downwardLoss) * floorWPerK;
  const toRoom = upWPerK * (1 - Math.exp((-kH * floor.areaM2) / upWPerK));
  return {
    loopWPerK,
    hasFloor: floor.areaM2 > 0,
    floorAreaM2: floor.areaM2,
    downward: floor.downwardLoss,
    /** supply to slab: the conductance supply to room without the film that K_H holds */
    toSlabWPerK: floor.areaM2 > 0 ? 1 / (1 / toRoom - 1 / (FLOOR_FILM * floor.areaM2)) : 0,
    slabJPerK: ((floor.screedMm + 20) / 1000) * 2e6 * floor.areaM2,
    ratedW: radiators.ratedW,
    exponent: radiators.exponent,
    radiatorFlowWPerK: loopWPerK - floorWPerK,
  };
}

function floorConductance(floor: House['emitters']['floor']): number {
  const { spacingMm, screedMm, screedConductivity, coveringM2KPerW } = floor;
  const film = 1 / FLOOR_FILM;
  const covering = (film + 0.045) / (film + screedMm / 1000 / screedConductivity + coveringM2KPerW);
  const step = Math.min(2, Math.floor(coveringM2KPerW / 0.05));
  const share = coveringM2KPerW / 0.05 - step;
  const spacing = SPACING_FACTOR[step]! + share * (SPACING_FACTOR[step + 1]! - SPACING_FACTOR[step]!);
  return FLOOR_B * covering * spacing ** (1 - spacingMm / 75);
}

/** All coefficients of a house and a design. */
export function coefficients(house: House, design: Design) {
  const network = houseOf(house);
  return {
    array: arrayOf(design),
    store: storeOf(design),
    house: network,
    emitters: emittersOf(house, design, network.designLoadW),
  };
}

/** Linear loss at the wind of the hour (ISO 9806:2017: a1 stands at 3 m/s), not below 0.3 a1 [W/(m²K)]. */
export function linearLossAt({ collector, array }: Design, windMPerS: number): number {
  const { a1, a3 } = collector.curve;
  return Math.max(0.3 * a1, a1 + a3 * (windMPerS * array.windFactor - 3));
}

/** Supply of the outdoor reset [°C]: the emitter's law solved for its mean water, EN 442-2 and EN 1264-2. */
export function supplyAt(house: House, design: Design, outdoorC: number): number {
  const { designSupplyC, designSpreadK, limitC } = design.supply;
  const { floor, radiators } = house.emitters;
  const exponent = floor.areaM2 > 0 ? 1.1 : radiators.exponent;
  const load = Math.max(0, (house.roomSetC - outdoorC) / (house.roomSetC - house.designOutdoorC));
  const meanK = (designSupplyC - designSpreadK / 2 - house.roomSetC) * load ** (1 / exponent);
  return Math.min(limitC, house.roomSetC + meanK + (designSpreadK / 2) * load);
}

/** Water tapped in an hour of the day [kg/s]; the cases use profile M. */
export function tapAt(house: House, hour: number): number {
  const day = PROFILE_M.reduce((sum, kwh) => sum + kwh, 0);
  return (house.hotWater.litresPerDay * PROFILE_M[hour % 24]!) / day / 3600;
}

/** Cold water on a day of the year, 1 = 1 January, of the northern half [°C] (EN 12976-2, Annex B, from memory). */
export function coldWaterAt(house: House, day: number): number {
  const { mainsMeanC, mainsAmplitudeK } = house.hotWater;
  return mainsMeanC + mainsAmplitudeK * Math.sin((2 * Math.PI * (day - 137)) / 365);
}

/**
 * Heat of a radiator at full flow [W]: Φ50 (x/50)^n = 2 C (E − x) for the arithmetic mean excess x by bisection, and
 * never more than cools the water to the room (EN 442-2).
 */
export function radiatorFullW(ratedW: number, exponent: number, flowWPerK: number, excessK: number): number {
  if (ratedW <= 0 || excessK <= 0) return 0;
  let low = 0;
  let high = excessK;
  for (let round = 0; round < 60; round++) {
    const x = (low + high) / 2;
    if (ratedW * (x / 50) ** exponent > 2 * flowWPerK * (excessK - x)) high = x;
    else low = x;
  }
  return Math.min(2 * flowWPerK * (excessK - low), flowWPerK * excessK);
}
