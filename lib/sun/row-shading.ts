import { incidenceCosine } from '@/lib/sun/irradiance-on-plane';
import type { Plane, PlaneYear } from '@/lib/sun/plane-year';
import type { SunYear } from '@/lib/sun/sun-year';
import { HOURS_PER_YEAR, toDegrees, toRadians } from '@/lib/units/constants';

/** Declination of the sun on the shortest day [°]; the other sign in the south. */
const SOLSTICE_DEG = 23.44;

/** Equal rows behind one another on level ground. */
export interface RowLayout {
  rows: number;
  /** from the front (lower) edge of one row to that of the next [m] */
  rowSpacingM: number;
  /** along the slope, from the lower to the upper edge of one row [m] */
  rowHeightM: number;
}

type RowSection = Pick<RowLayout, 'rowSpacingM' | 'rowHeightM'>;

/**
 * Part of a row that lies in the beam shadow of the row before it.
 * Equation: F = 1 − (s/L) cos θz / cos θ, between 0 and 1. It is the two-dimensional construction with the profile
 * angle, tan αp = tan α / cos(γs − γ), worked out for infinitely long rows.
 * @param layout spacing s and slant height L [m]
 * @param cosZenith cos θz [-]
 * @param cosIncidence cos θ on the rows [-]; 0 is returned behind them
 * @returns shaded part of the slant, from the lower edge up [-] 0…1
 * @remarks the free ends of short rows let some sun in from the side: the shadow is over- and never understated
 * @see J. A. Duffie & W. A. Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, sec. 1.9 (from memory);
 *   this form: derived
 */
export function rowShadow(layout: RowSection, cosZenith: number, cosIncidence: number): number {
  if (cosIncidence <= 0) return 0;
  const lit = (layout.rowSpacingM / layout.rowHeightM) * (Math.max(0, cosZenith) / cosIncidence);
  return Math.max(0, 1 - lit);
}

/**
 * Angle under which a point of a row sees the upper edge of the row before it.
 * Equation: tan ψ = (L − y) sin β / (s − (L − y) cos β).
 * @param layout spacing s and slant height L [m]
 * @param tiltDeg β [°] 0…90
 * @param upSlope y/L, 0 at the lower edge [-] 0…1
 * @returns ψ above the level ground [°] 0…180
 * @see J. Passias & B. Källbäck, Shading effects in rows of solar cell panels, Solar Cells 11 (1984) 281 (from memory)
 */
export function maskingAngleDeg(layout: RowSection, tiltDeg: number, upSlope: number): number {
  const above = layout.rowHeightM * (1 - upSlope);
  const beta = toRadians(tiltDeg);
  return toDegrees(Math.atan2(above * Math.sin(beta), layout.rowSpacingM - above * Math.cos(beta)));
}

/**
 * View factor from a row to the sky over the row before it: the mean of (1 + cos(β + ψ))/2 over the slant, with the
 * masking angle ψ, in the closed form of crossed strings.
 * Equation: F = (L + s − √(s² − 2 s L cos β + L²)) / (2 L).
 * @param layout spacing s and slant height L [m]
 * @param tiltDeg β [°] 0…90
 * @returns view factor [-]; (1 + cos β)/2 for rows far apart
 * @see H. C. Hottel & A. F. Sarofim, Radiative Transfer, 1967, crossed strings (from memory); masking angle: Passias &
 *   Källbäck, Solar Cells 11 (1984) 281 (from memory)
 */
export function rowSkyView(layout: RowSection, tiltDeg: number): number {
  const { rowSpacingM: s, rowHeightM: l } = layout;
  const toEdge = Math.sqrt(s * s - 2 * s * l * Math.cos(toRadians(tiltDeg)) + l * l);
  return (l + s - toEdge) / (2 * l);
}

/**
 * View factor from a row to the level ground between it and the row before it, by crossed strings.
 * Equation: F = (L + s − √(s² + 2 s L cos β + L²)) / (2 L).
 * @param layout spacing s and slant height L [m]
 * @param tiltDeg β [°] 0…90
 * @returns view factor [-]; (1 − cos β)/2 for rows far apart
 * @see H. C. Hottel & A. F. Sarofim, Radiative Transfer, 1967, crossed strings (from memory)
 */
export function rowGroundView(layout: RowSection, tiltDeg: number): number {
  const { rowSpacingM: s, rowHeightM: l } = layout;
  const fromEdge = Math.sqrt(s * s + 2 * s * l * Math.cos(toRadians(tiltDeg)) + l * l);
  return (l + s - fromEdge) / (2 * l);
}

/**
 * Mean of all rows over a year: the first stands free, each of the others behind one like it. Beam and the bright sky
 * around the sun by the shaded part, the rest of the sky and the ground by their view factors.
 * @param free the year on a plane that stands free [W/m²]
 * @param sun the sun of the same site and shift [-]
 * @param plane tilt 0…90 and azimuth [°]
 * @param layout number of rows [-], spacing and slant height [m]
 * @returns columns of 8,760 values [W/m², °]; the same object for one row
 * @remarks Rows are taken as infinitely long, the ground between them as level and as bright as open ground, the backs
 *   of the rows as dark. Behind a skyline both shares are multiplied: sky hidden by both counts as hidden twice.
 * @see rowShadow, rowSkyView, rowGroundView
 */
export function amongRows(
  free: PlaneYear,
  sun: Pick<SunYear, 'cosZenith'>,
  plane: Plane,
  layout: RowLayout,
): PlaneYear {
  if (layout.rows <= 1) return free;
  const behind = (layout.rows - 1) / layout.rows;
  const cosTilt = Math.cos(toRadians(plane.tiltDeg));
  const sky = 1 - behind * (1 - ratio(rowSkyView(layout, plane.tiltDeg), (1 + cosTilt) / 2));
  const ground = 1 - behind * (1 - ratio(rowGroundView(layout, plane.tiltDeg), (1 - cosTilt) / 2));
  const year: PlaneYear = {
    beamWm2: free.beamWm2.slice(),
    diffuseWm2: free.diffuseWm2.map((diffuse) => diffuse * sky),
    groundWm2: free.groundWm2.map((reflected) => reflected * ground),
    incidenceDeg: free.incidenceDeg,
    totalWm2: new Float64Array(HOURS_PER_YEAR),
  };
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    if (year.beamWm2[h]! > 0) {
      const cosIncidence = Math.cos(toRadians(free.incidenceDeg[h]!));
      year.beamWm2[h]! *= 1 - behind * rowShadow(layout, sun.cosZenith[h]!, cosIncidence);
    }
    year.totalWm2[h] = year.beamWm2[h]! + year.diffuseWm2[h]! + year.groundWm2[h]!;
  }
  return year;
}

/** A horizontal plane sees no ground: nothing is left to be scaled. */
function ratio(part: number, whole: number): number {
  return whole > 1e-12 ? part / whole : 1;
}

/**
 * Shadow of each row on the next at solar noon of the shortest day, and the spacing that would just clear it.
 * Equation: rowShadow at θz = φ + 23.44°, the sun due south (north of the equator); s = L cos θ / cos θz.
 * @param layout spacing and slant height [m]
 * @param plane tilt 0…90 and azimuth [°]
 * @param latitudeDeg φ, north positive [°] −90…90
 * @returns shaded part [-] and clearing spacing [m]; no shadow where the sun does not rise on that day
 * @see rowShadow; declination at the solstice 23.44°
 */
export function shortestNoonShadow(
  layout: RowSection,
  plane: Plane,
  latitudeDeg: number,
): { shaded: number; clearSpacingM: number } {
  const zenithDeg = Math.abs(latitudeDeg) + SOLSTICE_DEG;
  if (zenithDeg >= 90) return { shaded: 0, clearSpacingM: 0 };
  const sunAzimuthDeg = latitudeDeg < 0 ? 0 : 180;
  const cosZenith = Math.cos(toRadians(zenithDeg));
  const cosIncidence = incidenceCosine(plane.tiltDeg, plane.azimuthDeg, zenithDeg, sunAzimuthDeg);
  return {
    shaded: rowShadow(layout, cosZenith, cosIncidence),
    clearSpacingM: (layout.rowHeightM * Math.max(0, cosIncidence)) / cosZenith,
  };
}
