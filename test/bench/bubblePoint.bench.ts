/**
 * Speed of the bubble-point sweep beside plain C, in one run, on the same cases.
 * npx ts-node -T -P tsconfig.json test/bench/bubblePoint.bench.ts [cases]
 */
import { execFileSync } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { defineComponent } from "../../src/components/defineComponent";
import { bubblePointSweep } from "../../src/equilibrium/bubblePointSweep";

const rounds = 7;
const cases = Number(process.argv[2] ?? 1_000_000);

/** log10(P/Pa) = A - B/(T + C), as in bubblePointReference.c */
const antoine: Readonly<Record<string, readonly [number, number, number]>> = {
  "n-pentane": [8.97786, 1064.84, -41.136],
  "n-hexane": [9.00139, 1170.875, -48.833],
  "n-heptane": [9.02023, 1263.909, -56.718],
  "n-octane": [9.05075, 1356.36, -63.515],
  "n-nonane": [9.07356, 1438.03, -70.456],
};
const components = Object.keys(antoine);
const ownComponents = components.map((name) => {
  const [A, B, C] = antoine[name]!;
  const units = { logBase: 10, temperatureUnit: "K", pressureUnit: "Pa" } as const;
  return defineComponent({
    name,
    vaporPressure: { form: "antoine", A, B, C, ...units, range: [220, 500], source: "benchmark" },
  });
});

function drawCases(): { composition: Float64Array; pressure: Float64Array } {
  let state = 23456;
  const uniform = (): number => (state = (16807 * state) % 2147483647) / 2147483647;
  const n = components.length;
  const composition = new Float64Array(n * cases);
  const pressure = new Float64Array(cases);
  for (let c = 0; c < cases; c++) {
    let sum = 0;
    for (let i = 0; i < n; i++) sum += composition[n * c + i] = 0.05 + uniform();
    for (let i = 0; i < n; i++) composition[n * c + i]! /= sum;
    pressure[c] = 5e4 * 10 ** uniform();
  }
  return { composition, pressure };
}

function checksums(temperature: Float64Array): string {
  let [all, first] = [0, 0];
  for (let i = 0; i < temperature.length; i++) {
    all += temperature[i]!;
    if (i === 1999) first = all;
  }
  return `${all.toExponential(12)} ${first.toExponential(12)}`;
}

function report(name: string, nanoseconds: number, remark: string): void {
  console.log(`${name.padEnd(34)} ${nanoseconds.toFixed(0).padStart(7)} ns  ${remark}`);
}

function timeReference(): { nanoseconds: number; sums: string } | undefined {
  const folder = mkdtempSync(join(tmpdir(), "refluxbook-bench-"));
  try {
    const program = join(folder, "reference");
    const source = join(__dirname, "bubblePointReference.c");
    execFileSync("gcc", ["-O3", "-march=native", "-o", program, source, "-lm"], { stdio: "ignore" });
    let best = { nanoseconds: Infinity, sums: "" };
    for (let round = 0; round < rounds; round++) {
      const [time, ...sums] = execFileSync(program, [String(cases)], { encoding: "utf8" })
        .trim()
        .split(" ");
      if (Number(time) < best.nanoseconds) best = { nanoseconds: Number(time), sums: sums.join(" ") };
    }
    return best;
  } catch {
    return undefined;
  } finally {
    rmSync(folder, { recursive: true });
  }
}

const input = { components, ...drawCases() };
const reference = timeReference();
if (reference !== undefined) report("C, five Antoine components", reference.nanoseconds, reference.sums);
for (const own of [true, false]) {
  let best = Infinity;
  let temperature = new Float64Array(0);
  for (let round = 0; round < rounds; round++) {
    const start = process.hrtime.bigint();
    temperature = Float64Array.from(bubblePointSweep(own ? { ...input, ownComponents } : input).temperature);
    best = Math.min(best, Number(process.hrtime.bigint() - start) / cases);
  }
  const ratio =
    reference === undefined ? "" : `${(best / reference.nanoseconds).toFixed(2)} times the time of C  `;
  report(`bubblePointSweep, ${own ? "the same" : "of the table"}`, best, `${ratio}${checksums(temperature)}`);
}
