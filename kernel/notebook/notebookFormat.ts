import type { MimeBundle } from "../cellOutput";

/** Outputs of a cell as notebook files store them (format 4.5); text is kept as one string until it is written. */
export type Output =
  | { output_type: "stream"; name: "stdout" | "stderr"; text: string }
  | { output_type: "display_data"; data: MimeBundle; metadata: object }
  | { output_type: "execute_result"; execution_count: number; data: MimeBundle; metadata: object }
  | { output_type: "error"; ename: string; evalue: string; traceback: readonly string[] };

/** What every cell carries; `tags` mark the parameters cell and cells that are meant to fail. */
export interface CellMetadata {
  readonly tags?: readonly string[];
}

/** A cell of code with what it gave out. */
export interface CodeCell {
  readonly cell_type: "code";
  readonly id: string;
  readonly metadata: CellMetadata;
  readonly source: string;
  execution_count: number | null;
  outputs: Output[];
}

/** A cell of prose. */
export interface ProseCell {
  readonly cell_type: "markdown" | "raw";
  readonly id: string;
  readonly metadata: CellMetadata;
  readonly source: string;
  /** Pictures pasted into the cell, by name and media type. */
  readonly attachments?: Readonly<Record<string, Readonly<Record<string, string>>>>;
}

/** A notebook in memory. */
export interface Notebook {
  readonly metadata: Readonly<Record<string, unknown>>;
  readonly cells: readonly (CodeCell | ProseCell)[];
}

/** Whether a cell is code. */
export function isCode(cell: CodeCell | ProseCell): cell is CodeCell {
  return cell.cell_type === "code";
}

/** Whether a cell carries a tag. */
export function hasTag(cell: CodeCell | ProseCell, tag: string): boolean {
  return cell.metadata.tags?.includes(tag) === true;
}
