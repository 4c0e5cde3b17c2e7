import type { Plane, PlaneYear } from '@/lib/sun/plane-year';
import type { SunYear } from '@/lib/sun/sun-year';
import { HOURS_PER_YEAR, toRadians } from '@/lib/units/constants';

/** Directions in which the sky above the skyline is summed up. */
const DIRECTIONS = 720;
const FULL_TURN_DEG = 360;

/** One point of the skyline as it is seen from the site. */
export interface HorizonPoint {
  /** clockwise from true north [°] 0…360 */
  azimuthDeg: number;
  /** above the level horizon [°] 0…85 */
  altitudeDeg: number;
}

/** A horizon profile in order, its last point repeated before north and its first after it. */
export interface Skyline {
  azimuthDeg: Float64Array;
  altitudeDeg: Float64Array;
}

/**
 * Puts the points of a horizon profile in order, closed over north.
 * @param points any number of points in any order [°]; two of one azimuth make a step
 * @returns skyline [°]; level when there are no points
 * @see own definition: straight lines between the points in azimuth and altitude
 */
export function skylineOf(points: readonly HorizonPoint[]): Skyline {
  const sorted = [...points].sort((a, b) => a.azimuthDeg - b.azimuthDeg);
  const first = sorted[0] ?? { azimuthDeg: 0, altitudeDeg: 0 };
  const last = sorted.at(-1) ?? first;
  const closed = [
    { ...last, azimuthDeg: last.azimuthDeg - FULL_TURN_DEG },
    ...sorted,
    { ...first, azimuthDeg: first.azimuthDeg + FULL_TURN_DEG },
  ];
  return {
    azimuthDeg: Float64Array.from(closed, (point) => point.azimuthDeg),
    altitudeDeg: Float64Array.from(closed, (point) => point.altitudeDeg),
  };
}

/**
 * Altitude of the skyline in one direction, on the straight line between its neighbouring points.
 * @param skyline from skylineOf [°]
 * @param azimuthDeg clockwise from true north [°] 0…360
 * @returns altitude [°]
 * @see own definition: straight lines between the points in azimuth and altitude
 */
export function horizonAltitudeDeg(skyline: Skyline, azimuthDeg: number): number {
  const { azimuthDeg: at, altitudeDeg } = skyline;
  let next = 1;
  while (next < at.length - 1 && at[next]! <= azimuthDeg) next++;
  const width = at[next]! - at[next - 1]!;
  if (width <= 0) return altitudeDeg[next]!;
  const share = (azimuthDeg - at[next - 1]!) / width;
  return altitudeDeg[next - 1]! + share * (altitudeDeg[next]! - altitudeDeg[next - 1]!);
}

/**
 * Part of the sky's diffuse that still reaches a plane above a skyline, for a sky of equal brightness:
 * ∫∫ max(0, cos θ) cos a da dγ above the skyline over the same integral above the level horizon,
 * cos θ = cos β sin a + sin β cos a cos(γ − γp). The inner integral has a closed form, the outer one is summed.
 * @param skyline from skylineOf [°]
 * @param plane tilt 0…90 and azimuth [°]
 * @returns share [-] 0…1; cos²h on the horizontal with a skyline of altitude h all round
 * @see view factor of a plane to the sky dome: Liu & Jordan, Solar Energy 7 (1963) 53; integral: derived
 */
export function visibleSkyShare(skyline: Skyline, plane: Plane): number {
  const up = Math.cos(toRadians(plane.tiltDeg));
  const sine = Math.sin(toRadians(plane.tiltDeg));
  let seen = 0;
  let open = 0;
  for (let i = 0; i < DIRECTIONS; i++) {
    const azimuthDeg = ((i + 0.5) * FULL_TURN_DEG) / DIRECTIONS;
    const facing = sine * Math.cos(toRadians(azimuthDeg - plane.azimuthDeg));
    const planeEdge = facing < 0 ? Math.atan2(-facing, up) : 0;
    const edge = toRadians(horizonAltitudeDeg(skyline, azimuthDeg));
    open += skyAbove(planeEdge, up, facing);
    seen += skyAbove(Math.max(planeEdge, edge), up, facing);
  }
  return seen / open;
}

/** ∫ (up sin a + facing cos a) cos a da from an altitude to the zenith. */
function skyAbove(altitude: number, up: number, facing: number): number {
  const across = Math.PI / 4 - altitude / 2 - Math.sin(2 * altitude) / 4;
  return 0.5 * up * Math.cos(altitude) ** 2 + facing * across;
}

/**
 * A year on a plane behind a skyline: no beam and nothing of the bright sky around the sun while the sun stands
 * below the skyline; the rest of the sky's diffuse is scaled by the part of the dome that the plane still sees.
 * @param open the year on the same plane under an open sky [W/m²]
 * @param sun the sun of the same site and shift [°]
 * @param plane tilt 0…90 and azimuth [°]
 * @param points the horizon profile [°]
 * @returns columns of 8,760 values [W/m², °]
 * @remarks An hour is in the sun or in the shade as a whole, by the sun at its middle. What the ground reflects is
 *   left as it is: near ground is lit by the same sky, and what the hill itself reflects is not known. The skyline is
 *   taken as dark and as far away, the same for array and windows.
 * @see own definition on the parts of lib/sun/plane-year.ts; sky share: visibleSkyShare
 */
export function behindHorizon(
  open: PlaneYear,
  sun: Pick<SunYear, 'zenithDeg' | 'azimuthDeg'>,
  plane: Plane,
  points: readonly HorizonPoint[],
): PlaneYear {
  const skyline = skylineOf(points);
  const share = visibleSkyShare(skyline, plane);
  const year: PlaneYear = {
    beamWm2: open.beamWm2.slice(),
    diffuseWm2: open.diffuseWm2.map((diffuse) => diffuse * share),
    groundWm2: open.groundWm2,
    incidenceDeg: open.incidenceDeg.slice(),
    totalWm2: new Float64Array(HOURS_PER_YEAR),
  };
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    if (year.beamWm2[h]! > 0) {
      const altitudeDeg = 90 - sun.zenithDeg[h]!;
      if (altitudeDeg < horizonAltitudeDeg(skyline, sun.azimuthDeg[h]!)) {
        year.beamWm2[h] = 0;
        year.incidenceDeg[h] = 90;
      }
    }
    year.totalWm2[h] = year.beamWm2[h]! + year.diffuseWm2[h]! + year.groundWm2[h]!;
  }
  return year;
}
