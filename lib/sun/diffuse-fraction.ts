/** Below this the beam is too grazing to be told from the diffuse (about 2° above the horizon). */
const GRAZING_COS_ZENITH = 0.035;
/** No beam at the ground passes this share of the extraterrestrial one. */
const BEAM_TRANSMITTANCE_LIMIT = 0.85;

/**
 * Diffuse share of the global irradiance of an hour from its clearness, in four pieces:
 * kt ≤ 0.22: 1 − 0.09 kt; kt ≤ 0.8: 0.9511 − 0.1604 kt + 4.388 kt² − 16.638 kt³ + 12.336 kt⁴; above: 0.165.
 * @param clearness kt = G / (Gon cos θz) [-] 0…1
 * @returns diffuse / global [-] 0.165…1
 * @see D. G. Erbs, S. A. Klein & J. A. Duffie, Estimation of the diffuse radiation fraction, Solar Energy 28 (1982) 293
 */
export function erbsDiffuseFraction(clearness: number): number {
  const k = clearness;
  if (k <= 0.22) return 1 - 0.09 * k;
  if (k > 0.8) return 0.165;
  return 0.9511 + k * (-0.1604 + k * (4.388 + k * (-16.638 + k * 12.336)));
}

export interface GlobalSplit {
  clearness: number;
  diffuseWm2: number;
  beamNormalWm2: number;
}

/**
 * Global irradiance on the horizontal split into diffuse and beam, so that G = D + B cos θz holds exactly.
 * Equation: D = G · fd(kt), B = (G − D)/cos θz; B is at most 0.85 Gon and 0 below cos θz = 0.035, the rest goes to D.
 * @param globalWm2 G [W/m²] from 0
 * @param cosZenith cos θz [-] −1…1
 * @param extraterrestrialNormalWm2 Gon, times the sunlit part of the hour [W/m²]
 * @returns clearness [-], diffuse and beam [W/m²]
 * @see D. G. Erbs, S. A. Klein & J. A. Duffie, Solar Energy 28 (1982) 293; limits: common practice
 */
export function splitGlobal(
  globalWm2: number,
  cosZenith: number,
  extraterrestrialNormalWm2: number,
): GlobalSplit {
  const outside = extraterrestrialNormalWm2 * cosZenith;
  if (outside <= 0 || globalWm2 <= 0) {
    return { clearness: 0, diffuseWm2: Math.max(0, globalWm2), beamNormalWm2: 0 };
  }
  const clearness = globalWm2 / outside;
  if (cosZenith < GRAZING_COS_ZENITH) return { clearness, diffuseWm2: globalWm2, beamNormalWm2: 0 };
  const beam = (globalWm2 * (1 - erbsDiffuseFraction(clearness))) / cosZenith;
  const beamNormalWm2 = Math.min(beam, BEAM_TRANSMITTANCE_LIMIT * extraterrestrialNormalWm2);
  return { clearness, diffuseWm2: globalWm2 - beamNormalWm2 * cosZenith, beamNormalWm2 };
}
