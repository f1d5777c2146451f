import { readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { join } from "node:path";
import type ts from "typescript";
import { describe, expect, test } from "vitest";
import * as rb from "../../kernel/index";
import { codeBlocks, examplesIn } from "./examples";
import { root } from "./sourceFiles";

/** TypeScript 5.0, the compiler of the notebook cells. */
const compiler = createRequire(__filename)("@tslab/typescript-for-tslab") as typeof ts;

const options: ts.CompilerOptions = {
  strict: true,
  noEmit: true,
  target: compiler.ScriptTarget.ES2022,
  lib: ["lib.es2022.d.ts"], // no DOM
  types: [], // no Node
  skipLibCheck: false,
  module: compiler.ModuleKind.CommonJS,
  moduleResolution: compiler.ModuleResolutionKind.Node10,
  baseUrl: root,
  paths: { refluxbook: ["dist/kernel/index.d.ts"] },
};

/** Compiles texts as if they were files of a program that uses the package; gives what the compiler says. */
function compile(texts: Readonly<Record<string, string>>): string[] {
  const disk = compiler.createCompilerHost(options);
  const virtual = new Map(Object.entries(texts).map(([name, text]) => [join(root, "out", name), text]));
  const host: ts.CompilerHost = {
    ...disk,
    fileExists: (path) => virtual.has(path) || disk.fileExists(path),
    readFile: (path) => virtual.get(path) ?? disk.readFile(path),
    getSourceFile: (path, language, ...rest) => {
      const text = virtual.get(path);
      return text === undefined
        ? disk.getSourceFile(path, language, ...rest)
        : compiler.createSourceFile(path, text, language);
    },
  };
  const program = compiler.createProgram([...virtual.keys()], options, host);
  return compiler.getPreEmitDiagnostics(program).map((diagnostic) => {
    const { file, start = 0 } = diagnostic;
    const line = file === undefined ? 0 : file.getLineAndCharacterOfPosition(start).line + 1;
    return `${file?.fileName.slice(root.length + 1)}:${line} ${compiler.flattenDiagnosticMessageText(diagnostic.messageText, "\n")}`;
  });
}

/** What a script has besides the language. */
const consoleType = "declare const console: { log(...items: readonly unknown[]): void };\n";

describe("the built declarations under TypeScript 5.0, strict, without DOM and Node types", () => {
  test("it is TypeScript 5.0", () => {
    expect(compiler.version).toMatch(/^5\.0\./);
  });

  test("a program of a user compiles, and what is misspelt does not", () => {
    const consumer = readFileSync(join(root, "test/project/consumer/consumer.ts"), "utf8");
    expect(compile({ "consumer.ts": consumer })).toEqual([]);
  });

  test("the code of the README compiles", () => {
    const blocks = codeBlocks(readFileSync(join(root, "README.md"), "utf8"));
    expect(blocks.length).toBeGreaterThan(0);
    const texts = blocks.map((code, i) => [`readme${i}.ts`, `${consoleType}${code}\nexport {};`] as const);
    expect(compile(Object.fromEntries(texts))).toEqual([]);
  });

  test("the examples of the exported functions compile", () => {
    const names = Object.keys(rb);
    const ofPublic = examplesIn("src", "kernel").filter(({ of }) => names.includes(of.split(" ").at(-1)!));
    const head = `import * as rb from "refluxbook";\nimport { ${names.join(", ")} } from "refluxbook";\n`;
    const texts = ofPublic.map(({ code }, i) => [`example${i}.ts`, `${head}${code}`] as const);
    expect(compile(Object.fromEntries(texts))).toEqual([]);
  });
});
