import * as path from "node:path";
import type { CellError, Declaration } from "../cellOutput";
import { UsageError } from "../usageError";
import { cellTitle, firstLine } from "./cellTitle";
import { type Ended, type KernelProcess, startKernelProcess } from "./kernelProcess";
import { drawsFigures } from "./drawsFigures";
import { type Answer, expectsFigures, type Remark, type Versions } from "./messages";
import { type CodeCell, hasTag, isCode, type Notebook } from "./notebookFormat";
import { readNotebook } from "./notebookFile";
import { injectParameters, parametersCell, parameterValues, type Setting } from "./parameters";

/** How a cell of a run went. */
export interface CellProgress {
  readonly number: number;
  readonly count: number;
  readonly title: string;
  readonly seconds: number;
  readonly failed: boolean;
}

/** What stopped a run. */
export interface RunFailure {
  readonly why: "cell-failed" | "over-time" | "kernel-died" | "late-fault";
  readonly number: number;
  readonly title: string;
  readonly firstLine: string;
  readonly error: CellError;
}

/** A notebook that has run, whole or up to the cell that failed. */
export interface NotebookRun {
  readonly notebook: Notebook;
  readonly parameters: readonly { readonly name: string; readonly value: string }[];
  readonly versions: Versions;
  readonly failure?: RunFailure;
}

/** How to run a notebook. */
export interface RunOptions {
  readonly settings: readonly Setting[];
  /** Seconds that one cell may take. */
  readonly timeLimit: number;
  readonly onCell?: (progress: CellProgress) => void;
}

const longestStart = 120_000; // ms
const patience = 3000; // ms between asking a cell to stop and ending the process

type Ran = { readonly answer: Answer | Ended; readonly overTime: boolean };

/** Waits for an answer; over time, the cell is interrupted, then the process ended. */
async function withinTime(
  kernel: KernelProcess,
  answer: Promise<Answer | Ended>,
  limit: number,
): Promise<Ran> {
  let overTime = false;
  let killer: NodeJS.Timeout | undefined;
  const timer = setTimeout(() => {
    overTime = true;
    kernel.interrupt();
    killer = setTimeout(kernel.kill, patience);
  }, limit);
  const given = await answer;
  clearTimeout(timer);
  clearTimeout(killer);
  return { answer: given, overTime };
}

/** Puts what a cell gives out into it; text that follows text of the same stream is joined on. */
function recorder(cells: readonly CodeCell[], onLateFault: () => void): (remark: Remark) => void {
  return (remark) => {
    if (remark.say === "late-fault") return onLateFault();
    const outputs = cells[Math.max(remark.number, 1) - 1]?.outputs;
    const { output } = remark;
    const last = outputs?.at(-1);
    if (output.type === "display") {
      outputs?.push({ output_type: "display_data", data: output.data, metadata: {} });
    } else if (last?.output_type === "stream" && last.name === output.name) last.text += output.text;
    else outputs?.push({ output_type: "stream", name: output.name, text: output.text });
  };
}

function errorOf(
  { answer, overTime }: Ran,
  limit: number,
): { why: RunFailure["why"]; error: CellError } | undefined {
  if (overTime) {
    const evalue = `the cell ran longer than ${limit} s`;
    const traceback = answer.say === "ran" && "traceback" in answer.outcome ? answer.outcome.traceback : [];
    return { why: "over-time", error: { ename: "TimeLimit", evalue, traceback: [evalue, ...traceback] } };
  }
  if (answer.say === "ended") {
    const evalue = `the process that runs the cells ended (${answer.how})`;
    return { why: "kernel-died", error: { ename: "KernelDied", evalue, traceback: [evalue] } };
  }
  if (answer.say !== "ran" || answer.outcome.status === "ok") return undefined;
  const { ename, evalue, traceback } = answer.outcome;
  return { why: "cell-failed", error: { ename, evalue, traceback } };
}

/** Runs one cell and records how it ended. */
async function runCell(
  kernel: KernelProcess,
  cell: CodeCell,
  number: number,
  limit: number,
): Promise<ReturnType<typeof errorOf>> {
  cell.execution_count = number;
  const ran = await withinTime(kernel, kernel.ask({ ask: "run", code: cell.source, number }), limit * 1000);
  const failed = errorOf(ran, limit);
  if (failed !== undefined) cell.outputs.push({ output_type: "error", ...failed.error });
  else if (
    ran.answer.say === "ran" &&
    "bundle" in ran.answer.outcome &&
    ran.answer.outcome.bundle !== undefined
  ) {
    const { bundle } = ran.answer.outcome;
    cell.outputs.push({ output_type: "execute_result", execution_count: number, data: bundle, metadata: {} });
  }
  return failed;
}

/** Runs the cells in order; stops at the first that fails, unless it is tagged `raises-exception`. */
async function runCells(
  kernel: KernelProcess,
  notebook: Notebook,
  cells: readonly CodeCell[],
  options: RunOptions,
): Promise<RunFailure | undefined> {
  for (const [i, cell] of cells.entries()) {
    const title = cellTitle(notebook, cell);
    const start = Date.now();
    const failed = await runCell(kernel, cell, i + 1, options.timeLimit);
    const expected = failed?.why === "cell-failed" && hasTag(cell, "raises-exception");
    const stops = failed !== undefined && !expected;
    const seconds = (Date.now() - start) / 1000;
    options.onCell?.({ number: i + 1, count: cells.length, title, seconds, failed: stops });
    if (stops) return { ...failed, number: i + 1, title, firstLine: firstLine(cell) };
  }
  return undefined;
}

async function declarationsIn(kernel: KernelProcess, notebook: Notebook): Promise<readonly Declaration[]> {
  const cell = parametersCell(notebook);
  if (cell === undefined) return [];
  const answer = await kernel.ask({ ask: "declarations", code: cell.source });
  return answer.say === "declarations" ? answer.declarations : [];
}

function withKernelMetadata(notebook: Notebook, versions: Versions): Notebook {
  const metadata = {
    ...notebook.metadata,
    kernelspec: { name: "refluxbook", display_name: "refluxbook (TypeScript)", language: "typescript" },
    language_info: {
      name: "typescript",
      file_extension: ".ts",
      mimetype: "text/typescript",
      version: versions["typescript"] ?? "",
    },
  };
  return { ...notebook, metadata };
}

/** A fault that surfaced when its cell had ended, told as the last cell's. */
function lateFailure(notebook: Notebook, cells: readonly CodeCell[]): RunFailure {
  const cell = cells[cells.length - 1]!;
  const evalue = "an error surfaced after its cell had ended; see what the notebook prints on stderr";
  return {
    why: "late-fault",
    number: cells.length,
    title: cellTitle(notebook, cell),
    firstLine: firstLine(cell),
    error: { ename: "LateFault", evalue, traceback: [evalue] },
  };
}

/**
 * Runs a notebook without Jupyter: every cell in order, in a process of its own.
 *
 * @throws UsageError when the notebook cannot be read or has no such parameter
 */
export async function runNotebook(file: string, options: RunOptions): Promise<NotebookRun> {
  const given = readNotebook(file);
  let hear: (remark: Remark) => void = () => undefined;
  const folder = path.dirname(path.resolve(file));
  const words = drawsFigures(given, folder) ? [expectsFigures] : [];
  const kernel = startKernelProcess(folder, words, (remark) => hear(remark));
  const stop = () => kernel.kill();
  process.on("SIGINT", stop).on("SIGTERM", stop);
  try {
    const { answer: ready } = await withinTime(kernel, kernel.ready, longestStart);
    if (ready.say !== "ready") throw new UsageError("the process that runs the cells did not start");
    const declared = await declarationsIn(kernel, given);
    const notebook = injectParameters(given, options.settings, declared);
    const cells = notebook.cells.filter(isCode);
    let isLate = false;
    hear = recorder(cells, () => {
      isLate = true;
    });
    const failed = await runCells(kernel, notebook, cells, options);
    await kernel.close();
    const failure = failed ?? (isLate ? lateFailure(notebook, cells) : undefined);
    return {
      notebook: withKernelMetadata(notebook, ready.versions),
      parameters: parameterValues(declared, options.settings),
      versions: ready.versions,
      ...(failure === undefined ? {} : { failure }),
    };
  } finally {
    process.off("SIGINT", stop).off("SIGTERM", stop);
    await kernel.close();
  }
}
