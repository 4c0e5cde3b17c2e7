import { zodResolver } from '@hookform/resolvers/zod';
import type { FieldValues, Resolver } from 'react-hook-form';
import type { z } from 'zod';
import { fromTyped } from './typed-values';

/** Judges a form by its schema: typed text is read as numbers first. */
export function resolverOf(schema: z.ZodObject): Resolver<FieldValues> {
  const judge = zodResolver(schema);
  return (typed, context, options) =>
    judge(fromTyped(schema, typed) as FieldValues, context, options as Parameters<typeof judge>[2]);
}
