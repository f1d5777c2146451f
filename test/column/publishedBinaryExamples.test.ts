import { describe, expect, test } from "vitest";
import { mccabeThiele } from "../../src/column/mccabeThiele";
import type { McCabeThieleInput } from "../../src/column/mccabeThieleInput";

const points = (x: number[], y: number[]): [number, number][] => x.map((each, i) => [each, y[i]!]);

/** Benzene-toluene at 101.32 kPa as printed with the Geankoplis examples. */
const geankoplis = points([0, 0.13, 0.258, 0.411, 0.581, 0.78, 1], [0, 0.261, 0.456, 0.632, 0.777, 0.9, 1]);

/** Ethanol-water at 1 atm, standard handbook table (Perry), from memory; up to its azeotrope. */
const ethanolWater = points(
  [
    0, 0.019, 0.0721, 0.0966, 0.1238, 0.1661, 0.2337, 0.2608, 0.3273, 0.3965, 0.5079, 0.5198, 0.5732, 0.6763,
    0.7472, 0.8943, 1,
  ],
  [
    0, 0.17, 0.3891, 0.4375, 0.4704, 0.5089, 0.5445, 0.558, 0.5826, 0.6122, 0.6564, 0.6599, 0.6841, 0.7385,
    0.7815, 0.8943, 1,
  ],
);

describe("Geankoplis, Transport Processes and Unit Operations, Example 11.4-2 (p. 660)", () => {
  // Printed minimum reflux 1.104 comes from a q-line slope of 1/(q - 1); with q/(q - 1) it is 1.14 to 1.20.
  const column = (interpolation: "linear" | "monotone"): McCabeThieleInput => ({
    equilibriumCurve: { points: geankoplis, interpolation },
    feed: { lightFraction: 0.45, q: 1.193679 },
    distillateLightFraction: 0.95,
    bottomsLightFraction: 0.1,
    refluxOverMinimum: 1.5,
  });
  test.each(["linear", "monotone"] as const)(
    "minimum reflux 1.17 and 5.8 stages at total reflux, %s curve",
    (kind) => {
      const result = mccabeThiele(column(kind));
      expect(Math.abs(result.minimumReflux - 1.17)).toBeLessThan(0.05);
      expect(Math.abs(result.minimumStages - 5.8)).toBeLessThan(0.2);
    },
  );
});

describe("Coulson, Richardson, Backhurst and Harker, vol. 2, Examples 11.7 and 11.8 (pp. 564, 567)", () => {
  const curve = points(
    [0, 0.048, 0.12, 0.208, 0.298, 0.382, 0.492, 0.644, 0.79, 1],
    [0, 0.127, 0.252, 0.379, 0.498, 0.594, 0.708, 0.818, 0.9, 1],
  );
  const result = mccabeThiele({
    equilibriumCurve: { points: curve, interpolation: "linear" },
    feed: { lightFraction: 0.4, q: 1, flow: 100 },
    distillateLightFraction: 0.9,
    bottomsLightFraction: 0.1,
    refluxRatio: 3,
  });
  test("37.5 and 62.5 of 100, seven plates and the reboiler", () => {
    expect(result.distillateFlow).toBeCloseTo(37.5, 9);
    expect(result.bottomsFlow).toBeCloseTo(62.5, 9);
    expect(result.stagesWhole).toBe(8);
  });
  test("liquids stage by stage, within the 0.004 of the printed table", () => {
    const printed = [0.79, 0.644, 0.492, 0.382, 0.298, 0.208, 0.12, 0.048];
    result.steps.forEach(({ x }, i) => expect(Math.abs(x - printed[i]!)).toBeLessThan(0.004));
  });
});

describe("Wankat, Separation Process Engineering, Example 4-4: open steam, methanol-water", () => {
  // Equilibrium: standard handbook table of methanol-water at 1 atm, from memory.
  const curve = points(
    [0, 0.02, 0.04, 0.06, 0.08, 0.1, 0.15, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.95, 1],
    [
      0, 0.134, 0.23, 0.304, 0.365, 0.418, 0.517, 0.579, 0.665, 0.729, 0.779, 0.825, 0.87, 0.915, 0.958,
      0.979, 1,
    ],
  );
  const result = mccabeThiele({
    equilibriumCurve: { points: curve, interpolation: "linear" },
    feed: { lightFraction: 0.6, q: 0.7, flow: "350 kmol/h" },
    distillateLightFraction: 0.95,
    bottomsLightFraction: 0.08,
    refluxRatio: 3,
    reboiler: "open-steam",
  });
  test("just under five stages, feed on stage 3 or 4", () => {
    expect(Math.abs(result.stages - 5)).toBeLessThan(0.3);
    expect(result.stages).toBeLessThan(5);
    expect([3, 4]).toContain(result.feedStage);
  });
  test("top operating line meets x = 0 at 0.2375", () => {
    const { liquid, vapor } = result.sections[0]!;
    expect((1 - liquid / vapor) * 0.95).toBeCloseTo(0.2375, 9);
  });
});

describe("Seader and Henley, Separation Process Principles, ethanol-water with z = 0.20 (solutions)", () => {
  // The printed minimum reflux 1.86 is a misread tangent; the table gives 2.00.
  const result = mccabeThiele({
    equilibriumCurve: { points: ethanolWater, interpolation: "linear" },
    feed: { lightFraction: 0.2, q: 1, flow: 100 },
    distillateLightFraction: 0.85,
    bottomsLightFraction: 0.00777439,
    refluxOverMinimum: 1.5,
  });
  test("products 22.82 and 77.18 of 100", () => {
    expect(Math.abs(result.distillateFlow - 22.82)).toBeLessThan(0.01);
    expect(Math.abs(result.bottomsFlow - 77.18)).toBeLessThan(0.01);
  });
  test("a tangent pinch at minimum reflux 2.00, and about 10 stages at total reflux", () => {
    expect(result.minimumRefluxLimitedBy).toBe("tangent-pinch");
    expect(Math.abs(result.minimumReflux - 1.997)).toBeLessThan(0.001);
    expect(Math.abs(result.minimumStages - 10)).toBeLessThan(1);
    expect(result.cautions.map(({ code }) => code)).toContain("tangent-pinch");
  });
});

test("Coulson, Richardson, Backhurst and Harker, vol. 2, Example 11.11 (p. 590): 41.7 and 48.3 of 100 beside a side stream", () => {
  const result = mccabeThiele({
    relativeVolatility: 2.5, // only the balance is taken from the example
    feeds: [{ flow: 100, lightFraction: 0.5, q: 1 }],
    sideDraws: [{ flow: 10, lightFraction: 0.8, phase: "liquid" }],
    distillateLightFraction: 0.95,
    bottomsLightFraction: 0.05,
    refluxOverMinimum: 1.5,
  });
  expect(Math.abs(result.distillateFlow - 41.7)).toBeLessThan(0.06);
  expect(Math.abs(result.bottomsFlow - 48.3)).toBeLessThan(0.06);
});

test("binary pinch in closed form (McCabe and Thiele 1925): Rmin = (xD/z - a (1 - xD)/(1 - z))/(a - 1) at q = 1", () => {
  const expected = [0.94097, 1.1, 1.49868, 2.1, 2.54097]; // q 1.3, 1, 0.5, 0, -0.3; equal to Underwood's
  [1.3, 1, 0.5, 0, -0.3].forEach((q, i) => {
    const result = mccabeThiele({
      relativeVolatility: 2.5,
      feed: { lightFraction: 0.5, q },
      distillateLightFraction: 0.95,
      bottomsLightFraction: 0.05,
      refluxOverMinimum: 1.3,
    });
    expect(result.minimumReflux).toBeCloseTo(expected[i]!, 5);
  });
});
