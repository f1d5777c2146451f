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

/**
 * Follows the two compilations of a cell back. `prefixColumns` characters stand before the first line of the code
 * that ran, and `addedLines` lines before the cell in the text that was compiled.
 */
export function positionFinder(
  first: SourceMap,
  second: SourceMap,
  prefixColumns: number,
  addedLines: number,
): PositionFinder {
  return (line, column) => {
    const middle = step(second, line - 1, column - 1 - (line === 1 ? prefixColumns : 0));
    const typed = middle === undefined ? undefined : step(first, middle.line, middle.column);
    if (typed === undefined || typed.line < addedLines) return undefined;
    return { line: typed.line - addedLines + 1, column: typed.column + 1 };
  };
}
