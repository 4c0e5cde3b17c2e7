import { buildingRows } from './building-rows';
import { calibrationRows } from './calibration-rows';
import { collectorRows } from './collector-rows';
import { emitterRows } from './emitter-rows';
import { fluidRows } from './fluid-rows';
import { houseRows } from './house-rows';
import { hydraulicsRows } from './hydraulics-rows';
import { moneyRows } from './money-rows';
import type { ReferenceRow } from './reference-row';
import { storeAndWaterRows } from './store-and-water-rows';
import { sunGeometryRows } from './sun-geometry-rows';
import { sunRows } from './sun-rows';
import { systemRows } from './system-rows';

/** Every check against an outside value: run by the tests, by the method pages and in the visitor's browser. */
export const referenceRows: readonly ReferenceRow[] = [
  ...collectorRows,
  ...emitterRows,
  ...storeAndWaterRows,
  ...fluidRows,
  ...hydraulicsRows,
  ...buildingRows,
  ...houseRows,
  ...moneyRows,
  ...calibrationRows,
  ...sunRows,
  ...sunGeometryRows,
  ...systemRows,
];

/** Tier C rows repeat the cited equation with other means: they guard against changes, they are no outside evidence. */
export function isRegression(row: Pick<ReferenceRow, 'tier'>): boolean {
  return row.tier === 'C';
}
