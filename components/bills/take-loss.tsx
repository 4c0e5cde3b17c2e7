'use client';

import { useState, useTransition } from 'react';
import { useFormContext, useFormState } from 'react-hook-form';
import { OriginMark } from '@/components/forms/origin-mark';
import type { Answer } from '@/lib/schemas/answer';
import type { BillsStudy } from '@/lib/study/house-by-bills';
import { formatFixed, withUnit } from '@/lib/units/display';
import { useBillsSurroundings } from './bills-context';

/** The ratio of slopes moves a little with the loss itself: nearer than this is taken for the same. */
const SETTLED_SHARE = 0.02;
const NO_ANSWER = 'The server did not answer. Nothing was changed: try again in a moment.';

/** Scales the house to its bills, or lets it go again; the server works the factor out of what is saved. */
export function TakeLoss({ study, enteredWPerK }: { study: BillsStudy; enteredWPerK: number }) {
  const { house, houseVersion, scale, release } = useBillsSurroundings();
  const { control } = useFormContext();
  const { dirtyFields } = useFormState({ control });
  const [message, setMessage] = useState<string>();
  const [pending, start] = useTransition();
  const unsaved = Object.keys(dirtyFields).length > 0;
  const { basis, factor } = house.calibration;
  const byBills = study.model?.lossWPerK.value ?? NaN;
  const settled = basis === 'bills' && Math.abs(byBills / (factor * enteredWPerK) - 1) < SETTLED_SHARE;

  function run(action: (version: number) => Promise<Answer<object>>) {
    start(async () => {
      const answer = await action(houseVersion).catch(() => undefined);
      setMessage(answer?.ok ? undefined : (answer?.message ?? NO_ANSWER));
    });
  }

  return (
    <div className="space-y-2">
      {basis === 'bills' && (
        <p className="flex flex-wrap items-baseline gap-x-3">
          <OriginMark origin="measured" word="bill" />
          <span>
            The house is scaled to its bills: × {formatFixed(factor, 2)}, {formatFixed(enteredWPerK)} →{' '}
            {withUnit(formatFixed(factor * enteredWPerK), 'W/K')}. Every year is worked with it.
          </span>
        </p>
      )}
      <p className="flex flex-wrap items-baseline gap-x-4 gap-y-2">
        {!settled && (
          <button type="button" className="framed" disabled={pending || unsaved} onClick={() => run(scale)}>
            {pending ? 'Taking it …' : `Take ${withUnit(formatFixed(byBills), 'W/K')} from the bills`}
          </button>
        )}
        {basis === 'bills' && (
          <button type="button" className="word" disabled={pending} onClick={() => run(release)}>
            Take the shell as entered again
          </button>
        )}
        {unsaved && !settled && <span className="text-note text-muted">Save the readings first.</span>}
      </p>
      <p role="alert" className="text-hot-text empty:hidden">
        {message}
      </p>
    </div>
  );
}
