import { formatNumber } from "../base/displayUnits";
import { requireResult } from "../base/resultKind";
import type { ShortcutDesign } from "../column/shortcutDesignResult";
import { type Figure, figure } from "./figure";
import { axis, baseLayout, note, palette, titled } from "./theme";

/**
 * Gilliland's curve with the operating point of a design.
 *
 * @param design - what `shortcutDesign` gave
 * @returns a figure; nothing is calculated here
 * @throws DesignInputError for anything else
 * Source: E. R. Gilliland, Ind. Eng. Chem. 32 (1940) 1220.
 * @example gillilandDiagram(shortcutDesign({ feed: { flow: 100, composition: { a: 0.3, b: 0.3, c: 0.4 }, q: 1 }, relativeVolatility: { a: 4, b: 2, c: 1 }, lightKey: "a", heavyKey: "b", lightKeyRecovery: 0.99, heavyKeyRecovery: 0.99, refluxOverMinimum: 1.2 })).name // "gillilandDiagram"
 */
export function gillilandDiagram(design: ShortcutDesign): Figure {
  requireResult("design", design, "shortcutDesign");
  const { gilliland } = design.curves;
  const [x, y] = gilliland.point;
  const title = "Gilliland's correlation and the operating point";
  const data = [
    {
      type: "scatter",
      mode: "lines",
      x: gilliland.x,
      y: gilliland.y,
      name: `form of ${design.correlation[0]!.toUpperCase()}${design.correlation.slice(1)}`,
      line: { color: palette.lake, width: 2.5 },
      hovertemplate: "X %{x:.3f}<br>Y %{y:.3f}<extra></extra>",
    },
    {
      type: "scatter",
      mode: "lines",
      x: [x, x, 0],
      y: [0, y, y],
      name: "reading",
      line: { color: palette.stone, width: 1.2, dash: "dot" },
      hoverinfo: "skip",
      showlegend: false,
    },
    {
      type: "scatter",
      mode: "markers",
      x: [x],
      y: [y],
      name: "this design",
      marker: { symbol: "diamond", size: 12, color: palette.ochre, line: { color: palette.ink, width: 1 } },
    },
  ];
  const words = [
    `X = <b>${formatNumber(x, 3)}</b>, Y = <b>${formatNumber(y, 3)}</b>`,
    `${formatNumber(design.stages, 3)} stages`,
  ];
  const layout = {
    ...baseLayout(700, 450),
    title: titled(title, "published columns scatter about the curve by several percent of the stages"),
    xaxis: axis("X = (R − R<sub>min</sub>)/(R + 1)", { range: [0, 1] }),
    yaxis: axis("Y = (N − N<sub>min</sub>)/(N + 1)", { range: [0, 0.85] }),
    annotations: [
      note(words.join("<br>"), {
        xref: "paper",
        yref: "paper",
        x: 0.985,
        y: 0.97,
        xanchor: "right",
        yanchor: "top",
      }),
    ],
  };
  return figure(
    { name: "gillilandDiagram", title, data, layout, alt: `${title}. ${words.join("; ")}.` },
    design,
  );
}
