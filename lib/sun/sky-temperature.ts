import { KELVIN_OFFSET, STEFAN_BOLTZMANN, toRadians } from '@/lib/units/constants';

/**
 * Emittance of the clear sky from humidity and the time of day.
 * Equation: ε = 0.711 + 0.0056 θdp + 0.000073 θdp² + 0.013 cos(15° t).
 * @param dewPointC θdp [°C] −20…30
 * @param hour t, hours from midnight [h] 0…24
 * @returns ε [-]
 * @see P. Berdahl & M. Martin, Emissivity of clear skies, Solar Energy 32 (1984) 663
 */
function clearSkyEmittance(dewPointC: number, hour: number): number {
  return 0.711 + dewPointC * (0.0056 + 0.000073 * dewPointC) + 0.013 * Math.cos(toRadians(15 * hour));
}

/**
 * Temperature of a black sky that sends the same long-wave radiation as the clear sky: Ts = Ta ε^¼.
 * @param dryBulbC θa [°C] −40…45
 * @param dewPointC θdp [°C] −20…30
 * @param hour t, hours from midnight [h] 0…24
 * @returns sky temperature [°C]
 * @remarks clouds are left out: a grey sky is warmer and sends up to 80 W/m² more
 * @see P. Berdahl & M. Martin, Emissivity of clear skies, Solar Energy 32 (1984) 663
 */
export function skyTemperatureC(dryBulbC: number, dewPointC: number, hour: number): number {
  const air = dryBulbC + KELVIN_OFFSET;
  return air * Math.pow(clearSkyEmittance(dewPointC, hour), 0.25) - KELVIN_OFFSET;
}

/**
 * Sky temperature from the air temperature alone: Ts = 0.0552 Ta^1.5.
 * @param dryBulbC θa [°C] −40…45
 * @returns sky temperature [°C]
 * @see W. C. Swinbank, Long-wave radiation from clear skies, Q. J. R. Meteorol. Soc. 89 (1963) 339
 */
export function swinbankSkyTemperatureC(dryBulbC: number): number {
  return 0.0552 * Math.pow(dryBulbC + KELVIN_OFFSET, 1.5) - KELVIN_OFFSET;
}

/**
 * Long-wave irradiance on the horizontal of a sky that radiates like a black body: EL = σ Ts⁴.
 * @param skyC sky temperature [°C] −60…40
 * @returns EL [W/m²]
 * @see J. A. Duffie & W. A. Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, sec. 3.9
 */
export function skyLongwaveWm2(skyC: number): number {
  const sky2 = (skyC + KELVIN_OFFSET) * (skyC + KELVIN_OFFSET);
  return STEFAN_BOLTZMANN * sky2 * sky2;
}
