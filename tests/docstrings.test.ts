import { readFileSync, readdirSync } from 'node:fs';
import path from 'node:path';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';

const ROOMS = ['physics', 'sun', 'weather', 'economics'];
const ROOT = path.join(import.meta.dirname, '..', 'lib');

interface Documented {
  name: string;
  text: string;
  source: string;
}

/** Exported functions of a file with their docstrings. */
function exportedFunctions(file: string): Documented[] {
  const code = readFileSync(file, 'utf8');
  const tree = ts.createSourceFile(file, code, ts.ScriptTarget.Latest, true);
  return tree.statements.filter(ts.isFunctionDeclaration).flatMap((node) => {
    if (!node.modifiers?.some((modifier) => modifier.kind === ts.SyntaxKind.ExportKeyword)) return [];
    const docs = ts.getJSDocCommentsAndTags(node).filter(ts.isJSDoc);
    const see = ts.getJSDocTags(node).find((tag) => tag.tagName.text === 'see');
    return {
      name: `${path.relative(ROOT, file)}: ${node.name?.text ?? 'default'}`,
      text: docs.map((doc) => doc.getText()).join('\n'),
      source: see?.getText().replace(/^@see\s*/, '') ?? '',
    };
  });
}

const files = ROOMS.flatMap((room) =>
  readdirSync(path.join(ROOT, room), { recursive: true, encoding: 'utf8' })
    .filter((name) => name.endsWith('.ts') && !name.endsWith('.d.ts'))
    .map((name) => path.join(ROOT, room, name)),
);
const functions = files.flatMap(exportedFunctions);

/** A unit in brackets ([W/m²], [-], [money]) or, for functions of texts and records, "own definition" as source. */
const hasUnit = ({ text, source }: Documented) =>
  /\[[^\]\s][^\]]*\]/.test(text) || source.startsWith('own definition');

describe('docstrings of the core', () => {
  it('finds the functions', () => {
    expect(functions.length).toBeGreaterThan(80);
  });

  it('state units', () => {
    expect(functions.filter((entry) => !hasUnit(entry)).map((entry) => entry.name)).toEqual([]);
  });

  it('name a source, or say that it is the product’s own definition', () => {
    expect(functions.filter((entry) => entry.source.trim().length < 8).map((entry) => entry.name)).toEqual(
      [],
    );
  });
});
