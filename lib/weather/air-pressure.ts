import { STANDARD_PRESSURE_PA } from '@/lib/units/constants';

/**
 * Mean air pressure at an altitude: p = 101325 (1 − 2.25577·10⁻⁵ z)^5.25588.
 * @param elevationM z above the sea [m] −500…9000
 * @returns p [Pa]
 * @see ISO 2533:1975, Standard atmosphere
 */
export function standardPressurePa(elevationM: number): number {
  return STANDARD_PRESSURE_PA * Math.pow(1 - 2.25577e-5 * elevationM, 5.25588);
}
