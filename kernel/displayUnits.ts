import { readChoice } from "../src/base/check";
import type { DisplayUnits } from "../src/base/displayUnits";
import { type Issue, refuseIfFaulty } from "../src/base/errors";
import { notebookSession } from "./session";

const systems: readonly DisplayUnits[] = ["metric", "SI", "US"];

/**
 * Chooses the units in which tables of this notebook are shown from here on: "metric" (bar abs, degC, kmol/h; the
 * setting at the start), "SI" (Pa, K, mol/s) or "US" (psi abs, degF, lbmol/h). Results stay SI numbers.
 *
 * @param system - "metric", "SI" or "US"
 * @throws DesignInputError for any other word
 * @example displayUnits("US") // undefined
 */
export function displayUnits(system: DisplayUnits): void {
  const faults: Issue[] = [];
  const chosen = readChoice(faults, "system", system ?? null, systems);
  refuseIfFaulty(faults);
  notebookSession().displayUnits = chosen;
}
