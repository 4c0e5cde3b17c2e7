import { afterEach, describe, expect, it } from 'vitest';
import { createRunPool, type RunInput, type RunPool } from '@/lib/server/run-pool';

/** The stand-in thread reads nothing but the name: how long to take. */
const year = (name: string) => ({ house: { name } }) as unknown as RunInput;

describe('run pool', { timeout: 30_000 }, () => {
  let pool: RunPool;
  const open = (threads: number, queueLength: number) => {
    pool = createRunPool({ script: 'tests/fakes/slow.worker.ts', threads, queueLength, budgetMs: 300 });
  };
  afterEach(() => pool.close());

  it('gives up a year that is over its time, and works the next', async () => {
    open(1, 4);
    const [slow, next] = await Promise.all([pool.run(year('forever')), pool.run(year('1'))]);
    expect(slow).toMatchObject({ ok: false, code: 'too slow' });
    expect(next).toMatchObject({ ok: true });
  });

  it('outlives a thread that falls over', async () => {
    open(1, 4);
    expect(await pool.run(year('crash'))).toMatchObject({ ok: false, code: 'engine' });
    expect(await pool.run(year('1'))).toMatchObject({ ok: true });
  });

  it('refuses what does not fit into the line, and works the rest', async () => {
    open(1, 2);
    const answers = await Promise.all(['20', '20', '20', '20', '20'].map((name) => pool.run(year(name))));
    expect(answers.filter((answer) => answer.ok)).toHaveLength(3);
    expect(answers.filter((answer) => !answer.ok && answer.code === 'busy')).toHaveLength(2);
  });

  it('works two years at once on two threads', async () => {
    open(2, 0);
    const answers = await Promise.all([pool.run(year('50')), pool.run(year('50')), pool.run(year('50'))]);
    expect(answers.map((answer) => (answer.ok ? 'done' : answer.code))).toEqual(['done', 'done', 'busy']);
  });
});
