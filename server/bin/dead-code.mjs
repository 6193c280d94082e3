import { readFileSync, readdirSync } from 'node:fs';
import path from 'node:path';
import ts from 'typescript';
import { inProject } from './paths.mjs';
import { runScript, say } from './say.mjs';

/**
 * Finds exports that no other file names, and files that nobody imports. By name, not by reference: a name that two
 * files export counts as used when either is. A type may be exported for the signature it stands in.
 */

/** Found by their place: routes, start-up scripts, tests, tool configuration. */
const ENTRY_FILE = /^(app\/|server\/bin\/|test\/|server\/main\.ts$)|\.test\.tsx?$|\.d\.ts$/;

await runScript(async () => {
  const files = ['app', 'src', 'server', 'shared', 'test'].flatMap(listFiles).map(readFile);
  const complaints = files.flatMap((file) => [...findDeadExports(file, files), ...findOrphan(file, files)]);
  for (const line of complaints) say(line);
  if (complaints.length > 0) {
    say(`${complaints.length} dead. Remove it, or drop the word export where only the own file uses it.`);
    process.exitCode = 1;
  }
});

/** @typedef {{path: string, exported: {name: string, isType: boolean}[], mentions: Map<string, number>, strings: Set<string>}} ReadFile */

/** @param {string} folder @returns {string[]} */
function listFiles(folder) {
  return readdirSync(inProject(folder), { withFileTypes: true }).flatMap((entry) => {
    const place = path.posix.join(folder, entry.name);
    if (entry.isDirectory()) return listFiles(place);
    return /\.(ts|tsx|mjs)$/.test(entry.name) ? [place] : [];
  });
}

/** @param {string} file @returns {ReadFile} */
function readFile(file) {
  const tree = ts.createSourceFile(file, readFileSync(inProject(file), 'utf8'), ts.ScriptTarget.Latest, true);
  /** @type {Map<string, number>} */
  const mentions = new Map();
  /** @type {Set<string>} */
  const strings = new Set();
  /** @param {ts.Node} node */
  const visit = (node) => {
    if (ts.isIdentifier(node)) mentions.set(node.text, (mentions.get(node.text) ?? 0) + 1);
    if (ts.isStringLiteralLike(node)) strings.add(node.text);
    ts.forEachChild(node, visit);
  };
  visit(tree);
  return { path: file, exported: tree.statements.flatMap(exportedNames), mentions, strings };
}

/** @param {ts.Statement} node @returns {{name: string, isType: boolean}[]} */
function exportedNames(node) {
  const modifiers = (ts.canHaveModifiers(node) && ts.getModifiers(node)?.map((one) => one.kind)) || [];
  if (!modifiers.includes(ts.SyntaxKind.ExportKeyword) || modifiers.includes(ts.SyntaxKind.DefaultKeyword))
    return [];
  if (ts.isVariableStatement(node)) {
    return node.declarationList.declarations.flatMap(({ name }) =>
      ts.isIdentifier(name) ? [{ name: name.text, isType: false }] : [],
    );
  }
  if (ts.isInterfaceDeclaration(node) || ts.isTypeAliasDeclaration(node))
    return [{ name: node.name.text, isType: true }];
  if (ts.isFunctionDeclaration(node) || ts.isClassDeclaration(node) || ts.isEnumDeclaration(node)) {
    return node.name ? [{ name: node.name.text, isType: false }] : [];
  }
  return [];
}

/** @param {ReadFile} file @param {ReadFile[]} files */
function findDeadExports(file, files) {
  return file.exported
    .filter(({ name, isType }) => {
      if (isType && (file.mentions.get(name) ?? 0) > 1) return false;
      return !files.some((other) => other !== file && !isIndexOf(other, file) && other.mentions.has(name));
    })
    .map(({ name }) => `${file.path}: nobody uses ${name}.`);
}

/** An index that only passes names on does not use them. @param {ReadFile} other @param {ReadFile} file */
function isIndexOf(other, file) {
  return other.path === path.posix.join(path.posix.dirname(file.path), 'index.ts');
}

/** @param {ReadFile} file @param {ReadFile[]} files */
function findOrphan(file, files) {
  if (ENTRY_FILE.test(file.path)) return [];
  const names = [
    path.posix.basename(file.path),
    path.posix.basename(file.path).replace(/\.(web\.)?(ts|tsx|mjs)$/, ''),
  ];
  if (/^index\.tsx?$/.test(names[0] ?? '')) names.push(path.posix.basename(path.posix.dirname(file.path)));
  const isNamed = files.some(
    (other) =>
      other !== file && [...other.strings].some((text) => names.includes(text.split('/').at(-1) ?? '')),
  );
  return isNamed ? [] : [`${file.path}: nobody imports this file.`];
}
