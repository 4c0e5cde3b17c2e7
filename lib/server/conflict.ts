import 'server-only';
import type { Conflict } from '@/lib/schemas/answer';

/** Somebody saved first; the page shows what stands now and lets people choose. */
export function conflict<T>(thing: string, current: { data: T; version: number }): Conflict<T> {
  return {
    ok: false,
    code: 'conflict',
    message: `The ${thing} was changed elsewhere since you opened it. Nothing was overwritten: compare, then save again.`,
    current: { data: current.data, version: current.version },
  };
}
