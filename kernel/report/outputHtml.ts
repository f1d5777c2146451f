import { dataUrl, escapeHtml } from "../display/markup";
import { bundleText } from "../cellOutput";
import { resultStyle } from "../display/resultStyle";
import type { Output } from "../notebook/notebookFormat";

const pictures = ["image/png", "image/jpeg", "image/gif"];

/** Terminal color codes, which some libraries print. */

const colorCodes = /\u001b\[[0-9;]*m/g;

function preformatted(text: string, css: string): string {
  return `<pre class="${css}">${escapeHtml(text.replace(colorCodes, ""))}</pre>`;
}

/** One output as HTML; the style of results stands once in the page's head. */
export function outputHtml(output: Output): string {
  if (output.output_type === "stream") return preformatted(output.text, output.name);
  if (output.output_type === "error") return preformatted(output.traceback.join("\n"), "error");
  const text = (type: string): string => bundleText(output.data, type);
  if (text("text/html") !== "") return text("text/html").replaceAll(resultStyle, "");
  if (text("image/svg+xml") !== "") {
    return `<img alt="" src="${dataUrl("image/svg+xml", text("image/svg+xml"))}">`;
  }
  const picture = pictures.find((type) => text(type) !== "");
  if (picture !== undefined)
    return `<img alt="" src="data:${picture};base64,${text(picture).replace(/\s/g, "")}">`;
  return preformatted(text("text/plain"), "value");
}
