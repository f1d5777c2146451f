import { inspect } from "node:util";
import ts from "typescript";
import { parseFolders, walk } from "./sourceFiles";

/** One `@example` of a docstring: code whose last line ends in `// value`. */
export interface Example {
  /** File and name of what it documents. */
  readonly of: string;
  readonly path: string;
  readonly code: string;
  /** The value as written; undefined when the last line carries none. */
  readonly written: string | undefined;
}

type Scope = Readonly<Record<string, unknown>>;

/** Every `@example` in the docstrings of the folders. */
export function examplesIn(...folders: readonly string[]): Example[] {
  return parseFolders(...folders).flatMap(({ path, tree }) => {
    const found: Example[] = [];
    walk(tree, (node) => {
      for (const doc of ts.isSourceFile(node) ? [] : ts.getJSDocCommentsAndTags(node).filter(ts.isJSDoc)) {
        if (doc.parent !== node) continue;
        for (const tag of doc.tags ?? []) {
          if (tag.tagName.text !== "example") continue;
          const name = (node as Partial<ts.NamedDeclaration>).name?.getText() ?? "";
          found.push({ of: `${path} ${name}`.trim(), path, ...splitExample(textOf(tag)) });
        }
      }
    });
    return found;
  });
}

/** The text of a tag with the comment's margin taken off, untouched otherwise. */
function textOf(tag: ts.JSDocTag): string {
  const lines = tag
    .getText()
    .replace(/^@\w+[ \t]*/, "")
    .split("\n")
    .map((line) => line.replace(/^\s*\* ?/, ""))
    .filter((line) => !line.startsWith("```"));
  const end = lines.findIndex((line, i) => i > 0 && /^(Source|\s*$)/.test(line));
  return (end < 0 ? lines : lines.slice(0, end)).join("\n").trim();
}

/** Splits the value off the last line. */
export function splitExample(text: string): { code: string; written: string | undefined } {
  const lines = text.trimEnd().split("\n");
  const last = /^(.*?)\s*\/\/ (.+)$/.exec(lines.at(-1)!);
  if (last === null) return { code: text, written: undefined };
  return { code: [...lines.slice(0, -1), last[1]!].join("\n"), written: last[2]!.trim() };
}

/** Runs TypeScript with the names of `scope` in reach; gives the value of the last statement. */
export function run(code: string, scope: Scope): unknown {
  const script = ts.transpileModule(code, {
    compilerOptions: {
      target: ts.ScriptTarget.ES2022,
      module: ts.ModuleKind.CommonJS,
      esModuleInterop: true,
    },
  }).outputText;
  // sloppy code outside, so that `with` is allowed; the value of a script is that of its last statement
  // eslint-disable-next-line @typescript-eslint/no-implied-eval -- the docstrings are ours
  const evaluate = new Function("reach", "script", "with (reach) { return eval(script) }") as (
    reach: Scope,
    script: string,
  ) => unknown;
  return evaluate(scope, script.replace(/^"use strict";\n/, ""));
}

/** Where a value differs from what is written, or undefined; numbers are compared to the digits written. */
export function difference(value: unknown, written: string): string | undefined {
  const parsed = ts.createSourceFile("value.ts", `(${written})`, ts.ScriptTarget.ES2022, true);
  const statement = parsed.statements[0];
  if (parsed.statements.length !== 1 || statement === undefined || !ts.isExpressionStatement(statement)) {
    return `${written} is not a value`;
  }
  return compare(value, statement.expression, "");
}

function compare(value: unknown, node: ts.Expression, at: string): string | undefined {
  if (ts.isParenthesizedExpression(node)) return compare(value, node.expression, at);
  if (ts.isArrayLiteralExpression(node)) return compareList(value, node.elements, at);
  if (ts.isObjectLiteralExpression(node)) return compareRecord(value, node, at);
  const text = node.getText();
  const isNumber = /^[-+]?[\d._]+(e[-+]?\d+)?$/i.test(text.replace(/\s/g, ""));
  const same = isNumber ? agrees(value, text.replace(/\s/g, "")) : Object.is(value, literal(node));
  return same ? undefined : `${at === "" ? "value" : at} is ${inspect(value)}, written ${text}`;
}

function literal(node: ts.Expression): unknown {
  if (ts.isStringLiteralLike(node)) return node.text;
  if (node.kind === ts.SyntaxKind.TrueKeyword) return true;
  if (node.kind === ts.SyntaxKind.FalseKeyword) return false;
  if (node.kind === ts.SyntaxKind.NullKeyword) return null;
  if (ts.isIdentifier(node) && node.text === "undefined") return undefined;
  throw new Error(`cannot compare with ${node.getText()}`);
}

/** Half a unit of the last digit written. */
function agrees(value: unknown, digits: string): boolean {
  const [mantissa, exponent = "0"] = digits.replace(/_/g, "").toLowerCase().split("e");
  const decimals = mantissa!.split(".")[1]?.length ?? 0;
  const unit = 10 ** (Number(exponent) - decimals);
  return typeof value === "number" && Math.abs(value - Number(digits.replace(/_/g, ""))) <= 0.5000001 * unit;
}

function compareList(value: unknown, nodes: readonly ts.Expression[], at: string): string | undefined {
  if (!Array.isArray(value) && !ArrayBuffer.isView(value))
    return `${at} is ${inspect(value)}, written a list`;
  const list = Array.from(value as ArrayLike<unknown>);
  if (list.length !== nodes.length) return `${at} has ${list.length} entries, written ${nodes.length}`;
  return firstOf(nodes, (node, i) => compare(list[i], node, `${at}[${i}]`));
}

function compareRecord(value: unknown, node: ts.ObjectLiteralExpression, at: string): string | undefined {
  if (typeof value !== "object" || value === null) return `${at} is ${inspect(value)}, written an object`;
  const fields = node.properties.filter(ts.isPropertyAssignment);
  const nameOf = (field: ts.PropertyAssignment): string =>
    ts.isComputedPropertyName(field.name) ? field.name.getText() : field.name.text;
  const names = fields.map(nameOf).sort();
  const got = Object.keys(value).sort();
  if (names.join() !== got.join()) return `${at} has fields ${got.join()}, written ${names.join()}`;
  return firstOf(fields, (field) =>
    compare((value as Scope)[nameOf(field)], field.initializer, `${at}.${nameOf(field)}`),
  );
}

function firstOf<T>(
  items: readonly T[],
  look: (item: T, i: number) => string | undefined,
): string | undefined {
  for (const [i, item] of items.entries()) {
    const found = look(item, i);
    if (found !== undefined) return found;
  }
  return undefined;
}

/** The code blocks of a Markdown file marked `ts`. */
export function codeBlocks(markdown: string): string[] {
  return [...markdown.matchAll(/^```ts\n([\s\S]*?)^```/gm)].map((match) => match[1]!);
}
