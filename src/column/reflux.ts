import { type Fields, readExactlyOne, readNumber } from "../base/check";
import { type Issue, refuseAsInfeasible } from "../base/errors";
import type { Caution } from "../base/result";
import { sources } from "../base/source";

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

const leastFactor = 1.05;

/** A caution when the reflux lies so near its minimum that the stages depend steeply on it. */
export function nearMinimumReflux(refluxRatio: number, minimum: number): Caution | undefined {
  const factor = refluxRatio / minimum;
  if (!(minimum > 0) || factor >= leastFactor) return undefined;
  return {
    code: "near-minimum-reflux",
    severity: "check",
    kind: "method",
    message: `the reflux ratio is ${factor.toPrecision(4)} times its minimum; below ${leastFactor} the stages depend steeply on it`,
    value: factor,
    limit: leastFactor,
    source: sources.commonPractice,
  };
}

const leastVolatility = 1.05;

/** A caution when the two components that are parted boil so close together that distillation is rare. */
export function closeBoiling(relativeVolatility: number): Caution | undefined {
  if (relativeVolatility >= leastVolatility) return undefined;
  return {
    code: "close-boiling-keys",
    severity: "check",
    kind: "method",
    message: `the relative volatility is ${relativeVolatility.toPrecision(4)}; below ${leastVolatility} large-scale distillation is rare, and an error of 1 % in it moves the stages by more than 20 %`,
    value: relativeVolatility,
    limit: leastVolatility,
    source: sources.commonPractice,
  };
}
