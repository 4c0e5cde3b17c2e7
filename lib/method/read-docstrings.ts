import ts from 'typescript';
import { readDocstring } from './docstring';
import type { Docstring } from './docstring';
import { docstringOf, isExported, parseSource, plainComment } from './parse-source';

/** One function, class or method of the core with what its docstring says. */
export interface MethodEntry extends Docstring {
  /** `radiatorFactor`, or `HouseNetwork.prepare` for a method */
  name: string;
  file: string;
  /** false for classes and their methods */
  isFunction: boolean;
  /** the signature carries numbers: a quantity, so a unit and a source are due */
  numeric: boolean;
}

/** A named number of the core. */
export interface MethodConstant {
  name: string;
  value: string;
  meaning: string;
}

/** All that a file of the core says of itself. */
export interface MethodFile {
  file: string;
  intro: string;
  entries: MethodEntry[];
  constants: MethodConstant[];
}

const NUMERIC_TYPE = /\bnumber\b|Float(32|64)Array|= -?\d/;

/**
 * Reads the docstrings of a file: exported functions, exported classes with their public methods, named numbers.
 * @param file path from the top of the checkout
 * @returns entries in the order of the file
 */
export function readDocstrings(file: string): MethodFile {
  const { text, tree } = parseSource(file);
  const entries = tree.statements.flatMap((node) => {
    if (ts.isFunctionDeclaration(node) && isExported(node)) return [entry(file, node.name?.text, node)];
    return ts.isClassDeclaration(node) && isExported(node) ? classEntries(file, node) : [];
  });
  return { file, intro: introOf(text), entries, constants: constantsOf(tree) };
}

type Callable = ts.FunctionDeclaration | ts.MethodDeclaration | ts.ConstructorDeclaration;

function entry(file: string, name: string | undefined, node: Callable | ts.ClassDeclaration): MethodEntry {
  const types = ts.isClassDeclaration(node)
    ? []
    : [...node.parameters.map((parameter) => parameter.getText()), node.type?.getText() ?? ''];
  const numeric = types.some((type) => NUMERIC_TYPE.test(type));
  return {
    ...readDocstring(docstringOf(node)),
    name: name ?? 'default',
    file,
    isFunction: ts.isFunctionDeclaration(node),
    numeric,
  };
}

function classEntries(file: string, node: ts.ClassDeclaration): MethodEntry[] {
  const name = node.name?.text ?? 'default';
  const members = node.members.flatMap((member) => {
    const isOpen = ts.isMethodDeclaration(member) && !hasPrivate(member);
    if (isOpen && docstringOf(member)) return [entry(file, `${name}.${member.name.getText()}`, member)];
    const isMaker = ts.isConstructorDeclaration(member) && docstringOf(member) !== '';
    return isMaker ? [entry(file, name, member)] : [];
  });
  const said = docstringOf(node) !== '' && !members.some((member) => member.name === name);
  return said ? [entry(file, name, node), ...members] : members;
}

function hasPrivate(node: ts.MethodDeclaration): boolean {
  return node.modifiers?.some(({ kind }) => kind === ts.SyntaxKind.PrivateKeyword) ?? false;
}

/** The comment that opens a file and belongs to no declaration. */
function introOf(text: string): string {
  const found = /^\/\*\*[\s\S]*?\*\/(?=\s*\n(\s*\n|import\b))/.exec(text);
  return found ? plainComment(found[0]).split(/^@/m)[0]!.trim() : '';
}

/** Numbers with a name and a comment; what is made of other numbers is left to the code. */
function constantsOf(tree: ts.SourceFile): MethodConstant[] {
  return tree.statements.filter(ts.isVariableStatement).flatMap((node) =>
    node.declarationList.declarations.flatMap(({ name, initializer }) => {
      const meaning = docstringOf(node).replace(/\s*\n\s*/g, ' ');
      const value = initializer?.getText().replace(/_/g, '') ?? '';
      return meaning && /^-?\d[\d.e-]*$/i.test(value) ? [{ name: name.getText(), value, meaning }] : [];
    }),
  );
}
