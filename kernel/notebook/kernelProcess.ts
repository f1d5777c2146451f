import { fork } from "node:child_process";
import * as path from "node:path";
import type { Answer, Remark, Request } from "./messages";

/** How the process ended, in words. */
export interface Ended {
  readonly say: "ended";
  readonly how: string;
}

/** The process that runs the cells, seen from the runner. */
export interface KernelProcess {
  /** Asks and waits; "ended" when the process is gone. */
  readonly ask: (request: Request) => Promise<Answer | Ended>;
  /** The first answer: the process is ready. */
  readonly ready: Promise<Answer | Ended>;
  readonly interrupt: () => void;
  readonly kill: () => void;
  /** Asks it to leave, and sees to it that it does. */
  readonly close: () => Promise<void>;
}

const longestLeave = 2000; // ms

/** Starts the process in the notebook's folder, with arguments of `messages`. */
export function startKernelProcess(
  folder: string,
  words: readonly string[],
  hear: (remark: Remark) => void,
): KernelProcess {
  const child = fork(path.join(__dirname, "notebookChild.js"), words, {
    cwd: folder,
    serialization: "advanced",
    stdio: ["ignore", "inherit", "inherit", "ipc"],
  });
  let ended: Ended | undefined;
  let answer: ((answer: Answer | Ended) => void) | undefined;

  child.on("message", (message: Answer | Remark) => {
    if (message.say === "output" || message.say === "late-fault") hear(message);
    else answer?.(message);
  });
  child.on("error", () => undefined); // the exit event tells
  const gone = new Promise<void>((resolve) => {
    child.once("exit", (code, signal) => {
      ended = { say: "ended", how: signal === null ? `exit code ${code}` : `signal ${signal}` };
      answer?.(ended);
      resolve();
    });
  });

  function nextAnswer(): Promise<Answer | Ended> {
    if (ended !== undefined) return Promise.resolve(ended);
    return new Promise((resolve) => {
      answer = resolve;
    });
  }

  function ask(request: Request): Promise<Answer | Ended> {
    const next = nextAnswer();
    if (ended === undefined && child.connected) child.send(request, () => undefined);
    return next;
  }

  async function close(): Promise<void> {
    const timer = setTimeout(() => child.kill("SIGKILL"), longestLeave);
    if (ended === undefined) void ask({ ask: "quit" });
    await gone;
    clearTimeout(timer);
  }

  return {
    ask,
    ready: nextAnswer(),
    interrupt: () => child.kill("SIGINT"),
    kill: () => child.kill("SIGKILL"),
    close,
  };
}
