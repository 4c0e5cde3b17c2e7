import { existsSync, readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import ts from 'typescript';

/** A file of the product as the compiler sees it. */
export interface ParsedSource {
  /** from the top of the checkout, for example lib/physics/radiator.ts */
  file: string;
  text: string;
  tree: ts.SourceFile;
}

const ROOT = process.cwd();

/** The TypeScript files of a folder such as lib/physics, in the order of their names; none where it is missing. */
export function filesOf(folder: string): string[] {
  const place = path.join(/* turbopackIgnore: true */ ROOT, folder);
  if (!existsSync(place)) return [];
  return readdirSync(place)
    .filter((name) => name.endsWith('.ts') && !name.endsWith('.d.ts'))
    .sort()
    .map((name) => `${folder}/${name}`);
}

/** Reads and parses one file of the checkout. */
export function parseSource(file: string): ParsedSource {
  const text = readFileSync(path.join(/* turbopackIgnore: true */ ROOT, file), 'utf8');
  return { file, text, tree: ts.createSourceFile(file, text, ts.ScriptTarget.Latest, true) };
}

/** Whether a declaration carries the word `export`. */
export function isExported(node: ts.HasModifiers): boolean {
  return node.modifiers?.some(({ kind }) => kind === ts.SyntaxKind.ExportKeyword) ?? false;
}

/** The text of the last docstring before a node, without stars; '' when there is none. */
export function docstringOf(node: ts.Node): string {
  const doc = ts.getJSDocCommentsAndTags(node).filter(ts.isJSDoc).at(-1);
  return doc ? plainComment(doc.getText()) : '';
}

/** A comment without its slashes and stars. */
export function plainComment(comment: string): string {
  return comment
    .replace(/^\/\*\*?/, '')
    .replace(/\*\/$/, '')
    .split('\n')
    .map((line) => line.replace(/^\s*\* ?/, '').trimEnd())
    .join('\n')
    .trim();
}
