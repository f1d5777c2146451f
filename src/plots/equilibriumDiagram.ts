import { formatNumber } from "../base/displayUnits";
import { requireResult } from "../base/resultKind";
import type { BinaryEquilibrium } from "../equilibrium/binaryEquilibrium";
import { type Figure, figure } from "./figure";
import { axis, baseLayout, note, palette, squareHeight, titled } from "./theme";

const width = 560;

/**
 * Equilibrium (y-x) diagram of a result of `binaryEquilibrium`, with the relative volatility at both ends.
 *
 * @param result - what `binaryEquilibrium` gave
 * @returns a figure; nothing is calculated here
 * @throws DesignInputError for anything else
 * Source: F.-M. Raoult, Comptes rendus 104 (1887) 1430 (citation from memory).
 * @example equilibriumDiagram(binaryEquilibrium({ pair: { light: "benzene", heavy: "toluene" }, pressure: "1 atm" })).name // "equilibriumDiagram"
 */
export function equilibriumDiagram(result: BinaryEquilibrium): Figure {
  requireResult("result", result, "binaryEquilibrium");
  const { curve, pair, relativeVolatility: alpha, pressure } = result;
  const title = `Equilibrium: ${pair.light} / ${pair.heavy}`;
  const words = [
    `relative volatility <b>${formatNumber(alpha.mean)}</b> in the mean`,
    `${formatNumber(alpha.atLightEnd)} where ${pair.light} is pure`,
    `${formatNumber(alpha.atHeavyEnd)} where ${pair.heavy} is pure`,
  ];
  const style = (color: string, dash: string, width: number) => ({ color, dash, width });
  const data = [
    {
      type: "scatter",
      mode: "lines",
      x: [0, 1],
      y: [0, 1],
      name: "y = x",
      line: style(palette.stone, "dot", 1),
      hoverinfo: "skip",
    },
    {
      type: "scatter",
      mode: "lines",
      x: curve.liquid,
      y: curve.vapor,
      name: "equilibrium by Raoult's law",
      line: style(palette.lake, "solid", 2.5),
      hovertemplate: "x %{x:.4f}<br>y %{y:.4f}<extra></extra>",
    },
  ];
  const layout = {
    ...baseLayout(width, squareHeight(width)),
    title: titled(title, `Raoult's law at ${formatNumber(pressure / 1e5)} bar abs`),
    xaxis: axis(`liquid x, mole fraction of ${pair.light}`, { range: [0, 1] }),
    yaxis: axis(`vapor y, mole fraction of ${pair.light}`, {
      range: [0, 1],
    }),
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
    { name: "equilibriumDiagram", title, data, layout, alt: `${title}. ${words.join("; ")}.` },
    result,
  );
}
