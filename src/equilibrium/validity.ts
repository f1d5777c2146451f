import { shown } from "../base/check";
import type { Issue } from "../base/errors";
import { criticalPressureOf, criticalTemperatureOf } from "./criticalPoint";
import { leastFraction, type Mixture } from "./mixture";

/** Beyond this ln(P/Pa) an equation has left every number a computer holds. */
const largestLogPressure = 690;

/** Where a temperature comes from: the field typed, or the point that was solved for a pressure typed. */
export interface Origin {
  readonly path: string;
  readonly typed: unknown;
  /** Such as "the bubble point", when the temperature was solved for. */
  readonly solvedFor?: string;
}

/**
 * Refuses a temperature [K] at which a component that is present has no vapor pressure: above its critical
 * temperature, or where its equation has no value. `logVaporPressure` is ln(P/Pa) at that temperature.
 */
export function refuseTemperature(
  faults: Issue[],
  mixture: Mixture,
  temperature: number,
  logVaporPressure: Float64Array,
  origin: Origin,
): void {
  for (let i = 0; i < mixture.names.length; i++) {
    if (!(mixture.fractions[i]! >= leastFraction)) continue;
    const critical = criticalTemperatureOf(mixture.components[i]!);
    if (critical !== undefined && temperature > critical) {
      faults.push(aboveCritical(mixture.names[i]!, temperature, critical, origin));
    } else if (!(Math.abs(logVaporPressure[i]!) < largestLogPressure)) {
      const message = `${origin.path}: the vapor-pressure equation of ${mixture.names[i]!} has no value at ${temperature.toPrecision(5)} K; use a temperature within its range, ${mixture.components[i]!.vaporPressure.range.join(" to ")} K`;
      faults.push({ code: "vapor-pressure-undefined", path: origin.path, message, value: origin.typed });
    }
  }
}

function aboveCritical(name: string, temperature: number, critical: number, origin: Origin): Issue {
  const at = temperature.toPrecision(5);
  const where =
    origin.solvedFor === undefined
      ? `${at} K`
      : `${at} K, ${origin.solvedFor} at ${typeof origin.typed === "number" ? `${origin.typed} Pa` : shown(origin.typed)},`;
  const wayOut = origin.solvedFor === undefined ? "a lower temperature" : "a lower pressure";
  const message = `${origin.path}: ${where} is above the critical temperature of ${name}, ${critical.toPrecision(5)} K, where it has no vapor pressure and Raoult's law says nothing; use ${wayOut}, leave ${name} out as a gas that does not condense, or give relativeVolatility where the function takes it`;
  return { code: "above-critical", path: origin.path, message, value: origin.typed, limit: critical };
}

/** Refuses a pressure [Pa] above the critical pressure of every component present: nothing boils there. */
export function refusePressure(faults: Issue[], mixture: Mixture, pressure: number, origin: Origin): void {
  let largest = 0;
  for (let i = 0; i < mixture.names.length; i++) {
    if (!(mixture.fractions[i]! >= leastFraction)) continue;
    largest = Math.max(largest, criticalPressureOf(mixture.components[i]!) ?? Infinity);
  }
  if (!(pressure > largest)) return;
  const message = `${origin.path} must be below the critical pressure of at least one component (largest: ${largest.toPrecision(4)} Pa), got ${shown(origin.typed)}; nothing boils there, use a lower pressure`;
  faults.push({ code: "above-critical", path: origin.path, message, value: origin.typed, limit: largest });
}
