import type { MimeBundle } from "../cellOutput";
import { readPlotlyBytes } from "./plotlySource";

/**
 * Runs in the page: unpacks plotly.js and defines window.Plotly, once. The module systems that a page may have are
 * hidden from it, so that it becomes a plain global.
 */
const unpack = [
  "(function(packed){if(window.Plotly||window.refluxbookPlotly)return;window.refluxbookPlotly=true;",
  "var bytes=Uint8Array.from(atob(packed),function(c){return c.charCodeAt(0)});",
  'new Response(new Blob([bytes]).stream().pipeThrough(new DecompressionStream("gzip"))).text().then(function(code){',
  'var found=new Function("define","module","exports","require",code+"\\n;return this.Plotly||window.Plotly").call(window);',
  "window.Plotly=found||window.Plotly})",
  '["catch"](function(error){window.refluxbookPlotly=false;console.error(error)})})',
].join("");

/** HTML that brings plotly.js (MIT licence, notice inside) into a page without a network; empty before a build. */
export function plotlyLoader(): string {
  const bytes = readPlotlyBytes();
  return bytes === undefined ? "" : `<script>${unpack}("${bytes.toString("base64")}")</script>`;
}

/** Whether an output is a figure. */
export function showsFigure(bundle: MimeBundle): boolean {
  return bundle["application/vnd.plotly.v1+json"] !== undefined;
}
