import type { Metadata } from 'next';
import Link from 'next/link';
import { CAUTIONS, MODEL_LIMITS } from '@/lib/method/limits';
import type { ModelLimit } from '@/lib/method/limits';

export const dynamic = 'force-static';
export const metadata: Metadata = { title: 'Limits and cautions' };

/** Where the figures end, and where the work can hurt. */
export default function LimitsPage() {
  return (
    <div className="max-w-[56rem] pt-7">
      <p className="mb-2 text-note">
        <Link href="/method">How it computes</Link>
      </p>
      <h1>Limits and cautions</h1>
      <p className="mt-2 max-w-[46rem] font-display text-h2">
        What the model does not know, and where the work can hurt. A model is no permit: local codes and
        licensed practice decide.
      </p>
      <Subjects title="What the model does not know" subjects={MODEL_LIMITS} />
      <Subjects title="Where the work can hurt" subjects={CAUTIONS} />
    </div>
  );
}

function Subjects({ title, subjects }: { title: string; subjects: readonly ModelLimit[] }) {
  return (
    <section aria-label={title} className="mt-7">
      <h2 className="mb-1">{title}</h2>
      <dl className="rule-ink">
        {subjects.map(({ subject, text }) => (
          <div key={subject} className="grid gap-x-7 py-3 rule-hair md:grid-cols-[13rem_minmax(0,1fr)]">
            <dt className="font-display text-h3 font-heading">{subject}</dt>
            <dd>{text}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
