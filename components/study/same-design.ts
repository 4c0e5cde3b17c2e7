import type { DesignRecord } from '@/lib/schemas/design';

/** Whether two designs hold the same values, whatever the order in which they came. */
export function sameDesign(a: DesignRecord, b: DesignRecord): boolean {
  return a === b || sameValue(a, b);
}

function sameValue(a: unknown, b: unknown): boolean {
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return Object.is(a, b);
  const names = Object.keys(a);
  const other = b as Record<string, unknown>;
  return (
    names.length === Object.keys(b).length &&
    names.every((name) => name in other && sameValue((a as Record<string, unknown>)[name], other[name]))
  );
}
