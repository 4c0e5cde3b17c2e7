'use client';

import { memo, useCallback, useState } from 'react';
import type { AnswerFeed } from '@/components/study/answer-slot';
import { HOURS_PER_DAY } from '@/lib/units/constants';
import { dayName } from './calendar';
import type { MosaicLayout } from './layout';
import { StonesCanvas } from './stones-canvas';
import { DAYS_SHOWN, LOUPE_DAYS, columnOfDay, dayOfColumn } from './stones';
import type { ReadingId } from './stones';

const STONE_PX = 12;

/** First column of the loupe round a day: the day in the middle, at the ends of the picture aside. */
export function loupeStart(day: number, firstDay: number): number {
  const middle = columnOfDay(day, firstDay) - Math.floor(LOUPE_DAYS / 2);
  return Math.min(DAYS_SHOWN - LOUPE_DAYS, Math.max(0, middle));
}

const loupeColumns = () => LOUPE_DAYS;
const loupeRow = (cssWidth: number) => cssWidth / LOUPE_DAYS;

interface LoupeProps {
  feed: AnswerFeed;
  reading: ReadingId;
  firstDay: number;
  hour: number;
  onMove(hour: number): void;
}

/** The fifteen days round the cursor, with stones large enough for their full cut. A picture: the mosaic has the keys. */
export const Loupe = memo(function Loupe({ feed, reading, firstDay, hour, onMove }: LoupeProps) {
  const [grid, setGrid] = useState<{ layout: MosaicLayout; pixelRatio: number }>();
  const onLayout = useCallback(
    (layout: MosaicLayout, pixelRatio: number) => setGrid({ layout, pixelRatio }),
    [],
  );
  const day = Math.floor(hour / HOURS_PER_DAY);
  const start = loupeStart(day, firstDay);
  const column = columnOfDay(day, firstDay) - start;
  const side = grid && grid.layout.x[1]! / grid.pixelRatio;
  return (
    <div className="w-[212px]">
      <div className="flex gap-1">
        <div
          className="relative shrink-0 cursor-crosshair"
          style={{ width: LOUPE_DAYS * STONE_PX }}
          onPointerDown={(event) => {
            const box = event.currentTarget.getBoundingClientRect();
            const days = Math.floor(((event.clientX - box.left) / box.width) * LOUPE_DAYS);
            const clockHour = Math.floor(((event.clientY - box.top) / box.height) * HOURS_PER_DAY);
            onMove(dayOfColumn(start + days, firstDay) * HOURS_PER_DAY + clockHour);
          }}
        >
          <StonesCanvas
            feed={feed}
            reading={reading}
            firstDay={dayOfColumn(start, firstDay)}
            columnsFor={loupeColumns}
            rowFor={loupeRow}
            onLayout={onLayout}
          />
          {side !== undefined && (
            <span
              aria-hidden="true"
              className="pointer-events-none absolute border-2 border-ink outline-2 outline-paper"
              style={{
                left: column * side - 3,
                top: (hour % HOURS_PER_DAY) * side - 3,
                width: side + 5,
                height: side + 5,
              }}
            />
          )}
        </div>
        <div className="relative w-6 text-note text-muted" aria-hidden="true">
          {[0, 6, 12, 18].map((tick) => (
            <span
              key={tick}
              className="absolute leading-3"
              style={{ top: `${(tick / HOURS_PER_DAY) * 100}%` }}
            >
              {tick}
            </span>
          ))}
        </div>
      </div>
      <p className="mt-1 flex justify-between pr-7 text-note text-muted">
        <span>{dayName(dayOfColumn(start, firstDay))}</span>
        <span>{dayName(dayOfColumn(start + LOUPE_DAYS - 1, firstDay))}</span>
      </p>
    </div>
  );
});
