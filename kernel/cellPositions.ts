import { SourceMap, type SourceMapPayload } from "node:module";

/** Where a statement stands in the cell as typed, both from 1. */
export interface CellPosition {
  readonly line: number;
  readonly column: number;
}

/** Finds the typed position of a position in the code that ran. */
export type PositionFinder = (line: number, column: number) => CellPosition | undefined;

const inlineMap = /\n?\/\/# sourceMappingURL=data:application\/json;base64,([A-Za-z0-9+/=]+)\s*$/;

/** Takes the inline source map off compiled code. */
export function takeInlineMap(code: string): { code: string; map?: SourceMap } {
  const found = inlineMap.exec(code);
  if (found === null) return { code };
  const payload = Buffer.from(found[1]!, "base64").toString("utf8");
  return { code: code.slice(0, found.index), map: new SourceMap(JSON.parse(payload) as SourceMapPayload) };
}

function step(map: SourceMap, line: number, column: number): { line: number; column: number } | undefined {
  const entry = map.findEntry(line, column);
  return "originalLine" in entry ? { line: entry.originalLine, column: entry.originalColumn } : undefined;
}

/** How the code that ran differs from what the compiler gave out, and that from the cell. */
export interface Surroundings {
  /** Characters put before the first line that ran. */
  readonly prefixColumns: number;
  /** Lines of compiled code; a line after them belongs to the wrapping. */
  readonly lines: number;
  /** Lines put before the cell in the text that was compiled. */
  readonly addedLines: number;
}

/** Follows the two compilations of a cell back. */
export function positionFinder(first: SourceMap, second: SourceMap, around: Surroundings): PositionFinder {
  return (line, column) => {
    if (line > around.lines) return undefined;
    const middle = step(second, line - 1, column - 1 - (line === 1 ? around.prefixColumns : 0));
    const typed = middle === undefined ? undefined : step(first, middle.line, middle.column);
    if (typed === undefined || typed.line < around.addedLines) return undefined;
    return { line: typed.line - around.addedLines + 1, column: typed.column + 1 };
  };
}
