import { formatNumber } from "../base/displayUnits";
import { type Issue, refuseIfFaulty } from "../base/errors";
import type { ShortcutDesign } from "../column/shortcutDesignResult";
import type { GillilandResult } from "../shortcut/gilliland";
import { type Figure, figure } from "./figure";
import { curveShape, type FigureOptions, readOptions, readResult } from "./figureInput";
import { formName } from "./stagesAgainstReflux";
import { axis, baseLayout, chosen, line, marks, palette, wide, words } from "./theme";

const common = { correlation: "", stages: 0, refluxRatio: 0 } as const;
const designShape = { ...common, curves: { gilliland: { ...curveShape, point: [0] } } } as const;
const resultShape = { ...common, refluxCoordinate: 0, stagesCoordinate: 0, curve: curveShape } as const;

/**
 * Gilliland's curve, Y against X, with the operating point of a design or of a result of `gilliland`.
 *
 * @param result - what `shortcutDesign` or `gilliland` gave
 * @param options - `units`, for the sake of likeness: nothing here has a unit system
 * @returns a figure; nothing is calculated here
 * @throws DesignInputError for anything else than a result of `shortcutDesign` or `gilliland`
 * Source: E. R. Gilliland, Ind. Eng. Chem. 32 (1940) 1220.
 * @example gillilandDiagram(gilliland({ minimumStages: 8, minimumReflux: 1, refluxRatio: 1.5 })).name // "gillilandDiagram"
 */
export function gillilandDiagram(
  result: ShortcutDesign | GillilandResult,
  options: FigureOptions = {},
): Figure {
  const faults: Issue[] = [];
  const isDesign = (result as { kind?: unknown } | null | undefined)?.kind === "shortcutDesign";
  if (isDesign) readResult(faults, "result", result, "shortcutDesign", designShape);
  else readResult(faults, "result", result, "gilliland", resultShape);
  readOptions(faults, options);
  refuseIfFaulty(faults);
  const curve = "curves" in result ? result.curves.gilliland : result.curve;
  const [x, y] =
    "curves" in result ? result.curves.gilliland.point : [result.refluxCoordinate, result.stagesCoordinate];
  const facts = [
    `${result.stages.toFixed(1)} stages at reflux ratio ${formatNumber(result.refluxRatio)}`,
    `X ${formatNumber(x, 3)}, Y ${formatNumber(y, 3)}`,
  ];
  return figure(
    {
      name: "gillilandDiagram",
      title: "Gilliland's correlation and the operating point",
      subtitle: `form of ${formName(result)}; the columns behind the curve scatter about it by several percent of the stages`,
      facts,
      data: [
        line({ x: [x, x, 0], y: [0, y, y] }, "reading", { color: palette.slate, width: 1.2, dash: "dot" }),
        line(
          { x: curve.x, y: curve.y },
          `form of ${formName(result)}`,
          { color: palette.spruce, width: 2.6 },
          {
            hoverinfo: "all",
            hovertemplate: "X %{x:.3f}<br>Y %{y:.3f}<extra></extra>",
          },
        ),
        marks([x], [y], "operating point", chosen, { cliponaxis: false }),
      ],
      layout: {
        ...baseLayout(wide),
        xaxis: axis("X = (R − R<sub>min</sub>)/(R + 1)", "-", { range: [0, 1], dtick: 0.2 }),
        yaxis: axis("Y = (N − N<sub>min</sub>)/(N + 1)", "-", { range: [0, 1], dtick: 0.2 }),
        annotations: [words(`<b>${facts[0]}</b><br>${facts[1]}`, x, y, besideCurve(x))],
      },
    },
    result,
  );
}

/** Above the falling curve: to the right of the point, or well over it where there is no room on the right. */
function besideCurve(x: number) {
  return x < 0.6
    ? { xanchor: "left", yanchor: "bottom", xshift: 12, yshift: 8 }
    : { xanchor: "right", yanchor: "bottom", showarrow: true, arrowhead: 0, arrowwidth: 1, ax: 0, ay: -90 };
}
