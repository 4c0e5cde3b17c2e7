import { memo } from 'react';
import type { StudyAnswer } from '@/lib/study/study-question';
import { NO_VALUE, formatFixed, withUnit } from '@/lib/units/display';
import { celsius, hourName, hourSentence, power } from './hour-words';

interface Sounding {
  name: string;
  value: string;
  note?: string;
}

function soundings(answer: StudyAnswer, hour: number): Sounding[] {
  const { columns } = answer.result;
  const at = (column: Float32Array) => column[hour]!;
  const pump = at(columns.pumpShare);
  const supply = at(columns.supplyC);
  const flowing = Number.isFinite(supply);
  return [
    { name: 'outside', value: celsius(at(columns.outdoorC)) },
    { name: 'sun on the array’s plane', value: withUnit(formatFixed(at(columns.planeWm2)), 'W/m²') },
    {
      name: 'array into the store',
      value: pump > 0 ? power(at(columns.arrayW)) : 'empty',
      note:
        pump > 0 ? `pump ${formatFixed(pump * 60)} of 60 minutes` : `plate ${celsius(at(columns.arrayC), 0)}`,
    },
    { name: 'store, top', value: celsius(at(columns.storeTopC)) },
    { name: 'store, bottom', value: celsius(at(columns.storeBottomC)) },
    {
      name: 'supply and return',
      value: flowing ? celsius(supply) : 'at rest',
      note: flowing ? `back with ${celsius(at(columns.returnC))}` : 'no heating water flows',
    },
    { name: 'room', value: celsius(at(columns.roomC)) },
    { name: 'floor surface', value: celsius(at(columns.floorSurfaceC)) },
    {
      name: 'backup',
      value: power(at(columns.backupHeatingW) + at(columns.backupTapW)),
    },
  ];
}

/** The hour under the cursor in figures; the drawing of it takes this room later. */
export const HourPanel = memo(function HourPanel({
  answer,
  hour,
}: {
  answer: StudyAnswer | undefined;
  hour: number;
}) {
  return (
    <section aria-labelledby="hour-heading">
      <h2 id="hour-heading">{hourName(hour)}</h2>
      <p className="min-h-[2.9rem] max-w-[34em] font-display text-h3 text-pretty">
        {answer ? hourSentence(answer, hour) : NO_VALUE}
      </p>
      <dl className="mt-4 grid grid-cols-2 gap-x-6 gap-y-6 sm:grid-cols-3">
        {answer &&
          soundings(answer, hour).map((sounding) => (
            <div key={sounding.name} className="flex flex-col pt-1 rule-ink">
              <dt className="order-2">{sounding.name}</dt>
              <dd className="order-1 font-display text-title">{sounding.value}</dd>
              {sounding.note && <dd className="order-3 text-note text-muted">{sounding.note}</dd>}
            </div>
          ))}
      </dl>
    </section>
  );
});
