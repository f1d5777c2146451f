import { escapeHtml } from "../display/markup";
import { resultStyle } from "../display/resultStyle";
import { plotlyLoader, showsFigure } from "../figures/plotlyLoader";
import { type CodeCell, isCode, type Notebook } from "../notebook/notebookFormat";
import type { NotebookRun, RunFailure } from "../notebook/runNotebook";
import { outputHtml } from "./outputHtml";
import { proseHtml } from "./prose";
import { reportStyle } from "./reportStyle";

/** Where a report comes from. */
export interface ReportOrigin {
  /** The notebook's file name. */
  readonly name: string;
  /** The notebook's folder: pictures named in its prose are found from there. */
  readonly folder: string;
  readonly date: Date;
}

/** Before printing, what is folded is opened, but for the code. */
const openForPrint =
  '<script>addEventListener("beforeprint",function(){document.querySelectorAll("details.rb-methods").forEach(function(d){d.open=true})})</script>';

/** Keeps the page from asking for anything outside itself. */
const policy =
  "default-src 'none'; img-src data: blob:; style-src 'unsafe-inline'; script-src 'unsafe-inline' 'unsafe-eval' blob:; font-src data:";

function cellHtml(cell: CodeCell): string {
  const code = `<details class="code"><summary>code of cell ${cell.execution_count ?? "that did not run"}</summary><pre>${escapeHtml(cell.source)}</pre></details>`;
  const outputs = cell.outputs.map((output) => `<div class="output">${outputHtml(output)}</div>`);
  return `<div class="cell">${code}${outputs.join("\n")}</div>`;
}

function firstHeading(notebook: Notebook): string | undefined {
  for (const { cell_type: type, source } of notebook.cells) {
    const found = type === "markdown" ? /^#\s+(.+?)\s*$/m.exec(source) : null;
    if (found !== null) return found[1];
  }
  return undefined;
}

/** Local date and time as a person writes them, the offset from UTC with it. */
function dateText(date: Date): string {
  const offset = -date.getTimezoneOffset();
  const local = new Date(date.getTime() + offset * 60_000).toISOString().slice(0, 16).replace("T", " ");
  const hours = String(Math.floor(Math.abs(offset) / 60)).padStart(2, "0");
  const minutes = String(Math.abs(offset) % 60).padStart(2, "0");
  return `${local} (UTC${offset < 0 ? "-" : "+"}${hours}:${minutes})`;
}

function headerHtml(run: NotebookRun, title: string, { name, date }: ReportOrigin): string {
  const versions = Object.entries(run.versions).map(([what, version]) => `${what} ${version}`);
  const parameters = run.parameters.map(
    ({ name: parameter, value }) =>
      `<dt>${escapeHtml(parameter)}</dt><dd><code>${escapeHtml(value)}</code></dd>`,
  );
  return [
    `<header><p class="origin">${escapeHtml(name)} &middot; run ${escapeHtml(dateText(date))}</p>`,
    `<h1>${escapeHtml(title)}</h1>`,
    parameters.length === 0 ? "" : `<dl aria-label="parameters of this run">${parameters.join("")}</dl>`,
    `<p class="origin">${escapeHtml(versions.join(", "))}</p></header>`,
  ].join("");
}

function failureHtml({ number, title, error }: RunFailure): string {
  const where = `cell ${number}, ${title}`;
  return `<div class="failure" role="alert"><strong>This run did not finish.</strong> ${escapeHtml(where)}<br>${escapeHtml(`${error.ename}: ${error.evalue}`)}</div>`;
}

function hasFigure(notebook: Notebook): boolean {
  return notebook.cells
    .filter(isCode)
    .some((cell) => cell.outputs.some((output) => "data" in output && showsFigure(output.data)));
}

/** A run as one self-contained HTML page that opens offline; figures are live, plotly.js is in it once. */
export function reportPage(run: NotebookRun, origin: ReportOrigin): string {
  const heading = firstHeading(run.notebook);
  const title = heading ?? origin.name.replace(/\.ipynb$/, "");
  const body = run.notebook.cells.map((cell) => {
    if (isCode(cell)) return cell.source.trim() === "" ? "" : cellHtml(cell);
    return cell.cell_type === "raw"
      ? ""
      : `<section class="prose">${proseHtml(cell, origin.folder)}</section>`;
  });
  // The notebook's own first heading is the report's.
  const prose = heading === undefined ? body : withoutFirstHeading(body);
  return [
    `<!doctype html>\n<html lang="en">\n<head>\n<meta charset="utf-8">\n<meta name="viewport" content="width=device-width, initial-scale=1">`,
    `<meta http-equiv="Content-Security-Policy" content="${policy}">\n<title>${escapeHtml(title)}</title>`,
    reportStyle,
    resultStyle,
    openForPrint,
    `</head>\n<body>\n${headerHtml(run, title, origin)}`,
    run.failure === undefined ? "" : failureHtml(run.failure),
    `<main>\n${prose.join("\n")}\n</main>`,
    hasFigure(run.notebook) ? plotlyLoader() : "",
    `</body>\n</html>\n`,
  ].join("\n");
}

function withoutFirstHeading(body: readonly string[]): string[] {
  const at = body.findIndex((html) => html.includes("<h1>"));
  return body.map((html, i) => (i === at ? html.replace(/<h1>[\s\S]*?<\/h1>/, "") : html));
}
