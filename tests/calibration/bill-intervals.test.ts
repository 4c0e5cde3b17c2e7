import { describe, expect, it } from 'vitest';
import type { BillRow } from '@/lib/calibration/bill-row';
import { dayNumber } from '@/lib/calibration/day-number';
import { intervalsBetweenDates } from '@/lib/calibration/intervals-between-dates';
import { intervalsOfMeter } from '@/lib/calibration/intervals-of-meter';

const bill = (from: string, to: string, quantity: number, estimated = false): BillRow => ({
  from,
  to,
  quantity,
  estimated,
});
const standing = (to: string, quantity: number, estimated = false) => bill('', to, quantity, estimated);
const day = (iso: string) => dayNumber(iso)!;

describe('bills between two dates', () => {
  it('count the days, also where bills name first and last day', () => {
    const { intervals, answers } = intervalsBetweenDates([
      bill('2024-01-01', '2024-01-31', 100),
      bill('2024-02-01', '2024-02-29', 90),
      bill('2024-02-29', '2024-04-01', 80),
    ]);
    expect(answers).toEqual([]);
    expect(intervals.map(({ from, to }) => to - from)).toEqual([30, 29, 32]);
  });

  it('join an estimate with the reading that mends it', () => {
    const { intervals, answers } = intervalsBetweenDates([
      bill('2024-01-01', '2024-02-01', 100),
      bill('2024-02-01', '2024-03-01', 300, true),
      bill('2024-03-01', '2024-04-01', -120),
    ]);
    expect(intervals).toHaveLength(2);
    expect(intervals[1]).toEqual({
      from: day('2024-02-01'),
      to: day('2024-04-01'),
      quantity: 180,
      rows: [1, 2],
    });
    expect(answers).toEqual([
      {
        row: 1,
        kind: 'joined',
        text: 'Estimated: joined with row 3 to one interval, 1 February 2024 to 1 April 2024.',
      },
    ]);
  });

  it('leave out the row that overlaps, and say which days', () => {
    const { intervals, answers } = intervalsBetweenDates([
      bill('2024-01-01', '2024-02-01', 100),
      bill('2024-01-20', '2024-03-01', 90),
    ]);
    expect(intervals.map(({ rows }) => rows)).toEqual([[0]]);
    expect(answers).toEqual([
      {
        row: 1,
        kind: 'left out',
        text: 'It overlaps row 1 in 12 days; row 1 runs from 1 January 2024 to 1 February 2024. Left out until the dates are mended.',
      },
    ]);
  });

  it('let one wrong long row go and keep the many that it covers', () => {
    const { intervals } = intervalsBetweenDates([
      bill('2023-01-01', '2024-05-01', 1),
      bill('2024-01-01', '2024-02-01', 100),
      bill('2024-02-01', '2024-03-01', 90),
      bill('2024-03-01', '2024-04-01', 80),
    ]);
    expect(intervals.map(({ rows }) => rows)).toEqual([[1], [2], [3]]);
  });

  it.each([
    ['no day', [bill('', '2024-02-01', 1)], 'The first day is missing or no day of the calendar.'],
    ['no such day', [bill('2024-01-01', '2024-02-30', 1)], 'The last day is missing'],
    ['swapped', [bill('2024-02-01', '2024-01-01', 1)], 'are the dates swapped?'],
    ['one day', [bill('2024-02-01', '2024-02-01', 1)], 'begins and ends on the same day'],
    ['negative', [bill('2024-01-01', '2024-02-01', -5)], 'Negative use.'],
    ['an estimate at the end', [bill('2024-01-01', '2024-02-01', 5, true)], 'no real reading follows'],
  ])('answer %s', (_name, rows, words) => {
    const { intervals, answers } = intervalsBetweenDates(rows);
    expect(intervals).toEqual([]);
    expect(answers[0]).toMatchObject({ row: 0, kind: 'left out' });
    expect(answers[0]!.text).toContain(words);
  });

  it('answer a row given twice and a gap', () => {
    const { answers } = intervalsBetweenDates([
      bill('2024-01-01', '2024-02-01', 100),
      bill('2024-01-01', '2024-02-01', 100),
      bill('2024-02-14', '2024-03-01', 50),
    ]);
    expect(answers).toEqual([
      { row: 1, kind: 'left out', text: 'The same as row 1. Left out.' },
      { row: 2, kind: 'remark', text: 'Nothing is known of the 13 days before it.' },
    ]);
  });
});

describe('standings of a meter', () => {
  it('are subtracted in the order of their days', () => {
    const { intervals } = intervalsOfMeter(
      [standing('2024-03-01', 1190), standing('2024-01-01', 1000), standing('2024-02-01', 1100)],
      6,
    );
    expect(intervals.map(({ quantity }) => quantity)).toEqual([100, 90]);
  });

  it('pass over an estimate', () => {
    const { intervals, answers } = intervalsOfMeter(
      [standing('2024-01-01', 1000), standing('2024-02-01', 1300, true), standing('2024-03-01', 1190)],
      6,
    );
    expect(intervals).toMatchObject([{ quantity: 190, rows: [1, 2] }]);
    expect(answers[0]).toMatchObject({ row: 1, kind: 'joined' });
    expect(answers[0]!.text).toContain('1 January 2024 to 1 March 2024');
  });

  it('carry on over the last digit', () => {
    const { intervals, answers } = intervalsOfMeter(
      [standing('2024-01-01', 99700), standing('2024-02-01', 99900), standing('2024-03-01', 80)],
      5,
    );
    expect(intervals.map(({ quantity }) => quantity)).toEqual([200, 180]);
    expect(answers).toEqual([
      { row: 2, kind: 'remark', text: 'The meter ran over its 5 digits: 180 used since row 2.' },
    ]);
  });

  it('answer negative use that is no rollover, and count from there', () => {
    const { intervals, answers } = intervalsOfMeter(
      [
        standing('2024-01-01', 5000),
        standing('2024-02-01', 5200),
        standing('2024-03-01', 30),
        standing('2024-04-01', 150),
      ],
      6,
    );
    expect(intervals.map(({ quantity }) => quantity)).toEqual([200, 120]);
    expect(answers).toMatchObject([{ row: 2, kind: 'left out' }]);
    expect(answers[0]!.text).toContain('Negative use since row 2: a new meter, or a slip?');
  });

  it('answer two readings of one day', () => {
    const { answers } = intervalsOfMeter([standing('2024-01-01', 5), standing('2024-01-01', 6)], 6);
    expect(answers[0]!.text).toContain('The same day as row 1');
  });
});
