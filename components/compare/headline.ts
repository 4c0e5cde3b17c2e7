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
  const parts: HeadlinePart[] = [`${cheapest.name} gives the cheapest sun heat at `, price(cheapest)];
  const sound = byCost.find(({ hotHours }) => hotHours === 0);
  if (cheapest.hotHours > 0) {
    parts.push(', but stands too hot when empty');
    if (sound) parts.push(`; of those that do not, ${sound.name} is the cheapest at `, price(sound));
  }
  const most = [...designs].sort((a, b) => b.solarShare - a.solarShare)[0]!;
  const share: HeadlinePart = { text: formatShare(most.solarShare), course: 'sun' };
  if (most === cheapest && !(cheapest.hotHours > 0))
    parts.push(' and carries the most, ', share, ' of the heat.');
  else parts.push(`; ${most.name} carries the most, `, share, ' of the heat.');
  return parts;
}
