import type { StudyAnswer, StudyOutcome, StudyQuestion } from '@/lib/study/study-question';
import { latestWins } from './latest-wins';
import type { LatestWins } from './latest-wins';

export type AnswerListener = (answer: StudyAnswer) => void;

/** Answers as they come, past React: a picture that listens here follows the finger. */
export interface AnswerFeed {
  /** @returns the way to stop listening */
  listen(listener: AnswerListener): () => void;
}

/** What React hears of a slot. */
export interface Heard {
  answer: StudyAnswer | undefined;
  /** why there is no newer answer, in words; the last good one stays */
  failure: string | undefined;
}

/** React hears at most this often while answers stream in; the listeners hear every frame [ms]. */
const TELL_EVERY_MS = 60;

/** The place of one design: its newest question, its newest answer, and whoever draws it once per frame. */
export class AnswerSlot implements AnswerFeed {
  private asked: StudyQuestion | undefined;
  private heard: Heard = { answer: undefined, failure: undefined };
  private frame = 0;
  private toldAt = 0;
  private telling: ReturnType<typeof setTimeout> | undefined;
  private tell: (heard: Heard) => void = () => undefined;
  private readonly listeners = new Set<AnswerListener>();
  private readonly queue: LatestWins<StudyQuestion>;

  constructor(answer: (question: StudyQuestion) => Promise<StudyOutcome>) {
    this.queue = latestWins(
      answer,
      (outcome) => {
        if (outcome.ok) this.hear({ answer: outcome.answer, failure: undefined });
        else this.hear({ ...this.heard, failure: outcome.message });
      },
      (failure) =>
        this.hear({
          ...this.heard,
          failure: failure instanceof Error ? failure.message : 'The year could not be worked.',
        }),
    );
  }

  /** Asks when the question is another one, or again after a failure. */
  ask(question: StudyQuestion): void {
    if (question === this.asked && this.heard.failure === undefined) return;
    this.asked = question;
    this.queue.ask(question);
  }

  listen = (listener: AnswerListener): (() => void) => {
    this.listeners.add(listener);
    if (this.heard.answer) listener(this.heard.answer);
    return () => void this.listeners.delete(listener);
  };

  attach(tell: (heard: Heard) => void): () => void {
    this.tell = tell;
    return () => {
      this.tell = () => undefined;
    };
  }

  private hear(heard: Heard) {
    this.heard = heard;
    this.frame ||= requestAnimationFrame(() => {
      this.frame = 0;
      const { answer, failure } = this.heard;
      if (answer && failure === undefined) this.listeners.forEach((listener) => listener(answer));
      this.tellSoon();
    });
  }

  private tellSoon() {
    this.telling ??= setTimeout(
      () => {
        this.telling = undefined;
        this.toldAt = performance.now();
        this.tell(this.heard);
      },
      Math.max(0, this.toldAt + TELL_EVERY_MS - performance.now()),
    );
  }
}
