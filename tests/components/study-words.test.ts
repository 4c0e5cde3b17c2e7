import { describe, expect, it } from 'vitest';
import { moveCursor } from '@/components/mosaic/calendar';
import { FIRST_OF_JULY } from '@/components/mosaic/stones';
import { readAddress, writeAddress } from '@/components/study/address';
import { designWord } from '@/components/study/design-word';
import { explain } from '@/components/study/how-computed';
import { hourName, hourSentence, power, spokenHour } from '@/components/study/hour-words';
import { LEVERS, coverChoices, withCollector, withMonths } from '@/components/study/levers';
import { sameDesign } from '@/components/study/same-design';
import { flatStretch } from '@/components/study/use-traces';
import { verdictParts, verdictText } from '@/components/study/verdict-words';
import { nextValue, placeOf, valueAt } from '@/components/ui/slider';
import { collectorByCover } from '@/data/collectors/generic';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { CARRIERS } from '@/lib/simulation/results';
import { withUnit } from '@/lib/units/display';
import { inventedAnswer } from '../fakes/invented-answer';

const { house, prices, designs } = demonstration;
const saved = designs[0];
const plain = (text: string) => text.replace(/[\u00a0\u202f]/g, ' ');

describe('the verdict', () => {
  it('says in one sentence what is carried, at what price, and what is still bought', () => {
    const answer = inventedAnswer(saved, {
      solarKwh: 3700,
      backupKwh: 12400,
      referenceKwh: 16100,
      perKwh: 0.1011,
    });
    expect(plain(verdictText(verdictParts(answer, house, prices)))).toBe(
      'With 24 m² of film-covered absorbers the sun carries 23 % of this house’s heat at 0.101 €/kWh; the boiler burns 3 080 kg of pellets instead of 3 990.',
    );
  });

  it('names no price where nothing is carried', () => {
    const none = LEVERS[0]!.write(saved, 0);
    const answer = inventedAnswer(none, {
      solarKwh: 0,
      backupKwh: 16100,
      referenceKwh: 16100,
      perKwh: Number.NaN,
    });
    expect(plain(verdictText(verdictParts(answer, house, prices)))).toBe(
      'Without sun on the array nothing is carried: the boiler burns 3 990 kg of pellets a year.',
    );
  });

  it('names both fields where a design has two', () => {
    const second = { collector: collectorByCover['selective glass'], array: { ...saved.array, areaM2: 6 } };
    const answer = inventedAnswer(
      { ...saved, second },
      { solarKwh: 3700, backupKwh: 12400, referenceKwh: 16100, perKwh: 0.1 },
    );
    expect(plain(verdictText(verdictParts(answer, house, prices)))).toMatch(
      /^With 24 m² of film-covered absorbers and 6 m² of factory collectors the sun carries 23 %/,
    );
    expect(explain('secondArea', answer, house, prices)).toMatchObject({
      title: 'Area of the second field',
      value: withUnit('6', 'm²'),
    });
    const labels = answer.cost.investment.map(({ label }) => label);
    expect(labels).toEqual(expect.arrayContaining(['collectors', 'collectors of the second field']));
    const only = inventedAnswer(
      { ...saved, array: { ...saved.array, areaM2: 0 }, second },
      { solarKwh: 3700, backupKwh: 12400, referenceKwh: 16100, perKwh: 0.1 },
    );
    expect(plain(verdictText(verdictParts(only, house, prices)))).toMatch(
      /^With 6 m² of factory collectors the/,
    );
    expect(only.cost.investment.map(({ label }) => label)).not.toContain('collectors of the second field');
  });

  it('reads gas in kilowatt hours', () => {
    const gas = { ...house, backup: { ...house.backup, fuel: 'gas' as const } };
    const answer = inventedAnswer(saved, {
      solarKwh: 3700,
      backupKwh: 12400,
      referenceKwh: 16100,
      perKwh: 0.1,
    });
    expect(plain(verdictText(verdictParts(answer, gas, prices)))).toContain(
      '14 800 kWh of gas instead of 19 200.',
    );
  });

  it('opens each of its numbers with the value that it shows', () => {
    const answer = inventedAnswer(saved, {
      solarKwh: 3700,
      backupKwh: 12400,
      referenceKwh: 16100,
      perKwh: 0.1011,
    });
    for (const part of verdictParts(answer, house, prices)) {
      if (typeof part === 'string') continue;
      const explanation = explain(part.number, answer, house, prices);
      expect(explanation.value.startsWith(part.text)).toBe(true);
      expect(explanation.inputs.length).toBeGreaterThan(0);
    }
  });
});

describe('an hour in words', () => {
  const answer = inventedAnswer(saved, { solarKwh: 1, backupKwh: 1, referenceKwh: 2, perKwh: 1 });
  const hour = 56 * 24 + 13;
  const { columns } = answer.result;
  columns.carrier[hour] = CARRIERS.indexOf('sun, straight in');
  columns.solarHeatingW[hour] = 2400;
  columns.arrayW[hour] = 4500;
  columns.storeTopC[hour] = 36.4;
  columns.roomC[hour] = 21.8;

  it('is named by date and clock', () => {
    expect(hourName(hour)).toBe('26 February, 13:00 to 14:00');
    expect(hourName(8759)).toBe('31 December, 23:00 to 24:00');
  });

  it('is spoken with carrier, power and temperatures', () => {
    expect(plain(spokenHour(answer, hour))).toBe(
      '26 February 13:00 to 14:00, sun straight in, 2.4 kW, store 36 °C, room 21.8 °C',
    );
  });

  it('says who carries the house and what the array gives', () => {
    expect(plain(hourSentence(answer, hour))).toBe(
      'The sun carries the house with 2.4 kW. No backup. The array puts 4.5 kW into the store.',
    );
  });

  it.each([
    [5, '0 kW'],
    [31, '31 W'],
    [310, '0.3 kW'],
    [4540, '4.5 kW'],
    [12_400, '12 kW'],
  ])('writes %d W as %s', (watts, text) => expect(plain(power(watts))).toBe(text));
});

describe('the address', () => {
  it('holds what differs from the saved design and gives it back', () => {
    const collector = coverChoices(saved).find(({ cover }) => cover === 'glass')!;
    let design = withMonths(withCollector(saved, collector), Array<boolean>(12).fill(true));
    for (const lever of LEVERS) design = lever.write(design, lever.to);
    const params = writeAddress(design, saved);
    expect(params.toString()).toBe('area=48&store=8000&supply=55&tilt=90&cover=glass&months=111111111111');
    const read = readAddress(params, saved);
    expect(read.broken).toEqual([]);
    expect(sameDesign(read.design, design)).toBe(true);
    expect(writeAddress(saved, saved).toString()).toBe('');
  });

  it('names what it cannot read and leaves that as saved', () => {
    const read = readAddress(new URLSearchParams('area=lots&store=&cover=straw&months=12&tilt=60'), saved);
    expect(read.broken).toEqual(['area', 'store', 'cover', 'months']);
    expect(sameDesign(read.design, LEVERS[3]!.write(saved, 60))).toBe(true);
  });

  it('names a design by a word', () => {
    expect(designWord({ name: 'Twin-wall rows, all year!' })).toBe('twin-wall-rows-all-year');
  });
});

describe('levers', () => {
  it('land on values that somebody would type', () => {
    expect(valueAt(0.5, 0, 48, 1, false)).toBe(24);
    expect(valueAt(placeOf(2000, 250, 8000, true), 250, 8000, 50, true)).toBe(2000);
    expect(valueAt(0.333, 250, 8000, 50, true)).toBe(790);
    expect(valueAt(1, 28, 55, 0.5, false)).toBe(55);
  });

  it('change with every key, to the ends and no further', () => {
    const store = { min: 250, max: 8000, step: 50, logarithmic: true };
    expect(nextValue(1000, 1, store)).toBe(1100);
    expect(nextValue(1000, -1, store)).toBe(990);
    expect(nextValue(8000, 1, store)).toBe(8000);
    expect(nextValue(35, 1, { min: 28, max: 55, step: 0.5 })).toBe(35.5);
  });

  it('show a flat stretch only where the best lies between the ends', () => {
    const points = (kwh: number[]) => kwh.map((value, place) => ({ value: place, kwh: value }));
    expect(flatStretch(points([120, 100, 100.5, 110]))).toEqual([1, 2]);
    expect(flatStretch(points([120, 110, 100, 100]))).toBeUndefined();
    expect(flatStretch(undefined)).toBeUndefined();
  });
});

describe('the cursor of the mosaic', () => {
  const at = (day: number, hour: number) => day * 24 + hour;

  it('goes by hour and day, over midnight and the turn of the year', () => {
    expect(moveCursor(at(10, 23), 'ArrowDown', 0)).toBe(at(11, 0));
    expect(moveCursor(at(364, 5), 'ArrowRight', FIRST_OF_JULY)).toBe(at(0, 5));
    expect(moveCursor(at(0, 0), 'ArrowUp', 0)).toBe(0);
  });

  it('goes by month and to the ends of the picture', () => {
    expect(moveCursor(at(30, 7), 'PageDown', 0)).toBe(at(58, 7));
    expect(moveCursor(at(50, 7), 'Home', FIRST_OF_JULY)).toBe(at(181, 7));
    expect(moveCursor(at(50, 7), 'End', FIRST_OF_JULY)).toBe(at(180, 7));
    expect(moveCursor(0, 'a', 0)).toBeUndefined();
  });
});
