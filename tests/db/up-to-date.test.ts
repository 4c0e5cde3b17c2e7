import { describe, expect, it } from 'vitest';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { upToDate } from '@/db/queries/up-to-date';
import { houseSchema, type HouseRecord } from '@/lib/schemas/house';

describe('a stored record', () => {
  it('from before a field gets its default', () => {
    const { horizon, ...older } = demonstration.house;
    expect(horizon).not.toEqual([]);
    expect(upToDate(houseSchema, older as HouseRecord)).toEqual({ ...older, horizon: [] });
  });

  it('of today comes back as it is, and one that no longer fits too', () => {
    expect(upToDate(houseSchema, demonstration.house)).toEqual(demonstration.house);
    const cold = { ...demonstration.house, roomSetC: 3 };
    expect(upToDate(houseSchema, cold)).toBe(cold);
  });
});
