import { standardAtmosphere } from "../base/constants";
import type { Issue } from "../base/errors";
import { readQuantity } from "../base/units";
import { boilingTemperatureAt } from "./boilingTemperature";
import type { Component } from "./component";

/** A bare temperature this far [K] under the lowest normal boiling point is taken for a forgotten unit. */
const farthestBelowBoiling = 150;

/** Normal boiling point [K]: the component's own, else by its vapor pressure; NaN when the equation gives none. */
export function normalBoilingPointOf(component: Component): number {
  return component.normalBoilingPoint ?? boilingTemperatureAt(component, Math.log(standardAtmosphere));
}

/** Reads a temperature [K]: a bare number must be plausible beside the normal boiling points of the components. */
export function readTemperature(
  faults: Issue[],
  path: string,
  value: unknown,
  components: readonly Component[],
): number {
  const temperature = readQuantity(faults, path, value, "temperature");
  if (typeof value !== "number" || Number.isNaN(temperature)) return temperature;
  let lowest = Infinity;
  for (const component of components) {
    const boiling = normalBoilingPointOf(component);
    if (boiling < lowest) lowest = boiling;
  }
  const limit = lowest - farthestBelowBoiling;
  if (lowest === Infinity || !(temperature < limit)) return temperature;
  const message = `${path} is read in K, and ${value} K is more than ${farthestBelowBoiling} K under the lowest normal boiling point present; write "${value} degC" or "${value} K"`;
  faults.push({ code: "implausible-bare-number", path, message, value, limit });
  return Number.NaN;
}
