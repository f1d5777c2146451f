import type { CellOutcome, CellOutput, Declaration } from "../cellOutput";

/** Versions of what ran a notebook. */
export type Versions = Readonly<Record<string, string>>;

/** What the runner asks of the process that runs the cells. */
export type Request =
  | { readonly ask: "declarations"; readonly code: string }
  | { readonly ask: "run"; readonly code: string; readonly number: number }
  | { readonly ask: "quit" };

/** What that process says; each request but the last is answered once. */
export type Answer =
  | { readonly say: "ready"; readonly versions: Versions }
  | { readonly say: "declarations"; readonly declarations: readonly Declaration[] }
  | { readonly say: "ran"; readonly outcome: CellOutcome };

/** What it says without being asked. */
export type Remark =
  | { readonly say: "output"; readonly number: number; readonly output: CellOutput }
  | { readonly say: "late-fault" };

/** Argument of that process when the notebook will draw figures. */
export const expectsFigures = "expects-figures";
