import { HOURS_PER_DAY } from '@/lib/units/constants';
import { CARRIER_STONES, DAYS_SHOWN, HOT_STONE, dayOfColumn } from './stones';

/** Hours of need below which a day counts as one in which nothing was needed. */
const IDLE_DAY_HOURS = 4;

function stoneOfDay(hours: Uint8Array): number {
  const votes = new Uint8Array(CARRIER_STONES);
  for (const stone of hours) votes[stone] = votes[stone]! + 1;
  if (votes[HOT_STONE]) return HOT_STONE;
  const needed = votes.slice(1, HOT_STONE);
  if (needed.reduce((sum, count) => sum + count, 0) < IDLE_DAY_HOURS) return 0;
  return 1 + needed.indexOf(Math.max(...needed));
}

/**
 * One stone per day: who carried most of the hours in which heat was needed; a warning is not voted away.
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
