import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { dirname, join, relative, resolve } from 'node:path';
import ts from 'typescript';

export interface Import {
  /** Both relative to the repository. */
  from: string;
  /** A file of ours, or null when it is a package. */
  file: string | null;
  /** What stands between the quotes. */
  words: string;
  typeOnly: boolean;
}

export const root = resolve(__dirname, '..', '..');
const endings = ['', '.ts', '.tsx', '.web.ts', '.web.tsx', '.mjs', '.js', '/index.ts', '/index.tsx'];

/** Every source file of ours under these folders. */
export function sourceFiles(folders: readonly string[]): string[] {
  return folders
    .flatMap((folder) => readdirSync(join(root, folder), { recursive: true, withFileTypes: true }))
    .filter((entry) => entry.isFile() && /\.(ts|tsx|mjs|js)$/.test(entry.name) && !entry.name.endsWith('.d.ts'))
    .map((entry) => relative(root, join(entry.parentPath, entry.name)));
}

/** Every import, export-from, import() and require() with a fixed name in a file. */
export function importsOf(from: string): Import[] {
  const source = ts.createSourceFile(from, readFileSync(join(root, from), 'utf8'), ts.ScriptTarget.Latest, true);
  const found: Import[] = [];
  const add = (words: string, typeOnly: boolean) => found.push({ from, words, typeOnly, file: resolveFile(from, words) });
  const visit = (node: ts.Node): void => {
    if (ts.isImportDeclaration(node) && ts.isStringLiteral(node.moduleSpecifier)) {
      add(node.moduleSpecifier.text, isTypeOnly(node.importClause));
    } else if (ts.isExportDeclaration(node) && node.moduleSpecifier && ts.isStringLiteral(node.moduleSpecifier)) {
      add(node.moduleSpecifier.text, node.isTypeOnly);
    } else if (ts.isCallExpression(node)) {
      const [argument] = node.arguments;
      const loads = node.expression.kind === ts.SyntaxKind.ImportKeyword || (ts.isIdentifier(node.expression) && node.expression.text === 'require');
      if (loads && argument && ts.isStringLiteral(argument)) add(argument.text, false);
    } else if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument) && ts.isStringLiteral(node.argument.literal)) {
      add(node.argument.literal.text, true);
    }
    ts.forEachChild(node, visit);
  };
  visit(source);
  return found;
}

function isTypeOnly(clause: ts.ImportClause | undefined): boolean {
  if (clause === undefined) return false;
  if (clause.isTypeOnly) return true;
  const names = clause.namedBindings;
  return clause.name === undefined && names !== undefined && ts.isNamedImports(names) && names.elements.length > 0
    && names.elements.every((element) => element.isTypeOnly);
}

/** A file that is not there keeps its bare path: the type check is what complains of it. */
function resolveFile(from: string, words: string): string | null {
  if (!words.startsWith('.')) return null;
  const base = join(root, dirname(from), words);
  return relative(root, endings.map((ending) => base + ending).find((file) => existsSync(file) && statSync(file).isFile()) ?? base);
}

/** The circles among files that are loaded at run time: each as the files on its way. */
export function findCircles(imports: readonly Import[]): string[][] {
  const edges = new Map<string, string[]>();
  for (const { from, file, typeOnly } of imports) {
    if (file !== null && !typeOnly) edges.set(from, [...(edges.get(from) ?? []), file]);
  }
  const circles: string[][] = [];
  const done = new Set<string>();
  const visit = (file: string, way: string[]): void => {
    const start = way.indexOf(file);
    if (start >= 0) {
      circles.push([...way.slice(start), file]);
      return;
    }
    if (done.has(file)) return;
    for (const next of edges.get(file) ?? []) visit(next, [...way, file]);
    done.add(file);
  };
  for (const file of edges.keys()) visit(file, []);
  return circles;
}
