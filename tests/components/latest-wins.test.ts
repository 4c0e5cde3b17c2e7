import { describe, expect, it } from 'vitest';
import { latestWins } from '@/components/study/latest-wins';

function deferred<T>() {
  let resolve: (value: T) => void = () => undefined;
  let reject: (reason: Error) => void = () => undefined;
  const promise = new Promise<T>((yes, no) => {
    resolve = yes;
    reject = no;
  });
  return { promise, resolve, reject };
}

function setUp() {
  const started: { question: number; answer: ReturnType<typeof deferred<string>> }[] = [];
  const outcomes: string[] = [];
  const failures: unknown[] = [];
  const queue = latestWins<number, string>(
    (question) => {
      const answer = deferred<string>();
      started.push({ question, answer });
      return answer.promise;
    },
    (outcome) => outcomes.push(outcome),
    (failure) => failures.push(failure),
  );
  return { queue, started, outcomes, failures };
}

const settle = () => new Promise((resolve) => setTimeout(resolve));

describe('the newest question wins', () => {
  it('skips stale questions and always answers the last', async () => {
    const { queue, started, outcomes } = setUp();
    [1, 2, 3, 4].forEach((question) => queue.ask(question));
    expect(started.map((run) => run.question)).toEqual([1]);
    started[0]!.answer.resolve('one');
    await settle();
    expect(started.map((run) => run.question)).toEqual([1, 4]);
    started[1]!.answer.resolve('four');
    await settle();
    expect(outcomes).toEqual(['one', 'four']);
    expect(queue.idle).toBe(true);
  });

  it('goes on with the waiting question after a failure', async () => {
    const { queue, started, outcomes, failures } = setUp();
    queue.ask(1);
    queue.ask(2);
    started[0]!.answer.reject(new Error('worker gone'));
    await settle();
    expect(failures).toHaveLength(1);
    started[1]!.answer.resolve('two');
    await settle();
    expect(outcomes).toEqual(['two']);
  });

  it('starts at once when idle again', async () => {
    const { queue, started } = setUp();
    queue.ask(1);
    started[0]!.answer.resolve('one');
    await settle();
    queue.ask(2);
    expect(started.map((run) => run.question)).toEqual([1, 2]);
  });
});
