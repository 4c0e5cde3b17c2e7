import { extraterrestrialNormalWm2 } from '@/lib/sun/extraterrestrial';
import { seenFrom, sunOverEarth } from '@/lib/sun/sun-position';
import {
  DAYS_PER_YEAR,
  DEGREES_PER_HOUR,
  HOURS_PER_DAY,
  HOURS_PER_YEAR,
  MS_PER_HOUR,
  toDegrees,
  toRadians,
} from '@/lib/units/constants';

/** Start of the calendar year by which the sun moves, whatever years a weather file names [ms UTC]. */
const SUN_YEAR_START_MS = Date.UTC(2025, 0, 1);
/** Half of what the earth turns in an hour [°]. */
const HALF_HOUR_DEG = DEGREES_PER_HOUR / 2;

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
 * Declination and equation of time are taken from suncalc at the start of each day and interpolated over the day
 * (error below 0.002°). In an hour of sunrise or sunset the sun stands at the middle of the sunlit part.
 * @param site latitude, longitude [°], time zone [h]
 * @param sunShiftH from the end of each row to the middle of its irradiance's interval [h], nominal −0.5
 * @returns columns of 8,760 values [°, -, W/m²]
 * @remarks the sun's calendar year is 2025 for every row
 * @see lib/sun/sun-position.ts; Duffie & Beckman 2013, sec. 2.14 (hours of sunrise and sunset)
 */
export function sunYear(site: Site, sunShiftH: number): SunYear {
  const sun: SunYear = {
    cosZenith: new Float64Array(HOURS_PER_YEAR),
    zenithDeg: new Float64Array(HOURS_PER_YEAR),
    azimuthDeg: new Float64Array(HOURS_PER_YEAR),
    sunlitFraction: new Float64Array(HOURS_PER_YEAR),
    extraterrestrialNormalWm2: new Float64Array(HOURS_PER_YEAR),
  };
  let today = noonOffset(site, 0);
  for (let day = 0; day < DAYS_PER_YEAR; day++) {
    const tomorrow = noonOffset(site, day + 1);
    const outside = extraterrestrialNormalWm2(day + 1);
    for (let hour = 0; hour < HOURS_PER_DAY; hour++) {
      const h = day * HOURS_PER_DAY + hour;
      const middleH = hour + 1 + sunShiftH;
      const part = middleH / HOURS_PER_DAY;
      const declinationDeg = today.declinationDeg + part * (tomorrow.declinationDeg - today.declinationDeg);
      const offsetDeg = today.offsetDeg + part * halfTurn(tomorrow.offsetDeg - today.offsetDeg);
      const hourAngleDeg = halfTurn(DEGREES_PER_HOUR * middleH + offsetDeg);
      const lit = sunlitPart(site.latitudeDeg, declinationDeg, hourAngleDeg);
      const seen = seenFrom(site.latitudeDeg, declinationDeg, lit.hourAngleDeg);
      sun.zenithDeg[h] = 90 - seen.altitudeDeg;
      sun.cosZenith[h] = Math.sin(toRadians(seen.altitudeDeg));
      sun.azimuthDeg[h] = seen.azimuthDeg;
      sun.sunlitFraction[h] = lit.fraction;
      sun.extraterrestrialNormalWm2[h] = outside;
    }
    today = tomorrow;
  }
  return sun;
}

/** Declination at the start of a local day, and the hour angle then [°]. */
function noonOffset(site: Site, day: number): { declinationDeg: number; offsetDeg: number } {
  const startMs = SUN_YEAR_START_MS + (day * HOURS_PER_DAY - site.timeZoneH) * MS_PER_HOUR;
  const { declinationDeg, greenwichHourAngleDeg } = sunOverEarth(startMs);
  return { declinationDeg, offsetDeg: greenwichHourAngleDeg + site.longitudeDeg };
}

/** The same angle in −180…180 [°]. */
function halfTurn(angleDeg: number): number {
  return angleDeg - 360 * Math.round(angleDeg / 360);
}

interface SunlitPart {
  /** of the hour [-] */
  fraction: number;
  /** at the middle of the sunlit part, or of the hour when it is dark [°] */
  hourAngleDeg: number;
}

/** The sun is up while |ω| < ωs, cos ωs = −tan φ tan δ; near the poles an hour may be lit at both ends. */
function sunlitPart(latitudeDeg: number, declinationDeg: number, hourAngleDeg: number): SunlitPart {
  const cosSunset = -Math.tan(toRadians(latitudeDeg)) * Math.tan(toRadians(declinationDeg));
  if (cosSunset >= 1) return { fraction: 0, hourAngleDeg };
  if (cosSunset <= -1) return { fraction: 1, hourAngleDeg };
  const sunsetDeg = toDegrees(Math.acos(cosSunset));
  const startDeg = hourAngleDeg - HALF_HOUR_DEG;
  const endDeg = hourAngleDeg + HALF_HOUR_DEG;
  let litDeg = 0;
  let longestDeg = 0;
  let middleDeg = hourAngleDeg;
  for (let turn = -360; turn <= 360; turn += 360) {
    const fromDeg = Math.max(startDeg, turn - sunsetDeg);
    const toDeg = Math.min(endDeg, turn + sunsetDeg);
    if (toDeg <= fromDeg) continue;
    litDeg += toDeg - fromDeg;
    if (toDeg - fromDeg > longestDeg) {
      longestDeg = toDeg - fromDeg;
      middleDeg = (fromDeg + toDeg) / 2;
    }
  }
  return { fraction: litDeg / DEGREES_PER_HOUR, hourAngleDeg: middleDeg };
}
