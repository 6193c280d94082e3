import { readFileSync, readdirSync } from 'node:fs';
import path from 'node:path';
import ts from 'typescript';

export const ROOT = path.resolve(__dirname, '../..');
const SOURCE_FOLDERS = ['app', 'src', 'server', 'shared', 'test'];

export interface SourceImport {
  /** As written: './field' or 'yup'. */
  specifier: string;
  /** Path from the project's folder without extension; undefined for a package. */
  target: string | undefined;
  isTypeOnly: boolean;
}

export interface SourceFile {
  /** Path from the project's folder, with forward slashes. */
  path: string;
  text: string;
  tree: ts.SourceFile;
  imports: SourceImport[];
}

/** Every TypeScript and JavaScript file of the project, parsed once. */
export function readSourceFiles(): SourceFile[] {
  return SOURCE_FOLDERS.flatMap((folder) => listFiles(folder))
    .filter((file) => /\.(ts|tsx|mjs|js)$/.test(file))
    .map(readSourceFile);
}

/** All files below a folder, as paths from the project's folder. */
export function listFiles(folder: string): string[] {
  return readdirSync(path.join(ROOT, folder), { withFileTypes: true }).flatMap((entry) => {
    const place = `${folder}/${entry.name}`;
    return entry.isDirectory() ? listFiles(place) : [place];
  });
}

function readSourceFile(file: string): SourceFile {
  return parseSource(file, readFileSync(path.join(ROOT, file), 'utf8'));
}

export function parseSource(file: string, text: string): SourceFile {
  const tree = ts.createSourceFile(file, text, ts.ScriptTarget.Latest, true);
  return { path: file, text, tree, imports: findImports(file, tree) };
}

function findImports(file: string, tree: ts.SourceFile): SourceImport[] {
  const found: SourceImport[] = [];
  const add = (specifier: ts.Node | undefined, isTypeOnly: boolean) => {
    if (specifier === undefined || !ts.isStringLiteralLike(specifier)) return;
    found.push({ specifier: specifier.text, target: resolveTarget(file, specifier.text), isTypeOnly });
  };
  const visit = (node: ts.Node): void => {
    if (ts.isImportDeclaration(node)) add(node.moduleSpecifier, isTypeOnlyImport(node));
    if (ts.isExportDeclaration(node)) add(node.moduleSpecifier, node.isTypeOnly);
    if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) add(node.argument.literal, true);
    if (ts.isCallExpression(node)) {
      const isDynamic = node.expression.kind === ts.SyntaxKind.ImportKeyword;
      const isRequire = ts.isIdentifier(node.expression) && node.expression.text === 'require';
      if (isDynamic || isRequire) add(node.arguments[0], false);
    }
    ts.forEachChild(node, visit);
  };
  visit(tree);
  return found;
}

/** `import type …`, and `import { type A, type B }` where every name is a type. */
function isTypeOnlyImport(node: ts.ImportDeclaration): boolean {
  const clause = node.importClause;
  if (clause === undefined) return false;
  if (clause.phaseModifier === ts.SyntaxKind.TypeKeyword) return true;
  if (clause.name !== undefined || clause.namedBindings === undefined) return false;
  if (!ts.isNamedImports(clause.namedBindings)) return false;
  const names = clause.namedBindings.elements;
  return names.length > 0 && names.every((name) => name.isTypeOnly);
}

function resolveTarget(file: string, specifier: string): string | undefined {
  if (!specifier.startsWith('.')) return undefined;
  const target = path.posix.normalize(path.posix.join(path.posix.dirname(file), specifier));
  return target.replace(/\.(tsx?|mjs|js)$/, '');
}
