import { describe, expect, test } from "vitest";
import { binaryEquilibrium } from "../../src/equilibrium/binaryEquilibrium";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { dewPoint } from "../../src/equilibrium/dewPoint";

const aromatics = { light: "benzene", heavy: "toluene" } as const;

/** Value of a rising or falling curve between its points. */
function between(xs: readonly number[], ys: readonly number[], x: number): number {
  const i = Math.max(
    1,
    xs.findIndex((each) => each >= x),
  );
  const share = (x - xs[i - 1]!) / (xs[i]! - xs[i - 1]!);
  return ys[i - 1]! + share * (ys[i]! - ys[i - 1]!);
}

// Isobaric points at 101.3 kPa, T [K], x and y of benzene: Fluid Phase Equilibria (2012), DOI 10.1016/j.fluid.2012.09.019
test.each([
  [380.67, 0.071, 0.148],
  [377.99, 0.134, 0.265],
  [375.24, 0.205, 0.376],
  [372, 0.293, 0.497],
  [369.18, 0.375, 0.593],
  [366.67, 0.456, 0.672],
  [364.05, 0.543, 0.747],
  [361.41, 0.639, 0.817],
  [359.07, 0.731, 0.873],
  [357.37, 0.804, 0.91],
  [355.2, 0.903, 0.957],
  [354.25, 0.951, 0.979],
])("benzene and toluene as measured at %d K: T to 0.25 K, y to 0.009", (temperature, x, y) => {
  const { curve } = binaryEquilibrium({ pair: aromatics, pressure: "101.3 kPa" });
  expect(Math.abs(between(curve.liquid, curve.temperature, x) - temperature)).toBeLessThan(0.25);
  expect(Math.abs(between(curve.liquid, curve.vapor, x) - y)).toBeLessThan(0.009);
});

describe("the curve", () => {
  const pressure = 1.3e5;
  const result = binaryEquilibrium({ pair: aromatics, pressure });
  const { liquid, vapor, temperature, vaporAtMeanVolatility } = result.curve;

  test("is made of bubble and dew points", () => {
    for (let i = 1; i < liquid.length - 1; i += 8) {
      const [x, y] = [liquid[i]!, vapor[i]!];
      const bubble = bubblePoint({ composition: { benzene: x, toluene: 1 - x }, pressure });
      expect(bubble.temperature).toBeCloseTo(temperature[i]!, 8);
      expect(bubble.vapor["benzene"]!).toBeCloseTo(y, 9);
      const dew = dewPoint({ composition: { benzene: y, toluene: 1 - y }, pressure });
      expect(dew.temperature).toBeCloseTo(temperature[i]!, 7);
    }
  });

  test("runs from pure to pure, vapor richer than liquid, temperature falling", () => {
    expect([liquid[0], vapor[0], liquid.at(-1), vapor.at(-1)]).toEqual([0, 0, 1, 1]);
    expect(temperature[0]!).toBeCloseTo(result.boilingTemperature.heavy, 9);
    expect(temperature.at(-1)!).toBeCloseTo(result.boilingTemperature.light, 9);
    for (let i = 1; i < liquid.length; i++) {
      expect(temperature[i]!).toBeLessThan(temperature[i - 1]!);
      expect(vapor[i]!).toBeGreaterThan(vapor[i - 1]!);
      if (i < liquid.length - 1) expect(vapor[i]!).toBeGreaterThan(liquid[i]!);
    }
  });

  test("beside it, that of the mean volatility: y/(1 - y) = alpha x/(1 - x)", () => {
    const { mean, atLightEnd, atHeavyEnd } = result.relativeVolatility;
    expect(mean ** 2).toBeCloseTo(atLightEnd * atHeavyEnd, 9);
    const y = vaporAtMeanVolatility[20]!;
    const x = liquid[20]!;
    expect(y / (1 - y)).toBeCloseTo((mean * x) / (1 - x), 9);
  });
});

test("the light component must be the light one, and another one; the guard speaks", () => {
  const call = (light: string, heavy: string, pressure = 101325) =>
    binaryEquilibrium({ pair: { light, heavy }, pressure });
  expect(() => call("toluene", "benzene")).toThrow(/pair.light must boil below pair.heavy.*swap them/);
  expect(() => call("benzene", "71-43-2")).toThrow(/both benzene/);
  expect(() => call("benzene", "toluene", 6e6)).toThrow(/critical/);
  expect(() => call("benzene", "tolune", 6e6)).toThrow(/tolune/);
  expect(call("ethanol", "water").cautions[0]).toMatchObject({ code: "azeotrope", severity: "stop" });
});
