import { existsSync, readdirSync, readFileSync } from "node:fs";
import { join, posix, relative, resolve, sep } from "node:path";
import ts from "typescript";

/** Root of the repository. */
export const root = resolve(__dirname, "../..");

/** A parsed file; `path` is relative to the root, with forward slashes. */
export interface ParsedFile {
  readonly path: string;
  readonly text: string;
  readonly tree: ts.SourceFile;
}

function typescriptFiles(folder: string): string[] {
  const full = join(root, folder);
  if (!existsSync(full)) return [];
  return readdirSync(full, { recursive: true, encoding: "utf8" })
    .filter((name) => name.endsWith(".ts"))
    .map((name) => relative(root, join(full, name)).split(sep).join("/"))
    .sort();
}

/** Every TypeScript file under the folders, parsed. */
export function parseFolders(...folders: readonly string[]): ParsedFile[] {
  return folders.flatMap(typescriptFiles).map((path) => {
    const text = readFileSync(join(root, path), "utf8");
    return { path, text, tree: ts.createSourceFile(path, text, ts.ScriptTarget.ES2022, true) };
  });
}

/** Calls `visit` on every node of a tree. */
export function walk(node: ts.Node, visit: (node: ts.Node) => void): void {
  visit(node);
  node.forEachChild((child) => walk(child, visit));
}

/** What a file imports: the module as written, in import, export, require, import() and import types. */
export function importsOf(file: ParsedFile): string[] {
  const found: string[] = [];
  walk(file.tree, (node) => {
    const specifier =
      ts.isImportDeclaration(node) || ts.isExportDeclaration(node)
        ? node.moduleSpecifier
        : ts.isExternalModuleReference(node)
          ? node.expression
          : ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)
            ? node.argument.literal
            : ts.isCallExpression(node) && isLoad(node)
              ? node.arguments[0]
              : undefined;
    if (specifier !== undefined && ts.isStringLiteralLike(specifier)) found.push(specifier.text);
  });
  return found;
}

/** `require(...)`, `import(...)`, `createRequire(...)(...)`. */
function isLoad(call: ts.CallExpression): boolean {
  const callee = call.expression;
  return (
    callee.kind === ts.SyntaxKind.ImportKeyword ||
    (ts.isIdentifier(callee) && callee.text === "require") ||
    (ts.isCallExpression(callee) && callee.expression.getText() === "createRequire")
  );
}

/** The file that a relative import of `from` means, relative to the root; undefined for a package. */
export function resolveImport(from: string, specifier: string): string | undefined {
  if (!specifier.startsWith(".")) return undefined;
  const base = posix.join(posix.dirname(from), specifier);
  const candidates = [base, `${base}.ts`, `${base}/index.ts`];
  return candidates.find((path) => /\.\w+$/.test(path) && existsSync(join(root, path))) ?? base;
}
