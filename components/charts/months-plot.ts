import * as Plot from '@observablehq/plot';
import { MONTHS } from '@/components/mosaic/calendar';
import type { EnergyRow } from '@/lib/simulation/results';
import { formatFixed } from '@/lib/units/display';

const HATCH_ID = 'months-backup-hatch';

interface MonthBar {
  month: string;
  source: 'sun' | 'backup';
  kwh: number;
}

function bars(months: readonly EnergyRow[], order: readonly number[]): MonthBar[] {
  return order.flatMap((index) => {
    const row = months[index]!;
    const month = MONTHS[index]!.slice(0, 3);
    return [
      { month, source: 'sun' as const, kwh: row.solarHeatingKwh + row.solarTapKwh },
      { month, source: 'backup' as const, kwh: row.backupHeatingKwh + row.backupTapKwh },
    ];
  });
}

/** The hatch of backup, as on the large stones. */
function hatchMark(document: Document): SVGElement {
  const holder = document.createElementNS('http://www.w3.org/2000/svg', 'defs');
  holder.innerHTML = `<pattern id="${HATCH_ID}" width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(45)"><rect width="5" height="5" fill="var(--color-backup)"/><line x1="0" x2="0" y2="5" stroke="var(--color-paper)" stroke-width="1.1" stroke-opacity="0.6"/></pattern>`;
  return holder;
}

/**
 * Options of the monthly chart: heat of each month, the sun's part below, the backup's above; a line for the heat
 * that the array collected, used or not.
 * @param months twelve rows, January first
 * @param order months in the order of the picture
 * @param width width of the chart [px]
 */
export function monthsPlot(
  months: readonly EnergyRow[],
  order: readonly number[],
  width: number,
): Plot.PlotOptions {
  const names = order.map((index) => MONTHS[index]!.slice(0, 3));
  const collected = order.map((index) => ({
    month: MONTHS[index]!.slice(0, 3),
    kwh: months[index]!.collectedKwh,
  }));
  return {
    width,
    height: 240,
    marginLeft: 48,
    marginRight: 0,
    ariaLabel: 'Heat of each month in kilowatt hours: sun, backup and what the array collected',
    style: {
      background: 'transparent',
      color: 'var(--color-muted)',
      fontFamily: 'var(--font-text)',
      fontSize: '13px',
      overflow: 'visible',
    },
    x: { domain: names, label: null, tickSize: 0, padding: 0.25 },
    y: {
      label: 'kWh',
      grid: false,
      ticks: 4,
      tickFormat: (value: number) => formatFixed(value),
      labelArrow: 'none',
    },
    marks: [
      (_index, _scales, _values, _dimensions, context) => hatchMark(context.document),
      Plot.barY(bars(months, order), {
        x: 'month',
        y: 'kwh',
        fill: (bar: MonthBar) => (bar.source === 'sun' ? 'var(--color-sun)' : `url(#${HATCH_ID})`),
        order: ['sun', 'backup'],
        z: 'source',
      }),
      Plot.tickY(collected, { x: 'month', y: 'kwh', stroke: 'var(--color-ink)', strokeWidth: 2 }),
      Plot.ruleY([0], { stroke: 'var(--color-ink)' }),
    ],
  };
}
