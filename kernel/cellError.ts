import { inspect } from "node:util";
import type { CellError } from "./cellOutput";
import type { PositionFinder } from "./cellPositions";

/** A cell that has run: its text, and how to find typed positions. */
export interface RanCell {
  readonly code: string;
  readonly find: PositionFinder | undefined;
}

/** Cells by the name that stack frames carry, such as "cell 3". */
export type RanCells = ReadonlyMap<string, RanCell>;

const frame = /^\s+at /;
const ownFrame = /node:|[\\/]tslab[\\/]dist[\\/]|[\\/]dist[\\/]kernel[\\/]/;
const libraryFrame = /[\\/]dist[\\/]src[\\/]/;
const cellFrame = /\(?(cell \d+):(\d+):(\d+)\)?$/;

/** A line of the cell with a mark under the column. */
export function quoteLine(code: string, line: number, column: number): string[] {
  const text = code.split("\n")[line - 1];
  return text === undefined ? [] : [`    ${text}`, `    ${" ".repeat(column - 1)}^`];
}

/** One stack frame in terms of the cell as typed; undefined for a frame that says nothing to its author. */
function readFrame(text: string, cells: RanCells, quote: boolean): string[] {
  const found = cellFrame.exec(text);
  const cell = found === null ? undefined : cells.get(found[1]!);
  const typed = cell?.find?.(Number(found![2]), Number(found![3]));
  if (cell === undefined || typed === undefined) return found === null ? [text] : [];
  const where = `  at ${found![1]}, line ${typed.line}`;
  return quote ? [where, ...quoteLine(cell.code, typed.line, typed.column)] : [where];
}

function isDesignError(error: Error): boolean {
  return error.name === "DesignInputError" || error.name === "DesignInfeasibleError";
}

/** Message and frames, without those of the machinery; a design error needs none of the library's either. */
function readStack(error: Error, cells: RanCells): string[] {
  const heading = `${error.name}: ${error.message}`.split("\n");
  const frames = (error.stack ?? "").split("\n").filter((line) => frame.test(line) && !ownFrame.test(line));
  const wanted = isDesignError(error) ? frames.filter((line) => !libraryFrame.test(line)) : frames;
  const quoted = wanted.findIndex((line) => cellFrame.test(line));
  return [...heading, ...wanted.flatMap((line, i) => readFrame(line, cells, i === quoted))];
}

function isError(thrown: unknown): thrown is Error {
  return typeof thrown === "object" && thrown !== null && typeof (thrown as Error).message === "string";
}

/** Anything thrown, as a notebook stores it. */
export function describeError(thrown: unknown, cells: RanCells): CellError {
  if (!isError(thrown)) {
    const text = typeof thrown === "string" ? thrown : inspect(thrown);
    return { ename: "Thrown", evalue: text, traceback: [`Thrown: ${text}`] };
  }
  if ((thrown as NodeJS.ErrnoException).code === "ERR_SCRIPT_EXECUTION_INTERRUPTED") {
    return { ename: "Interrupted", evalue: "the cell was interrupted", traceback: ["Interrupted"] };
  }
  const cause = thrown.cause === undefined ? [] : describeError(thrown.cause, cells).traceback;
  const traceback = [
    ...readStack(thrown, cells),
    ...cause.map((line, i) => (i === 0 ? `caused by ${line}` : line)),
  ];
  return { ename: thrown.name || "Error", evalue: thrown.message, traceback };
}
