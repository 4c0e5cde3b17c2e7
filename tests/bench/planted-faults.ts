/** A fault that is planted in a copy of the product, and the tests that have to notice it. */
export interface PlantedFault {
  name: string;
  file: string;
  /** stands in the file exactly once */
  search: string;
  replace: string;
  /** test files, and a part of the names of the tests when not all of them are needed */
  tests: readonly string[];
  only?: string;
}

const SYSTEM = ['tests/system/system.test.ts'];
const REFERENCE = ['tests/reference/reference.test.ts'];
const YEAR = ['tests/simulation/year.test.ts'];

export const plantedFaults: readonly PlantedFault[] = [
  {
    name: 'wind lowers the loss (sign of a3)',
    file: 'lib/physics/collector.ts',
    search: 'a1 + a3 * (windMPerS - REFERENCE_WIND_M_PER_S)',
    replace: 'a1 - a3 * (windMPerS - REFERENCE_WIND_M_PER_S)',
    tests: SYSTEM,
  },
  {
    name: 'film of the floor used twice',
    file: 'lib/physics/floor.ts',
    search: 'return 1 / (1 / toRoom - 1 / (FLOOR_FILM_W_PER_M2K * areaM2));',
    replace: 'return toRoom;',
    tests: ['tests/physics/floor.test.ts', ...SYSTEM],
  },
  {
    name: 'pipes lose nothing while they stand drained',
    file: 'lib/simulation/array-loop.ts',
    search: 'this.pipeLossJ = pipeCapacityJPerK * pipeGap * (1 - kept);',
    replace: 'this.pipeLossJ = 0;',
    tests: SYSTEM,
  },
  {
    name: 'cold pipes take no heat on filling',
    file: 'lib/simulation/array-loop.ts',
    search: 'store.coolBottom(pipeHeatJ);',
    replace: 'store.coolBottom(0);',
    tests: ['tests/simulation/drain-cycles.test.ts'],
  },
  {
    name: 'water comes home to the top of the store',
    file: 'lib/simulation/store-layers.ts',
    search: 'const level = this.levelFor(waterC);',
    replace: 'const level = 0;',
    tests: SYSTEM,
  },
  {
    name: 'upwind the wrong way round',
    file: 'lib/simulation/store-layers.ts',
    search: 'flow * (flow > 0 ? here : below)',
    replace: 'flow * (flow > 0 ? below : here)',
    tests: SYSTEM,
  },
  {
    name: 'layers that lie under colder ones stay there',
    file: 'lib/simulation/store-layers.ts',
    search: 'if (!sorted) this.mergeInversions();',
    replace: '',
    tests: [...SYSTEM, 'tests/property/store-layers.test.ts'],
  },
  {
    name: 'sun an hour late',
    file: 'lib/simulation/site-cache.ts',
    search: 'sunYear(weather, weather.sunShiftH)',
    replace: 'sunYear(weather, weather.sunShiftH + 1)',
    tests: SYSTEM,
  },
  {
    name: 'diffuse modifier ignored',
    file: 'lib/simulation/accepted-sun.ts',
    search: 'curve.diffuseModifier * (year.diffuseWm2',
    replace: '(year.diffuseWm2',
    tests: SYSTEM,
  },
  {
    name: 'array put up a month early',
    file: 'lib/simulation/hour-columns.ts',
    search: 'months[monthOf(h)] ? 1 : 0',
    replace: 'months[(monthOf(h) + 1) % 12] ? 1 : 0',
    tests: YEAR,
    only: 'starts no pump in months',
  },
  {
    name: 'loss of the pipes left out of the balance',
    file: 'lib/simulation/tally.ts',
    search: 'this.pipeLossJ += this.hourPipeJ;',
    replace: '',
    tests: YEAR,
    only: 'closes to 1e-11 of its inputs: the demonstration',
  },
  {
    name: 'radiators give to the surfaces what belongs to the air',
    file: 'lib/simulation/emitter-duty.ts',
    search: 'const RADIATOR_TO_AIR = 0.7;',
    replace: 'const RADIATOR_TO_AIR = 0.3;',
    tests: SYSTEM,
  },
  {
    name: 'radiators see the room without their own heat',
    file: 'lib/simulation/emitter-duty.ts',
    search: 'radiatorWPerK * (this.supplyC - this.roomC)',
    replace: 'radiatorWPerK * (this.supplyC - network.airC)',
    tests: SYSTEM,
  },
  {
    name: 'band of the thermostat twice as wide',
    file: 'lib/simulation/emitter-duty.ts',
    search: 'const HALF_BAND_K = 0.5;',
    replace: 'const HALF_BAND_K = 1;',
    tests: SYSTEM,
  },
  {
    name: 'seasons of the cold water turned round',
    file: 'lib/physics/hot-water.ts',
    search: 'southern ? DAYS_PER_YEAR / 2 : 0',
    replace: 'southern ? 0 : DAYS_PER_YEAR / 2',
    tests: REFERENCE,
    only: 'C3-',
  },
  {
    name: 'seasons of the cold water by the wrong half of the Earth',
    file: 'lib/simulation/build-plan.ts',
    search: 'const south = weather.latitudeDeg < 0;',
    replace: 'const south = weather.latitudeDeg > 0;',
    tests: SYSTEM,
  },
  {
    name: 'coefficient of performance upside down',
    file: 'lib/physics/heat-pump.ts',
    search: '(carnotShare * toKelvin(supplyC)) / liftK',
    replace: '(carnotShare * liftK) / toKelvin(supplyC)',
    tests: REFERENCE,
    only: 'H8',
  },
  {
    name: 'heat pump warms taps and rooms the wrong way round',
    file: 'lib/simulation/hour-columns.ts',
    search: 'heatPumpCop(sourceC(h), house.hotWater.setC, heatPump.carnotShare)',
    replace: 'heatPumpCop(sourceC(h), supplySetC[h]!, heatPump.carnotShare)',
    tests: ['tests/simulation/setback-and-heat-pump.test.ts'],
  },
  {
    name: 'stop difference counted once for both halves of the spread',
    file: 'lib/simulation/array-loop.ts',
    search: '(0.5 * this.input.stopK + fromSink',
    replace: '(this.input.stopK + fromSink',
    tests: SYSTEM,
  },
  {
    name: 'least run of the pump forgotten',
    file: 'lib/simulation/array-loop.ts',
    search: 'this.mustRunS = this.input.minimumRunS;',
    replace: 'this.mustRunS = 0;',
    tests: SYSTEM,
  },
  {
    name: 'sun that the glass lets out again kept in the house',
    file: 'lib/physics/house-network.ts',
    search: 'this.gainToSurface = 1 - this.gainToMass - this.gainLost;',
    replace: 'this.gainToSurface = 1 - this.gainToMass;',
    tests: [...REFERENCE],
    only: 'A2:',
  },
  {
    name: 'store outside the house warms it',
    file: 'lib/simulation/build-plan.ts',
    search: 'storeInside: design.store.insideHouse && !toSlab,',
    replace: 'storeInside: !toSlab,',
    tests: SYSTEM,
  },
];
