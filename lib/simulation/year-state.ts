import { HouseNetwork } from '@/lib/physics/house-network';
import { ArrayLoop } from './array-loop';
import { fieldsOf, type Plan } from './plan';
import { StoreLayers } from './store-layers';

/** The bodies that carry heat from one hour to the next. */
export class YearState {
  readonly network: HouseNetwork;
  readonly store: StoreLayers;
  /** one for each collector field */
  readonly loops: ArrayLoop[];
  /** the sink is too warm to be charged */
  locked = false;
  windowsOpen = false;
  /** heat that the store lost to its room in the last step [W] */
  storeLossW = 0.0;
  /** sun that the array put into the slab in the last step, downward loss taken off [W] */
  slabSunW = 0.0;
  subSteps = 0;
  /** hour in which a run was given up [h] */
  lastHour = 0;

  constructor(plan: Plan) {
    this.network = new HouseNetwork(plan.network);
    this.network.reset(plan.roomSetC);
    this.store = new StoreLayers(
      plan.layers,
      plan.storeKg,
      plan.storeLossWPerK,
      plan.conductionWPerK,
      plan.storeRoomC,
      fieldsOf(plan).length,
    );
    this.store.t.fill(plan.roomSetC);
    this.store.flows.effectiveness = plan.exchangerEffectiveness;
    this.loops = fieldsOf(plan).map(({ array }) => {
      if (!array.ownVessel) this.store.takeFromBottom(-array.waterKg);
      const loop = new ArrayLoop(array);
      loop.arrayC = loop.pipeC = plan.columns.outdoorC[0]!;
      loop.vesselC = array.vesselRoomC;
      return loop;
    });
  }
}
