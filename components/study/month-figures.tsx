import type { EnergyRow } from '@/lib/simulation/results';
import { formatSignificant } from '@/lib/units/display';

/** The sun's part of a month's need, under the mosaic: "291 of 299". */
export function MonthFigure({ month }: { month: EnergyRow }) {
  const sun = month.solarHeatingKwh + month.solarTapKwh;
  const need = sun + month.backupHeatingKwh + month.backupTapKwh + month.unmetKwh;
  return (
    <>
      <strong className="block text-sun-text">{formatSignificant(sun, 3)}</strong>
      <span className="whitespace-nowrap text-muted">of {formatSignificant(need, 3)}</span>
    </>
  );
}
