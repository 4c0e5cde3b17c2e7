import 'server-only';
import { pathToFileURL } from 'node:url';
import { Worker } from 'node:worker_threads';
import type { Answer, Refusal } from '@/lib/schemas/answer';
import type { Design, House, Numerics } from '@/lib/simulation/design';
import type { YearResult } from '@/lib/simulation/results';
import type { YearOutcome } from '@/lib/simulation/simulate';
import type { WeatherYear } from '@/lib/weather/weather-year';
import { env } from './env';
import { oncePerProcess } from './once-per-process';

export interface RunInput {
  weather: WeatherYear;
  house: House;
  design: Design;
  numerics: Numerics;
}

export interface RunPoolOptions {
  /** worker script, relative to the folder of the application */
  script: string;
  threads: number;
  /** years that may wait for a thread; one more is refused */
  queueLength: number;
  /** longest time for one year [ms] */
  budgetMs: number;
}

export interface RunPool {
  run(input: RunInput): Promise<Answer<{ result: YearResult }>>;
  close(): Promise<void>;
}

interface Job {
  input: RunInput;
  settle: (answer: Answer<{ result: YearResult }>) => void;
}

/** Loads TypeScript, then the script. */
const BOOT = 'workers/start-thread.mjs';

const refuse = (code: Refusal['code'], message: string): Refusal => ({ ok: false, code, message });
const BUSY = refuse('busy', 'The server is working other years just now. Try again in a few seconds.');
const TOO_SLOW = refuse(
  'too slow',
  'The server gave this year up: it took longer than one may. A very small store with a very large flow does that; try a larger store, fewer layers or less flow.',
);
const STOPPED = refuse('engine', 'The server’s run stopped unexpectedly. What you saved is safe; try again.');

/**
 * Threads that work simulated years beside the server, so that no design can stop it for others: a thread
 * over its time is ended and replaced, and the line of waiting years is bounded.
 */
export function createRunPool({ script, threads, queueLength, budgetMs }: RunPoolOptions): RunPool {
  const idle: Worker[] = [];
  const all = new Set<Worker>();
  const waiting: Job[] = [];

  function start(): Worker {
    // Paths are put together at run time: the bundler must leave the scripts to the thread's own loader.
    const inApplication = (file: string) => pathToFileURL(`${process.cwd()}/${file}`);
    const worker = new Worker(inApplication(BOOT), {
      execArgv: [],
      workerData: { script: inApplication(script).href },
    });
    // A thread that fails while idle only leaves the pool.
    worker.on('error', () => undefined);
    worker.on('exit', () => forget(worker));
    all.add(worker);
    return worker;
  }

  function forget(worker: Worker): void {
    all.delete(worker);
    const place = idle.indexOf(worker);
    if (place >= 0) idle.splice(place, 1);
  }

  function next(): void {
    if (waiting.length === 0) return;
    const worker = idle.pop() ?? (all.size < threads ? start() : undefined);
    const job = worker && waiting.shift();
    if (!worker || !job) return;
    void work(worker, job.input, budgetMs).then((answer) => {
      if (answer === TOO_SLOW || answer === STOPPED) {
        forget(worker);
        void worker.terminate();
      } else {
        worker.unref();
        idle.push(worker);
      }
      job.settle(answer);
      next();
    });
  }

  return {
    run: (input) =>
      new Promise((settle) => {
        const free = idle.length > 0 || all.size < threads;
        if (!free && waiting.length >= queueLength) return settle(BUSY);
        waiting.push({ input, settle });
        next();
      }),
    close: async () => {
      for (const job of waiting.splice(0)) job.settle(STOPPED);
      await Promise.all([...all].map((worker) => worker.terminate()));
    },
  };
}

/** One year on one thread. The thread says that it has begun, so that loading the engine is not counted. */
function work(worker: Worker, input: RunInput, budgetMs: number): Promise<Answer<{ result: YearResult }>> {
  return new Promise((resolve) => {
    let timer: NodeJS.Timeout | undefined;
    const finish = (answer: Answer<{ result: YearResult }>) => {
      clearTimeout(timer);
      worker.off('message', hear);
      worker.off('error', fail);
      worker.off('exit', fail);
      resolve(answer);
    };
    const fail = () => finish(STOPPED);
    const hear = (message: 'begun' | YearOutcome) => {
      if (message === 'begun') timer = setTimeout(() => finish(TOO_SLOW), budgetMs);
      else finish(message.ok ? message : refuse('engine', message.message));
    };
    worker.on('message', hear);
    worker.on('error', fail);
    worker.on('exit', fail);
    worker.ref();
    worker.postMessage(input);
  });
}

/** The server's own pool. */
export function runPool(): RunPool {
  return oncePerProcess('run pool', () =>
    createRunPool({
      script: 'workers/run.worker.ts',
      threads: 2,
      queueLength: 16,
      budgetMs: env().RUN_BUDGET_MS,
    }),
  );
}
