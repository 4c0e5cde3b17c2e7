import 'server-only';
import type { z } from 'zod';
import type { Answer } from '@/lib/schemas/answer';

/** Checks what a client sent; the first fault comes back with its words and its place. */
export function parseInput<S extends z.ZodType>(schema: S, input: unknown): Answer<{ data: z.output<S> }> {
  const parsed = schema.safeParse(input);
  if (parsed.success) return { ok: true, data: parsed.data };
  const issue = parsed.error.issues[0];
  return {
    ok: false,
    code: 'invalid',
    message: issue?.message ?? 'This input does not fit.',
    field: issue?.path.map(String).join('.') || undefined,
  };
}
