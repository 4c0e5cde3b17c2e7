import { memo } from 'react';
import type { Finding } from '@/lib/checks/findings';
import type { StudyAnswer } from '@/lib/study/study-question';
import { explainFinding } from './explain-finding';
import { HowComputed } from './how-computed-button';

const WORDS: Record<Finding['severity'], string> = { stop: 'Stop.', caution: 'Caution.', note: 'Note.' };

/** What the engineering checks found, the gravest first: a mark, the word, the sentence. */
export const ChecksList = memo(function ChecksList({ answer }: { answer: StudyAnswer | undefined }) {
  const findings = answer?.findings;
  return (
    <section aria-labelledby="checks-heading" className="pt-1 rule-ink">
      <h2 id="checks-heading" className="sr-only">
        Checks
      </h2>
      <ul>
        {answer?.findings.map((finding) => (
          <li key={`${finding.id} ${finding.text}`} className="flex gap-3 py-1.5 rule-hair">
            <CheckMark severity={finding.severity} />
            <p title={`Source: ${finding.source}`}>
              <strong>{WORDS[finding.severity]}</strong> {finding.text}{' '}
              <HowComputed
                className="word text-note"
                label={`How check ${finding.id} was judged`}
                explain={() => explainFinding(finding, answer)}
              >
                How?
              </HowComputed>
            </p>
          </li>
        ))}
      </ul>
      {findings?.length === 0 && <p className="py-1.5">No check has anything to say.</p>}
      <p className="mt-2 text-note text-muted">
        A model is no permit: wind, snow, hot water and electricity follow the local code and a licensed
        trade.
      </p>
    </section>
  );
});

export function CheckMark({ severity }: { severity: Finding['severity'] }) {
  return (
    <svg width="18" height="18" viewBox="0 0 18 18" aria-hidden="true" className="mt-0.5 shrink-0">
      {severity === 'stop' && (
        <>
          <rect width="18" height="18" className="fill-hot" />
          <rect x="4" y="7.5" width="10" height="3" className="fill-paper" />
        </>
      )}
      {severity === 'caution' && (
        <>
          <path d="m9 1 8 8-8 8-8-8z" className="fill-paper stroke-ink" strokeWidth="1.5" />
          <path d="m9 1 8 8H1z" className="fill-ink" />
        </>
      )}
      {severity === 'note' && (
        <rect x="4" y="4" width="10" height="10" fill="none" className="stroke-ink" strokeWidth="1.8" />
      )}
    </svg>
  );
}
