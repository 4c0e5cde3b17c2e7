import { HOURS_PER_DAY, SOLAR_CONSTANT_W_PER_M2, toDegrees, toRadians } from '@/lib/units/constants';

/**
 * Irradiance outside the atmosphere on a plane facing the sun.
 * Equation: Gon = Gsc (1.000110 + 0.034221 cos B + 0.001280 sin B + 0.000719 cos 2B + 0.000077 sin 2B), B = 2π(n − 1)/365.
 * @param dayOfYear n, 1 January = 1 [d] 1…366
 * @param solarConstantWm2 Gsc [W/m²]
 * @returns Gon [W/m²]
 * @see J. W. Spencer, Fourier series representation of the position of the sun, Search 2 (1971) 172
 */
export function extraterrestrialNormalWm2(
  dayOfYear: number,
  solarConstantWm2: number = SOLAR_CONSTANT_W_PER_M2,
): number {
  const b = (2 * Math.PI * (dayOfYear - 1)) / 365;
  const distanceFactor =
    1.00011 +
    0.034221 * Math.cos(b) +
    0.00128 * Math.sin(b) +
    0.000719 * Math.cos(2 * b) +
    0.000077 * Math.sin(2 * b);
  return solarConstantWm2 * distanceFactor;
}

/**
 * Declination of the sun for a day, good enough for daily sums.
 * Equation: δ = 23.45° sin(360° (284 + n)/365).
 * @param dayOfYear n [d] 1…366
 * @returns δ [°] −23.45…23.45
 * @see P. I. Cooper, The absorption of radiation in solar stills, Solar Energy 12 (1969) 333
 */
export function declinationDeg(dayOfYear: number): number {
  return 23.45 * Math.sin((2 * Math.PI * (284 + dayOfYear)) / 365);
}

/**
 * Hour angle of sunset on the horizontal: cos ωs = −tan φ tan δ.
 * @param latitudeDeg φ [°] −90…90
 * @param dayOfYear n [d] 1…366
 * @returns ωs [°]: 0 in the polar night, 180 in the polar day
 * @see J. A. Duffie & W. A. Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, eq. 1.6.10
 */
export function sunsetHourAngleDeg(latitudeDeg: number, dayOfYear: number): number {
  const cosine = -Math.tan(toRadians(latitudeDeg)) * Math.tan(toRadians(declinationDeg(dayOfYear)));
  return toDegrees(Math.acos(Math.min(1, Math.max(-1, cosine))));
}

/**
 * Irradiation outside the atmosphere on the horizontal between two hour angles of one day.
 * Equation: I0 = (24/2π) Gon [cos φ cos δ (sin ω2 − sin ω1) + (ω2 − ω1) sin φ sin δ].
 * @param latitudeDeg φ [°] −90…90
 * @param dayOfYear n [d] 1…366
 * @param fromHourAngleDeg ω1, morning negative [°] from −ωs
 * @param toHourAngleDeg ω2 [°] to ωs
 * @returns I0 [Wh/m²]
 * @see J. A. Duffie & W. A. Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, eq. 1.10.4
 */
export function extraterrestrialWhPerM2(
  latitudeDeg: number,
  dayOfYear: number,
  fromHourAngleDeg: number,
  toHourAngleDeg: number,
): number {
  const phi = toRadians(latitudeDeg);
  const delta = toRadians(declinationDeg(dayOfYear));
  const from = toRadians(fromHourAngleDeg);
  const to = toRadians(toHourAngleDeg);
  const path =
    Math.cos(phi) * Math.cos(delta) * (Math.sin(to) - Math.sin(from)) +
    (to - from) * Math.sin(phi) * Math.sin(delta);
  return (HOURS_PER_DAY / (2 * Math.PI)) * extraterrestrialNormalWm2(dayOfYear) * path;
}

/**
 * Irradiation outside the atmosphere on the horizontal over a whole day: I0 from −ωs to ωs.
 * @param latitudeDeg φ [°] −90…90
 * @param dayOfYear n [d] 1…366
 * @returns H0 [Wh/m²]
 * @see J. A. Duffie & W. A. Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, eq. 1.10.3
 */
export function dailyExtraterrestrialWhPerM2(latitudeDeg: number, dayOfYear: number): number {
  const sunset = sunsetHourAngleDeg(latitudeDeg, dayOfYear);
  return extraterrestrialWhPerM2(latitudeDeg, dayOfYear, -sunset, sunset);
}
