import * as Plot from '@observablehq/plot';
import { dayNumber, dayWords } from '@/lib/calibration/day-number';
import { lineBandW, type EnergySignature } from '@/lib/calibration/energy-signature';
import { formatFixed, withUnit } from '@/lib/units/display';
import { W_PER_KW } from '@/lib/units/constants';

/** One bill on the picture. */
export interface HingeNail {
  meanC: number;
  powerW: number;
  fittedW: number | undefined;
  /** heat of the simulated house in the same days [W] */
  modelW: number | undefined;
  /** first day, as 2024-03-01 */
  from: string;
  /** several rows joined over an estimate */
  joined: boolean;
}

const kw = (watts: number) => watts / W_PER_KW;
const MONTH_LETTERS = 3;

/** "Jan 2025" */
function shortMonth(iso: string): string {
  const [, month, year] = dayWords(dayNumber(iso)!).split(' ');
  return `${month!.slice(0, MONTH_LETTERS)} ${year}`;
}

function nailMarks(nails: readonly HingeNail[], named: number): Plot.Markish[] {
  const far = nails
    .filter((nail) => nail.fittedW !== undefined)
    .sort((a, b) => Math.abs(b.powerW - b.fittedW!) - Math.abs(a.powerW - a.fittedW!))
    .slice(0, named);
  return [
    Plot.ruleX(nails, {
      filter: (nail: HingeNail) => nail.fittedW !== undefined,
      x: 'meanC',
      y1: (nail: HingeNail) => kw(nail.fittedW ?? nail.powerW),
      y2: (nail: HingeNail) => kw(nail.powerW),
      stroke: 'var(--color-backup-text)',
    }),
    Plot.dot(nails, {
      filter: (nail: HingeNail) => nail.modelW !== undefined,
      x: 'meanC',
      y: (nail: HingeNail) => kw(nail.modelW ?? 0),
      symbol: 'plus',
      r: 3.5,
      stroke: 'var(--color-muted)',
      strokeWidth: 1.2,
    }),
    Plot.dot(nails, {
      x: 'meanC',
      y: (nail: HingeNail) => kw(nail.powerW),
      symbol: 'square',
      r: 4,
      fill: (nail: HingeNail) => (nail.joined ? 'var(--color-paper)' : 'var(--color-backup-text)'),
      stroke: 'var(--color-backup-text)',
      strokeWidth: 1.5,
    }),
    Plot.text(far, {
      x: 'meanC',
      y: (nail: HingeNail) => kw(nail.powerW),
      text: (nail: HingeNail) => shortMonth(nail.from),
      textAnchor: 'start',
      dx: 8,
      dy: -1,
      fill: 'var(--color-ink)',
      stroke: 'var(--color-paper)',
      strokeWidth: 3,
    }),
  ];
}

function lineMarks(signature: EnergySignature, fromC: number, toC: number): Plot.Markish[] {
  const { base, slope, hinge } = signature;
  const powerW = (outdoorC: number) => base.value + slope.value * Math.max(0, hinge.value - outdoorC);
  const steps = Array.from({ length: 61 }, (_, i) => fromC + ((toC - fromC) * i) / 60);
  const band = [...steps, hinge.value].sort((a, b) => a - b);
  const ends = [fromC, hinge.value, toC].map((outdoorC) => ({ outdoorC, kw: kw(powerW(outdoorC)) }));
  const onSlopeC = fromC + 0.35 * (hinge.value - fromC);
  const label = { fill: 'var(--color-ink)', stroke: 'var(--color-paper)', strokeWidth: 4, fontWeight: 600 };
  return [
    Plot.areaY(band, {
      x: (outdoorC: number) => outdoorC,
      y1: (outdoorC: number) => kw(Math.max(0, powerW(outdoorC) - lineBandW(signature, outdoorC))),
      y2: (outdoorC: number) => kw(powerW(outdoorC) + lineBandW(signature, outdoorC)),
      fill: 'var(--color-band)',
    }),
    Plot.line(ends, { x: 'outdoorC', y: 'kw', stroke: 'var(--color-ink)', strokeWidth: 2 }),
    Plot.dot([ends[1]!], {
      x: 'outdoorC',
      y: 'kw',
      r: 5,
      fill: 'var(--color-paper)',
      stroke: 'var(--color-ink)',
      strokeWidth: 2,
    }),
    Plot.text([{ outdoorC: onSlopeC, kw: kw(powerW(onSlopeC)) }], {
      x: 'outdoorC',
      y: 'kw',
      text: () => `slope ${withUnit(formatFixed(slope.value), 'W/K')}`,
      textAnchor: 'end',
      dx: -14,
      dy: 12,
      ...label,
    }),
    Plot.text([ends[2]!], {
      x: 'outdoorC',
      y: 'kw',
      text: () => `heats below ${withUnit(formatFixed(hinge.value, 1), '°C')}`,
      textAnchor: 'end',
      dy: -44,
      ...label,
    }),
    Plot.text([ends[2]!], {
      x: 'outdoorC',
      y: 'kw',
      text: () => `base ${withUnit(formatFixed(kw(base.value), 2), 'kW')}`,
      textAnchor: 'end',
      dy: 12,
      ...label,
    }),
  ];
}

/**
 * Options of the hinge picture: each bill a nail at its outdoor temperature and mean heat, the line with its hinge and
 * band, a stem from each nail to what the line gives for its days, the farthest nails named by month.
 * @param nails bills
 * @param signature fitted line; undefined where none is read
 * @param width width of the chart [px]
 */
export function hingePlot(
  nails: readonly HingeNail[],
  signature: EnergySignature | undefined,
  width: number,
): Plot.PlotOptions {
  const temperatures = nails.map((nail) => nail.meanC);
  const fromC = Math.floor(Math.min(0, ...temperatures) - 1);
  const toC = Math.ceil(Math.max(18, ...temperatures) + 1);
  const narrow = width < 480;
  return {
    width,
    height: 340,
    marginLeft: 44,
    marginRight: narrow ? 8 : 40,
    marginBottom: 40,
    ariaLabel: 'Mean heat of each bill against the mean outdoor temperature of its days',
    style: {
      background: 'transparent',
      color: 'var(--color-muted)',
      fontFamily: 'var(--font-text)',
      fontSize: '13px',
      overflow: 'visible',
    },
    x: {
      domain: [fromC, toC],
      label: 'mean outdoor temperature, °C',
      labelAnchor: 'center',
      labelArrow: 'none',
      ticks: narrow ? 5 : 8,
      tickFormat: (value: number) => formatFixed(value),
    },
    y: {
      zero: true,
      nice: true,
      label: 'kW of heat',
      labelArrow: 'none',
      ticks: 5,
      tickFormat: (value: number) => formatFixed(value, 1),
    },
    marks: [
      ...(signature ? lineMarks(signature, fromC, toC) : []),
      Plot.ruleY([0], { stroke: 'var(--color-ink)' }),
      ...nailMarks(nails, narrow ? 2 : 5),
    ],
  };
}
