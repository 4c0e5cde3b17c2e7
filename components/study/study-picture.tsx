'use client';

import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import type { ReactNode } from 'react';
import { Legend } from '@/components/mosaic/legend';
import { Loupe, loupeStart } from '@/components/mosaic/loupe';
import { Mosaic } from '@/components/mosaic/mosaic';
import { BAND_READINGS, FIRST_OF_JULY } from '@/components/mosaic/stones';
import type { ReadingId } from '@/components/mosaic/stones';
import type { Site } from '@/components/mosaic/sun-lines';
import { Segmented } from '@/components/ui/segmented';
import type { StudyAnswer } from '@/lib/study/study-question';
import { HOURS_PER_DAY } from '@/lib/units/constants';
import type { AnswerFeed } from './answer-slot';
import { HourPanel } from './hour-panel';
import { spokenHour } from './hour-words';
import { MonthFigures } from './month-figures';
import { YearTable } from './year-table';

/** 1 February to 15 March: late winter, when sun, store and backup all have their part. */
const TELLING_DAYS = [31, 74] as const;
const ROW_PX = 9;

const READINGS: readonly { value: ReadingId; label: string }[] = [
  { value: 'carrier', label: 'Who carried the house' },
  ...BAND_READINGS.map(({ id, label }) => ({ value: id, label })),
];

/** Where the cursor stands at first: the hour of late winter in which the array gives most. */
function tellingHour({ result }: StudyAnswer): number {
  const [from, to] = TELLING_DAYS.map((day) => day * HOURS_PER_DAY) as [number, number];
  const outputs = result.columns.arrayW.subarray(from, to);
  const best = outputs.reduce((most, watts, hour) => (watts > outputs[most]! ? hour : most), 12);
  return from + best;
}

interface StudyPictureProps {
  feed: AnswerFeed;
  answer: StudyAnswer | undefined;
  site: Site;
  firstDay: number;
  onFirstDay(firstDay: number): void;
  /** the right-hand part of the lower half */
  levers: ReactNode;
  /** below the hour and the fifteen days */
  months: ReactNode;
}

/** The mosaic over the whole page, and what hangs on its cursor: the hour and the fifteen days round it. */
export function StudyPicture({
  feed,
  answer,
  site,
  firstDay,
  onFirstDay,
  levers,
  months,
}: StudyPictureProps) {
  const [reading, setReading] = useState<ReadingId>('carrier');
  const [chosenHour, setHour] = useState<number>();
  if (chosenHour === undefined && answer) setHour(tellingHour(answer));
  const hour = chosenHour ?? TELLING_DAYS[0] * HOURS_PER_DAY + 12;
  const [spoken, setSpoken] = useState('');
  const [asTable, setAsTable] = useState(false);

  const latest = useRef<StudyAnswer>(undefined);
  useEffect(
    () =>
      feed.listen((heard) => {
        latest.current = heard;
      }),
    [feed],
  );
  const onMove = useCallback((next: number) => {
    setHour(next);
    if (latest.current) setSpoken(spokenHour(latest.current, next));
  }, []);
  const cursor = useMemo(() => ({ hour, spoken, onMove }), [hour, spoken, onMove]);

  return (
    <>
      <div className="mt-3 grid gap-x-7 gap-y-4 lg:grid-cols-[minmax(0,1fr)_204px]">
        <div>
          <div className="mb-2 flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 sm:pl-8">
            <Segmented
              label="Reading of the stones"
              options={READINGS}
              value={reading}
              onChange={(next) => setReading(next)}
            />
            <p className="flex flex-wrap items-baseline gap-x-2 text-note text-muted">
              {firstDay === FIRST_OF_JULY ? 'July to June, winter in the middle.' : 'January to December.'}
              <button
                type="button"
                className="word text-ink"
                onClick={() => onFirstDay(firstDay === FIRST_OF_JULY ? 0 : FIRST_OF_JULY)}
              >
                {firstDay === FIRST_OF_JULY ? 'January to December' : 'July to June'}
              </button>
              <button
                type="button"
                className="word text-ink"
                aria-pressed={asTable}
                onClick={() => setAsTable(!asTable)}
              >
                Table
              </button>
            </p>
          </div>
          <Mosaic
            feed={feed}
            reading={reading}
            firstDay={firstDay}
            site={site}
            rowPx={ROW_PX}
            label="Mosaic of the year, one stone per hour"
            cursor={cursor}
            bracketFrom={loupeStart(Math.floor(hour / HOURS_PER_DAY), firstDay)}
          />
          <MonthFigures result={answer?.result} firstDay={firstDay} />
          {asTable && answer && (
            <div className="mt-4">
              <YearTable result={answer.result} firstDay={firstDay} />
            </div>
          )}
        </div>
        <div className="lg:pt-12">
          <Legend reading={reading} result={answer?.result} />
        </div>
      </div>
      <div className="mt-4 grid gap-x-7 gap-y-7 pt-3 rule-ink sm:grid-cols-[minmax(0,1fr)_212px] lg:grid-cols-[minmax(0,47fr)_212px_minmax(0,36fr)] lg:grid-rows-[auto_1fr]">
        <HourPanel answer={answer} hour={hour} />
        <section aria-labelledby="loupe-heading">
          <h2 id="loupe-heading" className="mb-2">
            Fifteen days
          </h2>
          <Loupe feed={feed} reading={reading} firstDay={firstDay} hour={hour} onMove={onMove} />
        </section>
        <div className="sm:col-span-2 lg:col-span-1 lg:col-start-3 lg:row-span-2 lg:row-start-1">
          {levers}
        </div>
        <div className="sm:col-span-2">{months}</div>
      </div>
    </>
  );
}
