import { describe, expect, test } from "vitest";
import { shortcutDesign } from "../../src/column/shortcutDesign";
import { dewPoint } from "../../src/equilibrium/dewPoint";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { fenske } from "../../src/shortcut/fenske";
import { underwood } from "../../src/shortcut/underwood";
import { defineComponent } from "../../src/components/defineComponent";
import solved from "../data/solvedShortcutCases.json";
import { refusal } from "../shortcut/answerOrRefusal";
import { gap, largestGap, listed, records } from "../shortcut/caseRecords";

const tolerance = 1e-9;

describe.each(solved.cases.map((each, i) => ({ ...each, number: i + 1 })))("solved case $number", (each) => {
  const { lightKey, heavyKey, lightKeyRecovery, heavyKeyRecovery, q, refluxRatio } = each;
  const { composition, relativeVolatility } = records(each.composition, each.relativeVolatility);
  const design = shortcutDesign({
    feed: { flow: 1, composition, q },
    relativeVolatility,
    lightKey,
    heavyKey,
    lightKeyRecovery,
    heavyKeyRecovery,
    refluxRatio,
  });

  test("minimum stages, exact minimum reflux, products", () => {
    expect(gap(design.minimumStages, each.totalReflux.stages)).toBeLessThan(tolerance);
    expect(gap(design.minimumReflux, each.minimumReflux.value)).toBeLessThan(tolerance);
    const feed = listed(composition);
    const distillate = listed(design.distillate.composition).map((x) => x * design.distillate.flow);
    const expected = each.totalReflux.recovery.map((r, i) => r * feed[i]!);
    expect(largestGap(distillate, expected)).toBeLessThan(tolerance);
  });

  test("stages by Gilliland in the form of Molokanov and feed stage by Kirkbride", () => {
    expect(gap(design.gillilandStages, each.stages.molokanov)).toBeLessThan(tolerance);
    expect(gap(design.feedStage, each.kirkbride.rectifyingStages)).toBeLessThan(tolerance);
    const [low, high] = design.stagesRange;
    expect(low).toBeLessThanOrEqual(design.gillilandStages * (1 + tolerance));
    if (high !== null) expect(high).toBeGreaterThanOrEqual(design.gillilandStages * (1 - tolerance));
  });

  test("a component that distributes between the keys is cautioned", () => {
    const heavy = relativeVolatility[heavyKey]!;
    const light = relativeVolatility[lightKey]!;
    const between = Object.entries(relativeVolatility).some(
      ([name, alpha]) => alpha > heavy && alpha < light && composition[name]! > 0,
    );
    const codes = design.cautions.map(({ code }) => code);
    expect(codes.includes("gilliland-with-distributing-component")).toBe(between);
    expect(design.stagesBasis).toBe("gilliland");
  });
});

const aromatics = {
  feed: {
    massFlow: "25 t/h",
    basis: "mass",
    composition: { benzene: 0.06, toluene: 0.36, ethylbenzene: 0.09, "m-xylene": 0.37, "o-xylene": 0.12 },
    q: 1,
  },
  lightKey: "toluene",
  heavyKey: "ethylbenzene",
  lightKeyRecovery: 0.995,
  heavyKeyRecovery: 0.99,
  pressure: "1.3 bar",
  refluxOverMinimum: 1.25,
} as const;

describe("volatilities by Raoult's law", () => {
  const design = shortcutDesign(aromatics);
  const { distillate, bottoms, relativeVolatility: volatility } = design;

  test("the means agree with the product temperatures that they give", () => {
    const top = dewPoint({ composition: distillate.composition, pressure: 1.3e5 });
    const bottom = bubblePoint({ composition: bottoms.composition, pressure: 1.3e5 });
    for (const name of Object.keys(volatility.mean)) {
      const above = top.kValues[name]! / top.kValues["ethylbenzene"]!;
      const below = bottom.kValues[name]! / bottom.kValues["ethylbenzene"]!;
      expect(volatility.top[name]! / above).toBeCloseTo(1, 9);
      expect(volatility.bottom[name]! / below).toBeCloseTo(1, 9);
      expect(volatility.mean[name]! / Math.sqrt(above * below)).toBeCloseTo(1, 9);
    }
    expect(bottoms.temperature).toBeCloseTo(bottom.temperature, 6);
  });

  test("the parts give the same as the whole", () => {
    const { lightKey, heavyKey, lightKeyRecovery, heavyKeyRecovery } = aromatics;
    const keys = { lightKey, heavyKey, lightKeyRecovery, heavyKeyRecovery };
    // The feed's own composition: what goes in comes out.
    const total = distillate.flow + bottoms.flow;
    const composition = Object.fromEntries(
      Object.keys(volatility.mean).map((name) => [
        name,
        (distillate.composition[name]! * distillate.flow + bottoms.composition[name]! * bottoms.flow) / total,
      ]),
    );
    const limit = fenske({ composition, relativeVolatility: volatility.mean, ...keys });
    expect(design.minimumStages).toBeCloseTo(limit.minimumStages, 9);
    const minimum = underwood({ composition, relativeVolatility: volatility.feed, q: 1, ...keys });
    expect(design.minimumReflux).toBeCloseTo(minimum.minimumReflux, 9);
  });

  test("mass is kept", () => {
    expect((distillate.massFlow! + bottoms.massFlow!) * 3.6).toBeCloseTo(25, 9);
  });

  test("a partial condenser gives the distillate as vapor at its dew point", () => {
    const partial = shortcutDesign({ ...aromatics, condenser: "partial" });
    expect(partial.distillate.vaporFraction).toBe(1);
    expect(partial.distillate.temperature).toBeGreaterThan(distillate.temperature!);
    expect(partial.stages).toBeCloseTo(design.stages, 9);
  });

  test("a pressure that rises down the column lowers the volatility", () => {
    const dropped = shortcutDesign({
      ...aromatics,
      bottomPressure: "1.6 bar",
      condenserPressureDrop: "0.1 bar",
    });
    expect(dropped.minimumStages).toBeGreaterThan(design.minimumStages);
    expect(dropped.distillate.pressure).toBeCloseTo(1.2e5, 6);
    expect(dropped.bottoms.pressure).toBeCloseTo(1.6e5, 6);
  });
});

test("with a drop a stage the bottom pressure and the stages agree", () => {
  const { bottoms, stages } = shortcutDesign({ ...aromatics, pressureDropPerStage: "0.7 kPa" });
  expect(bottoms.pressure! / (1.3e5 + 700 * stages)).toBeCloseTo(1, 8);
  expect(
    refusal(() => shortcutDesign({ ...aromatics, pressureDropPerStage: 700, bottomPressure: "1.6 bar" })),
  ).toEqual(["conflicting-fields pressureDropPerStage"]);
});

describe("where Raoult's law is known not to fit, the design says stop", () => {
  const nearly = {
    lightKeyRecovery: 0.9,
    heavyKeyRecovery: 0.9,
    refluxOverMinimum: 1.3,
    pressure: "1 atm",
  } as const;
  test.each([
    ["a listed azeotrope", { ethanol: 0.5, benzene: 0.5 }, "ethanol", "benzene"],
    ["water with an organic", { water: 0.4, toluene: 0.6 }, "water", "toluene"],
    ["a carboxylic acid", { benzene: 0.5, "acetic acid": 0.5 }, "benzene", "acetic acid"],
  ])("%s", (_title, composition, lightKey, heavyKey) => {
    const design = shortcutDesign({ ...nearly, feed: { flow: 1, composition, q: 1 }, lightKey, heavyKey });
    expect(design.cautions[0]!.severity).toBe("stop");
  });
});

const plain = {
  feed: { flow: 100, composition: { a: 0.3, b: 0.3, c: 0.4 }, q: 1 },
  relativeVolatility: { a: 4, b: 2, c: 1 },
  lightKey: "a",
  heavyKey: "b",
  lightKeyRecovery: 0.99,
  heavyKeyRecovery: 0.99,
  refluxRatio: 3,
};

test.each<[string, object, string[]]>([
  ["one component for both keys", { ...plain, lightKey: "b" }, ["keys-equal heavyKey"]],
  ["full recovery", { ...plain, lightKeyRecovery: 1 }, ["recovery-out-of-range lightKeyRecovery"]],
  ["recovery in percent", { ...plain, lightKeyRecovery: 99 }, ["recovery-out-of-range lightKeyRecovery"]],
  [
    "keys of one volatility",
    { ...plain, relativeVolatility: { a: 2, b: 2, c: 1 } },
    ["volatility-equal relativeVolatility.a"],
  ],
  [
    "an infinite volatility",
    { ...plain, relativeVolatility: { a: Infinity, b: 2, c: 1 } },
    ["not-finite relativeVolatility.a"],
  ],
  [
    "fractions that add up to 1.1",
    { ...plain, feed: { ...plain.feed, composition: { a: 0.4, b: 0.3, c: 0.4 } } },
    ["composition-sum feed.composition"],
  ],
  [
    "a pressure drop beside given volatilities",
    { ...plain, pressureDropPerStage: 700 },
    ["conflicting-fields pressureDropPerStage"],
  ],
  ["a negative feed", { ...plain, feed: { ...plain.feed, flow: -100 } }, ["flow-not-positive feed.flow"]],
  [
    "reflux factor 1",
    { ...plain, refluxRatio: undefined, refluxOverMinimum: 1 },
    ["reflux-factor-not-above-one refluxOverMinimum"],
  ],
  [
    "reflux below the minimum",
    { ...plain, refluxRatio: 2.2 },
    ["infeasible reflux-below-minimum refluxRatio"],
  ],
  [
    "reflux between a single root and the exact minimum",
    {
      ...plain,
      feed: { flow: 100, composition: { a: 0.1, b: 0.25, c: 0.3, d: 0.2, e: 0.15 }, q: 0.5 },
      relativeVolatility: { a: 5, b: 3, c: 2.2, d: 1.5, e: 1 },
      lightKey: "b",
      heavyKey: "d",
      lightKeyRecovery: 0.97,
      heavyKeyRecovery: 0.96,
      refluxRatio: 1.6211,
    },
    ["infeasible reflux-below-minimum refluxRatio"],
  ],
  [
    "vapor of the feed fills the column",
    { ...plain, feed: { ...plain.feed, q: -3 }, refluxRatio: 8 },
    ["infeasible reflux-below-minimum refluxRatio"],
  ],
])("%s is refused: %j gives %s", (_title, input, expected) => {
  expect(refusal(() => shortcutDesign(input as typeof plain))).toEqual(expected);
});

test("two non-keys of one volatility are answered, as if lumped", () => {
  const split = shortcutDesign({
    ...plain,
    feed: { flow: 1, composition: { a: 0.3, b: 0.3, c: 0.15, d: 0.25 }, q: 1 },
    relativeVolatility: { a: 4, b: 2, c: 1, d: 1 },
  });
  expect(split.minimumReflux).toBeCloseTo(2.2348704317919843, 9);
  expect(split.roots).toHaveLength(2);
});

test("a superheated feed: the extra root below the lowest volatility is not used", () => {
  const design = shortcutDesign({
    ...plain,
    feed: { flow: 1, composition: { a: 0.3, b: 0.3, c: 0.4 }, q: -0.4 },
    lightKey: "b",
    heavyKey: "c",
    refluxRatio: 5,
  });
  expect(design.minimumReflux).toBeCloseTo(2.37873544834774, 9);
  expect(design.roots).toHaveLength(2);
});

test("a component above its critical temperature is refused, and the message says what to do", () => {
  const input = {
    feed: { flow: 1, composition: { methane: 0.1, propane: 0.4, "n-butane": 0.5 }, q: 1 },
    lightKey: "propane",
    heavyKey: "n-butane",
    lightKeyRecovery: 0.99,
    heavyKeyRecovery: 0.99,
    pressure: "12 bar",
    refluxOverMinimum: 1.3,
  } as const;
  expect(refusal(() => shortcutDesign(input))).toContain("above-critical pressure");
});

test("Yeo, Chemical Engineering Computation with MATLAB, Example 7.22, data only: minimum stages and products", () => {
  // Published inputs, own answers: 60 % vaporized n-hexane, n-heptane, n-octane at 1.2 atm; Antoine in mmHg and degC.
  const antoine = (name: string, A: number, B: number, C: number) =>
    defineComponent({
      name,
      vaporPressure: {
        form: "antoine",
        A,
        B,
        C,
        logBase: 10,
        temperatureUnit: "degC",
        pressureUnit: "mmHg",
        range: [290, 420],
        source: "Yeo, Example 7.22",
      },
    });
  const ownComponents = [
    antoine("hexane", 6.87024, 1168.72, 224.21),
    antoine("heptane", 6.89385, 1264.37, 216.636),
    antoine("octane", 6.9094, 1349.82, 209.385),
  ];
  // Dew point of the distillate and bubble point of the bottoms as the example's script has them.
  const dew = dewPoint({ composition: { hexane: 0.99, heptane: 0.01 }, pressure: "1.2 atm", ownComponents });
  expect(dew.temperature - 273.15).toBeCloseTo(75.18604, 2);
  const design = shortcutDesign({
    feed: { flow: 100, composition: { hexane: 0.33, heptane: 0.37, octane: 0.3 }, q: 0.4 },
    lightKey: "hexane",
    heavyKey: "heptane",
    lightKeyRecovery: (32.65306 * 0.99) / 33,
    heavyKeyRecovery: 1 - (32.65306 * 0.01) / 37,
    pressure: "1.2 atm",
    refluxOverMinimum: 1.5,
    ownComponents,
  });
  // The script takes the cube root of the volatilities at feed, top and bottom (2.3396); the mean of the ends is 2.34.
  expect(design.relativeVolatility.mean["hexane"]).toBeCloseTo(2.3396, 1);
  // It moves the minimum stages by less than 2 %.
  expect(Math.abs(design.minimumStages / 10.1088 - 1)).toBeLessThan(0.02);
  // With the volatilities of the feed throughout, the minimum reflux is 2.75 (the script, which mixes two temperatures, has 1.90).
  expect(Math.abs(design.minimumReflux - 2.751)).toBeLessThan(0.01);
});
