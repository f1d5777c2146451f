import { createHash } from "node:crypto";
import type { Figure } from "../../src/plots/figure";
import type { MimeBundle } from "../cellOutput";
import { cautionsHtml, methodsHtml } from "../display/judgment";
import { dataUrl, escapeHtml, scriptJson } from "../display/markup";
import { resultStyle } from "../display/resultStyle";
import { sizedLayout } from "./figure";
import { figureScript } from "./figureScript";
import { figureText } from "./figureText";
import { figureSvg } from "./svg";

const config = { responsive: true, displaylogo: false };

/** The same figure gets the same mark in every run, so that notebooks do not change without need. */
function markOf(plot: object): string {
  return createHash("sha256").update(JSON.stringify(plot)).digest("hex").slice(0, 12);
}

/** A figure as plotly JSON, as HTML that holds the picture and a script that makes it live, as picture and as text. */
export function figureBundle(figure: Figure): MimeBundle {
  const layout = sizedLayout(figure);
  const plot = { data: figure.data, layout, config };
  const svg = figureSvg(plot);
  const mark = markOf(plot);
  const words = escapeHtml(figure.alt);
  const picture =
    svg === undefined
      ? `<p>${words}</p>`
      : `<img alt="${words}" width="${layout.width}" height="${layout.height}" src="${dataUrl("image/svg+xml", svg)}">`;
  const html = [
    `<div class="rb-result">${resultStyle}${cautionsHtml(figure.cautions)}`,
    `<figure class="rb-figure"><div data-rb-figure="${mark}">${picture}</div></figure>`,
    `${methodsHtml(figure.methods)}</div>`,
    `<script>(${figureScript})(${scriptJson(mark)},${scriptJson(plot)})</script>`,
  ].join("");
  return {
    "application/vnd.plotly.v1+json": plot,
    "text/html": html,
    ...(svg === undefined ? {} : { "image/svg+xml": svg }),
    "text/plain": figureText(figure),
  };
}

/** HTML of a figure without its script: the picture alone. */
export function stillHtml(html: string): string {
  return html.replace(/<script>[\s\S]*?<\/script>/g, "");
}
