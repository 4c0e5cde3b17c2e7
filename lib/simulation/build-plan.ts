import { linearLoss, REFERENCE_WIND_M_PER_S } from '@/lib/physics/collector';
import { slabCapacity, supplyToSlabConductance } from '@/lib/physics/floor';
import { resetSupplyC } from '@/lib/physics/outdoor-reset';
import { layerLossesWPerK } from '@/lib/physics/store-loss';
import { WATER_KG_PER_L, WATER_SPECIFIC_HEAT_J_PER_KG_K as CP } from '@/lib/physics/water';
import type { PlaneYear } from '@/lib/sun/plane-year';
import {
  HOURS_PER_YEAR,
  L_PER_M3,
  MM_PER_M,
  STEFAN_BOLTZMANN,
  toKelvin,
  toRadians,
} from '@/lib/units/constants';
import type { WeatherYear } from '@/lib/weather/weather-year';
import { acceptedSun } from './accepted-sun';
import type { Collector, CollectorArray, Design, House } from './design';
import { dryColumns, type DryColumns } from './dry-hours';
import { arrayInput, hangs, pumpDuty, type Field } from './field-plan';
import {
  efficiencyColumns,
  mountedHours,
  NO_FLOW,
  radiatorTable,
  roomSetColumn,
  tapColumns,
  windowSun,
} from './hour-columns';
import { emitterLoop, houseHeat } from './house-heat';
import type { FieldPlan, Plan, PlanColumns } from './plan';
import type { SimulationInput } from './simulate';
import { SiteCache } from './site-cache';

/** Vertical conduction of a store: water, wall and mixing together [W/(m K)]. */
const STORE_CONDUCTIVITY = 1;
/** Screed below the pipe's crown that takes part in storing heat [mm]. */
const SCREED_AROUND_PIPE_MM = 20;
/** Outer steps of a quarter of an hour. */
const STEPS_PER_HOUR = 4;
/** A run is given up beyond this many sub-steps; an ordinary design takes about 50,000. */
const SUB_STEP_CAP = 4_000_000;
const KEPT = 12;
/** Locks open again this far below their limit: store top, room air [K]. */
const STORE_UNLOCK_K = 2;
const SLAB_UNLOCK_K = 0.5;

/** Keeps the newest few values by key. */
class Memo<T> {
  private readonly kept = new Map<string, T>();

  get(key: string, make: () => T): T {
    const known = this.kept.get(key);
    if (known !== undefined) return known;
    const made = make();
    if (this.kept.size >= KEPT) this.kept.delete(this.kept.keys().next().value!);
    this.kept.set(key, made);
    return made;
  }
}

/** Builds plans and keeps what a slider does not touch. */
export class PlanBuilder {
  private readonly sites = new WeakMap<WeatherYear, { site: SiteCache; id: number }>();
  private siteCount = 0;
  private readonly windows = new Memo<Float64Array>();
  private readonly supplies = new Memo<Float64Array>();
  private readonly taps = new Memo<{ tapKgPerS: Float64Array; mainsC: Float64Array }>();
  private readonly radiators = new Memo<Float64Array>();
  private readonly roomSets = new Memo<Float64Array>();
  private readonly efficiencies = new Memo<Pick<PlanColumns, 'heatingEfficiency' | 'tapEfficiency'>>();
  private readonly dryYears = new Memo<DryColumns>();

  private siteOf(weather: WeatherYear): { site: SiteCache; id: number } {
    const known = this.sites.get(weather);
    if (known) return known;
    const made = { site: new SiteCache(weather), id: this.siteCount++ };
    this.sites.set(weather, made);
    return made;
  }

  /** The plan of a design. */
  plan(input: SimulationInput): Plan {
    const { house, design, numerics } = input;
    const { site } = this.siteOf(input.weather);
    const housePlan = this.housePlan(house, design);
    const field = ({ collector, array }: Field): FieldPlan => {
      const plane = site.plane(array, numerics.skyModel, { horizon: house.horizon, rows: array });
      const pump = pumpDuty({ array, loop: design.loop });
      return {
        array: arrayInput(design, { collector, array }, pump.flowKgPerS, housePlan),
        columns: {
          planeWm2: plane.totalWm2,
          mounted: mountedHours(array.mountedMonths),
          ...this.collectorColumns(site, plane, collector, array),
        },
        pumpW: pump.powerW,
      };
    };
    const first = field(design);
    const second = design.second && hangs(design.second.array) ? field(design.second) : null;
    const ofHouse = this.houseColumns(input);
    const columns: PlanColumns = {
      outdoorC: site.outdoorC,
      planeWm2: first.columns.planeWm2,
      mounted: first.columns.mounted,
      absorbedWm2: first.columns.absorbedWm2,
      a1: first.columns.a1,
      windowSunW: ofHouse.windowSunW,
      supplySetC: ofHouse.supplySetC,
      roomSetC: ofHouse.roomSetC,
      heatingEfficiency: ofHouse.heatingEfficiency,
      tapEfficiency: ofHouse.tapEfficiency,
      tapKgPerS: ofHouse.tapKgPerS,
      mainsC: ofHouse.mainsC,
    };
    const toSlab = design.loop.layout === 'straight to the slab';
    const storeKg = design.store.volumeL * WATER_KG_PER_L;
    const baseM2 = design.store.volumeL / L_PER_M3 / design.store.heightM;
    // every field by name: objects of one shape keep the year loop fast
    return {
      network: housePlan.network,
      ventilationWPerK: housePlan.ventilationWPerK,
      windowOpening: housePlan.windowOpening,
      internalW: housePlan.internalW,
      roomSetC: housePlan.roomSetC,
      staticLossWPerK: housePlan.staticLossWPerK,
      ideal: housePlan.ideal,
      loopKgPerS: housePlan.loopKgPerS,
      floorWPerK: housePlan.floorWPerK,
      floorKH: housePlan.floorKH,
      floorAreaM2: housePlan.floorAreaM2,
      floorDownward: housePlan.floorDownward,
      radiatorWPerK: housePlan.radiatorWPerK,
      tapSetC: housePlan.tapSetC,
      exchangerEffectiveness: housePlan.exchangerEffectiveness,
      coilWPerK: housePlan.coilWPerK,
      ratedW: housePlan.ratedW,
      columns,
      theta: numerics.theta,
      stepsPerHour: STEPS_PER_HOUR,
      subStepCap: SUB_STEP_CAP,
      hasArray: hangs(design.array) || second !== null,
      array: first.array,
      second,
      toSlab,
      limitC: toSlab ? design.loop.slabRoomLimitC : design.controller.storeLimitC,
      unlockK: toSlab ? SLAB_UNLOCK_K : STORE_UNLOCK_K,
      pumpW: first.pumpW,
      layers: design.store.layers,
      storeKg,
      storeLossWPerK: layerLossesWPerK({
        volumeL: design.store.volumeL,
        heightM: design.store.heightM,
        layers: design.store.layers,
        insulationM: design.store.insulationMm / MM_PER_M,
        conductivity: design.store.insulationConductivity,
        shape: design.store.shape,
      }),
      conductionWPerK: (STORE_CONDUCTIVITY * baseM2 * design.store.layers) / design.store.heightM,
      storeRoomC: design.store.roomC,
      storeInside: design.store.insideHouse && !toSlab,
    };
  }

  /** The same house, supply and weather without array and store. */
  referencePlan(input: SimulationInput): Plan {
    const { design } = input;
    const store = { ...design.store, insideHouse: false };
    const array = { ...design.array, areaM2: 0 };
    return this.plan({ ...input, design: { ...design, store, array, second: null } });
  }

  /** Key of all that the reference plan depends on. */
  referenceKey(input: SimulationInput): string {
    const { id } = this.siteOf(input.weather);
    return JSON.stringify([id, input.house, input.design.supply, input.numerics]);
  }

  /** Dry temperatures of every hour for the design's collector, orientation and wind. */
  dry(input: SimulationInput, { collector, array }: Field = input.design): DryColumns {
    const { site, id } = this.siteOf(input.weather);
    const { tiltDeg, azimuthDeg, windFactor } = array;
    const { skyModel } = input.numerics;
    const { dry, curve, faceLayerM2KPerW } = collector;
    const key = JSON.stringify([
      id,
      tiltDeg,
      azimuthDeg,
      windFactor,
      skyModel,
      dry,
      faceLayerM2KPerW,
      curve.b0,
      curve.modifier,
      curve.diffuseModifier,
      input.house.horizon,
      dry.kind === 'declared' ? [curve.eta0Beam, curve.a1, curve.a2] : 0,
    ]);
    return this.dryYears.get(key, () => {
      // the first row stands free of the others, and is the hottest
      const plane = site.plane(array, skyModel, { horizon: input.house.horizon });
      return dryColumns(collector, array, {
        planeWm2: plane.totalWm2,
        acceptedWm2: acceptedSun(curve, plane, array, site.sun),
        outdoorC: site.outdoorC,
        windMPerS: site.windMPerS,
        skyLongwaveWm2: input.weather.skyLongwaveWm2,
      });
    });
  }

  private collectorColumns(
    site: SiteCache,
    plane: PlaneYear,
    collector: Collector,
    array: CollectorArray,
  ): Pick<PlanColumns, 'absorbedWm2' | 'a1'> {
    const { eta0Beam, a1, a3, a4, a6, a7 } = collector.curve;
    const accepted = acceptedSun(collector.curve, plane, array, site.sun);
    const absorbedWm2 = new Float64Array(HOURS_PER_YEAR);
    const loss = new Float64Array(HOURS_PER_YEAR);
    const toSky = 0.5 * (1 + Math.cos(toRadians(array.tiltDeg)));
    const longwave = site.weather.skyLongwaveWm2;
    for (let h = 0; h < HOURS_PER_YEAR; h++) {
      const wind = site.windMPerS[h]! * array.windFactor;
      const reducedWind = wind - REFERENCE_WIND_M_PER_S;
      let sun = eta0Beam * accepted[h]!;
      if (a6 !== 0) sun = Math.max(0, sun - a6 * reducedWind * plane.totalWm2[h]!);
      if (a4 !== 0 || a7 !== 0) {
        // towards the ground the plane sees surfaces at about air temperature: only the sky counts
        const net = longwave[h]! - STEFAN_BOLTZMANN * toKelvin(site.outdoorC[h]!) ** 4;
        sun += (a4 - a7 * reducedWind) * toSky * net;
      }
      absorbedWm2[h] = sun;
      loss[h] = linearLoss(a1, a3, wind);
    }
    return { absorbedWm2, a1: loss };
  }

  private houseColumns(
    input: SimulationInput,
  ): Omit<PlanColumns, 'outdoorC' | 'planeWm2' | 'mounted' | 'absorbedWm2' | 'a1'> {
    const { house, design, numerics, weather } = input;
    const { site, id } = this.siteOf(weather);
    const windowSunW = this.windows.get(
      JSON.stringify([id, house.windows, house.horizon, numerics.skyModel]),
      () => windowSun(site, house, numerics.skyModel),
    );
    const loop = emitterLoop(house, houseHeat(house), design.supply);
    const curve = {
      roomC: house.roomSetC,
      designOutdoorC: house.designOutdoorC,
      designSupplyC: design.supply.designSupplyC,
      designSpreadK: design.supply.designSpreadK,
      exponent: loop.exponent,
      limitC: design.supply.limitC,
    };
    const supplySetC = this.supplies.get(JSON.stringify([id, curve]), () =>
      site.outdoorC.map((outdoorC) => resetSupplyC(curve, outdoorC)),
    );
    const south = weather.latitudeDeg < 0;
    const taps = this.taps.get(JSON.stringify([south, house.hotWater]), () => tapColumns(house, south));
    const roomSetC = this.roomSets.get(JSON.stringify([house.roomSetC, house.setback]), () =>
      roomSetColumn(house),
    );
    const efficiency = this.efficiencies.get(
      JSON.stringify([id, house.backup, house.hotWater.setC, curve]),
      () => efficiencyColumns(house, site.outdoorC, supplySetC),
    );
    return { windowSunW, supplySetC, roomSetC, ...efficiency, ...taps };
  }

  private housePlan(house: House, design: Design) {
    const heat = houseHeat(house);
    const loop = emitterLoop(house, heat, design.supply);
    const { floor, radiators, kind } = house.emitters;
    const ideal = kind === 'ideal';
    const hasFloor = !ideal && floor.areaM2 > 0;
    const slabMm = floor.screedMm + SCREED_AROUND_PIPE_MM;
    return {
      network: {
        floorAreaM2: house.floorAreaM2,
        capacityClass: house.capacityClass,
        opaqueWPerK: heat.opaqueWPerK,
        windowWPerK: heat.windowWPerK,
        slabCapacityJPerK: hasFloor ? slabCapacity(slabMm) * floor.areaM2 : 0,
      },
      ventilationWPerK: heat.ventilationWPerK,
      windowOpening: house.windowOpening,
      internalW: house.internalGainsW,
      roomSetC: house.roomSetC,
      staticLossWPerK: heat.totalWPerK,
      ideal,
      loopKgPerS: loop.loopKgPerS,
      floorWPerK: hasFloor
        ? supplyToSlabConductance(
            floor.areaM2,
            loop.floorKH,
            // the rest of the water's heat goes down
            (1 - floor.downwardLoss) * Math.max(NO_FLOW, loop.floorKgPerS) * CP,
          )
        : 0,
      floorKH: loop.floorKH,
      floorAreaM2: hasFloor ? floor.areaM2 : 0,
      floorDownward: floor.downwardLoss,
      radiatorWPerK: this.radiators.get(JSON.stringify([ideal, radiators, loop.radiatorKgPerS]), () =>
        radiatorTable(ideal ? 0 : radiators.ratedW, radiators.exponent, loop.radiatorKgPerS),
      ),
      tapSetC: house.hotWater.setC,
      exchangerEffectiveness: house.hotWater.exchangerEffectiveness,
      coilWPerK: house.hotWater.exchanger === 'coil' ? house.hotWater.coilWPerK : 0,
      ratedW: house.backup.ratedW,
    };
  }
}
