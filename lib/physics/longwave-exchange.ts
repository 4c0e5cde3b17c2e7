/** Factors on differences of σT⁴ between plate, cover and sky [-]. */
export interface LongwaveFactors {
  plateToCover: number;
  /** straight through a cover that lets long-wave radiation pass */
  plateToSky: number;
  coverToSky: number;
}

/**
 * Long-wave exchange of an opaque plate under a grey cover that may let long-wave radiation through, all
 * reflections between both counted: D = 1 − (1 − εp)(1 − εc − τ); plate–cover εp εc/D, plate–sky εp τ/D,
 * cover–sky εc + εc (1 − εp) τ/D. With τ = 0 the first becomes 1/(1/εp + 1/εc − 1).
 * @param plateEmittance εp [-] 0.02–1
 * @param coverEmittance εc, either side [-] 0.05–1; held to 1 − τ
 * @param coverTransmittance τ for long-wave radiation [-] 0–0.9
 * @returns factors on σ(T1⁴ − T2⁴) [-]
 * @see Duffie & Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, sec. 3.8 and 6.4 (cover partly
 * transparent to long-wave radiation); net-radiation method for two parallel plates
 */
export function longwaveFactors(
  plateEmittance: number,
  coverEmittance: number,
  coverTransmittance: number,
): LongwaveFactors {
  const emittance = Math.min(coverEmittance, 1 - coverTransmittance);
  const reflected = 1 - plateEmittance;
  const rest = 1 - reflected * (1 - emittance - coverTransmittance);
  return {
    plateToCover: (plateEmittance * emittance) / rest,
    plateToSky: (plateEmittance * coverTransmittance) / rest,
    coverToSky: emittance + (emittance * reflected * coverTransmittance) / rest,
  };
}

/**
 * Long-wave irradiance of a tilted plane: Es (1 + cos β)/2 + σTa⁴ (1 − cos β)/2, the ground at air temperature.
 * @param skyWm2 long-wave irradiance of the sky on the horizontal [W/m²]
 * @param groundWm2 emission of the ground σTa⁴ [W/m²]
 * @param cosTilt cosine of the tilt [-] 0–1
 * @returns irradiance [W/m²]
 * @see Duffie & Beckman, 4th ed. 2013, eq. 3.9.1 with the view factors of sec. 2.15
 */
export function planeLongwave(skyWm2: number, groundWm2: number, cosTilt: number): number {
  return 0.5 * (skyWm2 * (1 + cosTilt) + groundWm2 * (1 - cosTilt));
}

/**
 * Convection from a flat surface to wind: h = 2.8 + 3.0 u.
 * @param windMPerS wind at the surface [m/s] 0–7
 * @returns coefficient without radiation [W/(m²K)]
 * @see Watmuff, Charters & Proctor, COMPLES 2 (1977) 56 (from memory); Duffie & Beckman, 4th ed. 2013, sec. 3.15
 */
export function windConvection(windMPerS: number): number {
  return 2.8 + 3 * windMPerS;
}
