import { extraterrestrialNormalWm2 } from '@/lib/sun/extraterrestrial';
import { sunPosition } from '@/lib/sun/sun-position';
import { HOURS_PER_DAY, HOURS_PER_YEAR, MS_PER_HOUR, toRadians } from '@/lib/units/constants';

/** Start of the calendar year by which the sun moves, whatever years a weather file names [ms UTC]. */
const SUN_YEAR_START_MS = Date.UTC(2025, 0, 1);
/** The sun climbs at most 7.5° in half an hour; beyond this altitude an hour is wholly lit or wholly dark [°]. */
const CROSSING_ALTITUDE_DEG = 7.6;

export interface Site {
  /** north positive [°] */
  latitudeDeg: number;
  /** east positive [°] */
  longitudeDeg: number;
  /** local standard time − UTC [h] */
  timeZoneH: number;
}

/** The sun of each hour of a year, seen at the middle of the sunlit part of the hour. */
export interface SunYear {
  cosZenith: Float64Array;
  zenithDeg: Float64Array;
  /** clockwise from north [°] */
  azimuthDeg: Float64Array;
  /** part of the hour with the sun's centre above the true horizon [-] */
  sunlitFraction: Float64Array;
  extraterrestrialNormalWm2: Float64Array;
}

/**
 * Sun position and extraterrestrial irradiance for the 8,760 hours of a weather year.
 * In an hour of sunrise or sunset the sun stands at the middle of the sunlit part, found from the altitude at the
 * hour's start, middle and end by a parabola.
 * @param site latitude, longitude [°], time zone [h]
 * @param sunShiftH from the end of each row to the middle of its irradiance's interval [h], nominal −0.5
 * @returns columns of 8,760 values [°, -, W/m²]
 * @remarks the sun's calendar year is 2025 for every row
 * @see lib/sun/sun-position.ts; middle of the sunlit part: Duffie & Beckman 2013, sec. 2.14 (interval-averaged Rb)
 */
export function sunYear(site: Site, sunShiftH: number): SunYear {
  const sun: SunYear = {
    cosZenith: new Float64Array(HOURS_PER_YEAR),
    zenithDeg: new Float64Array(HOURS_PER_YEAR),
    azimuthDeg: new Float64Array(HOURS_PER_YEAR),
    sunlitFraction: new Float64Array(HOURS_PER_YEAR),
    extraterrestrialNormalWm2: new Float64Array(HOURS_PER_YEAR),
  };
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    const middleMs = SUN_YEAR_START_MS + (h + 1 + sunShiftH - site.timeZoneH) * MS_PER_HOUR;
    let position = sunPosition(middleMs, site.latitudeDeg, site.longitudeDeg);
    let lit = position.altitudeDeg > 0 ? 1 : 0;
    if (Math.abs(position.altitudeDeg) < CROSSING_ALTITUDE_DEG) {
      const part = sunlitPart(site, middleMs, position.altitudeDeg);
      lit = part.fraction;
      if (lit > 0 && lit < 1) {
        position = sunPosition(middleMs + part.middleH * MS_PER_HOUR, site.latitudeDeg, site.longitudeDeg);
      }
    }
    const zenithDeg = 90 - position.altitudeDeg;
    sun.zenithDeg[h] = zenithDeg;
    sun.cosZenith[h] = Math.cos(toRadians(zenithDeg));
    sun.azimuthDeg[h] = position.azimuthDeg;
    sun.sunlitFraction[h] = lit;
  }
  for (let day = 0; day * HOURS_PER_DAY < HOURS_PER_YEAR; day++) {
    const from = day * HOURS_PER_DAY;
    sun.extraterrestrialNormalWm2.fill(extraterrestrialNormalWm2(day + 1), from, from + HOURS_PER_DAY);
  }
  return sun;
}

interface SunlitPart {
  /** of the hour [-] */
  fraction: number;
  /** middle of the (longer) sunlit part, from the middle of the hour [h] */
  middleH: number;
}

/** Altitude over the hour as h(t) = hm + b t + c t², t = −1…1 in half hours: lit where h > 0. */
function sunlitPart(site: Site, middleMs: number, middleDeg: number): SunlitPart {
  const half = MS_PER_HOUR / 2;
  const startDeg = sunPosition(middleMs - half, site.latitudeDeg, site.longitudeDeg).altitudeDeg;
  const endDeg = sunPosition(middleMs + half, site.latitudeDeg, site.longitudeDeg).altitudeDeg;
  if (startDeg >= 0 && middleDeg > 0 && endDeg >= 0) return { fraction: 1, middleH: 0 };
  if (startDeg <= 0 && middleDeg <= 0 && endDeg <= 0) return { fraction: 0, middleH: 0 };
  const b = (endDeg - startDeg) / 2;
  const c = (endDeg + startDeg) / 2 - middleDeg;
  const cuts = [-1, ...rootsInside(c, b, middleDeg), 1];
  let lit = 0;
  let longest = 0;
  let middle = 0;
  for (let i = 0; i + 1 < cuts.length; i++) {
    const from = cuts[i]!;
    const to = cuts[i + 1]!;
    const t = (from + to) / 2;
    if (middleDeg + t * (b + c * t) <= 0) continue;
    lit += to - from;
    if (to - from > longest) {
      longest = to - from;
      middle = t;
    }
  }
  return { fraction: lit / 2, middleH: middle / 2 };
}

/** Roots of a t² + b t + c inside (−1, 1), in rising order; stable where a is nearly zero. */
function rootsInside(a: number, b: number, c: number): number[] {
  const discriminant = b * b - 4 * a * c;
  if (discriminant < 0) return [];
  const q = -0.5 * (b + (b < 0 ? -1 : 1) * Math.sqrt(discriminant));
  const roots = [q / a, c / q].filter((t) => t > -1 && t < 1);
  return roots.sort((s, t) => s - t);
}
