import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { offeredCorrection } from '@/components/forms/offered-correction';
import { fromTyped, heldValues, schemaAt, toTyped, type Typed } from '@/components/forms/typed-values';
import { dayStones } from '@/components/mosaic/day-stones';
import { genericCollectors } from '@/data/collectors/generic';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { collectorSchema } from '@/lib/schemas/collector';
import { designSchema } from '@/lib/schemas/design';
import { houseSchema } from '@/lib/schemas/house';
import { pricesSchema } from '@/lib/schemas/prices';
import { quantity, quantityMeta } from '@/lib/schemas/quantity';

const volume = quantity({
  label: 'Volume',
  unit: 'L',
  min: 200,
  max: 10000,
  step: 50,
  default: 2000,
  origin: 'assumed',
  source: 'test',
  help: 'Of the store.',
});

const meta = (schema: z.ZodType) => quantityMeta(schema)!;

describe('records as form text', () => {
  it.each([
    ['house', houseSchema, demonstration.house],
    ['prices', pricesSchema, demonstration.prices],
    ['design', designSchema, demonstration.designs[0]],
    ...genericCollectors.map((c) => [c.name, collectorSchema, c] as const),
  ] as [string, z.ZodType, unknown][])('%s comes back as it went', (_, schema, record) => {
    expect(schema.parse(fromTyped(schema, toTyped(schema, record)))).toEqual(record);
  });

  it('begins a field that is younger than the record at its default', () => {
    const grown = z.object({ volume, extra: z.object({ on: z.boolean().default(true) }).prefault({}) });
    expect(toTyped(grown, { volume: 500 })).toEqual({ volume: '500', extra: { on: true } });
    expect(schemaAt(grown, 'extra.on').parse(undefined)).toBe(true);
  });

  it('leaves out a part that is left out, and gives it back whole where it is there', () => {
    const plan = z.object({ store: z.object({ volume }).nullable().default(null) });
    expect(toTyped(plan, {})).toEqual({ store: null });
    expect(fromTyped(plan, { store: null })).toEqual({ store: null });
    expect(fromTyped(plan, { store: { volume: '500' } })).toEqual({ store: { volume: 500 } });
    expect(heldValues(plan, { store: { volume: 'x' } }, { store: { volume: 700 } })).toEqual({
      store: { volume: 700 },
    });
    expect(heldValues(plan, { store: null }, { store: { volume: 700 } })).toEqual({ store: null });
    expect(quantityMeta(schemaAt(plan, 'store.volume'))?.label).toBe('Volume');
  });

  it('never turns text that is no number into a default', () => {
    for (const text of ['', '  ', 'warm', '1.2.3'])
      expect(z.object({ volume }).safeParse(fromTyped(z.object({ volume }), { volume: text })).success).toBe(
        false,
      );
  });

  it('keeps the figures of the way that is not chosen, ready to be chosen', () => {
    const typed = toTyped(collectorSchema, genericCollectors[1]) as { dry: { [key: string]: Typed } };
    typed.dry.kind = 'declared';
    expect(fromTyped(collectorSchema, typed as Typed)).toMatchObject({
      dry: { kind: 'declared', stagnationC: 189 },
    });
  });

  it('holds a wrong field at its last good value and takes the others as typed', () => {
    const store = z.object({ volume, height: volume });
    const held = heldValues(store, { volume: '9', height: '300' }, { volume: 800, height: 900 });
    expect(held).toEqual({ volume: 800, height: 300 });
  });

  it('refuses a path that leads nowhere', () => {
    expect(() => schemaAt(houseSchema, 'shell.0.colour')).toThrow('shell.0.colour');
  });
});

describe('offered corrections', () => {
  const supply = designSchema.shape.supply;

  it.each([
    ['20', '2\u202f000'],
    ['2', '2\u202f000'],
    ['20000', '2\u202f000'],
    ['\u2212500', '500'],
    ['1,200', '1\u202f200'],
  ])('%s litres may have been %s', (text, word) => {
    expect(offeredCorrection(text, meta(volume))?.word).toBe(word);
  });

  it('knows degrees Fahrenheit in a field of degrees Celsius', () => {
    expect(offeredCorrection('120', meta(schemaAt(supply, 'designSupplyC')))).toEqual({
      value: 49,
      word: '49 (120 °F)',
    });
  });

  it('offers nothing for a good value or for words', () => {
    expect(offeredCorrection('800', meta(volume))).toBeUndefined();
    expect(offeredCorrection('large', meta(volume))).toBeUndefined();
  });
});

describe('a day as one stone', () => {
  const year = (day: number[]) => Uint8Array.from({ length: 8760 }, (_, hour) => day[hour % 24]!);
  const day = (counts: Partial<Record<number, number>>) =>
    year(Object.entries(counts).flatMap(([stone, hours]) => Array<number>(hours!).fill(Number(stone))));

  it.each([
    ['idle', { 0: 22, 2: 2 }, 0],
    ['carried by the sun', { 1: 9, 2: 5, 5: 10 }, 1],
    ['carried from the store', { 2: 14, 5: 10 }, 2],
    ['shared', { 1: 5, 5: 19 }, 3],
    ['backup', { 1: 1, 5: 23 }, 5],
    ['too hot for one hour', { 0: 23, 7: 1 }, 7],
  ])('%s', (_, counts, stone) => {
    expect(dayStones(day(counts), 0)[0]).toBe(stone);
  });
});
