import { describe, expect, it } from 'vitest';
import { agreement, isCalibrated } from '@/lib/calibration/agreement';
import type { BillRow } from '@/lib/calibration/bill-row';
import { calibrateHouse, type Bills } from '@/lib/calibration/calibrate-house';
import { dayNumber, dayOfTypicalYear, isoDay } from '@/lib/calibration/day-number';
import { degreeDays, degreeDaysOfMean, outdoorDays, type Outdoor } from '@/lib/calibration/degree-days';
import { energySignature, lineBandW } from '@/lib/calibration/energy-signature';
import { autoregressive, seededRandom } from '@/lib/weather/seeded-random';

/** A year between −4 and 20 °C with days that scatter. */
const scatter = autoregressive(seededRandom(3), 365, 0.7);
const typicalDayC = Float64Array.from(
  scatter,
  (z, day) => 8 - 12 * Math.cos((2 * Math.PI * (day - 15)) / 365) + 2.5 * z,
);
const outdoor: Outdoor = { typicalDayC, monthMeanC: {} };

const TRUE_W_PER_K = 162;
const TRUE_HINGE_C = 15.5;
const TRUE_BASE_KWH_PER_DAY = 8;
const KWH_PER_UNIT = 4.8;
const EFFICIENCY = 0.84;

/** Bills of whole months from a house whose heat is known. */
function billsOf(months: number, noise = 0, first = 0): BillRow[] {
  const random = seededRandom(11);
  return Array.from({ length: months }, (_, i) => {
    const monthDay = (m: number) => new Date(Date.UTC(2024, m, 1)).toISOString().slice(0, 10);
    const [from, to] = [monthDay(first + i), monthDay(first + i + 1)];
    let heatKwh = 0;
    for (let day = dayNumber(from)!; day < dayNumber(to)!; day++) {
      const below = Math.max(0, TRUE_HINGE_C - typicalDayC[dayOfTypicalYear(day)]!);
      heatKwh += TRUE_BASE_KWH_PER_DAY + (TRUE_W_PER_K * below * 24) / 1000;
    }
    const quantity = (heatKwh / EFFICIENCY / KWH_PER_UNIT) * (1 + noise * (2 * random() - 1));
    return { from, to, quantity, estimated: false };
  });
}

const bills = (rows: BillRow[], changes: Partial<Bills> = {}): Bills => ({
  way: 'between two dates',
  kwhPerUnit: KWH_PER_UNIT,
  efficiency: EFFICIENCY,
  otherKwhPerYear: 0,
  stoveKwhPerYear: 0,
  stoveBandShare: 0,
  meterDigits: 6,
  rows,
  ...changes,
});

describe('the fit', () => {
  it('recovers the house that made the bills', () => {
    const found = calibrateHouse(bills(billsOf(24)), outdoor, 8);
    expect(found.refusals).toEqual([]);
    expect(found.lossWPerK!.value).toBeCloseTo(TRUE_W_PER_K, 3);
    expect(found.signature!.hinge.value).toBeCloseTo(TRUE_HINGE_C, 3);
    expect(found.baseKwhPerDay!.value).toBeCloseTo(TRUE_BASE_KWH_PER_DAY, 3);
    expect(found.lossWPerK!.band).toBeLessThan(0.01);
    expect(found.signature!.fit.cvRmse).toBeLessThan(1e-6);
  });

  it('holds the truth in its band when the readings scatter', () => {
    const { lossWPerK, signature, baseKwhPerDay } = calibrateHouse(bills(billsOf(24, 0.08)), outdoor, 8);
    expect(lossWPerK!.band).toBeGreaterThan(1);
    expect(lossWPerK!.band).toBeLessThan(30);
    expect(Math.abs(lossWPerK!.value - TRUE_W_PER_K)).toBeLessThan(lossWPerK!.band);
    expect(Math.abs(signature!.hinge.value - TRUE_HINGE_C)).toBeLessThan(signature!.hinge.band);
    expect(Math.abs(baseKwhPerDay!.value - TRUE_BASE_KWH_PER_DAY)).toBeLessThan(baseKwhPerDay!.band);
    expect(lineBandW(signature!, -5)).toBeGreaterThan(lineBandW(signature!, 5));
  });

  it('is the same from standings of a meter', () => {
    const rows = billsOf(24);
    let sum = 1000;
    const standings = [
      { from: '', to: rows[0]!.from, quantity: sum, estimated: false },
      ...rows.map(({ to, quantity }) => ({ from: '', to, quantity: (sum += quantity), estimated: false })),
    ];
    const found = calibrateHouse(bills(standings, { way: 'meter readings' }), outdoor, 8);
    expect(found.lossWPerK!.value).toBeCloseTo(TRUE_W_PER_K, 3);
  });

  it('is not moved by an estimate once a reading mends it', () => {
    const rows = billsOf(24);
    const [estimate, mended] = [rows[3]!, rows[4]!];
    rows[3] = { ...estimate, quantity: estimate.quantity + 77, estimated: true };
    rows[4] = { ...mended, quantity: mended.quantity - 77 };
    const found = calibrateHouse(bills(rows), outdoor, 8);
    expect(found.intervals).toHaveLength(23);
    expect(found.lossWPerK!.value).toBeCloseTo(TRUE_W_PER_K, 3);
  });

  it('takes cooking from the base load and adds the stove to the loss', () => {
    const cooking = calibrateHouse(bills(billsOf(24), { otherKwhPerYear: 365 }), outdoor, 8);
    expect(cooking.lossWPerK!.value).toBeCloseTo(TRUE_W_PER_K, 3);
    expect(cooking.baseKwhPerDay!.value).toBeCloseTo(TRUE_BASE_KWH_PER_DAY - EFFICIENCY, 3);
    const stove = calibrateHouse(
      bills(billsOf(24), { stoveKwhPerYear: 1000, stoveBandShare: 0.5 }),
      outdoor,
      8,
    );
    expect(stove.lossWPerK!.value).toBeGreaterThan(TRUE_W_PER_K + 5);
    expect(stove.lossWPerK!.band).toBeCloseTo(0.5 * (stove.lossWPerK!.value - TRUE_W_PER_K), 3);
  });

  it('holds a base load below nothing at nothing', () => {
    const points = [0, 4, 8, 12, 16, 20].map((below) => ({
      powerW: Math.max(0, 150 * (below - 2)),
      days: 30,
      outdoor: [{ days: 30, meanC: 16 - below, scattered: false }],
    }));
    const { base, slope } = energySignature(points);
    expect(base.value).toBeLessThan(1e-3);
    expect(slope.value).toBeCloseTo(150, 3);
  });
});

describe('the slope is refused', () => {
  const refusal = (rows: BillRow[]) => calibrateHouse(bills(rows), outdoor, 8);

  it('with fewer than six intervals, and a range is given instead', () => {
    const found = refusal(billsOf(5));
    expect(found.signature).toBeUndefined();
    expect(found.refusals[0]).toContain('There are 5 intervals between real readings; a slope needs 6.');
    expect(found.lossRange!.low).toBeLessThan(TRUE_W_PER_K);
    expect(found.lossRange!.high).toBeGreaterThan(TRUE_W_PER_K);
  });

  it('with less than nine months', () => {
    expect(refusal(billsOf(8)).refusals.join()).toContain('cover 8 months; a slope needs 9');
  });

  it('from winters alone', () => {
    const winters = [0, 1, 2, 10, 11, 12, 13, 14, 22, 23, 24, 25].flatMap((month) => billsOf(1, 0, month));
    expect(refusal(winters).refusals.join()).toContain('All readings are of the cold season');
  });

  it('from summers alone', () => {
    const summers = [5, 6, 7, 17, 18, 19, 29, 30, 31, 41].flatMap((month) => billsOf(1, 0, month));
    expect(refusal(summers).refusals.join()).toContain('No reading is of the cold season');
  });

  it('when more than 30 % are estimated', () => {
    const rows = billsOf(24).map((row, i) => ({ ...row, estimated: i % 3 !== 2 }));
    expect(refusal(rows).refusals.join()).toContain('67 % of the readings are estimated');
  });

  it('when the heat does not follow the weather', () => {
    const rows = billsOf(24).map((row) => ({ ...row, quantity: 100 }));
    expect(refusal(rows).refusals.join()).toContain('does not follow the weather');
  });

  it('without any reading', () => {
    expect(refusal([]).refusals).toEqual([
      'There are no intervals between real readings; a slope needs 6. Add readings, monthly if you can.',
    ]);
  });
});

describe('the outdoor days', () => {
  it('are moved to the mean of a real month', () => {
    const [from, to] = [dayNumber('2024-01-01')!, dayNumber('2024-02-01')!];
    const days = outdoorDays(from, to, { typicalDayC, monthMeanC: { '2024-01': -7.5 } })!;
    expect(days.reduce((sum, day) => sum + day.meanC, 0) / 31).toBeCloseTo(-7.5, 9);
    expect(degreeDays(days, 30)).toBeCloseTo(31 * 37.5, 6);
  });

  it('come from the mean alone where no weather year is chosen', () => {
    const [from, to] = [dayNumber('2024-01-01')!, dayNumber('2024-02-01')!];
    const days = outdoorDays(from, to, { monthMeanC: { '2024-01': 10 } })!;
    expect(degreeDays(days, 15.5)).toBeCloseTo(degreeDaysOfMean(31, 15.5, 10), 9);
    expect(outdoorDays(from, to + 1, { monthMeanC: { '2024-01': 10 } })).toBeUndefined();
  });

  it('take 29 February for the 28th', () => {
    expect(dayOfTypicalYear(dayNumber('2024-02-29')!)).toBe(58);
    expect(dayOfTypicalYear(dayNumber('2024-12-31')!)).toBe(364);
    expect(isoDay(dayNumber('2023-03-01')!)).toBe('2023-03-01');
    expect(dayNumber('2023-02-29')).toBeUndefined();
  });
});

describe('agreement by ASHRAE Guideline 14', () => {
  it('is bias and scatter over the mean', () => {
    const found = agreement([110, 90, 100, 100], [100, 100, 100, 100], 1);
    expect(found.nmbe).toBeCloseTo(0, 12);
    expect(found.cvRmse).toBeCloseTo(Math.sqrt(200 / 3) / 100, 12);
    expect(isCalibrated(found)).toBe(true);
    expect(isCalibrated(agreement([106, 107, 105, 106], [100, 100, 100, 100], 1))).toBe(false);
  });
});
