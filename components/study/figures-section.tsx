import type { ReactNode } from 'react';
import { Scientific } from '@/components/method/scientific';
import type { Prices } from '@/lib/schemas/prices';
import type { StudyAnswer } from '@/lib/study/study-question';
import { currencySign, formatFixed, formatShare, formatSignificant, withUnit } from '@/lib/units/display';
import { explainBalance, explainCost, explainFraction } from './explain-figures';
import type { BalanceName, CostName, FractionName } from './explain-figures';
import { HowComputed } from './how-computed-button';

const CENTS = 100;
const kwh = (value: number) => withUnit(formatSignificant(value, 3), 'kWh');

/** Where the heat goes, three answers to "how much of it is solar", and the receipt of a kilowatt hour. */
export function BalanceSection({ answer }: { answer: StudyAnswer }) {
  const { balance, year } = answer.result;
  const sum = (parts: Record<string, number>) =>
    Object.values(parts).reduce((total, part) => total + part, 0);
  const line = (text: string, name: BalanceName, value: number) => {
    const words = kwh(value);
    return [
      text,
      <HowComputed key={name} explain={() => explainBalance(name, answer, words)}>
        {words}
      </HowComputed>,
    ] as const;
  };
  return (
    <section aria-labelledby="balance-heading">
      <h2 id="balance-heading">Where the heat goes</h2>
      <p className="mb-2 font-display text-h3">
        {kwh(sum(balance.inKwh))} go in, {kwh(sum(balance.outKwh))} come out; the books close.
      </p>
      <Rows
        rows={[
          line('sun on the array', 'arraySun', balance.inKwh.arraySun),
          line('lost at the array', 'arrayLoss', balance.outKwh.arrayLoss),
          line('lost in pipes', 'pipeLoss', balance.outKwh.pipeLoss),
          line('lost from the store', 'storeLoss', balance.outKwh.storeLoss),
          line('given to heating and hot water', 'given', year.solarHeatingKwh + year.solarTapKwh),
          line('left over because the store was full', 'unused', year.unusedKwh),
          line('pump, electricity', 'pump', year.pumpKwh),
        ]}
      />
      <p className="mt-2 text-note text-muted">
        Residual of the energy balance:{' '}
        <HowComputed
          explain={() => explainBalance('residual', answer, balance.residualShare.toExponential(1))}
        >
          <Scientific value={balance.residualShare} />
        </HowComputed>{' '}
        of all heat that went in. Stored at the end against the start: {kwh(sum(balance.storedKwh))}.
      </p>
    </section>
  );
}

export function FractionsSection({ answer }: { answer: StudyAnswer }) {
  const { fractions } = answer.result.year;
  const share = (name: FractionName) => (
    <HowComputed explain={() => explainFraction(name, answer)}>{formatShare(fractions[name])}</HowComputed>
  );
  return (
    <section aria-labelledby="fractions-heading">
      <h2 id="fractions-heading">Three solar fractions</h2>
      <p className="mb-2 font-display text-h3">They answer different questions and are not to be mixed.</p>
      <Rows
        rows={[
          [
            <Definition key="solar" term="solar fraction" text="solar heat over solar and backup heat" />,
            share('solar'),
          ],
          [
            <Definition
              key="thermal"
              term="thermal savings"
              text="bought energy saved against the same house without sun and store"
            />,
            share('savedThermal'),
          ],
          [
            <Definition
              key="extended"
              term="extended savings"
              text="the same, less the pump’s power at 0.4"
            />,
            share('savedExtended'),
          ],
        ]}
      />
    </section>
  );
}

export function ReceiptSection({ answer, prices }: { answer: StudyAnswer; prices: Prices }) {
  const { heat, toBuild, backupHeatPerKwh, ownHours, ownHoursAmount } = answer.cost;
  const money = (amount: number) => withUnit(formatSignificant(amount, 3), currencySign(prices.currency));
  const open = (name: CostName, text: string) => (
    <HowComputed explain={() => explainCost(name, answer, prices)}>{text}</HowComputed>
  );
  if (!Number.isFinite(heat.perKwh)) {
    return (
      <section aria-labelledby="receipt-heading">
        <h2 id="receipt-heading">What a kilowatt-hour costs</h2>
        <p className="font-display text-h3">Nothing is carried, so nothing has a price.</p>
      </section>
    );
  }
  return (
    <section aria-labelledby="receipt-heading">
      <h2 id="receipt-heading">What a kilowatt-hour costs</h2>
      <p className="mb-2 font-display text-h3">
        {open('toBuild', money(toBuild))} to build; heat from the backup costs{' '}
        {open('backupHeat', formatFixed(backupHeatPerKwh * CENTS, 1))} cents.
      </p>
      <dl className="pt-1 rule-ink">
        {heat.receipt
          .filter((line) => line.perKwh !== 0)
          .map((line) => (
            <div key={line.label} className="flex items-baseline gap-2 py-px">
              <dt className="flex grow items-baseline gap-2 after:grow after:border-b after:border-dotted after:border-line">
                {line.label}
              </dt>
              <dd className="tabular-nums">{formatFixed(line.perKwh * CENTS, 2)}</dd>
            </div>
          ))}
        <div className="mt-1 flex justify-between border-t-3 border-double border-ink pt-1 font-strong">
          <dt>cents per kWh</dt>
          <dd className="tabular-nums">{open('perKwh', formatFixed(heat.perKwh * CENTS, 2))}</dd>
        </div>
      </dl>
      <p className="mt-2 text-note text-muted">
        {withUnit(String(prices.realRate), '%')} real over {prices.years} years, prices of {prices.priceYear}.
        Each saved bought kilowatt-hour costs {open('perSavedKwh', formatFixed(heat.perSavedKwh * CENTS, 1))}{' '}
        cents.
        {ownHoursAmount === 0 &&
          ownHours > 0 &&
          ` ${formatFixed(ownHours)} hours of your own are not priced.`}
      </p>
    </section>
  );
}

function Definition({ term, text }: { term: string; text: string }) {
  return (
    <>
      {term} <span className="block text-note text-muted">{text}</span>
    </>
  );
}

function Rows({ rows }: { rows: readonly (readonly [ReactNode, ReactNode])[] }) {
  return (
    <dl className="rule-ink">
      {rows.map(([name, value], place) => (
        <div key={place} className="flex justify-between gap-4 py-0.5 rule-hair">
          <dt>{name}</dt>
          <dd className="whitespace-nowrap tabular-nums">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
