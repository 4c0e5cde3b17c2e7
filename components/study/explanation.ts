import type { z } from 'zod';
import { methodHref } from '@/lib/method/topics';
import type { TopicId } from '@/lib/method/topics';
import { collectorCurveSchema } from '@/lib/schemas/collector';
import type { CollectorRecord } from '@/lib/schemas/collector';
import { arraySchema, storeSchema, supplySchema } from '@/lib/schemas/design';
import type { DesignRecord } from '@/lib/schemas/design';
import { quantityMeta } from '@/lib/schemas/quantity';
import type { Origin } from '@/lib/schemas/quantity';
import { formatTyped, unitInCurrency, withUnit } from '@/lib/units/display';

/** A number that went into another: computed in the same year where it has no origin. */
export interface ExplainedInput {
  name: string;
  value: string;
  origin?: Origin;
  /** what stands behind an entered value: a standard, a table, a reason */
  source?: string;
}

/** A place on the method pages. */
export interface MethodLink {
  text: string;
  href: string;
}

/** How a number on the page was made: its equation in words, its inputs, and where the equation stands. */
export interface Explanation {
  title: string;
  value: string;
  equation: string;
  inputs: readonly ExplainedInput[];
  /** what was entered for the year behind it */
  entered?: readonly ExplainedInput[];
  source: string;
  method: readonly MethodLink[];
}

/** A function of the method pages by its topic. */
export function equationLink(text: string, topic: TopicId, name: string): MethodLink {
  return { text, href: methodHref(topic, name) };
}

/**
 * An entered number with its origin: that of the default while it stands at the default, else typed.
 * @param schema quantity of a schema
 * @param value the entered number
 * @param currency for amounts of money
 */
export function enteredInput(schema: z.ZodType, value: number, currency = 'EUR'): ExplainedInput {
  const meta = quantityMeta(schema);
  if (!meta) throw new Error('Only a quantity can be explained.');
  const kept = value === meta.default;
  return {
    name: meta.label,
    value: withUnit(formatTyped(value), unitInCurrency(meta.unit, currency)),
    origin: kept ? meta.origin : 'typed',
    ...(kept && { source: meta.source }),
  };
}

/** How a collector's coefficients are known when they are not the defaults of the form. */
const OF_COLLECTOR: Record<CollectorRecord['origin'], { origin: Origin; source: string }> = {
  'generic class': { origin: 'assumed', source: 'generic class, flat-plate theory' },
  'own build': { origin: 'assumed', source: 'build-up, flat-plate theory' },
  certificate: { origin: 'certificate', source: 'certificate, ISO 9806' },
  'own test': { origin: 'measured', source: 'own test' },
};

/** A coefficient of the collector's curve, known as its record says. */
export function coefficientInput(
  collector: CollectorRecord,
  name: 'eta0Beam' | 'a1' | 'a2' | 'diffuseModifier',
): ExplainedInput {
  const input = enteredInput(collectorCurveSchema.shape[name], collector.curve[name]);
  return input.origin === 'typed' ? { ...input, ...OF_COLLECTOR[collector.origin] } : input;
}

function fieldInputs({ array, collector }: Pick<DesignRecord, 'array' | 'collector'>): ExplainedInput[] {
  return [
    enteredInput(arraySchema.shape.areaM2, array.areaM2),
    enteredInput(arraySchema.shape.tiltDeg, array.tiltDeg),
    coefficientInput(collector, 'eta0Beam'),
    coefficientInput(collector, 'a1'),
    coefficientInput(collector, 'a2'),
  ];
}

/** The entered numbers that move a year most. */
export function designInputs(design: DesignRecord): ExplainedInput[] {
  const { second, store, supply } = design;
  return [
    ...fieldInputs(design),
    ...(second
      ? fieldInputs(second).map((input) => ({ ...input, name: `Second field: ${input.name}` }))
      : []),
    enteredInput(storeSchema.shape.volumeL, store.volumeL),
    enteredInput(supplySchema.shape.designSupplyC, supply.designSupplyC),
  ];
}

export const YEAR_LOOP = equationLink('The year, hour by hour', 'year', 'runYear');
export const FRACTIONS = equationLink('Solar fractions', 'year', 'solarFractions');
export const COLLECTOR_CURVE = equationLink('Efficiency curve', 'collector', 'steadyPower');
export const COST_OF_HEAT = equationLink('Cost of solar heat', 'money', 'costOfHeat');
export const REPLACEMENTS = equationLink('Replacements', 'money', 'replacementValue');
export const CHOICES_LINK: MethodLink = { text: 'Choices', href: '/method/choices' };
