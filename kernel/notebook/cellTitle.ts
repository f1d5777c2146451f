import { isCode, type CodeCell, type Notebook } from "./notebookFormat";

/** The last heading of a text in Markdown. */
function lastHeading(source: string): string | undefined {
  return [...source.matchAll(/^#{1,6}\s+(.+?)\s*#*$/gm)].at(-1)?.[1];
}

/** The first line of code that is no comment, shortened. */
export function firstLine(cell: CodeCell): string {
  const line =
    cell.source
      .split("\n")
      .find((text) => !/^\s*(\/\/.*)?$/.test(text))
      ?.trim() ?? "";
  return line.length > 70 ? `${line.slice(0, 67)}...` : line;
}

/** The heading above a cell, else its first line: how a person knows it. */
export function cellTitle(notebook: Notebook, cell: CodeCell): string {
  const above = notebook.cells.slice(0, notebook.cells.indexOf(cell)).filter((other) => !isCode(other));
  const headings = above.map(({ source }) => lastHeading(source)).filter((text) => text !== undefined);
  return headings.at(-1) ?? firstLine(cell);
}
