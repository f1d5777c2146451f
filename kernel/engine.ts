/**
 * Runs cells. The one file that knows the internals of tslab (1.0.22, pinned): it loads tslab's converter and executor
 * with compiler options of its own and turns what they print into structured outcomes. It knows no notebook format and
 * no protocol: the Jupyter kernel and the headless runner both sit on it.
 */
import { createRequire } from "node:module";
import * as path from "node:path";
import vm from "node:vm";
import { describeError, quoteLine, type RanCell } from "./cellError";
import type { CellError, CellOutcome, CellOutput, Declaration, MimeBundle } from "./cellOutput";
import { type PositionFinder, positionFinder, takeInlineMap } from "./cellPositions";
import { guardProcess } from "./processGuard";
import { type ShortProperty, type WrittenOut, writeOutShorthand } from "./shorthand";

type Compiler = typeof import("@tslab/typescript-for-tslab");
type TranspileModule = Compiler["transpileModule"];
type ConverterModule = typeof import("tslab/dist/converter");
type ExecutorModule = typeof import("tslab/dist/executor");

const prelude = 'import * as rb from "refluxbook";';
/** What tslab puts before the code of a cell on the first line that runs. */
const wrapping = "(function(exports, require) { ";

/** What an engine needs from its host. */
export interface EngineOptions {
  /** Folder of the package that cells import. */
  readonly packageFolder: string;
  /** Folder in which cells run: the notebook's. */
  readonly folder: string;
  readonly emit: (output: CellOutput) => void;
  /** Represents the value of a cell's last expression. */
  readonly represent: (value: unknown) => MimeBundle;
  /** Hears of an error that surfaces while no cell runs. */
  readonly onLateFault?: () => void;
}

/** Runs the cells of one notebook; one engine a process. */
export interface Engine {
  readonly versions: Readonly<Record<"tslab" | "typescript", string>>;
  /** Loads the package for the cells, which the first cell does otherwise. */
  readonly prepare: () => Promise<CellOutcome>;
  readonly execute: (code: string, number: number) => Promise<CellOutcome>;
  /** Top-level variables of a cell, read without running it. */
  readonly declarations: (code: string) => Declaration[];
  /** Ends a cell that waits; a busy one ends by SIGINT. */
  readonly interrupt: () => void;
  readonly exit: (code: number) => never;
}

/** The compilation of the cell that runs. */
interface Compilation {
  find: PositionFinder | undefined;
}

/**
 * Compiler options over tslab's. Bundler resolution honours the package's `exports`, so cells import it by name;
 * the node types are tslab's own dependency, so cells are checked wherever the notebook lies.
 */
function optionsOf(compiler: Compiler, fromTslab: NodeJS.Require): object {
  const nodeTypes = path.dirname(fromTslab.resolve("@types/node/package.json"));
  return {
    moduleResolution: compiler.ModuleResolutionKind.Bundler,
    lib: ["lib.es2023.d.ts"],
    typeRoots: [path.dirname(nodeTypes)],
    types: ["node"],
    inlineSourceMap: true,
  };
}

/** Compiles the second time with a source map, and keeps both maps. */
function keepingMaps(transpile: TranspileModule, last: Compilation): TranspileModule {
  return (input, options) => {
    const { code, map } = takeInlineMap(input);
    const compilerOptions = { ...options.compilerOptions, sourceMap: map !== undefined };
    const output = transpile(code, { ...options, compilerOptions });
    if (map === undefined) return output;
    const inline = `\n//# sourceMappingURL=data:application/json;base64,${Buffer.from(output.sourceMapText!).toString("base64")}`;
    const outputText = output.outputText.replace(/\n?\/\/# sourceMappingURL=.*\s*$/, "");
    const second = takeInlineMap(inline).map!;
    const lines = outputText.split("\n").length;
    last.find = positionFinder(map, second, { prefixColumns: wrapping.length, lines, addedLines: 1 });
    return { ...output, outputText };
  };
}

function loadTslab(last: Compilation) {
  const tslabPackage = require.resolve("tslab/package.json");
  const fromTslab = createRequire(tslabPackage);
  const compilerFile = fromTslab.resolve("@tslab/typescript-for-tslab");
  const compiler = fromTslab(compilerFile) as Compiler;
  const options = optionsOf(compiler, fromTslab);
  const watchHost = compiler.createWatchCompilerHost as (...given: unknown[]) => unknown;
  // The compiler's exports are read-only getters, so tslab is handed a copy with two functions replaced.
  require.cache[compilerFile]!.exports = {
    ...compiler,
    createWatchCompilerHost: (files: unknown, given: object, ...rest: unknown[]) =>
      watchHost(files, { ...given, ...options }, ...rest),
    transpileModule: keepingMaps(compiler.transpileModule, last),
  };
  return {
    compiler,
    version: (fromTslab("./package.json") as { version: string }).version,
    converter: fromTslab("./dist/converter") as ConverterModule,
    executor: fromTslab("./dist/executor") as ExecutorModule,
  };
}

/** What tslab reports through its console while a cell runs. */
interface Report {
  values: unknown[];
  thrown: unknown[];
  diagnostics: { line: number; column: number; message: string }[];
}

function emptyReport(): Report {
  return { values: [], thrown: [], diagnostics: [] };
}

/** Types of the package by their names alone. */
function withoutPaths(message: string): string {
  return message
    .replace(/typeof import\("[^"]*\/dist\/kernel\/index"\)/g, "rb")
    .replace(/import\("[^"]*\/dist\/[^"]*"\)\./g, "");
}

/** tslab calls `error` with one argument for an exception and with a format and its parts for a diagnostic. */
function recordError(report: Report, given: readonly unknown[]): void {
  if (given.length === 1) report.thrown.push(given[0]);
  else {
    const [, file, line, column, message] = given as [string, string, number, number, string];
    report.diagnostics.push({ line, column, message: withoutPaths(`${file}${message}`) });
  }
}

function typedFinder(find: PositionFinder, typed: WrittenOut["typed"]): PositionFinder {
  return (line, column) => {
    const position = find(line, column);
    return position && typed(position);
  };
}

/** Diagnostics as one error; those that continue the one before stand under it. */
function typeError(report: Report, code: string, label: string): CellError {
  const traceback = report.diagnostics.flatMap(({ line, column, message }, i) => {
    const before = report.diagnostics[i - 1];
    if (before?.line === line && before.column === column) return [`      ${message}`];
    return [`${label}, line ${line}: ${message}`, ...quoteLine(code, line, column)];
  });
  return {
    ename: "TypeScriptError",
    evalue: report.diagnostics.map(({ line, message }) => `line ${line}: ${message}`).join("\n"),
    traceback,
  };
}

/** Names a cell's code in stack traces while `run` starts it. */
function withFileName<T>(label: string, run: () => T): T {
  const machine: { runInThisContext: typeof vm.runInThisContext } = vm;
  const plain = machine.runInThisContext;
  machine.runInThisContext = (code, options): unknown =>
    plain(code, { ...(options as vm.RunningCodeOptions), filename: label });
  try {
    return run();
  } finally {
    machine.runInThisContext = plain;
  }
}

/** tslab resolves modules from the current directory of the moment its converter is created. */
function createExecutor(tslab: ReturnType<typeof loadTslab>, options: EngineOptions, report: () => Report) {
  process.chdir(options.packageFolder);
  try {
    const node = tslab.converter.createConverter({ isJS: false, isBrowser: false });
    const converters = { node, browser: node, close: () => node.close() };
    return tslab.executor.createExecutor(options.packageFolder, converters, {
      log: (value: unknown) => report().values.push(value),
      error: (...given: unknown[]) => recordError(report(), given),
    });
  } finally {
    process.chdir(options.folder);
  }
}

/** Properties in the short form, `{ feed }`, in the order of the text. */
function shortProperties(compiler: Compiler, code: string): ShortProperty[] {
  const file = compiler.createSourceFile("cell.ts", code, compiler.ScriptTarget.Latest, true);
  const found: ShortProperty[] = [];
  const visit = (node: import("@tslab/typescript-for-tslab").Node): void => {
    if (compiler.isShorthandPropertyAssignment(node)) {
      found.push({ name: node.name.text, end: node.name.getEnd() });
    }
    compiler.forEachChild(node, visit);
  };
  visit(file);
  return found;
}

function declarationsOf(compiler: Compiler, code: string): Declaration[] {
  const file = compiler.createSourceFile("cell.ts", code, compiler.ScriptTarget.Latest, true);
  return file.statements.flatMap((statement) => {
    if (!compiler.isVariableStatement(statement)) return [];
    const { flags } = statement.declarationList;
    const keyword =
      flags & compiler.NodeFlags.Const ? "const" : flags & compiler.NodeFlags.Let ? "let" : "var";
    return statement.declarationList.declarations
      .filter((declared) => compiler.isIdentifier(declared.name))
      .map((declared) => ({
        keyword,
        name: declared.name.getText(file),
        ...(declared.type === undefined ? {} : { type: declared.type.getText(file) }),
        ...(declared.initializer === undefined ? {} : { value: declared.initializer.getText(file) }),
      }));
  });
}

/** Starts the engine. It changes the current directory to the notebook's folder. */
export function createEngine(options: EngineOptions): Engine {
  const last: Compilation = { find: undefined };
  const tslab = loadTslab(last);
  const cells = new Map<string, RanCell>();
  let report = emptyReport();
  const executor = createExecutor(tslab, options, () => report);
  const guard = guardProcess((fault, label) => {
    const text = `${label}:\n${describeError(fault, cells).traceback.join("\n")}\n`;
    options.emit({ type: "stream", name: "stderr", text });
    options.onLateFault?.();
  });

  async function run(code: string, label: string): Promise<CellOutcome> {
    report = emptyReport();
    last.find = undefined;
    guard.collect();
    let answered = false;
    const { code: written, typed } = writeOutShorthand(code, shortProperties(tslab.compiler, code));
    try {
      const running = withFileName(label, () => executor.execute(written));
      const find = last.find;
      cells.set(label, { code, find: find && typedFinder(find, typed) });
      answered = await running;
      // Promises rejected without a handler show up after a turn of the event loop.
      await new Promise((resolve) => setImmediate(resolve));
    } catch (fault) {
      report.thrown.push(fault);
    }
    report.diagnostics = report.diagnostics.map((each) => ({ ...each, ...typed(each) }));
    return outcome(answered, [...report.thrown, ...guard.collected()], code, label);
  }

  function outcome(answered: boolean, faults: unknown[], code: string, label: string): CellOutcome {
    if (faults.length > 0) return { status: "error", ...describeError(faults[0], cells) };
    if (!answered) return { status: "error", ...typeError(report, code, label) };
    if (report.values.length === 0) return { status: "ok" };
    try {
      return { status: "ok", bundle: options.represent(report.values[0]) };
    } catch (fault) {
      return { status: "error", ...describeError(fault, cells) };
    }
  }

  let prepared = false;
  async function prepare(): Promise<CellOutcome> {
    if (prepared) return { status: "ok" };
    const start = await run(prelude, "start");
    prepared = start.status === "ok";
    return start.status === "ok" ? start : startError(start, options.packageFolder);
  }

  async function execute(code: string, number: number): Promise<CellOutcome> {
    const start = await prepare();
    if (start.status === "error" || code.trim() === "") return start;
    return run(code, `cell ${number}`);
  }

  return {
    versions: { tslab: tslab.version, typescript: tslab.compiler.version },
    prepare,
    execute,
    declarations: (code) => declarationsOf(tslab.compiler, code),
    interrupt: () => executor.interrupt(),
    exit: guard.exit,
  };
}

function startError(error: CellError, packageFolder: string): CellOutcome {
  const evalue = `the package in ${packageFolder} cannot be loaded; in a clone, run "npm run build" first`;
  return { status: "error", ename: "StartError", evalue, traceback: [evalue, ...error.traceback] };
}
