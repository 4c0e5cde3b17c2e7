import { describe, expect, it } from 'vitest';
import { filesOf } from '@/lib/method/parse-source';
import { readDocstrings } from '@/lib/method/read-docstrings';
import type { MethodEntry } from '@/lib/method/read-docstrings';

const ROOMS = ['physics', 'sun', 'weather', 'calibration', 'economics'];

/** Exported functions; methods of classes keep to the words of their class. */
const functions = ROOMS.flatMap((room) => filesOf(`lib/${room}`))
  .flatMap((file) => readDocstrings(file).entries)
  .filter(({ isFunction }) => isFunction);
const names = (entries: MethodEntry[]) => entries.map(({ file, name }) => `${file}: ${name}`);

/** Functions of texts, bytes and records have neither unit nor published source: a docstring is enough. */
const quantities = functions.filter((entry) => entry.numeric);

/** A unit in brackets ([W/m²], [-], [money]), or "own definition" as source where a number has none. */
function hasUnit({ purpose, body, params, returns, sources }: MethodEntry): boolean {
  const values = returns ? [...params, returns] : params;
  const texts = [purpose, body, ...values.map(({ meaning }) => meaning)];
  return (
    values.some(({ unit }) => unit !== '') ||
    texts.some((text) => /\[[^\]\s][^\]]*\]/.test(text)) ||
    sources.some((source) => source.startsWith('own definition'))
  );
}

describe('docstrings of the core', () => {
  it('finds the functions', () => {
    expect(functions.length).toBeGreaterThan(80);
    expect(quantities.length).toBeGreaterThan(80);
  });

  it('say what each exported function is for', () => {
    expect(names(functions.filter(({ purpose, body }) => `${purpose}${body}`.length < 8))).toEqual([]);
  });

  it('state units', () => {
    expect(names(quantities.filter((entry) => !hasUnit(entry)))).toEqual([]);
  });

  it('name a source, or say that it is the product’s own definition', () => {
    expect(names(quantities.filter(({ sources }) => sources.join('').trim().length < 8))).toEqual([]);
  });
});
