import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { columnFlows } from "../../src/staging/binaryColumn";
import { smoker } from "../../src/staging/smoker";
import { gap } from "../shortcut/caseRecords";
import { refusal } from "../shortcut/answerOrRefusal";

/**
 * Smoker's formula with one root of the quadratic, evaluated with 60 digits (mpmath): relative volatility, feed light
 * fraction, q, distillate, bottoms, reflux ratio (1.001 to 1000 times the minimum), rectifying, stripping stages.
 */
const precise: readonly (readonly number[])[] = [
  [
    1.8145798003060754, 0.3810316466438598, 0.793827226603568, 0.9999, 0.0001, 4.542305810967807,
    26.156363992022683, 29.29286812945748,
  ],
  [
    1.6910820006431844, 0.3630210425180177, -0.2524899523316311, 0.95, 1e-8, 5.808829629934539,
    25.54252847309769, 145.77181293000876,
  ],
  [
    1.0799280596733158, 0.6141261463000685, 0, 0.999999, 0.05, 21000.719968697955, 173.73041412697043,
    44.354590690726354,
  ],
  [
    1.1186346446985884, 0.39171834244043613, 0, 0.99, 0.01, 29.499849904186856, 73.32434201294024,
    72.11225969641377,
  ],
  [
    1.006303914714833, 0.5828694163463836, -0.38611718402368167, 0.99, 0.05, 266610.64092509367,
    678.3581479453059, 522.0309832743077,
  ],
  [
    1.0051392309485345, 0.7958230145127122, 1.088016098788344, 0.9999, 0.0001, 244.60527041557197,
    11033.127832241878, 4170.839803222409,
  ],
  [
    1.0007953517563464, 0.25125799514358943, 1.1681286154021044, 0.95, 0.0001, 4669332.372798472,
    5078.803462209927, 10218.304224540909,
  ],
  [
    1.000701544658585, 0.5040777603716572, 0, 0.95, 1e-8, 2543570.3765510935, 4177.38988349727,
    26302.841158858748,
  ],
  [
    1.000123288765413, 0.7008702599662527, 0.22726796424580487, 0.999999, 0.0001, 11573102.205432117,
    105229.00944441337, 81643.440946375,
  ],
  [
    1.0001345032029627, 0.5835383460895189, 1, 0.999999, 1e-8, 12740806.810195735, 100271.24623200718,
    139530.07385180861,
  ],
  [
    1.000001318047411, 0.8635361691247834, 0.4403831051988718, 0.999999, 0.0001, 879466.6465441432,
    82362856.24106877, 15522789.137223477,
  ],
  [
    1.000001332858003, 0.18708433390030532, 1.2674840593210404, 0.95, 0.05, 4892749.162764818,
    4835349.764235031, 2333905.126246067,
  ],
  [
    1.0000000080336122, 0.7956194208377714, 1.3815072206810235, 0.99, 0.05, 148946767.72325698,
    3676281848.605329, 1654933780.7279563,
  ],
  [
    1.0000000055524612, 0.6539250803324926, 1, 0.999999, 0.0001, 358037547.71376777, 4800598198.291419,
    2624579334.406063,
  ],
  [
    70.16319549333741, 0.4204219590665338, 0.35456636053651325, 0.95, 1e-8, 0.6613674388963613,
    1.355387251443757, 7.445067819426806,
  ],
  [
    120.53184914499107, 0.7862111851708562, 0, 0.999999, 0.01, 0.28284499734451846, 5.903069947317793,
    3.120681467941825,
  ],
  [
    5242.161366016126, 0.25618777498103396, 0.6058108763279058, 0.999999, 0.01, 0.5857444478694773,
    2.3035573370316644, 0.13040617297762055,
  ],
  [
    10372.078047415389, 0.22925833580012223, 0, 0.99, 0.0001, 3319.7206706170887, 0.6281917557595907,
    0.8648979927977718,
  ],
  [1.5, 0.9999999, 1, 0.999999999, 0.9, 1.9897002008210138, 241.95067238376552, 46.71960112918231],
  [1.5, 1e-7, 0, 0.1, 1e-9, 3029997.1719998186, 45.71534989746785, 198.98153678989192],
];

describe("Smoker (1938) against 60 digits, volatilities from 1 + 1e-8 to 1e4, near and far from the minimum reflux", () => {
  test.each(precise)("volatility %f, z %f, q %f, xD %f, xB %f, R %f", (...row) => {
    const [relativeVolatility, lightFraction, q, xD, xB, refluxRatio, rectifying, stripping] = row;
    const result = smoker({
      relativeVolatility: relativeVolatility!,
      feed: { lightFraction: lightFraction!, q: q! },
      distillateLightFraction: xD!,
      bottomsLightFraction: xB!,
      refluxRatio: refluxRatio!,
    });
    expect(gap(result.rectifyingStages, rectifying!)).toBeLessThan(1e-9);
    expect(gap(result.strippingStages, stripping!)).toBeLessThan(1e-9);
    expect(result.stages).toBeCloseTo(result.rectifyingStages + result.strippingStages, 9);
  });
});

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const tasks = fc.record({
  relativeVolatility: fc.oneof(number(1.05, 10), number(1.0001, 1.01)),
  feed: fc.record({ lightFraction: number(0.1, 0.9), q: number(-0.5, 1.5) }),
  distillateLightFraction: number(0.92, 0.9999),
  bottomsLightFraction: number(0.0001, 0.08),
});

test("total reflux: Smoker becomes Fenske", () => {
  fc.assert(
    fc.property(tasks, (task) => {
      const { distillateLightFraction: xD, bottomsLightFraction: xB } = task;
      const separation = Math.log(((xD / (1 - xD)) * (1 - xB)) / xB);
      const fenske = separation / Math.log(task.relativeVolatility);
      const { stages } = smoker({ ...task, refluxRatio: 1e9 });
      expect(gap(stages, fenske)).toBeLessThan(1e-4);
    }),
    { numRuns: 300, seed: 20261205 },
  );
});

test("heavy for light and vapor for liquid: rectifying and stripping stages change places", () => {
  fc.assert(
    fc.property(tasks, number(1, 10), (task, above) => {
      const { feed, distillateLightFraction: xD, bottomsLightFraction: xB } = task;
      // above any minimum of these tasks
      const refluxRatio = (above * 20) / (task.relativeVolatility - 1) + 20;
      const column = {
        streams: [{ flow: 1, ...feed }],
        distillateLightFraction: xD,
        bottomsLightFraction: xB,
        openSteam: false,
      };
      const { sections, bottoms } = columnFlows(column, refluxRatio);
      const upright = smoker({ ...task, refluxRatio });
      const mirrored = smoker({
        relativeVolatility: task.relativeVolatility,
        feed: { lightFraction: 1 - feed.lightFraction, q: 1 - feed.q },
        distillateLightFraction: 1 - xB,
        bottomsLightFraction: 1 - xD,
        refluxRatio: sections[1]!.vapor / bottoms,
      });
      expect(gap(mirrored.rectifyingStages, upright.strippingStages)).toBeLessThan(1e-8);
      expect(gap(mirrored.strippingStages, upright.rectifyingStages)).toBeLessThan(1e-8);
    }),
    { numRuns: 300, seed: 20261206 },
  );
});

const column = {
  relativeVolatility: 2.5,
  feed: { lightFraction: 0.5, q: 1 },
  distillateLightFraction: 0.95,
  bottomsLightFraction: 0.05,
  refluxRatio: 1.8,
};

test("published: 5.1385 rectifying and 5.8963 stripping stages at volatility 2.5, R 1.8 (Smoker's formula, recomputed)", () => {
  const { rectifyingStages, strippingStages } = smoker(column);
  expect(rectifyingStages).toBeCloseTo(5.1385, 4);
  expect(strippingStages).toBeCloseTo(5.8963, 4);
});

test.each<[string, object, string[]]>([
  ["reflux at its minimum", { refluxRatio: 1.1 }, ["infeasible reflux-below-minimum refluxRatio"]],
  [
    "a superheated feed without boilup",
    {
      relativeVolatility: 20,
      feed: { lightFraction: 0.5, q: -0.5 },
      distillateLightFraction: 0.98,
      refluxRatio: 2.0584,
    },
    ["infeasible negative-boilup refluxRatio"],
  ],
  ["volatility 1", { relativeVolatility: 1 }, ["volatility-not-above-one relativeVolatility"]],
  [
    "volatility 1 to the last digit",
    { relativeVolatility: 1 + Number.EPSILON },
    ["infeasible reflux-below-minimum refluxRatio"],
  ],
  [
    "a pure product",
    { distillateLightFraction: 1 },
    ["infeasible specification-infeasible distillateLightFraction"],
  ],
])("%s is refused", (_title, changed, expected) => {
  expect(refusal(() => smoker({ ...column, ...changed }))).toEqual(expected);
});

test("close volatilities and a reflux near its minimum carry their cautions", () => {
  const codes = (changed: object): string[] =>
    smoker({ ...column, ...changed }).cautions.map(({ code }) => code);
  expect(codes({})).toEqual([]);
  expect(codes({ refluxRatio: 1.12 })).toEqual(["near-minimum-reflux"]);
  expect(codes({ relativeVolatility: 1.04, refluxRatio: 100 })).toEqual(["close-boiling-keys"]);
});
