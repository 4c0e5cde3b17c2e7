import * as Comlink from 'comlink';
import type { StudyOutcome, StudyQuestion, StudyWorker } from '@/lib/study/study-question';

/** A year that takes longer than this in the browser is given up [ms]. */
const PATIENCE_MS = 20_000;

/** One worker of the page; it dies with its first failure and is then replaced by a new one. */
export interface YearClient {
  /** the first answer comes as it can; the engine is warmed up behind it, before the first lever moves */
  answer(question: StudyQuestion): Promise<StudyOutcome>;
  /** for traces: no columns come back */
  backupKwh(question: StudyQuestion): Promise<number | undefined>;
}

function startClient(onDeath: () => void): YearClient {
  const worker = new Worker(new URL('../../workers/simulate.worker.ts', import.meta.url), { type: 'module' });
  const remote = Comlink.wrap<StudyWorker>(worker);
  let die: (reason: Error) => void = () => undefined;
  const death = new Promise<never>((_, reject) => {
    die = (reason) => {
      worker.terminate();
      onDeath();
      reject(reason);
    };
  });
  death.catch(() => undefined);
  worker.onerror = () => die(new Error('The worker that works the year has stopped.'));
  worker.onmessageerror = () => die(new Error('An answer of the worker could not be read.'));

  async function orDeath<T>(work: Promise<T>): Promise<T> {
    const patience = setTimeout(
      () => die(new Error(`The year was given up after ${PATIENCE_MS / 1000} seconds.`)),
      PATIENCE_MS,
    );
    try {
      return await Promise.race([work, death]);
    } finally {
      clearTimeout(patience);
    }
  }

  let warm = false;
  return {
    async answer(question) {
      const outcome = await orDeath<StudyOutcome>(remote.answer(question));
      if (!warm) void orDeath(remote.warmUp(question)).catch(() => undefined);
      warm = true;
      return outcome;
    },
    backupKwh: (question) => orDeath(remote.backupKwh(question)),
  };
}

let client: YearClient | undefined;

/** The worker of this page, started on first use and kept: it stays warm from one study to the next. */
export function yearClient(): YearClient {
  client ??= startClient(() => {
    client = undefined;
  });
  return client;
}
