import { describe, expect, it } from 'vitest';
import {
  currencySign,
  formatFixed,
  formatShare,
  formatSignificant,
  formatTyped,
  readNumber,
  unitInCurrency,
  withUnit,
} from '@/lib/units/display';

const thin = '\u202f';
const nbsp = '\u00a0';

describe('numbers on screen', () => {
  it('keeps the significant figures that are known', () => {
    expect(formatSignificant(0.1, 2)).toBe('0.10');
    expect(formatSignificant(10.84)).toBe('10.8');
    expect(formatSignificant(999.6)).toBe(`1${thin}000`);
    expect(formatSignificant(2674)).toBe(`2${thin}670`);
    expect(formatSignificant(1234567, 3)).toBe(`1${thin}230${thin}000`);
    expect(formatSignificant(0)).toBe('0');
    expect(formatSignificant(Number.NaN)).toBe('–');
  });

  it('writes a true minus and never a negative nothing', () => {
    expect(formatFixed(-1.25, 1)).toBe('−1.3');
    expect(formatFixed(-0.01, 1)).toBe('0.0');
    expect(formatFixed(-12345)).toBe(`−12${thin}345`);
  });

  it('gives typed values back as they were typed', () => {
    expect(formatTyped(24)).toBe('24');
    expect(formatTyped(35.5)).toBe('35.5');
    expect(formatTyped(2000)).toBe(`2${thin}000`);
  });

  it('keeps number and unit together', () => {
    expect(withUnit('24', 'm²')).toBe(`24${nbsp}m²`);
    expect(withUnit('65', '°')).toBe('65°');
    expect(formatShare(0.2345)).toBe(`23${nbsp}%`);
    expect(formatShare(0.0421)).toBe(`4.2${nbsp}%`);
    expect(formatShare(0)).toBe(`0${nbsp}%`);
  });

  it('puts the project’s currency where the schemas say money', () => {
    expect(currencySign('EUR')).toBe('€');
    expect(unitInCurrency('money/kWh', 'EUR')).toBe('€/kWh');
    expect(unitInCurrency('m²', 'EUR')).toBe('m²');
  });
});

describe('numbers as people type them', () => {
  it.each([
    ['24', 24],
    [' 2 000 ', 2000],
    [`2${thin}000`, 2000],
    ['0,085', 0.085],
    ['−13', -13],
    ['.5', 0.5],
  ])('reads %j', (text, value) => expect(readNumber(text)).toBe(value));

  it.each(['', 'warm', '1,2,3', '12 m', '--4'])('refuses %j', (text) =>
    expect(readNumber(text)).toBeUndefined(),
  );
});
