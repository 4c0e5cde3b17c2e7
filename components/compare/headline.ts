import { pricePerKwh } from '@/components/study/verdict-words';
import { formatShare } from '@/lib/units/display';
import type { ComparedDesign } from './compared-design';

/** A run of words, or a number with the course of its meaning. */
export type HeadlinePart = string | { text: string; course: 'ink' | 'sun' | 'hot' };

const priced = (design: ComparedDesign) => Number.isFinite(design.costPerKwh);

/** The comparison in one sentence: who gives the cheapest heat, whether it bears its dry days, who carries most. */
export function headline(designs: readonly ComparedDesign[], currency: string): HeadlinePart[] {
  const byCost = designs.filter(priced).sort((a, b) => a.costPerKwh - b.costPerKwh);
  const [cheapest] = byCost;
  if (!cheapest) return ['None of these designs carries heat from the sun.'];
  const price = (design: ComparedDesign): HeadlinePart => ({
    text: pricePerKwh(design.costPerKwh, currency),
    course: 'ink',
  });
  const parts: HeadlinePart[] = [`The cheapest sun heat comes from ${cheapest.name} at `, price(cheapest)];
  const sound = byCost.find(({ hotHours }) => hotHours === 0);
  if (cheapest.hotHours > 0) {
    parts.push(', too hot when it stands empty');
    if (sound) parts.push(`; among those that bear it, from ${sound.name} at `, price(sound));
  }
  const most = [...designs].sort((a, b) => b.solarShare - a.solarShare)[0]!;
  parts.push(
    '; the most, ',
    { text: formatShare(most.solarShare), course: 'sun' },
    ` of all heat, from ${most.name}.`,
  );
  return parts;
}
