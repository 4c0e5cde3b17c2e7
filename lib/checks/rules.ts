import { FLOOR_LIMITS } from '@/lib/physics/floor';
import type { PartDryness } from '@/lib/simulation/results';
import { pumpDuty } from '@/lib/simulation/field-plan';
import { builtFields } from '@/lib/simulation/built-fields';
import { emitterLoop, houseHeat } from '@/lib/simulation/house-heat';
import { shortestNoonShadow } from '@/lib/sun/row-shading';
import { formatFixed, formatShare, formatSignificant, withUnit } from '@/lib/units/display';
import { DAYS_IN_MONTH, HOURS_PER_DAY, SECONDS_PER_HOUR } from '@/lib/units/constants';
import type { CheckSubject } from './findings';
import { EQUATION_RANGES } from './ranges';

export type Severity = 'stop' | 'caution' | 'note';
export type Where = 'collector' | 'array' | 'store' | 'supply' | 'hot water' | 'house' | 'prices' | 'weather';

/** One engineering check: what it judges, what it says, and where the limit comes from. */
export interface Rule {
  id: string;
  severity: Severity;
  where: Where;
  source: string;
  /** the sentences to print; none when all is well */
  judge: (subject: CheckSubject) => string[];
}

const MONTHS = [
  'January', 'February', 'March', 'April', 'May', 'June', 'July', 'August', 'September', 'October', 'November', 'December',
] as const; // prettier-ignore

/** Head beyond lift and friction that fills an array with certainty [m]. */
const FILL_RESERVE_M = 1.2;
/** Absorbers that hold this much water are soft mats, not metal plates [L/m²]. */
const SOFT_ABSORBER_L_PER_M2 = 3;

const celsius = (value: number) => withUnit(formatFixed(value), '°C');
const hoursText = (hours: number) => (hours === 1 ? 'one hour' : `${formatFixed(hours)} hours`);
/** " of the second field" where a design has two. */
const of = (name: string) => (name === 'array' ? '' : ` of the ${name}`);
const when = (condition: boolean, text: () => string): string[] => (condition ? [text()] : []);

function dayOf(hour: number): string {
  let day = Math.floor(hour / HOURS_PER_DAY);
  for (let month = 0; month < 12; month++) {
    const days = DAYS_IN_MONTH[month]!;
    if (day < days) return `${day + 1} ${MONTHS[month]!}`;
    day -= days;
  }
  return '';
}

function tooHot(part: PartDryness): string {
  return `Empty in the sun, the ${part.name} (${part.material}) reaches ${celsius(part.hottestC)} on ${dayOf(part.hottestHour)}; it bears ${celsius(part.shortTermLimitC)} for short times. ${hoursText(part.hoursAboveShort)} a year above. Steeper, fewer months, a vent flap or a heat-proof face layer help.`;
}

function hotPart(place: PartDryness['place'], id: string): Rule[] {
  return [
    {
      id,
      severity: 'stop',
      where: 'collector',
      source: 'limits of the material, low end; data/materials',
      judge: ({ result }) =>
        result.dryParts.filter((p) => p.place === place && p.hottestC > p.shortTermLimitC).map(tooHot),
    },
    {
      id: `${id} lasting`,
      severity: 'caution',
      where: 'collector',
      source: 'lasting limit of the material, low end; from 24 hours a year on: common practice, no source',
      judge: ({ result }) =>
        result.dryParts
          .filter((p) => p.place === place && p.hottestC <= p.shortTermLimitC && p.hoursAboveLong > 24)
          .map(
            (p) =>
              `Empty in the sun, the ${p.name} (${p.material}) is above its lasting limit of ${celsius(p.longTermLimitC)} for ${hoursText(p.hoursAboveLong)} a year. It will age sooner.`,
          ),
    },
  ];
}

/** All checks, in the order of their ids. */
export const RULES: readonly Rule[] = [
  ...hotPart('absorber', 'M1'),
  ...hotPart('back', 'M2'),
  ...hotPart('cover', 'M3'),
  {
    id: 'X1',
    severity: 'stop',
    where: 'house',
    source: 'energy balance',
    judge: ({ result }) =>
      when(
        !(result.balance.residualShare <= 1e-3),
        () => 'The energy balance of this run does not close. Its figures must not be used.',
      ),
  },
  {
    id: 'E1',
    severity: 'stop',
    where: 'supply',
    source: 'EN 1264-2: 29 °C where people stay',
    judge: ({ house, design, result }) => {
      const hottest = result.year.floorHeatedMaxC;
      return when(
        house.emitters.kind === 'water' &&
          house.emitters.floor.areaM2 > 0 &&
          hottest > FLOOR_LIMITS.occupiedC,
        () =>
          `The heated floor reaches ${celsius(hottest)}; ${celsius(FLOOR_LIMITS.occupiedC)} is the limit where people stay. Lower the supply of ${celsius(design.supply.designSupplyC)}.`,
      );
    },
  },
  {
    id: 'E3',
    severity: 'stop',
    where: 'supply',
    source: 'EN 1264-4: 60 °C anywhere in a floor, 55 °C for screed (from memory)',
    judge: ({ house, design }) => {
      const most = Math.min(design.supply.limitC, design.supply.designSupplyC);
      return when(
        house.emitters.floor.areaM2 > 0 && most > 55,
        () => `A supply of ${celsius(most)} is too hot for screed; ${celsius(55)} is its limit.`,
      );
    },
  },
  {
    id: 'E4',
    severity: 'caution',
    where: 'supply',
    source: 'EN 1264-4 (from memory)',
    judge: ({ house, design }) =>
      when(
        house.emitters.floor.areaM2 > 0 && design.controller.storeLimitC > 60 && design.supply.limitC > 55,
        () =>
          `The store may reach ${celsius(design.controller.storeLimitC)}; a mixing valve and a limiter at ${celsius(55)} or less must keep that from the floor.`,
      ),
  },
  {
    id: 'E5',
    severity: 'caution',
    where: 'supply',
    source: 'common practice, no source: 49 °C beside solar heat',
    judge: ({ design }) =>
      when(
        design.supply.designSupplyC > 49,
        () =>
          `A supply of ${celsius(design.supply.designSupplyC)} on the coldest day asks for more than low-temperature collectors give well; up to ${celsius(49)} suits them.`,
      ),
  },
  {
    id: 'E6',
    severity: 'caution',
    where: 'supply',
    source: 'EN 442-2, EN 1264-2: output at the design temperatures against the design load of EN 12831-1',
    judge: ({ house, design }) => {
      if (house.emitters.kind === 'ideal') return [];
      const heat = houseHeat(house);
      const loop = emitterLoop(house, heat, design.supply);
      const share = (loop.floorDesignW + loop.radiatorDesignW) / heat.designLoadW;
      return when(
        share < 0.97,
        () =>
          `At ${celsius(design.supply.designSupplyC)} floor and radiators give ${formatShare(share)} of the design load. The rooms get colder on the coldest days, or need a warmer supply.`,
      );
    },
  },
  {
    id: 'U1',
    severity: 'caution',
    where: 'house',
    source: 'own definition: heat missing at the static loss of the house',
    judge: ({ result }) => {
      const { unmetKwh, heatingKwh } = result.year;
      return when(
        unmetKwh > 0.005 * heatingKwh && unmetKwh > 1,
        () =>
          `${withUnit(formatSignificant(unmetKwh, 2), 'kWh')} a year are not met: rooms fall to ${celsius(result.year.roomMinC)}.`,
      );
    },
  },
  {
    id: 'S1',
    severity: 'caution',
    where: 'store',
    source: 'common practice, no source: 30 to 150 L per m²',
    judge: ({ design }) => {
      const areaM2 = builtFields(design).reduce((sum, { array }) => sum + array.areaM2, 0);
      if (areaM2 <= 0 || design.loop.layout === 'straight to the slab') return [];
      const ratio = design.store.volumeL / areaM2;
      return when(
        ratio < 30 || ratio > 150,
        () =>
          `${withUnit(formatFixed(ratio), 'L')} of store per m² of array; 30 to 150 is the usual range. Too little stops the pump early, too much only loses heat.`,
      );
    },
  },
  {
    id: 'A2',
    severity: 'note',
    where: 'array',
    source: 'common practice, no source: within 45° of the equator',
    judge: ({ design, result }) =>
      builtFields(design).flatMap(({ array, name }) => {
        const south = result.year.southern ? 0 : 180;
        const off = Math.abs(((array.azimuthDeg - south + 540) % 360) - 180);
        return when(
          off > 45,
          () =>
            `The ${name} looks ${withUnit(formatFixed(off), '°')} away from the equator; its winter sun is weak.`,
        );
      }),
  },
  {
    id: 'H3',
    severity: 'stop',
    where: 'array',
    source: 'common practice, no source: lift to the top of the array + 1.2 m + friction',
    judge: ({ design: { loop, ...design } }) =>
      builtFields(design).flatMap(({ array, name }) => {
        const neededM = pumpDuty({ array, loop }).fillHeadM + FILL_RESERVE_M;
        return when(
          loop.pump.kind === 'curve' && loop.pump.shutOffHeadM < neededM,
          () =>
            `The pump lifts ${withUnit(formatFixed(loop.pump.shutOffHeadM, 1), 'm')} at most; filling the ${name} asks for ${withUnit(formatFixed(neededM, 1), 'm')}. It will not start.`,
        );
      }),
  },
  {
    id: 'H6',
    severity: 'stop',
    where: 'array',
    source: 'common practice, no source: soft absorbers bear no vacuum',
    judge: ({ design }) =>
      when(
        design.loop.pump.returnPipe === 'siphon' &&
          builtFields(design).some(
            ({ collector }) => collector.curve.waterContentLPerM2 >= SOFT_ABSORBER_L_PER_M2,
          ),
        () =>
          'A siphon return pulls a vacuum at the top of the array; a soft absorber collapses under it. Vent the top and let the pump pay the lift.',
      ),
  },
  {
    id: 'H12',
    severity: 'caution',
    where: 'array',
    source: 'common practice, no source: 15 to 100 L/h per m²',
    judge: ({ design: { loop, ...design } }) =>
      builtFields(design).flatMap(({ array, name }) => {
        const perHour = (pumpDuty({ array, loop }).flowKgPerS / array.areaM2) * SECONDS_PER_HOUR;
        return when(
          perHour > 0 && (perHour < 15 || perHour > 100),
          () => `The flow${of(name)} is ${withUnit(formatFixed(perHour), 'L/h')} per m²; 15 to 100 is usual.`,
        );
      }),
  },
  {
    id: 'H18',
    severity: 'caution',
    where: 'array',
    source: 'common practice, no source: 5 % of useful heat',
    judge: ({ result }) => {
      const { pumpKwh, solarHeatingKwh, solarTapKwh } = result.year;
      const share = pumpKwh / (solarHeatingKwh + solarTapKwh);
      return when(
        share > 0.05,
        () =>
          `The pump takes ${formatShare(share)} of the solar heat as electricity. A smaller lift or flow helps.`,
      );
    },
  },
  {
    id: 'H20',
    severity: 'caution',
    where: 'array',
    source: 'common practice, no source: 20 starts a day',
    judge: ({ design, result }) => {
      const days = DAYS_IN_MONTH.reduce(
        (sum, count, month) =>
          sum + count * builtFields(design).filter(({ array }) => array.mountedMonths[month]).length,
        0,
      );
      const perDay = days > 0 ? result.year.starts / days : 0;
      return when(
        perDay > 20,
        () => `About ${formatFixed(perDay)} starts a day: look at the start and stop differences.`,
      );
    },
  },
  {
    id: 'X5',
    severity: 'note',
    where: 'array',
    source: 'common practice, no source',
    judge: ({ result }) =>
      when(
        result.year.unusedKwh > 0.2 * result.year.collectedKwh,
        () =>
          `${withUnit(formatSignificant(result.year.unusedKwh, 2), 'kWh')} a year find a full store and stay unused, most of it in summer.`,
      ),
  },
  {
    id: 'D1',
    severity: 'caution',
    where: 'hot water',
    source:
      'public guidance on hot and cold water: 20 to 45 °C is the range in which legionella grow; local rules prevail',
    judge: ({ house, design }) =>
      when(
        house.hotWater.litresPerDay > 0 &&
          (house.hotWater.exchanger === 'coil' || house.hotWater.exchangerEffectiveness > 0) &&
          design.loop.layout !== 'straight to the slab' &&
          builtFields(design).length > 0,
        () =>
          'Preheated drinking water lies between 20 and 45 °C, where legionella grow. Keep it in the exchanger only, heat it through after that, and follow local rules.',
      ),
  },
  {
    id: 'D2',
    severity: 'caution',
    where: 'hot water',
    source: 'published burn tables; 45 °C at most for vulnerable users',
    judge: ({ house }) =>
      when(
        house.hotWater.litresPerDay > 0 && house.hotWater.setC > 45,
        () =>
          `Tap at ${celsius(house.hotWater.setC)}: a thermostatic mixing valve is needed; ${celsius(45)} at most where children, old or ill people wash.`,
      ),
  },
  {
    id: 'A4',
    severity: 'caution',
    where: 'array',
    source: 'geometry of infinitely long rows at solar noon of the shortest day, level horizon',
    judge: ({ design, result }) =>
      builtFields(design).flatMap(({ array, name }) => {
        if (array.rows <= 1) return [];
        const { shaded, clearSpacingM } = shortestNoonShadow(array, array, result.year.latitudeDeg);
        return when(
          shaded >= 0.01,
          () =>
            `At noon of the shortest day each row${of(name)} shades ${formatShare(shaded)} of the next. ${withUnit(formatFixed(clearSpacingM, 1), 'm')} from front edge to front edge would clear it; now ${withUnit(formatFixed(array.rowSpacingM, 1), 'm')}.`,
        );
      }),
  },
  {
    id: 'A5',
    severity: 'note',
    where: 'house',
    source: 'common practice, no source',
    judge: ({ house, design }) =>
      when(
        builtFields(design).length > 0 && house.horizon.length === 0,
        () =>
          'No horizon is entered: the sky is taken as open all round. A hill, house or trees to the south cost winter sun.',
      ),
  },
  {
    id: 'A6',
    severity: 'note',
    where: 'array',
    source: 'EN 1991-1-4, EN 1991-1-3',
    judge: ({ design }) =>
      when(
        builtFields(design).length > 0,
        () => 'Wind and snow loads, roof and ballast: local code and a licensed engineer decide.',
      ),
  },
  {
    id: 'R1',
    severity: 'note',
    where: 'house',
    source: 'validity ranges of the equations, method pages',
    judge: (subject) =>
      EQUATION_RANGES.flatMap(({ name, unit, low, high, equation, value }) => {
        const figure = value(subject);
        return figure !== undefined && (figure < low || figure > high)
          ? [
              `${name}: ${withUnit(formatSignificant(figure), unit)} lies outside ${low} to ${withUnit(String(high), unit)}, the range of ${equation}. The figures that rest on it are less certain.`,
            ]
          : [];
      }),
  },
  {
    id: 'T0',
    severity: 'note',
    where: 'collector',
    source: 'ISO 9806: curves are tested with water warmer than air',
    judge: ({ result }) =>
      when(
        result.year.colderThanAirHours > 0.05 * result.year.pumpHours && result.year.colderThanAirHours >= 10,
        () =>
          `In ${hoursText(result.year.colderThanAirHours)} the array ran with water colder than the air: its curve is extrapolated there.`,
      ),
  },
  {
    id: 'W13',
    severity: 'note',
    where: 'weather',
    source: 'own definition',
    judge: ({ result }) =>
      when(
        result.synthetic,
        () =>
          `The weather year “${result.weatherName}” is synthetic. Upload a year of your place before money is spent.`,
      ),
  },
];
