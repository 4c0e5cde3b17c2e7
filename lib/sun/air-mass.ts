import { toRadians } from '@/lib/units/constants';

/**
 * Relative optical air mass at sea level.
 * Equation: m = 1 / [cos θz + 0.50572 (96.07995° − θz)^−1.6364].
 * @param zenithDeg θz [°] 0…90; larger values are taken as 90
 * @returns m [-] 1…38
 * @see F. Kasten & A. T. Young, Revised optical air mass tables, Applied Optics 28 (1989) 4735
 */
export function airMass(zenithDeg: number): number {
  const z = Math.min(90, zenithDeg);
  return 1 / (Math.cos(toRadians(z)) + 0.50572 * Math.pow(96.07995 - z, -1.6364));
}
