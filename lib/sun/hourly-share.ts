import { toDegrees, toRadians } from '@/lib/units/constants';

/** The formula divides by zero where day or night has no length. */
const MIN_SUNSET_DEG = 1;

/**
 * Mean share of a day's global irradiation that falls in one hour.
 * Equation: rt = (π/24)(a + b cos ω)(cos ω − cos ωs)/(sin ωs − ωs cos ωs),
 * a = 0.409 + 0.5016 sin(ωs − 60°), b = 0.6609 − 0.4767 sin(ωs − 60°).
 * @param hourAngleDeg ω at the middle of the hour [°] −ωs…ωs
 * @param sunsetHourAngleDeg ωs [°] 1…180
 * @returns rt [-]; 0 outside the day. The hours of a day add up to 0.99…1.01
 * @see M. Collares-Pereira & A. Rabl, The average distribution of solar radiation, Solar Energy 22 (1979) 155
 */
export function hourlyShare(hourAngleDeg: number, sunsetHourAngleDeg: number): number {
  const sunset = toRadians(Math.max(MIN_SUNSET_DEG, sunsetHourAngleDeg));
  const omega = toRadians(hourAngleDeg);
  const shift = Math.sin(toRadians(toDegrees(sunset) - 60));
  const a = 0.409 + 0.5016 * shift;
  const b = 0.6609 - 0.4767 * shift;
  const height = Math.max(0, Math.cos(omega) - Math.cos(sunset));
  const day = Math.sin(sunset) - sunset * Math.cos(sunset);
  return ((Math.PI / 24) * (a + b * Math.cos(omega)) * height) / day;
}
