import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll } from "vitest";

/** A folder that is gone after the tests of the file. */
export function temporaryFolder(): string {
  const folder = mkdtempSync(join(tmpdir(), "refluxbook-kernel-"));
  afterAll(() => rmSync(folder, { recursive: true, force: true }));
  return folder;
}

/** Writes a file into a folder; gives its path. */
export function written(folder: string, name: string, text: string): string {
  const file = join(folder, name);
  writeFileSync(file, text);
  return file;
}

/** A cell of a test notebook: its code, or prose that begins with "#", with tags. */
export interface TestCell {
  readonly source: string;
  readonly tags?: readonly string[];
}

/** The text of a notebook file. */
export function notebookOf(...cells: readonly (string | TestCell)[]): string {
  const stored = cells.map((cell, i) => {
    const { source, tags = [] } = typeof cell === "string" ? { source: cell } : cell;
    const common = { id: `cell-${i}`, metadata: tags.length > 0 ? { tags } : {}, source };
    return source.startsWith("#")
      ? { cell_type: "markdown", ...common }
      : { cell_type: "code", execution_count: null, outputs: [], ...common };
  });
  return JSON.stringify({ cells: stored, metadata: {}, nbformat: 4, nbformat_minor: 5 });
}
