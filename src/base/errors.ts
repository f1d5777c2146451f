import type { IssueCode } from "./codes";

/** One fault of an input, or one reason why no column can do what was asked. */
export interface Issue {
  readonly code: IssueCode;
  /** The field as typed, such as `feed.composition.toluene`. */
  readonly path: string;
  /** Field, rule, what came, and the way out. */
  readonly message: string;
  readonly value: unknown;
  readonly limit?: number;
}

function summary(issues: readonly Issue[]): string {
  if (issues.length === 1) return issues[0]!.message;
  return `${issues.length} faults:\n${issues.map((issue) => `- ${issue.message}`).join("\n")}`;
}

/**
 * The input of a call is wrong. `issues` holds all faults that were found, at least one.
 *
 * @example
 * try { gilliland({ minimumStages: 8, minimumReflux: 1, refluxRatio: Number.NaN }) } catch (error) { (error as DesignInputError).issues[0]!.code } // "not-finite"
 */
export class DesignInputError extends Error {
  override readonly name: string = "DesignInputError";
  constructor(readonly issues: readonly Issue[]) {
    super(summary(issues));
  }
}

/**
 * The input is well formed, but no column meets it. `issues` gives the reason and the way out.
 *
 * @example
 * try { gilliland({ minimumStages: 8, minimumReflux: 1, refluxRatio: 0.9 }) } catch (error) { (error as DesignInfeasibleError).issues[0]!.code } // "reflux-below-minimum"
 */
export class DesignInfeasibleError extends Error {
  override readonly name: string = "DesignInfeasibleError";
  constructor(readonly issues: readonly Issue[]) {
    super(summary(issues));
  }
}

/** Throws the collected faults, if there are any. */
export function refuseIfFaulty(faults: readonly Issue[]): void {
  if (faults.length > 0) throw new DesignInputError(faults);
}

/** Throws one reason why no column can do what was asked. */
export function refuseAsInfeasible(issue: Issue): never {
  throw new DesignInfeasibleError([issue]);
}
