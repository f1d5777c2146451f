import type { IssueCode } from "./codes";

/**
 * What each status of a sweep means, by position: 0 answered, else the code of the refusal that a single call would
 * throw. Positions never change; new ones are added at the end.
 */
export const sweepStatus = [
  "answered",
  "not-finite",
  "fraction-out-of-range",
  "composition-sum",
  "pressure-not-positive",
  "implausible-bare-number",
  "above-critical",
  "vapor-pressure-undefined",
] as const satisfies readonly (IssueCode | "answered")[];

/** The status of a refusal. */
export function statusOf(code: (typeof sweepStatus)[number]): number {
  return sweepStatus.indexOf(code);
}
