import { describe, expect, it } from 'vitest';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { findings } from '@/lib/checks/findings';
import type { CollectorArray, House } from '@/lib/simulation/design';
import { inventedAnswer } from '../fakes/invented-answer';

const [design] = demonstration.designs;
const { result } = inventedAnswer(design, {
  solarKwh: 4000,
  backupKwh: 8000,
  referenceKwh: 12_000,
  perKwh: 0.1,
});

function text(id: string, array: Partial<CollectorArray>, house: Partial<House> = {}, latitudeDeg = 46) {
  const found = findings({
    house: { ...demonstration.house, ...house },
    design: { ...design, array: { ...design.array, tiltDeg: 65, azimuthDeg: 180, ...array } },
    result: { ...result, year: { ...result.year, latitudeDeg, southern: latitudeDeg < 0 } },
  });
  return found.find((finding) => finding.id === id)?.text;
}

describe('check A4, rows that shade rows', () => {
  // by hand at 46°: θz = 69.44°, θ = 4.44°, s = 2 cos 4.44° / cos 69.44° = 5.68 m; 1 − 4/5.68 = 29.6 %
  it('names the shadow at noon of the shortest day and the spacing that clears it', () => {
    expect(text('A4', { rows: 3, rowSpacingM: 4 })).toMatch(/shades 30.% of the next\. 5\.7.m .* now 4\.0.m/);
  });

  it('is silent for one row, for rows far enough apart, and without an array', () => {
    expect(text('A4', { rows: 1, rowSpacingM: 1 })).toBeUndefined();
    expect(text('A4', { rows: 3, rowSpacingM: 5.7 })).toBeUndefined();
    expect(text('A4', { rows: 3, rowSpacingM: 4, areaM2: 0 })).toBeUndefined();
  });

  it('looks north in the southern half of the Earth', () => {
    expect(text('A4', { rows: 3, rowSpacingM: 4, azimuthDeg: 0 }, {}, -46)).toBe(
      text('A4', { rows: 3, rowSpacingM: 4 }),
    );
  });
});

describe('check A5, the horizon', () => {
  it('asks for one where none is entered', () => {
    expect(text('A5', {}, { horizon: [] })).toMatch(/No horizon/);
    expect(text('A5', {})).toBeUndefined();
    expect(text('A5', { areaM2: 0 }, { horizon: [] })).toBeUndefined();
  });
});
