import type { z } from 'zod';
import { quantityMeta } from '@/lib/schemas/quantity';
import { formatTyped, withUnit } from '@/lib/units/display';

/** The default of an input with its unit, as the forms show it: "7 K". */
export function defaultWords(schema: z.ZodType): string {
  const meta = quantityMeta(schema);
  if (!meta) throw new Error('Only a quantity has a default with a unit.');
  return withUnit(formatTyped(meta.default), meta.unit);
}
