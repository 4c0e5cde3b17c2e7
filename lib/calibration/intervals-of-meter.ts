import type { BillInterval, BillIntervals, BillRow, RowAnswer } from './bill-row';
import { rowWords } from './bill-row';
import { dayNumber, dayWords } from './day-number';

interface Standing {
  row: number;
  day: number;
  standing: number;
  estimated: boolean;
}

/** Use per day after a rollover may be so many times the ordinary use; above that the meter was changed. */
const ROLLOVER_MOST_TIMES = 3;

const leftOut = (row: number, text: string): RowAnswer => ({ row, kind: 'left out', text });

function standings(rows: readonly BillRow[], answers: RowAnswer[]): Standing[] {
  const seen = new Map<number, number>();
  const found: Standing[] = [];
  rows.forEach(({ to, quantity, estimated }, row) => {
    const day = dayNumber(to);
    if (day === undefined)
      return answers.push(
        leftOut(row, 'The day of the reading is missing or no day of the calendar. Left out.'),
      );
    const twin = seen.get(day);
    if (twin !== undefined)
      return answers.push(
        leftOut(row, `The same day as ${rowWords([twin])}: one of them is too many. Left out.`),
      );
    seen.set(day, row);
    return found.push({ row, day, standing: quantity, estimated });
  });
  return found.sort((a, b) => a.day - b.day);
}

function usePerDay(from: Standing, to: Standing): number {
  return (to.standing - from.standing) / (to.day - from.day);
}

/** Median use per day of the steps that go up. */
function ordinaryUse(real: readonly Standing[]): number {
  const steps = real.slice(1).map((standing, i) => usePerDay(real[i]!, standing));
  const up = steps.filter((use) => use >= 0).sort((a, b) => a - b);
  return up[Math.floor(up.length / 2)] ?? 0;
}

/**
 * Standings of a meter as intervals between real readings. Estimated standings are passed over; a meter that has run
 * over its last digit is carried on where that gives an ordinary use, and answered where it does not.
 * @param rows rows as typed, in any order
 * @param digits digits before the decimal point on the meter [-] 3 to 9
 * @returns intervals and what is said to each row
 * @see own definition: carried on up to three times the median use per day
 */
export function intervalsOfMeter(rows: readonly BillRow[], digits: number): BillIntervals {
  const answers: RowAnswer[] = [];
  const intervals: BillInterval[] = [];
  const all = standings(rows, answers);
  const ordinary = ordinaryUse(all.filter((standing) => !standing.estimated));
  let last: Standing | undefined;
  let passed: Standing[] = [];
  for (const standing of all) {
    if (standing.estimated) {
      passed.push(standing);
      continue;
    }
    for (const { row } of passed)
      answers.push(
        last
          ? { row, kind: 'joined', text: `Estimated: passed over. ${joinWords(last, standing)}` }
          : leftOut(row, 'Estimated, and no real reading stands before it. Left out.'),
      );
    if (last) {
      const interval = between(last, standing, passed, digits, ordinary, answers);
      if (interval) intervals.push(interval);
    }
    last = standing;
    passed = [];
  }
  for (const { row } of passed)
    answers.push(leftOut(row, 'Estimated, and no real reading follows that would mend it. Left out.'));
  return { intervals, answers };
}

function joinWords(from: Standing, to: Standing): string {
  return `One interval runs from ${dayWords(from.day)} to ${dayWords(to.day)}.`;
}

function between(
  from: Standing,
  to: Standing,
  passed: readonly Standing[],
  digits: number,
  ordinaryPerDay: number,
  answers: RowAnswer[],
): BillInterval | undefined {
  const rows = [...passed, to].map((standing) => standing.row);
  const quantity = to.standing - from.standing;
  if (quantity >= 0) return { from: from.day, to: to.day, quantity, rows };
  const carried = quantity + 10 ** digits;
  const plausible = carried > 0 && carried / (to.day - from.day) <= ROLLOVER_MOST_TIMES * ordinaryPerDay;
  if (plausible) {
    answers.push({
      row: to.row,
      kind: 'remark',
      text: `The meter ran over its ${digits} digits: ${Math.round(carried)} used since ${rowWords([from.row])}.`,
    });
    return { from: from.day, to: to.day, quantity: carried, rows };
  }
  answers.push(
    leftOut(
      to.row,
      `Negative use since ${rowWords([from.row])}: a new meter, or a slip? The time between them is left out; what follows counts from here.`,
    ),
  );
  return undefined;
}
