'use client';

import Link from 'next/link';
import { useFormContext } from 'react-hook-form';
import type { HouseRecord } from '@/lib/schemas/house';
import { formatFixed, withUnit } from '@/lib/units/display';
import { useHeld } from './form-context';
import { houseLoss } from './house-loss';
import { OriginMark } from './origin-mark';

/** Whether the loss is that of the shell as entered or scaled to the fuel bills, and the way back. */
export function CalibrationLine({ billsHref }: { billsHref: string }) {
  const house = useHeld<HouseRecord>();
  const { setValue } = useFormContext();
  const { enteredWPerK, wholeWPerK } = houseLoss(house);
  if (house.calibration.basis === 'as entered')
    return (
      <p className="max-w-[70ch] text-muted">
        The loss is that of the shell and the air as entered. <Link href={billsHref}>Fuel bills</Link> can
        check it.
      </p>
    );
  return (
    <p className="flex max-w-[70ch] flex-wrap items-baseline gap-x-3">
      <OriginMark origin="measured" word="bill" />
      <span>
        Scaled to the <Link href={billsHref}>fuel bills</Link>: × {formatFixed(house.calibration.factor, 2)},{' '}
        {formatFixed(enteredWPerK)} → {withUnit(formatFixed(wholeWPerK), 'W/K')} with air.
      </span>
      <button
        type="button"
        className="word"
        onClick={() => setValue('calibration', { factor: '1', basis: 'as entered' }, { shouldDirty: true })}
      >
        Take the shell as entered again
      </button>
    </p>
  );
}
