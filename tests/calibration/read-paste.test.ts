import { describe, expect, it } from 'vitest';
import { readDate } from '@/lib/calibration/read-date';
import { readPaste } from '@/lib/calibration/read-paste';

describe('a date', () => {
  it.each([
    ['2024-03-01', '2024-03-01'],
    ['2024/3/1', '2024-03-01'],
    ['1.3.2024', '2024-03-01'],
    ['01.03.24', '2024-03-01'],
    ['13/3/2024', '2024-03-13'],
    ['3/13/2024', '2024-03-13'],
    ['5/5/2024', '2024-05-05'],
    ['1 March 2024', '2024-03-01'],
    ['1-Mar-24', '2024-03-01'],
    ['March 1, 2024', '2024-03-01'],
    ['2024-03-01 00:00:00', '2024-03-01'],
  ])('%s is one day', (text, iso) => {
    expect(readDate(text)).toMatchObject({ kind: 'day', iso });
  });

  it('with strokes is two days until somebody says which', () => {
    expect(readDate('3/4/2024')).toEqual({
      kind: 'either',
      dayFirst: '2024-04-03',
      monthFirst: '2024-03-04',
    });
    expect(readDate('3/4/2024', 'month first')).toMatchObject({ kind: 'day', iso: '2024-03-04' });
  });

  it.each(['', '30.2.2024', '2024', '12.5', 'last week', '31/31/2024'])('is not read from “%s”', (text) => {
    expect(readDate(text)).toEqual({ kind: 'none' });
  });
});

describe('a paste', () => {
  it('of a spreadsheet with a head and decimal commas', () => {
    const text = 'from\tto\tkg\test.\n1.1.2024\t1.2.2024\t612,5\t\n1.2.2024\t1.3.2024\t540\te\n';
    expect(readPaste(text, false)).toEqual({
      kind: 'rows',
      rows: [
        { from: '2024-01-01', to: '2024-02-01', quantity: 612.5, estimated: false },
        { from: '2024-02-01', to: '2024-03-01', quantity: 540, estimated: true },
      ],
      problems: [],
    });
  });

  it.each([
    ['2024-01-01;2024-02-01;1 234,5;yes', 1234.5, true],
    ['2024-01-01,2024-02-01,"1,234.5",no', 1234.5, false],
    ['2024-01-01\t2024-02-01\t1.234,50', 1234.5, false],
  ])('with the separator it has: %s', (text, quantity, estimated) => {
    expect(readPaste(text, false)).toMatchObject({ kind: 'rows', rows: [{ quantity, estimated }] });
  });

  it('of meter readings has one date', () => {
    expect(readPaste('2024-01-01;10500\n2024-02-01;10620', true)).toMatchObject({
      rows: [
        { from: '', to: '2024-01-01', quantity: 10500 },
        { from: '', to: '2024-02-01', quantity: 10620 },
      ],
    });
  });

  it('asks for the order of day and month, and takes the answer', () => {
    const text = '3/4/2024\t5/5/2024\t100';
    expect(readPaste(text, false)).toEqual({
      kind: 'question',
      question: { kind: 'order', row: 1, text: '3/4/2024', dayFirst: '2024-04-03', monthFirst: '2024-03-04' },
    });
    expect(readPaste(text, false, { order: 'day first' })).toMatchObject({ rows: [{ from: '2024-04-03' }] });
  });

  it('does not ask where another row shows the order', () => {
    expect(readPaste('3/4/2024\t5/5/2024\t100\n5/5/2024\t17/6/2024\t80', false)).toMatchObject({
      rows: [{ from: '2024-04-03' }, { to: '2024-06-17' }],
    });
  });

  it('asks whether a point stands before thousands or decimals', () => {
    const text = '2024-01-01\t2024-02-01\t1.200';
    expect(readPaste(text, false)).toEqual({
      kind: 'question',
      question: { kind: 'decimal', row: 1, text: '1.200', point: 1.2, comma: 1200 },
    });
    expect(readPaste(text, false, { decimal: 'comma' })).toMatchObject({ rows: [{ quantity: 1200 }] });
  });

  it('names the rows that it cannot take by their own numbers', () => {
    const text = 'from;to;kg\n2024-01-01;2024-02-01;100\n\n2024-02-01;;90\nsum;;190';
    expect(readPaste(text, false)).toMatchObject({
      rows: [{ quantity: 100 }],
      problems: [
        { row: 4, text: expect.stringContaining('one date') as string },
        { row: 5, text: 'no date is found in it.' },
      ],
    });
  });

  it('of something else says what to copy', () => {
    expect(readPaste('hello', false)).toMatchObject({ kind: 'nothing' });
  });
});
