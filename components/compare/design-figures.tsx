import { pricePerKwh } from '@/components/study/verdict-words';
import { currencySign, formatFixed, formatShare, formatSignificant, withUnit } from '@/lib/units/display';
import type { ComparedDesign } from './compared-design';

/** The row of figures beside one design. */
export function DesignFigures({ design, currency }: { design: ComparedDesign; currency: string }) {
  const figures = [
    { name: 'carried by the sun', value: formatShare(design.solarShare) },
    {
      name: 'heat still bought',
      value: withUnit(formatSignificant(design.backupHeatKwh / 1000, 3), 'MWh'),
    },
    { name: 'cost of sun heat', value: pricePerKwh(design.costPerKwh, currency) },
    { name: 'to build', value: withUnit(formatFixed(design.toBuild), currencySign(currency)) },
  ];
  return (
    <dl className="rule-ink">
      {figures.map(({ name, value }) => (
        <div key={name} className="flex justify-between gap-2 py-px rule-hair">
          <dt>{name}</dt>
          <dd className="font-strong whitespace-nowrap">{value}</dd>
        </div>
      ))}
      <div className="flex justify-between gap-2 py-px">
        <dt>hours too hot, empty</dt>
        <dd className={`font-strong whitespace-nowrap ${design.hotHours ? 'text-hot-text' : ''}`}>
          {design.hotHours ? withUnit(formatFixed(design.hotHours), 'h') : 'none'}
        </dd>
      </div>
    </dl>
  );
}
