import { HOURS_PER_DAY } from '@/lib/units/constants';
import { CARRIER_STONES, DAYS_SHOWN, HOT_STONE, countStones, dayOfColumn } from './stones';

/** Hours of need below which a day counts as one in which nothing was needed. */
const IDLE_DAY_HOURS = 4;

/** Share of the hours of need from which on the sun has carried a day, or shared it. */
const CARRIED = 0.5;
const SHARED = 0.15;

function stoneOfDay(hours: Uint8Array): number {
  const [idle = 0, sun = 0, store = 0, sunShared = 0, storeShared = 0, backup = 0, unmet = 0, hot = 0] =
    countStones(hours, CARRIER_STONES);
  if (hot) return HOT_STONE;
  const needed = HOURS_PER_DAY - idle;
  if (needed < IDLE_DAY_HOURS) return 0;
  if (unmet > backup) return 6;
  const direct = sun + sunShared >= store + storeShared;
  const share = (sun + store + (sunShared + storeShared) / 2) / needed;
  if (share >= CARRIED) return direct ? 1 : 2;
  if (share >= SHARED) return direct ? 3 : 4;
  return 5;
}

/**
 * One stone per day: who carried the hours in which heat was needed; a warning is not voted away.
 * @param stones one byte per hour [8760]
 * @param firstDay day of the year with which the picture begins
 * @returns stones in the order of the picture [365]
 */
export function dayStones(stones: Uint8Array, firstDay: number): Uint8Array {
  return Uint8Array.from({ length: DAYS_SHOWN }, (_, column) => {
    const from = dayOfColumn(column, firstDay) * HOURS_PER_DAY;
    return stoneOfDay(stones.subarray(from, from + HOURS_PER_DAY));
  });
}
