/** A limit of the model: what it does not know, and what that means for a reader. */
export interface ModelLimit {
  subject: string;
  text: string;
}

/** Where the figures end. */
export const MODEL_LIMITS: readonly ModelLimit[] = [
  {
    subject: 'Withdrawn standards',
    text: 'ISO 13790:2008 was superseded by ISO 52016-1, and EN 12975-2 by ISO 9806 (both from memory). The hourly network of ISO 13790 is used all the same: it has five resistances and one capacity, each with a printed value, it takes a heated slab as one more node, and a year of it costs milliseconds, which lets the whole year follow a slider. The later standard resolves each building element and asks for layers that owners rarely know. Curves tested to EN 12975-2 are converted to the form of ISO 9806:2017 and keep their values.',
  },
  {
    subject: 'One zone',
    text: 'The house is one room with one temperature. A sunny south room that is too warm while a north room is cold is not seen.',
  },
  {
    subject: 'Typical weather',
    text: 'A typical or synthetic year is no forecast. Single winters lie some 10 to 20 % of solar heat above or below (common practice, no source). A synthetic year meets its monthly means exactly and invents its days.',
  },
  {
    subject: 'Homemade collectors',
    text: 'A curve from flat-plate theory holds for a collector built as drawn: dry insulation, a tight cover, a mat in full contact. Measure one before trusting the second digit; the origin stands beside every value.',
  },
  {
    subject: 'Beyond the tested range',
    text: 'A fitted efficiency curve is carried on beyond its test points. For dry temperatures it is not used alone: the balance of absorber and cover, or a declared stagnation temperature, decides.',
  },
  {
    subject: 'Snow, dirt, leaks, people',
    text: 'Snow on the array, dirty covers, air in the loop, wrong sensors and habits are not modelled. Evaluations find less saved than predicted more often than more.',
  },
  {
    subject: 'Hydraulics',
    text: 'Flow is an input: rows are taken as evenly supplied. Fall of the pipes, siphon height and boiling are judged by checks, not by the year.',
  },
];

/** Where the work can hurt: said on the page before anything is built. */
export const CAUTIONS: readonly ModelLimit[] = [
  {
    subject: 'Hot surfaces and steam',
    text: 'An empty collector in the sun can pass the boiling point of water and the softening point of plastics. Do not fill a hot collector; do not touch it.',
  },
  {
    subject: 'Scald',
    text: 'Water of a solar store can scald in a second. A mixing valve at the tap side belongs to every system; people who cannot step back need lower limits.',
  },
  {
    subject: 'Legionella',
    text: 'Lukewarm drinking water can breed legionella. Preheat through an exchanger and follow the local rules on temperature and volume; the model does not judge hygiene.',
  },
  {
    subject: 'Pressure and boiling',
    text: 'A closed loop needs a safety valve and an expansion vessel sized by a licensed fitter. An open, vented loop must stay open.',
  },
  {
    subject: 'Wind, snow and roof',
    text: 'Arrays are sails. Loads, fixings and the roof’s reserve follow the local code and a structural engineer.',
  },
  {
    subject: 'Electricity',
    text: 'Pump, controller and any heater follow the local wiring rules and are connected by those who may.',
  },
  {
    subject: 'Hot polymer and fire',
    text: 'Foams and films soften, sag and may burn. Keep them away from flues and below the limits printed with each part.',
  },
];
