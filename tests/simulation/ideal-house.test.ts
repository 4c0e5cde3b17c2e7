import { describe, expect, it } from 'vitest';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { PlanBuilder } from '@/lib/simulation/build-plan';
import { runYear } from '@/lib/simulation/year';
import { YearState } from '@/lib/simulation/year-state';
import { monthSum, Tally } from '@/lib/simulation/tally';
import { HOURS_PER_YEAR, J_PER_KWH } from '@/lib/units/constants';
import type { CapacityClass } from '@/lib/physics/house-network';
import { WAVE_YEARS } from '@/lib/reference/house-rows';
import { waveSolarW, waveWeather } from '@/lib/reference/wave-weather';

/** ISO 13790:2008 annex C, synthetic years A6: the year loop with ideal set point on the same five houses. */
describe('year loop with ideal set point against the hourly calculation of ISO 13790', () => {
  for (const capacityClass of Object.keys(WAVE_YEARS) as CapacityClass[]) {
    it(`stays within 0.05 % of heat and 0.5 % of peak, class ${capacityClass}`, async ({ annotate }) => {
      const [heating, peak, hoursHeating] = WAVE_YEARS[capacityClass];
      const design = demonstration.designs[0]!;
      const plan = new PlanBuilder().plan({
        weather: waveWeather(),
        house: {
          ...demonstration.house,
          floorAreaM2: 100,
          capacityClass,
          windowOpening: false,
          roomSetC: 20,
          internalGainsW: 300,
          windows: [],
          emitters: { ...demonstration.house.emitters, kind: 'ideal' },
          hotWater: { ...demonstration.house.hotWater, litresPerDay: 0 },
          backup: { ...demonstration.house.backup, ratedW: 100_000 },
        },
        design: { ...design, array: { ...design.array, areaM2: 0 } },
        numerics: { theta: 0.5, skyModel: 'hdkr' },
      });
      plan.network = { ...plan.network, opaqueWPerK: 90, windowWPerK: 21 };
      plan.ventilationWPerK = 40;
      for (let h = 0; h < HOURS_PER_YEAR; h++) plan.columns.windowSunW[h] = waveSolarW(h);
      const state = new YearState(plan);
      const tally = new Tally(plan.layers);
      // the published years start with the mass at 20 °C and have no pre-run
      expect(runYear(plan, state, tally)).toBe('done');
      let sum = 0;
      for (let month = 0; month < 12; month++) sum += monthSum(tally.monthJ, month, 'heating');
      const hours = tally.columns.backupHeatingW.filter((w) => w > 0).length;
      const top = Math.max(...tally.columns.backupHeatingW);
      await annotate(`${hours} hours of heating, ${hoursHeating} by the hourly calculation`);
      expect(Math.abs(sum / J_PER_KWH / heating - 1)).toBeLessThan(5e-4);
      expect(Math.abs(top / peak - 1)).toBeLessThan(5e-3);
    });
  }
});
