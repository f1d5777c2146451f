import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { mccabeThiele } from "../../src/column/mccabeThiele";
import type { McCabeThieleInput } from "../../src/column/mccabeThieleInput";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { smoker } from "../../src/staging/smoker";
import { gap } from "../shortcut/caseRecords";

const base = {
  relativeVolatility: 2.5,
  feed: { lightFraction: 0.5, q: 1 },
  distillateLightFraction: 0.95,
  bottomsLightFraction: 0.05,
  refluxRatio: 1.8,
} as const;
const { relativeVolatility: _, ...withoutVolatility } = base;

const codes = (changed: object): string[] =>
  mccabeThiele({ ...base, ...changed }).cautions.map(({ code }) => code);

describe("a pair of components at a pressure", () => {
  const pair = { light: "benzene", heavy: "toluene" };
  const input = { ...withoutVolatility, pair, pressure: "1.2 bar", refluxOverMinimum: 1.3 } as const;
  const { refluxRatio: _reflux, ...asked } = input;
  const result = mccabeThiele(asked);
  const exact = (x: number): number =>
    bubblePoint({ composition: { benzene: x, toluene: 1 - x }, pressure: "1.2 bar" }).vapor["benzene"]!;

  test("every stage holds an exact bubble point", () => {
    expect(result.steps.length).toBeGreaterThan(10);
    for (const { x, y } of result.steps) expect(gap(y, exact(x))).toBeLessThan(1e-9);
  });

  test("so does the pinch, and the minimum reflux follows from it", () => {
    const [x, y] = result.pinch;
    expect(gap(y, exact(x))).toBeLessThan(1e-12);
    expect(gap(result.minimumReflux, (0.95 - y) / (y - x))).toBeLessThan(1e-9);
  });

  test("names and pressure come back for the diagram", () => {
    expect(result.pair).toEqual(pair);
    expect(result.pressure).toBeCloseTo(120_000, 6);
    expect(result.relativeVolatility).toBeUndefined();
  });

  test("heats of vaporization far apart are said: the operating lines are not quite straight", () => {
    const wide = mccabeThiele({
      ...withoutVolatility,
      pair: { light: "n-pentane", heavy: "n-decane" },
      pressure: "1.2 bar",
    });
    const caution = wide.cautions.find(({ code }) => code === "unequal-heats-of-vaporization")!;
    expect(caution.value).toBeGreaterThan(0.15);
    expect(caution.limit).toBe(0.15);
    expect(result.cautions.map(({ code }) => code)).not.toContain("unequal-heats-of-vaporization");
  });

  test("a pair that boils close together is said, from its volatility at the products", () => {
    const close = mccabeThiele({
      ...asked,
      pair: { light: "p-xylene", heavy: "m-xylene" },
    });
    const caution = close.cautions.find(({ code }) => code === "close-boiling-keys")!;
    expect(caution.value).toBeLessThan(1.05);
    expect(caution.value).toBeGreaterThan(1.01);
  });
});

describe("what is doubtful is said, with the number that shows it", () => {
  test.each<[string, object, string[]]>([
    ["nothing", {}, []],
    ["a reflux ratio 1.02 times its minimum", { refluxRatio: 1.122 }, ["near-minimum-reflux"]],
    ["a volatility of 1.04", { relativeVolatility: 1.04, refluxRatio: 100 }, ["close-boiling-keys"]],
    ["a subcooled feed", { feed: { lightFraction: 0.5, q: 1.2 } }, ["feed-outside-two-phases"]],
    [
      "a superheated feed",
      { feed: { lightFraction: 0.5, q: -0.2 }, refluxRatio: 4 },
      ["feed-outside-two-phases"],
    ],
    ["a feed off its optimum", { feedStage: 8 }, ["feed-stage-off-optimum"]],
    ["a feed on its optimum", { feedStage: 6 }, []],
  ])("%s", (_title, changed, expected) => {
    expect(codes(changed)).toEqual(expected);
  });

  test("a feed off its optimum: stage, optimum, and the stages that it costs", () => {
    const at8 = mccabeThiele({ ...base, refluxRatio: 2, feedStage: 8 });
    const best = mccabeThiele({ ...base, refluxRatio: 2 });
    const [caution] = at8.cautions;
    expect(caution).toMatchObject({ value: 8, limit: best.feedStage });
    expect(caution!.message).toContain(`costs ${(at8.stages - best.stages).toPrecision(4)} stages`);
  });

  test("the same with an efficiency on the trays over an ideal reboiler", () => {
    const trays = { ...base, refluxRatio: 2, murphreeVaporEfficiency: 0.7 };
    const best = mccabeThiele(trays);
    const late = mccabeThiele({ ...trays, feedStage: best.feedStage + 3 });
    const caution = late.cautions.find(({ code }) => code === "feed-stage-off-optimum")!;
    expect(caution.message).toContain(`costs ${(late.stages - best.stages).toPrecision(4)} stages`);
  });
});

describe("feeds and draws", () => {
  const feeds = [
    { flow: 1, lightFraction: 0.7, q: 1 },
    { flow: 2, lightFraction: 0.35, q: 0.5 },
  ];
  const several = { ...base, feed: undefined, feeds, refluxRatio: 3 } as unknown as McCabeThieleInput;

  test("a draw above the feed does not take its place: feedStage is the feed's", () => {
    const result = mccabeThiele({
      ...base,
      refluxRatio: 3,
      sideDraws: [{ flow: 0.1, lightFraction: 0.8, phase: "liquid" }],
    });
    expect(result.feedStage).toBe(result.feedStages[0]);
    expect(result.sideDrawStages![0]).toBeLessThan(result.feedStage);
  });

  test("stages given to feeds are kept to, in whatever order they are typed", () => {
    const staged = feeds.map((feed, i) => ({ ...feed, stage: [3, 9][i]! }));
    const result = mccabeThiele({ ...several, feeds: staged });
    expect(result.feedStages).toEqual([3, 9]);
    const { stages } = mccabeThiele({ ...several, feeds: [...staged].reverse() });
    expect(stages).toBe(result.stages);
  });

  test("a stage given to one feed is kept to beside a draw that finds its own", () => {
    const result = mccabeThiele({
      ...base,
      refluxRatio: 4,
      feedStage: 6,
      sideDraws: [{ flow: 0.05, lightFraction: 0.75, phase: "liquid" }],
    });
    expect(result.feedStages).toEqual([6]);
    expect(result.sideDrawStages![0]).toBeLessThanOrEqual(6);
  });

  test('feedStage "optimum" and an empty list of draws change nothing', () => {
    const plain = mccabeThiele(several);
    expect(mccabeThiele({ ...several, feedStage: "optimum", sideDraws: [] })).toEqual(plain);
  });

  test("two feeds of one state count as their mixture", () => {
    const half = { lightFraction: 0.5, q: 1, flow: 0.5 };
    const split = mccabeThiele({
      ...base,
      feed: undefined,
      feeds: [half, half],
    } as unknown as McCabeThieleInput);
    expect(gap(split.stages, mccabeThiele(base).stages)).toBeLessThan(1e-10);
  });

  test("a feed far below the pinch is answered: the stages between stand still", () => {
    const result = mccabeThiele({ ...base, feedStage: 3000 });
    expect(result.feedStage).toBe(3000);
    expect(result.stages).toBeGreaterThan(3003);
  });
});

describe("results", () => {
  test("are plain data and leave the input as it was", () => {
    const input = Object.freeze({ ...base, feed: Object.freeze({ ...base.feed }) });
    const result = mccabeThiele(input);
    expect(JSON.parse(JSON.stringify(result))).toEqual(result);
    expect(result.kind).toBe("mccabeThiele");
  });

  test("the lines of the diagram run through the stages", () => {
    const { curves, steps, distillateLightFraction: xD } = mccabeThiele(base);
    const { staircase, operatingLines, qLines, equilibrium } = curves;
    expect([staircase.x[0], staircase.y[0]]).toEqual([xD, xD]);
    steps.forEach(({ x, y }, i) => expect([staircase.x[2 * i + 1], staircase.y[2 * i + 1]]).toEqual([x, y]));
    expect(operatingLines[0]!.x[1]).toBeCloseTo(operatingLines[1]!.x[0]!, 14);
    expect(operatingLines[0]!.y[1]).toBeCloseTo(operatingLines[1]!.y[0]!, 12);
    expect(qLines[0]!.x[0]).toBe(0.5);
    expect(equilibrium.x.length).toBe(equilibrium.y.length);
  });

  test("purities of 1e-12 on both ends are stepped: Fenske at total reflux, Smoker at any", () => {
    const pure = { ...base, distillateLightFraction: 1 - 1e-12, bottomsLightFraction: 1e-12 };
    const result = mccabeThiele(pure);
    expect(Math.abs(result.stages - smoker(pure).stages)).toBeLessThan(1);
    expect(gap(result.minimumStages, (2 * Math.log(1e12)) / Math.log(2.5))).toBeLessThan(1e-5);
  });
});

test("less efficient trays are more trays, and an efficiency of 1 is none", () => {
  const ideal = mccabeThiele(base);
  const efficiency = fc.double({ min: 0.1, max: 0.99, noNaN: true });
  fc.assert(
    fc.property(efficiency, efficiency, (a, b) => {
      fc.pre(Math.abs(a - b) > 0.02);
      const stages = (murphreeVaporEfficiency: number): number =>
        mccabeThiele({ ...base, murphreeVaporEfficiency }).stages;
      expect(stages(Math.min(a, b))).toBeGreaterThan(stages(Math.max(a, b)));
      expect(stages(a)).toBeGreaterThan(ideal.stages - 0.1);
    }),
    { numRuns: 100, seed: 20261208 },
  );
  const all = mccabeThiele({ ...base, murphreeVaporEfficiency: 1, efficiencyOnReboiler: true });
  expect(all.stages).toBe(ideal.stages);
});
