/**
 * Asks one question at a time and remembers only the newest of those that wait: while a slider moves, stale ticks are
 * skipped and the last one always gets its answer.
 */
export interface LatestWins<Question> {
  ask(question: Question): void;
  /** nothing asked, nothing waiting */
  readonly idle: boolean;
}

export function latestWins<Question, Outcome>(
  answer: (question: Question) => Promise<Outcome>,
  onOutcome: (outcome: Outcome, question: Question) => void,
  onFailure: (failure: unknown) => void,
): LatestWins<Question> {
  let running = false;
  let waiting: { question: Question } | undefined;

  async function work(first: Question) {
    running = true;
    let next: { question: Question } | undefined = { question: first };
    while (next) {
      const { question } = next;
      try {
        onOutcome(await answer(question), question);
      } catch (failure) {
        onFailure(failure);
      }
      next = waiting;
      waiting = undefined;
    }
    running = false;
  }

  return {
    ask(question) {
      if (running) waiting = { question };
      else void work(question);
    },
    get idle() {
      return !running;
    },
  };
}
