import type { WeatherRefusal } from '@/lib/weather/weather-result';

interface WeatherRefusedProps {
  refusal: WeatherRefusal;
  onRepair: () => void;
}

/** Why a file is not taken: the rows in question, and the repair if there is one. */
export function WeatherRefused({ refusal, onRepair }: WeatherRefusedProps) {
  const { message, rows = [], repair } = refusal;
  return (
    <section role="alert" className="pt-3 rule-ink">
      <p className="mb-3 max-w-[44rem] text-hot-text">{message}</p>
      {rows.length > 0 && (
        <div
          className="mb-4 max-h-72 max-w-[44rem] overflow-y-auto"
          tabIndex={0}
          role="group"
          aria-label="Rows"
        >
          <table className="w-full">
            <thead>
              <tr>
                <th scope="col" data-number>
                  Row
                </th>
                <th scope="col">What is wrong</th>
              </tr>
            </thead>
            <tbody>
              {rows.map(({ row, problem }) => (
                <tr key={`${row} ${problem}`}>
                  <td data-number>{row}</td>
                  <td>{problem}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
      {repair && (
        <p className="flex flex-wrap items-center gap-3">
          <button type="button" className="framed" onClick={onRepair}>
            Repair it
          </button>
          <span className="text-note text-muted">{repair} The file itself is kept as it came.</span>
        </p>
      )}
    </section>
  );
}
