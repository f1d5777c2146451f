import * as fs from "node:fs";
import * as path from "node:path";
import { type Arguments, lastValue, type Option, optionHelp, readArguments } from "./commandLine";
import { readSetting, type Setting } from "./notebook/parameters";
import type { CellProgress, RunFailure } from "./notebook/runNotebook";
import { UsageError } from "./usageError";

const options: readonly Option[] = [
  { name: "--set", value: "name=value", help: "give a parameter of the notebook another value; repeatable" },
  { name: "--feed", value: "file", help: "feed file to use: sets the parameter feedFile" },
  { name: "--out", value: "folder", help: "where the two files go (out)" },
  { name: "--name", value: "name", help: "what they are called (the notebook's name)" },
  { name: "--time-limit", value: "seconds", help: "longest time for one cell (600)" },
  {
    name: "--still-figures",
    help: "save the notebook small: figures as pictures, live ones in the report only",
  },
  { name: "--help", help: "this text" },
];

export const runHelp = `refluxbook run <notebook> [options]

Runs every cell of a notebook from top to bottom, without Jupyter, and writes the executed notebook and a
report (one HTML file that opens offline). Both are written also when a cell fails.

${optionHelp(options)}

A value is a JSON literal (1.3, true, [1, 2], "text") or bare text (--set pressure="1.6 bar").

Exit codes: 0 all cells ran; 1 a cell failed; 2 wrong usage or unreadable notebook; 3 a cell ran over its time
or the process that runs the cells ended.
`;

/** The feed file as the notebook's cells find it: relative to the notebook's folder, where there is such a way. */
function feedSetting(feed: string, folder: string): Setting {
  const file = path.resolve(feed);
  if (!fs.existsSync(file)) throw new UsageError(`--feed: there is no file ${feed}`);
  const relative = path.relative(folder, file);
  return { name: "feedFile", value: relative.split(path.sep).join("/") };
}

function readSettings(typed: Arguments, folder: string): Setting[] {
  const settings = (typed.given.get("--set") ?? []).map(readSetting);
  const feed = lastValue(typed, "--feed");
  if (feed !== undefined) settings.push(feedSetting(feed, folder));
  const twice = settings.find(({ name }, i) => settings.findIndex((other) => other.name === name) < i);
  if (twice !== undefined) throw new UsageError(`the parameter ${twice.name} is set twice`);
  return settings;
}

function readTimeLimit(typed: Arguments): number {
  const text = lastValue(typed, "--time-limit") ?? "600";
  const seconds = Number(text);
  if (!(seconds > 0 && seconds <= 1e6)) {
    throw new UsageError(`--time-limit needs seconds above 0 and at most 1000000, got ${text}`);
  }
  return seconds;
}

function tellProgress({ number, count, title, seconds, failed }: CellProgress): void {
  const mark = failed ? "  FAILED" : "";
  process.stderr.write(`cell ${number} of ${count}  ${seconds.toFixed(1)} s  ${title}${mark}\n`);
}

function tellFailure({ number, title, firstLine, error }: RunFailure): void {
  const heading = title === firstLine ? "" : `, under "${title}"`;
  const text = error.traceback.length === 0 ? `${error.ename}: ${error.evalue}` : error.traceback.join("\n");
  process.stderr.write(`\ncell ${number} failed${heading}: ${firstLine}\n${text}\n\n`);
}

function exitCode(failure: RunFailure | undefined): number {
  if (failure === undefined) return 0;
  return failure.why === "over-time" || failure.why === "kernel-died" ? 3 : 1;
}

/** The notebook to run and the two files to write. */
function filesOf(typed: Arguments): { notebook: string; executed: string; report: string } {
  const [given, ...more] = typed.positional;
  if (given === undefined) throw new UsageError("which notebook? refluxbook run <notebook>");
  if (more.length > 0) throw new UsageError(`one notebook at a time; got ${typed.positional.join(", ")}`);
  const notebook = path.resolve(given);
  const name = lastValue(typed, "--name") ?? path.basename(notebook, ".ipynb");
  if (path.basename(name) !== name) throw new UsageError(`--name is a name without a folder, got ${name}`);
  const executed = path.resolve(lastValue(typed, "--out") ?? "out", `${name}.ipynb`);
  if (executed === notebook)
    throw new UsageError("--out would overwrite the notebook; choose another folder or --name");
  return { notebook, executed, report: executed.replace(/\.ipynb$/, ".html") };
}

/** `refluxbook run`: gives the exit code. */
export async function runCommand(words: readonly string[]): Promise<number> {
  const typed = readArguments(words, options);
  if (typed.given.has("--help")) {
    process.stdout.write(runHelp);
    return 0;
  }
  const { notebook, executed, report } = filesOf(typed);
  const folder = path.dirname(notebook);
  const settings = readSettings(typed, folder);
  const timeLimit = readTimeLimit(typed);
  // Loaded when needed, so that help and mistakes answer at once.
  const { runNotebook } = await import("./notebook/runNotebook");
  const run = await runNotebook(notebook, { settings, timeLimit, onCell: tellProgress });
  const { saveNotebook } = await import("./notebook/saveNotebook");
  const { writeWhole } = await import("./notebook/notebookFile");
  const { reportPage } = await import("./report/reportPage");
  saveNotebook(executed, run.notebook, typed.given.has("--still-figures"));
  writeWhole(report, reportPage(run, { name: path.basename(notebook), folder, date: new Date() }));
  if (run.failure !== undefined) tellFailure(run.failure);
  process.stdout.write(`${path.relative("", executed)}\n${path.relative("", report)}\n`);
  return exitCode(run.failure);
}
