import { behindHorizon, type HorizonPoint } from '@/lib/sun/horizon';
import { planeYear, type Plane, type PlaneYear } from '@/lib/sun/plane-year';
import { amongRows, type RowLayout } from '@/lib/sun/row-shading';
import { sunYear, type SunYear } from '@/lib/sun/sun-year';
import { HOURS_PER_YEAR } from '@/lib/units/constants';
import type { WeatherYear } from '@/lib/weather/weather-year';
import type { SkyModel } from './design';

/** Planes kept per site: a drag over the tilt lever asks for each degree once. */
const PLANES_KEPT = 80;

/** What stands between a plane and the sky. */
export interface Obstructions {
  horizon?: readonly HorizonPoint[];
  rows?: RowLayout;
}

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

  /** Irradiance on a plane, worked once per orientation, sky model and what stands before it. */
  plane(plane: Plane, model: SkyModel, obstructions: Obstructions = {}): PlaneYear {
    const { horizon = [] } = obstructions;
    const rows = obstructions.rows && obstructions.rows.rows > 1 ? obstructions.rows : undefined;
    const free = `${plane.tiltDeg}|${plane.azimuthDeg}|${model}`;
    const open = this.kept(free, () => planeYear(this.weather, this.sun, plane, model));
    if (horizon.length === 0 && !rows) return open;
    const layout = rows && [rows.rows, rows.rowSpacingM, rows.rowHeightM];
    return this.kept(`${free}|${JSON.stringify([horizon, layout])}`, () => {
      const seen = horizon.length > 0 ? behindHorizon(open, this.sun, plane, horizon) : open;
      return rows ? amongRows(seen, this.sun, plane, rows) : seen;
    });
  }

  private kept(key: string, make: () => PlaneYear): PlaneYear {
    const known = this.planes.get(key);
    if (known) return known;
    const made = make();
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
