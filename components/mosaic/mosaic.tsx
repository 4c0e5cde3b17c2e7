'use client';

import { memo, useCallback, useMemo, useState } from 'react';
import type { KeyboardEvent, PointerEvent } from 'react';
import type { AnswerFeed } from '@/components/study/answer-slot';
import { HOURS_PER_DAY } from '@/lib/units/constants';
import { MONTHS, MONTH_FIRST_DAY, monthOrder, moveCursor } from './calendar';
import { CursorMarks } from './cursor-marks';
import { yearColumns } from './layout';
import type { MosaicLayout } from './layout';
import { StonesCanvas } from './stones-canvas';
import { DAYS_SHOWN, WEEKS_SHOWN, columnOfDay, dayOfColumn } from './stones';
import type { ReadingId } from './stones';
import { sunLine } from './sun-lines';
import type { Site } from './sun-lines';

export interface MosaicCursor {
  hour: number;
  /** summary of the stone under the cursor, said aloud when the keyboard moves it */
  spoken: string;
  onMove(hour: number): void;
}

interface MosaicProps {
  feed: AnswerFeed;
  reading: ReadingId;
  firstDay: number;
  site: Site;
  /** height of an hour where the year is laid in days [CSS px] */
  rowPx: number;
  cursor?: MosaicCursor | undefined;
  /** first of the columns that a loupe shows */
  bracketFrom?: number | undefined;
  label: string;
}

const HOUR_TICKS = [0, 6, 12, 18, 24];

/** The year as a floor of stones: a column per day, midnight on top; on a phone a column per week. */
export const Mosaic = memo(function Mosaic(props: MosaicProps) {
  const { feed, reading, firstDay, site, rowPx, cursor, bracketFrom, label } = props;
  const [grid, setGrid] = useState<{ layout: MosaicLayout; pixelRatio: number }>();
  const onLayout = useCallback(
    (layout: MosaicLayout, pixelRatio: number) => setGrid({ layout, pixelRatio }),
    [],
  );
  const rowFor = useCallback(
    (cssWidth: number) => (yearColumns(cssWidth) === WEEKS_SHOWN ? cssWidth / WEEKS_SHOWN : rowPx),
    [rowPx],
  );
  const weeks = grid?.layout.columns === WEEKS_SHOWN;
  const order = monthOrder(firstDay);

  function onPointer(event: PointerEvent<HTMLElement>) {
    if (!cursor || event.buttons === 0) return;
    const box = event.currentTarget.getBoundingClientRect();
    const share = Math.min(0.99999, Math.max(0, (event.clientX - box.left) / box.width));
    const down = Math.min(0.99999, Math.max(0, (event.clientY - box.top) / box.height));
    const day = dayOfColumn(Math.floor(share * DAYS_SHOWN), firstDay);
    cursor.onMove(day * HOURS_PER_DAY + Math.floor(down * HOURS_PER_DAY));
  }

  function onKeyDown(event: KeyboardEvent) {
    const next = cursor && moveCursor(cursor.hour, event.key, firstDay);
    if (next === undefined) return;
    event.preventDefault();
    cursor?.onMove(next);
  }

  return (
    <div className="grid grid-cols-[2rem_minmax(0,1fr)]">
      <MonthNames order={order} firstDay={firstDay} />
      <HourTicks />
      <div
        className="relative touch-pan-y select-none"
        style={{ minHeight: grid ? undefined : rowPx * HOURS_PER_DAY }}
        {...(cursor && {
          role: 'application',
          'aria-roledescription': 'year of hours',
          'aria-label': `${label}. Arrow keys move by hour and day, page keys by month.`,
          tabIndex: 0,
          onKeyDown,
          onPointerDown: onPointer,
          onPointerMove: onPointer,
        })}
      >
        <StonesCanvas
          feed={feed}
          reading={reading}
          firstDay={firstDay}
          columnsFor={yearColumns}
          rowFor={rowFor}
          onLayout={onLayout}
        />
        <SunLines site={site} firstDay={firstDay} />
        {cursor && grid && (
          <CursorMarks
            layout={grid.layout}
            pixelRatio={grid.pixelRatio}
            column={columnOfDay(Math.floor(cursor.hour / HOURS_PER_DAY), firstDay)}
            hour={cursor.hour % HOURS_PER_DAY}
            bracketFrom={bracketFrom}
          />
        )}
        {cursor && (
          <p className="sr-only" aria-live="polite">
            {cursor.spoken}
          </p>
        )}
      </div>
      {weeks && (
        <p className="col-span-2 mt-2 text-note text-muted">
          One stone: the same hour of seven days, laid by the majority; an hour too hot always shows.
        </p>
      )}
    </div>
  );
});

function MonthNames({ order, firstDay }: { order: readonly number[]; firstDay: number }) {
  return (
    <div className="relative col-start-2 h-7 font-display text-h3 italic max-sm:text-body" aria-hidden="true">
      {order.map((month) => (
        <span
          key={month}
          className="absolute bottom-1.5 leading-5"
          style={{ left: `${(columnOfDay(MONTH_FIRST_DAY[month]!, firstDay) / DAYS_SHOWN) * 100}%` }}
        >
          <span className="max-lg:hidden">{MONTHS[month]}</span>
          <span className="lg:hidden">{MONTHS[month]!.slice(0, 3)}</span>
        </span>
      ))}
    </div>
  );
}

function HourTicks() {
  return (
    <div className="relative text-note text-muted" aria-hidden="true">
      {HOUR_TICKS.map((hour) => (
        <span
          key={hour}
          className="absolute right-0 flex items-center gap-1 leading-3"
          style={{
            top: `calc(${(hour / HOURS_PER_DAY) * 100}% - ${hour === 0 ? 0 : hour === 24 ? 11 : 6}px)`,
          }}
        >
          {hour}
          <span className="h-px w-1.5 bg-line" />
        </span>
      ))}
    </div>
  );
}

function SunLines({ site, firstDay }: { site: Site; firstDay: number }) {
  const lines = useMemo(
    () => (['rise', 'set'] as const).map((which) => sunLine(site, which, firstDay).join(' ')),
    [site, firstDay],
  );
  return (
    <svg
      viewBox={`0 0 ${DAYS_SHOWN} ${HOURS_PER_DAY}`}
      preserveAspectRatio="none"
      className="pointer-events-none absolute inset-0 size-full"
      aria-hidden="true"
    >
      {lines.map((points) => (
        <polyline
          key={points}
          points={points}
          fill="none"
          strokeOpacity="0.75"
          className="stroke-ink"
          vectorEffect="non-scaling-stroke"
        />
      ))}
    </svg>
  );
}
