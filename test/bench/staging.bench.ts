/**
 * Speed of the binary staircase: nanoseconds a stage beside the bare recurrence in a plain loop, and microseconds a call.
 * npx ts-node -T -P tsconfig.json test/bench/staging.bench.ts
 */
import { mccabeThiele } from "../../src/column/mccabeThiele";
import { columnFlows } from "../../src/staging/binaryColumn";
import { constantVolatilityCurve } from "../../src/staging/equilibriumCurve";
import { smoker } from "../../src/staging/smoker";
import { stepStages } from "../../src/staging/stepStages";

/** The least time of one call [ns] over rounds of `calls`; long staircases need the more rounds to warm up. */
function leastTime(calls: number, call: () => unknown): number {
  const rounds = calls === 1 ? 300 : 30;
  let least = Infinity;
  for (let round = 0; round < rounds; round++) {
    const start = process.hrtime.bigint();
    for (let i = 0; i < calls; i++) call();
    least = Math.min(least, Number(process.hrtime.bigint() - start) / calls);
  }
  return least;
}

function report(name: string, value: number, unit: string): void {
  console.log(`${name.padEnd(44)} ${value.toFixed(1).padStart(8)} ${unit}`);
}

const volatility = 1.0005;
const products = { distillateLightFraction: 0.95, bottomsLightFraction: 0.05 };
const column = { streams: [{ flow: 1, lightFraction: 0.5, q: 1 }], ...products, openSteam: false };
const flows = columnFlows(column, 6000);
const curve = constantVolatilityCurve(volatility);
const rules = { ...products, efficiency: 1, idealFirstStage: false, idealReboiler: false };
const stairs = stepStages(curve, flows, rules);
if ("reason" in stairs) throw new Error(stairs.reason);
const { count, streamStages } = stairs;

function recurrence(): number {
  let y = 0.95;
  let x = 0.95;
  for (let stage = 1; stage <= count; stage++) {
    x = y / (volatility - (volatility - 1) * y);
    const { liquid, vapor, lightUp } = flows.sections[stage < streamStages[0]! ? 0 : 1]!;
    y = (liquid * x + lightUp) / vapor;
  }
  return x;
}

report(
  `stepStages, ${count} stages`,
  leastTime(1, () => stepStages(curve, flows, rules)) / count,
  "ns/stage",
);
report("bare recurrence", leastTime(1, recurrence) / count, "ns/stage");

const task = { ...products, feed: { lightFraction: 0.5, q: 1 }, refluxRatio: 1.8 };
const constant = { ...task, relativeVolatility: 2.5 };
const pair = { ...task, pair: { light: "benzene", heavy: "toluene" }, pressure: 101_325 };
report("mccabeThiele, constant volatility", leastTime(1000, () => mccabeThiele(constant)) / 1000, "us/call");
report("mccabeThiele, pair at a pressure", leastTime(30, () => mccabeThiele(pair)) / 1000, "us/call");
report("smoker", leastTime(1000, () => smoker(constant)) / 1000, "us/call");
