import * as fs from "node:fs";
import * as path from "node:path";
import { gunzipSync } from "node:zlib";
import { ownPackage } from "../packageRoot";

/** The minified and compressed plotly.js that the build leaves in dist. */
export function plotlyFile(): string {
  return path.join(ownPackage(), "dist", "kernel", "plotly.min.js.gz");
}

/** plotly.js as compressed bytes; undefined when the build has not made them. */
export function readPlotlyBytes(): Buffer | undefined {
  return fs.existsSync(plotlyFile()) ? fs.readFileSync(plotlyFile()) : undefined;
}

/** plotly.js as text: that of the build, else that of its package. */
export function readPlotlySource(): string {
  const bytes = readPlotlyBytes();
  return bytes === undefined
    ? fs.readFileSync(require.resolve("plotly.js-dist"), "utf8")
    : gunzipSync(bytes).toString("utf8");
}
