import type { Metadata } from 'next';
import Link from 'next/link';
import { CheckMark } from '@/components/study/checks-list';
import { RULES } from '@/lib/checks/rules';
import type { Severity } from '@/lib/checks/rules';

export const dynamic = 'force-static';
export const metadata: Metadata = { title: 'Engineering checks' };

const SEVERITIES: Record<Severity, string> = { stop: 'Stop', caution: 'Caution', note: 'Note' };

/** The checks that speak beside a result, with the source of their limits. */
export default function ChecksPage() {
  return (
    <div className="max-w-[56rem] pt-7">
      <p className="mb-2 text-note">
        <Link href="/method">How it computes</Link>
      </p>
      <h1>Engineering checks</h1>
      <p className="mt-2 max-w-[46rem] font-display text-h2">
        {RULES.length} checks read every result and say what they find, the gravest first. A stop never hides
        the figures; it stands beside them until the design is mended.
      </p>
      <div className="mt-6 overflow-x-auto" role="region" aria-label="Engineering checks" tabIndex={0}>
        <table className="w-full min-w-[32rem]">
          <thead>
            <tr>
              {['Check', 'says at most', 'to be mended at', 'source of the limit'].map((head) => (
                <th key={head} scope="col" className="pr-4">
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {RULES.map(({ id, severity, where, source }) => (
              <tr key={id} id={`rule-${id.replaceAll(' ', '-')}`} className="align-top">
                <th scope="row" className="pr-4 font-normal">
                  {id}
                </th>
                <td className="pr-4">
                  <span className="flex gap-2 whitespace-nowrap">
                    <CheckMark severity={severity} /> {SEVERITIES[severity]}
                  </span>
                </td>
                <td className="pr-4">{where}</td>
                <td>{source}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </div>
  );
}
