import type { Design, House } from '@/lib/simulation/design';
import { coefficients, CP, type Coefficients } from './coefficients';
import {
  ARRAY,
  filmAtHour,
  FLOWS,
  heating,
  massAt,
  radiatorAtHour,
  rates,
  runningWater,
  slabAt,
  storeLossOf,
  sumsAt,
  TOP,
  WALL,
  type Decisions,
  type Flow,
  type Hour,
} from './equations';
import { integrate } from './odex';

const HOUR_S = 3600;
/** Where water enters, whether the loop draws and whether layers have turned over is looked at this often [s]. */
export const LOOK_S = 30;
const EVENT_TOLERANCE_S = 1e-6;
const RETURN_MARGIN_K = 1;
const OPEN_C = 25;

export interface WeekStart {
  storeC: readonly number[];
  roomC: number;
}

export interface WeekSums {
  flowKwh: Record<Flow, number>;
  starts: number;
  pumpHours: number;
  layersC: number[];
  airC: number;
}

/** One week of the separately written equations. */
class Week {
  private readonly c: Coefficients;
  private readonly tap: { setC: number; effectiveness: number };
  private y: number[];
  private readonly d: Decisions;
  private runS = 0;
  private opened = false;
  starts = 0;
  pumpS = 0;

  constructor(
    private readonly house: House,
    design: Design,
    start: WeekStart,
    first: Hour,
  ) {
    this.c = coefficients(house, design);
    this.tap = { setC: house.hotWater.setC, effectiveness: house.hotWater.exchangerEffectiveness };
    this.y = [
      first.outdoorC,
      first.outdoorC,
      ...start.storeC,
      start.roomC,
      start.roomC,
      ...FLOWS.map(() => 0),
    ];
    this.d = {
      full: false,
      chargeLayer: 0,
      returnLayer: 0,
      draws: false,
      taps: false,
      filmWPerK: 0,
      radiatorWPerK: 0,
      ventilationWPerK: this.c.house.hVe,
    };
    this.roomC = { airC: start.roomC, surfaceC: start.roomC };
  }

  private roomC: { airC: number; surfaceC: number };

  private get last(): number {
    return this.c.store.layers - 1;
  }

  private layer(i: number): number {
    return this.y[TOP + i]!;
  }

  private kg(i: number): number {
    return this.c.store.layerKg + (i === this.last && !this.d.full ? this.c.array.waterKg : 0);
  }

  hour(hour: Hour): void {
    const { c, d } = this;
    d.filmWPerK = filmAtHour(c, this.y[slabAt(c.store.layers)]!, this.roomC.surfaceC);
    d.radiatorWPerK = radiatorAtHour(c, hour.supplyC, this.roomC.airC);
    if (this.house.windowOpening) this.opened = this.roomC.airC > OPEN_C && hour.outdoorC < this.roomC.airC;
    d.ventilationWPerK = (this.opened ? 4 : 1) * c.house.hVe;
    for (let rest = HOUR_S; rest > EVENT_TOLERANCE_S;) {
      this.look(hour);
      rest -= this.advance(hour, Math.min(rest, LOOK_S));
    }
    const { airC, surfaceC } = this.rooms(hour);
    this.roomC = { airC, surfaceC };
  }

  private rooms(hour: Hour) {
    const { layers } = this.c.store;
    const [mass, slab] = [this.y[massAt(layers)]!, this.y[slabAt(layers)]!];
    return heating(this.c, hour, this.d, mass, slab, storeLossOf(this.c, this.y));
  }

  /** Switches the pump where it is due, and finds where water enters. */
  private look(hour: Hour): void {
    const { c, d } = this;
    this.turnOver();
    if (d.full ? this.stops(hour) >= 0 && this.runS >= c.array.minimumRunS : this.begins() >= 0) {
      if (d.full) this.drain();
      else this.fill();
      this.turnOver();
    }
    const { returnC } = this.rooms(hour);
    d.returnLayer = this.entry(returnC);
    d.draws = this.layer(0) > returnC + RETURN_MARGIN_K;
    d.taps = hour.tapKgPerS > 0 && this.layer(0) > hour.coldC;
    if (d.full) {
      const { homeC } = runningWater(c, hour.outdoorC, this.y[ARRAY]!, this.layer(this.last));
      d.chargeLayer = this.entry(homeC);
    }
  }

  /** First layer from the top that is not warmer than the water, else the bottom. */
  private entry(waterC: number): number {
    const found = this.y.slice(TOP, TOP + this.c.store.layers).findIndex((t) => t <= waterC);
    return found < 0 ? this.last : found;
  }

  /** Rises through zero when the pump has to stop: outlet − inlet has come down to the stop difference. */
  private stops(hour: Hour, y = this.y): number {
    const { inletC, outletC } = runningWater(this.c, hour.outdoorC, y[ARRAY]!, y[TOP + this.last]!);
    return this.c.array.stopK - (outletC - inletC);
  }

  /** Rises through zero when the pump has to start: the plate is warmer than the bottom by the start difference. */
  private begins(y = this.y): number {
    return y[ARRAY]! - y[TOP + this.last]! - this.c.array.startK;
  }

  /** Integrates up to `dtS`, less far when the pump switches before; returns how far [s]. */
  private advance(hour: Hour, dtS: number): number {
    const { c, d } = this;
    const untilMaySwitch = d.full ? Math.max(0, c.array.minimumRunS - this.runS) : 0;
    const f = (_x: number, y: number[]) => rates(c, hour, d, this.tap, y);
    const due = (y: number[]) => (d.full ? this.stops(hour, y) : this.begins(y));
    let length = untilMaySwitch > EVENT_TOLERANCE_S ? Math.min(dtS, untilMaySwitch) : dtS;
    let end = integrate(f, this.y, length);
    if (untilMaySwitch <= EVENT_TOLERANCE_S && due(end) >= 0) {
      let early = 0;
      while (length - early > EVENT_TOLERANCE_S) {
        const middle = 0.5 * (early + length);
        const there = integrate(f, this.y, middle);
        if (due(there) >= 0) {
          length = middle;
          end = there;
        } else early = middle;
      }
    }
    this.y = end;
    if (d.full) {
      this.runS += length;
      this.pumpS += length;
    }
    return length;
  }

  /** Water of the bottom layer meets the dry plate; the cold wall of the pipes takes its heat from that layer. */
  private fill(): void {
    const { array } = this.c;
    const bottomC = this.layer(this.last);
    const waterJPerK = array.fullJPerK - array.dryJPerK;
    this.y[ARRAY] = (array.dryJPerK * this.y[ARRAY]! + waterJPerK * bottomC) / array.fullJPerK;
    this.d.full = true;
    this.y[TOP + this.last]! -= (array.wallJPerK * (bottomC - this.y[WALL]!)) / (this.kg(this.last) * CP);
    this.y[WALL] = bottomC;
    this.runS = 0;
    this.starts++;
  }

  /** The water comes home at its own temperature and pushes the layers below its entry down, as a stream that mixes. */
  private drain(): void {
    const { layerKg } = this.c.store;
    const homeC = this.y[ARRAY]!;
    const entry = this.entry(homeC);
    const { last } = this;
    const byMass = (kg: number, t: number[]) =>
      t.map((here, i) => {
        if (i < entry) return 0;
        const above = i === entry ? homeC : t[i - 1]!;
        return (above - here) / (i === last ? layerKg + kg : layerKg);
      });
    const layers = integrate(byMass, this.y.slice(TOP, TOP + last + 1), this.c.array.waterKg);
    layers.forEach((t, i) => (this.y[TOP + i] = t));
    this.d.full = false;
  }

  /** Mixes layers that have come to lie under colder ones. */
  private turnOver(): void {
    const blocks: { kg: number; heat: number; count: number }[] = [];
    for (let i = 0; i <= this.last; i++) {
      let block = { kg: this.kg(i), heat: this.kg(i) * this.layer(i), count: 1 };
      for (
        let above = blocks.at(-1);
        above && above.heat / above.kg < block.heat / block.kg;
        above = blocks.at(-1)
      ) {
        block = { kg: above.kg + block.kg, heat: above.heat + block.heat, count: above.count + block.count };
        blocks.pop();
      }
      blocks.push(block);
    }
    const mixed = blocks.flatMap(({ kg, heat, count }) => Array<number>(count).fill(heat / kg));
    mixed.forEach((t, i) => (this.y[TOP + i] = t));
  }

  sums(): WeekSums {
    const { layers } = this.c.store;
    const at = sumsAt(layers);
    return {
      flowKwh: Object.fromEntries(FLOWS.map((flow, i) => [flow, this.y[at + i]!])) as Record<Flow, number>,
      starts: this.starts,
      pumpHours: this.pumpS / HOUR_S,
      layersC: this.y.slice(TOP, TOP + layers),
      airC: this.roomC.airC,
    };
  }
}

/**
 * Works the hours one after another.
 * @param house and design of the case
 * @param hours what each hour brings
 * @param start temperatures of layers and of the house at the start; array and pipes start at outdoor air
 */
export function integrateWeek(
  house: House,
  design: Design,
  hours: readonly Hour[],
  start: WeekStart,
): WeekSums {
  const week = new Week(house, design, start, hours[0]!);
  for (const hour of hours) week.hour(hour);
  return week.sums();
}
