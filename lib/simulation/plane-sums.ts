import type { Plane } from '@/lib/sun/plane-year';
import { WH_PER_KWH } from '@/lib/units/constants';
import type { WeatherYear } from '@/lib/weather/weather-year';
import type { SkyModel } from './design';
import { SiteCache, type Obstructions } from './site-cache';

const MODELS: readonly SkyModel[] = ['isotropic', 'hay-davies', 'hdkr', 'perez'];

/**
 * Yearly irradiation on the plane of an array by each sky model, so that the spread of the models can be seen.
 * @param weather weather year
 * @param plane tilt and azimuth [°]
 * @param obstructions skyline and rows before it
 * @returns irradiation [kWh/m²] by sky model
 * @see lib/sun/plane-year.ts, lib/sun/horizon.ts, lib/sun/row-shading.ts
 */
export function planeSums(
  weather: WeatherYear,
  plane: Plane,
  obstructions?: Obstructions,
): Record<SkyModel, number> {
  const site = new SiteCache(weather);
  const sum = (model: SkyModel) =>
    site.plane(plane, model, obstructions).totalWm2.reduce((total, value) => total + value, 0) / WH_PER_KWH;
  return Object.fromEntries(MODELS.map((model) => [model, sum(model)])) as Record<SkyModel, number>;
}
