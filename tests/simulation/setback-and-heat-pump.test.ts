import { describe, expect, it } from 'vitest';
import { climates } from '@/data/climates/climates';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { heatPumpCop } from '@/lib/physics/heat-pump';
import { houseSchema, type HouseRecord } from '@/lib/schemas/house';
import { createSimulator } from '@/lib/simulation/simulate';
import { WH_PER_KWH } from '@/lib/units/constants';

const weather = climates[0]!.weatherYear();
const simulator = createSimulator();

function year(house: HouseRecord) {
  const outcome = simulator.run({
    weather,
    house,
    design: demonstration.designs[0]!,
    numerics: { theta: 0.5, skyModel: 'hdkr' },
  });
  if (!outcome.ok) throw new Error(outcome.message);
  return outcome.result;
}

const plain = year(demonstration.house);

describe('night setback', () => {
  const house = houseSchema.parse({
    ...demonstration.house,
    setback: { on: true, nightC: 17, fromHour: 22, toHour: 5 },
  });
  const set = year(house);

  it('needs less heat and lets the rooms cool, but not below the night set point', () => {
    expect(set.year.heatingKwh).toBeLessThan(plain.year.heatingKwh);
    expect(set.year.roomMinC).toBeLessThan(plain.year.roomMinC);
    expect(set.year.roomMinC).toBeGreaterThan(16.4);
    expect(set.balance.residualShare).toBeLessThan(1e-11);
  });

  it('gives the same year as no setback when night and day set points are equal', () => {
    const same = houseSchema.parse({
      ...demonstration.house,
      setback: { on: true, nightC: demonstration.house.roomSetC, fromHour: 22, toHour: 5 },
    });
    expect(year(same).year.heatingKwh).toBe(plain.year.heatingKwh);
  });
});

describe('heat pump as backup', () => {
  const house = houseSchema.parse({
    ...demonstration.house,
    backup: { ...demonstration.house.backup, fuel: 'heat pump', heatPump: { source: 'ground', groundC: 3 } },
  });
  const pumped = year(house);

  it('gives the same heat as a boiler and buys less, between the bounds of its two temperatures', () => {
    expect(pumped.year.heatingKwh).toBe(plain.year.heatingKwh);
    const backup = pumped.year.backupHeatingKwh + pumped.year.backupTapKwh;
    const mean = backup / pumped.year.boughtKwh;
    expect(mean).toBeGreaterThan(heatPumpCop(3, house.hotWater.setC));
    expect(mean).toBeLessThan(heatPumpCop(3, house.roomSetC + 1));
    expect(pumped.year.fractions.savedThermal).toBeGreaterThan(0);
  });

  it('buys for the taps at their own temperature and for the rooms at that of the loop', () => {
    const { backupHeatingW, backupTapW, supplyC } = pumped.columns;
    let boughtWh = 0;
    for (let h = 0; h < supplyC.length; h++) {
      boughtWh += backupTapW[h]! / heatPumpCop(3, house.hotWater.setC);
      if (backupHeatingW[h]! > 0) boughtWh += backupHeatingW[h]! / heatPumpCop(3, supplyC[h]!);
    }
    expect(Math.abs(boughtWh / WH_PER_KWH / pumped.year.boughtKwh - 1)).toBeLessThan(1e-4);
  });

  it('buys more with a colder source', () => {
    const colder = houseSchema.parse({
      ...house,
      backup: { ...house.backup, heatPump: { source: 'ground', groundC: -5 } },
    });
    expect(year(colder).year.boughtKwh).toBeGreaterThan(pumped.year.boughtKwh);
  });
});
