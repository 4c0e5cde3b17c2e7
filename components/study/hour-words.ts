import { clock, dayName } from '@/components/mosaic/calendar';
import { partsOverLimit } from '@/components/mosaic/stones';
import { OF_SECOND_FIELD } from '@/lib/simulation/built-fields';
import { CARRIERS } from '@/lib/simulation/results';
import type { Carrier } from '@/lib/simulation/results';
import type { StudyAnswer } from '@/lib/study/study-question';
import { HOURS_PER_DAY, W_PER_KW } from '@/lib/units/constants';
import { formatFixed, formatSignificant, withUnit } from '@/lib/units/display';

const SMALLEST_W = 20;

/** "2.4 kW", "0.3 kW", and watts where that would be nothing: "31 W". */
export function power(watts: number): string {
  if (watts < 10) return withUnit('0', 'kW');
  if (watts < 95) return withUnit(formatSignificant(watts, 2), 'W');
  const kilowatts = watts / W_PER_KW;
  return withUnit(kilowatts < 1 ? formatFixed(kilowatts, 1) : formatSignificant(kilowatts, 2), 'kW');
}

/** "36.4 °C". */
export function celsius(temperatureC: number, decimals = 1): string {
  return withUnit(formatFixed(temperatureC, decimals), '°C');
}

/** "26 February, 13:00 to 14:00". */
export function hourName(hour: number): string {
  const start = hour % HOURS_PER_DAY;
  return `${dayName(Math.floor(hour / HOURS_PER_DAY))}, ${clock(start)} to ${clock(start + 1)}`;
}

const SPOKEN_CARRIERS: Record<Carrier, string> = {
  'nothing needed': 'nothing needed',
  'sun, straight in': 'sun straight in',
  'sun from the store': 'sun from the store',
  'sun and backup': 'sun and backup',
  'store and backup': 'store and backup',
  backup: 'backup',
  'not met': 'not warm enough',
};

function carrierAt(answer: StudyAnswer, hour: number): Carrier {
  return CARRIERS[answer.result.columns.carrier[hour]!]!;
}

function tooHotParts(answer: StudyAnswer, hour: number): string[] {
  const { collector, second } = answer.design;
  const parts = [
    ...collector.parts,
    ...(second?.collector.parts ?? []).map((part) => ({ ...part, name: part.name + OF_SECOND_FIELD })),
  ];
  return partsOverLimit(answer.result.columns.overLimit[hour]!, parts);
}

/** What a screen reader says of the stone under the cursor. */
export function spokenHour(answer: StudyAnswer, hour: number): string {
  const { columns } = answer.result;
  const heatW =
    columns.solarHeatingW[hour]! +
    columns.solarTapW[hour]! +
    columns.backupHeatingW[hour]! +
    columns.backupTapW[hour]!;
  const words = [
    hourName(hour).replace(',', ''),
    SPOKEN_CARRIERS[carrierAt(answer, hour)],
    heatW > SMALLEST_W ? power(heatW) : '',
    `store ${celsius(columns.storeTopC[hour]!, 0)}`,
    `room ${celsius(columns.roomC[hour]!)}`,
    ...tooHotParts(answer, hour).map((part) => `empty ${part} above its limit`),
  ];
  return words.filter(Boolean).join(', ');
}

/** One or two sentences on who carries the house in an hour. */
export function hourSentence(answer: StudyAnswer, hour: number): string {
  const { columns } = answer.result;
  const sunW = columns.solarHeatingW[hour]! + columns.solarTapW[hour]!;
  const backupW = columns.backupHeatingW[hour]! + columns.backupTapW[hour]!;
  const carrier = carrierAt(answer, hour);
  const sentences = [carrierSentence(carrier, sunW, backupW)];
  if (columns.arrayW[hour]! > SMALLEST_W) {
    sentences.push(`The array puts ${power(columns.arrayW[hour]!)} into the store.`);
  }
  const parts = tooHotParts(answer, hour);
  if (parts.length > 0)
    sentences.push(`Standing empty, the ${parts.join(' and the ')} would be hotter than allowed.`);
  return sentences.join(' ');
}

function carrierSentence(carrier: Carrier, sunW: number, backupW: number): string {
  switch (carrier) {
    case 'nothing needed':
      return 'The house needs no heat.';
    case 'sun, straight in':
      return `The sun carries the house with ${power(sunW)}. No backup.`;
    case 'sun from the store':
      return `The store carries the house with ${power(sunW)}. No backup.`;
    case 'sun and backup':
      return `Sun with ${power(sunW)} and backup with ${power(backupW)} share the house.`;
    case 'store and backup':
      return `The store with ${power(sunW)} and backup with ${power(backupW)} share the house.`;
    case 'backup':
      return `The backup carries the house with ${power(backupW)}.`;
    case 'not met':
      return 'The house gets less heat than it asks for.';
  }
}
