import type { Metadata } from 'next';
import Link from 'next/link';
import { comparedDesign } from '@/components/compare/compared-design';
import { Comparison } from '@/components/compare/comparison';
import { climateYear } from '@/data/climates/climates';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { numericsSchema } from '@/lib/schemas/design-file';
import { createSimulator } from '@/lib/simulation/simulate';

export const metadata: Metadata = { title: `${demonstration.house.name}, compared` };

/** Nothing of it changes: the years are worked once, when the page is built. */
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
    return comparedDesign(design.name, design, house, prices, outcome.result);
  });
  return { compared, latitudeDeg: weather.latitudeDeg };
}

/** The designs of the invented house side by side, without an account. */
export default function DemonstrationComparePage() {
  const { compared, latitudeDeg } = demonstrationYears();
  const { house, prices } = demonstration;
  return (
    <>
      <nav aria-label="Demonstration" className="flex flex-wrap items-center gap-x-6 pt-2">
        <span>
          <strong>{house.name}</strong>, <span className="text-muted">an invented house</span>
        </span>
        <Link href="/demonstration" className="inline-flex min-h-9 items-center">
          Study
        </Link>
        <span
          aria-current="page"
          className="inline-flex min-h-9 items-center border-b-2 border-ink font-strong"
        >
          Compare
        </span>
      </nav>
      <Comparison
        designs={compared}
        terms={{ currency: prices.currency, realRate: prices.realRate, years: prices.years }}
        fuel={house.backup.fuel}
        latitudeDeg={latitudeDeg}
      />
    </>
  );
}
