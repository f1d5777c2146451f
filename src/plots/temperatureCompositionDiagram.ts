import { displayUnit, toDisplay } from "../base/displayUnits";
import type { BinaryEquilibrium } from "../equilibrium/binaryEquilibrium";
import { type Figure, figure } from "./figure";
import { type FigureOptions, pressureText, readFigureInput } from "./figureInput";
import { plainText, shortName } from "./plainText";
import { axis, baseLayout, legend, line, marks, palette, wide, words } from "./theme";

const shape = {
  pair: { light: "", heavy: "" },
  pressure: 0,
  boilingTemperature: { light: 0, heavy: 0 },
  curve: { liquid: [0], vapor: [0], temperature: [0] },
} as const;

/**
 * Temperature-composition (T-x-y) diagram of a result of `binaryEquilibrium`: boiling line, dew line, the boiling points
 * of the pure components.
 *
 * @param result - what `binaryEquilibrium` gave
 * @param options - `units`: "metric" (degC), "SI" (K) or "US" (degF)
 * @returns a figure; nothing is calculated here
 * @throws DesignInputError for anything else than a result of `binaryEquilibrium`
 * Source: F.-M. Raoult, Comptes rendus 104 (1887) 1430 (citation from memory).
 * @example temperatureCompositionDiagram(binaryEquilibrium({ pair: { light: "benzene", heavy: "toluene" }, pressure: "1 atm" })).name // "temperatureCompositionDiagram"
 */
export function temperatureCompositionDiagram(
  result: BinaryEquilibrium,
  options: FigureOptions = {},
): Figure {
  const units = readFigureInput("result", result, "binaryEquilibrium", shape, options);
  const unit = displayUnit("temperature", units);
  const shown = (kelvin: number): number => toDisplay(kelvin, "temperature", units);
  const { curve, pair, pressure, boilingTemperature } = result;
  const [light, heavy] = [shortName(pair.light), shortName(pair.heavy)];
  const [lightBoils, heavyBoils] = [shown(boilingTemperature.light), shown(boilingTemperature.heavy)];
  const boils = (name: string, at: number): string => `${name} boils at ${at.toFixed(1)} ${unit}`;
  const room = 0.14 * (heavyBoils - lightBoils);
  const temperature = curve.temperature.map(shown);
  const pointed = (letter: string) => ({
    hoverinfo: "all",
    hovertemplate: `${letter} %{x:.4f}<br>%{y:.1f} ${unit}<extra></extra>`,
  });
  const phase = (text: string, x: number, y: number) =>
    words(`<i>${text}</i>`, x, y, {
      xref: "paper",
      yref: "paper",
      xanchor: x > 0.5 ? "right" : "left",
      font: { size: 13, color: palette.slate },
    });
  return figure(
    {
      name: "temperatureCompositionDiagram",
      title: `Boiling and dew lines: ${light} / ${heavy}`,
      subtitle: `Raoult's law at ${pressureText(pressure, units)}`,
      facts: [boils(light, lightBoils), boils(heavy, heavyBoils)],
      data: [
        line(
          { x: curve.vapor, y: temperature },
          "dew line, vapor y",
          { color: palette.rust, dash: "dash" },
          pointed("y"),
        ),
        line(
          { x: curve.liquid, y: temperature },
          "boiling line, liquid x",
          { color: palette.spruce },
          pointed("x"),
        ),
        marks(
          [0, 1],
          [heavyBoils, lightBoils],
          "pure",
          { size: 7, color: palette.ink },
          { showlegend: false },
        ),
      ],
      layout: {
        ...baseLayout(wide),
        margin: { l: 72, r: 28, t: 60, b: 84 },
        ...legend({ orientation: "h", x: 0.5, xanchor: "center", y: -0.17, yanchor: "top" }),
        xaxis: axis(`${plainText(light)} in liquid and vapor, x and y`, "mol/mol", {
          range: [-0.02, 1.02],
          dtick: 0.2,
        }),
        yaxis: axis("temperature", unit, { range: [lightBoils - room, heavyBoils + room] }),
        annotations: [
          words(plainText(boils(heavy, heavyBoils)), 0, heavyBoils, {
            xanchor: "left",
            xshift: 8,
            yshift: 12,
          }),
          words(plainText(boils(light, lightBoils)), 1, lightBoils, {
            xanchor: "right",
            xshift: -8,
            yshift: -12,
          }),
          phase("vapor", 0.97, 0.93),
          phase("liquid", 0.03, 0.07),
        ],
      },
    },
    result,
  );
}
