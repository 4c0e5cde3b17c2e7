import { designHeatLoadW, transmissionWPerK, ventilationWPerK } from '@/lib/physics/design-heat-load';
import { floorConductance } from '@/lib/physics/floor';
import { radiatorFactor } from '@/lib/physics/radiator';
import { WATER_SPECIFIC_HEAT_J_PER_KG_K } from '@/lib/physics/water';
import type { House, SupplyControl } from './design';

/** Loss coefficients of a house by path, design heat load and the flows that follow from it. */
export interface HouseHeat {
  /** opaque transmission H_op, windows and doors H_w, ventilation H_ve [W/K] */
  opaqueWPerK: number;
  windowWPerK: number;
  ventilationWPerK: number;
  totalWPerK: number;
  /** [W] */
  designLoadW: number;
}

/**
 * Heat loss of a house: H_T = c Σ A U f, H_ve = c 0.34 n V, Φ_HL = (H_T + H_ve)(θi − θe,d).
 * @param house shell [m², W/(m²K), -], air change [1/h], volume [m³], temperatures [°C], c from fuel bills [-]
 * @returns coefficients [W/K] and design heat load [W]
 * @see EN 12831-1:2017, simplified form; ISO 13789 for the coefficients
 */
export function houseHeat(
  house: Pick<House, 'shell' | 'calibration' | 'airChangePerH' | 'volumeM3' | 'roomSetC' | 'designOutdoorC'>,
): HouseHeat {
  const glazed = house.shell.filter(({ kind }) => kind === 'window' || kind === 'door');
  const factor = house.calibration?.factor ?? 1;
  const window = factor * transmissionWPerK(glazed);
  const opaque = factor * transmissionWPerK(house.shell) - window;
  const ventilation = factor * ventilationWPerK(house.airChangePerH, house.volumeM3);
  const total = opaque + window + ventilation;
  return {
    opaqueWPerK: opaque,
    windowWPerK: window,
    ventilationWPerK: ventilation,
    totalWPerK: total,
    designLoadW: designHeatLoadW(total, house.roomSetC, house.designOutdoorC),
  };
}

/** Flows and conductances of floor and radiators on one supply. */
export interface EmitterLoop {
  /** K_H of the floor [W/(m²K)] */
  floorKH: number;
  loopKgPerS: number;
  floorKgPerS: number;
  radiatorKgPerS: number;
  /** exponent of the outdoor reset: floor 1.1, radiators alone n */
  exponent: number;
  /** heat of floor and radiators at the design supply [W] */
  floorDesignW: number;
  radiatorDesignW: number;
}

/**
 * Sizes the loop for the design load at the design spread and shares its flow by what floor and radiators give
 * at the mean temperature of the design day, or by the load of the zones that they heat.
 * @param house emitters and room set point
 * @param heat design heat load [W]
 * @param supply design supply [°C] and spread [K]
 * @returns flows [kg/s], K_H [W/(m²K)], heat at the design day [W]
 * @see EN 1264-3 (flow from load and spread); EN 442-2; the share by output is common practice, no source
 */
export function emitterLoop(house: House, heat: HouseHeat, supply: SupplyControl): EmitterLoop {
  const { floor, radiators, zones } = house.emitters;
  const meanExcessK = Math.max(1, supply.designSupplyC - 0.5 * supply.designSpreadK - house.roomSetC);
  const floorKH =
    floor.areaM2 > 0
      ? floorConductance(floor.spacingMm, floor.screedMm, floor.screedConductivity, floor.coveringM2KPerW)
      : 0;
  const floorDesignW = (floorKH * floor.areaM2 * meanExcessK) / (1 - floor.downwardLoss);
  const radiatorDesignW = radiators.ratedW * radiatorFactor(meanExcessK, radiators.exponent);
  const sum = floorDesignW + radiatorDesignW;
  const loopKgPerS =
    Math.max(heat.designLoadW, 500) / (WATER_SPECIFIC_HEAT_J_PER_KG_K * supply.designSpreadK);
  const byOutput = sum > 0 ? floorDesignW / sum : 0;
  const both = floorDesignW > 0 && radiatorDesignW > 0;
  const floorShare = both && zones.share === 'by zone' ? zones.floorShare : byOutput;
  return {
    floorKH,
    loopKgPerS,
    floorKgPerS: loopKgPerS * floorShare,
    radiatorKgPerS: loopKgPerS * (1 - floorShare),
    exponent: floor.areaM2 > 0 ? 1.1 : radiators.exponent,
    floorDesignW,
    radiatorDesignW,
  };
}
