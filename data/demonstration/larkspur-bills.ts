import { climateYear } from '@/data/climates/climates';
import { dayNumber, dayOfTypicalYear, isoDay } from '@/lib/calibration/day-number';
import { dailyMeans } from '@/lib/calibration/degree-days';
import { billsSchema, type BillsRecord } from '@/lib/schemas/bills';
import { autoregressive, seededRandom } from '@/lib/weather/seeded-random';

/*
 * Invented bills of the demonstration house: made here, measured nowhere. larkspur-house.md says what they show.
 */

const SEED = 26;
const FIRST_DAY = '2024-05-02';
const READINGS = 26;
const DAYS_BETWEEN = 30.4;

/** The house that burnt these pellets: what the line through the bills should find. */
const SLOPE_W_PER_K = 188;
const HEATING_LIMIT_C = 14.8;
const BASE_KWH_PER_DAY = 7.2;
const KWH_PER_KG = 4.8;
const EFFICIENCY = 0.84;
const KWH_PER_W_DAY = 0.024;

/** Months are warmer or colder than the typical one by this much, readings wrong by this share. */
const MONTH_SPREAD_K = 0.8;
const READING_SPREAD = 0.02;

const ESTIMATED = [7, 16];
/** This row begins so many days too early. */
const OVERLAPPING = { row: 19, days: 12 };

function generate(): BillsRecord {
  const dayC = dailyMeans(climateYear('upland-u46')!.dryBulbC);
  const random = seededRandom(SEED);
  const warmerK = autoregressive(random, READINGS, 0.3);
  const reading = autoregressive(random, READINGS, 0);
  const days = Array.from({ length: READINGS + 1 }, (_, i) =>
    Math.round(dayNumber(FIRST_DAY)! + i * DAYS_BETWEEN + (i > 0 ? 4 * (random() - 0.5) : 0)),
  );
  const kg = Array.from({ length: READINGS }, (_, i) => {
    let heatKwh = 0;
    for (let day = days[i]!; day < days[i + 1]!; day++) {
      const outdoorC = dayC[dayOfTypicalYear(day)]! + MONTH_SPREAD_K * warmerK[i]!;
      const belowK = Math.max(0, HEATING_LIMIT_C - outdoorC);
      heatKwh += BASE_KWH_PER_DAY + SLOPE_W_PER_K * belowK * KWH_PER_W_DAY;
    }
    return (heatKwh / EFFICIENCY / KWH_PER_KG) * (1 + READING_SPREAD * reading[i]!);
  });
  for (const row of ESTIMATED) {
    const shift = 0.25 * kg[row]!;
    kg[row]! -= shift;
    kg[row + 1]! += shift;
  }
  const rows = kg.map((quantity, i) => ({
    from: isoDay(days[i]! - (i === OVERLAPPING.row ? OVERLAPPING.days : 0)),
    to: isoDay(days[i + 1]!),
    quantity: Math.round(quantity),
    estimated: ESTIMATED.includes(i),
  }));
  return billsSchema.parse({ rows, kwhPerUnit: KWH_PER_KG, efficiency: EFFICIENCY });
}

let made: BillsRecord | undefined;

/** The 26 readings of the demonstration, the same at every call. */
export function larkspurBills(): BillsRecord {
  made ??= generate();
  return made;
}
