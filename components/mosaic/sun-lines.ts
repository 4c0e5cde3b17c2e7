import { sunPosition } from '@/lib/sun/sun-position';
import { HOURS_PER_DAY, MS_PER_HOUR } from '@/lib/units/constants';
import { DAYS_SHOWN, dayOfColumn } from './stones';

export interface Site {
  latitudeDeg: number;
  longitudeDeg: number;
  timeZoneH: number;
}

/** The calendar year whose sun the engine uses for every row. */
const SUN_YEAR = 2025;
const DAYS_BETWEEN_POINTS = 7;

/**
 * Sunrise or sunset through the year as points of a line: column of the picture and hour of the day.
 * @returns points; days without a sunrise leave a gap
 */
export function sunLine(
  site: Site,
  which: 'rise' | 'set',
  firstDay: number,
): [column: number, hour: number][] {
  const points: [number, number][] = [];
  for (let column = 0; column <= DAYS_SHOWN; column += DAYS_BETWEEN_POINTS) {
    const hour = crossing(site, dayOfColumn(column, firstDay), which);
    if (hour !== undefined) points.push([column, hour]);
  }
  return points;
}

function crossing(site: Site, day: number, which: 'rise' | 'set'): number | undefined {
  const altitude = (hour: number) => {
    const time = Date.UTC(SUN_YEAR, 0, 1) + (day * HOURS_PER_DAY + hour - site.timeZoneH) * MS_PER_HOUR;
    return sunPosition(time, site.latitudeDeg, site.longitudeDeg).altitudeDeg;
  };
  const noon = 12 + site.timeZoneH - site.longitudeDeg / 15;
  let up = noon;
  let down = which === 'rise' ? noon - 12 : noon + 12;
  if (altitude(up) < 0 || altitude(down) > 0) return undefined;
  for (let step = 0; step < 10; step++) {
    const middle = (up + down) / 2;
    if (altitude(middle) > 0) up = middle;
    else down = middle;
  }
  return up;
}
