import { Scientific } from '@/components/method/scientific';
import type { BalanceOfDesign } from '@/lib/reference/convergence';
import type { EnergyBalance } from '@/lib/simulation/results';
import { formatFixed } from '@/lib/units/display';

type Part = 'inKwh' | 'outKwh' | 'storedKwh';

const PARTS: Record<Part, string> = { inKwh: 'in', outKwh: 'out', storedKwh: 'stored' };

/** "windowReloss" → "window reloss" */
const inWords = (name: string) => name.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);

const sum = (terms: Record<string, number>) => Object.values(terms).reduce((total, term) => total + term, 0);

/** Terms of the yearly balance, one column per design. */
export function BalanceTable({ balances }: { balances: readonly BalanceOfDesign[] }) {
  const [first] = balances;
  if (!first) return null;
  return (
    <div className="overflow-x-auto" role="region" aria-label="Terms of the balance, by design" tabIndex={0}>
      <table className="w-full max-w-[60rem] min-w-[36rem]">
        <thead>
          <tr>
            <th scope="col">kWh</th>
            {balances.map(({ design }) => (
              <th key={design} scope="col" data-number>
                {design}
              </th>
            ))}
          </tr>
        </thead>
        {(Object.keys(PARTS) as Part[]).map((part) => (
          <PartRows key={part} part={part} balances={balances.map(({ balance }) => balance)} />
        ))}
        <tbody>
          <tr>
            <th scope="row" className="pt-3">
              residual
            </th>
            {balances.map(({ design, balance }) => (
              <td key={design} data-number className="pt-3">
                <Scientific value={balance.residualKwh} />
              </td>
            ))}
          </tr>
          <tr>
            <th scope="row">of all that goes in</th>
            {balances.map(({ design, balance }) => (
              <td key={design} data-number>
                <Scientific value={balance.residualShare} />
              </td>
            ))}
          </tr>
        </tbody>
      </table>
    </div>
  );
}

function PartRows({ part, balances }: { part: Part; balances: readonly EnergyBalance[] }) {
  const terms = balances.map((balance): Record<string, number> => balance[part]);
  return (
    <tbody>
      {Object.keys(terms[0] ?? {}).map((name) => (
        <tr key={name}>
          <th scope="row" className="font-normal">
            {inWords(name)} <span className="text-muted">{PARTS[part]}</span>
          </th>
          {terms.map((of, place) => (
            <td key={place} data-number>
              {formatFixed(of[name] ?? NaN, 1)}
            </td>
          ))}
        </tr>
      ))}
      <tr>
        <th scope="row">sum {PARTS[part]}</th>
        {terms.map((of, place) => (
          <td key={place} data-number className="font-strong">
            {formatFixed(sum(of), 1)}
          </td>
        ))}
      </tr>
    </tbody>
  );
}
