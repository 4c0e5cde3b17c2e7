import { climates } from '@/data/climates/climates';
import { collectorByCover } from '@/data/collectors/generic';
import { demonstration } from '@/data/demonstration/larkspur-house';
import type { Collector, Design, House, Numerics } from '@/lib/simulation/design';
import type { YearResult } from '@/lib/simulation/results';
import { createSimulator, type SimulationInput, type Simulator } from '@/lib/simulation/simulate';

export const [upland, lowland] = climates.map((climate) => climate.weatherYear()) as [
  SimulationInput['weather'],
  SimulationInput['weather'],
];

/** What a case changes of the demonstration's house and its first design. */
export interface Change {
  cover?: Collector['cover'];
  array?: Partial<Design['array']>;
  second?: Design['second'];
  loop?: Partial<Design['loop']>;
  controller?: Partial<Design['controller']>;
  store?: Partial<Design['store']>;
  supply?: Partial<Design['supply']>;
  house?: Partial<House>;
  hotWater?: Partial<House['hotWater']>;
  backup?: Partial<House['backup']>;
  numerics?: Partial<Numerics>;
  weather?: SimulationInput['weather'];
}

/** The demonstration's house with 24 m² mounted all year, changed. */
export function example(change: Change = {}): SimulationInput {
  const { house, designs } = demonstration;
  const design: Design = designs[0]!;
  return {
    weather: change.weather ?? upland,
    house: {
      ...house,
      ...change.house,
      hotWater: { ...house.hotWater, ...change.hotWater },
      backup: { ...house.backup, ...change.backup },
    },
    design: {
      collector: change.cover ? collectorByCover[change.cover] : design.collector,
      array: { ...design.array, mountedMonths: Array<boolean>(12).fill(true), ...change.array },
      second: change.second ?? null,
      loop: { ...design.loop, ...change.loop },
      controller: { ...design.controller, ...change.controller },
      store: { ...design.store, ...change.store },
      supply: { ...design.supply, ...change.supply },
    },
    numerics: { theta: 0.5, skyModel: 'hdkr', ...change.numerics },
  };
}

const { floor, radiators, zones } = demonstration.house.emitters;

export const onlyFloor: House['emitters'] = {
  kind: 'water',
  floor,
  radiators: { ...radiators, ratedW: 0 },
  zones,
};
export const onlyRadiators: House['emitters'] = {
  kind: 'water',
  floor: { ...floor, areaM2: 0 },
  radiators: { ...radiators, ratedW: 18_000 },
  zones,
};
export const idealHeat: House['emitters'] = { ...demonstration.house.emitters, kind: 'ideal' };
/** Radiators fed with 55 °C on the coldest day. */
export const supply55: Design['supply'] = { designSupplyC: 55, designSpreadK: 12, limitC: 65 };

/** The year of a design; throws where the engine answers with an error. */
export function yearOf(input: SimulationInput, simulator: Simulator = createSimulator()): YearResult {
  const outcome = simulator.run(input);
  if (!outcome.ok) throw new Error(`${outcome.code}: ${outcome.message}`);
  return outcome.result;
}
