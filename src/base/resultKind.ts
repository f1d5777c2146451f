import { readChoice, readFields, shown } from "./check";
import { DesignInputError, type Issue, refuseIfFaulty } from "./errors";

/** Refuses what is not a result of the function named `kind`. */
export function requireResult(path: string, value: unknown, kind: string): void {
  const isResult = typeof value === "object" && value !== null && (value as { kind?: unknown }).kind === kind;
  if (isResult) return;
  const message = `${path} must be what ${kind} gives, got ${shown(value)}`;
  throw new DesignInputError([{ code: "wrong-type", path, message, value }]);
}

/** The one option of a function that draws or shows a result: one of a few words, or absent. */
export function readOption<T extends string>(
  name: string,
  options: unknown,
  choices: readonly T[],
): T | undefined {
  const faults: Issue[] = [];
  const value = readFields(faults, "options", options, new Set([name]))?.[name];
  const chosen = value === undefined ? undefined : readChoice(faults, name, value, choices);
  refuseIfFaulty(faults);
  return chosen;
}
