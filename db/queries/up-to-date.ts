import type { z } from 'zod';

/**
 * A stored record as the schema has it now: fields that came after it was stored get their defaults. One that no
 * longer fits comes back as it stands, for its form to say what is wrong.
 */
export function upToDate<T>(schema: z.ZodType<T>, data: T): T {
  const read = schema.safeParse(data);
  return read.success ? read.data : data;
}
