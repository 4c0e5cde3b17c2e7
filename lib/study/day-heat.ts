import type { HourColumns } from '@/lib/simulation/results';
import { DAYS_PER_YEAR, HOURS_PER_DAY, WH_PER_KWH } from '@/lib/units/constants';

type HeatColumns = Pick<HourColumns, 'solarHeatingW' | 'solarTapW' | 'backupHeatingW' | 'backupTapW'>;

/** Heat that house and taps were given on each day of a simulated year [kWh]. */
export function dayHeatKwh(columns: HeatColumns): number[] {
  const { solarHeatingW, solarTapW, backupHeatingW, backupTapW } = columns;
  return Array.from({ length: DAYS_PER_YEAR }, (_, day) => {
    let sum = 0;
    for (let hour = day * HOURS_PER_DAY; hour < (day + 1) * HOURS_PER_DAY; hour++)
      sum += solarHeatingW[hour]! + solarTapW[hour]! + backupHeatingW[hour]! + backupTapW[hour]!;
    return sum / WH_PER_KWH;
  });
}
