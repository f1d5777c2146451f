import type { Caution } from "../base/result";
import { sources } from "../base/source";

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
