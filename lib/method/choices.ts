import { arraySchema, controllerSchema } from '@/lib/schemas/design';
import { defaultWords } from './default-words';

/** Something that the equations leave open and the engine settles. */
export interface Choice {
  subject: string;
  /** what is done; {NAME} stands for the number of that name in `fixedIn` */
  text: string;
  /** by how much another honest choice moves the yearly solar heat, as measured on a prototype */
  effect?: string;
  /** the files in which the choice is made */
  fixedIn: readonly string[];
}

const { startK, stopK, minimumRunS, inhibitC, storeLimitC } = controllerSchema.shape;

/**
 * Two honest engines differ by up to a tenth of the solar heat when these are not written down. Each result
 * carries the engine version that fixes them.
 */
export const CHOICES: readonly Choice[] = [
  {
    subject: 'Hour',
    text: 'Row h stands for the hour from h to h + 1 in local standard time. The sun stands at the middle of the sunlit part of the hour and moves by one calendar year for every row, whatever years a file names. With the sun down, beam in the file is ignored and diffuse is isotropic.',
    fixedIn: ['lib/sun/sun-year.ts'],
  },
  {
    subject: 'Values at the stamp',
    text: 'Irradiance is the mean of its interval. Air temperature and wind of most file formats stand at the stamp: the mean of both ends of the hour is used.',
    effect: '−0.1 to −1.1 % against holding the value',
    fixedIn: ['lib/simulation/site-cache.ts'],
  },
  {
    subject: 'Plane',
    text: 'Beam on the plane is the normal beam times cos θ; ratios to the horizontal use cos θz of at least {MIN_COS_ZENITH}. Sky by Hay, Davies, Klucher and Reindl unless another model is chosen; its circumsolar part counts as beam in the incidence-angle modifier, the rest takes the diffuse modifier.',
    effect: '−0.5 to −2.2 % otherwise',
    fixedIn: ['lib/sun/irradiance-on-plane.ts'],
  },
  {
    subject: 'Collector',
    text: 'The linear loss a1 + a3 (u − 3) is not let below 0.3 a1; the quadratic term is a2 Δ |Δ|, so that it warms a collector colder than the air.',
    fixedIn: ['lib/physics/collector.ts'],
  },
  {
    subject: 'Wind at the collector',
    text: `Wind of the file, measured at 10 m, times an input, ${defaultWords(arraySchema.shape.windFactor)} by default.`,
    effect: '−3 to −7 % with factor 1 where a3 matters',
    fixedIn: ['lib/simulation/build-plan.ts'],
  },
  {
    subject: 'Pump, start',
    text: `Starts when the empty absorber is ${defaultWords(startK)} above the bottom layer, the store is not locked, the plate is below ${defaultWords(inhibitC)} and the array is mounted; all three numbers are inputs.`,
    fixedIn: ['lib/simulation/array-loop.ts'],
  },
  {
    subject: 'Pump, stop',
    text: `Stops when outlet − inlet falls below ${defaultWords(stopK)} after at least ${defaultWords(minimumRunS)}, or when the top of the store passes its limit of ${defaultWords(storeLimitC)} (unlocked {STORE_UNLOCK_K} K lower), or when the array is taken down; limit and taking down override the minimum run.`,
    effect: 'the stop pair: up to −5.7 %',
    fixedIn: ['lib/simulation/charge-step.ts', 'lib/simulation/build-plan.ts'],
  },
  {
    subject: 'Drained state',
    text: 'The empty plate has a capacity of its own; the water content comes on top when it fills. Filling brings water of the bottom layer to the dry plate and to the pipe wall at outdoor temperature; at stop the water comes home at its temperature, into its level. Lift is electric energy only.',
    effect: '+0.5 to +2.9 % against one capacity',
    fixedIn: ['lib/simulation/array-loop.ts'],
  },
  {
    subject: 'Charging',
    text: 'Into the first layer from the top that is not warmer than the entering water, else into the bottom.',
    fixedIn: ['lib/simulation/store-layers.ts'],
  },
  {
    subject: 'Heating draw',
    text: 'From the top; the return goes to the first layer that is not warmer than it.',
    fixedIn: ['lib/simulation/store-layers.ts'],
  },
  {
    subject: 'Hot water',
    text: 'A plate exchanger of constant effectiveness in balanced counter-flow, store water from the top back to the bottom; the tap side is mixed down to the set point. A coil in the store can be chosen instead.',
    effect: 'a coil instead: −1.3 %',
    fixedIn: ['lib/simulation/charge-step.ts'],
  },
  {
    subject: 'Order of heat',
    text: 'Top of the store at or above the set supply: mixing valve. Set supply above the top, and the top more than {RETURN_MARGIN_K} K above the return: the whole loop flow runs through the store and the backup lifts it to the set supply. Otherwise the backup alone, up to its rated power. What it cannot give is reported as unmet.',
    effect: 'without preheating the return: up to −10 %',
    fixedIn: ['lib/simulation/emitter-duty.ts'],
  },
  {
    subject: 'Thermostat',
    text: 'Senses the air; proportional over ± {HALF_BAND_K} K; acts as duty at full loop flow and set supply. No heating while outdoor air is at or above the set point.',
    effect: 'as modulation of the flow: +2 to +7 %',
    fixedIn: ['lib/simulation/emitter-duty.ts'],
  },
  {
    subject: 'Outdoor reset',
    text: 'From the outdoor temperature of the hour and the day’s set point, also at night, limited by the emitter’s limiter.',
    fixedIn: ['lib/physics/outdoor-reset.ts'],
  },
  {
    subject: 'Floor',
    text: 'Water to slab by 1/(1/K_H − 1/10.8): K_H of EN 1264 already holds the surface film. Slab to the surface node of the house by the floor’s own law, 8.92 |ΔT|^0.1 with |ΔT| of at least {LEAST_EXCESS_K} K. Loss downwards is an input.',
    effect: 'the film counted twice: −2 to −7 % of the load',
    fixedIn: ['lib/physics/floor.ts'],
  },
  {
    subject: 'Radiator',
    text: 'Rated at 75/65/20 °C (excess {RATED_EXCESS_K} K), arithmetic mean excess.',
    fixedIn: ['lib/physics/radiator.ts'],
  },
  {
    subject: 'Heat of a radiator',
    text: 'A share of {RADIATOR_TO_AIR} goes to the air, the rest to the surface node.',
    fixedIn: ['lib/simulation/emitter-duty.ts'],
  },
  {
    subject: 'Store',
    text: 'Equal layers. Loss by surface, end caps on the end layers, to the room of the store; credited to the house only where the store stands inside. Vertical conduction {STORE_CONDUCTIVITY} W/(m K). Layers under colder ones are mixed after every sub-step. The number of layers is a model parameter and printed with every result.',
    fixedIn: ['lib/simulation/build-plan.ts'],
  },
  {
    subject: 'House',
    text: 'Gains are split as in ISO 13790, with the re-loss through windows. Set point on the air. Windows are opened above {OPENING_C} °C and then let {OPENING_FACTOR} times the air through, unless that is switched off.',
    fixedIn: ['lib/simulation/hour-drive.ts'],
  },
  {
    subject: 'Year',
    text: 'The last two months of the year are run first to set the starting state. Where the heat stored at the end of the year then differs from that at its start by more than {STORED_TOLERANCE} of what went in, the year is run again, {MOST_YEARS} times at most; the change that is left is reported with the balance.',
    fixedIn: ['lib/simulation/simulate.ts'],
  },
  {
    subject: 'Solar heat',
    text: 'Heat from the store to heating and to hot water, and from the array straight to a slab where there is no store. A loss of the store is never counted as useful unless the store stands inside and the house needs heat.',
    fixedIn: ['lib/simulation/assemble-result.ts'],
  },
  {
    subject: 'Fractions',
    text: 'Three, by name and side by side. Unmet heat is added to the backup’s before saving is judged; pump power counts at an efficiency of {ELECTRIC_EFFICIENCY}.',
    fixedIn: ['lib/simulation/fractions.ts'],
  },
  {
    subject: 'Who carried an hour',
    text: 'The source with the larger share of the heat given to rooms and hot water; a second source from a share of {SHARED_FROM} on marks the hour as shared; below {NEED_SHARE} of the design load nothing is needed; unmet heat is a class of its own.',
    fixedIn: ['lib/simulation/carriers.ts'],
  },
  {
    subject: 'Dry temperature',
    text: 'Steady balance of absorber and cover in every mounted hour with enough sun, pump or no pump. The hottest plate of the run is another number and is labelled so.',
    fixedIn: ['lib/physics/dry-temperature.ts'],
  },
  {
    subject: 'Steps',
    text: '{STEPS_PER_HOUR} outer steps an hour for house, thermostat and loops. Inside them array and store advance to the next switch of the pump, found in closed form, and by no more than a share θ of a layer’s flush. Temperatures that are not numbers stop the run; the page keeps its last good result.',
    effect: 'holding the pump for whole hours: 15 %, with a perfect balance',
    fixedIn: ['lib/simulation/build-plan.ts'],
  },
];
