'use client';

import { useCallback, useEffect, useMemo, useState } from 'react';
import type { StudyQuestion } from '@/lib/study/study-question';
import { AnswerSlot } from './answer-slot';
import type { AnswerFeed, Heard } from './answer-slot';
import { yearClient } from './year-client';

export interface YearState extends Heard {
  feed: AnswerFeed;
  /** asks again after a failure */
  retry(): void;
}

const NOTHING_HEARD: Heard = { answer: undefined, failure: undefined };

/**
 * Works the years of several designs in the page's worker, each again whenever its question is another object.
 * The newest question of a design wins; its last good answer stays while the next is on the way.
 */
export function useYears(questions: readonly StudyQuestion[]): YearState[] {
  const count = questions.length;
  const slots = useMemo(
    () => Array.from({ length: count }, () => new AnswerSlot((question) => yearClient().answer(question))),
    [count],
  );
  const [heard, setHeard] = useState<readonly Heard[]>([]);
  const [attempt, setAttempt] = useState(0);

  useEffect(() => {
    const detach = slots.map((slot, place) =>
      slot.attach((now) =>
        setHeard((all) => slots.map((_, i) => (i === place ? now : (all[i] ?? NOTHING_HEARD)))),
      ),
    );
    return () => detach.forEach((stop) => stop());
  }, [slots]);

  useEffect(() => {
    questions.forEach((question, place) => slots[place]?.ask(question));
  }, [slots, questions, attempt]);

  const retry = useCallback(() => setAttempt((times) => times + 1), []);
  return useMemo(
    () => slots.map((feed, place) => ({ ...(heard[place] ?? NOTHING_HEARD), feed, retry })),
    [slots, heard, retry],
  );
}

/** The year of one design, see `useYears`. */
export function useYear(question: StudyQuestion): YearState {
  const questions = useMemo(() => [question], [question]);
  return useYears(questions)[0]!;
}
