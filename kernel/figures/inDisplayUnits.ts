import type { BinaryEquilibrium } from "../../src/equilibrium/binaryEquilibrium";
import type { Figure } from "../../src/plots/figure";
import * as plots from "../../src/plots/temperatureCompositionDiagram";
import { notebookSession } from "../session";

/**
 * Temperature-composition (T-x-y) diagram of a result of `binaryEquilibrium`, in the display units of the notebook unless
 * others are asked for.
 *
 * @param result - what `binaryEquilibrium` gave
 * @param options - `units`: "metric" (degC), "SI" (K) or "US" (degF)
 * @returns a figure; nothing is calculated here
 * @throws DesignInputError when `result` is not what `binaryEquilibrium` gives, or for an unknown option
 * Source: F.-M. Raoult, Comptes rendus 104 (1887) 1430 (citation from memory).
 * @example temperatureCompositionDiagram(binaryEquilibrium({ pair: { light: "benzene", heavy: "toluene" }, pressure: "1 atm" })).name // "temperatureCompositionDiagram"
 */
export function temperatureCompositionDiagram(
  result: BinaryEquilibrium,
  options: plots.FigureOptions = {},
): Figure {
  return plots.temperatureCompositionDiagram(result, { units: notebookSession().displayUnits, ...options });
}
