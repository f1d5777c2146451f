import { readChoice } from "../base/check";
import { displayUnit, formatNumber, toDisplay } from "../base/displayUnits";
import { type Issue, refuseIfFaulty } from "../base/errors";
import type { VolatilityOverTemperature } from "../equilibrium/volatilityCurve";
import { type Figure, figure } from "./figure";
import { type FigureOptions, pressureText, readOptions, readResult } from "./figureInput";
import { plainText, shortName } from "./plainText";
import { axis, baseLayout, line, palette, wide, words } from "./theme";
import { valueAxis, volatilityLabels, volatilityLines, volatilityMargin } from "./volatilityLines";

const shape = {
  heavyKey: "",
  pressure: null,
  temperatureRange: [0],
  "saturation?": { bubble: 0, dew: 0 },
  curve: { temperature: [0], relativeVolatility: { "*": [null] }, kValues: { "*": [null] } },
} as const;

/** What a volatility diagram shows. */
export interface VolatilityDiagramOptions extends FigureOptions {
  /** "relativeVolatility" (when absent) or "kValues", for which the result needs a pressure. */
  readonly values?: "relativeVolatility" | "kValues";
}

/**
 * Volatilities relative to the heavy key, or K-values, against temperature, of a result of `volatilityOverTemperature`:
 * level lines of relative volatility mean that a constant one holds.
 *
 * @param result - what `volatilityOverTemperature` gave
 * @param options - `units`: "metric" (degC), "SI" (K) or "US" (degF); `values`: "relativeVolatility" or "kValues"
 * @returns a figure; nothing is calculated here
 * @throws DesignInputError for anything else than a result of `volatilityOverTemperature`, or K-values without a pressure
 * Source: F.-M. Raoult, Comptes rendus 104 (1887) 1430 (citation from memory).
 * @example volatilityDiagram(volatilityOverTemperature({ components: ["benzene", "toluene"], heavyKey: "toluene", pressure: "1 atm" })).name // "volatilityDiagram"
 */
export function volatilityDiagram(
  result: VolatilityOverTemperature,
  options: VolatilityDiagramOptions = {},
): Figure {
  const faults: Issue[] = [];
  readResult(faults, "result", result, "volatilityOverTemperature", shape);
  const { fields, units } = readOptions(faults, options, ["values"]);
  const what = readChoice(faults, "options.values", fields["values"], ["relativeVolatility", "kValues"]);
  if (what === "kValues" && faults.length === 0 && result.pressure === null) faults.push(withoutPressure);
  refuseIfFaulty(faults);
  const unit = displayUnit("temperature", units);
  const shown = (kelvin: number): number => toDisplay(kelvin, "temperature", units);
  const { curve, temperatureRange, pressure, saturation } = result;
  const temperature = curve.temperature.map(shown);
  const lines = volatilityLines(curve[what]);
  const values = valueAxis(lines);
  const heavy = shortName(result.heavyKey);
  const isRelative = what === "relativeVolatility";
  const band = saturation ? boilingBand(shown(saturation.bubble), shown(saturation.dew)) : undefined;
  return figure(
    {
      name: "volatilityDiagram",
      title: isRelative ? `Volatility relative to ${heavy}` : "K-values over temperature",
      subtitle: pressure === null ? "Raoult's law" : `Raoult's law at ${pressureText(pressure, units)}`,
      facts: lines
        .slice(0, mostFacts)
        .map(({ name, first, last }) => `${name} ${formatNumber(first, 3)} to ${formatNumber(last, 3)}`),
      data: lines.map(({ label, values, style }) =>
        line({ x: temperature, y: values }, label, style, {
          hoverinfo: "all",
          hovertemplate: `${label}<br>%{x:.1f} ${unit}<br>%{y:.3f}<extra></extra>`,
        }),
      ),
      layout: {
        ...baseLayout(wide),
        margin: volatilityMargin,
        xaxis: axis("temperature", unit, { range: temperatureRange.map(shown) }),
        yaxis: axis(
          isRelative ? `relative volatility, ${plainText(heavy)} = 1` : "K = y/x",
          "-",
          values.ticks,
        ),
        shapes: band === undefined ? [] : [band.shape],
        annotations: [
          ...volatilityLabels(lines, temperature, values),
          ...(band === undefined ? [] : [band.label]),
        ],
      },
    },
    result,
  );
}

/** So many components are told in words. */
const mostFacts = 12;

const withoutPressure: Issue = {
  code: "missing-field",
  path: "options.values",
  message:
    "options.values cannot be kValues for a result without a pressure; give volatilityOverTemperature one",
  value: "kValues",
};

/** Between bubble and dew point of the composition. */
function boilingBand(bubble: number, dew: number) {
  return {
    shape: {
      type: "rect",
      x0: bubble,
      x1: dew,
      yref: "paper",
      y0: 0,
      y1: 1,
      fillcolor: palette.amber,
      opacity: 0.16,
      line: { width: 0 },
      layer: "below",
    },
    label: words("bubble to dew point", (bubble + dew) / 2, 0, {
      yref: "paper",
      yanchor: "bottom",
      yshift: 2,
    }),
  };
}
