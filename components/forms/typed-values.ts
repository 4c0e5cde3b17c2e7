import { z } from 'zod';
import { quantityMeta } from '@/lib/schemas/quantity';
import { readNumber } from '@/lib/units/display';

/** A record as it stands in a form: every number is the text that somebody typed; null where a part is left out. */
export type Typed = string | boolean | null | Typed[] | { [key: string]: Typed };

/** A number as form text: full precision, true minus. */
export function typedNumber(value: number): string {
  return String(value).replace('-', '\u2212');
}

/** A schema without its default and its leave to be absent, so that its kind can be told. */
export function bare(schema: z.ZodType): z.ZodType {
  const wrapped =
    schema instanceof z.ZodDefault || schema instanceof z.ZodPrefault || schema instanceof z.ZodNullable;
  return wrapped ? bare(schema.unwrap() as z.ZodType) : schema;
}

/** Whether a part that may be left out is left out. */
function isLeftOut(schema: z.ZodType, typed: unknown): boolean {
  return (typed === null || typed === undefined) && schema.isNullable();
}

type Shape = Readonly<Record<string, z.ZodType>>;

function optionsOf(union: z.ZodDiscriminatedUnion): { tag: string; word: string; shape: Shape }[] {
  const tag = union.def.discriminator;
  return union.options.map((option) => {
    const { shape } = option as z.ZodObject;
    return { tag, word: String((shape[tag] as z.ZodLiteral).value), shape: shape as Shape };
  });
}

/** Fields of an object or of the chosen option of a union; undefined for a leaf. */
function shapeOf(schema: z.ZodType, value: unknown): Shape | undefined {
  if (schema instanceof z.ZodObject) return schema.shape as Shape;
  if (!(schema instanceof z.ZodDiscriminatedUnion)) return undefined;
  const options = optionsOf(schema);
  const chosen = (value as Record<string, unknown> | undefined)?.[options[0]!.tag];
  return (options.find(({ word }) => word === chosen) ?? options[0]!).shape;
}

function elementOf(schema: z.ZodType): z.ZodType | undefined {
  return schema instanceof z.ZodArray ? (schema.element as z.ZodType) : undefined;
}

/** The schema of one field, found by its path: 'shell.0.uWPerM2K'. */
export function schemaAt(schema: z.ZodType, path: string): z.ZodType {
  let at = schema;
  for (const key of path.split('.')) {
    const here = bare(at);
    const shapes =
      here instanceof z.ZodDiscriminatedUnion
        ? optionsOf(here).map(({ shape }) => shape)
        : [shapeOf(here, undefined)];
    const next = elementOf(here) ?? shapes.find((shape) => shape?.[key])?.[key];
    if (!next) throw new Error(`No field "${path}" in this form.`);
    at = next;
  }
  return at;
}

/**
 * A record as form text; a field that is younger than the record begins at its default. Options of a union that are
 * not chosen are filled with their defaults, ready to be chosen.
 */
export function toTyped(schema: z.ZodType, stored: unknown): Typed {
  const here = bare(schema);
  const value = stored === undefined ? schema.parse(undefined) : stored;
  if (value === null) return null;
  if (typeof value === 'number') return typedNumber(value);
  const element = elementOf(here);
  if (element) return (value as unknown[]).map((row) => toTyped(element, row));
  const record = value as Record<string, unknown>;
  const typed: Record<string, Typed> = {};
  if (here instanceof z.ZodDiscriminatedUnion)
    for (const { tag, word, shape } of optionsOf(here))
      Object.assign(typed, toTyped(z.object(shape), z.object(shape).parse({ [tag]: word })));
  const shape = shapeOf(here, value);
  if (!shape) return value as Typed;
  for (const [key, field] of Object.entries(shape)) typed[key] = toTyped(field, record[key]);
  return typed;
}

/** Form text as a record that the schema can judge; text that is no number becomes NaN and never a default. */
export function fromTyped(schema: z.ZodType, typed: Typed | undefined): unknown {
  if (isLeftOut(schema, typed)) return null;
  if (quantityMeta(schema)) return readNumber(String(typed ?? '')) ?? Number.NaN;
  const here = bare(schema);
  const element = elementOf(here);
  if (element) return Array.isArray(typed) ? typed.map((row) => fromTyped(element, row)) : [];
  const shape = shapeOf(here, typed);
  if (!shape) return typed;
  const record = (typed ?? {}) as Record<string, Typed>;
  return Object.fromEntries(
    Object.entries(shape).map(([key, field]) => [key, fromTyped(field, record[key])]),
  );
}

function holdLeaf(schema: z.ZodType, typed: Typed | undefined, last: unknown): unknown {
  const now = schema.safeParse(fromTyped(schema, typed));
  if (now.success && typed !== undefined) return now.data;
  return last ?? schema.parse(undefined);
}

function hold(schema: z.ZodType, typed: Typed | undefined, last: unknown): unknown {
  if (isLeftOut(schema, typed)) return null;
  const here = bare(schema);
  const element = elementOf(here);
  if (element && Array.isArray(typed))
    return typed.map((row, i) => hold(element, row, (last as unknown[] | undefined)?.[i]));
  const shape = shapeOf(here, typed);
  if (!shape) return holdLeaf(schema, typed, last);
  return Object.fromEntries(
    Object.entries(shape).map(([key, field]) => [
      key,
      hold(
        field,
        (typed as Record<string, Typed> | undefined)?.[key],
        (last as Record<string, unknown> | undefined)?.[key],
      ),
    ]),
  );
}

/**
 * What the results go by while a form is being typed: each field as typed where it is good, and its last good value
 * where it is not.
 */
export function heldValues<S extends z.ZodType>(schema: S, typed: Typed, lastGood: z.output<S>): z.output<S> {
  return hold(schema, typed, lastGood) as z.output<S>;
}

/** A record without one row of the list at a path. */
export function withoutRow(record: unknown, path: readonly string[], index: number): unknown {
  const [key, ...rest] = path;
  if (key === undefined) return Array.isArray(record) ? record.filter((_, i) => i !== index) : record;
  const here = record as Record<string, unknown>;
  return { ...here, [key]: withoutRow(here[key], rest, index) };
}
