import { MONTHS, monthOrder } from '@/components/mosaic/calendar';
import { CARRIERS } from '@/lib/simulation/results';
import type { YearResult } from '@/lib/simulation/results';
import { MONTH_START_HOUR } from '@/lib/units/constants';
import { formatFixed } from '@/lib/units/display';

function hoursByMonth({ columns }: YearResult): number[][] {
  return MONTHS.map((_, month) => {
    const hours = Array<number>(CARRIERS.length + 1).fill(0);
    for (let hour = MONTH_START_HOUR[month]!; hour < MONTH_START_HOUR[month + 1]!; hour++) {
      const carrier = columns.carrier[hour]!;
      hours[carrier] = hours[carrier]! + 1;
      if (columns.overLimit[hour]) hours[CARRIERS.length] = hours[CARRIERS.length]! + 1;
    }
    return hours;
  });
}

/** The stones as a table: hours of each carrier in each month. */
export function YearTable({ result, firstDay }: { result: YearResult; firstDay: number }) {
  const hours = hoursByMonth(result);
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Hours of each carrier by month">
      <table className="w-full">
        <caption className="pb-2 text-left">Hours of each month by who carried the house.</caption>
        <thead>
          <tr>
            <th scope="col">Month</th>
            {CARRIERS.map((carrier) => (
              <th key={carrier} scope="col" data-number>
                {carrier}
              </th>
            ))}
            <th scope="col" data-number>
              empty, too hot
            </th>
          </tr>
        </thead>
        <tbody>
          {monthOrder(firstDay).map((month) => (
            <tr key={month}>
              <th scope="row" className="font-normal">
                {MONTHS[month]}
              </th>
              {hours[month]!.map((count, carrier) => (
                <td key={carrier} data-number>
                  {formatFixed(count)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
