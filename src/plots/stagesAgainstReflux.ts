import { formatNumber } from "../base/displayUnits";
import type { ShortcutDesign } from "../column/shortcutDesignResult";
import { type Figure, figure } from "./figure";
import { type FigureOptions, readFigureInput } from "./figureInput";
import { plainText, shortName } from "./plainText";
import { axis, baseLayout, chosen, line, marks, palette, wide, words } from "./theme";

const shape = {
  lightKey: "",
  heavyKey: "",
  correlation: "",
  minimumReflux: 0,
  minimumStages: 0,
  refluxRatio: 0,
  refluxOverMinimum: null,
  stages: 0,
  stagesRange: [null],
  curves: { stagesAgainstReflux: { refluxRatio: [0], stages: [0] } },
} as const;

/**
 * Stages against reflux ratio of a design, between its two limits: minimum reflux on the left, minimum stages below,
 * with the chosen point and the range of its stages.
 *
 * @param design - what `shortcutDesign` gave
 * @param options - `units`, for the sake of likeness: nothing here has a unit system
 * @returns a figure; nothing is calculated here
 * @throws DesignInputError for anything else than a result of `shortcutDesign`
 * Source: E. R. Gilliland, Ind. Eng. Chem. 32 (1940) 1220.
 * @example stagesAgainstReflux(shortcutDesign({ feed: { flow: 100, composition: { a: 0.3, b: 0.3, c: 0.4 }, q: 1 }, relativeVolatility: { a: 4, b: 2, c: 1 }, lightKey: "a", heavyKey: "b", lightKeyRecovery: 0.99, heavyKeyRecovery: 0.99, refluxOverMinimum: 1.2 })).name // "stagesAgainstReflux"
 */
export function stagesAgainstReflux(design: ShortcutDesign, options: FigureOptions = {}): Figure {
  readFigureInput("design", design, "shortcutDesign", shape, options);
  const { minimumReflux, minimumStages, refluxRatio, stages, curves } = design;
  const { right, left, top } = view(design);
  const curve = curves.stagesAgainstReflux;
  const hovertemplate = "reflux ratio %{x:.3f}<br>%{y:.1f} stages<extra></extra>";
  const leastReflux = `minimum reflux ${formatNumber(minimumReflux)}`;
  const leastStages = `minimum stages ${formatNumber(minimumStages, 3)}, at total reflux`;
  const point = pointWords(design);
  return figure(
    {
      name: "stagesAgainstReflux",
      title: `Stages against reflux: ${shortName(design.lightKey)} / ${shortName(design.heavyKey)}`,
      subtitle: `Gilliland's correlation in the form of ${formName(design)}`,
      facts: [...point, leastReflux, leastStages],
      data: [
        line({ x: [left, right], y: [minimumStages, minimumStages] }, "minimum stages", {
          color: palette.iris,
          dash: "dash",
          width: 1.6,
        }),
        line({ x: [minimumReflux, minimumReflux], y: [0, top] }, "minimum reflux", {
          color: palette.rust,
          dash: "dashdot",
          width: 1.6,
        }),
        line(
          { x: curve.refluxRatio, y: curve.stages },
          "Gilliland's correlation",
          { color: palette.spruce, width: 2.6 },
          {
            hoverinfo: "all",
            hovertemplate,
          },
        ),
        rangeBar(design, top),
        marks([refluxRatio], [stages], "this design", chosen, { hoverinfo: "all", hovertemplate }),
      ],
      layout: {
        ...baseLayout(wide),
        xaxis: axis("reflux ratio L/D", "mol/mol", { range: [left, right] }),
        yaxis: axis("equilibrium stages, with the reboiler", "-", { range: [0, top] }),
        annotations: [
          words(leastReflux, minimumReflux, 0, { xanchor: "left", yanchor: "bottom", xshift: 2 }),
          words(leastStages, right, minimumStages, {
            xanchor: "right",
            yanchor: "top",
            xshift: -2,
            yshift: -1,
          }),
          words([`<b>${point[0]}</b>`, ...point.slice(1).map(plainText)].join("<br>"), refluxRatio, stages, {
            xanchor: "left",
            yanchor: "bottom",
            xshift: 12,
            yshift: 8,
          }),
        ],
      },
    },
    design,
  );
}

/** The part of the curve in which the design lies, with its two limits. */
function view({ minimumReflux, minimumStages, refluxRatio, stages, stagesRange }: ShortcutDesign) {
  const right = Math.max(2.2 * refluxRatio, 2.5 * minimumReflux);
  const high = Math.min(stagesRange[1] ?? 0, 2 * stages);
  return {
    right,
    left: Math.max(0, minimumReflux - 0.06 * (right - minimumReflux)),
    top: Math.max(1.5 * stages, 3.2 * minimumStages, 1.1 * high),
  };
}

/** Name of a form of the correlation, which is that of its author. */
export function formName({ correlation }: { readonly correlation: string }): string {
  return `${correlation.slice(0, 1).toUpperCase()}${correlation.slice(1)}`;
}

function pointWords({ stages, refluxRatio, refluxOverMinimum, stagesRange }: ShortcutDesign): string[] {
  const [low, high] = stagesRange;
  const times = refluxOverMinimum === null ? [] : [`${formatNumber(refluxOverMinimum)} × the minimum reflux`];
  const range =
    high === null ? `${low.toFixed(1)} upward, not bounded` : `${low.toFixed(1)} to ${high.toFixed(1)}`;
  return [
    `${stages.toFixed(1)} stages at reflux ratio ${formatNumber(refluxRatio)}`,
    ...times,
    `range of the estimates: ${range}`,
  ];
}

/** Range of the stages over the correlations and both minimum refluxes; an arrow where it is open above. */
function rangeBar({ refluxRatio, stagesRange: [low, high] }: ShortcutDesign, top: number) {
  const isOpen = high === null;
  const symbols = ["line-ew", isOpen ? "triangle-up" : "line-ew"];
  return line(
    { x: [refluxRatio, refluxRatio], y: [low, high ?? 0.97 * top] },
    isOpen ? "range, open above" : "range of the estimates",
    { color: palette.ink, width: 1.6, dash: isOpen ? "dot" : "solid" },
    {
      mode: "lines+markers",
      marker: {
        symbol: symbols,
        size: [12, isOpen ? 9 : 12],
        color: palette.ink,
        line: { width: 1.6, color: palette.ink },
      },
    },
  );
}
