import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { findRoot } from "../../src/numerics/findRoot";

describe("roots known in closed form", () => {
  test.each<[string, (x: number) => number, number, number, number]>([
    ["x^2 = 2", (x) => x * x - 2, 1, 2, Math.SQRT2],
    ["the same from the other side", (x) => x * x - 2, 2, 1, Math.SQRT2],
    ["exp x = 1e5", (x) => Math.exp(x) - 1e5, -100, 700, Math.log(1e5)],
    ["a pole at one end", (x) => 1 / (x - 3) + 6, 3 - 1e-9, -50, 3 - 1 / 6],
    ["a flat root", (x) => (x - 1) ** 3, -5, 4, 1],
    ["a jump", (x) => (x < 0.3 ? -1 : 1), 0, 1, 0.3],
    ["at the lower end", (x) => x, 0, 1, 0],
    ["at the upper end", (x) => x - 1, 0, 1, 1],
    ["zero inside", (x) => Math.sinh(x), -3, 100, 0],
    ["a wide bracket", (x) => Math.atan(x - 7), -1e10, 1e12, 7],
  ])("%s", (_, f, lower, upper, root) => {
    expect(Math.abs(findRoot(f, lower, upper)! - root)).toBeLessThan(
      2e-15 * (Math.abs(root) + Math.abs(upper)),
    );
  });
});

test("no root without a change of sign, and none where there is no value", () => {
  expect(findRoot((x) => x + 1, 0, 1)).toBeUndefined();
  expect(findRoot(() => Number.NaN, 0, 1)).toBeUndefined();
  expect(findRoot((x) => (x === 0 ? -1 : x === 1 ? 1 : Number.NaN), 0, 1)).toBeUndefined();
});

test("any rising cubic: never outside the bracket, found in a bounded number of evaluations", () => {
  const number = fc.double({ min: -100, max: 100, noNaN: true });
  fc.assert(
    fc.property(number, fc.double({ min: 0, max: 50, noNaN: true }), (root, slope) => {
      let evaluations = 0;
      const f = (x: number): number => {
        evaluations++;
        expect(x >= -101 && x <= 101).toBe(true);
        return (x - root) * (slope + (x - root) ** 2 + 0.1);
      };
      const found = findRoot(f, -101, 101)!;
      expect(Math.abs(found - root)).toBeLessThan(1e-12 * (1 + Math.abs(root)));
      expect(evaluations).toBeLessThan(130);
    }),
    { numRuns: 1000, seed: 28 },
  );
});
