import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import ts from "typescript";
import { afterAll, describe, expect, test } from "vitest";
import * as rb from "../../kernel/index";
import { codeBlocks, difference, examplesIn, run, splitExample } from "./examples";
import { root } from "./sourceFiles";

const scope: Record<string, unknown> = { ...rb, rb };

interface Documented {
  readonly name: string;
  readonly node: ts.Declaration;
  readonly description: string;
  /** Description and tags together. */
  readonly text: string;
  readonly tags: readonly string[];
}

/** Everything that the package root exports, with its docstring. */
function publicNames(): Documented[] {
  const entry = join(root, "kernel/index.ts");
  const program = ts.createProgram([entry], {
    target: ts.ScriptTarget.ES2022,
    resolveJsonModule: true,
    types: [],
  });
  const checker = program.getTypeChecker();
  const module = checker.getSymbolAtLocation(program.getSourceFile(entry)!)!;
  return checker.getExportsOfModule(module).map((symbol) => {
    const target = symbol.flags & ts.SymbolFlags.Alias ? checker.getAliasedSymbol(symbol) : symbol;
    const tags = target.getJsDocTags(checker);
    const description = ts.displayPartsToString(target.getDocumentationComment(checker));
    return {
      name: symbol.name,
      node: target.declarations![0]!,
      description,
      text: [description, ...tags.map((tag) => ts.displayPartsToString(tag.text))].join("\n"),
      tags: tags.map((tag) => tag.name),
    };
  });
}

const names = publicNames();
const functions = names.filter(({ node }) => ts.isFunctionDeclaration(node));

describe("docstrings of what the package exports", () => {
  test("there are functions to look at", () => {
    expect(functions.length).toBeGreaterThan(0);
  });

  test("every name says what it is", () => {
    expect(names.filter((each) => each.description.trim() === "").map((each) => each.name)).toEqual([]);
  });

  test.each(functions)("$name: source, errors and an example", ({ node, text, tags }) => {
    const missing: string[] = [];
    const hasSource = /^\s*Sources?\b/m.test(text) || tags.includes("see");
    const isMethod = node.getSourceFile().fileName.includes("/src/");
    if (isMethod && !hasSource && !/common practice|\bown\b/i.test(text)) missing.push("Source: publication");
    const takesInput = (node as ts.FunctionDeclaration).parameters.length > 0;
    if (takesInput && !tags.includes("throws") && !/never throws/i.test(text)) missing.push("@throws");
    if (!tags.includes("example")) missing.push("@example");
    expect(missing).toEqual([]);
  });
});

describe("examples in docstrings", () => {
  afterAll(() => {
    rb.displayUnits("metric");
  });

  const examples = examplesIn("src", "kernel");

  test("there are examples to run", () => {
    expect(examples.length).toBeGreaterThan(0);
  });

  test.each(examples)("$of: $code", async ({ path, code, written }) => {
    const own = (await import(/* @vite-ignore */ join(root, path))) as Record<string, unknown>;
    expect(written, "the last line carries no // value").toBeDefined();
    expect(difference(run(code, { ...own, ...scope }), written!)).toBeUndefined();
  });
});

describe("code in README.md and DEVELOPERS.md", () => {
  const blocks = ["README.md", "DEVELOPERS.md"]
    .filter((file) => existsSync(join(root, file)))
    .flatMap((file) =>
      codeBlocks(readFileSync(join(root, file), "utf8")).map((code) => ({
        file,
        code,
        first: code.split("\n")[0],
      })),
    );

  test.each(blocks)("$file: $first", ({ code }) => {
    const printed: unknown[] = [];
    const console = { log: (...items: readonly unknown[]) => printed.push(...items) };
    const require = (): unknown => rb;
    const { code: body, written } = splitExample(code);
    const value = run(body, { ...scope, console, require, exports: {} });
    if (written !== undefined) expect(difference(value, written)).toBeUndefined();
    expect(printed.filter((item) => item === undefined || Number.isNaN(item))).toEqual([]);
  });
});

describe("the comparison with what is written", () => {
  test.each<[unknown, string]>([
    [11.3334, "11.333"],
    [-0.0123, "-0.012"],
    [123456, "1.23e5"],
    ["a", '"a"'],
    [true, "true"],
    [[1.04, { b: 2 }], "[1.0, { b: 2 }]"],
    [new Float64Array([0.5]), "[0.5]"],
  ])("%j agrees with %s", (value, written) => {
    expect(difference(value, written)).toBeUndefined();
  });

  test.each<[unknown, string]>([
    [11.3336, "11.333"],
    [Number.NaN, "1"],
    ["1", "1"],
    [1, '"1"'],
    [[1, 2], "[1]"],
    [{ a: 1, b: 2 }, "{ a: 1 }"],
    [undefined, "1"],
  ])("%j differs from %s", (value, written) => {
    expect(difference(value, written)).toBeDefined();
  });
});
