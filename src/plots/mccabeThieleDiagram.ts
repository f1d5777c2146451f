import { readChoice } from "../base/check";
import { formatNumber } from "../base/displayUnits";
import { type Issue, refuseIfFaulty } from "../base/errors";
import type { McCabeThiele } from "../column/mccabeThiele";
import { belowDiagonal } from "./belowDiagonal";
import { type DiagramAxes, endAxes, wholeAxes } from "./diagramAxes";
import { type Figure, figure } from "./figure";
import {
  curveShape,
  type FigureOptions,
  fractionText,
  pressureText,
  readOptions,
  readResult,
} from "./figureInput";
import { plainText, shortName } from "./plainText";
import { stageCorners, stageNumbers } from "./stageNumbers";
import { baseLayout, chosen, line, marks, palette, square } from "./theme";

/** How a McCabe-Thiele diagram is drawn. */
export interface McCabeThieleDiagramOptions extends FigureOptions {
  /** Draws one end on logarithmic axes, where a high purity crowds the steps. */
  readonly zoom?: "distillate" | "bottoms";
}

const shape = {
  curves: {
    equilibrium: curveShape,
    operatingLines: [curveShape],
    qLines: [curveShape],
    staircase: curveShape,
  },
  steps: [{ stage: 0, x: 0, y: 0 }],
  feedStages: [0],
  pinch: [0],
  minimumRefluxLimitedBy: "",
  "pair?": { light: "", heavy: "" },
  "pressure?": 0,
  "relativeVolatility?": 0,
  "murphreeVaporEfficiency?": 0,
  condenser: "",
  reboiler: "",
  refluxRatio: 0,
  refluxOverMinimum: null,
  minimumReflux: 0,
  minimumStages: 0,
  stages: 0,
  stagesWhole: 0,
  distillateLightFraction: 0,
  bottomsLightFraction: 0,
} as const;

/**
 * McCabe-Thiele diagram of a result of `mccabeThiele`: equilibrium curve, operating lines, q-line and staircase, with
 * the feed stage and the pinch at minimum reflux marked and reflux, stages and their minima written beside.
 *
 * @param result - what `mccabeThiele` gave
 * @param options - `zoom`: "distillate" or "bottoms" draws that end on logarithmic axes, on which the steps of a high
 * purity are readable; `units` of the pressure
 * @returns a figure; nothing is calculated here
 * @throws DesignInputError for anything else than a result of `mccabeThiele`
 * Source: W. L. McCabe and E. W. Thiele, Ind. Eng. Chem. 17 (1925) 605; logarithmic ends: common practice.
 * @example mccabeThieleDiagram(mccabeThiele({ relativeVolatility: 2.5, feed: { lightFraction: 0.5, q: 1 }, distillateLightFraction: 0.95, bottomsLightFraction: 0.05, refluxRatio: 1.8 })).kind // "figure"
 */
export function mccabeThieleDiagram(result: McCabeThiele, options: McCabeThieleDiagramOptions = {}): Figure {
  const faults: Issue[] = [];
  readResult(faults, "result", result, "mccabeThiele", shape);
  const { fields, units } = readOptions(faults, options, ["zoom"]);
  const zoom = readChoice(faults, "options.zoom", fields["zoom"], ["none", "distillate", "bottoms"]);
  refuseIfFaulty(faults);
  const { pair } = result;
  const axes = axesOf(result, zoom);
  const facts = factsOf(result);
  const title =
    pair === undefined
      ? "McCabe-Thiele diagram"
      : `McCabe-Thiele: ${shortName(pair.light, 22)} / ${shortName(pair.heavy, 22)}`;
  const shown = zoom === "none" ? columnOf(result) : `${zoom} end on logarithmic axes`;
  return figure(
    {
      name: "mccabeThieleDiagram",
      title,
      subtitle: `${basisOf(result, units)}, ${shown}`,
      facts,
      data: linesOf(result, axes),
      layout: {
        ...baseLayout(square),
        xaxis: axes.xaxis,
        yaxis: axes.yaxis,
        ...belowDiagonal(facts, stageNumbers(result, drawnStages(result), axes)),
      },
    },
    result,
  );
}

function axesOf(result: McCabeThiele, zoom: "none" | "distillate" | "bottoms"): DiagramAxes {
  const { pair, steps, distillateLightFraction, bottomsLightFraction } = result;
  const light = plainText(shortName(pair?.light ?? "light component"));
  const heavy = plainText(shortName(pair?.heavy ?? "heavy component"));
  if (zoom === "none") return wholeAxes(light);
  const lastLiquid = steps[steps.length - 1]?.x ?? bottomsLightFraction;
  const least =
    zoom === "distillate" ? 1 - distillateLightFraction : Math.min(lastLiquid, bottomsLightFraction);
  return endAxes(zoom, Math.max(least, 1e-15), light, heavy);
}

function linesOf(result: McCabeThiele, axes: DiagramAxes): Figure["data"] {
  const { curves, steps, feedStages, pinch, minimumRefluxLimitedBy } = result;
  const drawn = drawnStages(result);
  const corner = axes.drawn;
  const [pinchX, pinchY] = pinch;
  const fed = feedStages.map((stage) => steps[stage - 1]).filter((step) => step !== undefined);
  const many = steps.length > drawn ? ` (${drawn} of ${steps.length})` : "";
  return [
    line(
      axes.curve({ x: [0, 1], y: [0, 1] }),
      "y = x",
      { color: palette.slate, width: 1, dash: "dot" },
      unlisted,
    ),
    line(axes.curve(curves.equilibrium), "equilibrium", { color: palette.spruce, width: 2.6 }),
    ...curves.operatingLines.map((each, k) =>
      line(
        axes.curve(each),
        "operating lines",
        { color: palette.rust, dash: "12px,3px" },
        oncePer("operating", k),
      ),
    ),
    ...curves.qLines.map((each, k) =>
      line(axes.curve(each), "q-line", { color: palette.iris, dash: "dashdot" }, oncePer("feed", k)),
    ),
    line({ x: curves.staircase.x.map(corner), y: curves.staircase.y.map(corner) }, `stages${many}`, {
      color: palette.ink,
      width: steps.length > 60 ? 0.8 : 1.2,
    }),
    stageCorners(result, drawn, axes),
    ...(minimumRefluxLimitedBy === "vanishing-flow" ? [] : [pinchMark(corner(pinchX), corner(pinchY))]),
    marks(
      fed.map(({ x }) => corner(x)),
      fed.map(({ y }) => corner(y)),
      "feed stage",
      chosen,
    ),
  ];
}

/** A staircase of very many stages is carried in part. */
function drawnStages({ steps, curves }: McCabeThiele): number {
  return Math.min(steps.length, Math.floor((curves.staircase.x.length - 1) / 2));
}

const unlisted = { showlegend: false } as const;

function oncePer(legendgroup: string, k: number) {
  return { legendgroup, showlegend: k === 0 };
}

function pinchMark(x: number, y: number) {
  const marker = { symbol: "circle-open", size: 10, color: palette.rust, line: { width: 2 } };
  return marks([x], [y], "pinch at minimum reflux", marker);
}

function factsOf(result: McCabeThiele): string[] {
  const { refluxRatio, minimumReflux, refluxOverMinimum, stages, stagesWhole, minimumStages } = result;
  const efficiency = result.murphreeVaporEfficiency;
  const times = refluxOverMinimum === null ? "minimum" : `${formatNumber(refluxOverMinimum)} × minimum`;
  return [
    `${stages.toFixed(1)} stages, ${stagesWhole} whole; feed on stage ${result.feedStages.join(" and ")}`,
    `reflux ratio ${formatNumber(refluxRatio)} (${times} ${formatNumber(minimumReflux)})`,
    `minimum stages ${formatNumber(minimumStages, 3)}`,
    ...(efficiency === undefined ? [] : [`Murphree vapor efficiency ${formatNumber(efficiency, 3)}`]),
    `distillate ${fractionText(result.distillateLightFraction)}, bottoms ${fractionText(result.bottomsLightFraction)}`,
  ];
}

function basisOf({ pressure, relativeVolatility }: McCabeThiele, units: "metric" | "SI" | "US"): string {
  if (pressure !== undefined) return `Raoult's law at ${pressureText(pressure, units)}`;
  return relativeVolatility === undefined
    ? "equilibrium curve as given"
    : `relative volatility ${formatNumber(relativeVolatility)}`;
}

function columnOf({ condenser, reboiler }: McCabeThiele): string {
  return `${condenser} condenser, ${reboiler === "open-steam" ? "open steam" : "partial reboiler"}`;
}
