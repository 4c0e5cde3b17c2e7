import type { Metadata } from 'next';
import Link from 'next/link';
import { Prose } from '@/components/method/method-text';
import { CHOICES } from '@/lib/method/choices';
import { withNumbers } from '@/lib/method/named-numbers';
import { ENGINE_VERSION } from '@/lib/simulation/engine-version';

export const dynamic = 'force-static';
export const metadata: Metadata = { title: 'Choices that the equations leave open' };

/** What the engine settles where the equations do not, with the numbers as they stand in the code. */
export default function ChoicesPage() {
  return (
    <div className="pt-7">
      <p className="mb-2 text-note">
        <Link href="/method">How it computes</Link>
      </p>
      <h1>Choices that the equations leave open</h1>
      <p className="mt-2 max-w-[46rem] font-display text-h2">
        Two honest engines differ by up to a tenth of the solar heat when these are not written down. Each
        result names the engine version that fixes them, now {ENGINE_VERSION}; numbers are read from the code.
      </p>
      <dl className="mt-7 max-w-[72rem] rule-ink">
        {CHOICES.map(({ subject, text, effect, fixedIn }) => (
          <div
            key={subject}
            id={subject.toLowerCase().replaceAll(/[^a-z]+/g, '-')}
            className="grid gap-x-7 gap-y-1 py-3 rule-hair md:grid-cols-[11rem_minmax(0,1fr)_15rem]"
          >
            <dt className="font-display text-h3 font-heading">{subject}</dt>
            <dd className="max-w-[44rem]">
              <Prose text={withNumbers(text, fixedIn)} />
            </dd>
            <dd className="text-note break-words text-muted">
              {effect && <span className="block">Solar heat of the year: {effect}.</span>}
              Fixed in {fixedIn.join(', ')}
            </dd>
          </div>
        ))}
      </dl>
      <p className="mt-3 max-w-[44rem] text-note text-muted">
        Effects were measured on a prototype over several designs; they tell the size, not the value for your
        house.
      </p>
    </div>
  );
}
