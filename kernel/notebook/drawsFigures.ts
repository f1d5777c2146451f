import * as fs from "node:fs";
import * as path from "node:path";
import { packageForNotebook } from "../packageRoot";
import { isCode, type Notebook } from "./notebookFormat";

/** Names of the functions that make figures: the package has a file for each. */
function figureNames(packageFolder: string): string[] {
  const folder = path.join(packageFolder, "dist", "src", "plots");
  if (!fs.existsSync(folder)) return [];
  return fs
    .readdirSync(folder)
    .filter((file) => /^\w+\.js$/.test(file))
    .map((file) => path.basename(file, ".js"));
}

/** Whether a notebook calls a function that makes a figure; then the drawing thread is started with the run. */
export function drawsFigures(notebook: Notebook, folder: string): boolean {
  const names = figureNames(packageForNotebook(folder));
  const call = new RegExp(`\\brb\\.(${names.join("|")})\\s*\\(`);
  return names.length > 0 && notebook.cells.some((cell) => isCode(cell) && call.test(cell.source));
}
