import { formatNumber } from "../base/displayUnits";
import { readOption, requireResult } from "../base/resultKind";
import type { McCabeThiele } from "../column/mccabeThiele";
import { type Figure, figure } from "./figure";
import { axis, baseLayout, note, palette, squareHeight, titled } from "./theme";

const width = 600;

/** How a McCabe-Thiele diagram is drawn. */
export interface McCabeThieleDiagramOptions {
  /** Draws one end enlarged, where a high purity crowds the steps. */
  readonly zoom?: "distillate" | "bottoms";
}

const line = (curve: { x: readonly number[]; y: readonly number[] }, name: string, style: object) => ({
  type: "scatter",
  mode: "lines",
  x: curve.x,
  y: curve.y,
  name,
  line: style,
  hoverinfo: "skip",
});

/**
 * McCabe-Thiele diagram of a result of `mccabeThiele`: equilibrium curve, operating lines, q-line and staircase, with
 * the feed stage marked and reflux, stages and minimum written beside.
 *
 * @param result - what `mccabeThiele` gave
 * @param options - `zoom` shows one end enlarged
 * @returns a figure; nothing is calculated here
 * @throws DesignInputError for anything else, or another `zoom`
 * Source: W. L. McCabe and E. W. Thiele, Ind. Eng. Chem. 17 (1925) 605.
 * @example mccabeThieleDiagram(mccabeThiele({ relativeVolatility: 2.5, feed: { lightFraction: 0.5, q: 1 }, distillateLightFraction: 0.95, bottomsLightFraction: 0.05, refluxRatio: 1.8 })).kind // "figure"
 */
export function mccabeThieleDiagram(result: McCabeThiele, options: McCabeThieleDiagramOptions = {}): Figure {
  requireResult("result", result, "mccabeThiele");
  const { curves, pair } = result;
  const light = pair?.light ?? "light component";
  const data = [
    line({ x: [0, 1], y: [0, 1] }, "y = x", { color: palette.stone, width: 1, dash: "dot" }),
    line(curves.equilibrium, "equilibrium", { color: palette.lake, width: 2.5 }),
    ...curves.operatingLines.map((each, k) => ({
      ...line(each, "operating lines", { color: palette.brick, width: 2 }),
      showlegend: k === 0,
      legendgroup: "operating",
    })),
    ...curves.qLines.map((each, k) => ({
      ...line(each, "feed (q-line)", { color: palette.plum, width: 2, dash: "dash" }),
      showlegend: k === 0,
      legendgroup: "feed",
    })),
    line(curves.staircase, "stages", { color: palette.ink, width: 1.1 }),
    feedStageMarks(result),
    stageNumbers(result),
  ];
  const words = wordsOf(result);
  const title = pair === undefined ? "McCabe-Thiele diagram" : `McCabe-Thiele: ${pair.light} / ${pair.heavy}`;
  const range = rangeOf(result, readOption("zoom", options, ["distillate", "bottoms"]));
  const layout = {
    ...baseLayout(width, squareHeight(width)),
    title: titled(title, subtitleOf(result)),
    xaxis: axis(`liquid x, mole fraction of ${light}`, { range }),
    yaxis: axis(`vapor y, mole fraction of ${light}`, { range }),
    annotations: [
      note(words.join("<br>"), {
        xref: "paper",
        yref: "paper",
        x: 0.98,
        y: 0.03,
        xanchor: "right",
        yanchor: "bottom",
      }),
    ],
  };
  return figure(
    { name: "mccabeThieleDiagram", title, data, layout, alt: `${title}. ${words.join("; ")}.` },
    result,
  );
}

function subtitleOf({ pressure, relativeVolatility }: McCabeThiele): string {
  if (pressure !== undefined) return `Raoult's law at ${formatNumber(pressure / 1e5)} bar abs`;
  return relativeVolatility === undefined
    ? "equilibrium curve as given"
    : `relative volatility ${formatNumber(relativeVolatility)}`;
}

function wordsOf(result: McCabeThiele): string[] {
  const { refluxRatio, minimumReflux, stages, stagesWhole, feedStages, minimumStages } = result;
  return [
    `<b>${formatNumber(stages, 3)} stages</b>, ${stagesWhole} whole`,
    `feed on stage ${feedStages.join(" and ")}`,
    `reflux ratio <b>${formatNumber(refluxRatio, 3)}</b>, minimum ${formatNumber(minimumReflux, 3)}`,
    `minimum stages ${formatNumber(minimumStages, 3)}`,
  ];
}

function feedStageMarks({ steps, feedStages }: McCabeThiele) {
  const at = feedStages.map((stage) => steps[stage - 1]).filter((step) => step !== undefined);
  return {
    type: "scatter",
    mode: "markers",
    x: at.map(({ x }) => x),
    y: at.map(({ y }) => y),
    name: "feed stage",
    marker: { symbol: "diamond", size: 10, color: palette.ochre, line: { color: palette.ink, width: 1 } },
    hovertemplate: "feed stage<br>x %{x:.4f}<br>y %{y:.4f}<extra></extra>",
  };
}

/** Steps between two numbered stages, so that about twelve are numbered. */
function spacing(count: number): number {
  return [1, 2, 5, 10, 20, 50, 100, 200, 500].find((each) => count / each <= 12) ?? 1000;
}

const isNumbered = (stage: number, every: number): boolean => stage === 1 || stage % every === 0;

/** The corners of the staircase on the curve; every few carry their stage number, the feed stage its own mark. */
function stageNumbers({ steps, feedStages }: McCabeThiele) {
  const drawn = steps.slice(0, 400);
  const every = spacing(drawn.length);
  return {
    type: "scatter",
    mode: "text+markers",
    x: drawn.map(({ x }) => x),
    y: drawn.map(({ y }) => y),
    text: drawn.map(({ stage }) =>
      isNumbered(stage, every) && !feedStages.includes(stage) ? String(stage) : "",
    ),
    textposition: "top left",
    textfont: { size: 11, color: palette.ink },
    marker: { size: 1, color: palette.ink },
    hovertemplate: "stage %{customdata}<br>x %{x:.5f}<br>y %{y:.5f}<extra></extra>",
    customdata: drawn.map(({ stage }) => stage),
    showlegend: false,
    cliponaxis: true,
  };
}

function rangeOf(result: McCabeThiele, zoom: McCabeThieleDiagramOptions["zoom"]): [number, number] {
  const { distillateLightFraction: xD, bottomsLightFraction: xB } = result;
  if (zoom === "distillate") return [Math.max(0, 1 - 6 * (1 - xD)), 1];
  if (zoom === "bottoms") return [0, Math.min(1, 6 * xB)];
  return [0, 1];
}
