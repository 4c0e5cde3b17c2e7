import type { Collector, CollectorArray } from './design';

/** A collector field that is built, under the name that tells it from the other. */
export interface BuiltField<C, A> {
  collector: C;
  array: A;
  name: 'array' | 'first field' | 'second field';
}

/** Added to the name of a part, so that it is not taken for the first field's. */
export const OF_SECOND_FIELD = ' of the second field';

/**
 * The collector fields of a design that have an area, in their order.
 * @param design first field and, where there is one, the second
 * @returns no field, one named “array”, or two named “first field” and “second field”
 */
export function builtFields<C extends Collector, A extends CollectorArray>(design: {
  collector: C;
  array: A;
  second: { collector: C; array: A } | null;
}): BuiltField<C, A>[] {
  const { collector, array, second } = design;
  const built = [{ collector, array }, ...(second ? [second] : [])].filter((field) => field.array.areaM2 > 0);
  const names = built.length > 1 ? (['first field', 'second field'] as const) : (['array'] as const);
  return built.map((field, place) => ({ ...field, name: names[place]! }));
}
