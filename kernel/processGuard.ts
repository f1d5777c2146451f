/** Faults that surface outside the call stack of a cell, and the process's own way out. */
export interface ProcessGuard {
  /** Collects faults from here on, as those of a running cell. */
  readonly collect: () => void;
  /** Ends collecting; the faults seen. */
  readonly collected: () => unknown[];
  /** Really ends the process, which cells may not. */
  readonly exit: (code: number) => never;
}

/** Keeps a cell from ending the process; `late` hears of faults while no cell runs. */
export function guardProcess(late: (fault: unknown, label: string) => void): ProcessGuard {
  let faults: unknown[] | undefined;
  const hear = (label: string) => (fault: unknown) => {
    if (faults === undefined) late(fault, label);
    else faults.push(fault);
  };
  process.on("unhandledRejection", hear("a promise was rejected and nothing handled it"));
  process.on("uncaughtException", hear("an error was thrown outside a cell"));
  const leave = process.exit.bind(process);
  process.exit = (code) => {
    throw new Error(
      `process.exit(${code ?? ""}) is not allowed in a cell: it would end the notebook's kernel`,
    );
  };
  return {
    collect: () => {
      faults = [];
    },
    collected: () => {
      const seen = faults ?? [];
      faults = undefined;
      return seen;
    },
    exit: (code) => leave(code),
  };
}
