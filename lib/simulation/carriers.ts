import { HOURS_PER_YEAR } from '@/lib/units/constants';
import { CARRIERS, type HourColumns } from './results';

/** Below this share of the design load nothing is needed. */
const NEED_SHARE = 0.01;
/** From this share on the second source marks the stone as shared. */
const SHARED_FROM = 0.25;

const [NOTHING, STRAIGHT, STORE, STRAIGHT_SHARED, STORE_SHARED, BACKUP, NOT_MET] = CARRIERS.map(
  (_, index) => index,
) as [number, number, number, number, number, number, number];

/**
 * Says for each hour who carried the house: the source with the larger share of the heat given to rooms and hot
 * water. Solar heat counts as straight in as far as the array gave as much in the same hour, the rest as from the
 * store.
 * @param columns hourly powers [W]; `carrier` is filled
 * @param designLoadW design heat load [W]
 * @returns hours per carrier [h]
 * @see own definition, method pages: "who carried the hour"
 */
export function markCarriers(columns: HourColumns, designLoadW: number): number[] {
  const { solarHeatingW, solarTapW, backupHeatingW, backupTapW, unmetW, arrayW, carrier } = columns;
  const least = NEED_SHARE * designLoadW;
  const hours = new Array<number>(CARRIERS.length).fill(0);
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    const solar = Math.max(0, solarHeatingW[h]! + solarTapW[h]!);
    const backup = backupHeatingW[h]! + backupTapW[h]!;
    const total = solar + backup;
    const straight = Math.min(solar, arrayW[h]!);
    let mark = NOTHING;
    if (unmetW[h]! > least) mark = NOT_MET;
    else if (total + unmetW[h]! >= least && total > 0) {
      const sunStraight = straight >= solar - straight;
      if (backup < SHARED_FROM * total) mark = sunStraight ? STRAIGHT : STORE;
      else if (solar < SHARED_FROM * total) mark = BACKUP;
      else mark = sunStraight ? STRAIGHT_SHARED : STORE_SHARED;
    }
    carrier[h] = mark;
    hours[mark]!++;
  }
  return hours;
}
