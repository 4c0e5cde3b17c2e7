import { describe, expect, it } from 'vitest';
import { efficiencyDoubt } from '@/lib/calibration/efficiency-doubt';
import { larkspurBills } from '@/data/demonstration/larkspur-bills';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { climateYear } from '@/data/climates/climates';
import { dailyMeans } from '@/lib/calibration/degree-days';
import { houseHeat } from '@/lib/simulation/house-heat';
import { createSimulator } from '@/lib/simulation/simulate';
import { numericsSchema } from '@/lib/schemas/design-file';
import type { HouseRecord } from '@/lib/schemas/house';
import { billsFindings } from '@/lib/study/bills-findings';
import { dayHeatKwh } from '@/lib/study/day-heat';
import { houseByBills } from '@/lib/study/house-by-bills';

const { house, designs } = demonstration;
const weather = climateYear(demonstration.climateId)!;
const typicalDayC = [...dailyMeans(weather.dryBulbC)];
const simulator = createSimulator();

function dayKwhOf(changed: HouseRecord): number[] {
  const input = { weather, house: changed, design: designs[0], numerics: numericsSchema.parse({}) };
  const outcome = simulator.run(input);
  if (!outcome.ok) throw new Error(outcome.message);
  return dayHeatKwh(outcome.result.columns);
}

const scaled = (factor: number): HouseRecord => ({ ...house, calibration: { factor, basis: 'bills' } });

/** Monthly bills of a simulated house: its own heat as bought energy. */
function billsOfModel(dayKwh: readonly number[]) {
  const days = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];
  let first = 0;
  const rows = days.map((count, month) => {
    const heat = dayKwh.slice(first, first + count).reduce((sum, kwh) => sum + kwh, 0);
    first += count;
    const iso = (m: number) => new Date(Date.UTC(2025, m, 1)).toISOString().slice(0, 10);
    return { from: iso(month), to: iso(month + 1), quantity: heat, estimated: false };
  });
  return { ...larkspurBills(), rows, kwhPerUnit: 1, efficiency: 1 };
}

const entered = houseHeat(house).totalWPerK;

describe('a simulated house against its bills', () => {
  it('finds its own loss in its own bills, although sun bends their slope', () => {
    const dayKwh = dayKwhOf(house);
    const study = houseByBills(billsOfModel(dayKwh), house, typicalDayC, dayKwh);
    expect(study.byBills.lossWPerK!.value).toBeGreaterThan(1.08 * entered);
    expect(study.model!.lossWPerK.value).toBeCloseTo(entered, 6);
    expect(study.model!.agreement.cvRmse).toBeLessThan(1e-9);
  });

  it.each([0.75, 1.3])(
    'finds the loss of another house within 5 %, taken twice within 1 % (× %f)',
    (factor) => {
      const bills = billsOfModel(dayKwhOf(scaled(factor)));
      const errorAt = (now: HouseRecord) => {
        const lossWPerK = houseByBills(bills, now, typicalDayC, dayKwhOf(now)).model!.lossWPerK.value;
        return { lossWPerK, share: Math.abs(lossWPerK / (factor * entered) - 1) };
      };
      const once = errorAt(house);
      expect(once.share).toBeLessThan(0.05);
      expect(errorAt(scaled(once.lossWPerK / entered)).share).toBeLessThan(0.01);
    },
  );

  it('is set right by the bills of the demonstration', () => {
    const before = houseByBills(larkspurBills(), house, typicalDayC, dayKwhOf(house));
    const words = (study: typeof before) =>
      billsFindings(study, larkspurBills(), entered).map(({ text }) => text);
    expect(words(before).join()).toContain('is not calibrated by these bills');
    const after = scaled(before.model!.lossWPerK.value / entered);
    expect(houseHeat(after).totalWPerK).toBeCloseTo(before.model!.lossWPerK.value, 9);
    expect(words(houseByBills(larkspurBills(), after, typicalDayC, dayKwhOf(after))).join()).toContain(
      'The simulated house is calibrated by these bills',
    );
  });

  it('doubts savings where the drawings lose more than 1.25 times what the bills say', () => {
    const dayKwh = dayKwhOf(house);
    const bills = billsOfModel(dayKwhOf(scaled(0.7)));
    const found = billsFindings(houseByBills(bills, house, typicalDayC, dayKwh), bills, entered);
    expect(found.find(({ id }) => id === 'L3')?.text).toContain(
      'Savings worked out with it are probably over-stated',
    );
  });
});

describe('an efficiency', () => {
  it.each([
    [1.05, 'gross', true],
    [1.05, 'net', false],
    [1.12, 'net', true],
    [0.45, 'net', true],
    [3.5, 'none', false],
    [7, 'none', true],
  ] as const)('of %f on the %s value is doubted: %s', (efficiency, basis, doubted) => {
    expect(efficiencyDoubt(efficiency, basis) !== undefined).toBe(doubted);
  });
});
