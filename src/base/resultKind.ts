import { shown } from "./check";
import { DesignInputError } from "./errors";

/** Refuses what is not a result of the function named `kind`. */
export function requireResult(path: string, value: unknown, kind: string): void {
  const isResult = typeof value === "object" && value !== null && (value as { kind?: unknown }).kind === kind;
  if (isResult) return;
  const message = `${path} must be what ${kind} gives, got ${shown(value)}`;
  throw new DesignInputError([{ code: "wrong-type", path, message, value }]);
}
