import { describe, expect, it } from 'vitest';
import { countChanges, markUnchanged } from '@/components/compare/changes';
import {
  comparedDesign,
  readStones,
  withShortNames,
  type ComparedDesign,
} from '@/components/compare/compared-design';
import { differenceInWords, differences, notLikeForLike } from '@/components/compare/differences';
import { headline } from '@/components/compare/headline';
import { ownHoursRow, receiptRows } from '@/components/compare/receipt';
import { CARRIER_STONES, HOT_STONE } from '@/components/mosaic/stones';
import { climateYear } from '@/data/climates/climates';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { numericsSchema } from '@/lib/schemas/design-file';
import { createSimulator } from '@/lib/simulation/simulate';

const terms = { currency: 'EUR', realRate: 3, years: 20 };

const film: ComparedDesign = {
  id: 'film',
  name: 'Film rows',
  areaM2: 24,
  fields: [{ areaM2: 24, cover: 'film' }],
  volumeL: 2000,
  weatherName: 'Upland',
  synthetic: true,
  roomSetC: 20.5,
  stones: '0'.repeat(8760),
  solarShare: 0.23,
  solarKwh: 3670,
  backupHeatKwh: 12500,
  boughtKwh: 14880,
  unmetKwh: 0,
  costPerKwh: 0.101,
  toBuild: 3580,
  runningPerYear: 1400,
  replaces: true,
  hotHours: 0,
  hotPart: undefined,
  receipt: [
    { kind: 'investment', label: 'collectors', perKwh: 0.05 },
    { kind: 'replacement', label: 'new film', perKwh: 0.03 },
    { kind: 'replacement', label: 'new mat', perKwh: 0.02 },
    { kind: 'residual', label: 'value left at the end', perKwh: -0.01 },
    { kind: 'upkeep', label: 'upkeep', perKwh: 0.011 },
  ],
  ownHours: 64,
  backupPerKwh: 0.101,
};

const twinWall: ComparedDesign = {
  ...film,
  id: 'twin-wall',
  name: 'Twin-wall rows',
  solarShare: 0.34,
  solarKwh: 5520,
  backupHeatKwh: 10800,
  boughtKwh: 12857,
  costPerKwh: 0.078,
  toBuild: 4160,
  runningPerYear: 1220,
  hotHours: 6,
  hotPart: { material: 'PC sheet', limitC: 125, hottestC: 131, hours: 6 },
};

const factory: ComparedDesign = {
  ...film,
  id: 'factory',
  name: 'Factory ten',
  fields: [{ areaM2: 10, cover: 'selective glass' }],
  areaM2: 10,
  volumeL: 1000,
  solarKwh: 3700,
  costPerKwh: 0.125,
  toBuild: 5590,
  runningPerYear: 1410,
  replaces: false,
};

describe('differences in words', () => {
  it('says when more to build is paid back, and warns of what stands dry too hot', () => {
    // 580 € at 180 €/a and 3 % real: 174.8 + 169.7 + 164.7 + 159.9 = 669 € after four years, 509 € after three.
    expect(differenceInWords(twinWall, film, terms)).toEqual({
      title: 'Twin-wall rows against Film rows',
      sentence:
        'Costs 580\u00a0€ more to build and buys 2\u202f020\u00a0kWh less energy every year; the sun carries 11 points more. ' +
        'The difference is paid back in year 4. But dry, its PC sheet passes 125\u00a0°C in 6 hours of this year; ' +
        'Film rows bears all its dry hours.',
    });
  });

  it('says when the same heat never pays the difference back', () => {
    expect(differenceInWords(factory, film, terms).sentence).toBe(
      'Costs 2\u202f010\u00a0€ more to build and gives the same heat from 10\u00a0m² instead of 24. ' +
        'Never pays the difference back. Its collectors have nothing to replace for 20 years.',
    );
  });

  it('says when the cheaper one loses its lead', () => {
    expect(differenceInWords(film, twinWall, terms).sentence).toContain(
      'What it saves in building is used up in year 4.',
    );
  });

  it('sets every design against the first, and of three the second against the third', () => {
    expect(differences([film, twinWall, factory], terms).map(({ title }) => title)).toEqual([
      'Twin-wall rows against Film rows',
      'Factory ten against Film rows',
      'Twin-wall rows against Factory ten',
    ]);
    expect(differences([film, twinWall, factory, twinWall], terms)).toHaveLength(3);
  });
});

describe('not like for like', () => {
  it('is silent when like stands with like', () => {
    expect(notLikeForLike([film, twinWall])).toBeUndefined();
  });

  it('names other weather, other rooms and a house that stays cold', () => {
    expect(notLikeForLike([film, { ...twinWall, weatherName: 'Lowland' }])).toContain('Upland, Lowland');
    expect(notLikeForLike([film, { ...twinWall, roomSetC: 19 }])).toContain('19\u00a0°C');
    expect(notLikeForLike([film, { ...twinWall, unmetKwh: 900 }])).toContain('too cold with Twin-wall rows');
  });
});

describe('headline', () => {
  const words = (designs: ComparedDesign[]) =>
    headline(designs, 'EUR')
      .map((part) => (typeof part === 'string' ? part : part.text))
      .join('');

  it('never praises the cheapest heat without its dry temperature', () => {
    expect(words([film, twinWall, factory])).toBe(
      'The cheapest sun heat comes from Twin-wall rows at 0.078\u00a0€/kWh, too hot when it stands empty; ' +
        'among those that bear it, from Film rows at 0.101\u00a0€/kWh; the most, 34\u00a0% of all heat, from Twin-wall rows.',
    );
  });

  it('has words for designs without sun', () => {
    expect(words([{ ...film, costPerKwh: Number.NaN }])).toBe(
      'None of these designs carries heat from the sun.',
    );
  });
});

describe('short names', () => {
  it('drop what follows a comma where the rest tells the designs apart', () => {
    const names = (list: ComparedDesign[]) => withShortNames(list).map(({ name }) => name);
    expect(names([{ ...film, name: 'Film rows, winter' }, twinWall])).toEqual([
      'Film rows',
      'Twin-wall rows',
    ]);
    expect(
      names([
        { ...film, name: 'Film, 20' },
        { ...film, name: 'Film, 30' },
      ]),
    ).toEqual(['Film, 20', 'Film, 30']);
  });
});

describe('receipt', () => {
  it('keeps replacements in one row and every design’s lines adding up', () => {
    const rows = receiptRows([
      film,
      { ...factory, receipt: [{ kind: 'upkeep', label: 'upkeep', perKwh: 0.02 }] },
    ]);
    expect(rows.map(({ label }) => label)).toEqual([
      'collectors',
      'new film, mat',
      'value left at the end',
      'upkeep',
    ]);
    expect(rows.reduce((sum, { perKwh }) => sum + (perKwh[0] ?? 0), 0)).toBeCloseTo(film.costPerKwh, 10);
    expect(rows[0]!.perKwh[1]).toBeUndefined();
    expect(ownHoursRow([film])).toEqual([undefined]);
  });
});

describe('changed hours', () => {
  it('counts them and leaves a warning inked', () => {
    const before = Uint8Array.of(5, 5, 1, HOT_STONE, 0);
    const after = Uint8Array.of(1, 5, 5, HOT_STONE, 2);
    expect(countChanges(after, before)).toEqual({ hours: 3, backupToSun: 1, sunToBackup: 1 });
    expect([...markUnchanged(after, before)]).toEqual([1, 5 + CARRIER_STONES, 5, HOT_STONE, 2]);
  });
});

describe('the demonstration, compared', () => {
  const { house, prices, designs, climateId } = demonstration;
  const simulator = createSimulator();
  const compared = designs.map((design) => {
    const weather = climateYear(climateId)!;
    const outcome = simulator.run({ weather, house, design, numerics: numericsSchema.parse({}) });
    if (!outcome.ok) throw new Error(outcome.message);
    return comparedDesign(design.name, design, house, prices, outcome.result);
  });

  it('has receipts that add up to the cost of heat', () => {
    for (const design of compared) {
      const sum = design.receipt.reduce((total, { perKwh }) => total + perKwh, 0);
      expect(sum).toBeCloseTo(design.costPerKwh, 10);
    }
  });

  it('shows a homemade film design that bears its dry days beside a selective-coated one', () => {
    const filmRows = compared.find(({ fields }) => fields[0]?.cover === 'film')!;
    const selective = compared.find(({ fields }) => fields[0]?.cover === 'selective glass')!;
    expect(readStones(filmRows.stones)).toHaveLength(8760);
    expect(filmRows.hotHours).toBe(0);
    expect(selective.solarShare).toBeGreaterThan(0);
    expect(filmRows.solarShare).toBeGreaterThan(0);
    expect(notLikeForLike(compared)).toBeUndefined();
  });
});
