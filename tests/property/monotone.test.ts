import { describe, expect, it, vi } from 'vitest';
import { anyDesign, forDesigns, PATIENCE_MS, RUNS, yearOf, type AnyDesign } from './any-design';

/* More of a good thing is never less: own requirements (model.md section 11), no source. */

vi.setConfig({ testTimeout: PATIENCE_MS });

const AREAS_M2 = [10, 20, 30, 40];
/** An array that hardly ever warms its store works at the threshold of use, where more area helps more than in proportion. */
const WORTH_KWH_PER_M2 = 20;

/**
 * The design at an area, facing the sun, with an ordinary controller. Without pipe and with a well insulated store the
 * first square metre works like the last: with them a small array first has to pay for its pipe and its store, and its
 * heat begins to rise with growing slope, as it should.
 */
function atArea(drawn: AnyDesign, areaM2: number): AnyDesign {
  const { design } = drawn;
  const mountedMonths = Array<boolean>(12).fill(true);
  const array = { ...design.array, areaM2, azimuthDeg: 180, pipeLengthM: 0, mountedMonths };
  const controller = { ...design.controller, startK: 7, stopK: 2, minimumRunS: 0, inhibitC: 130 };
  const pump = { ...design.loop.pump, kind: 'flow' as const };
  const loop = { ...design.loop, layout: 'through the store' as const, pump };
  // in a room as warm as the mains: a colder one is a threshold of its own
  const roomC = drawn.house.hotWater.mainsMeanC;
  const store = { ...design.store, insulationMm: 500, insulationConductivity: 0.02, roomC };
  return { ...drawn, design: { ...design, array, second: null, loop, controller, store } };
}

function solarKwh(drawn: AnyDesign): number | undefined {
  const year = yearOf(drawn)?.year;
  return year && year.solarHeatingKwh + year.solarTapKwh;
}

describe('area of any array', () => {
  /*
   * Tolerance: the store keeps its size, so a larger array turns it over faster and mixes its layers more, and starts
   * come at other moments. Both may cost a little heat beside the gain of the area. The slope may rise by a tenth
   * where the store has to pass a warm mains before it is of use.
   */
  it('more area gives more solar heat, with falling slope', () => {
    forDesigns(RUNS / 10, anyDesign, (drawn) => {
      const heats = AREAS_M2.map((areaM2) => solarKwh(atArea(drawn, areaM2)));
      if (heats.some((heat) => heat === undefined)) return;
      const [first, ...rest] = heats as [number, ...number[]];
      const tolerance = 0.01 * rest.at(-1)! + 2;
      let before = first;
      let slope = first;
      const judgesSlope = first > WORTH_KWH_PER_M2 * AREAS_M2[0]!;
      for (const heat of rest) {
        expect(heat - before, heats.join(', ')).toBeGreaterThan(-tolerance);
        if (judgesSlope) expect(heat - before, heats.join(', ')).toBeLessThan(1.1 * slope + 2 * tolerance);
        slope = heat - before;
        before = heat;
      }
    });
  });
});

describe('insulation of any house', () => {
  it('lower U never raises the load', () => {
    forDesigns(RUNS / 5, anyDesign, (drawn) => {
      const { house } = drawn;
      const load = (share: number) => {
        const shell = house.shell.map((element) => ({ ...element, uWPerM2K: element.uWPerM2K * share }));
        const bare = { ...drawn.design, array: { ...drawn.design.array, areaM2: 0 }, second: null };
        const year = yearOf({ ...drawn, design: bare, house: { ...house, shell } })?.year;
        return year && year.heatingKwh + year.unmetKwh;
      };
      const [before, after] = [load(1), load(0.7)];
      if (before === undefined || after === undefined) return;
      // the band of the thermostat is half a kelvin wide on either side
      expect(after).toBeLessThanOrEqual(before * 1.001 + 1);
    });
  });
});
