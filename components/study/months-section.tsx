'use client';

import { useCallback, useState } from 'react';
import { PlotFigure } from '@/components/charts/plot-figure';
import { MONTHS, monthOrder } from '@/components/mosaic/calendar';
import { StoneSwatch } from '@/components/mosaic/stone-swatch';
import type { YearResult } from '@/lib/simulation/results';
import { formatSignificant, withUnit } from '@/lib/units/display';
import { explainMonth } from './explain-month';
import { HowComputed } from './how-computed-button';

/** The twelve months: a chart that opens with what to see, and the same as a table. */
export function MonthsSection({ result, firstDay }: { result: YearResult; firstDay: number }) {
  const [asTable, setAsTable] = useState(false);
  const { months } = result;
  const load = useCallback(async () => {
    const { monthsPlot } = await import('@/components/charts/months-plot');
    return (width: number) => monthsPlot(months, monthOrder(firstDay), width);
  }, [months, firstDay]);
  return (
    <section aria-labelledby="months-heading">
      <div className="flex items-baseline justify-between gap-4">
        <h2 id="months-heading">Month by month</h2>
        <button
          type="button"
          className="word text-note"
          aria-pressed={asTable}
          onClick={() => setAsTable(!asTable)}
        >
          Table
        </button>
      </div>
      <p className="mb-2 font-display text-h3">{monthsSentence(result)}</p>
      {asTable ? (
        <MonthsTable result={result} firstDay={firstDay} />
      ) : (
        <PlotFigure load={load} height={240} />
      )}
      {!asTable && (
        <ul className="mt-1 flex flex-wrap gap-x-6 text-note">
          <li className="flex items-center gap-2">
            <StoneSwatch stone={1} /> carried by the sun
          </li>
          <li className="flex items-center gap-2">
            <StoneSwatch stone={5} /> backup
          </li>
          <li className="flex items-center gap-2">
            <span className="h-0.5 w-4 bg-ink" aria-hidden="true" /> collected, used or lost
          </li>
        </ul>
      )}
    </section>
  );
}

function monthsSentence({ months, year }: YearResult): string {
  const sun = months.map((month) => month.solarHeatingKwh + month.solarTapKwh);
  const best = sun.indexOf(Math.max(...sun));
  const most = months.map((month) => month.backupHeatingKwh + month.backupTapKwh);
  const hardest = most.indexOf(Math.max(...most));
  const total = year.solarHeatingKwh + year.solarTapKwh;
  if (!(total > 0)) return 'No month gets heat from the sun.';
  return `${MONTHS[best]} brings the most sun, ${withUnit(formatSignificant(sun[best]!, 3), 'kWh')}; ${MONTHS[hardest]} asks the most of the backup.`;
}

function MonthsTable({ result, firstDay }: { result: YearResult; firstDay: number }) {
  const cell = (value: number) => formatSignificant(Math.abs(value) < 0.5 ? 0 : value, 3);
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Heat of each month">
      <table className="w-full">
        <thead>
          <tr>
            <th scope="col">kWh</th>
            {['to heating', 'hot water', 'from the sun', 'backup', 'collected'].map((name) => (
              <th key={name} scope="col" data-number>
                {name}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {monthOrder(firstDay).map((index) => {
            const month = result.months[index]!;
            return (
              <tr key={index}>
                <th scope="row" className="font-normal">
                  {MONTHS[index]}
                </th>
                <td data-number>{cell(month.heatingKwh)}</td>
                <td data-number>{cell(month.tapKwh)}</td>
                <td data-number>
                  <HowComputed
                    label={`${MONTHS[index]}, from the sun: how it was computed`}
                    explain={() => explainMonth(index, result)}
                  >
                    {cell(month.solarHeatingKwh + month.solarTapKwh)}
                  </HowComputed>
                </td>
                <td data-number>{cell(month.backupHeatingKwh + month.backupTapKwh)}</td>
                <td data-number>{cell(month.collectedKwh)}</td>
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}
