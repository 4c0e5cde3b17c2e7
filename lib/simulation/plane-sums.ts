import { planeYear, type Plane } from '@/lib/sun/plane-year';
import { sunYear } from '@/lib/sun/sun-year';
import { WH_PER_KWH } from '@/lib/units/constants';
import type { WeatherYear } from '@/lib/weather/weather-year';
import type { SkyModel } from './design';

const MODELS: readonly SkyModel[] = ['isotropic', 'hay-davies', 'hdkr', 'perez'];

/**
 * Yearly irradiation on the plane of an array by each sky model, so that the spread of the models can be seen.
 * @param weather weather year
 * @param plane tilt and azimuth [°]
 * @returns irradiation [kWh/m²] by sky model
 * @see lib/sun/plane-year.ts
 */
export function planeSums(weather: WeatherYear, plane: Plane): Record<SkyModel, number> {
  const sun = sunYear(weather, weather.sunShiftH);
  const sum = (model: SkyModel) =>
    planeYear(weather, sun, plane, model).totalWm2.reduce((total, value) => total + value, 0) / WH_PER_KWH;
  return Object.fromEntries(MODELS.map((model) => [model, sum(model)])) as Record<SkyModel, number>;
}
