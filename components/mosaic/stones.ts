import type { CollectorPart } from '@/lib/simulation/design';
import { CARRIERS } from '@/lib/simulation/results';
import type { HourColumns } from '@/lib/simulation/results';
import { HOURS_PER_DAY, HOURS_PER_YEAR } from '@/lib/units/constants';

export type StoneToken = 'ink' | 'sun' | 'store' | 'hot';

/** The stone of an hour in which the empty collector is hotter than a part of it bears: it lies over the carrier. */
export const HOT_STONE = CARRIERS.length;
/** Stones of the picture "who carried the house": the carriers in their order, then the mark. */
export const CARRIER_STONES = CARRIERS.length + 1;

export type ReadingId = 'carrier' | 'store' | 'room' | 'output' | 'dry';

export interface BandReading {
  id: Exclude<ReadingId, 'carrier'>;
  label: string;
  /** one plain sentence of what to see */
  sentence: string;
  token: StoneToken;
  unit: '°C' | 'kW';
  /** lower edges of the bands; below the first an hour is a pebble */
  edges: readonly number[];
  values(columns: HourColumns): Float32Array;
  /** number in the column per unit on screen */
  scale: number;
}

/** Readings of the same 8,760 stones: the taller the stone, the higher the value. */
export const BAND_READINGS: readonly BandReading[] = [
  {
    id: 'store',
    label: 'Store temperature',
    sentence: 'Top of the store at the end of each hour: the taller the stone, the warmer.',
    token: 'store',
    unit: '°C',
    edges: [25, 30, 35, 40, 50, 60],
    values: (columns) => columns.storeTopC,
    scale: 1,
  },
  {
    id: 'room',
    label: 'Room temperature',
    sentence: 'Air of the rooms at the end of each hour: the taller the stone, the warmer.',
    token: 'ink',
    unit: '°C',
    edges: [17, 19, 20, 21, 23, 25],
    values: (columns) => columns.roomC,
    scale: 1,
  },
  {
    id: 'output',
    label: 'Collector output',
    sentence: 'Heat that the array put into the store, mean of the hour: the taller the stone, the more.',
    token: 'sun',
    unit: 'kW',
    edges: [0.05, 1, 2, 4, 6, 9],
    values: (columns) => columns.arrayW,
    scale: 1000,
  },
  {
    id: 'dry',
    label: 'Dry temperature',
    sentence:
      'What the empty plate would reach in this hour’s sun, whether the pump ran or not: the taller the stone, the hotter.',
    token: 'hot',
    unit: '°C',
    edges: [60, 80, 100, 120, 140, 160],
    values: (columns) => columns.dryPlateC,
    scale: 1,
  },
];

/**
 * One byte per hour for "who carried the house".
 * @param columns hours of the year
 * @param stones filled: index into CARRIERS, or HOT_STONE [8760]
 */
export function packCarriers(columns: Pick<HourColumns, 'carrier' | 'overLimit'>, stones: Uint8Array): void {
  for (let hour = 0; hour < stones.length; hour++) {
    stones[hour] = columns.overLimit[hour] ? HOT_STONE : columns.carrier[hour]!;
  }
}

/**
 * One byte per hour for a reading in bands.
 * @param reading bands and column
 * @param columns hours of the year
 * @param stones filled: number of edges reached; 0 where nothing is known [8760]
 */
export function packBands(reading: BandReading, columns: HourColumns, stones: Uint8Array): void {
  const values = reading.values(columns);
  const edges = reading.edges.map((edge) => edge * reading.scale);
  for (let hour = 0; hour < stones.length; hour++) {
    const value = values[hour]!;
    let band = 0;
    while (band < edges.length && value >= edges[band]!) band++;
    stones[hour] = band;
  }
}

/** Hours of each stone. */
export function countStones(stones: Uint8Array, kinds: number): number[] {
  const hours = Array<number>(kinds).fill(0);
  for (const stone of stones) hours[stone] = hours[stone]! + 1;
  return hours;
}

export const DAYS_SHOWN = HOURS_PER_YEAR / HOURS_PER_DAY;
/** 1 July, counted from 1 January = 0. */
export const FIRST_OF_JULY = 181;
export const WEEKS_SHOWN = 52;
export const LOUPE_DAYS = 15;

/** Day of the calendar year in a column of the picture. */
export function dayOfColumn(column: number, firstDay: number): number {
  return (column + firstDay) % DAYS_SHOWN;
}

/** Column of the picture in which a day of the calendar year stands. */
export function columnOfDay(day: number, firstDay: number): number {
  return (day - firstDay + DAYS_SHOWN) % DAYS_SHOWN;
}

/** Stones in the order of the picture: column after column, midnight on top. */
export function layDays(stones: Uint8Array, firstDay: number): Uint8Array {
  const split = firstDay * HOURS_PER_DAY;
  const laid = new Uint8Array(stones.length);
  laid.set(stones.subarray(split));
  laid.set(stones.subarray(0, split), stones.length - split);
  return laid;
}

/**
 * One stone for the same hour of seven days, by majority; the last of the 52 weeks has eight days. A tie goes to the
 * later stone of the list. A stone of `loud` wins over any majority: a warning is not voted away.
 */
export function layWeeks(stones: Uint8Array, firstDay: number, kinds: number, loud = -1): Uint8Array {
  const laid = new Uint8Array(WEEKS_SHOWN * HOURS_PER_DAY);
  const votes = new Uint8Array(kinds);
  for (let week = 0; week < WEEKS_SHOWN; week++) {
    const lastColumn = week === WEEKS_SHOWN - 1 ? DAYS_SHOWN : week * 7 + 7;
    for (let hour = 0; hour < HOURS_PER_DAY; hour++) {
      votes.fill(0);
      for (let column = week * 7; column < lastColumn; column++) {
        const stone = stones[dayOfColumn(column, firstDay) * HOURS_PER_DAY + hour]!;
        votes[stone] = votes[stone]! + 1;
      }
      laid[week * HOURS_PER_DAY + hour] = loud >= 0 && votes[loud]! > 0 ? loud : winner(votes);
    }
  }
  return laid;
}

function winner(votes: Uint8Array): number {
  let best = 0;
  for (let kind = 1; kind < votes.length; kind++) if (votes[kind]! >= votes[best]!) best = kind;
  return best;
}

/** Names of the parts that bit p of `overLimit` stands for. */
export function partsOverLimit(mask: number, parts: readonly CollectorPart[]): string[] {
  return parts.filter((_, part) => mask & (1 << part)).map((part) => part.name);
}
