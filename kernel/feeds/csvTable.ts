import type { FileFault } from "./feedSource";
import type { Place } from "./place";

/** A text with its place. */
export interface PlacedText {
  readonly text: string;
  readonly place: Place;
}

/** A `# key: value` line. */
export interface Remark {
  readonly key: string;
  readonly value: string;
  readonly place: Place;
}

/** A table file: remarks, a row of headings and the rows below it. */
export interface CsvTable {
  readonly remarks: readonly Remark[];
  readonly header: readonly PlacedText[];
  readonly rows: readonly (readonly PlacedText[])[];
  readonly faults: readonly FileFault[];
}

/** The separator of the first row: tab, semicolon or comma. */
function separatorOf(line: string): string {
  return ["\t", ";", ","].find((mark) => line.includes(mark)) ?? ",";
}

/** A line as cells: plain, or in double quotes with a quote doubled. */
function cellsOf(line: string, number: number, separator: string): PlacedText[] {
  const cells: PlacedText[] = [];
  let start = 0;
  let quoted = false;
  for (let i = 0; i <= line.length; i++) {
    if (line[i] === '"') quoted = !quoted;
    if (i < line.length && (line[i] !== separator || quoted)) continue;
    const raw = line.slice(start, i);
    const text = raw.trim().replace(/^"([\s\S]*)"$/, (_, inner: string) => inner.replace(/""/g, '"'));
    const indent = raw.length - raw.trimStart().length;
    cells.push({ text: text.trim(), place: { line: number, column: start + indent + 1 } });
    start = i + 1;
  }
  return cells;
}

/** A comment line; one without a colon is for people alone. */
function remarkOf(line: string, number: number): Remark[] {
  const found = /^\s*#\s*([^:]*?)\s*:\s*(.*?)\s*$/.exec(line);
  if (found === null) return [];
  const column = line.indexOf(found[2]!, line.indexOf(":")) + 1;
  return [{ key: found[1]!, value: found[2]!, place: { line: number, column: Math.max(column, 1) } }];
}

function raggedRows(header: readonly PlacedText[], rows: readonly (readonly PlacedText[])[]): FileFault[] {
  return rows
    .filter((row) => row.length !== header.length)
    .map((row) => ({
      code: "file-format",
      place: row[0]!.place,
      message: `the row has ${row.length} of the ${header.length} cells that the heading asks for`,
      value: row.map(({ text }) => text).join(),
    }));
}

/** Reads a table; lines that begin with # are remarks, empty lines count for nothing. */
export function readCsv(text: string): CsvTable {
  const numbered = text.split(/\r\n|\n|\r/).map((line, i) => ({ line, number: i + 1 }));
  const isRemark = ({ line }: { line: string }): boolean => /^\s*#/.test(line);
  const remarks = numbered.filter(isRemark).flatMap(({ line, number }) => remarkOf(line, number));
  const body = numbered.filter((each) => !isRemark(each) && each.line.replace(/[\s,;]/g, "") !== "");
  const separator = separatorOf(body[0]?.line ?? "");
  const [header = [], ...rows] = body.map(({ line, number }) => cellsOf(line, number, separator));
  const ragged = raggedRows(header, rows);
  const even = rows.filter((row) => row.length === header.length);
  if (rows.length > 0) return { remarks, header, rows: even, faults: ragged };
  const message = "a row of headings and at least one row of values are needed";
  const place = header[0]?.place ?? { line: 1, column: 1 };
  return {
    remarks,
    header,
    rows: even,
    faults: [{ code: "file-format", place, message, value: text.slice(0, 60) }],
  };
}
