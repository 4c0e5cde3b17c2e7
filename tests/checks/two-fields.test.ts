import { describe, expect, it } from 'vitest';
import { collectorByCover } from '@/data/collectors/generic';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { findings } from '@/lib/checks/findings';
import type { CollectorArray, Design } from '@/lib/simulation/design';
import { inventedAnswer } from '../fakes/invented-answer';

const [design] = demonstration.designs;
const { result } = inventedAnswer(design, {
  solarKwh: 4000,
  backupKwh: 8000,
  referenceKwh: 12_000,
  perKwh: 0.1,
});

function texts(id: string, second: Partial<CollectorArray> | null, change: Partial<Design> = {}): string[] {
  const collector = collectorByCover['selective glass'];
  return findings({
    house: demonstration.house,
    design: {
      ...design,
      ...change,
      second: second && { collector, array: { ...design.array, areaM2: 6, ...second } },
    },
    result,
  })
    .filter((finding) => finding.id === id)
    .map(({ text }) => text);
}

describe('checks of a design with two collector fields', () => {
  it('judges the store by the area of both', () => {
    const store = { ...design.store, volumeL: 800 };
    expect(texts('S1', null, { store })).toEqual([]);
    expect(texts('S1', {}, { store })[0]).toMatch(/^27.L of store per m²/);
  });

  it('names the field that looks away from the equator', () => {
    expect(texts('A2', { azimuthDeg: 270 })).toEqual([
      expect.stringMatching(/^The second field looks 90° away/),
    ]);
    expect(texts('A2', { azimuthDeg: 180 })).toEqual([]);
  });

  it('asks the head of the pump for the higher field', () => {
    const loop = { ...design.loop, pump: { ...design.loop.pump, kind: 'curve' as const, shutOffHeadM: 7 } };
    expect(texts('H3', { liftM: 3 }, { loop })).toEqual([]);
    expect(texts('H3', { liftM: 9 }, { loop })).toEqual([
      expect.stringMatching(/filling the second field asks/),
    ]);
  });

  it('speaks of one array where the second has no area', () => {
    expect(texts('A2', { areaM2: 0, azimuthDeg: 270 })).toEqual([]);
    expect(texts('A2', { areaM2: 0 }, { array: { ...design.array, azimuthDeg: 270 } })[0]).toMatch(
      /^The array looks/,
    );
  });
});
