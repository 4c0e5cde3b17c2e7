import type { Metadata } from 'next';
import Link from 'next/link';
import { CHANGES } from '@/lib/method/changes';

export const dynamic = 'force-static';
export const metadata: Metadata = { title: 'Results that change' };

/** Versions of the engine, newest first. */
export default function ChangesPage() {
  return (
    <div className="max-w-[56rem] pt-7">
      <p className="mb-2 text-note">
        <Link href="/method">How it computes</Link>
      </p>
      <h1>Results that change</h1>
      <p className="mt-2 max-w-[46rem] font-display text-h2">
        Each stored year carries the version of the engine that worked it. Older years stay readable; the
        study offers to work them again and shows the difference.
      </p>
      {CHANGES.map(({ version, date, moves }) => (
        <section key={version} aria-label={`Engine ${version}`} className="mt-7">
          <h2 className="flex flex-wrap items-baseline justify-between gap-x-4">
            Engine {version} <time className="font-text text-note text-muted">{date}</time>
          </h2>
          <dl className="mt-1 rule-ink">
            {moves.map(({ what, byHowMuch }) => (
              <div key={what} className="grid gap-x-7 py-2 rule-hair md:grid-cols-2">
                <dt>{what}</dt>
                <dd className="text-muted">{byHowMuch}</dd>
              </div>
            ))}
          </dl>
        </section>
      ))}
    </div>
  );
}
