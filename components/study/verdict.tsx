'use client';

import { memo } from 'react';
import { Popover } from 'radix-ui';
import type { HouseRecord } from '@/lib/schemas/house';
import type { Prices } from '@/lib/schemas/prices';
import type { StudyAnswer } from '@/lib/study/study-question';
import { explain } from './how-computed';
import type { Explanation } from './how-computed';
import { useSettled } from './use-settled';
import { verdictParts, verdictText } from './verdict-words';
import type { VerdictNumber } from './verdict-words';

/** The course of stones on which a number stands, in the colour of its meaning. */
const COURSES: Record<VerdictNumber, string> = {
  area: 'course-ink',
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
                <VerdictButton
                  key={place}
                  text={part.text}
                  course={COURSES[part.number]}
                  explanation={explain(part.number, answer, house, prices)}
                />
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

function VerdictButton(props: { text: string; course: string; explanation: Explanation }) {
  const { text, course, explanation } = props;
  return (
    <Popover.Root>
      <Popover.Trigger className={`${course} whitespace-nowrap hover:bg-band`} title="How it was computed">
        {text}
      </Popover.Trigger>
      <Popover.Portal>
        <Popover.Content
          sideOffset={8}
          collisionPadding={16}
          aria-label={`How it was computed: ${explanation.title}`}
          className="z-10 w-[min(26rem,calc(100vw-2rem))] border border-ink bg-paper p-4 font-text text-body"
        >
          <ExplanationSheet explanation={explanation} />
          <Popover.Close className="mt-3 word">Close</Popover.Close>
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  );
}

function ExplanationSheet({ explanation }: { explanation: Explanation }) {
  const { title, value, equation, inputs, source } = explanation;
  return (
    <>
      <h2 className="flex items-baseline justify-between gap-4">
        {title} <span className="whitespace-nowrap">{value}</span>
      </h2>
      <p className="mt-2 font-display text-h3 italic">= {equation}</p>
      <dl className="mt-3 rule-ink">
        {inputs.map((input) => (
          <div key={input.name} className="flex justify-between gap-4 py-1 rule-hair">
            <dt>{input.name}</dt>
            <dd className="whitespace-nowrap tabular-nums">{input.value}</dd>
          </div>
        ))}
      </dl>
      <p className="mt-3 text-note text-muted">{source}</p>
    </>
  );
}
