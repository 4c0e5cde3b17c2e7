import 'server-only';
import { z } from 'zod';
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

const versionSchema = z.int({ error: 'Reload this page: it does not say which version it shows.' });

/** The same for a thing that is saved over the version that a client has seen. */
export function parseVersioned<S extends z.ZodType>(
  schema: S,
  input: unknown,
  version: unknown,
): Answer<{ data: z.output<S> }> {
  const seen = parseInput(versionSchema, version);
  return seen.ok ? parseInput(schema, input) : seen;
}
