'use client';

import type { ReactNode } from 'react';
import { monthOrder } from '@/components/mosaic/calendar';
import type { DesignRecord } from '@/lib/schemas/design';
import type { StudyAnswer, StudyQuestion } from '@/lib/study/study-question';
import { formatTyped, withUnit } from '@/lib/units/display';
import { CoverLever } from './cover-lever';
import { LeverRow } from './lever-row';
import { coverChoices, leverOf, withCollector, withMonths } from './levers';
import type { LeverId } from './levers';
import { MonthsLever } from './months-lever';
import { traceRange, useTraces } from './use-traces';
import { COLLECTOR_WORDS } from './verdict-words';

interface LeversPanelProps {
  design: DesignRecord;
  saved: DesignRecord;
  question: StudyQuestion;
  answer: StudyAnswer | undefined;
  firstDay: number;
  changed: boolean;
  onChange(design: DesignRecord): void;
  children: ReactNode;
}

/** Six levers, each with a trace of the heat still bought, all on one vertical scale. */
export function LeversPanel(props: LeversPanelProps) {
  const { design, saved, question, answer, firstDay, changed, onChange, children } = props;
  const traces = useTraces(question, saved, answer !== undefined);
  const year = answer?.result.year;
  const nowKwh = year && year.backupHeatingKwh + year.backupTapKwh;
  const traceOf = (id: keyof typeof traces) =>
    nowKwh === undefined ? undefined : { points: traces[id], range: traceRange(traces, nowKwh), nowKwh };
  const row = (id: LeverId) => {
    const lever = leverOf(id);
    return (
      <LeverRow
        key={id}
        lever={lever}
        value={lever.read(design)}
        saved={lever.read(saved)}
        trace={traceOf(id)}
        onChange={(value) => onChange(lever.write(design, value))}
      />
    );
  };
  return (
    <section aria-labelledby="levers-heading">
      <div className="flex items-baseline justify-between gap-4 border-b border-ink pb-0.5">
        <h2 id="levers-heading">Six levers</h2>
        <p className="text-note text-muted">trace: heat still bought, MWh a year</p>
      </div>
      {design.second && (
        <p className="pt-1 text-note text-muted">
          Area, cover, tilt and months move the first field. The second,{' '}
          {withUnit(formatTyped(design.second.array.areaM2), 'm²')} of{' '}
          {COLLECTOR_WORDS[design.second.collector.cover]}, stays as it is saved.
        </p>
      )}
      {row('area')}
      <CoverLever
        choices={coverChoices(saved)}
        value={design.collector}
        saved={saved.collector}
        trace={traceOf('cover')}
        onChange={(collector) => onChange(withCollector(design, collector))}
      />
      {row('store')}
      {row('supply')}
      {row('tilt')}
      <MonthsLever
        mounted={design.array.mountedMonths}
        saved={saved.array.mountedMonths}
        order={monthOrder(firstDay)}
        onChange={(months) => onChange(withMonths(design, months))}
      />
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2 py-4">
        {children}
        {changed && (
          <button type="button" className="word" onClick={() => onChange(saved)}>
            Back to the saved design
          </button>
        )}
      </div>
    </section>
  );
}
