import { getPosition } from 'suncalc';
import { RADIANS_PER_DEGREE, toDegrees, toRadians } from '@/lib/units/constants';

/** Refraction that suncalc adds for every true altitude of 0° and below [°]. */
const HORIZON_REFRACTION_DEG = refractionDeg(0);

/** The sun against the turning earth. */
export interface SunOverEarth {
  declinationDeg: number;
  /** hour angle at Greenwich, 0…360 [°] */
  greenwichHourAngleDeg: number;
}

export interface SunPosition {
  /** true (geometric) altitude of the sun's centre [°] */
  altitudeDeg: number;
  /** clockwise from north [°] */
  azimuthDeg: number;
}

/**
 * Declination and Greenwich hour angle of the sun. To an observer at the North Pole the sun's altitude is its
 * declination and its azimuth its hour angle: suncalc is asked there and its refraction taken out again.
 * @param timeMs instant, milliseconds since 1970 UTC [ms]
 * @returns declination [°] −23.5…23.5, hour angle [°] 0…360
 * @remarks error below 0.012° against a full ephemeris
 * @see J. Meeus, Astronomical Algorithms, 2nd ed. 1998, ch. 25 (as used by suncalc 2)
 */
export function sunOverEarth(timeMs: number): SunOverEarth {
  const fromPole = getPosition(new Date(timeMs), 90, 0);
  return {
    declinationDeg: trueAltitudeDeg(fromPole.altitude),
    greenwichHourAngleDeg: (fromPole.azimuth + 180) % 360,
  };
}

/**
 * True position of the sun without refraction.
 * @param timeMs instant, milliseconds since 1970 UTC [ms]
 * @param latitudeDeg north positive [°] −90…90
 * @param longitudeDeg east positive [°] −180…180
 * @returns true altitude and azimuth [°]
 * @see sunOverEarth, seenFrom
 */
export function sunPosition(timeMs: number, latitudeDeg: number, longitudeDeg: number): SunPosition {
  const sun = sunOverEarth(timeMs);
  return seenFrom(latitudeDeg, sun.declinationDeg, sun.greenwichHourAngleDeg + longitudeDeg);
}

/**
 * Altitude and azimuth from declination and local hour angle.
 * Equation: sin h = sin φ sin δ + cos φ cos δ cos ω, γs = 180° + atan2(sin ω, cos ω sin φ − tan δ cos φ).
 * @param latitudeDeg φ, north positive [°] −90…90
 * @param declinationDeg δ [°] −23.5…23.5
 * @param hourAngleDeg ω, 0 at solar noon, afternoon positive [°]
 * @returns true altitude and azimuth [°]
 * @see J. Meeus, Astronomical Algorithms, 2nd ed. 1998, eq. 13.5-13.6
 */
export function seenFrom(latitudeDeg: number, declinationDeg: number, hourAngleDeg: number): SunPosition {
  const phi = toRadians(latitudeDeg);
  const delta = toRadians(declinationDeg);
  const omega = toRadians(hourAngleDeg);
  const cosOmega = Math.cos(omega);
  const sinPhi = Math.sin(phi);
  const cosPhi = Math.cos(phi);
  const sinAltitude = sinPhi * Math.sin(delta) + cosPhi * Math.cos(delta) * cosOmega;
  const westOfSouth = Math.atan2(Math.sin(omega), cosOmega * sinPhi - Math.tan(delta) * cosPhi);
  return {
    altitudeDeg: toDegrees(Math.asin(Math.min(1, Math.max(-1, sinAltitude)))),
    azimuthDeg: (toDegrees(westOfSouth) + 180) % 360,
  };
}

/**
 * Hour angle of a sun seen at a place: the inverse of seenFrom.
 * Equation: ω = atan2(sin θz sin γ, cos θz cos φ + sin θz cos γ sin φ), γ from south, west positive.
 * @param latitudeDeg φ, north positive [°] −90…90
 * @param zenithDeg θz [°] 0…180
 * @param azimuthDeg clockwise from north [°]
 * @returns ω, 0 at solar noon, afternoon positive [°] −180…180
 * @see J. Meeus, Astronomical Algorithms, 2nd ed. 1998, ch. 13
 */
export function hourAngleDeg(latitudeDeg: number, zenithDeg: number, azimuthDeg: number): number {
  const phi = toRadians(latitudeDeg);
  const z = toRadians(zenithDeg);
  const west = toRadians(azimuthDeg - 180);
  const across = Math.sin(z) * Math.sin(west);
  const along = Math.cos(z) * Math.cos(phi) + Math.sin(z) * Math.cos(west) * Math.sin(phi);
  return toDegrees(Math.atan2(across, along));
}

/** Solves apparent = h + R(h) for the true altitude h by fixed point, since R changes slowly. */
function trueAltitudeDeg(apparentDeg: number): number {
  if (apparentDeg <= HORIZON_REFRACTION_DEG) return apparentDeg - HORIZON_REFRACTION_DEG;
  let altitudeDeg = apparentDeg;
  for (let step = 0; step < 12; step++) {
    altitudeDeg = apparentDeg - refractionDeg(Math.max(0, altitudeDeg));
  }
  return altitudeDeg;
}

/**
 * Refraction of the atmosphere, with the constants of suncalc, so that taking it out is exact.
 * Equation: R = 1.02′ / tan(h + 10.3° / (h + 5.11)), here in radians.
 * @see J. Meeus, Astronomical Algorithms, 2nd ed. 1998, eq. 16.4
 */
function refractionDeg(altitudeDeg: number): number {
  const h = altitudeDeg * RADIANS_PER_DEGREE;
  return 0.0002967 / Math.tan(h + 0.00312536 / (h + 0.08901179)) / RADIANS_PER_DEGREE;
}
