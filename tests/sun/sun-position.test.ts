import { Body, Equator, Horizon, MakeTime, Observer } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';
import { hourAngleDeg, seenFrom, sunPosition } from '@/lib/sun/sun-position';
import { sunYear } from '@/lib/sun/sun-year';

const HOUR_MS = 3_600_000;
const START_MS = Date.UTC(2025, 0, 1);

/** True position by astronomy-engine (D. Cross, MIT), which agrees with NREL's SPA within 0.0004°. */
function ephemeris(
  timeMs: number,
  latitudeDeg: number,
  longitudeDeg: number,
): { altitudeDeg: number; azimuthDeg: number } {
  const time = MakeTime(new Date(timeMs));
  const observer = new Observer(latitudeDeg, longitudeDeg, 0);
  const sun = Equator(Body.Sun, time, observer, true, true);
  const seen = Horizon(time, observer, sun.ra, sun.dec);
  return { altitudeDeg: seen.altitude, azimuthDeg: seen.azimuth };
}

/** Angle between two directions in the sky [°]. */
function separationDeg(
  a: { altitudeDeg: number; azimuthDeg: number },
  b: { altitudeDeg: number; azimuthDeg: number },
): number {
  const rad = Math.PI / 180;
  const unit = (p: typeof a): number[] => [
    Math.cos(p.altitudeDeg * rad) * Math.cos(p.azimuthDeg * rad),
    Math.cos(p.altitudeDeg * rad) * Math.sin(p.azimuthDeg * rad),
    Math.sin(p.altitudeDeg * rad),
  ];
  const [u, v] = [unit(a), unit(b)];
  return Math.hypot(...u.map((x, i) => x - v[i]!)) / rad;
}

const places = [
  ['equator', 0, 0, 0],
  ['35° N', 35, -106, -7],
  ['46° N', 46, 11, 1],
  ['52° N', 52.2, 21, 1],
  ['60° N', 60, 25, 2],
  ['69° N', 69.6, 18.9, 1],
  ['34° S', -33.9, 151.2, 10],
  ['55° S', -54.8, -68.3, -3],
] as const;

describe.each(places)('the sun at %s', (_, latitudeDeg, longitudeDeg, timeZoneH) => {
  it('stands within 0.02° of the ephemeris over the year', () => {
    let worst = 0;
    for (let hour = 0; hour < 8760; hour += 53) {
      const timeMs = START_MS + hour * HOUR_MS;
      const found = sunPosition(timeMs, latitudeDeg, longitudeDeg);
      worst = Math.max(worst, separationDeg(found, ephemeris(timeMs, latitudeDeg, longitudeDeg)));
    }
    expect(worst).toBeLessThan(0.02);
  });

  it.each([1995, 2010, 2040])('stands within 0.02° of the ephemeris in %i too', (year) => {
    const startMs = Date.UTC(year, 0, 1);
    let worst = 0;
    for (let hour = 0; hour < 8760; hour += 211) {
      const timeMs = startMs + hour * HOUR_MS;
      const found = sunPosition(timeMs, latitudeDeg, longitudeDeg);
      worst = Math.max(worst, separationDeg(found, ephemeris(timeMs, latitudeDeg, longitudeDeg)));
    }
    expect(worst).toBeLessThan(0.02);
  });

  it('stands there in the hours of the year too, at the middle of each wholly lit hour', () => {
    const sun = sunYear({ latitudeDeg, longitudeDeg, timeZoneH }, -0.5);
    let worst = 0;
    for (let hour = 0; hour < 8760; hour += 31) {
      if (sun.sunlitFraction[hour] !== 1) continue;
      const timeMs = START_MS + (hour + 0.5 - timeZoneH) * HOUR_MS;
      const found = { altitudeDeg: 90 - sun.zenithDeg[hour]!, azimuthDeg: sun.azimuthDeg[hour]! };
      worst = Math.max(worst, separationDeg(found, ephemeris(timeMs, latitudeDeg, longitudeDeg)));
    }
    expect(worst).toBeLessThan(0.02);
  });

  it('is up for the same part of every hour as by the ephemeris', () => {
    const sun = sunYear({ latitudeDeg, longitudeDeg, timeZoneH }, -0.5);
    for (let day = 3; day < 365; day += 45) {
      for (let hour = 24 * day; hour < 24 * day + 24; hour++) {
        let lit = 0;
        for (let minute = 0; minute < 60; minute++) {
          const timeMs = START_MS + (hour + (minute + 0.5) / 60 - timeZoneH) * HOUR_MS;
          if (ephemeris(timeMs, latitudeDeg, longitudeDeg).altitudeDeg > 0) lit++;
        }
        // a minute of counting each at rise and set; the sun grazes the horizon for longer near the poles
        expect(Math.abs(sun.sunlitFraction[hour]! - lit / 60)).toBeLessThan(0.04);
      }
    }
  });
});

describe('hours of sunrise and sunset', () => {
  const sun = sunYear({ latitudeDeg: 46, longitudeDeg: 11, timeZoneH: 1 }, -0.5);

  it('show the sun at the middle of the sunlit part, above the horizon', () => {
    let partly = 0;
    for (let hour = 0; hour < 8760; hour++) {
      const lit = sun.sunlitFraction[hour]!;
      expect(sun.cosZenith[hour]! > 0).toBe(lit > 0);
      if (lit > 0 && lit < 1) partly++;
    }
    expect(partly).toBeGreaterThan(700);
    expect(partly).toBeLessThanOrEqual(730);
  });

  it('move with the shift of the time stamp', () => {
    const later = sunYear({ latitudeDeg: 46, longitudeDeg: 11, timeZoneH: 1 }, 0.5);
    for (let hour = 100; hour < 8700; hour += 97) {
      expect(Math.abs(later.zenithDeg[hour]! - sun.zenithDeg[hour + 1]!)).toBeLessThan(0.01);
    }
  });
});

describe('polar year', () => {
  const sun = sunYear({ latitudeDeg: 75, longitudeDeg: 20, timeZoneH: 1 }, -0.5);

  it('has hours without sun in December and without night in June', () => {
    const day = (first: number): number[] => Array.from(sun.sunlitFraction.subarray(first, first + 24));
    expect(day(24 * 354).every((lit) => lit === 0)).toBe(true);
    expect(day(24 * 171).every((lit) => lit === 1)).toBe(true);
    for (const column of Object.values(sun)) {
      expect((column as Float64Array).every(Number.isFinite)).toBe(true);
    }
  });

  it('holds at the pole itself', () => {
    const pole = sunYear({ latitudeDeg: 90, longitudeDeg: 0, timeZoneH: 0 }, -0.5);
    expect(pole.cosZenith.every(Number.isFinite)).toBe(true);
    expect(pole.sunlitFraction[24 * 171]).toBe(1);
    expect(pole.sunlitFraction[0]).toBe(0);
  });
});

describe('hour angle', () => {
  it('is the inverse of the position', () => {
    for (const latitudeDeg of [-54.8, 0, 46, 69.6]) {
      for (const omega of [-170, -95, -30, 0, 12.5, 80, 179]) {
        const seen = seenFrom(latitudeDeg, -12.3, omega);
        expect(hourAngleDeg(latitudeDeg, 90 - seen.altitudeDeg, seen.azimuthDeg)).toBeCloseTo(omega, 9);
      }
    }
  });
});
