/**
 * Speed of the shortcut arithmetic beside plain C and a numpy script, in one run, on the same cases.
 * npx ts-node -T -P tsconfig.json test/bench/shortcut.bench.ts [cases]
 */
import { execFileSync } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { shortcutDesign } from "../../src/column/shortcutDesign";
import { underwood } from "../../src/shortcut/underwood";
import { drawShortcutCases, type ShortcutCases } from "./shortcutCases";
import { type Checksums, runExact, runSingleRoot } from "./shortcutKernelRun";

interface Timing {
  readonly nanoseconds: number;
  readonly checksum: string;
}

interface CallInput {
  readonly composition: Readonly<Record<string, number>>;
  readonly relativeVolatility: Readonly<Record<string, number>>;
  readonly q: number;
  readonly lightKey: string;
  readonly heavyKey: string;
  readonly lightKeyRecovery: number;
  readonly heavyKeyRecovery: number;
  readonly refluxOverMinimum: number;
}

const rounds = 7;
const scriptCases = 2000;

/** The faster of two timings: the other one was disturbed. */
function faster(a: Timing | undefined, b: Timing | undefined): Timing | undefined {
  if (a === undefined || b === undefined) return a ?? b;
  return a.nanoseconds < b.nanoseconds ? a : b;
}

function timed(cases: ShortcutCases, run: (cases: ShortcutCases) => Checksums): Timing {
  const start = process.hrtime.bigint();
  const { all, first2000, roots } = run(cases);
  const nanoseconds = Number(process.hrtime.bigint() - start) / cases.count;
  return { nanoseconds, checksum: `${digits(all)} ${digits(first2000)} ${digits(roots)}` };
}

/** Thirteen digits with a two-digit exponent, as C and Python print them. */
function digits(value: number): string {
  return value.toExponential(12).replace(/e\+(\d)$/, "e+0$1");
}

/** Runs a reference program that prints nanoseconds and checksums; undefined where it cannot run. */
function timedProgram(program: string, words: readonly string[]): Timing | undefined {
  try {
    const [nanoseconds, ...checksums] = execFileSync(program, words, { encoding: "utf8" }).trim().split(" ");
    return { nanoseconds: Number(nanoseconds), checksum: checksums.join(" ") };
  } catch {
    return undefined;
  }
}

function compileReference(folder: string): string | undefined {
  const program = join(folder, "shortcutReference");
  const source = join(__dirname, "shortcutReference.c");
  try {
    execFileSync("gcc", ["-O3", "-march=native", "-o", program, source, "-lm"], { stdio: "ignore" });
    return program;
  } catch {
    return undefined;
  }
}

/** Public calls, records in and out; the checksum is the sum of the minimum reflux ratios. */
function timedCalls(cases: ShortcutCases, call: (input: CallInput) => number): Timing {
  const names = ["a", "b", "c", "d", "e"];
  const inputs: CallInput[] = Array.from({ length: scriptCases }, (_, c) => {
    const at = (list: Float64Array): Record<string, number> =>
      Object.fromEntries(names.map((name, i) => [name, list[5 * c + i]!]));
    return {
      composition: at(cases.fraction),
      relativeVolatility: at(cases.volatility),
      q: cases.q[c]!,
      lightKey: names[cases.lightKey[c]!]!,
      heavyKey: names[cases.lightKey[c]! + 1]!,
      lightKeyRecovery: cases.lightKeyRecovery[c]!,
      heavyKeyRecovery: cases.heavyKeyRecovery[c]!,
      refluxOverMinimum: cases.refluxOverMinimum[c]!,
    };
  });
  let sum = 0;
  const start = process.hrtime.bigint();
  for (let repeat = 0; repeat < 20; repeat++) for (const input of inputs) sum += call(input);
  const nanoseconds = Number(process.hrtime.bigint() - start) / (20 * scriptCases);
  return { nanoseconds, checksum: digits(sum / 20) };
}

function report(name: string, timing: Timing | undefined, comparison?: string): void {
  if (timing === undefined) return console.log(`${name.padEnd(34)} not available here`);
  const time = `${timing.nanoseconds.toFixed(0).padStart(7)} ns`;
  console.log(`${name.padEnd(34)} ${time}  ${(comparison ?? "").padEnd(30)} ${timing.checksum}`);
}

/** How many times as long as the reference, or how many times as fast; empty when either could not run. */
function ratio(a: Timing | undefined, b: Timing | undefined, words: string): string {
  return a === undefined || b === undefined ? "" : `${(a.nanoseconds / b.nanoseconds).toFixed(2)} ${words}`;
}

function callUnderwood({ refluxOverMinimum: _, ...input }: CallInput): number {
  return underwood(input).minimumReflux;
}

function callShortcutDesign({ composition, q, ...split }: CallInput): number {
  return shortcutDesign({ feed: { flow: 1, composition, q }, ...split }).minimumReflux;
}

const cases = drawShortcutCases(Number(process.argv[2] ?? 1_000_000));
const folder = mkdtempSync(join(tmpdir(), "refluxbook-bench-"));
const program = compileReference(folder);
const best: Record<"c" | "script" | "single" | "exact" | "underwood" | "design", Timing | undefined> = {
  c: undefined,
  script: undefined,
  single: undefined,
  exact: undefined,
  underwood: undefined,
  design: undefined,
};
for (let round = 0; round < rounds; round++) {
  if (program !== undefined) best.c = faster(best.c, timedProgram(program, [String(cases.count)]));
  best.single = faster(best.single, timed(cases, runSingleRoot));
  best.exact = faster(best.exact, timed(cases, runExact));
  const script = [join(__dirname, "shortcutReference.py"), String(scriptCases)];
  best.script = faster(best.script, timedProgram("python3", script));
  best.underwood = faster(best.underwood, timedCalls(cases, callUnderwood));
  best.design = faster(best.design, timedCalls(cases, callShortcutDesign));
}
rmSync(folder, { recursive: true });
report("C, single root", best.c);
report("array kernel, single root", best.single, ratio(best.single, best.c, "times the time of C"));
report("array kernel, exact minimum", best.exact, ratio(best.exact, best.c, "times the time of C"));
report("numpy and scipy, single root", best.script);
report(
  "underwood, one public call",
  best.underwood,
  ratio(best.script, best.underwood, "times as fast as numpy"),
);
report(
  "shortcutDesign, one public call",
  best.design,
  ratio(best.script, best.design, "times as fast as numpy"),
);
