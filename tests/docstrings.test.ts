import { readFileSync, readdirSync } from 'node:fs';
import path from 'node:path';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';

const ROOMS = ['physics', 'sun', 'weather', 'calibration', 'economics'];
const ROOT = path.join(import.meta.dirname, '..', 'lib');

interface Documented {
  name: string;
  text: string;
  source: string;
  /** the signature carries numbers: a quantity, so a unit and a source are due */
  numeric: boolean;
}

/** Exported functions of a file with their docstrings. */
function exportedFunctions(file: string): Documented[] {
  const code = readFileSync(file, 'utf8');
  const tree = ts.createSourceFile(file, code, ts.ScriptTarget.Latest, true);
  return tree.statements.filter(ts.isFunctionDeclaration).flatMap((node) => {
    if (!node.modifiers?.some((modifier) => modifier.kind === ts.SyntaxKind.ExportKeyword)) return [];
    const docs = ts.getJSDocCommentsAndTags(node).filter(ts.isJSDoc);
    const types = [...node.parameters.map((parameter) => parameter.getText()), node.type?.getText() ?? ''];
    const see = ts.getJSDocTags(node).find((tag) => tag.tagName.text === 'see');
    return {
      name: `${path.relative(ROOT, file)}: ${node.name?.text ?? 'default'}`,
      text: docs.map((doc) => doc.getText()).join('\n'),
      source: see?.getText().replace(/^@see\s*/, '') ?? '',
      numeric: types.some((type) => /\bnumber\b|Float(32|64)Array|= -?\d/.test(type)),
    };
  });
}

const files = ROOMS.flatMap((room) =>
  readdirSync(path.join(ROOT, room), { recursive: true, encoding: 'utf8' })
    .filter((name) => name.endsWith('.ts') && !name.endsWith('.d.ts'))
    .map((name) => path.join(ROOT, room, name)),
);
const functions = files.flatMap(exportedFunctions);

/** Functions of texts, bytes and records have neither unit nor published source: a docstring is enough. */
const quantities = functions.filter((entry) => entry.numeric);

/** A unit in brackets ([W/m²], [-], [money]), or "own definition" as source where a number has none. */
const hasUnit = ({ text, source }: Documented) =>
  /\[[^\]\s][^\]]*\]/.test(text) || source.startsWith('own definition');

describe('docstrings of the core', () => {
  it('finds the functions', () => {
    expect(functions.length).toBeGreaterThan(80);
    expect(quantities.length).toBeGreaterThan(80);
  });

  it('say what each exported function is for', () => {
    expect(functions.filter((entry) => entry.text.length < 20).map((entry) => entry.name)).toEqual([]);
  });

  it('state units', () => {
    expect(quantities.filter((entry) => !hasUnit(entry)).map((entry) => entry.name)).toEqual([]);
  });

  it('name a source, or say that it is the product’s own definition', () => {
    expect(quantities.filter((entry) => entry.source.trim().length < 8).map((entry) => entry.name)).toEqual(
      [],
    );
  });
});
