import { readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { CHANGES } from '@/lib/method/changes';
import { designFileSchema } from '@/lib/schemas/design-file';
import { ENGINE_VERSION } from '@/lib/simulation/engine-version';
import { workGolden, type Golden } from './golden-runs';

const TOLERANCE = 1e-8;
const NEXT =
  'If results are meant to move: raise ENGINE_VERSION in lib/simulation/engine-version.ts, say in lib/method/changes.ts what moves and by how much, then node --import tsx tests/simulation/write-golden.ts';

const golden = JSON.parse(readFileSync(path.join(import.meta.dirname, 'golden.json'), 'utf8')) as Golden;

/** Math.exp and its kin are not specified to the last bit, so another JavaScript engine may differ a little. */
const isNear = (value: number, kept: number) =>
  Math.abs(value - kept) <= TOLERANCE * Math.max(1, Math.abs(kept));

describe('golden runs', () => {
  it('belong to the present engine, whose change is told', () => {
    expect(golden.engineVersion, NEXT).toBe(ENGINE_VERSION);
    expect(CHANGES[0]?.version, NEXT).toBe(ENGINE_VERSION);
  });

  it.each(golden.runs.map((run) => [run.name, run] as const))('%s: every sum within 1e-8', (_, run) => {
    const sums = workGolden({ climateId: run.climateId, file: designFileSchema.parse(run.file) });
    const moved = Object.entries(run.sums)
      .filter(([name, kept]) => !isNear(sums[name] ?? NaN, kept))
      .map(([name, kept]) => `${name}: ${sums[name]} instead of ${kept}`);
    expect(moved, NEXT).toEqual([]);
  });
});
