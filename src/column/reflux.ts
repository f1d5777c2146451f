import { type Fields, readExactlyOne, readNumber } from "../base/check";
import { type Issue, refuseAsInfeasible } from "../base/errors";

export { closeBoiling, nearMinimumReflux } from "../balance/refluxCautions";

/** A reflux as it is asked for: the ratio L/D itself, or its multiple of the minimum. */
export interface RefluxChoice {
  readonly field: "refluxRatio" | "refluxOverMinimum";
  readonly value: number;
}

const limits = {
  refluxRatio: { above: 0, atMost: 1e9 },
  refluxOverMinimum: {
    above: 1,
    atMost: 1e9,
    code: "reflux-factor-not-above-one",
    hint: "1.1 to 1.5 is usual; at 1 the stages are endless",
  },
} as const;

/** Reads the one of `refluxRatio` and `refluxOverMinimum` that is given. */
export function readReflux(faults: Issue[], fields: Fields): RefluxChoice | undefined {
  const field = readExactlyOne(faults, "input", fields, ["refluxRatio", "refluxOverMinimum"]);
  return field && { field, value: readNumber(faults, field, fields[field], limits[field]) };
}

/** A reflux that equals the minimum to rounding stands at the pinch. */
const leastExcess = 1e-12;

/** The reflux ratio asked for; refused when it does not exceed the minimum. */
export function refluxAbove({ field, value }: RefluxChoice, minimum: number): number {
  const refluxRatio = field === "refluxRatio" ? value : value * minimum;
  if (refluxRatio > minimum * (1 + leastExcess) && refluxRatio > 0) return refluxRatio;
  const wayOut = field === "refluxRatio" ? "1.1 to 1.5 times the minimum is usual" : "give refluxRatio here";
  return refuseAsInfeasible({
    code: "reflux-below-minimum",
    path: field,
    message: `${field} must give a reflux ratio above the minimum ${Number(minimum.toPrecision(12))}, got ${value}; ${wayOut}`,
    value,
    limit: minimum,
  });
}
