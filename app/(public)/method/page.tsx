import type { Metadata } from 'next';
import Link from 'next/link';
import { methodPages } from '@/lib/method/method-page';
import { ENGINE_VERSION } from '@/lib/simulation/engine-version';

export const dynamic = 'force-static';
export const metadata: Metadata = { title: 'How it computes' };

const BESIDE = [
  {
    href: '/method/choices',
    title: 'Choices that the equations leave open',
    text: 'Hour convention, pump, order of heat, thermostat: where two honest engines part, and by how much.',
  },
  {
    href: '/method/checks',
    title: 'Engineering checks',
    text: 'What speaks up beside a result, how gravely, and where each limit comes from.',
  },
  {
    href: '/method/limits',
    title: 'Limits and cautions',
    text: 'What the model does not know, which standards have been withdrawn, and where the work can hurt.',
  },
  {
    href: '/method/changes',
    title: 'Results that change',
    text: 'Each version of the engine, what it moves and by how much.',
  },
  {
    href: '/validation',
    title: 'Validation',
    text: 'Every check with its residual, the convergence of steps and layers, the balance: to be run here, by you.',
  },
] as const;

/** Contents of the method: subjects in the order in which a year is worked. */
export default function MethodIndexPage() {
  return (
    <div className="pt-7">
      <h1>How it computes</h1>
      <p className="mt-2 max-w-[46rem] font-display text-h2">
        Every equation with its symbols, source, range and the present value of its checks. These pages are
        written from the program’s own comments and checks each time it is built; there is no second copy.
        Engine {ENGINE_VERSION}.
      </p>
      <div className="mt-7 grid gap-x-10 gap-y-7 lg:grid-cols-[minmax(0,1fr)_22rem]">
        <ol className="rule-ink">
          {methodPages().map(({ topic, entryCount, checkCount }) => (
            <li key={topic.id} className="flex flex-wrap justify-between gap-x-6 py-2 rule-hair">
              <div className="max-w-[38rem]">
                <h2 className="text-h3">
                  <Link href={`/method/${topic.id}`}>{topic.title}</Link>
                </h2>
                <p>{topic.text}</p>
              </div>
              <p className="text-note text-muted tabular-nums sm:text-right">
                {entryCount} equations and rules
                <br />
                {checkCount} checks
              </p>
            </li>
          ))}
        </ol>
        <ul className="rule-ink lg:self-start">
          {BESIDE.map(({ href, title, text }) => (
            <li key={href} className="py-2 rule-hair">
              <h2 className="text-h3">
                <Link href={href}>{title}</Link>
              </h2>
              <p>{text}</p>
            </li>
          ))}
        </ul>
      </div>
    </div>
  );
}
