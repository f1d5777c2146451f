import { inspect } from "node:util";
import { resultTable } from "../../src/study/resultTable";
import type { MimeBundle } from "../cellOutput";
import { figureBundle } from "../figures/figureBundle";
import { isFigure } from "../figures/figure";
import { figureText } from "../figures/figureText";
import { notebookSession } from "../session";
import { tableHtml } from "./tableHtml";
import { tableText } from "./tableText";

/** Results without cautions and methods of their own that still show as a table. */
const tabled = new Set(["component", "stream"]);
const mostTables = 20;

function isResult(value: unknown): value is object {
  if (typeof value !== "object" || value === null || Array.isArray(value)) return false;
  const { kind, cautions, methods } = value as Record<string, unknown>;
  if (typeof kind !== "string") return false;
  return tabled.has(kind) || (Array.isArray(cautions) && Array.isArray(methods));
}

function resultBundle(results: readonly object[]): MimeBundle {
  const tables = results
    .slice(0, mostTables)
    .map((result) => resultTable(result, notebookSession().displayUnits));
  const more = results.length - tables.length;
  const rest = more > 0 ? [`... and ${more} more`] : [];
  return {
    "text/html": [...tables.map(tableHtml), ...rest].join("\n"),
    "text/plain": [...tables.map(tableText), ...rest].join("\n\n"),
  };
}

/** What a value shows: a result its table, a figure its picture, anything else its structure. */
export function represent(value: unknown): MimeBundle {
  if (isFigure(value)) return figureBundle(value);
  if (isResult(value)) return resultBundle([value]);
  if (Array.isArray(value) && value.length > 0 && value.every(isResult)) return resultBundle(value);
  return { "text/plain": inspect(value, { depth: 4, maxArrayLength: 100, breakLength: 100 }) };
}

/** The text form alone, for a script that prints. */
export function representAsText(value: unknown): string {
  if (isFigure(value)) return figureText(value);
  return String(represent(value)["text/plain"]);
}
