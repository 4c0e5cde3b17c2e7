import 'server-only';
import { createHash } from 'node:crypto';
import type { Design, House, Numerics } from '@/lib/simulation/design';

export interface HashedInputs {
  house: House;
  design: Design;
  numerics: Numerics;
  /** of the weather year */
  weatherSha256: string;
}

/** The same text for the same values, in whatever order the database returns their keys. */
function canonical(value: unknown): string {
  return JSON.stringify(value, (_key, part: unknown) =>
    part !== null && typeof part === 'object' && !Array.isArray(part)
      ? Object.fromEntries(Object.entries(part).sort(([a], [b]) => (a < b ? -1 : 1)))
      : part,
  );
}

/** SHA-256 of everything that a year depends on beside the engine, as hexadecimal digits. */
export function inputsHash(inputs: HashedInputs): string {
  return createHash('sha256').update(canonical(inputs)).digest('hex');
}
