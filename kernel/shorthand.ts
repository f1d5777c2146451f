import type { CellPosition } from "./cellPositions";

type Compiler = typeof import("@tslab/typescript-for-tslab");

/** A cell with what was put into it. */
export interface WrittenOut {
  readonly code: string;
  /** The place in the cell as typed. */
  readonly typed: (position: CellPosition) => CellPosition;
}

interface Insertion {
  readonly offset: number;
  readonly text: string;
}

function insertions(compiler: Compiler, code: string): Insertion[] {
  const file = compiler.createSourceFile("cell.ts", code, compiler.ScriptTarget.Latest, true);
  const found: Insertion[] = [];
  const visit = (node: import("@tslab/typescript-for-tslab").Node): void => {
    if (compiler.isShorthandPropertyAssignment(node)) {
      found.push({ offset: node.name.getEnd(), text: `: ${node.name.text}` });
    }
    compiler.forEachChild(node, visit);
  };
  visit(file);
  return found;
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
export function writeOutShorthand(compiler: Compiler, code: string): WrittenOut {
  const found = insertions(compiler, code);
  if (found.length === 0) return { code, typed: (position) => position };
  let written = "";
  let from = 0;
  const lines = new Map<number, { column: number; length: number }[]>();
  for (const { offset, text } of found) {
    written += code.slice(from, offset) + text;
    from = offset;
    const before = code.slice(0, offset).split("\n");
    const line = lines.get(before.length) ?? [];
    line.push({ column: before[before.length - 1]!.length, length: text.length });
    lines.set(before.length, line);
  }
  return {
    code: written + code.slice(from),
    typed: ({ line, column }) => ({ line, column: column - added(lines.get(line) ?? [], column - 1) }),
  };
}
