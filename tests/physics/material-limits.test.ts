import { describe, expect, it } from 'vitest';
import { MATERIAL_LIMITS } from '@/data/materials/limits';
import { countLimitHours } from '@/lib/physics/material-limits';
import { HOURS_PER_YEAR } from '@/lib/units/constants';

describe('hours above the limits of a material', () => {
  it('counts hours and degree-hours by month', () => {
    const temperatures = new Float64Array(HOURS_PER_YEAR).fill(20);
    temperatures[0] = 80;
    temperatures[743] = 100;
    temperatures[744] = 90;
    temperatures[8759] = 76;
    const counted = countLimitHours(temperatures, 75, 85);
    expect(counted).toMatchObject({
      hottestC: 100,
      hottestHour: 743,
      hoursAboveLong: 4,
      hoursAboveShort: 2,
      degreeHoursAboveLong: 5 + 25 + 15 + 1,
      degreeHoursAboveShort: 15 + 5,
    });
    expect(counted.monthHoursAboveLong).toEqual([2, 1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 1]);
    expect(counted.monthHoursAboveShort).toEqual([1, 1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0]);
    expect(counted.monthDegreeHoursAboveLong[0]).toBe(30);
  });

  it('leaves out the hours in which the part is not mounted', () => {
    const temperatures = new Float64Array(HOURS_PER_YEAR).fill(NaN);
    expect(countLimitHours(temperatures, 75, 85)).toMatchObject({ hottestHour: -1, hoursAboveLong: 0 });
    temperatures[100] = -5;
    expect(countLimitHours(temperatures, 75, 85)).toMatchObject({ hottestC: -5, hottestHour: 100 });
  });

  it('does not count a temperature that only reaches the limit', () => {
    const temperatures = new Float64Array(HOURS_PER_YEAR).fill(75);
    expect(countLimitHours(temperatures, 75, 85).hoursAboveLong).toBe(0);
  });
});

describe('table of material limits', () => {
  it('names each material once with a source, low below high, lasting below short', () => {
    expect(new Set(MATERIAL_LIMITS.map((material) => material.id)).size).toBe(MATERIAL_LIMITS.length);
    for (const material of MATERIAL_LIMITS) {
      expect(material.source.length, material.id).toBeGreaterThan(10);
      expect(material.longTermLowC, material.id).toBeLessThanOrEqual(material.longTermHighC);
      expect(material.shortTermLowC, material.id).toBeLessThanOrEqual(material.shortTermHighC);
      expect(material.longTermLowC, material.id).toBeLessThanOrEqual(material.shortTermLowC);
    }
  });
});
