'use client';

import { useEffect, useRef, useState } from 'react';
import { CheckTable } from '@/components/method/check-table';
import type { Validation, ValidationStep } from '@/lib/reference/validation';
import { BalanceTable } from './balance-table';
import { ConvergenceTable } from './convergence-table';

type Run =
  | { kind: 'built' }
  | { kind: 'running'; done: number; total: number }
  | { kind: 'done'; seconds: number }
  | { kind: 'cancelled'; done: number; total: number }
  | { kind: 'failed' };

const NOTHING: Validation = { rows: [], years: [], balances: [] };

/** The checks as the server found them when it was built; on request the visitor's browser runs them all again. */
export function ValidationReport({ built }: { built: Validation }) {
  const { shown, run, start, cancel } = useValidation(built);
  const regression = shown.rows.filter(({ tier }) => tier === 'C');
  const outside = shown.rows.filter(({ tier }) => tier !== 'C');
  return (
    <>
      <div className="mt-6 flex flex-wrap items-center gap-x-6 gap-y-2">
        {run.kind === 'running' ? (
          <button type="button" className="framed" onClick={cancel}>
            Cancel
          </button>
        ) : (
          <button type="button" className="framed filled" onClick={start}>
            Run the checks here
          </button>
        )}
        {run.kind === 'running' && (
          <progress
            value={run.done}
            max={run.total}
            aria-label="Checks run"
            className="h-3 w-40 accent-ink"
          />
        )}
        <p role="status">{words(run)}</p>
      </div>
      <Counts rows={shown.rows} />
      <section aria-labelledby="outside-heading" className="mt-7">
        <h2 id="outside-heading">Against published values</h2>
        <p className="mb-2 max-w-[44rem]">
          Each row calls the product’s own function. “Read” means that the published number was seen, “from
          memory” that it was written down from memory and waits to be seen again.
        </p>
        <CheckTable label="Checks against published values" rows={outside} />
      </section>
      <section aria-labelledby="years-heading" className="mt-10">
        <h2 id="years-heading">Steps and layers</h2>
        <p className="mb-2 max-w-[44rem]">
          The demonstration’s designs with finer steps (θ is the share of a layer’s flush that one sub-step
          may take) and with other numbers of layers. Steps are an error and must vanish; layers are a choice
          of the model.
        </p>
        <ConvergenceTable years={shown.years} />
      </section>
      <section aria-labelledby="balance-heading" className="mt-10">
        <h2 id="balance-heading">Energy balance of the demonstration</h2>
        <p className="mb-2 max-w-[44rem]">
          What goes in comes out or is stored; the residual is what is left.
        </p>
        <BalanceTable balances={shown.balances} />
      </section>
      <section aria-labelledby="regression-heading" className="mt-10">
        <h2 id="regression-heading">Regression</h2>
        <p className="mb-2 max-w-[44rem]">
          Computed from the cited equation by other means. They guard against changes and are not counted as
          evidence from outside.
        </p>
        <CheckTable label="Regression checks" rows={regression} />
      </section>
    </>
  );
}

function Counts({ rows }: { rows: Validation['rows'] }) {
  const count = (tiers: string) => {
    const of = rows.filter(({ tier }) => tiers.includes(tier));
    return `${of.filter(({ within }) => within).length} of ${of.length}`;
  };
  return (
    <p data-testid="validation-counts" className="mt-4 font-display text-h2">
      {count('AB')} published checks lie within their tolerance; regression {count('C')}.
    </p>
  );
}

function words(run: Run): string {
  switch (run.kind) {
    case 'built':
      return 'As the server found them when it was built.';
    case 'running':
      return `${run.done} of ${run.total} run in this browser.`;
    case 'done':
      return `All run in this browser, in ${run.seconds.toFixed(1)} seconds.`;
    case 'cancelled':
      return `Cancelled after ${run.done} of ${run.total}; what had come is shown.`;
    case 'failed':
      return 'This browser could not run them. Reload the page, then try again.';
  }
}

/** Ends a worker; one that is ended while it loads would still report that as its failure. */
function dismiss(worker: Worker | undefined): void {
  if (!worker) return;
  worker.onmessage = null;
  worker.onerror = null;
  worker.terminate();
}

function useValidation(built: Validation) {
  const [shown, setShown] = useState(built);
  const [run, setRun] = useState<Run>({ kind: 'built' });
  const worker = useRef<Worker>(undefined);
  useEffect(() => () => dismiss(worker.current), []);

  function start() {
    const began = performance.now();
    const started = new Worker(new URL('../../workers/validation.worker.ts', import.meta.url), {
      type: 'module',
    });
    worker.current = started;
    setShown(NOTHING);
    setRun({ kind: 'running', done: 0, total: 0 });
    started.onmessage = ({ data }: MessageEvent<ValidationStep>) => {
      const { done, total, ...came } = data;
      setShown((before) => ({
        rows: [...before.rows, ...came.rows],
        years: [...before.years, ...came.years],
        balances: [...before.balances, ...came.balances],
      }));
      if (done < total) return setRun({ kind: 'running', done, total });
      dismiss(started);
      setRun({ kind: 'done', seconds: (performance.now() - began) / 1000 });
    };
    started.onerror = () => {
      dismiss(started);
      setShown(built);
      setRun({ kind: 'failed' });
    };
  }

  function cancel() {
    dismiss(worker.current);
    setRun((now) => (now.kind === 'running' ? { ...now, kind: 'cancelled' } : now));
  }

  return { shown, run, start, cancel };
}
