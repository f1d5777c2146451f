import * as plots from "../../src";
import type { Figure } from "../../src/plots/figure";
import { notebookSession } from "../session";

type Draw<Result, Options> = (result: Result, options?: Options) => Figure;

/** The same figure, in the display units of the notebook unless others are asked for. */
function inDisplayUnits<Result, Options extends plots.FigureOptions>(
  draw: Draw<Result, Options>,
): Draw<Result, Options> {
  return (result, options) => {
    const isAbsent = options === undefined || options === null;
    const isRecord = typeof options === "object" && !Array.isArray(options);
    if (!isAbsent && !isRecord) return draw(result, options);
    return draw(result, { units: notebookSession().displayUnits, ...options } as Options);
  };
}

/** McCabe-Thiele diagram of a result of `mccabeThiele`, as `mccabeThieleDiagram` of src, in the notebook's units. */
export const mccabeThieleDiagram = inDisplayUnits(plots.mccabeThieleDiagram);

/** Equilibrium (y-x) diagram of a result of `binaryEquilibrium`, as `equilibriumDiagram` of src, in the notebook's units. */
export const equilibriumDiagram = inDisplayUnits(plots.equilibriumDiagram);

/** T-x-y diagram of a result of `binaryEquilibrium`, as `temperatureCompositionDiagram` of src, in the notebook's units. */
export const temperatureCompositionDiagram = inDisplayUnits(plots.temperatureCompositionDiagram);

/** Volatilities of a result of `volatilityOverTemperature`, as `volatilityDiagram` of src, in the notebook's units. */
export const volatilityDiagram = inDisplayUnits(plots.volatilityDiagram);
