import fc from 'fast-check';
import type { z } from 'zod';
import { quantityMeta, type QuantityMeta } from '@/lib/schemas/quantity';

/** More elements of a list only make a run slower and a counter-example longer. */
const LONGEST_LIST = 4;

interface ListLimits {
  minimum?: number;
  maximum?: number;
  length?: number;
}

/** The parts of a zod schema's own description that are read here. */
interface Described {
  _zod: {
    def: {
      type: string;
      innerType?: z.ZodType;
      defaultValue?: unknown;
      shape?: Record<string, z.ZodType>;
      element?: z.ZodType;
      options?: readonly z.ZodType[];
      entries?: Record<string, string>;
      values?: readonly unknown[];
      checks?: readonly { _zod: { def: ListLimits } }[];
    };
  };
}

/** Steps of the form's own grid, counted from the default so that a counter-example shrinks towards it. */
function quantityArbitrary({ min, max, step, default: from }: QuantityMeta): fc.Arbitrary<number> {
  const down = -Math.floor((from - min) / step + 1e-9);
  const up = Math.floor((max - from) / step + 1e-9);
  const onGrid = fc
    .integer({ min: down, max: up })
    .map((k) => Math.min(max, Math.max(min, Number((from + k * step).toPrecision(12)))));
  return fc.oneof({ weight: 8, arbitrary: onGrid }, { weight: 1, arbitrary: fc.constantFrom(min, max) });
}

/**
 * Values of a schema, drawn from its own metadata: quantities over their whole range, every choice of an enum, every
 * kind of a union. A field added to a schema is drawn without a line here.
 */
export function schemaArbitrary(schema: z.ZodType): fc.Arbitrary<unknown> {
  const meta = quantityMeta(schema);
  if (meta) return quantityArbitrary(meta);
  const { def } = (schema as unknown as Described)._zod;
  switch (def.type) {
    case 'default':
    case 'prefault':
      // names are not drawn: no physics reads them
      return isText(def.innerType!) ? fc.constant(def.defaultValue) : schemaArbitrary(def.innerType!);
    case 'nullable':
      return fc.option(schemaArbitrary(def.innerType!), { nil: null });
    case 'object':
      return fc.record(
        Object.fromEntries(Object.entries(def.shape!).map(([key, field]) => [key, schemaArbitrary(field)])),
      );
    case 'array': {
      const limits = Object.assign({}, ...(def.checks ?? []).map((check) => check._zod.def)) as ListLimits;
      return fc.array(schemaArbitrary(def.element!), {
        minLength: limits.length ?? limits.minimum ?? 0,
        maxLength: limits.length ?? Math.min(LONGEST_LIST, limits.maximum ?? LONGEST_LIST),
        size: 'max',
      });
    }
    case 'enum':
      return fc.constantFrom(...Object.values(def.entries!));
    case 'union':
      return fc.oneof(...def.options!.map(schemaArbitrary));
    case 'literal':
      return fc.constantFrom(...def.values!);
    case 'boolean':
      return fc.boolean();
    default:
      throw new Error(`no values are drawn for a schema of the kind ${def.type}: give it a branch here`);
  }
}

function isText(schema: z.ZodType): boolean {
  return (schema as unknown as Described)._zod.def.type === 'string';
}
