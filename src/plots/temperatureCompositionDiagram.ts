import { type DisplayUnits, displayUnit, formatNumber, toDisplay } from "../base/displayUnits";
import { readOption, requireResult } from "../base/resultKind";
import type { BinaryEquilibrium } from "../equilibrium/binaryEquilibrium";
import { type Figure, figure } from "./figure";
import { axis, baseLayout, note, palette, titled } from "./theme";

/** Units in which a figure is drawn. */
export interface FigureOptions {
  /** "metric" when absent. */
  readonly units?: DisplayUnits;
}

/**
 * Temperature-composition (T-x-y) diagram of a result of `binaryEquilibrium`: boiling line, dew line, the boiling points
 * of the pure components.
 *
 * @param result - what `binaryEquilibrium` gave
 * @param options - `units`: "metric" (degC), "SI" (K) or "US" (degF)
 * @returns a figure; nothing is calculated here
 * @throws DesignInputError for anything else, or units that are not known
 * Source: F.-M. Raoult, Comptes rendus 104 (1887) 1430 (citation from memory).
 * @example temperatureCompositionDiagram(binaryEquilibrium({ pair: { light: "benzene", heavy: "toluene" }, pressure: "1 atm" })).name // "temperatureCompositionDiagram"
 */
export function temperatureCompositionDiagram(
  result: BinaryEquilibrium,
  options: FigureOptions = {},
): Figure {
  requireResult("result", result, "binaryEquilibrium");
  const units = readOption("units", options, ["metric", "SI", "US"]) ?? "metric";
  const unit = displayUnit("temperature", units);
  const shown = (kelvin: number): number => toDisplay(kelvin, "temperature", units);
  const { curve, pair, pressure, boilingTemperature } = result;
  const title = `Boiling and dew lines: ${pair.light} / ${pair.heavy}`;
  const temperature = curve.temperature.map(shown);
  const line = (x: readonly number[], name: string, style: object, letter: string) => ({
    type: "scatter",
    mode: "lines",
    x,
    y: temperature,
    name,
    line: style,
    hovertemplate: `${letter} %{x:.4f}<br>%{y:.1f} ${unit}<extra></extra>`,
  });
  const data = [
    line(curve.vapor, "dew line, vapor y", { color: palette.brick, width: 2.5, dash: "dash" }, "y"),
    line(curve.liquid, "boiling line, liquid x", { color: palette.lake, width: 2.5 }, "x"),
  ];
  const light = `${pair.light} boils at <b>${shown(boilingTemperature.light).toFixed(1)} ${unit}</b>`;
  const heavy = `${pair.heavy} boils at <b>${shown(boilingTemperature.heavy).toFixed(1)} ${unit}</b>`;
  const system = displayUnit("pressure", units);
  const at = `${formatNumber(toDisplay(pressure, "pressure", units))} ${system}`;
  const layout = {
    ...baseLayout(700, 450),
    title: titled(title, `Raoult's law at ${at}`),
    xaxis: axis(`mole fraction of ${pair.light}`, { range: [0, 1] }),
    yaxis: axis(`temperature [${unit}]`),
    annotations: [
      note(`${light}<br>${heavy}`, {
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
    {
      name: "temperatureCompositionDiagram",
      title,
      data,
      layout,
      alt: `${title} at ${at}. ${light}; ${heavy}.`,
    },
    result,
  );
}
