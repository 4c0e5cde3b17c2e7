import {
  incidenceCosine,
  type SkyModel,
  type SkyMoment,
  skyOnPlane,
  tiltFactors,
} from '@/lib/sun/irradiance-on-plane';
import type { SunYear } from '@/lib/sun/sun-year';
import { HOURS_PER_YEAR, toDegrees } from '@/lib/units/constants';
import type { WeatherYear } from '@/lib/weather/weather-year';

export interface Plane {
  /** from the horizontal [°] */
  tiltDeg: number;
  /** clockwise from north [°]; 180 = south */
  azimuthDeg: number;
}

/** Irradiance on a plane for each hour of a year. */
export interface PlaneYear {
  /** beam, and the circumsolar diffuse that comes as beam */
  beamWm2: Float64Array;
  /** the rest of the sky */
  diffuseWm2: Float64Array;
  groundWm2: Float64Array;
  /** of the beam; 90 when the sun is down or behind the plane [°] */
  incidenceDeg: Float64Array;
  totalWm2: Float64Array;
}

/**
 * Irradiance on a tilted plane over a year: beam = DNI cos θ + circumsolar, sky, ground.
 * With the sun down and irradiance in the file the beam is ignored and the diffuse taken as isotropic.
 * @param weather the year's irradiances [W/m²] and albedo
 * @param sun the sun of the same site and shift, from sunYear
 * @param plane tilt and azimuth [°]
 * @param model sky model; 'hdkr' is the product's default
 * @param albedo reflectance of the ground for all hours [-] 0…1; the weather year's when left out
 * @returns columns of 8,760 values [W/m², °]
 * @see lib/sun/irradiance-on-plane.ts; Duffie & Beckman 2013, sec. 2.14-2.16
 */
export function planeYear(
  weather: Pick<WeatherYear, 'globalWm2' | 'beamNormalWm2' | 'diffuseWm2' | 'albedo'>,
  sun: SunYear,
  plane: Plane,
  model: SkyModel,
  albedo?: number,
): PlaneYear {
  const year: PlaneYear = {
    beamWm2: new Float64Array(HOURS_PER_YEAR),
    diffuseWm2: new Float64Array(HOURS_PER_YEAR),
    groundWm2: new Float64Array(HOURS_PER_YEAR),
    incidenceDeg: new Float64Array(HOURS_PER_YEAR).fill(90),
    totalWm2: new Float64Array(HOURS_PER_YEAR),
  };
  const tilt = tiltFactors(plane.tiltDeg);
  // one record for all hours: making 8,760 of them would take longer than the physics
  const sky: SkyMoment = {
    beamNormal: 0,
    diffuse: 0,
    global: 0,
    extraterrestrialNormal: 0,
    cosZenith: 0,
    zenithDeg: 0,
    cosIncidence: 0,
    tilt,
  };
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    sky.global = weather.globalWm2[h]!;
    sky.diffuse = weather.diffuseWm2[h]!;
    sky.cosZenith = sun.cosZenith[h]!;
    let beam = 0;
    let diffuse = sky.diffuse * tilt.skyView;
    if (sun.sunlitFraction[h]! > 0 && sky.cosZenith > 0) {
      sky.zenithDeg = sun.zenithDeg[h]!;
      sky.beamNormal = weather.beamNormalWm2[h]!;
      sky.extraterrestrialNormal = sun.extraterrestrialNormalWm2[h]!;
      sky.cosIncidence = incidenceCosine(plane.tiltDeg, plane.azimuthDeg, sky.zenithDeg, sun.azimuthDeg[h]!);
      const parts = skyOnPlane(model, sky);
      beam = sky.beamNormal * Math.max(0, sky.cosIncidence) + parts.circumsolar;
      diffuse = parts.rest;
      if (sky.cosIncidence > 0) year.incidenceDeg[h] = toDegrees(Math.acos(sky.cosIncidence));
    }
    const ground = sky.global * (albedo ?? weather.albedo[h]!) * tilt.groundView;
    year.beamWm2[h] = beam;
    year.diffuseWm2[h] = diffuse;
    year.groundWm2[h] = ground;
    year.totalWm2[h] = beam + diffuse + ground;
  }
  return year;
}
