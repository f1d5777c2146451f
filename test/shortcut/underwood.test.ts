import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { fenske } from "../../src/shortcut/fenske";
import { underwood, type UnderwoodInput } from "../../src/shortcut/underwood";
import { refusal } from "./answerOrRefusal";
import { gap, largestGap, listed, record, records } from "./caseRecords";
import { anySplit } from "./splitArbitrary";

const ternary: UnderwoodInput = {
  ...records([0.3, 0.3, 0.4], [4, 2, 1]),
  q: 1,
  lightKey: "c1",
  heavyKey: "c2",
  lightKeyRecovery: 0.99,
  heavyKeyRecovery: 0.99,
};

/** McCabe and Thiele's pinch: where the q-line meets the equilibrium curve, in closed form. */
function pinchReflux(alpha: number, z: number, q: number, xD: number): number {
  const a = q * (alpha - 1);
  const b = q - z * (alpha - 1) - (q - 1) * alpha;
  const root = Math.sqrt(b * b + 4 * a * z);
  const x = b > 0 ? (2 * z) / (b + root) : (root - b) / (2 * a);
  const y = (alpha * x) / (1 + (alpha - 1) * x);
  return (xD - y) / (y - x);
}

describe("two components", () => {
  test.each([
    [1.3, 0.94097],
    [1, 1.1],
    [0.5, 1.49868],
    [0, 2.1],
    [-0.3, 2.54097],
  ])("q %f: the pinch of the McCabe-Thiele diagram, minimum reflux %f", (q, printed) => {
    const { minimumReflux } = underwood({
      ...records([0.5, 0.5], [2.5, 1]),
      q,
      lightKey: "c1",
      heavyKey: "c2",
      lightKeyRecovery: 0.95,
      heavyKeyRecovery: 0.95,
    });
    expect(Math.abs(minimumReflux - printed)).toBeLessThan(5e-6);
  });

  test("any volatility, feed and products: McCabe and Thiele's pinch in closed form", () => {
    const share = fc.double({ min: 0.01, max: 0.99, noNaN: true });
    fc.assert(
      fc.property(
        fc.double({ min: 1.005, max: 100, noNaN: true }),
        share,
        fc.double({ min: -1, max: 2, noNaN: true }).filter((q) => Math.abs(q) > 1e-3),
        share,
        share,
        (alpha, z, q, richer, leaner) => {
          const xD = z + richer * (1 - z);
          const xB = z * (1 - leaner);
          const distillate = (z - xB) / (xD - xB);
          const { minimumReflux } = underwood({
            ...records([z, 1 - z], [alpha, 1]),
            q,
            lightKey: "c1",
            heavyKey: "c2",
            lightKeyRecovery: (distillate * xD) / z,
            heavyKeyRecovery: ((1 - distillate) * (1 - xB)) / (1 - z),
          });
          expect(gap(minimumReflux + 1, pinchReflux(alpha, z, q, xD) + 1)).toBeLessThan(1e-9);
        },
      ),
      { numRuns: 1000, seed: 1925 },
    );
  });
});

describe("names, order and reference", () => {
  test("the order of the names, other names and another reference change nothing", () => {
    fc.assert(
      fc.property(
        anySplit,
        fc.array(fc.nat(1000), { minLength: 12, maxLength: 12 }),
        fc.double({ min: 0.01, max: 100, noNaN: true }),
        (input, ranks, factor) => {
          const order = Object.keys(input.composition)
            .map((name, i) => ({ name, rank: ranks[i]! }))
            .sort((a, b) => a.rank - b.rank);
          const renamed = (name: string): string => `component ${name}`;
          const composition = Object.fromEntries(
            order.map(({ name }) => [renamed(name), input.composition[name]!]),
          );
          const relativeVolatility = Object.fromEntries(
            [...order].reverse().map(({ name }) => [renamed(name), factor * input.relativeVolatility[name]!]),
          );
          const keys = { lightKey: renamed(input.lightKey), heavyKey: renamed(input.heavyKey) };
          const expected = underwood(input);
          const result = underwood({ ...input, composition, relativeVolatility, ...keys });
          expect(gap(result.minimumReflux, expected.minimumReflux)).toBeLessThan(1e-9);
          expect(largestGap(result.roots, expected.roots)).toBeLessThan(1e-9);
          expect(result.distributing).toEqual(expected.distributing.map(renamed));
          expect(Object.keys(result.distillateRecovery)).toEqual(Object.keys(composition));
        },
      ),
      { numRuns: 300, seed: 44 },
    );
  });

  test("the input is left as it was", () => {
    const copy = structuredClone(ternary);
    underwood(ternary);
    expect(ternary).toEqual(copy);
  });

  test("a component of many names is one row each in the result, even an awkward one", () => {
    const composition = JSON.parse('{"__proto__": 0.3, "constructor": 0.3, "c 3": 0.4}') as Record<
      string,
      number
    >;
    const relativeVolatility = JSON.parse('{"c 3": 1, "constructor": 2, "__proto__": 4}') as Record<
      string,
      number
    >;
    const result = underwood({
      ...ternary,
      composition,
      relativeVolatility,
      lightKey: "__proto__",
      heavyKey: "constructor",
    });
    expect(Object.keys(result.distillateRecovery)).toEqual(["__proto__", "constructor", "c 3"]);
    expect(result.minimumReflux).toBe(underwood(ternary).minimumReflux);
  });
});

describe("equal volatilities and absent components", () => {
  test("two components of one volatility give the result of both in one", () => {
    const apart = underwood({ ...ternary, ...records([0.3, 0.3, 0.15, 0.25], [4, 2, 1, 1]) });
    expect(gap(apart.minimumReflux, 2.2348704317919843)).toBeLessThan(1e-12);
    expect(apart.roots).toEqual(underwood(ternary).roots);
  });

  test("a component as volatile as a key shares the key's recovery and counts as distributing", () => {
    const { distillateRecovery, distributing, roots } = underwood({
      ...ternary,
      ...records([0.2, 0.1, 0.3, 0.4], [4, 4 * (1 + 1e-9), 2, 1]),
      heavyKey: "c3",
    });
    expect(distillateRecovery["c2"]).toBe(0.99);
    expect(distributing).toEqual(["c2"]);
    expect(roots).toHaveLength(2);
  });

  test("volatilities that all but coincide give nearly what equal ones give", () => {
    const composition = record([0.2, 0.3, 0.2, 0.3]);
    const at = (step: number) =>
      underwood({
        ...ternary,
        composition,
        relativeVolatility: record([4, 2 * (1 + step), 2, 1]),
        lightKey: "c3",
        heavyKey: "c4",
      });
    for (const step of [1e-12, 1e-7, 9.9e-7, 1.1e-6, 1e-5]) {
      expect(gap(at(step).minimumReflux, at(0).minimumReflux)).toBeLessThan(20 * step + 1e-12);
    }
    expect(at(1e-7).roots).toHaveLength(2);
    expect(at(1e-5).roots).toHaveLength(3);
  });

  test("a zero fraction has no root, changes nothing, and gets the recovery of a vanishing trace", () => {
    const with2 = (trace: number, alpha: number) =>
      underwood({
        ...ternary,
        ...records([0.2, 0.25, 0.2, 0.25, 0.1, trace], [4, 2.2, 2, 1, 0.9, alpha]),
        normalize: true,
        q: 0.8,
        lightKey: "c2",
        heavyKey: "c4",
        lightKeyRecovery: 0.9,
        heavyKeyRecovery: 0.8,
      });
    for (const alpha of [6, 3.9, 3, 2.3, 2.05, 1.5, 1.02, 0.95, 0.7, 0.3]) {
      const none = with2(0, alpha);
      expect(none.roots).toHaveLength(4);
      expect(none.distributing).toEqual(["c3", "c5"]);
      const trace = with2(1e-9, alpha);
      expect(trace.roots).toHaveLength(5);
      expect(gap(trace.minimumReflux, none.minimumReflux)).toBeLessThan(1e-7);
      expect(Math.abs(trace.distillateRecovery["c6"]! - none.distillateRecovery["c6"]!)).toBeLessThan(1e-6);
    }
  });

  test("an absent component exactly at a root of the others", () => {
    const [root] = underwood(ternary).roots;
    const result = underwood({ ...ternary, ...records([0.3, 0.3, 0.4, 0], [4, 2, 1, root! * 2]) });
    const nearby = underwood({ ...ternary, ...records([0.3, 0.3, 0.4, 0], [4, 2, 1, root! * 2.0001]) });
    expect(Math.abs(result.distillateRecovery["c4"]! - nearby.distillateRecovery["c4"]!)).toBeLessThan(1e-3);
  });
});

describe("feeds outside saturation", () => {
  test("superheated, q -0.4: the root below the lowest volatility is not used", () => {
    const result = underwood({ ...ternary, q: -0.4, lightKey: "c2", heavyKey: "c3" });
    expect(gap(result.minimumReflux, 2.37873544834774)).toBeLessThan(1e-9);
    expect(largestGap(result.roots, [3.3987137246910533, 1.6128897540233889])).toBeLessThan(1e-9);
  });

  test("where a flow vanishes first the value is still Underwood's, with a caution", () => {
    const { minimumReflux, cautions } = underwood({
      ...records([0.5, 0.5], [10, 1]),
      q: 2,
      lightKey: "c1",
      heavyKey: "c2",
      lightKeyRecovery: 0.6,
      heavyKeyRecovery: 0.9,
    });
    expect(minimumReflux).toBeLessThan(0);
    expect(cautions).toMatchObject([
      { code: "flow-vanishes-first", severity: "check", value: minimumReflux, limit: 0 },
    ]);
  });
});

describe("a component between the keys", () => {
  const input = { ...ternary, ...records([0.33, 0.33, 0.34], [4, 2, 1]), heavyKey: "c3" };

  test("the exact minimum lies between the single-root values, and a caution says so when they part", () => {
    const { minimumReflux, singleRootReflux, activeRoots, roots, cautions } = underwood(input);
    expect(activeRoots).toEqual(roots);
    expect(Math.max(...singleRootReflux)).toBeGreaterThan(minimumReflux);
    expect(Math.min(...singleRootReflux)).toBeLessThan(minimumReflux);
    expect(cautions.map(({ code }) => code)).toEqual(["components-distribute-between-keys"]);
  });

  test("all distributing at q 1: Shiras's straight line between the keys (recovery 0.4)", () => {
    const { distillateRecovery } = underwood({
      ...input,
      ...records([1, 1, 1], [4, 2, 1]),
      normalize: true,
      lightKeyRecovery: 0.9999999999,
      heavyKeyRecovery: 0.9,
    });
    expect(Math.abs(distillateRecovery["c2"]! - 0.4)).toBeLessThan(1e-9);
  });

  test("the single-root values rest on the Fenske distillate", () => {
    const { roots, singleRootReflux } = underwood(input);
    const kept = listed(fenske({ ...input, q: undefined } as never).distillateRecovery).map(
      (r, i) => r * listed(input.composition)[i]!,
    );
    const volatility = listed(input.relativeVolatility);
    const vapor = (root: number): number =>
      kept.reduce((sum, d, i) => sum + (volatility[i]! * d) / (volatility[i]! - root), 0);
    const total = kept.reduce((sum, d) => sum + d, 0);
    expect(
      largestGap(
        singleRootReflux,
        roots.map((root) => vapor(root) / total - 1),
      ),
    ).toBeLessThan(1e-9);
  });
});

describe("refusals", () => {
  test.each<[string, object, string[]]>([
    [
      "recoveries that leave the light key no richer",
      { lightKeyRecovery: 0.3, heavyKeyRecovery: 0.7 },
      ["infeasible specification-infeasible lightKeyRecovery"],
    ],
    ["the same key twice", { heavyKey: "c1" }, ["keys-equal heavyKey"]],
    ["the keys swapped", { lightKey: "c2", heavyKey: "c1" }, ["keys-reversed lightKey"]],
    [
      "keys of one volatility",
      { relativeVolatility: record([2, 2, 1]) },
      ["volatility-equal relativeVolatility.c1"],
    ],
    ["a full recovery", { lightKeyRecovery: 1 }, ["recovery-out-of-range lightKeyRecovery"]],
    ["a recovery in percent", { lightKeyRecovery: 99 }, ["recovery-out-of-range lightKeyRecovery"]],
    [
      "an endless volatility",
      { relativeVolatility: record([Infinity, 2, 1]) },
      ["not-finite relativeVolatility.c1"],
    ],
    [
      "a volatility below zero",
      { relativeVolatility: record([4, 2, -1]) },
      ["volatility-not-positive relativeVolatility.c3"],
    ],
    [
      "fractions that add up to 1.1",
      { composition: record([0.4, 0.3, 0.4]) },
      ["composition-sum composition"],
    ],
    [
      "a volatility too few",
      { relativeVolatility: record([4, 2]) },
      ["length-mismatch relativeVolatility.c3"],
    ],
    [
      "a volatility too many",
      { relativeVolatility: record([4, 2, 1, 0.5]) },
      ["length-mismatch relativeVolatility.c4"],
    ],
    ["a key that is not there", { heavyKey: "c9" }, ["key-absent heavyKey"]],
    ["a key that is absent", { composition: record([0, 0.6, 0.4]) }, ["key-absent lightKey"]],
    ["no q", { q: undefined }, ["missing-field q"]],
    ["a q that no feed has", { q: 1e6 }, ["above-limit q"]],
    ["a misspelt field", { lightkey: "c1" }, ["unknown-field lightkey"]],
    [
      "all at once",
      { q: "1", lightKey: 3, heavyKeyRecovery: -1 },
      ["wrong-type lightKey", "recovery-out-of-range heavyKeyRecovery", "wrong-type q"],
    ],
  ])("%s", (_, change, expected) => {
    expect(refusal(() => underwood({ ...ternary, ...change }))).toEqual(expected);
  });
});
