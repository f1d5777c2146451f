/** Build step: minifies and compresses plotly.js once, for notebooks, reports and still pictures. */
import * as fs from "node:fs";
import { gzipSync } from "node:zlib";
import { plotlyFile } from "../figures/plotlySource";

interface Minifier {
  minify(name: string, code: string, options: object): Promise<{ code: string }>;
}

/** Named through a variable: its declarations need another module resolution than this project's. */
const minifier: string = "vite";

async function minifyPlotly(): Promise<void> {
  const source = require.resolve("plotly.js-dist");
  const target = plotlyFile();
  const isCurrent = fs.existsSync(target) && fs.statSync(target).mtimeMs > fs.statSync(source).mtimeMs;
  if (isCurrent) return;
  const { minify } = (await import(minifier)) as Minifier;
  const full = fs.readFileSync(source, "utf8");
  const licence = /^\/\*\*[\s\S]*?\*\//.exec(full)?.[0];
  if (licence === undefined) throw new Error("plotly.js no longer begins with its licence notice");
  const { code } = await minify("plotly.js", full, { compress: true, mangle: true });
  fs.writeFileSync(target, gzipSync(`${licence}\n${code}`, { level: 9 }));
}

void minifyPlotly();
