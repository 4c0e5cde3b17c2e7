/** Hourly columns and tables of a plan that follow from the house alone or from its place. */
import { heatPumpCop } from '@/lib/physics/heat-pump';
import { mainsC, tappingShares } from '@/lib/physics/hot-water';
import { radiatorHeat } from '@/lib/physics/radiator';
import { WATER_KG_PER_L, WATER_SPECIFIC_HEAT_J_PER_KG_K as CP } from '@/lib/physics/water';
import { solarApertureM2 } from '@/lib/physics/window-gain';
import { HOURS_PER_DAY, HOURS_PER_YEAR, SECONDS_PER_HOUR } from '@/lib/units/constants';
import type { House, SkyModel } from './design';
import { EXCESS_STEP_K, EXCESS_STEPS, type PlanColumns } from './plan';
import type { SiteCache } from './site-cache';
import { monthOf } from './tally';

/** A small flow that stands for none where a flow divides [kg/s]. */
export const NO_FLOW = 1e-9;

/** Sun through all windows in each hour [W]. */
export function windowSun(site: SiteCache, house: House, model: SkyModel): Float64Array {
  const gain = new Float64Array(HOURS_PER_YEAR);
  for (const window of house.windows) {
    const aperture = solarApertureM2(window.areaM2, window.frameFraction, window.gValue, window.shade);
    const wall = { tiltDeg: 90, azimuthDeg: window.azimuthDeg };
    const plane = site.plane(wall, model, { horizon: house.horizon });
    for (let h = 0; h < HOURS_PER_YEAR; h++) gain[h]! += aperture * plane.totalWm2[h]!;
  }
  return gain;
}

/** Conductance of the radiators over the excess of the supply: their law needs powers, the loop only this table. */
export function radiatorTable(ratedW: number, exponent: number, kgPerS: number): Float64Array {
  const table = new Float64Array(EXCESS_STEPS + 2);
  if (ratedW <= 0) return table;
  for (let i = 1; i < table.length; i++) {
    const excessK = i * EXCESS_STEP_K;
    table[i] = radiatorHeat(ratedW, exponent, excessK, Math.max(NO_FLOW, kgPerS) * CP, 0) / excessK;
  }
  return table;
}

/** Tapped water [kg/s] and cold water [°C] of each hour. */
export function tapColumns(house: House, south: boolean): { tapKgPerS: Float64Array; mainsC: Float64Array } {
  const { litresPerDay, profile, mainsMeanC, mainsAmplitudeK } = house.hotWater;
  const shares = tappingShares(profile);
  const tapKgPerS = new Float64Array(HOURS_PER_YEAR);
  const mains = new Float64Array(HOURS_PER_YEAR);
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    const day = Math.floor(h / HOURS_PER_DAY);
    tapKgPerS[h] = (litresPerDay * WATER_KG_PER_L * shares[h % HOURS_PER_DAY]!) / SECONDS_PER_HOUR;
    mains[h] = mainsC(mainsMeanC, mainsAmplitudeK, day + 1, south);
  }
  return { tapKgPerS, mainsC: mains };
}

/** Set point of the room air in each hour, night setback counted [°C]. */
export function roomSetColumn(house: House): Float64Array {
  const { on, nightC, fromHour, toHour } = house.setback;
  const column = new Float64Array(HOURS_PER_YEAR).fill(house.roomSetC);
  if (!on) return column;
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    const hour = h % HOURS_PER_DAY;
    const night = fromHour <= toHour ? hour >= fromHour && hour < toHour : hour >= fromHour || hour < toHour;
    if (night) column[h] = Math.min(house.roomSetC, nightC);
  }
  return column;
}

/** Useful heat per bought energy by hour: a boiler's seasonal efficiency, or the heat pump at its two temperatures. */
export function efficiencyColumns(
  house: House,
  outdoorC: Float64Array,
  supplySetC: Float64Array,
): Pick<PlanColumns, 'heatingEfficiency' | 'tapEfficiency'> {
  const { fuel, seasonalEfficiency, heatPump } = house.backup;
  if (fuel !== 'heat pump') {
    const constant = new Float64Array(HOURS_PER_YEAR).fill(seasonalEfficiency);
    return { heatingEfficiency: constant, tapEfficiency: constant };
  }
  const sourceC = (h: number) => (heatPump.source === 'ground' ? heatPump.groundC : outdoorC[h]!);
  return {
    heatingEfficiency: supplySetC.map((supplyC, h) => heatPumpCop(sourceC(h), supplyC, heatPump.carnotShare)),
    tapEfficiency: outdoorC.map((_, h) => heatPumpCop(sourceC(h), house.hotWater.setC, heatPump.carnotShare)),
  };
}

/** 1 in each hour of a month in which the array hangs outside. */
export function mountedHours(months: readonly boolean[]): Uint8Array {
  const mounted = new Uint8Array(HOURS_PER_YEAR);
  for (let h = 0; h < HOURS_PER_YEAR; h++) mounted[h] = months[monthOf(h)] ? 1 : 0;
  return mounted;
}
