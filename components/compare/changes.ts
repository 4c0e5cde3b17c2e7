import { CARRIER_STONES, HOT_STONE } from '@/components/mosaic/stones';

const BACKUP = 5;
const SUN_STONES = new Set([1, 2, 3, 4]);

/** Hours that change hands between two designs, and the two kinds that matter most. */
export interface Changes {
  hours: number;
  backupToSun: number;
  sunToBackup: number;
}

/** Counts the hours in which somebody else carries the house. */
export function countChanges(stones: Uint8Array, against: Uint8Array): Changes {
  const changes: Changes = { hours: 0, backupToSun: 0, sunToBackup: 0 };
  stones.forEach((stone, hour) => {
    const before = against[hour]!;
    if (stone === before) return;
    changes.hours++;
    if (before === BACKUP && SUN_STONES.has(stone)) changes.backupToSun++;
    if (stone === BACKUP && SUN_STONES.has(before)) changes.sunToBackup++;
  });
  return changes;
}

/** Stones of a comparison: the ordinary kinds, then the same kinds as a thin line for an hour that stays as it was. */
export const COMPARE_STONES = 2 * CARRIER_STONES;

/** Marks the hours that stay as they were; an empty array too hot is always inked. */
export function markUnchanged(stones: Uint8Array, against: Uint8Array): Uint8Array {
  return stones.map((stone, hour) =>
    stone === against[hour] && stone !== HOT_STONE ? stone + CARRIER_STONES : stone,
  );
}
