import { describe, expect, it } from 'vitest';
import { readWeather } from '@/lib/weather/read-weather';
import type { WeatherRefusal } from '@/lib/weather/weather-result';
import type { WeatherYear } from '@/lib/weather/weather-year';
import { bytesOf, epwHeader, epwRow, epwText, exampleHours, tmy3Text } from './example-files';

function accepted(text: string, repair = false): WeatherYear {
  const result = readWeather(bytesOf(text), { repair });
  if (!result.ok) throw new Error(result.message);
  return result.year;
}

function refused(text: string, repair = false): WeatherRefusal {
  const result = readWeather(bytesOf(text), { repair });
  if (result.ok) throw new Error('the file was taken');
  return result;
}

const hours = exampleHours();

describe('a good EPW file', () => {
  const year = accepted(epwText(hours));

  it('gives the header as it stands', () => {
    expect(year).toMatchObject({
      name: 'Saltmarsh, North',
      source: 'epw',
      synthetic: false,
      latitudeDeg: 47.5,
      longitudeDeg: 8.5,
      timeZoneH: 1,
      elevationM: 410,
      sunShiftH: -0.5,
      pointValues: 'stamp',
    });
  });

  it('puts stamp 1 into row 0 and keeps every digit', () => {
    for (const h of [0, 11, 4000, 8759]) {
      expect(year.globalWm2[h]).toBe(Number(hours[h]!.global));
      expect(year.dryBulbC[h]).toBe(Number(hours[h]!.dryBulb));
    }
    expect(year.pressurePa[0]).toBe(96500);
    expect(year.albedo[0]).toBe(0.2);
    expect(year.skyLongwaveWm2[0]).toBe(290);
    expect(year.notes).toEqual([]);
  });

  it('is the same with a byte-order mark, LF, trailing commas and blank lines', () => {
    const rows = epwText(hours).trimEnd().split('\r\n');
    const text = '\uFEFF' + rows.map((row, i) => (i < 8 ? row : `${row},`)).join('\n') + '\n\n\n';
    expect(accepted(text).globalWm2).toEqual(year.globalWm2);
  });

  it('is the same with seven header lines and any years', () => {
    const header = epwHeader().filter((line) => !line.startsWith('GROUND'));
    const text = [...header, ...hours.map((h) => epwRow(h, 2030 - h.month))].join('\n');
    expect(accepted(text).dryBulbC).toEqual(year.dryBulbC);
  });

  it('reads Latin-1 names', () => {
    const text = epwText(hours).replace('Saltmarsh, North', 'S\u00e4ltmarsh');
    const bytes = Uint8Array.from(text, (letter) => letter.charCodeAt(0));
    const result = readWeather(bytes);
    expect(result.ok && result.year.name).toBe('S\u00e4ltmarsh');
  });

  it('leaves out 29 February and says so', () => {
    const leap = hours
      .filter((h) => h.month === 2 && h.day === 28)
      .map((h) => ({ ...h, day: 29, dryBulb: '-30' }));
    const at = hours.findIndex((h) => h.month === 3);
    const read = accepted(epwText([...hours.slice(0, at), ...leap, ...hours.slice(at)]));
    expect(read.dryBulbC).toEqual(year.dryBulbC);
    expect(read.notes[0]!.message).toContain('29 February');
    expect(read.notes[0]!.rows).toHaveLength(24);
    expect(read.notes[0]!.rows![0]).toBe(8 + at + 1);
  });

  it('names what it assumed where albedo and long-wave are missing', () => {
    const text = epwText(hours).replaceAll(',0.200,', ',999,').replaceAll(',0,0,290,', ',0,0,9999,');
    const read = accepted(text);
    expect(read.albedo[0]).toBe(0.2);
    expect(read.skyLongwaveWm2[0]).toBeGreaterThan(180);
    expect(read.notes.map((note) => note.kind)).toEqual(['assumption', 'assumption']);
  });
});

describe('a good TMY3 file', () => {
  const year = accepted(tmy3Text(hours));

  it('picks its columns by name', () => {
    expect(year).toMatchObject({ name: 'SALTMARSH [OLD MILL], NORTH', source: 'tmy3', timeZoneH: 1 });
    expect(year.globalWm2[11]).toBe(Number(hours[11]!.global));
    expect(year.windMPerS[8759]).toBe(3.1);
    expect(year.pressurePa[0]).toBe(96500);
    expect(year.albedo[0]).toBe(0.2);
  });

  it('takes 00:00 on the same date as the end of that day', () => {
    expect(accepted(tmy3Text(hours, '00:00')).dryBulbC).toEqual(year.dryBulbC);
  });

  it('takes 00:00 on the next date as the end of the day before', () => {
    const next = (i: number) => hours[(i + 1) % hours.length]!;
    const moved = hours.map((h, i) => (h.hour === 24 ? { ...h, month: next(i).month, day: next(i).day } : h));
    expect(accepted(tmy3Text(moved, '00:00')).dryBulbC).toEqual(year.dryBulbC);
  });

  it('reads a column name with a stray bracket', () => {
    expect(accepted(tmy3Text(hours).replace('DNI (W/m^2)', 'DNI (W/m^2))')).beamNormalWm2).toEqual(
      year.beamNormalWm2,
    );
  });
});

/** Values changed at some hours, counted from 0. */
function changed(at: readonly number[], change: Partial<(typeof hours)[number]>): string {
  return epwText(hours.map((h, i) => (at.includes(i) ? { ...h, ...change } : h)));
}

const scaled = (factor: number): string =>
  epwText(
    hours.map((h) => ({
      ...h,
      global: String(Number(h.global) * factor),
      beam: String(Number(h.beam) * factor),
      diffuse: String(Number(h.diffuse) * factor),
    })),
  );

describe('what a bad file gets', () => {
  it.each([
    ['an empty file', '', 'empty', /empty/, undefined],
    ['some text', 'once upon a time\n', 'unknown-format', /EPW or TMY3/, undefined],
    ['an archive', 'PK\u0003\u0004', 'unknown-format', /zip/, undefined],
    ['no LOCATION line', epwText(hours, epwHeader().slice(1)), 'no-header', /LOCATION/, 1],
    ['no header at all', epwText(hours, []), 'no-header', /LOCATION/, 1],
    ['a header without rows', epwText([]), 'empty', /no hourly rows/, undefined],
    ['no station line', tmy3Text(hours).replace(/^.*\n/, ''), 'no-header', /Row 1 of a TMY3/, 1],
    ['no line of names', tmy3Text(hours).replace(/\nDate.*\n/, '\n'), 'no-header', /Row 2 of a TMY3/, 2],
    ['no wind column', tmy3Text(hours).replace('Wspd (m/s)', 'Gust'), 'no-header', /wspd/, 2],
    [
      'two records an hour',
      epwText(hours).replace('PERIODS,1,1', 'PERIODS,1,2'),
      'not-hourly',
      /2 records/,
      8,
    ],
    [
      'a month 13',
      epwText(hours.map((h, i) => (i === 30 ? { ...h, month: 13 } : h))),
      'bad-stamp',
      /Row 39/,
      39,
    ],
    [
      'five hours without temperature',
      changed([100, 101, 102, 103, 104], { dryBulb: '99.9' }),
      'values-missing',
      /longer than 3 hours/,
      109,
    ],
    [
      'no beam in the whole file',
      epwText(hours.map((h) => ({ ...h, beam: '9999' }))),
      'values-missing',
      /no beam irradiance/,
      9,
    ],
    [
      'four rows missing',
      epwText(hours.toSpliced(3000, 4)),
      'rows-missing',
      /8,756 hours.*4 hours from 6 May/s,
      3008,
    ],
    ['irradiance in kW', scaled(0.001), 'irradiance-units', /Export the file in W\/m²/, undefined],
    [
      'the wrong half of the earth',
      epwText(hours).replace('47.50', '-47.50'),
      'hemisphere',
      /sign of the latitude/,
      1,
    ],
    ['a place off the earth', epwText(hours).replace('47.50', '147.50'), 'no-header', /degrees north/, 1],
  ] as const)('%s: refused, no repair offered', (_, text, code, message, row) => {
    for (const repair of [false, true]) {
      const refusal = refused(text, repair);
      expect(refusal.code).toBe(code);
      expect(refusal.message).toMatch(message);
      expect(refusal.rows?.[0]?.row).toBe(row);
      expect(refusal.repair).toBeUndefined();
    }
  });

  it.each([
    [
      'one row missing',
      epwText(hours.toSpliced(3000, 1)),
      'rows-missing',
      /8,759 hours.*6 May, hour 1/s,
      3008,
    ],
    ['one row twice', epwText(hours.toSpliced(3000, 0, hours[2999]!)), 'rows-twice', /8,761 hours/, 3009],
    [
      'three hours without irradiance',
      changed([12, 13, 14], { global: '9999' }),
      'values-missing',
      /3 values/,
      21,
    ],
    ['a word for a number', changed([12], { wind: 'calm' }), 'values-missing', /wind speed missing/, 21],
    ['an empty field', changed([12], { dryBulb: '' }), 'values-missing', /air temperature missing/, 21],
    ['irradiance in kJ', scaled(3.6), 'irradiance-units', /kJ/, undefined],
    [
      'temperature in °F',
      epwText(hours.map((h) => ({ ...h, dryBulb: (Number(h.dryBulb) * 1.8 + 32).toFixed(2) }))).replaceAll(
        ',2.5,',
        ',36.5,',
      ),
      'temperature-units',
      /°F/,
      undefined,
    ],
  ] as const)('%s: refused with an offer, read when it is taken', (_, text, code, message, row) => {
    const refusal = refused(text);
    expect(refusal.code).toBe(code);
    expect(refusal.message).toMatch(message);
    expect(refusal.rows?.[0]?.row).toBe(row);
    expect(refusal.repair).toBeTruthy();
    const year = accepted(text, true);
    expect(year.notes.some((note) => note.kind === 'repair')).toBe(true);
    for (const column of [year.dryBulbC, year.globalWm2, year.beamNormalWm2, year.windMPerS]) {
      expect(column.every(Number.isFinite)).toBe(true);
      expect(column).toHaveLength(8760);
    }
  });

  it('one row missing and one twice, as with summer time, is not repaired', () => {
    const text = epwText(hours.toSpliced(7000, 0, hours[6999]!).toSpliced(2000, 1));
    expect(refused(text, true).repair).toBeUndefined();
    expect(refused(text).message).toMatch(/standard time/);
  });

  it('interpolates straight between the neighbours', () => {
    const year = accepted(changed([12, 13], { dryBulb: '99.9' }), true);
    const before = Number(hours[11]!.dryBulb);
    const after = Number(hours[14]!.dryBulb);
    expect(year.dryBulbC[12]).toBeCloseTo(before + (after - before) / 3, 12);
    expect(year.dryBulbC[13]).toBeCloseTo(before + (2 * (after - before)) / 3, 12);
    expect(year.notes[0]).toMatchObject({ kind: 'repair', rows: [21] });
  });

  it('a gap over the end of the year counts as one', () => {
    expect(refused(changed([0, 1, 8758, 8759], { wind: '999' })).repair).toBeUndefined();
    expect(refused(changed([0, 8758, 8759], { wind: '999' })).repair).toBeTruthy();
  });

  it('warns of a time zone far from the longitude', () => {
    const year = accepted(epwText(hours).replace('8.5000000E+00,1,', '8.5000000E+00,-6,'));
    expect(year.notes[0]).toMatchObject({ kind: 'caution' });
    expect(year.notes[0]!.message).toMatch(/Time zone -6/);
  });
});
