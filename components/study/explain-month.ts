import { MONTHS } from '@/components/mosaic/calendar';
import type { YearResult } from '@/lib/simulation/results';
import { formatFixed, formatSignificant, withUnit } from '@/lib/units/display';
import { COLLECTOR_CURVE, YEAR_LOOP, equationLink } from './explanation';
import type { Explanation } from './explanation';

const kwh = (value: number) => withUnit(formatSignificant(Math.abs(value) < 0.5 ? 0 : value, 3), 'kWh');

/** Opens the sun's part of a month's need. */
export function explainMonth(month: number, { months, weatherName, engineVersion }: YearResult): Explanation {
  const row = months[month]!;
  return {
    title: `${MONTHS[month]}, carried by the sun`,
    value: kwh(row.solarHeatingKwh + row.solarTapKwh),
    equation: 'heat from the store to the heating and to hot water, summed over the hours of the month',
    inputs: [
      { name: 'store to the heating', value: kwh(row.solarHeatingKwh) },
      { name: 'store to hot water', value: kwh(row.solarTapKwh) },
      { name: 'backup to the heating', value: kwh(row.backupHeatingKwh) },
      { name: 'backup to hot water', value: kwh(row.backupTapKwh) },
      { name: 'sun on the plane while mounted', value: kwh(row.planeKwh) },
      { name: 'collected', value: kwh(row.collectedKwh) },
      { name: 'lost from the store', value: kwh(row.storeLossKwh) },
      { name: 'mean outdoor temperature', value: withUnit(formatFixed(row.meanOutdoorC, 1), '°C') },
    ],
    source: `Sums over the hours of this run; weather year ${weatherName}, engine ${engineVersion}.`,
    method: [
      YEAR_LOOP,
      COLLECTOR_CURVE,
      equationLink('Sun on a plane', 'plane', 'planeYear'),
      equationLink('Layers of the store', 'store', 'StoreLayers'),
    ],
  };
}
