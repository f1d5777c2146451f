import ts from "typescript";
import { describe, expect, test } from "vitest";
import { importsOf, type ParsedFile, parseFolders, resolveImport, walk } from "./sourceFiles";

/** The chain of DEVELOPERS.md; folders of one row are siblings that never import one another. */
const chain: readonly (readonly string[])[] = [
  ["base"],
  ["numerics"],
  ["components"],
  ["equilibrium"],
  ["balance"],
  ["staging", "shortcut", "stagewise"],
  ["hydraulics", "energy"],
  ["cost"],
  ["column"],
  ["study"],
  ["plots"],
  ["index.ts"],
];

/** Packages that src/ may load, by file, with the reason. Nothing else of src/ leaves src/. */
const packagesOfSrc: Readonly<Record<string, readonly string[]>> = {
  // the general unit library, loaded on first use because that takes a second
  "src/base/unitLibrary.ts": ["mathjs", "node:module"],
};

/** What a pure function does not touch. `Math.random` and `Date` would make two runs differ. */
const impure = new Set(
  "process console require fetch Date globalThis setTimeout setInterval setImmediate queueMicrotask".split(
    " ",
  ),
);

const src = parseFolders("src");
const kernel = parseFolders("kernel");
const all = [...src, ...kernel];

function layerOf(path: string): number {
  const top = path.split("/")[1]!;
  return chain.findIndex((row) => row.includes(top));
}

function edges(files: readonly ParsedFile[]): { from: string; to: string }[] {
  return files.flatMap((file) =>
    importsOf(file).flatMap((specifier) => {
      const to = resolveImport(file.path, specifier);
      return to === undefined ? [] : [{ from: file.path, to }];
    }),
  );
}

function packagesOf(file: ParsedFile): string[] {
  return importsOf(file).filter((specifier) => !specifier.startsWith("."));
}

/** Impure names that a file uses as a value: not as a property, a field name or a type. */
function impureUses(file: ParsedFile): string[] {
  const found: string[] = [];
  walk(file.tree, (node) => {
    if (ts.isPropertyAccessExpression(node) && node.getText() === "Math.random") found.push("Math.random");
    if (!ts.isIdentifier(node) || !impure.has(node.text)) return;
    const { parent } = node;
    const isName =
      (ts.isPropertyAccessExpression(parent) && parent.name === node) ||
      ((ts.isPropertyAssignment(parent) || ts.isPropertySignature(parent)) && parent.name === node);
    if (!isName) found.push(node.text);
  });
  return found.map((name) => `${file.path}: ${name}`);
}

/** The first import cycle found, as the files along it. */
function findCycle(files: readonly ParsedFile[]): string[] {
  const next = new Map<string, string[]>();
  for (const { from, to } of edges(files)) next.set(from, [...(next.get(from) ?? []), to]);
  const done = new Set<string>();
  const visit = (path: string, trail: readonly string[]): string[] => {
    if (trail.includes(path)) return [...trail.slice(trail.indexOf(path)), path];
    if (done.has(path)) return [];
    for (const to of next.get(path) ?? []) {
      const cycle = visit(to, [...trail, path]);
      if (cycle.length > 0) return cycle;
    }
    done.add(path);
    return [];
  };
  for (const { path } of files) {
    const cycle = visit(path, []);
    if (cycle.length > 0) return cycle;
  }
  return [];
}

describe("layers of src", () => {
  test("every folder is in the chain", () => {
    expect(src.map((file) => file.path).filter((path) => layerOf(path) < 0)).toEqual([]);
  });

  test("no folder imports from a later one or a sibling", () => {
    const wrong = edges(src).filter(({ from, to }) => {
      if (!to.startsWith("src/")) return true;
      const sameFolder = from.split("/")[1] === to.split("/")[1];
      return !sameFolder && layerOf(to) >= layerOf(from);
    });
    expect(wrong.map(({ from, to }) => `${from} imports ${to}`)).toEqual([]);
  });

  test("src loads no package but the unit library", () => {
    const wrong = src.flatMap((file) =>
      packagesOf(file)
        .filter((name) => !(packagesOfSrc[file.path] ?? []).includes(name))
        .map((name) => `${file.path} imports ${name}`),
    );
    expect(wrong).toEqual([]);
  });

  test("src is pure: no input, output, process, clock or unseeded chance", () => {
    expect(src.filter((file) => !(file.path in packagesOfSrc)).flatMap(impureUses)).toEqual([]);
  });
});

describe("imports of the whole project", () => {
  test("no cycle", () => {
    expect(findCycle(all)).toEqual([]);
  });

  test("every relative import names a file", () => {
    const missing = edges(all).filter(({ to }) => !/\.\w+$/.test(to));
    expect(missing.map(({ from, to }) => `${from} imports ${to}`)).toEqual([]);
  });

  test("only kernel/engine.ts knows tslab's internals", () => {
    const wrong = all.filter(
      (file) =>
        file.path !== "kernel/engine.ts" && packagesOf(file).some((name) => /^tslab(\/|$)/.test(name)),
    );
    expect(wrong.map((file) => file.path)).toEqual([]);
  });
});
