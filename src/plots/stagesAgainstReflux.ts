import { formatNumber } from "../base/displayUnits";
import { requireResult } from "../base/resultKind";
import type { ShortcutDesign } from "../column/shortcutDesignResult";
import { type Figure, figure } from "./figure";
import { axis, baseLayout, note, palette, titled } from "./theme";

const limitLine = (
  x: readonly number[],
  y: readonly number[],
  name: string,
  color: string,
  dash: string,
) => ({
  type: "scatter",
  mode: "lines",
  x,
  y,
  name,
  line: { color, width: 1.6, dash },
  hoverinfo: "skip",
});

/**
 * Stages against reflux ratio of a design, between its two limits: minimum reflux on the left, minimum stages below,
 * with the chosen point.
 *
 * @param design - what `shortcutDesign` gave
 * @returns a figure; nothing is calculated here
 * @throws DesignInputError for anything else
 * Source: E. R. Gilliland, Ind. Eng. Chem. 32 (1940) 1220.
 * @example stagesAgainstReflux(shortcutDesign({ feed: { flow: 100, composition: { a: 0.3, b: 0.3, c: 0.4 }, q: 1 }, relativeVolatility: { a: 4, b: 2, c: 1 }, lightKey: "a", heavyKey: "b", lightKeyRecovery: 0.99, heavyKeyRecovery: 0.99, refluxOverMinimum: 1.2 })).name // "stagesAgainstReflux"
 */
export function stagesAgainstReflux(design: ShortcutDesign): Figure {
  requireResult("design", design, "shortcutDesign");
  const { minimumReflux, minimumStages, refluxRatio, stages, lightKey, heavyKey, curves } = design;
  const title = `Stages against reflux: ${lightKey} / ${heavyKey}`;
  const right = Math.max(2.2 * refluxRatio, 2.5 * minimumReflux, 0.5);
  const top = Math.max(1.5 * stages, 3.2 * minimumStages);
  const left = Math.max(0, minimumReflux - 0.12 * (right - minimumReflux));
  const data = [
    limitLine(
      [left, right],
      [minimumStages, minimumStages],
      "minimum stages (total reflux)",
      palette.plum,
      "dash",
    ),
    limitLine([minimumReflux, minimumReflux], [0, top], "minimum reflux", palette.brick, "dashdot"),
    {
      type: "scatter",
      mode: "lines",
      x: curves.stagesAgainstReflux.refluxRatio,
      y: curves.stagesAgainstReflux.stages,
      name: "Gilliland's correlation",
      line: { color: palette.lake, width: 2.5 },
      hovertemplate: "reflux ratio %{x:.3f}<br>%{y:.1f} stages<extra></extra>",
    },
    rangeBar(design),
    {
      type: "scatter",
      mode: "markers",
      x: [refluxRatio],
      y: [stages],
      name: "this design",
      marker: { symbol: "diamond", size: 12, color: palette.ochre, line: { color: palette.ink, width: 1 } },
      hovertemplate: "reflux ratio %{x:.3f}<br>%{y:.1f} stages<extra></extra>",
    },
  ];
  const words = [
    `<b>${formatNumber(stages, 3)} stages</b> at reflux ratio <b>${formatNumber(refluxRatio, 3)}</b>`,
    `minimum reflux ${formatNumber(minimumReflux, 3)}`,
    `minimum stages ${formatNumber(minimumStages, 3)}`,
  ];
  const layout = {
    ...baseLayout(700, 470),
    title: titled(title, factorWords(design)),
    xaxis: axis("reflux ratio L/D", { range: [left, right] }),
    yaxis: axis("equilibrium stages, with the reboiler", { range: [0, top] }),
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
    { name: "stagesAgainstReflux", title, data, layout, alt: `${title}. ${words.join("; ")}.` },
    design,
  );
}

function factorWords({ refluxOverMinimum, correlation }: ShortcutDesign): string {
  const form = `Gilliland's correlation in the form of ${correlation[0]!.toUpperCase()}${correlation.slice(1)}`;
  return refluxOverMinimum === null
    ? form
    : `${form}, at ${formatNumber(refluxOverMinimum, 3)} times the minimum reflux`;
}

/** The spread over the correlations and both minimum refluxes, as a bar through the chosen point. */
function rangeBar({ refluxRatio, stages, stagesRange: [low, high] }: ShortcutDesign) {
  return {
    type: "scatter",
    mode: "lines",
    x: [refluxRatio, refluxRatio],
    y: [low, high ?? stages],
    name: high === null ? "range, open above" : "range of the correlations",
    line: { color: palette.ink, width: 4 },
    opacity: 0.45,
    hoverinfo: "skip",
  };
}
