import { z } from 'zod';
import { bare } from './typed-values';

/** Label and help of any field, read back from its schema. */
export interface FieldMeta {
  label: string;
  help?: string;
}

/** Label and help of a field, where its schema has them. */
export function findMeta(schema: z.ZodType): FieldMeta | undefined {
  const meta = z.globalRegistry.get(schema) as Partial<FieldMeta> | undefined;
  return meta?.label ? { label: meta.label, ...(meta.help ? { help: meta.help } : {}) } : undefined;
}

/** Label and help of a field; a field without a label is a mistake of the schema. */
export function metaOf(schema: z.ZodType): FieldMeta {
  const meta = findMeta(schema);
  if (!meta) throw new Error('A field of this form has no label in its schema.');
  return meta;
}

/** Whether a field holds a calendar day. */
export function isDay(schema: z.ZodType): boolean {
  const meta = z.globalRegistry.get(schema) as { kind?: unknown } | undefined;
  return meta?.kind === 'day';
}

/** The words that a choice offers; undefined for a field that is no choice. */
export function choicesOf(schema: z.ZodType): readonly string[] | undefined {
  const here = bare(schema);
  return here instanceof z.ZodEnum ? here.options.map(String) : undefined;
}
