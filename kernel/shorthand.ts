import type { CellPosition } from "./cellPositions";

/** A cell with what was put into it. */
export interface WrittenOut {
  readonly code: string;
  /** The place in the cell as typed. */
  readonly typed: (position: CellPosition) => CellPosition;
}

/** A property in the short form: its name, and the offset of the name's end. */
export interface ShortProperty {
  readonly name: string;
  readonly end: number;
}

/** Columns that insertions of a line have added before a column. */
function added(line: readonly { column: number; length: number }[], column: number): number {
  let sum = 0;
  for (const { column: at, length } of line) {
    if (column > at + sum) sum += Math.min(length, column - at - sum);
  }
  return sum;
}

/**
 * Writes `{ feed }` out as `{ feed: feed }`: tslab finds variables of earlier cells everywhere but in the short form.
 */
export function writeOutShorthand(code: string, found: readonly ShortProperty[]): WrittenOut {
  if (found.length === 0) return { code, typed: (position) => position };
  let written = "";
  let from = 0;
  const lines = new Map<number, { column: number; length: number }[]>();
  for (const { name, end } of found) {
    const text = `: ${name}`;
    written += code.slice(from, end) + text;
    from = end;
    const before = code.slice(0, end).split("\n");
    const line = lines.get(before.length) ?? [];
    line.push({ column: before[before.length - 1]!.length, length: text.length });
    lines.set(before.length, line);
  }
  return {
    code: written + code.slice(from),
    typed: ({ line, column }) => ({ line, column: column - added(lines.get(line) ?? [], column - 1) }),
  };
}
