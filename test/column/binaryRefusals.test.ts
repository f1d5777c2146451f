import { expect, test } from "vitest";
import { mccabeThiele } from "../../src/column/mccabeThiele";
import { smoker } from "../../src/staging/smoker";
import { refusal } from "../shortcut/answerOrRefusal";

const column = {
  relativeVolatility: 2.5,
  feed: { lightFraction: 0.5, q: 1 },
  distillateLightFraction: 0.95,
  bottomsLightFraction: 0.05,
  refluxRatio: 2,
};
const { relativeVolatility: _, ...withoutVolatility } = column;
const crossing: [number, number][] = [
  [0.2, 0.45],
  [0.5, 0.68],
  [0.8, 0.8],
  [0.9, 0.88],
];

test.each<[string, object, string]>([
  [
    "volatility exactly 1",
    { ...column, relativeVolatility: 1 },
    "volatility-not-above-one relativeVolatility",
  ],
  [
    "volatility negative",
    { ...column, relativeVolatility: -2.5 },
    "volatility-not-above-one relativeVolatility",
  ],
  [
    "distillate poorer than the feed",
    { ...column, distillateLightFraction: 0.45 },
    "infeasible specification-infeasible distillateLightFraction",
  ],
  [
    "products exchanged",
    { ...column, distillateLightFraction: 0.05, bottomsLightFraction: 0.95 },
    "infeasible specification-infeasible distillateLightFraction",
  ],
  [
    "bottoms without any light",
    { ...column, bottomsLightFraction: 0 },
    "infeasible specification-infeasible bottomsLightFraction",
  ],
  [
    "pure feed",
    { ...column, feed: { lightFraction: 1, q: 1 } },
    "infeasible specification-infeasible feed.lightFraction",
  ],
  ["reflux at its minimum", { ...column, refluxRatio: 1.1 }, "infeasible reflux-below-minimum refluxRatio"],
  [
    "reflux factor 1",
    { ...column, refluxRatio: undefined, refluxOverMinimum: 1 },
    "reflux-factor-not-above-one refluxOverMinimum",
  ],
  ["no feed", { ...column, feed: { lightFraction: 0.5, q: 1, flow: 0 } }, "flow-not-positive feed.flow"],
  ["q infinite", { ...column, feed: { lightFraction: 0.5, q: Infinity } }, "not-finite feed.q"],
  [
    "efficiency negative",
    { ...column, murphreeVaporEfficiency: -0.5 },
    "efficiency-out-of-range murphreeVaporEfficiency",
  ],
  [
    "feed on stage 1: the staircase leaves the diagram",
    { ...column, feedStage: 1 },
    "infeasible feed-stage-infeasible feedStage",
  ],
  ["feed on half a stage", { ...column, feedStage: 2.5 }, "stage-out-of-range feedStage"],
  [
    "superheated feed without boilup",
    {
      ...column,
      relativeVolatility: 20,
      feed: { lightFraction: 0.5, q: -0.5 },
      distillateLightFraction: 0.98,
      refluxRatio: 2.0584,
    },
    "infeasible negative-boilup refluxRatio",
  ],
  [
    "a liquid draw larger than the reflux",
    {
      ...column,
      feed: { lightFraction: 0.2, q: 1 },
      sideDraws: [{ flow: 0.14, lightFraction: 0.8, phase: "liquid" }],
      relativeVolatility: 100,
      refluxRatio: 1.4,
    },
    "infeasible negative-liquid refluxRatio",
  ],
  [
    "an azeotrope between the products",
    { ...withoutVolatility, equilibriumCurve: { points: crossing, interpolation: "linear" } },
    "infeasible azeotrope-in-range distillateLightFraction",
  ],
  [
    "a curve that falls",
    {
      ...withoutVolatility,
      equilibriumCurve: {
        points: [
          [0.2, 0.5],
          [0.5, 0.4],
        ],
        interpolation: "monotone",
      },
    },
    "curve-not-valid equilibriumCurve.points[1]",
  ],
  [
    "a draw of more light component than is fed",
    { ...column, sideDraws: [{ flow: 0.7, lightFraction: 0.8, phase: "liquid" }] },
    "infeasible specification-infeasible sideDraws[0].flow",
  ],
  [
    "two equilibria",
    { ...column, pair: { light: "benzene", heavy: "toluene" } },
    "conflicting-fields relativeVolatility",
  ],
  [
    "a pair the wrong way round",
    { ...withoutVolatility, pair: { light: "toluene", heavy: "benzene" }, pressure: 101325 },
    "volatility-not-above-one pair.light",
  ],
  [
    "two feeds, one on a stage that the staircase cannot reach",
    {
      ...column,
      feed: undefined,
      feeds: [
        { flow: 1, lightFraction: 0.7, q: 1, stage: 1 },
        { flow: 1, lightFraction: 0.3, q: 1, stage: 2 },
      ],
      refluxRatio: 3,
    },
    "infeasible feed-stage-infeasible feeds[1].stage",
  ],
  [
    "a draw richer than the distillate",
    { ...column, sideDraws: [{ flow: 0.1, lightFraction: 0.97, phase: "liquid" }] },
    "infeasible specification-infeasible sideDraws[0].lightFraction",
  ],
  ["no feed at all in the list", { ...column, feed: undefined, feeds: [] }, "empty feeds"],
  [
    "a stage for one feed beside a list of feeds",
    { ...column, feed: undefined, feeds: [{ flow: 1, lightFraction: 0.5, q: 1 }], feedStage: 4 },
    "conflicting-fields feedStage",
  ],
  [
    "a subcooled feed over open steam that would drown all the light component in the bottoms",
    {
      ...column,
      reboiler: "open-steam",
      feed: { lightFraction: 0.1, q: 3 },
      bottomsLightFraction: 0.04,
    },
    "infeasible specification-infeasible bottomsLightFraction",
  ],
  [
    "a curve of the heavy component",
    {
      ...withoutVolatility,
      equilibriumCurve: { points: crossing.map(([x, y]) => [y, x]).slice(0, 2), interpolation: "linear" },
    },
    "infeasible azeotrope-in-range distillateLightFraction",
  ],
  ["a misspelt option", { ...column, feedstage: 3 }, "unknown-field feedstage"],
])("%s is refused: %s", (_title, input, expected) => {
  expect(refusal(() => mccabeThiele(input as typeof column))).toEqual([expected]);
});

test("all faults of one call come at once", () => {
  const faulty = { ...column, relativeVolatility: 0.5, bottomsLightFraction: "x", condenser: "none" };
  expect(refusal(() => mccabeThiele(faulty as unknown as typeof column))).toHaveLength(3);
});

test("a feed far too low is answered: 43.306 stages, and what it costs is said", () => {
  const result = mccabeThiele({ ...column, feedStage: 40 });
  expect(result.stagesWhole).toBe(44);
  expect(result.stages).toBeCloseTo(43.30640141293854, 9);
  expect(result.cautions.map(({ code }) => code)).toEqual(["feed-stage-off-optimum"]);
});

test("a reflux so close to the minimum that a staircase has no end is refused; smoker counts it", () => {
  const close = { ...column, relativeVolatility: 1.00002, refluxRatio: 300000 };
  expect(refusal(() => mccabeThiele(close))).toEqual(["infeasible too-many-stages refluxRatio"]);
  expect(smoker(close).stages).toBeGreaterThan(100000);
});

test("a pair that Raoult's law does not fit carries a stop caution", () => {
  const result = mccabeThiele({
    ...withoutVolatility,
    pair: { light: "ethanol", heavy: "water" },
    pressure: "1 atm",
    distillateLightFraction: 0.8,
    refluxRatio: 6,
  });
  expect(result.cautions[0]!.severity).toBe("stop");
});
