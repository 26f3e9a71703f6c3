import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import ts from 'typescript';

const root = __dirname;
const files = readdirSync(root, { recursive: true, encoding: 'utf8' })
  .filter((name) => name.endsWith('.ts') && !name.endsWith('.spec.ts') && path.basename(name) !== 'index.ts')
  .filter((name) => !name.startsWith('testing'))
  .sort();
const references = readFileSync(path.join(root, '..', 'REFERENCES.md'), 'utf8');
const keys = new Set([...references.matchAll(/^\| \[([^\]]+)\]/gm)].map((match) => match[1]!));

interface Exported {
  readonly name: string;
  readonly doc: string;
  readonly isFunction: boolean;
}

const isExported = (node: ts.Node): boolean =>
  ts.canHaveModifiers(node) &&
  (ts.getModifiers(node) ?? []).some((modifier) => modifier.kind === ts.SyntaxKind.ExportKeyword);

const docOf = (node: ts.Node): string => {
  const docs = ts.getJSDocCommentsAndTags(node).filter(ts.isJSDoc);
  return docs
    .map((doc) => doc.getText())
    .join('\n')
    .replace(/\s*\n\s*\*\s?/g, ' ');
};

const functionLike = (node: ts.Expression | undefined): boolean =>
  node !== undefined && (ts.isArrowFunction(node) || ts.isFunctionExpression(node));

const exportsOf = (file: string): Exported[] => {
  const text = readFileSync(path.join(root, file), 'utf8');
  const source = ts.createSourceFile(file, text, ts.ScriptTarget.ES2023, true);
  return source.statements.filter(isExported).flatMap((node): Exported[] => {
    const doc = docOf(node);
    if (ts.isVariableStatement(node)) {
      return node.declarationList.declarations.map((declaration) => ({
        name: declaration.name.getText(),
        doc,
        isFunction: functionLike(declaration.initializer),
      }));
    }
    const name = (node as ts.DeclarationStatement).name?.getText() ?? '';
    return [{ name, doc, isFunction: ts.isFunctionDeclaration(node) }];
  });
};

const all = files.flatMap((file) =>
  exportsOf(file).map((found): [string, Exported] => [`${file} ${found.name}`, found]),
);
const functions = all.filter(([, found]) => found.isFunction);

describe('docstrings', () => {
  it('finds the exported functions of the package', () => {
    expect(functions.length).toBeGreaterThan(100);
  });

  it.each(all)('%s has a docstring', (_, { doc }) => {
    expect(doc).toMatch(/\/\*\*\s*\S/);
  });

  it.each(functions)('%s says its units, where it is valid and its source', (_, { doc }) => {
    expect(doc).toMatch(/Units: \S/);
    expect(doc).toMatch(/Valid: \S/);
    const source = /Source: (.+)$/.exec(doc)?.[1] ?? '';
    expect(source).toMatch(/\[[\w.]+\]|none \(|common practice/);
  });

  it('has every key of a docstring in REFERENCES.md', () => {
    const used = all.flatMap(([, { doc }]) => [
      ...doc.matchAll(/\[([A-Z0-9][\w.]*\d[\w.]*|[A-Z][A-Za-z]{2,})\]/g),
    ]);
    const unresolved = new Set(used.map((match) => match[1]!).filter((key) => !keys.has(key)));
    expect([...unresolved]).toEqual([]);
    expect(used.length).toBeGreaterThan(100);
  });

  it('has no key in REFERENCES.md that nothing uses', () => {
    const text = files.map((file) => readFileSync(path.join(root, file), 'utf8')).join('\n');
    expect([...keys].filter((key) => !text.includes(`[${key}]`))).toEqual([]);
  });
});
