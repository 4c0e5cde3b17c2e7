'use client';

import Link from 'next/link';
import { useState, useTransition } from 'react';
import type { Answer } from '@/lib/schemas/answer';
import { ENGINE_VERSION } from '@/lib/simulation/engine-version';
import type { YearDifference } from '@/lib/study/year-difference';
import { formatFixed, NO_VALUE } from '@/lib/units/display';

/** What comes back when a stored design is worked again. */
export interface RepeatedYear {
  /** whether the inputs are still those of the older year: then the engine alone differs */
  sameInputs: boolean;
  differences: YearDifference[];
}

interface OlderRunProps {
  engineVersion: string;
  repeat(): Promise<Answer<RepeatedYear>>;
}

/** A stored year of an older engine: it stays, and can be worked again with the differences beside it. */
export function OlderRun({ engineVersion, repeat }: OlderRunProps) {
  const [answer, setAnswer] = useState<Answer<RepeatedYear>>();
  const [pending, startTransition] = useTransition();
  const again = () => startTransition(async () => setAnswer(await repeat()));
  return (
    <div className="border-l-2 border-ink pl-3 text-note">
      <p>
        The stored year was worked by engine {engineVersion}; the picture above is engine {ENGINE_VERSION}.{' '}
        <Link href="/method/changes">Results that change</Link>.{' '}
        {!answer?.ok && (
          <button type="button" className="word" disabled={pending} onClick={again}>
            Work it again and compare
          </button>
        )}
      </p>
      {pending && <p role="status">The server is working the year…</p>}
      {answer && !answer.ok && (
        <p role="alert" className="text-hot-text">
          {answer.message}
        </p>
      )}
      {answer?.ok && <Differences before={engineVersion} repeated={answer} />}
    </div>
  );
}

function Differences({ before, repeated }: { before: string; repeated: RepeatedYear }) {
  const decimals = (unit: YearDifference['unit']) => (unit === '%' || unit === '°C' ? 2 : 1);
  return (
    <>
      {!repeated.sameInputs && (
        <p>House, design or weather were changed since, so the engine is not the only difference.</p>
      )}
      <div className="overflow-x-auto" role="region" aria-label="Difference of the engines" tabIndex={0}>
        <table className="w-full">
          <thead>
            <tr>
              <th scope="col">Year</th>
              {[before, ENGINE_VERSION, 'difference'].map((head) => (
                <th key={head} scope="col" data-number>
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {repeated.differences.map(({ label, unit, before: old, after }) => (
              <tr key={label}>
                <th scope="row" className="font-normal">
                  {label}, {unit}
                </th>
                <td data-number>{old === null ? NO_VALUE : formatFixed(old, decimals(unit))}</td>
                <td data-number>{formatFixed(after, decimals(unit))}</td>
                <td data-number>{old === null ? NO_VALUE : formatFixed(after - old, decimals(unit))}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </>
  );
}
