import path from "node:path";
import ts from "typescript";

export interface Import {
  /** As written, such as `~/units/format` or `node:fs`. */
  specifier: string;
  /** From the repository's root without extension for a file of ours (`app/units/format`), else undefined. */
  target: string | undefined;
  /** Nothing of it is left when the program runs. */
  typeOnly: boolean;
  line: number;
}

function isTypeOnly(clause: ts.ImportClause | undefined): boolean {
  if (clause === undefined) return false;
  if (clause.isTypeOnly) return true;
  const named = clause.namedBindings;
  if (clause.name !== undefined || named === undefined || !ts.isNamedImports(named)) return false;
  return named.elements.length > 0 && named.elements.every((element) => element.isTypeOnly);
}

function targetOf(specifier: string, file: string): string | undefined {
  const bare = specifier.replace(/\?.*$/, "");
  const joined = bare.startsWith("~/")
    ? path.posix.join("app", bare.slice(2))
    : bare.startsWith(".")
      ? path.posix.join(path.posix.dirname(file), bare)
      : undefined;
  return joined?.replace(/\.(?:tsx?|mjs|js)$/, "");
}

/**
 * Every import of a source file: declarations, re-exports, `import()` and import types.
 * @param file path from the repository's root, with slashes
 */
export function importsOf(file: string, source: string): Import[] {
  const tree = ts.createSourceFile(file, source, ts.ScriptTarget.Latest, true);
  const found: Import[] = [];
  const add = (specifier: ts.Node | undefined, typeOnly: boolean) => {
    if (specifier === undefined || !ts.isStringLiteralLike(specifier)) return;
    const { line } = tree.getLineAndCharacterOfPosition(specifier.getStart(tree));
    found.push({ specifier: specifier.text, target: targetOf(specifier.text, file), typeOnly, line: line + 1 });
  };
  const visit = (node: ts.Node): void => {
    if (ts.isImportDeclaration(node)) add(node.moduleSpecifier, isTypeOnly(node.importClause));
    else if (ts.isExportDeclaration(node)) add(node.moduleSpecifier, node.isTypeOnly);
    else if (ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword) {
      add(node.arguments[0], false);
    } else if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) add(node.argument.literal, true);
    ts.forEachChild(node, visit);
  };
  visit(tree);
  return found;
}
