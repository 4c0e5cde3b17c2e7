import type { Metadata } from 'next';
import Link from 'next/link';
import { comparedDesign } from '@/components/compare/compared-design';
import { Comparison } from '@/components/compare/comparison';
import { designWord } from '@/components/study/design-word';
import { climateYear } from '@/data/climates/climates';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { numericsSchema } from '@/lib/schemas/design-file';
import { createSimulator } from '@/lib/simulation/simulate';

export const metadata: Metadata = { title: `${demonstration.house.name}, designs compared` };

/** Nothing of it changes: the years are worked once, when the page is built, and stand in its first byte. */
export const dynamic = 'force-static';

function demonstrationYears() {
  const { house, prices, designs, climateId } = demonstration;
  const weather = climateYear(climateId);
  if (!weather) throw new Error(`The climate ${climateId} of the demonstration is missing.`);
  const simulator = createSimulator();
  const numerics = numericsSchema.parse({});
  const compared = designs.map((design) => {
    const outcome = simulator.run({ weather, house, design, numerics });
    if (!outcome.ok) throw new Error(outcome.message);
    return comparedDesign(designWord(design), design, house, prices, outcome.result);
  });
  return { compared, latitudeDeg: weather.latitudeDeg };
}

/** Homemade and factory-made side by side, without an account. */
export default function DemonstrationComparePage() {
  const { compared, latitudeDeg } = demonstrationYears();
  const { house, prices } = demonstration;
  return (
    <>
      <p className="pt-4">
        <strong>{house.name}</strong>, <span className="text-muted">an invented house.</span>{' '}
        <Link href="/demonstration">Move the levers of one design</Link>
      </p>
      <Comparison
        designs={compared}
        terms={{ currency: prices.currency, realRate: prices.realRate, years: prices.years }}
        fuel={house.backup.fuel}
        latitudeDeg={latitudeDeg}
        links={compared.map(({ id, name }) => (
          <Link key={id} href={`/demonstration?design=${id}`}>
            Open<span className="sr-only"> {name}</span>
          </Link>
        ))}
      />
    </>
  );
}
