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
    expect(error.issues.length).toBeGreaterThan(0);
    for (const issue of error.issues) {
      expect(Object.keys(issueCodes)).toContain(issue.code);
      expect(issue.message).not.toMatch(/undefined is not|cannot read/i);
      if (issue.limit !== undefined) expect(Number.isFinite(issue.limit)).toBe(true);
    }
    return;
  }
  expectFinite(result);
}

/** Every number in a result is finite. */
export function expectFinite(value: unknown): void {
  if (typeof value === "number") expect(Number.isFinite(value)).toBe(true);
  else if (typeof value === "object" && value !== null) Object.values(value).forEach(expectFinite);
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
