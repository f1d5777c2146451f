import { expect } from "vitest";
import { DesignInfeasibleError, DesignInputError } from "../../src/base/errors";
import { issueCodes } from "../../src/base/codes";

/** Runs a call that may be wrong in any way: it must give finite numbers, or refuse with a reason. */
export function expectAnswerOrRefusal(call: () => unknown): void {
  let result: unknown;
  try {
    result = call();
  } catch (error) {
    if (!(error instanceof DesignInputError) && !(error instanceof DesignInfeasibleError)) throw error;
    const sound = error.issues.filter(
      ({ code, message, limit }) =>
        code in issueCodes && message.length > 0 && (limit === undefined || Number.isFinite(limit)),
    );
    if (sound.length === 0 || sound.length < error.issues.length) expect(error.issues).toBe("sound issues");
    return;
  }
  expectFinite(result);
}

/** Every number in a result is finite. */
export function expectFinite(value: unknown): void {
  if (hasOnlyFiniteNumbers(value)) return;
  expect(value, "a number that is not finite").toBeUndefined();
}

function hasOnlyFiniteNumbers(value: unknown): boolean {
  if (typeof value === "number") return Number.isFinite(value);
  return typeof value !== "object" || value === null || Object.values(value).every(hasOnlyFiniteNumbers);
}

/** The codes with which a call refuses, each with its path. */
export function refusal(call: () => unknown): string[] {
  try {
    call();
  } catch (error) {
    if (!(error instanceof DesignInputError) && !(error instanceof DesignInfeasibleError)) throw error;
    const kind = error instanceof DesignInfeasibleError ? "infeasible " : "";
    return error.issues.map((issue) => `${kind}${issue.code} ${issue.path}`);
  }
  return [];
}
