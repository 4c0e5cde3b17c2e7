import { dailyExtraterrestrialWhPerM2, declinationDeg, sunsetHourAngleDeg } from '@/lib/sun/extraterrestrial';
import { beamRatio, incidenceCosine } from '@/lib/sun/irradiance-on-plane';
import { seenFrom, sunOverEarth } from '@/lib/sun/sun-position';
import { DEGREES_PER_HOUR, HOURS_PER_DAY, J_PER_MJ, J_PER_WH, toRadians } from '@/lib/units/constants';
import type { ReferenceRow } from './reference-row';

const DUFFIE_BECKMAN = 'Duffie & Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013';
const NOON_H = HOURS_PER_DAY / 2;
const MJ_PER_WH = J_PER_WH / J_PER_MJ;

/** Mean days of the months and their declinations as printed, to a tenth of a degree. */
// prettier-ignore
const MEAN_DAYS: Record<string, number> = {
  '17': -20.9, '47': -13, '75': -2.4, '105': 9.4, '135': 18.8, '162': 23.1,
  '198': 21.2, '228': 13.5, '258': 2.2, '288': -9.6, '318': -18.9, '344': -23,
};

/** Ratio of beam on a plane to beam on the horizontal, at a place, a day and an hour angle; azimuth from north. */
function beamRatioAt(
  latitude: number,
  dayOfYear: number,
  hourAngle: number,
  tilt: number,
  azimuth: number,
): number {
  const sun = seenFrom(latitude, declinationDeg(dayOfYear), hourAngle);
  const zenith = 90 - sun.altitudeDeg;
  return beamRatio(incidenceCosine(tilt, azimuth, zenith, sun.azimuthDeg), Math.cos(toRadians(zenith)));
}

/** Solar time, declination, sunrise and beam ratio against the worked examples of a textbook. */
export const sunGeometryRows: readonly ReferenceRow[] = [
  {
    id: 'SP-03',
    title: 'Declination and local hour angle of the sun, 17 October 2003, 12:30:30 at UTC−7, 105.1786° W',
    source:
      'Reda & Andreas, Solar Position Algorithm, NREL/TP-560-34302 (2003, rev. 2008), table A5.1; the parallax of the sun stays below the tolerance',
    provenance: 'read',
    tier: 'A',
    expected: { declination: -9.31434, hourAngle: 11.1059 },
    tolerance: 0.02,
    compute: () => {
      const sun = sunOverEarth(Date.UTC(2003, 9, 17, 19, 30, 30));
      return { declination: sun.declinationDeg, hourAngle: sun.greenwichHourAngleDeg - 105.1786 };
    },
  },
  {
    id: 'DB-01',
    title: 'Solar time at 89.4° W, 3 February, 10:30 of the clock at UTC−6',
    source: `${DUFFIE_BECKMAN}, Ex. 1.5.1: 10:19, to a minute; the year of the day is free, here 2025`,
    provenance: 'read',
    tier: 'A',
    expected: { solarTimeH: 10 + 19 / 60 },
    tolerance: 0.5 / 60,
    compute: () => {
      const sun = sunOverEarth(Date.UTC(2025, 1, 3, 16, 30));
      return { solarTimeH: NOON_H + (sun.greenwichHourAngleDeg - 89.4) / DEGREES_PER_HOUR };
    },
  },
  {
    id: 'DB-04',
    title: 'Declination, zenith and azimuth from south: latitude 43°, 1 July, 18:30 solar time',
    source: `${DUFFIE_BECKMAN}, Ex. 1.6.2`,
    provenance: 'read',
    tier: 'A',
    expected: { declination: 23.1, zenith: 79.6, azimuthFromSouth: 112 },
    tolerance: { declination: 0.05, zenith: 0.05, azimuthFromSouth: 0.06 },
    compute: () => {
      const declination = declinationDeg(182);
      const sun = seenFrom(43, declination, 97.5);
      return { declination, zenith: 90 - sun.altitudeDeg, azimuthFromSouth: sun.azimuthDeg - 180 };
    },
  },
  {
    id: 'DB-05',
    title: 'Sunset hour angle and sunrise: latitude 43°, 16 March',
    source: `${DUFFIE_BECKMAN}, Ex. 1.6.3`,
    provenance: 'read',
    tier: 'A',
    expected: { sunset: 87.8, sunriseH: 6.15 },
    tolerance: { sunset: 0.06, sunriseH: 0.01 },
    compute: () => {
      const sunset = sunsetHourAngleDeg(43, 75);
      return { sunset, sunriseH: NOON_H - sunset / DEGREES_PER_HOUR };
    },
  },
  {
    id: 'DB-07',
    title: 'Declination on the mean days of the twelve months',
    source: `${DUFFIE_BECKMAN}, Table 1.6.1, after Klein, Solar Energy 19 (1977) 325`,
    provenance: 'read',
    tier: 'A',
    expected: MEAN_DAYS,
    tolerance: Object.fromEntries(Object.keys(MEAN_DAYS).map((day) => [day, 0.051])),
    compute: () =>
      Object.fromEntries(Object.keys(MEAN_DAYS).map((day) => [day, declinationDeg(Number(day))])),
  },
  {
    id: 'DB-08',
    title: 'Beam ratio: latitude 43°, tilt 45°, 15° west of south, 13 February, 10:30 solar time',
    source: `${DUFFIE_BECKMAN}, Ex. 1.8.1 (inputs read)`,
    provenance: 'from memory',
    tier: 'B',
    expected: { beamRatio: 1.66 },
    tolerance: 0.005,
    compute: () => ({ beamRatio: beamRatioAt(43, 44, -22.5, 45, 195) }),
  },
  {
    id: 'DB-09',
    title: 'Beam ratio: latitude 40°, tilt 30° south, 16 February, 9–10 h',
    source: `${DUFFIE_BECKMAN}, Ex. 1.8.2 (inputs read)`,
    provenance: 'from memory',
    tier: 'B',
    expected: { beamRatio: 1.61 },
    tolerance: 0.006,
    compute: () => ({ beamRatio: beamRatioAt(40, 47, -37.5, 30, 180) }),
  },
  {
    id: 'DB-13',
    title: 'Extraterrestrial irradiation of a day: latitude 38.6°, 3 September [MJ/m²]',
    source: `${DUFFIE_BECKMAN}, Ex. 2.11.1 (inputs read)`,
    provenance: 'from memory',
    tier: 'B',
    expected: { H0: 33.3 },
    // printed to 0.05, and the book's plain cosine for the sun's distance lies 0.25 % above Spencer's series here
    tolerance: 0.05 + 0.0025 * 33.3,
    compute: () => ({ H0: dailyExtraterrestrialWhPerM2(38.6, 246) * MJ_PER_WH }),
  },
];
