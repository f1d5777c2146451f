import fc from "fast-check";
import { describe, expect, test } from "vitest";
import {
  constantVolatilityCurve,
  type EquilibriumCurve,
  functionCurve,
  linearCurve,
  monotoneCurve,
} from "../../src/staging/equilibriumCurve";

/** Benzene-toluene at 101.32 kPa as printed with the Geankoplis examples. */
const xs = Float64Array.of(0, 0.13, 0.258, 0.411, 0.581, 0.78, 1);
const ys = Float64Array.of(0, 0.261, 0.456, 0.632, 0.777, 0.9, 1);
const margules = (x: number): number => {
  const k = 2.5 * Math.exp(0.8 * ((1 - x) ** 2 - x * x));
  return (k * x) / (1 + (k - 1) * x);
};

const curves: [string, EquilibriumCurve][] = [
  ["constant volatility", constantVolatilityCurve(2.5)],
  ["straight lines", linearCurve(xs, ys)],
  ["monotone cubic", monotoneCurve(xs, ys)],
  ["function", functionCurve(margules)],
];

const fraction = fc.double({ min: 1e-6, max: 1 - 1e-6, noNaN: true });
const runs = { numRuns: 300, seed: 20261202 };

test("stage liquids at volatility 2.5: recalculated integrated design project, section 4.4 (2026)", () => {
  const y = [0.9, 0.8217, 0.7322, 0.6483, 0.5829, 0.4949, 0.3882, 0.2784, 0.1832, 0.112];
  const x = [0.783, 0.648, 0.522, 0.424, 0.359, 0.282, 0.202, 0.134, 0.082, 0.048];
  const { liquid } = constantVolatilityCurve(2.5);
  y.forEach((each, i) => expect(Math.abs(liquid(each) - x[i]!)).toBeLessThan(0.0008));
});

test("one stage contacting liquid and vapor: Geankoplis, Transport Processes and Unit Operations, Example 11.2-1 (p. 642)", () => {
  // 110 of liquid at 0.30 meets 100 of vapor at 0.40; printed x = 0.254, y = 0.4506.
  const { vapor } = monotoneCurve(xs, ys);
  const y = 0.4 + (110 / 100) * (0.3 - 0.254);
  expect(Math.abs(vapor(0.254) - y)).toBeLessThan(0.001);
  expect(Math.abs(vapor(0.254) - 0.4506)).toBeLessThan(0.001);
});

describe.each(curves)("%s", (_name, curve) => {
  test("liquid undoes vapor", () => {
    fc.assert(
      fc.property(fraction, (x) => {
        expect(Math.abs(curve.liquid(curve.vapor(x)) / x - 1)).toBeLessThan(1e-9);
      }),
      runs,
    );
  });

  test("vapor rises with liquid, from 0 to 1", () => {
    fc.assert(
      fc.property(fraction, fraction, (a, b) => {
        fc.pre(Math.abs(a - b) > 1e-9);
        expect(Math.sign(curve.vapor(a) - curve.vapor(b))).toBe(Math.sign(a - b));
      }),
      runs,
    );
    expect([curve.vapor(0), curve.vapor(1)]).toEqual([0, 1]);
  });
});

describe("curves through points", () => {
  test.each([
    ["straight lines", linearCurve(xs, ys)],
    ["monotone cubic", monotoneCurve(xs, ys)],
  ])("%s meets every point, both ways", (_name, curve) => {
    xs.forEach((x, i) => {
      expect(curve.vapor(x)).toBeCloseTo(ys[i]!, 14);
      expect(curve.liquid(ys[i]!)).toBeCloseTo(x, 14);
    });
  });

  test("a monotone cubic stays between its points where they hardly rise (Fritsch and Carlson 1980)", () => {
    const flat = monotoneCurve(
      Float64Array.of(0, 0.1, 0.2, 0.6, 1),
      Float64Array.of(0, 0.6, 0.6001, 0.6002, 1),
    );
    for (let x = 0.1; x <= 0.6; x += 0.001) {
      expect(flat.vapor(x)).toBeGreaterThanOrEqual(0.6 - 1e-15);
      expect(flat.vapor(x)).toBeLessThanOrEqual(0.6002 + 1e-15);
    }
  });

  test("a monotone cubic is smooth: its slope is the same on both sides of a point", () => {
    const { vapor } = monotoneCurve(xs, ys);
    const h = 1e-6;
    for (const x of xs.subarray(1, -1)) {
      const left = (vapor(x) - vapor(x - h)) / h;
      const right = (vapor(x + h) - vapor(x)) / h;
      expect(Math.abs(left - right)).toBeLessThan(1e-4);
    }
  });
});
