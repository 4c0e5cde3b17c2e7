import type { EnergyRow } from '@/lib/simulation/results';
import { formatFixed, formatSignificant } from '@/lib/units/display';

const figure = (kwh: number) => (kwh < 100 ? formatFixed(kwh) : formatSignificant(kwh, 3));

/** The sun's part of a month's need, under the mosaic: "291 of 299". */
export function MonthFigure({ month }: { month: EnergyRow }) {
  const sun = month.solarHeatingKwh + month.solarTapKwh;
  const need = sun + month.backupHeatingKwh + month.backupTapKwh + month.unmetKwh;
  return (
    <>
      <strong className="block text-sun-text">{figure(sun)}</strong>
      <span className="whitespace-nowrap text-muted">of {figure(need)}</span>
    </>
  );
}
