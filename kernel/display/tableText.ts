import type { ResultTable, TableSection } from "../../src/study/resultTable";
import { cautionLines, methodLines } from "./judgment";

function sectionLines({ heading, columns, rows, numeric }: TableSection): string[] {
  const lines = [columns, ...rows];
  const widths = columns.map((_, i) => Math.max(...lines.map((line) => (line[i] ?? "").length)));
  const aligned = lines.map((line) =>
    line
      .map((text, i) => (numeric[i] === true ? text.padStart(widths[i]!) : text.padEnd(widths[i]!)))
      .join("  ")
      .trimEnd(),
  );
  return ["", ...(heading === undefined ? [] : [heading]), ...aligned];
}

/** A result table as aligned text. */
export function tableText(table: ResultTable): string {
  const methods = methodLines(table.methods);
  return [
    table.title,
    ...cautionLines(table.cautions),
    ...table.sections.flatMap(sectionLines),
    ...(methods.length === 0 ? [] : ["", ...methods]),
  ].join("\n");
}
