/** The process that runs the cells of a headless run: the engine on one side, the runner's messages on the other. */
import type { CellOutcome, CellOutput } from "../cellOutput";
import { represent } from "../display/represent";
import { createEngine } from "../engine";
import { prepareSvg } from "../figures/svg";
import { packageForNotebook, packageVersion } from "../packageRoot";
import { notebookSession } from "../session";
import { captureStreams, createTextBuffer } from "../textBuffer";
import { type Answer, expectsFigures, type Remark, type Request } from "./messages";

const waitForLateFaults = 100; // ms after the last cell

if (process.argv.includes(expectsFigures)) prepareSvg();
const folder = process.cwd();
const packageFolder = packageForNotebook(folder);
let number = 0;

function say(message: Answer | Remark): void {
  process.send!(message);
}

const printed = createTextBuffer<number>((name, text, cell) =>
  say({ say: "output", number: cell, output: { type: "stream", name, text } }),
);

function emit(output: CellOutput): void {
  if (output.type === "stream") return printed.write(output.name, output.text, number);
  printed.flush();
  say({ say: "output", number, output });
}

const engine = createEngine({
  packageFolder,
  folder,
  emit,
  represent,
  onLateFault: () => say({ say: "late-fault" }),
});
captureStreams(printed, () => number);
notebookSession().show = (value) => emit({ type: "display", data: represent(value) });

async function runCell(code: string, next: number): Promise<CellOutcome> {
  printed.startCell();
  number = next;
  const outcome = await engine.execute(code, next);
  printed.flush();
  return outcome;
}

async function quit(): Promise<void> {
  await new Promise((resolve) => setTimeout(resolve, waitForLateFaults));
  printed.flush();
  process.disconnect();
  engine.exit(0);
}

process.on("SIGINT", () => engine.interrupt());
process.on("disconnect", () => engine.exit(0));
process.on("message", (request: Request) => {
  if (request.ask === "quit") void quit();
  else if (request.ask === "declarations") {
    say({ say: "declarations", declarations: engine.declarations(request.code) });
  } else void runCell(request.code, request.number).then((outcome) => say({ say: "ran", outcome }));
});

async function begin(): Promise<void> {
  await engine.prepare(); // a failure is told again by the first cell
  const versions = {
    refluxbook: packageVersion(packageFolder),
    ...engine.versions,
    node: process.versions.node,
  };
  say({ say: "ready", versions });
}

void begin();
