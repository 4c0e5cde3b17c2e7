import ts from 'typescript';
import { parseSource } from './parse-source';

/** The rows whose number fits `id` call the functions `calls` ("lib/physics/radiator.ts#radiatorFactor"). */
export interface RowCalls {
  id: RegExp;
  calls: string[];
}

/**
 * Finds out which functions of the core the checks of a file call, from the code of the checks themselves.
 * @param file path of a file of checks from the top of the checkout
 * @returns one entry for each place where checks are made
 */
export function readRowCalls(file: string): RowCalls[] {
  const { tree } = parseSource(file);
  const reach = reachOf(tree);
  const found: RowCalls[] = [];
  visit(tree, (node) => {
    if (!ts.isObjectLiteralExpression(node)) return;
    const id = propertyOf(node, 'id');
    const compute = propertyOf(node, 'compute');
    if (!id || !compute) return;
    if (ts.isPropertyAssignment(id)) {
      const pattern = patternOf(id.initializer);
      if (pattern) found.push({ id: pattern, calls: reach(compute) });
      return;
    }
    for (const { argument, others } of madeBy(id, tree)) {
      const pattern = patternOf(argument);
      const calls = new Set([compute, ...others].flatMap(reach));
      if (pattern) found.push({ id: pattern, calls: [...calls] });
    }
  });
  return found;
}

function visit(node: ts.Node, see: (node: ts.Node) => void): void {
  see(node);
  node.forEachChild((child) => visit(child, see));
}

function propertyOf(node: ts.ObjectLiteralExpression, name: string): ts.ObjectLiteralElementLike | undefined {
  return node.properties.find((property) => property.name?.getText() === name);
}

/** For a piece of code: the functions of the core that it reaches, through the file's own functions too. */
function reachOf(tree: ts.SourceFile): (node: ts.Node) => string[] {
  const imported = new Map<string, string>();
  for (const node of tree.statements) if (ts.isImportDeclaration(node)) readImports(node, imported);
  return (start) => {
    const calls = new Set<string>();
    const seen = new Set<ts.Node>();
    const follow = (node: ts.Node) => {
      if (seen.has(node)) return;
      seen.add(node);
      visit(node, (part) => {
        if (!ts.isIdentifier(part)) return;
        const declared = declarationOf(part);
        const call = imported.get(part.text);
        if (declared) follow(declared);
        else if (call) calls.add(call);
      });
    };
    follow(start);
    return [...calls];
  };
}

/** The function or variable of the same file that a name stands for, looked for from the inside out. */
function declarationOf(name: ts.Identifier): ts.Node | undefined {
  for (let at: ts.Node | undefined = name.parent; at; at = at.parent) {
    if (!ts.isBlock(at) && !ts.isSourceFile(at)) continue;
    for (const node of at.statements) {
      if (ts.isFunctionDeclaration(node) && node.name?.text === name.text) return node;
      if (!ts.isVariableStatement(node)) continue;
      const found = node.declarationList.declarations.find((one) => one.name.getText() === name.text);
      if (found) return found;
    }
  }
  return undefined;
}

function readImports(node: ts.ImportDeclaration, into: Map<string, string>): void {
  const from = node.moduleSpecifier.getText().slice(1, -1);
  const bindings = node.importClause?.namedBindings;
  if (!from.startsWith('@/lib/') || !bindings || !ts.isNamedImports(bindings)) return;
  for (const { name, propertyName } of bindings.elements) {
    into.set(name.text, `${from.slice(2)}.ts#${(propertyName ?? name).text}`);
  }
}

interface Making {
  /** what the maker of checks is handed as `id` */
  argument: ts.Expression;
  others: ts.Expression[];
}

/** The calls of the function that makes a check from an `id` handed to it. */
function madeBy(id: ts.ObjectLiteralElementLike, tree: ts.SourceFile): Making[] {
  const maker = makerOf(id);
  const place = maker?.parameters.findIndex(({ name }) => name.getText() === id.name?.getText()) ?? -1;
  const found: Making[] = [];
  visit(tree, (node) => {
    if (!maker || !ts.isCallExpression(node) || node.expression.getText() !== maker.name) return;
    const argument = node.arguments[place];
    if (argument) found.push({ argument, others: node.arguments.filter((_, at) => at !== place) });
  });
  return found;
}

function makerOf(
  node: ts.Node,
): { name: string; parameters: readonly ts.ParameterDeclaration[] } | undefined {
  for (let at: ts.Node | undefined = node; at; at = at.parent) {
    if (ts.isFunctionDeclaration(at) && at.name)
      return { name: at.name.text, parameters: [...at.parameters] };
    if (ts.isArrowFunction(at) && ts.isVariableDeclaration(at.parent)) {
      return { name: at.parent.name.getText(), parameters: [...at.parameters] };
    }
  }
  return undefined;
}

/** The numbers that an expression can give: one when written out, many when parts are put in. */
function patternOf(node: ts.Expression): RegExp | undefined {
  const escaped = (text: string) => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
  if (ts.isStringLiteralLike(node)) return new RegExp(`^${escaped(node.text)}$`);
  if (!ts.isTemplateExpression(node)) return undefined;
  const parts = [node.head.text, ...node.templateSpans.map(({ literal }) => literal.text)].map(escaped);
  return new RegExp(`^${parts.join('.+')}$`);
}
