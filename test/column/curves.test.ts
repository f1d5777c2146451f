import { describe, expect, test } from "vitest";
import { mccabeThiele } from "../../src/column/mccabeThiele";
import { shortcutDesign } from "../../src/column/shortcutDesign";
import { gilliland } from "../../src/shortcut/gilliland";

describe("equilibrium curve of a McCabe-Thiele result", () => {
  test.each([
    [0.05, 0.95],
    [1e-3, 0.999],
    [1e-7, 0.9999999],
  ])("bottoms %d, distillate %d: rises over the whole range and reaches beyond both products", (xB, xD) => {
    const { curves } = mccabeThiele({
      relativeVolatility: 2.5,
      feed: { lightFraction: 0.5, q: 1 },
      distillateLightFraction: xD,
      bottomsLightFraction: xB,
      refluxRatio: 2,
    });
    const { x, y } = curves.equilibrium;
    expect([x[0], y[0], x.at(-1), y.at(-1)]).toEqual([0, 0, 1, 1]);
    for (let i = 1; i < x.length; i++) {
      expect(x[i]!).toBeGreaterThan(x[i - 1]!);
      expect(y[i]!).toBeCloseTo((2.5 * x[i]!) / (1 + 1.5 * x[i]!), 12);
    }
    expect(x.some((each) => each > 0 && each < 0.5 * xB)).toBe(true);
    expect(x.some((each) => each < 1 && 1 - each < 0.5 * (1 - xD))).toBe(true);
    expect(x.length).toBeLessThan(200);
  });
});

describe("Gilliland's curve", () => {
  const design = shortcutDesign({
    feed: { flow: 100, composition: { a: 0.3, b: 0.3, c: 0.4 }, q: 1 },
    relativeVolatility: { a: 4, b: 2, c: 1 },
    lightKey: "a",
    heavyKey: "b",
    lightKeyRecovery: 0.99,
    heavyKeyRecovery: 0.99,
    refluxOverMinimum: 1.2,
  });
  const { minimumStages, minimumReflux, curves } = design;

  test("stages against reflux ratio are those of gilliland, falling between the two minima", () => {
    const { refluxRatio, stages } = curves.stagesAgainstReflux;
    for (let i = 0; i < stages.length; i += 12) {
      const at = gilliland({ minimumStages, minimumReflux, refluxRatio: refluxRatio[i]! });
      expect(at.stages).toBeCloseTo(stages[i]!, 8);
    }
    for (let i = 1; i < stages.length; i++) {
      expect(refluxRatio[i]!).toBeGreaterThan(refluxRatio[i - 1]!);
      expect(stages[i]!).toBeLessThan(stages[i - 1]!);
    }
    expect(refluxRatio[0]! / minimumReflux).toBeLessThan(1.001);
    expect(stages.at(-1)! / minimumStages).toBeLessThan(1.002);
  });

  test("is the same in both results and holds the point of each", () => {
    const alone = gilliland({ minimumStages, minimumReflux, refluxRatio: design.refluxRatio });
    const { point, x, y } = curves.gilliland;
    expect(alone.curve).toEqual({ x, y });
    expect(point[0]).toBeCloseTo(alone.refluxCoordinate, 12);
    expect(point[1]).toBeCloseTo(alone.stagesCoordinate, 12);
  });
});
