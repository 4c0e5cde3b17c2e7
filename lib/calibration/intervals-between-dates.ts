import type { BillInterval, BillIntervals, BillRow, RowAnswer } from './bill-row';
import { rowWords } from './bill-row';
import { dayNumber, dayWords } from './day-number';

interface DatedRow {
  row: number;
  from: number;
  to: number;
  quantity: number;
  estimated: boolean;
}

const leftOut = (row: number, text: string): RowAnswer => ({ row, kind: 'left out', text });
const daysText = (days: number) => (days === 1 ? 'one day' : `${days} days`);

function dated(rows: readonly BillRow[], answers: RowAnswer[]): DatedRow[] {
  return rows.flatMap(({ from, to, quantity, estimated }, row) => {
    const first = dayNumber(from);
    const last = dayNumber(to);
    if (first === undefined || last === undefined) {
      const which = first === undefined ? 'first' : 'last';
      answers.push(
        leftOut(row, `The ${which} day is missing or no day of the calendar. Left out until it is typed.`),
      );
      return [];
    }
    if (last <= first) {
      const words =
        last < first
          ? 'It ends before it begins: are the dates swapped?'
          : 'It begins and ends on the same day.';
      answers.push(leftOut(row, `${words} Left out.`));
      return [];
    }
    return [{ row, from: first, to: last, quantity, estimated }];
  });
}

/** Bills that count both their first and their last day share no day: 31 March and 1 April touch. */
const touches = (before: DatedRow, after: DatedRow) =>
  after.from === before.to || after.from === before.to + 1;
const overlap = (a: DatedRow, b: DatedRow) => a.from < b.to && b.from < a.to;
const same = (a: DatedRow, b: DatedRow) => a.from === b.from && a.to === b.to && a.quantity === b.quantity;

function overlapWords(row: DatedRow, others: readonly DatedRow[]): string {
  const twin = others.find((other) => same(row, other));
  if (twin) return `The same as ${rowWords([twin.row])}. Left out.`;
  const other = others[0]!;
  const days = Math.min(row.to, other.to) - Math.max(row.from, other.from);
  const shared =
    others.length > 1 ? rowWords(others.map((o) => o.row)) : `${rowWords([other.row])} in ${daysText(days)}`;
  return `It overlaps ${shared}; ${rowWords([other.row])} runs from ${dayWords(other.from)} to ${dayWords(other.to)}. Left out until the dates are mended.`;
}

/** Takes out the row that overlaps most others, the later one of two, until no day is counted twice. */
function withoutOverlaps(rows: DatedRow[], answers: RowAnswer[]): DatedRow[] {
  const kept = [...rows].sort((a, b) => a.from - b.from || a.row - b.row);
  for (;;) {
    let worst = -1;
    let most: DatedRow[] = [];
    kept.forEach((row, i) => {
      const others = kept.filter((other) => other !== row && overlap(row, other));
      if (others.length > 0 && others.length >= most.length) {
        worst = i;
        most = others;
      }
    });
    if (worst < 0) return kept;
    const [row] = kept.splice(worst, 1);
    answers.push(leftOut(row!.row, overlapWords(row!, most)));
  }
}

function joinWords(group: readonly DatedRow[], row: DatedRow): string {
  const others = group.filter((other) => other !== row).map((other) => other.row);
  return `Estimated: joined with ${rowWords(others)} to one interval, ${dayWords(group[0]!.from)} to ${dayWords(group.at(-1)!.to)}.`;
}

function close(group: readonly DatedRow[], intervals: BillInterval[], answers: RowAnswer[]): void {
  const last = group.at(-1)!;
  if (last.estimated) {
    for (const { row } of group)
      answers.push(leftOut(row, 'Estimated, and no real reading follows that would mend it. Left out.'));
    return;
  }
  const quantity = group.reduce((sum, row) => sum + row.quantity, 0);
  if (quantity < 0) {
    for (const { row } of group)
      answers.push(
        leftOut(
          row,
          'Negative use. A credit corrects an estimate before it: mark that row as estimated. Left out.',
        ),
      );
    return;
  }
  for (const row of group)
    if (row.estimated) answers.push({ row: row.row, kind: 'joined', text: joinWords(group, row) });
  intervals.push({ from: group[0]!.from, to: last.to, quantity, rows: group.map((row) => row.row) });
}

/**
 * Bills that say what was used between two dates, as intervals between real readings. Estimated rows are joined with
 * the rows after them up to the next real reading; rows that overlap others are left out.
 * @param rows rows as typed, in any order
 */
export function intervalsBetweenDates(rows: readonly BillRow[]): BillIntervals {
  const answers: RowAnswer[] = [];
  const intervals: BillInterval[] = [];
  let group: DatedRow[] = [];
  let before: DatedRow | undefined;
  for (const row of withoutOverlaps(dated(rows, answers), answers)) {
    const joined = before !== undefined && touches(before, row);
    if (before && !joined) {
      if (group.length > 0) close(group, intervals, answers);
      group = [];
      const days = row.from - before.to;
      answers.push({
        row: row.row,
        kind: 'remark',
        text: `Nothing is known of the ${daysText(days)} before it.`,
      });
    }
    group.push(joined && before ? { ...row, from: before.to } : row);
    before = row;
    if (row.estimated) continue;
    close(group, intervals, answers);
    group = [];
  }
  if (group.length > 0) close(group, intervals, answers);
  return { intervals, answers };
}
