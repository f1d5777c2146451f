import * as fs from "node:fs";
import * as path from "node:path";
import type { MimeBundle } from "../cellOutput";
import { UsageError } from "../usageError";
import type { CodeCell, Notebook, Output, ProseCell } from "./notebookFormat";

type Fields = Record<string, unknown>;

function isFields(value: unknown): value is Fields {
  return typeof value === "object" && value !== null && !Array.isArray(value);
}

function parse(file: string): unknown {
  let text: string;
  try {
    text = fs.readFileSync(file, "utf8");
  } catch (error) {
    throw new UsageError(`cannot read the notebook ${file}: ${(error as Error).message}`);
  }
  try {
    return JSON.parse(text);
  } catch (error) {
    throw new UsageError(`${file} is not a notebook: ${(error as Error).message}`);
  }
}

function joined(file: string, place: string, source: unknown): string {
  if (typeof source === "string") return source;
  if (Array.isArray(source) && source.every((line) => typeof line === "string")) return source.join("");
  throw new UsageError(`${file} is not a notebook: ${place}.source must be text`);
}

/** Outputs of an earlier run are left out: a run makes its own. */
function readCell(file: string, index: number, value: unknown): CodeCell | ProseCell {
  const place = `cells[${index}]`;
  if (!isFields(value)) throw new UsageError(`${file} is not a notebook: ${place} must be an object`);
  const { cell_type: type, metadata } = value;
  const id = typeof value["id"] === "string" ? value["id"] : `cell-${index + 1}`;
  const common = { id, metadata: isFields(metadata) ? metadata : {} };
  const source = joined(file, place, value["source"]);
  if (type === "code") return { cell_type: type, ...common, source, execution_count: null, outputs: [] };
  if (type !== "markdown" && type !== "raw") {
    throw new UsageError(`${file} is not a notebook: ${place}.cell_type must be code, markdown or raw`);
  }
  const attachments = value["attachments"];
  return {
    cell_type: type,
    ...common,
    source,
    ...(isFields(attachments) ? { attachments: attachments as NonNullable<ProseCell["attachments"]> } : {}),
  };
}

function checkLanguage(file: string, metadata: Fields): void {
  const { kernelspec, language_info: info } = metadata;
  const spoken =
    (isFields(info) ? info["name"] : undefined) ??
    (isFields(kernelspec) ? kernelspec["language"] : undefined);
  if (typeof spoken === "string" && !/^(typescript|javascript)$/i.test(spoken)) {
    throw new UsageError(`${file} is a ${spoken} notebook; this kernel runs TypeScript`);
  }
}

/** Reads a notebook of format 4. @throws UsageError when the file is missing or no such notebook */
export function readNotebook(file: string): Notebook {
  const value = parse(file);
  if (!isFields(value) || value["nbformat"] !== 4 || !Array.isArray(value["cells"])) {
    throw new UsageError(`${file} is not a notebook of format 4`);
  }
  const metadata = isFields(value["metadata"]) ? value["metadata"] : {};
  checkLanguage(file, metadata);
  return { metadata, cells: value["cells"].map((cell, i) => readCell(file, i, cell)) };
}

/** A text as a list of lines, each with its end. */
function lines(text: string): string[] {
  return text.match(/[^\n]*\n|[^\n]+$/g) ?? [];
}

function stored(data: MimeBundle): MimeBundle {
  return Object.fromEntries(
    Object.entries(data).map(([type, value]) => [type, typeof value === "string" ? lines(value) : value]),
  );
}

function storedOutput(output: Output): object {
  if (output.output_type === "stream") return { ...output, text: lines(output.text) };
  return "data" in output ? { ...output, data: stored(output.data) } : output;
}

/** The text of a notebook file, format 4.5. */
export function notebookText({ metadata, cells }: Notebook): string {
  const written = cells.map((cell) => ({
    ...cell,
    source: lines(cell.source),
    ...(cell.cell_type === "code" ? { outputs: cell.outputs.map(storedOutput) } : {}),
  }));
  return `${JSON.stringify({ cells: written, metadata, nbformat: 4, nbformat_minor: 5 }, null, 1)}\n`;
}

/** Writes a file whole or not at all. */
export function writeWhole(file: string, text: string): void {
  fs.mkdirSync(path.dirname(file), { recursive: true });
  const unfinished = `${file}.${process.pid}.tmp`;
  fs.writeFileSync(unfinished, text);
  fs.renameSync(unfinished, file);
}
