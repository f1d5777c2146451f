import type { Issue } from "../base/errors";
import { readQuantity } from "../base/units";
import { boilingTemperatureAt } from "../components/boilingTemperature";
import { standardAtmosphere } from "../base/constants";
import type { Mixture } from "./mixture";

/** A bare temperature this far [K] under the lowest normal boiling point present is taken for a forgotten unit. */
const farthestBelowBoiling = 150;

/** Reads a temperature [K] of a mixture: a bare number must be plausible beside the normal boiling points present. */
export function readTemperature(
  faults: Issue[],
  path: string,
  value: unknown,
  mixture: Mixture | undefined,
): number {
  const temperature = readQuantity(faults, path, value, "temperature");
  if (typeof value !== "number" || Number.isNaN(temperature) || mixture === undefined) return temperature;
  const limit = lowestBoilingPoint(mixture) - farthestBelowBoiling;
  if (!(temperature < limit) || limit === Infinity) return temperature;
  const message = `${path} is read in K, and ${value} K is more than ${farthestBelowBoiling} K under the lowest normal boiling point present; write "${value} degC" or "${value} K"`;
  faults.push({ code: "implausible-bare-number", path, message, value, limit });
  return Number.NaN;
}

/** Infinite when no component has a boiling point that its equation reaches. */
function lowestBoilingPoint({ components, fractions }: Mixture): number {
  let lowest = Infinity;
  for (let i = 0; i < components.length; i++) {
    if (fractions[i] === 0) continue;
    const component = components[i]!;
    const boiling =
      component.normalBoilingPoint ?? boilingTemperatureAt(component, Math.log(standardAtmosphere));
    if (boiling < lowest) lowest = boiling;
  }
  return lowest;
}
