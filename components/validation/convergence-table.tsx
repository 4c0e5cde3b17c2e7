import { Scientific } from '@/components/method/scientific';
import type { ConvergenceYear } from '@/lib/reference/convergence';
import { formatFixed } from '@/lib/units/display';

const PERCENT = 100;
const HEADS = [
  'θ',
  'layers',
  'solar heat, kWh',
  'bought, kWh',
  'difference',
  'sub-steps',
  'residual',
] as const;

/** Years of the same designs with finer steps and other layers. */
export function ConvergenceTable({ years }: { years: readonly ConvergenceYear[] }) {
  const designs = [...new Set(years.map(({ design }) => design))];
  return (
    <div className="overflow-x-auto" role="region" aria-label="Convergence of steps and layers" tabIndex={0}>
      <table className="w-full min-w-[42rem]">
        <thead>
          <tr>
            <th scope="col">Varied</th>
            {HEADS.map((head) => (
              <th key={head} scope="col" data-number>
                {head}
              </th>
            ))}
          </tr>
        </thead>
        {designs.map((design) => (
          <tbody key={design}>
            <tr>
              <th scope="rowgroup" colSpan={HEADS.length + 1} className="pt-3">
                {design}
              </th>
            </tr>
            {years
              .filter((year) => year.design === design)
              .map((year) => (
                <YearRow key={`${year.varied} ${year.theta} ${year.layers}`} year={year} />
              ))}
          </tbody>
        ))}
      </table>
    </div>
  );
}

function YearRow({ year }: { year: ConvergenceYear }) {
  const { varied, theta, layers, solarKwh, boughtKwh, difference, subSteps, residualShare } = year;
  return (
    <tr>
      <th scope="row" className="pl-4 font-normal text-muted">
        {varied === 'step' ? 'step, against the finest' : 'layers, against the design’s own'}
      </th>
      <td data-number>{theta}</td>
      <td data-number>{layers}</td>
      <td data-number>{formatFixed(solarKwh, 1)}</td>
      <td data-number>{formatFixed(boughtKwh, 1)}</td>
      <td data-number>{formatFixed(difference * PERCENT, 3)} %</td>
      <td data-number>{formatFixed(subSteps)}</td>
      <td data-number>
        <Scientific value={residualShare} />
      </td>
    </tr>
  );
}
