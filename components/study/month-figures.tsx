import { MONTHS, MONTH_FIRST_DAY, monthOrder } from '@/components/mosaic/calendar';
import { DAYS_SHOWN, columnOfDay } from '@/components/mosaic/stones';
import type { YearResult } from '@/lib/simulation/results';
import { formatFixed, formatSignificant } from '@/lib/units/display';
import { explainMonth } from './explain-month';
import { HowComputed } from './how-computed-button';

const figure = (kwh: number) => (kwh < 100 ? formatFixed(kwh) : formatSignificant(kwh, 3));

/** The sun's part of each month's need, under the mosaic and in step with it: "291 of 299". */
export function MonthFigures({ result, firstDay }: { result: YearResult | undefined; firstDay: number }) {
  return (
    <div className="mt-3 grid min-h-10 grid-cols-[2rem_minmax(0,1fr)] text-note leading-4.5 max-md:hidden">
      <span className="pr-1 text-right text-muted">kWh</span>
      <ol className="relative" aria-label="Sun’s part of each month’s need">
        {monthOrder(firstDay).map((month) => (
          <li
            key={month}
            className="absolute border-l border-hair pl-1"
            style={{ left: `${(columnOfDay(MONTH_FIRST_DAY[month]!, firstDay) / DAYS_SHOWN) * 100}%` }}
          >
            <span className="sr-only">{MONTHS[month]}: </span>
            {result && <MonthFigure month={month} result={result} />}
          </li>
        ))}
      </ol>
    </div>
  );
}

function MonthFigure({ month, result }: { month: number; result: YearResult }) {
  const row = result.months[month]!;
  const sun = row.solarHeatingKwh + row.solarTapKwh;
  const need = sun + row.backupHeatingKwh + row.backupTapKwh + row.unmetKwh;
  return (
    <>
      <HowComputed
        className="block min-h-6 font-strong text-sun-text"
        label={`${figure(sun)} kWh in ${MONTHS[month]}: how it was computed`}
        explain={() => explainMonth(month, result)}
      >
        {figure(sun)}
      </HowComputed>
      <span className="whitespace-nowrap text-muted">of {figure(need)}</span>
    </>
  );
}
