import { formatNumber } from "../base/displayUnits";
import type { BinaryEquilibrium } from "../equilibrium/binaryEquilibrium";
import { belowDiagonal } from "./belowDiagonal";
import { wholeAxes } from "./diagramAxes";
import { type Figure, figure } from "./figure";
import { type FigureOptions, pressureText, readFigureInput } from "./figureInput";
import { plainText, shortName } from "./plainText";
import { baseLayout, line, palette, square } from "./theme";

const shape = {
  pair: { light: "", heavy: "" },
  pressure: 0,
  relativeVolatility: { atLightEnd: 0, atHeavyEnd: 0, mean: 0 },
  curve: { liquid: [0], vapor: [0], vaporAtMeanVolatility: [0] },
} as const;

/**
 * Equilibrium (y-x) diagram of a result of `binaryEquilibrium`, beside the curve of its mean relative volatility: how
 * far the two part is how far a constant volatility errs.
 *
 * @param result - what `binaryEquilibrium` gave
 * @param options - `units` of the pressure: "metric", "SI" or "US"
 * @returns a figure; nothing is calculated here
 * @throws DesignInputError for anything else than a result of `binaryEquilibrium`
 * Source: F.-M. Raoult, Comptes rendus 104 (1887) 1430 (citation from memory).
 * @example equilibriumDiagram(binaryEquilibrium({ pair: { light: "benzene", heavy: "toluene" }, pressure: "1 atm" })).name // "equilibriumDiagram"
 */
export function equilibriumDiagram(result: BinaryEquilibrium, options: FigureOptions = {}): Figure {
  const units = readFigureInput("result", result, "binaryEquilibrium", shape, options);
  const { curve, pair, relativeVolatility: alpha, pressure } = result;
  const light = shortName(pair.light);
  const facts = [
    `relative volatility ${formatNumber(alpha.mean)} in the mean`,
    `${formatNumber(alpha.atLightEnd)} in pure ${light}`,
    `${formatNumber(alpha.atHeavyEnd)} in pure ${shortName(pair.heavy)}`,
  ];
  const { xaxis, yaxis } = wholeAxes(plainText(light));
  const hovertemplate = "x %{x:.4f}<br>y %{y:.4f}<extra></extra>";
  return figure(
    {
      name: "equilibriumDiagram",
      title: `Equilibrium: ${light} / ${shortName(pair.heavy)}`,
      subtitle: `Raoult's law at ${pressureText(pressure, units)}`,
      facts,
      data: [
        line(
          { x: [0, 1], y: [0, 1] },
          "y = x",
          { color: palette.slate, width: 1, dash: "dot" },
          { showlegend: false },
        ),
        line(
          { x: curve.liquid, y: curve.vapor },
          "Raoult's law",
          { color: palette.spruce, width: 2.6 },
          { hovertemplate, hoverinfo: "all" },
        ),
        line({ x: curve.liquid, y: curve.vaporAtMeanVolatility }, "mean relative volatility", {
          color: palette.rust,
          width: 1.6,
          dash: "dash",
        }),
      ],
      layout: { ...baseLayout(square), xaxis, yaxis, ...belowDiagonal(facts) },
    },
    result,
  );
}
