import ts from 'typescript';
import { parseSource } from './parse-source';

/** The numbers that a file of the core gives a name at its top level, written as in the code. */
export function namedNumbers(file: string): ReadonlyMap<string, string> {
  const found = new Map<string, string>();
  for (const node of parseSource(file).tree.statements.filter(ts.isVariableStatement)) {
    for (const { name, initializer } of node.declarationList.declarations) {
      if (initializer && ts.isNumericLiteral(initializer)) {
        found.set(name.getText(), initializer.getText().replaceAll('_', ''));
      }
    }
  }
  return found;
}

/**
 * Puts the numbers of the code into a sentence.
 * @param text sentence with {NAME} where a number stands
 * @param files files of the core in which the names stand
 * @returns the sentence; a name that no file has stays as it is, which a test finds
 */
export function withNumbers(text: string, files: readonly string[]): string {
  if (!text.includes('{')) return text;
  const numbers = new Map(files.flatMap((file) => [...namedNumbers(file)]));
  return text.replace(/\{(\w+)\}/g, (whole, name: string) => numbers.get(name) ?? whole);
}
