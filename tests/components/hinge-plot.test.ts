// @vitest-environment jsdom
import * as Plot from '@observablehq/plot';
import { describe, expect, it } from 'vitest';
import { hingePlot, type HingeNail } from '@/components/charts/hinge-plot';
import { energySignature } from '@/lib/calibration/energy-signature';

const points = [-6, -2, 3, 8, 12, 16, 18].map((meanC, i) => ({
  meanC,
  powerW: 300 + 180 * Math.max(0, 15 - meanC) + (i === 2 ? 250 : 0),
  days: 30,
  outdoor: [{ days: 30, meanC, scattered: false }],
}));
const signature = energySignature(points);
const nails: HingeNail[] = points.map(({ meanC, powerW }, i) => ({
  meanC,
  powerW,
  fittedW: signature.fittedW[i],
  modelW: undefined,
  from: `2024-0${i + 1}-01`,
  joined: i === 4,
}));

describe('the hinge picture', () => {
  it('labels slope, heating limit and base, and names the farthest nail', () => {
    const words = Plot.plot(hingePlot(nails, signature, 700)).textContent;
    expect(words).toMatch(/slope \d{3}\u00a0W\/K/);
    expect(words).toMatch(/heats below 1\d\.\d\u00a0°C/);
    expect(words).toMatch(/base 0\.\d\d\u00a0kW/);
    expect(words).toContain('Mar 2024');
  });

  it('draws a nail for each bill, hollow where rows are joined, also without a line', () => {
    const picture = Plot.plot(hingePlot(nails, undefined, 360));
    const dots = picture.querySelectorAll('g[aria-label="dot"] path');
    expect(dots).toHaveLength(nails.length);
    expect(picture.querySelectorAll('path[fill="var(--color-paper)"]')).toHaveLength(1);
    expect(picture.textContent).not.toContain('slope');
  });
});
