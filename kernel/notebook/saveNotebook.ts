import { bundleText, type MimeBundle } from "../cellOutput";
import { stillHtml } from "../figures/figureBundle";
import { plotlyLoader, showsFigure } from "../figures/plotlyLoader";
import { isCode, type Notebook, type Output } from "./notebookFormat";
import { notebookText, writeWhole } from "./notebookFile";

/** Applies a change to the HTML of every figure, in order. */
function withFigureHtml(notebook: Notebook, change: (html: string) => string): Notebook {
  const changed = (data: MimeBundle): MimeBundle =>
    showsFigure(data) ? { ...data, "text/html": change(bundleText(data, "text/html")) } : data;
  const output = (given: Output): Output =>
    "data" in given ? { ...given, data: changed(given.data) } : given;
  const cells = notebook.cells.map((cell) =>
    isCode(cell) ? { ...cell, outputs: cell.outputs.map(output) } : cell,
  );
  return { ...notebook, cells };
}

/** The first figure brings plotly.js for all. */
function withLoader(notebook: Notebook): Notebook {
  let isFirst = true;
  return withFigureHtml(notebook, (html) => {
    const loaded = isFirst ? plotlyLoader() + html : html;
    isFirst = false;
    return loaded;
  });
}

/** Writes an executed notebook; with `stillFigures` without plotly.js and small, its figures being pictures alone. */
export function saveNotebook(file: string, notebook: Notebook, stillFigures: boolean): void {
  const saved = stillFigures ? withFigureHtml(notebook, stillHtml) : withLoader(notebook);
  writeWhole(file, notebookText(saved));
}
