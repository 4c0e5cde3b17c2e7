import type { Design, House } from '@/lib/simulation/design';
import { planeYear } from '@/lib/sun/plane-year';
import { sunYear } from '@/lib/sun/sun-year';
import { HOURS_PER_DAY, HOURS_PER_YEAR, toRadians } from '@/lib/units/constants';
import type { WeatherYear } from '@/lib/weather/weather-year';
import { coldWaterAt, linearLossAt, supplyAt, tapAt } from './coefficients';
import type { Hour } from './equations';

/*
 * What the hours bring to collector and house, written from weather, house and design without the plan. Only the sun's
 * place and the irradiance on planes come from the product (`lib/sun`), which has checks of its own.
 */

/** Mean of an hour of a column that may stand at the ends of the hours. */
export function hourMean(weather: WeatherYear, column: Float64Array, h: number): number {
  if (weather.pointValues === 'interval') return column[h]!;
  return (column[h]! + column[(h + HOURS_PER_YEAR - 1) % HOURS_PER_YEAR]!) / 2;
}

/** Sun that the optics accept in an hour: η0,b (Kb Gb + Kd Gd) with Kb = 1 − b0 (1/cos θ − 1) [W/m²] (ISO 9806:2017, 23). */
export function acceptedSunOf({ collector, array }: Design, weather: WeatherYear): (h: number) => number {
  const plane = planeYear(weather, sunYear(weather, weather.sunShiftH), array, 'hdkr');
  const { eta0Beam, b0, diffuseModifier } = collector.curve;
  return (h) => {
    const beam = plane.beamWm2[h]!;
    const modifier = Math.max(0, 1 - b0 * (1 / Math.cos(toRadians(plane.incidenceDeg[h]!)) - 1));
    const rest = diffuseModifier * (plane.diffuseWm2[h]! + plane.groundWm2[h]!);
    return eta0Beam * (beam > 0 ? modifier * beam + rest : rest);
  };
}

/** Sun through the windows in an hour: 0.9 A (1 − F_F) g F_sh G [W] (ISO 13790:2008, 11.3). */
function windowSunOf(house: House, weather: WeatherYear): (h: number) => number {
  const sun = sunYear(weather, weather.sunShiftH);
  const windows = house.windows.map((window) => ({
    apertureM2: 0.9 * window.areaM2 * (1 - window.frameFraction) * window.gValue * window.shade,
    plane: planeYear(weather, sun, { tiltDeg: 90, azimuthDeg: window.azimuthDeg }, 'hdkr'),
  }));
  return (h) => windows.reduce((sum, { apertureM2, plane }) => sum + apertureM2 * plane.totalWm2[h]!, 0);
}

/** Whether an hour belongs to a night that passes midnight; never without a setback. */
function isNight({ setback }: House, hour: number): boolean {
  return setback.on && (hour >= setback.fromHour || hour < setback.toHour);
}

/**
 * The hours of a week.
 * @param firstDay of the week, 0 = 1 January
 * @param constantSun the same sun in every hour instead of that of the weather
 */
export function hoursOfWeek(
  house: House,
  design: Design,
  weather: WeatherYear,
  firstDay: number,
  constantSun?: { sunWm2: number; windowSunW: number },
): Hour[] {
  const sunOf = acceptedSunOf(design, weather);
  const windowOf = windowSunOf(house, weather);
  return Array.from({ length: 7 * HOURS_PER_DAY }, (_, i) => {
    const h = firstDay * HOURS_PER_DAY + i;
    const outdoorC = hourMean(weather, weather.dryBulbC, h);
    return {
      outdoorC,
      sunWm2: constantSun?.sunWm2 ?? sunOf(h),
      windowSunW: constantSun?.windowSunW ?? windowOf(h),
      a1: linearLossAt(design, hourMean(weather, weather.windMPerS, h)),
      roomSetC: isNight(house, h % HOURS_PER_DAY) ? house.setback.nightC : house.roomSetC,
      supplyC: supplyAt(house, design, outdoorC),
      tapKgPerS: tapAt(house, h % HOURS_PER_DAY),
      coldC: coldWaterAt(house, Math.floor(h / HOURS_PER_DAY) + 1),
    };
  });
}
