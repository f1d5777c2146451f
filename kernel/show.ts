import { representAsText } from "./display/represent";
import { notebookSession } from "./session";

/**
 * Shows a result as a table or a figure as a picture, in the middle of a cell or of a loop; the last expression of a
 * cell shows by itself. In a plain script it prints the text form. Never throws.
 *
 * @param value - a result, a figure, or anything else
 * @example show({ kind: "note", cautions: [], methods: [] }) // undefined
 */
export function show(value: unknown): void {
  const { show: showInNotebook } = notebookSession();
  if (showInNotebook === undefined) process.stdout.write(`${representAsText(value)}\n`);
  else showInNotebook(value);
}
