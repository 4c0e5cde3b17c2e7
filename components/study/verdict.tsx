'use client';

import { memo } from 'react';
import type { HouseRecord } from '@/lib/schemas/house';
import type { Prices } from '@/lib/schemas/prices';
import type { StudyAnswer } from '@/lib/study/study-question';
import { explain } from './how-computed';
import { HowComputed } from './how-computed-button';
import { useSettled } from './use-settled';
import { verdictParts, verdictText } from './verdict-words';
import type { VerdictNumber } from './verdict-words';

/** The course of stones on which a number stands, in the colour of its meaning. */
const COURSES: Record<VerdictNumber, string> = {
  area: 'course-ink',
  secondArea: 'course-ink',
  share: 'course-sun',
  price: 'course-ink',
  fuel: 'course-backup',
  reference: '',
};

interface VerdictProps {
  answer: StudyAnswer | undefined;
  house: HouseRecord;
  prices: Prices;
}

/** One plain sentence, live while levers move; each number opens how it was computed. */
export const Verdict = memo(function Verdict({ answer, house, prices }: VerdictProps) {
  const parts = answer ? verdictParts(answer, house, prices) : [];
  const spoken = useSettled(verdictText(parts), 700);
  return (
    <>
      <h1
        data-testid="verdict"
        className="min-h-[calc(5*1.28em)] max-w-[31em] font-display text-verdict font-verdict text-pretty sm:min-h-[calc(2*43/34*1em)]"
      >
        {answer
          ? parts.map((part, place) =>
              typeof part === 'string' ? (
                part
              ) : (
                <HowComputed
                  key={place}
                  className={COURSES[part.number]}
                  explain={() => explain(part.number, answer, house, prices)}
                >
                  {part.text}
                </HowComputed>
              ),
            )
          : 'The first year is being worked, hour by hour.'}
      </h1>
      <p className="sr-only" aria-live="polite">
        {spoken}
      </p>
    </>
  );
});
