/**
 * The layered store while it is being worked: N layers of equal mass, net flows at the interfaces, upwind,
 * conduction, losses by layer; advanced by two-stage Heun steps; inversions merged after each step.
 *
 * The water of the array and its outdoor pipes stands in the bottom layer while the array is empty: filling
 * and draining move that mass, so that heat and water are conserved exactly.
 *
 * @see Duffie & Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, sec. 8.4 (layered store);
 *      net-flow form and numerics: own definition, method pages, choices
 */

import { WATER_SPECIFIC_HEAT_J_PER_KG_K as CP } from '@/lib/physics/water';

/** Where a collector field charges the store: its water enters at `level` and leaves from the bottom. */
export class ChargePort {
  kgPerS = 0.0;
  waterC = 0.5;
  /** the same in the first stage, before the inlet of the array was known */
  firstC = 0.5;
  level = 0;
}

/** What flows through the store during one sub-step; set by the loops, read by `predict` and `correct`. */
export class StoreFlows {
  /** one port for each collector field */
  readonly charges: ChargePort[];
  /** heating draw from the top [kg/s], comes back with `returnC` into `returnLevel` */
  heatingKgPerS = 0.0;
  returnC = 0.5;
  returnLevel = 0;
  /** preheat draw from the top back to the bottom [kg/s] */
  tapKgPerS = 0.0;
  mainsC = 0.5;
  effectiveness = 0.5;
  /** tap water through a coil from the bottom to the top [kg/s]; `coilKept` of its lag stays after one layer [-] */
  coilKgPerS = 0.0;
  coilKept = 0.5;

  constructor(fields: number) {
    this.charges = Array.from({ length: fields }, () => new ChargePort());
  }
}

export class StoreLayers {
  readonly count: number;
  /** temperature of each layer, top first [°C] */
  readonly t: Float64Array;
  private readonly predicted: Float64Array;
  private readonly rate: Float64Array;
  private readonly rate2: Float64Array;
  /** of all fields together [kg/s] */
  private chargeKgPerS = 0.5;
  /** net flow from layer i to layer i + 1 [kg/s] */
  private readonly down: Float64Array;
  /** loss of each layer [W/K] */
  readonly lossWPerK: Float64Array;
  /** loss of a layer per kelvin of excess and kelvin of its own [1/s] */
  private readonly lossPerS: Float64Array;
  private readonly mergedMass: Float64Array;
  private readonly mergedT: Float64Array;
  private readonly mergedCount: Int32Array;
  readonly layerKg: number;
  /** mass of the bottom layer: more while the array is empty [kg] */
  bottomKg: number;
  private readonly conductionKgPerS: number;
  roomC: number;
  readonly flows: StoreFlows;
  /** length of the sub-step [s] */
  dtS = 0.5;

  /** mean top and bottom temperature of the last sub-step [°C], with which its energies are booked */
  topMeanC = 0.5;
  bottomMeanC = 0.5;
  /** heat given to tap water in the last sub-step [W] */
  tapW = 0.5;
  private stageTap = 0.5;
  private firstTap = 0.5;
  /** heat lost to the room in the last sub-step [J] */
  lossJ = 0.5;

  /**
   * @param count N [-] 1..12
   * @param massKg water while the array is full [kg]
   * @param lossWPerK loss of each layer [W/K]
   * @param conductionWPerK vertical conduction between neighbouring layers [W/K]
   * @param roomC room of the store [°C]
   * @param fields collector fields that charge the store [-] 1 or 2
   */
  constructor(
    count: number,
    massKg: number,
    lossWPerK: Float64Array,
    conductionWPerK: number,
    roomC: number,
    fields = 1,
  ) {
    this.count = count;
    this.flows = new StoreFlows(fields);
    this.t = new Float64Array(count);
    this.predicted = new Float64Array(count);
    this.rate = new Float64Array(count);
    this.rate2 = new Float64Array(count);
    this.down = new Float64Array(count);
    this.lossPerS = lossWPerK.map((loss) => (loss * count) / (massKg * CP));
    this.mergedMass = new Float64Array(count);
    this.mergedT = new Float64Array(count);
    this.mergedCount = new Int32Array(count);
    this.lossWPerK = lossWPerK;
    this.layerKg = massKg / count;
    this.bottomKg = this.layerKg;
    this.conductionKgPerS = conductionWPerK / CP;
    this.roomC = roomC;
  }

  get topC(): number {
    return this.t[0]!;
  }

  get bottomC(): number {
    return this.t[this.count - 1]!;
  }

  /** First layer from the top that is not warmer than the entering water, else the bottom. */
  levelFor(enteringC: number): number {
    const t = this.t;
    const last = this.count - 1;
    let i = 0;
    while (i < last && t[i]! > enteringC) i++;
    return i;
  }

  /**
   * Longest sub-step of the given flows [s]: θ · layer mass / largest flow, and no longer than the top needs to come
   * down to the heating return: beyond that a cold second layer would give heat uphill.
   */
  stepLimitS(theta: number): number {
    const f = this.flows;
    const drawn = f.heatingKgPerS + f.tapKgPerS;
    let charge = 0;
    for (let k = 0; k < f.charges.length; k++) charge += f.charges[k]!.kgPerS;
    // a coil takes from a layer what its tap water carries, beside what flows through
    const largest = Math.max(charge, drawn) + f.coilKgPerS;
    let limit = largest > 0 ? (theta * this.layerKg) / largest : Infinity;
    if (f.heatingKgPerS > 0 && this.count > 1) {
      const top = this.t[0]!;
      const below = this.t[1]!;
      if (below < f.returnC) {
        limit = Math.min(limit, (this.layerKg * (top - f.returnC)) / (drawn * (top - below)));
      }
    }
    return limit;
  }

  /** Net flows at the interfaces, fixed for both stages of a sub-step. */
  private settleFlows(): void {
    const { charges, heatingKgPerS, returnLevel, tapKgPerS } = this.flows;
    const down = this.down;
    const last = this.count - 1;
    for (let i = 0; i < last; i++) down[i] = returnLevel > i ? -tapKgPerS - heatingKgPerS : -tapKgPerS;
    let charge = 0;
    for (let k = 0; k < charges.length; k++) {
      const { kgPerS, level } = charges[k]!;
      if (kgPerS === 0) continue;
      charge += kgPerS;
      for (let i = level; i < last; i++) down[i]! += kgPerS;
    }
    this.chargeKgPerS = charge;
  }

  /** Rates of change [K/s] of all layers at temperatures `t` into `out`. */
  private rates(t: Float64Array, out: Float64Array): void {
    const f = this.flows;
    const down = this.down;
    const last = this.count - 1;
    const charge = this.chargeKgPerS;
    const conduction = this.conductionKgPerS;
    const lossPerS = this.lossPerS;
    const room = this.roomC;
    const perLayer = 1 / this.layerKg;
    const top = t[0]!;
    let here = top;
    let above = -(f.heatingKgPerS + f.tapKgPerS) * top;
    for (let i = 0; i < last; i++) {
      const below = t[i + 1]!;
      const flow = down[i]!;
      const carried = flow * (flow > 0 ? here : below) + conduction * (here - below);
      out[i] = (above - carried) * perLayer - lossPerS[i]! * (here - room);
      above = carried;
      here = below;
    }
    const tapReturn = top - f.effectiveness * (top - f.mainsC);
    const perBottom = 1 / this.bottomKg;
    const net = above - charge * here + f.tapKgPerS * tapReturn;
    out[last] = net * perBottom - lossPerS[last]! * this.layerKg * perBottom * (here - room);
    if (charge > 0) {
      for (let k = 0; k < f.charges.length; k++) {
        const { kgPerS, waterC, level } = f.charges[k]!;
        out[level]! += kgPerS * waterC * (level === last ? perBottom : perLayer);
      }
    }
    this.stageTap = f.tapKgPerS * (top - tapReturn);
    if (f.coilKgPerS > 0) this.coil(t, out);
    if (f.heatingKgPerS > 0) {
      out[f.returnLevel]! += f.heatingKgPerS * f.returnC * (f.returnLevel === last ? perBottom : perLayer);
    }
  }

  /** Tap water rises through the coil and takes heat from each layer it passes. */
  private coil(t: Float64Array, out: Float64Array): void {
    const { coilKgPerS, coilKept, mainsC } = this.flows;
    const last = this.count - 1;
    let waterC = mainsC;
    for (let i = last; i >= 0; i--) {
      const leavingC = t[i]! + (waterC - t[i]!) * coilKept;
      out[i]! -= (coilKgPerS * (leavingC - waterC)) / (i === last ? this.bottomKg : this.layerKg);
      waterC = leavingC;
    }
    this.stageTap += coilKgPerS * (waterC - mainsC);
  }

  /**
   * Temperature at which tap water would leave the coil now.
   * @param kept share of the lag that stays after one layer, e^(−UA/(N ṁ c)) [-]
   * @param mainsC cold water [°C]
   * @returns outlet [°C]
   */
  coilOutletC(kept: number, mainsC: number): number {
    let waterC = mainsC;
    for (let i = this.count - 1; i >= 0; i--) waterC = this.t[i]! + (waterC - this.t[i]!) * kept;
    return waterC;
  }

  /** First stage: rates at the present temperatures and the predicted temperatures after `dtS`. */
  predict(): void {
    const dtS = this.dtS;
    this.settleFlows();
    this.rates(this.t, this.rate);
    this.firstTap = this.stageTap;
    for (let i = 0; i < this.count; i++) this.predicted[i] = this.t[i]! + dtS * this.rate[i]!;
    const last = this.count - 1;
    this.topMeanC = 0.5 * (this.t[0]! + this.predicted[0]!);
    this.bottomMeanC = 0.5 * (this.t[last]! + this.predicted[last]!);
  }

  /**
   * Second stage. The charging water of the first stage came with `firstC`; both stages are booked with
   * the final `waterC`, so that the heat given is that of the array.
   */
  correct(): void {
    const { flows: f, dtS } = this;
    const last = this.count - 1;
    this.rates(this.predicted, this.rate2);
    this.tapW = 0.5 * CP * (this.firstTap + this.stageTap);
    if (this.chargeKgPerS > 0) {
      for (let k = 0; k < f.charges.length; k++) {
        const { kgPerS, waterC, firstC, level } = f.charges[k]!;
        this.rate[level]! += (kgPerS * (waterC - firstC)) / (level === last ? this.bottomKg : this.layerKg);
      }
    }
    const half = 0.5 * dtS;
    const room = this.roomC;
    let lost = 0;
    let sorted = true;
    let warmer = Infinity;
    for (let i = 0; i <= last; i++) {
      const before = this.t[i]!;
      lost += this.lossWPerK[i]! * (0.5 * (before + this.predicted[i]!) - room);
      const next = before + half * (this.rate[i]! + this.rate2[i]!);
      this.t[i] = next;
      if (next > warmer) sorted = false;
      warmer = next;
    }
    this.lossJ = lost * dtS;
    if (!sorted) this.mergeInversions();
  }

  /**
   * A sub-step in which nothing flows: conduction by one explicit stage, loss by two terms of its exponential.
   * Quiet hours are half of a winter array's year, so they are kept cheap.
   */
  rest(): void {
    const { t, dtS, lossPerS, lossWPerK, roomC: room } = this;
    const last = this.count - 1;
    const perLayer = dtS / this.layerKg;
    const conduction = this.conductionKgPerS;
    let lost = 0;
    let above = 0;
    let here = t[0]!;
    for (let i = 0; i < last; i++) {
      const below = t[i + 1]!;
      const carried = conduction * (here - below);
      const x = lossPerS[i]! * dtS;
      const excess = (here - room) * (1 - 0.5 * x);
      lost += lossWPerK[i]! * excess;
      t[i] = here + (above - carried) * perLayer - x * excess;
      above = carried;
      here = below;
    }
    const share = this.layerKg / this.bottomKg;
    const x = lossPerS[last]! * dtS * share;
    const excess = (here - room) * (1 - 0.5 * x);
    lost += lossWPerK[last]! * excess;
    t[last] = here + above * perLayer * share - x * excess;
    this.lossJ = lost * dtS;
    this.settle();
  }

  /** Mixes layers that lie under colder ones, from the unstable pair outward (pool adjacent violators). */
  mergeInversions(): void {
    const mass = this.mergedMass;
    const temperature = this.mergedT;
    const counts = this.mergedCount;
    const last = this.count - 1;
    let blocks = 0;
    for (let i = 0; i <= last; i++) {
      let m = i === last ? this.bottomKg : this.layerKg;
      let t = this.t[i]!;
      let n = 1;
      while (blocks > 0 && temperature[blocks - 1]! < t) {
        blocks--;
        const sum = mass[blocks]! + m;
        t = (temperature[blocks]! * mass[blocks]! + t * m) / sum;
        m = sum;
        n += counts[blocks]!;
      }
      mass[blocks] = m;
      temperature[blocks] = t;
      counts[blocks] = n;
      blocks++;
    }
    let i = 0;
    for (let b = 0; b < blocks; b++) {
      for (let k = counts[b]!; k > 0; k--) this.t[i++] = temperature[b]!;
    }
  }

  /** Takes water from the bottom layer without changing its temperature [kg]. */
  takeFromBottom(kg: number): void {
    this.bottomKg -= kg;
  }

  /** Takes heat out of the bottom layer [J]. */
  coolBottom(heatJ: number): void {
    this.t[this.count - 1]! -= heatJ / (this.bottomKg * CP);
    this.settle();
  }

  /** Brings water home into its level; the layers below move down and the bottom layer grows [kg, °C]. */
  bringHome(kg: number, waterC: number): void {
    const last = this.count - 1;
    const level = this.levelFor(waterC);
    const parts = Math.max(1, Math.ceil((2 * kg) / this.layerKg));
    const part = kg / parts;
    for (let p = 0; p < parts; p++) {
      const bottomInflowC = level === last ? waterC : this.t[last - 1]!;
      const share = part / this.layerKg;
      this.t[last] = (this.t[last]! * this.bottomKg + bottomInflowC * part) / (this.bottomKg + part);
      this.bottomKg += part;
      for (let i = last - 1; i > level; i--) this.t[i]! += share * (this.t[i - 1]! - this.t[i]!);
      if (level < last) this.t[level]! += share * (waterC - this.t[level]!);
    }
    this.settle();
  }

  private settle(): void {
    for (let i = 1; i < this.count; i++) {
      if (this.t[i]! > this.t[i - 1]!) {
        this.mergeInversions();
        return;
      }
    }
  }

  /** Heat held above 0 °C [J]. */
  heatJ(): number {
    let sum = 0;
    for (let i = 0; i < this.count - 1; i++) sum += this.t[i]! * this.layerKg;
    return (sum + this.t[this.count - 1]! * this.bottomKg) * CP;
  }
}
