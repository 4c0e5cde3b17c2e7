import { airMass } from '@/lib/sun/air-mass';
import { PEREZ_MIN_COS_ZENITH, perezShares, skyBrightness, skyClearness } from '@/lib/sun/perez-sky';
import { toRadians } from '@/lib/units/constants';

export type SkyModel = 'isotropic' | 'hay-davies' | 'hdkr' | 'perez';

/** cos 89°: smallest cos θz that a ratio is formed with, so that the last minutes of a day do not explode. */
const MIN_COS_ZENITH = 0.01745;

/** Sun and sky of one moment. Irradiances may be in any one unit, e.g. all in W/m² or all in MJ/m². */
export interface SkyMoment {
  beamNormal: number;
  /** diffuse on the horizontal */
  diffuse: number;
  global: number;
  extraterrestrialNormal: number;
  cosZenith: number;
  zenithDeg: number;
  /** cos θ on the plane, negative behind it */
  cosIncidence: number;
  tilt: TiltFactors;
}

/** What a plane's tilt does to sky and ground; the same for every hour of a year. */
export interface TiltFactors {
  /** part of the sky that the plane sees, (1 + cos β)/2 */
  skyView: number;
  /** (1 − cos β)/2 */
  groundView: number;
  /** sin β */
  sine: number;
  /** sin³(β/2) */
  halfSineCubed: number;
}

/** Diffuse of the sky on the plane: what comes from around the sun, and the rest. */
export interface SkyOnPlane {
  circumsolar: number;
  rest: number;
}

/**
 * Cosine of the angle between sun and the plane's normal.
 * Equation: cos θ = cos β cos θz + sin β sin θz cos(γs − γ).
 * @param tiltDeg β [°] 0…180
 * @param azimuthDeg γ of the plane, clockwise from north [°]
 * @param zenithDeg θz [°] 0…180
 * @param sunAzimuthDeg γs, clockwise from north [°]
 * @returns cos θ [-], negative behind the plane
 * @see J. A. Duffie & W. A. Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, eq. 1.6.3
 */
export function incidenceCosine(
  tiltDeg: number,
  azimuthDeg: number,
  zenithDeg: number,
  sunAzimuthDeg: number,
): number {
  const beta = toRadians(tiltDeg);
  const z = toRadians(zenithDeg);
  const turn = toRadians(sunAzimuthDeg - azimuthDeg);
  const cosine = Math.cos(beta) * Math.cos(z) + Math.sin(beta) * Math.sin(z) * Math.cos(turn);
  return Math.min(1, Math.max(-1, cosine));
}

/**
 * Beam on the plane over beam on the horizontal: Rb = cos θ / cos θz.
 * @param cosIncidence cos θ [-]; 0 is returned behind the plane
 * @param cosZenith cos θz [-]; at least 0.01745 (89°) is used
 * @returns Rb [-]
 * @see J. A. Duffie & W. A. Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, eq. 1.8.1
 */
export function beamRatio(cosIncidence: number, cosZenith: number): number {
  return Math.max(0, cosIncidence) / Math.max(MIN_COS_ZENITH, cosZenith);
}

/**
 * Anisotropy index, the beam's share of the extraterrestrial: Ai = Gbn / Gon.
 * @param beamNormal Gbn, any unit
 * @param extraterrestrialNormal Gon, same unit
 * @returns Ai [-] 0…1
 * @see J. E. Hay & J. A. Davies, Calculation of the solar radiation incident on an inclined surface, 1980
 */
export function anisotropyIndex(beamNormal: number, extraterrestrialNormal: number): number {
  return Math.min(1, beamNormal / extraterrestrialNormal);
}

/**
 * Root of the beam share of the global irradiance, that scales the brightening of the horizon: f = √(Gb/G).
 * @param beamHorizontal Gb on the horizontal, any unit
 * @param global G, same unit
 * @returns f [-] 0…1
 * @see D. T. Reindl, W. A. Beckman & J. A. Duffie, Evaluation of hourly tilted surface radiation models, Solar Energy 45 (1990) 9
 */
export function brighteningFactor(beamHorizontal: number, global: number): number {
  return global > 0 ? Math.sqrt(Math.min(1, Math.max(0, beamHorizontal / global))) : 0;
}

/**
 * View factors of a tilted plane: (1 + cos β)/2 to the sky, (1 − cos β)/2 to the ground; sin β, sin³(β/2).
 * @param tiltDeg β from the horizontal [°] 0…180
 * @returns factors [-]
 * @see B. Y. H. Liu & R. C. Jordan, The long-term average performance of flat-plate solar-energy collectors,
 *   Solar Energy 7 (1963) 53
 */
export function tiltFactors(tiltDeg: number): TiltFactors {
  const beta = toRadians(tiltDeg);
  const skyView = (1 + Math.cos(beta)) / 2;
  return {
    skyView,
    groundView: 1 - skyView,
    sine: Math.sin(beta),
    halfSineCubed: Math.pow(Math.sin(beta / 2), 3),
  };
}

/**
 * Diffuse of the sky on the plane by one of four models, for a sun above the horizon.
 * isotropic: D (1 + cos β)/2. Hay-Davies: D [Ai Rb + (1 − Ai)(1 + cos β)/2].
 * HDKR: the second term times [1 + √(Gb/G) sin³(β/2)].
 * Perez: D [F1 a/b + (1 − F1)(1 + cos β)/2 + F2 sin β], a = max(0, cos θ), b = max(cos 85°, cos θz).
 * @param model one of the four
 * @param sky irradiances in any one unit, angles [°]
 * @param airMassValue relative air mass for Perez [-]; by Kasten & Young when left out
 * @returns circumsolar part and the rest, in the unit of the irradiances
 * @see Hay & Davies 1980; Reindl et al., Solar Energy 45 (1990) 9; Perez et al., Solar Energy 44 (1990) 271;
 *   all in Duffie & Beckman 2013, sec. 2.15-2.16
 */
export function skyOnPlane(model: SkyModel, sky: SkyMoment, airMassValue?: number): SkyOnPlane {
  const view = sky.tilt.skyView;
  if (sky.diffuse <= 0) return { circumsolar: 0, rest: 0 };
  if (model === 'isotropic') return { circumsolar: 0, rest: sky.diffuse * view };
  if (model === 'perez') return perezOnPlane(sky, airMassValue ?? airMass(sky.zenithDeg));
  const ai = anisotropyIndex(sky.beamNormal, sky.extraterrestrialNormal);
  const circumsolar = sky.diffuse * ai * beamRatio(sky.cosIncidence, sky.cosZenith);
  const background = sky.diffuse * (1 - ai) * view;
  if (model === 'hay-davies') return { circumsolar, rest: background };
  const f = brighteningFactor(sky.beamNormal * sky.cosZenith, sky.global);
  return { circumsolar, rest: background * (1 + f * sky.tilt.halfSineCubed) };
}

function perezOnPlane(sky: SkyMoment, airMassValue: number): SkyOnPlane {
  const clearness = skyClearness(sky.diffuse, sky.beamNormal, sky.zenithDeg);
  const brightness = skyBrightness(sky.diffuse, airMassValue, sky.extraterrestrialNormal);
  const share = perezShares(clearness, brightness, sky.zenithDeg);
  const ratio = Math.max(0, sky.cosIncidence) / Math.max(PEREZ_MIN_COS_ZENITH, sky.cosZenith);
  const circumsolar = sky.diffuse * share.circumsolar * ratio;
  const { skyView, sine } = sky.tilt;
  const rest = sky.diffuse * ((1 - share.circumsolar) * skyView + share.horizon * sine);
  // a dark horizon band may outweigh the rest of the sky: it then takes from the circumsolar part
  return rest >= 0 ? { circumsolar, rest } : { circumsolar: Math.max(0, circumsolar + rest), rest: 0 };
}
