import { HOURS_PER_DAY, HOURS_PER_YEAR } from '@/lib/units/constants';
import type { WeatherYear } from '@/lib/weather/weather-year';

/** Outdoor temperature of the published synthetic year: a yearly and a daily cosine [°C]. */
export function waveOutdoorC(h: number): number {
  return (
    10 -
    9 * Math.cos((2 * Math.PI * (h - 360)) / HOURS_PER_YEAR) -
    4 * Math.cos((2 * Math.PI * ((h % HOURS_PER_DAY) - 3)) / HOURS_PER_DAY)
  );
}

/** Sun through the windows of the same year [W]. */
export function waveSolarW(h: number): number {
  const hour = h % HOURS_PER_DAY;
  if (hour < 7 || hour > 17) return 0;
  return (
    2500 *
    (0.6 - 0.4 * Math.cos((2 * Math.PI * h) / HOURS_PER_YEAR)) *
    Math.max(0, Math.sin((Math.PI * (hour - 7)) / 10))
  );
}

/** The same year as a weather year without sun on the array, at 45° N. */
export function waveWeather(): WeatherYear {
  const column = (value: (h: number) => number) =>
    Float64Array.from({ length: HOURS_PER_YEAR }, (_, h) => value(h));
  const none = () => new Float64Array(HOURS_PER_YEAR);
  return {
    name: 'Waves',
    source: 'synthetic',
    synthetic: true,
    latitudeDeg: 45,
    longitudeDeg: 0,
    timeZoneH: 0,
    elevationM: 0,
    sunShiftH: -0.5,
    pointValues: 'interval',
    dryBulbC: column(waveOutdoorC),
    globalWm2: none(),
    beamNormalWm2: none(),
    diffuseWm2: none(),
    windMPerS: column(() => 3),
    dewPointC: column((h) => waveOutdoorC(h) - 4),
    skyLongwaveWm2: column(() => 280),
    pressurePa: column(() => 101_325),
    albedo: column(() => 0.2),
    notes: [],
  };
}
