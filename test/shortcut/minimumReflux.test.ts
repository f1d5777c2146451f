import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { underwood, type UnderwoodInput, type UnderwoodResult } from "../../src/shortcut/underwood";
import { listed } from "./caseRecords";
import { expectFinite } from "./answerOrRefusal";
import { anySplit } from "./splitArbitrary";

/** Σ αᵢ nᵢ / (αᵢ − θ) with a bound on its rounding error, θ being known to the last digit only. */
function underwoodSum(volatility: readonly number[], amounts: readonly number[], root: number) {
  let sum = 0;
  let error = 0;
  volatility.forEach((alpha, i) => {
    const term = (alpha * amounts[i]!) / (alpha - root);
    sum += term;
    error += Math.abs(term) * (1e-10 + (4e-16 * alpha) / Math.abs(alpha - root));
  });
  return { sum, error };
}

/** What is wrong with a minimum reflux, by Underwood's equations alone. */
function contradictions(input: UnderwoodInput, result: UnderwoodResult): string[] {
  const heavy = input.relativeVolatility[input.heavyKey]!;
  const volatility = listed(input.relativeVolatility).map((alpha) => alpha / heavy);
  const feed = listed(input.composition);
  const recovery = listed(result.distillateRecovery);
  const distillate = feed.map((z, i) => z * recovery[i]!);
  const bottoms = feed.map((z, i) => z * (1 - recovery[i]!));
  const found: string[] = [];
  const expectThat = (holds: boolean, what: string): void => void (holds || found.push(what));
  expectThat(
    recovery.every((r) => r >= 0 && r <= 1 + 1e-12),
    "a recovery outside 0 to 1",
  );
  expectThat(
    recovery.every((r, i) => i === 0 || r <= recovery[i - 1]! + 1e-12),
    "recoveries that rise",
  );
  expectThat(result.roots.length === feed.length - 1, "a root too few or too many");
  result.roots.forEach((root, k) => {
    expectThat(root <= volatility[k]! && root >= volatility[k + 1]!, `root ${k} outside its gap`);
    const change = underwoodSum(volatility, feed, root);
    expectThat(
      Math.abs(change.sum - (1 - input.q)) <= change.error + 1e-10,
      `root ${k} does not solve the feed`,
    );
    const vapor = underwoodSum(volatility, distillate, root);
    const excess = vapor.sum - result.minimumVapor;
    if (!result.activeRoots.includes(root))
      return expectThat(excess <= vapor.error, `root ${k} asks for more vapor`);
    expectThat(Math.abs(excess) <= vapor.error, `root ${k} does not bind`);
    const stripping = underwoodSum(volatility, bottoms, root);
    const balance = result.minimumVapor + stripping.sum - (1 - input.q);
    expectThat(
      Math.abs(balance) <= stripping.error + vapor.error + 1e-10,
      `root ${k}: vapors do not differ by 1 - q`,
    );
  });
  const total = distillate.reduce((sum, d) => sum + d, 0);
  expectThat(
    Math.abs(result.minimumReflux + 1 - result.minimumVapor / total) <
      1e-9 * (2 + Math.abs(result.minimumReflux)),
    "R + 1 is not V / D",
  );
  return found;
}

describe("minimum reflux over random splits", () => {
  test("each answer satisfies Underwood's equations at every root, and no other is left out", () => {
    fc.assert(
      fc.property(anySplit, (input) => {
        const result = underwood(input);
        expectFinite(result);
        expect(contradictions(input, result)).toEqual([]);
      }),
      { numRuns: 3000, seed: 1948 },
    );
  });

  test("very hot and very cold feeds", () => {
    fc.assert(
      fc.property(anySplit, fc.double({ min: -100, max: 100, noNaN: true }), (split, q) => {
        const input = { ...split, q };
        expect(contradictions(input, underwood(input))).toEqual([]);
      }),
      { numRuns: 1000, seed: 603 },
    );
  });

  test("the distributing components are those between the first and the last active root", () => {
    fc.assert(
      fc.property(anySplit, (input) => {
        const { activeRoots, distributing } = underwood(input);
        expect(distributing.length).toBe(activeRoots.length - 1);
      }),
      { numRuns: 500, seed: 8 },
    );
  });

  test("a sharper split never takes less vapor", () => {
    fc.assert(
      fc.property(anySplit, fc.double({ min: 0, max: 0.9, noNaN: true }), (input, share) => {
        const sharper = {
          ...input,
          lightKeyRecovery: 1 - (1 - input.lightKeyRecovery) * (1 - share),
          heavyKeyRecovery: 1 - (1 - input.heavyKeyRecovery) * (1 - share),
        };
        const less = underwood(input).minimumVapor;
        expect(underwood(sharper).minimumVapor).toBeGreaterThanOrEqual(less - 1e-9 * (1 + Math.abs(less)));
      }),
      { numRuns: 500, seed: 9 },
    );
  });
});

test("fifty distributing components and five hundred in all answer within a second", () => {
  const names = Array.from({ length: 500 }, (_, i) => `n${i}`);
  const composition = Object.fromEntries(names.map((name) => [name, 1]));
  const relativeVolatility = Object.fromEntries(names.map((name, i) => [name, 1.02 ** i]));
  const start = performance.now();
  const result = underwood({
    composition,
    relativeVolatility,
    normalize: true,
    q: 1,
    lightKey: "n250",
    heavyKey: "n200",
    lightKeyRecovery: 0.6,
    heavyKeyRecovery: 0.5,
  });
  expect(performance.now() - start).toBeLessThan(1000);
  expect(result.roots).toHaveLength(499);
  expect(result.distributing.length).toBeGreaterThan(49);
  expectFinite(result);
});
