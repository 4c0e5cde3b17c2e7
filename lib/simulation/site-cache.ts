import { planeYear, type Plane, type PlaneYear } from '@/lib/sun/plane-year';
import { sunYear, type SunYear } from '@/lib/sun/sun-year';
import { HOURS_PER_YEAR } from '@/lib/units/constants';
import type { WeatherYear } from '@/lib/weather/weather-year';
import type { SkyModel } from './design';

/** Planes kept per site: a drag over the tilt lever asks for each degree once. */
const PLANES_KEPT = 80;

/** What depends on the weather year alone, and the planes already worked for it. */
export class SiteCache {
  readonly sun: SunYear;
  /** means of each hour [°C], [m/s] */
  readonly outdoorC: Float64Array;
  readonly windMPerS: Float64Array;
  private readonly planes = new Map<string, PlaneYear>();

  constructor(readonly weather: WeatherYear) {
    this.sun = sunYear(weather, weather.sunShiftH);
    const atStamp = weather.pointValues === 'stamp';
    this.outdoorC = atStamp ? hourMeans(weather.dryBulbC) : weather.dryBulbC;
    this.windMPerS = atStamp ? hourMeans(weather.windMPerS) : weather.windMPerS;
  }

  /** Irradiance on a plane, worked once per orientation and sky model. */
  plane(plane: Plane, model: SkyModel): PlaneYear {
    const key = `${plane.tiltDeg}|${plane.azimuthDeg}|${model}`;
    const kept = this.planes.get(key);
    if (kept) return kept;
    const made = planeYear(this.weather, this.sun, plane, model);
    if (this.planes.size >= PLANES_KEPT) this.planes.delete(this.planes.keys().next().value!);
    this.planes.set(key, made);
    return made;
  }
}

/**
 * Means of the hours from values at their ends; the value before the first hour is the last of the year.
 * @param atStamp values at the end of each hour, any unit
 * @returns means in the same unit
 */
export function hourMeans(atStamp: Float64Array): Float64Array {
  const means = new Float64Array(HOURS_PER_YEAR);
  let before = atStamp[HOURS_PER_YEAR - 1]!;
  for (let h = 0; h < HOURS_PER_YEAR; h++) {
    const here = atStamp[h]!;
    means[h] = 0.5 * (before + here);
    before = here;
  }
  return means;
}
