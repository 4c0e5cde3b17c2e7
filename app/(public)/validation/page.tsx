import type { Metadata } from 'next';
import Link from 'next/link';
import { ValidationReport } from '@/components/validation/validation-report';
import { validate } from '@/lib/reference/validation';
import { ENGINE_VERSION } from '@/lib/simulation/engine-version';

/** The server's own outcome is worked while the product is built. */
export const dynamic = 'force-static';
export const metadata: Metadata = { title: 'Validation' };

/** Every check of the engine, to be run by whoever doubts it. */
export default function ValidationPage() {
  return (
    <div className="pt-7">
      <h1>Validation</h1>
      <p className="mt-2 max-w-[46rem] font-display text-h2">
        Engine {ENGINE_VERSION} against the outside world, with expected and computed values, tolerances and
        residuals. The button runs all of it again on your own machine.{' '}
        <Link href="/method">How it computes</Link> shows the equations.
      </p>
      <ValidationReport built={validate()} />
    </div>
  );
}
