import { describe, expect, test } from "vitest";
import { columnFlows } from "../../src/staging/binaryColumn";
import { constantVolatilityCurve, linearCurve, monotoneCurve } from "../../src/staging/equilibriumCurve";
import { type StaircaseRules, stepStages } from "../../src/staging/stepStages";
import { trayLiquid } from "../../src/staging/trayLiquid";

const rules: StaircaseRules = {
  distillateLightFraction: 0.95,
  bottomsLightFraction: 0.05,
  efficiency: 1,
  idealFirstStage: false,
  idealReboiler: false,
};

function staircase(volatility: number, refluxRatio: number, changed: Partial<StaircaseRules>) {
  const column = {
    streams: [{ flow: 1, lightFraction: 0.5, q: 1 }],
    distillateLightFraction: 0.95,
    bottomsLightFraction: 0.05,
    openSteam: false,
  };
  return stepStages(constantVolatilityCurve(volatility), columnFlows(column, refluxRatio), {
    ...rules,
    ...changed,
  });
}

describe("Geankoplis, Transport Processes and Unit Operations, Example 11.4-3 (p. 662): feed on the top stage, no reflux", () => {
  const xs = Float64Array.of(0, 0.13, 0.258, 0.411, 0.581, 0.78, 1);
  const ys = Float64Array.of(0, 0.261, 0.456, 0.632, 0.777, 0.9, 1);
  // 400 kmol/h at 0.7 give 340 overhead and 60 of bottoms at 0.1; one section, its line through the bottoms.
  const distillate = (400 * 0.7 - 60 * 0.1) / 340;
  const section = { liquid: 400, vapor: 340, lightUp: -60 * 0.1, heavyUp: -60 * 0.9 };
  const flows = { distillate: 340, bottoms: 60, sections: [section], intersections: [] };
  test.each([
    ["straight lines", linearCurve(xs, ys), 5.467033],
    ["monotone cubic", monotoneCurve(xs, ys), 5.268758],
  ])("5.3 stages with the reboiler, %s", (_name, curve, recomputed) => {
    const stairs = stepStages(curve, flows, {
      ...rules,
      distillateLightFraction: distillate,
      bottomsLightFraction: 0.1,
    });
    if ("reason" in stairs) throw new Error(stairs.reason);
    expect(Math.abs(stairs.stages - 5.3)).toBeLessThan(0.3);
    expect(Math.abs(stairs.stages - recomputed)).toBeLessThan(0.03);
  });
});

test("Murphree vapor efficiency: Cussler, Diffusion, Example 13.4-1 (p. 397): 0.84 over 0.76 with 0.874 in equilibrium is 0.70", () => {
  const curve = constantVolatilityCurve(2.5);
  const x = curve.liquid(0.874);
  const leaving = trayLiquid(curve, 0.7)(0, 0.76, 0.84, 1);
  expect(Math.abs(curve.vapor(leaving) - 0.874)).toBeLessThan(0.001);
  const exact = trayLiquid(curve, (0.84 - 0.76) / (0.874 - 0.76))(0, 0.76, 0.84, 1);
  expect(exact).toBeCloseTo(x, 12);
});

describe("why a staircase ends without reaching the bottoms", () => {
  test.each([
    ["leaves-diagram", 2.5, 2, { streamStages: [1] }],
    ["stream-below-bottom", 20, 2, { streamStages: [9], bottomsLightFraction: 0.4 }],
    ["too-many-stages", 1.00002, 300_000, {}],
    ["too-many-stages", 2.5, 2, { efficiency: 1e-6 }],
  ])("%s", (reason, volatility, reflux, changed) => {
    expect(staircase(volatility, reflux, changed)).toMatchObject({ reason });
  });

  test("a staircase below the minimum reflux is stopped at its pinch, not after 100 000 stages", () => {
    const stairs = staircase(2.5, 1, {});
    expect(["stands-still", "leaves-diagram"]).toContain("reason" in stairs ? stairs.reason : "answered");
  });
});

test("a stage far below the pinch is waited for: every stage in between stands at the pinch", () => {
  const stairs = staircase(2.5, 2, { streamStages: [5000] });
  if ("reason" in stairs) throw new Error(stairs.reason);
  expect(stairs.streamStages).toEqual([5000]);
  expect(stairs.liquid[4000]).toBe(stairs.liquid[4500]);
  expect(stairs.stages).toBeGreaterThan(5003);
});

test("an efficient tray under a rich reboiler vapor: the feed goes to the reboiler when it is the first stage as lean", () => {
  const column = {
    streams: [{ flow: 1, lightFraction: 0.21, q: -0.33 }],
    distillateLightFraction: 0.97,
    bottomsLightFraction: 0.085,
    openSteam: false,
  };
  const stairs = stepStages(constantVolatilityCurve(12.4), columnFlows(column, 12), {
    ...rules,
    ...column,
    efficiency: 0.3,
    idealReboiler: true,
  });
  if ("reason" in stairs) throw new Error(stairs.reason);
  expect(stairs.streamStages).toEqual([stairs.count + 1]);
  expect(Math.ceil(stairs.stages)).toBe(stairs.count + 1);
});

test("no tray is needed when the reboiler alone gives more than the distillate", () => {
  const column = {
    streams: [{ flow: 1, lightFraction: 0.4, q: 1 }],
    distillateLightFraction: 0.5,
    bottomsLightFraction: 0.3,
    openSteam: false,
  };
  const stairs = stepStages(constantVolatilityCurve(20), columnFlows(column, 2), {
    ...rules,
    ...column,
    efficiency: 0.7,
    idealReboiler: true,
  });
  expect(stairs).toMatchObject({ count: 0, stages: 1, streamStages: [1] });
});
