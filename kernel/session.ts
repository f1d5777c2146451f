import type { DisplayUnits } from "../src/base/displayUnits";

/** What the notebook functions and the host that runs the cells share, in whichever copy of the package they live. */
export interface NotebookSession {
  displayUnits: DisplayUnits;
  /** Set by the host that runs the cells; absent in a plain script. */
  show?: (value: unknown) => void;
}

const key = Symbol.for("refluxbook.session");

/** The one session of this process. */
export function notebookSession(): NotebookSession {
  const holder = globalThis as unknown as Record<symbol, NotebookSession | undefined>;
  return (holder[key] ??= { displayUnits: "metric" });
}
