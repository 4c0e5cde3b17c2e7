import type { Metadata } from 'next';
import Link from 'next/link';
import { DemonstrationComparison } from '@/components/study/demonstration-comparison';
import { designWord } from '@/components/study/design-word';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { demonstrationWeather } from '../../_components/demonstration-weather';

export const metadata: Metadata = { title: `${demonstration.house.name}, designs compared` };

/** Homemade and factory-made side by side, without an account. */
export default function DemonstrationComparePage() {
  return (
    <div className="pt-4">
      <p>
        <strong>{demonstration.house.name}</strong>, <span className="text-muted">an invented house.</span>{' '}
        <Link href="/demonstration">Move the levers of one design</Link>
      </p>
      <DemonstrationComparison
        house={demonstration.house}
        prices={demonstration.prices}
        weather={demonstrationWeather()}
        designs={demonstration.designs.map((design) => ({ word: designWord(design), design }))}
      />
    </div>
  );
}
