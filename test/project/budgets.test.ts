import ts from "typescript";
import { expect, test } from "vitest";
import { parseFolders, walk } from "./sourceFiles";

/** Physical lines, comments and blanks included. Data are .json and not counted. */
const files = parseFolders("src", "kernel");

interface Sized {
  readonly name: string;
  readonly lines: number;
}

function linesOf(node: ts.Node): number {
  const tree = node.getSourceFile();
  const from = tree.getLineAndCharacterOfPosition(node.getStart()).line;
  return tree.getLineAndCharacterOfPosition(node.getEnd()).line - from + 1;
}

/** The name of a function, method, constructor or function assigned to a name; undefined for an inline one. */
function nameOf(node: ts.Node): string | undefined {
  if (ts.isFunctionDeclaration(node) || ts.isMethodDeclaration(node) || ts.isAccessor(node)) {
    return node.body === undefined ? undefined : node.name?.getText();
  }
  if (ts.isConstructorDeclaration(node)) return "constructor";
  const isInline = ts.isArrowFunction(node) || ts.isFunctionExpression(node);
  const { parent } = node;
  const isNamed =
    isInline &&
    (ts.isVariableDeclaration(parent) || ts.isPropertyAssignment(parent) || ts.isPropertyDeclaration(parent));
  return isNamed ? parent.name.getText() : undefined;
}

function functionsOf(tree: ts.SourceFile, path: string): Sized[] {
  const found: Sized[] = [];
  walk(tree, (node) => {
    const name = nameOf(node);
    if (name !== undefined) found.push({ name: `${path} ${name}`, lines: linesOf(node) });
  });
  return found;
}

function quantile(sizes: readonly Sized[], share: number): number {
  const sorted = sizes.map((size) => size.lines).sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))]!;
}

function over(sizes: readonly Sized[], limit: number): string[] {
  return sizes.filter((size) => size.lines > limit).map((size) => `${size.name}: ${size.lines} lines`);
}

const fileSizes: Sized[] = files.map(({ path, text }) => ({
  name: path,
  lines: text.trimEnd().split("\n").length,
}));
const functionSizes = files.flatMap(({ path, tree }) => functionsOf(tree, path));

test("files: median at most 80 lines, none over 300", () => {
  const median = quantile(fileSizes, 0.5);
  console.log(`${fileSizes.length} files, median ${median} lines, longest ${quantile(fileSizes, 1)}`);
  expect(over(fileSizes, 300)).toEqual([]);
  expect(median).toBeLessThanOrEqual(80);
});

test("functions: median at most 15 lines, nine in ten at most 40, none over 100", () => {
  const [median, ninth] = [quantile(functionSizes, 0.5), quantile(functionSizes, 0.9)];
  const longest = quantile(functionSizes, 1);
  console.log(
    `${functionSizes.length} functions, median ${median}, nine in ten at most ${ninth}, longest ${longest}`,
  );
  expect(over(functionSizes, 100)).toEqual([]);
  expect(median).toBeLessThanOrEqual(15);
  expect(ninth).toBeLessThanOrEqual(40);
});
