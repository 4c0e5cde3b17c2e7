/** A method page: a title, a sentence on what it answers, and the files of the core whose equations it shows. */
export interface Topic {
  id: TopicId;
  title: string;
  text: string;
  files: readonly string[];
  /** room whose other files come to this page: a new file appears without a word here */
  restOf?: string;
}

export type TopicId =
  | 'weather'
  | 'sun'
  | 'plane'
  | 'collector'
  | 'dry-temperature'
  | 'loop'
  | 'store'
  | 'house'
  | 'emitters'
  | 'hot-water'
  | 'fluids'
  | 'year'
  | 'money'
  | 'bills'
  | 'correlation';

const physics = (...names: string[]) => names.map((name) => `lib/physics/${name}.ts`);
const sun = (...names: string[]) => names.map((name) => `lib/sun/${name}.ts`);
const simulation = (...names: string[]) => names.map((name) => `lib/simulation/${name}.ts`);

/** The method pages in the order in which a year is worked. */
export const TOPICS: readonly Topic[] = [
  {
    id: 'weather',
    title: 'The weather year',
    text: 'How a file becomes 8,760 hours, what is checked and repaired, and how twelve monthly means become a year that is always called synthetic.',
    files: [],
    restOf: 'lib/weather',
  },
  {
    id: 'sun',
    title: 'Where the sun stands',
    text: 'Position of the sun without refraction, irradiance outside the atmosphere, and the share of an hour in its day.',
    files: sun('sun-position', 'sun-year', 'extraterrestrial', 'hourly-share', 'air-mass'),
  },
  {
    id: 'plane',
    title: 'Sun and sky on the plane',
    text: 'Beam, sky and ground on a tilted plane, split of global irradiance, long-wave sky, and what skyline and rows take away.',
    files: [],
    restOf: 'lib/sun',
  },
  {
    id: 'collector',
    title: 'The collector',
    text: 'The efficiency curve of ISO 9806 and what lies behind it: cover optics, absorber, gap, wind and sky.',
    files: physics(
      'collector',
      'incidence-angle',
      'cover',
      'absorber',
      'gap-convection',
      'top-loss',
      'longwave-exchange',
    ),
  },
  {
    id: 'dry-temperature',
    title: 'The empty collector in the sun',
    text: 'How hot absorber, cover and back become when no water comes, hour by hour, and how long their materials bear it.',
    files: [...physics('dry-temperature', 'material-limits', 'ageing'), ...simulation('dry-hours')],
  },
  {
    id: 'loop',
    title: 'Pipes, pump and drain-back',
    text: 'The array filling and draining, what the pump lifts, what the pipes lose, and when a siphon boils.',
    files: [...simulation('array-loop'), ...physics('drain-back', 'pipe', 'pipe-flow', 'pump')],
  },
  {
    id: 'store',
    title: 'The store',
    text: 'Layers, flows between them, losses by surface, and exchangers.',
    files: [...simulation('store-layers'), ...physics('store-loss', 'heat-exchanger')],
  },
  {
    id: 'house',
    title: 'The house',
    text: 'The hourly network of five resistances and one capacity, heat loss, design load and sun through windows.',
    files: [...physics('house-network', 'design-heat-load', 'window-gain'), ...simulation('house-heat')],
  },
  {
    id: 'emitters',
    title: 'Floors, radiators and their supply',
    text: 'What floors and radiators give at a water temperature, and which temperature the outdoor reset asks for.',
    files: physics('floor', 'radiator', 'outdoor-reset', 'heat-pump'),
  },
  {
    id: 'hot-water',
    title: 'Hot water',
    text: 'Tapping over the day, cold water over the year, and mixing.',
    files: physics('hot-water'),
  },
  {
    id: 'fluids',
    title: 'Water, air and what else is used',
    text: 'Properties of water and air, and every equation that no other page holds.',
    files: physics('water', 'air'),
    restOf: 'lib/physics',
  },
  {
    id: 'year',
    title: 'The year and its fractions',
    text: 'The loop over the hours, who carried each of them, and three solar fractions side by side.',
    files: simulation('year', 'simulate', 'carriers', 'fractions', 'plane-sums', 'assemble-result'),
    restOf: 'lib/simulation',
  },
  {
    id: 'money',
    title: 'Money',
    text: 'Cost of solar heat with its receipt, replacements, payback and carbon dioxide, all in real prices.',
    files: [],
    restOf: 'lib/economics',
  },
  {
    id: 'bills',
    title: 'The house against its bills',
    text: 'How meter readings become a heat loss and a base load with their bands, and when the readings are too few to say.',
    files: [],
    restOf: 'lib/calibration',
  },
  {
    id: 'correlation',
    title: 'A monthly correlation beside it',
    text: 'Klein, Beckman and Duffie’s correlation of 1976 on its own standard system: an outside check, not the engine.',
    files: physics('monthly-fraction'),
  },
];

/** Files without a quantity: readers of bytes, tables of types, caches. */
export const WITHOUT_EQUATIONS: readonly string[] = [
  'lib/weather/hour-runs.ts',
  'lib/weather/hour-table.ts',
  'lib/weather/month-names.ts',
  'lib/weather/packed-weather.ts',
  'lib/weather/scan-bytes.ts',
  'lib/weather/weather-header.ts',
  'lib/weather/weather-result.ts',
  'lib/weather/weather-year.ts',
  'lib/weather/with-thousands.ts',
  ...simulation(
    'build-plan',
    'design',
    'engine-version',
    'field-plan',
    'hour-columns',
    'plan',
    'results',
    'site-cache',
    'tally',
    'warm-up',
  ),
];

/** The address of a method page, or of one function on it. */
export function methodHref(topic: TopicId, name?: string): string {
  return name === undefined ? `/method/${topic}` : `/method/${topic}#${name}`;
}
