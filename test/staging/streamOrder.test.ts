import fc from "fast-check";
import { expect, test } from "vitest";
import type { TypedStream } from "../../src/staging/binaryInput";
import { constantVolatilityCurve } from "../../src/staging/equilibriumCurve";
import { streamsFromTheTop } from "../../src/staging/streamOrder";

const curve = constantVolatilityCurve(2.5);

function stream(path: string, lightFraction: number, q: number, stage?: number): TypedStream {
  return { path, lightFraction, q, flow: 1, stage, stagePath: `${path}.stage` };
}

const paths = (streams: readonly TypedStream[]): string[] =>
  streamsFromTheTop(streams, curve).map(({ path }) => path);

test("streams without stages stand by the liquid at which their q-line meets the curve, the richest on top", () => {
  // 0.5 as vapor meets the curve at x = 0.286, below 0.4 as liquid
  expect(paths([stream("vapor", 0.5, 0), stream("lean", 0.4, 1), stream("rich", 0.7, 1)])).toEqual([
    "rich",
    "lean",
    "vapor",
  ]);
});

test("streams with stages stand by stage, even against their compositions", () => {
  expect(paths([stream("a", 0.8, 1, 9), stream("b", 0.3, 1, 4)])).toEqual(["b", "a"]);
});

test("streams without a stage are put between those with one", () => {
  const mixed = [stream("low", 0.3, 1, 12), stream("draw", 0.6, 1), stream("high", 0.7, 1, 3)];
  expect(paths(mixed)).toEqual(["high", "draw", "low"]);
});

test("the order in which they were typed never matters", () => {
  const some = fc.array(
    fc.record({
      lightFraction: fc.double({ min: 0.1, max: 0.9, noNaN: true }),
      q: fc.double({ min: -0.5, max: 1.5, noNaN: true }),
      stage: fc.option(fc.integer({ min: 1, max: 30 }), { nil: undefined }),
    }),
    { minLength: 2, maxLength: 6 },
  );
  fc.assert(
    fc.property(some, (list) => {
      const streams = list.map(({ lightFraction, q, stage }, i) => stream(`${i}`, lightFraction, q, stage));
      expect(paths([...streams].reverse())).toEqual(paths(streams));
    }),
    { numRuns: 300, seed: 20261207 },
  );
});
