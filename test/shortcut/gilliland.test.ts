import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { gilliland } from "../../src/shortcut/gilliland";
import { type GillilandCorrelation, gillilandCorrelations } from "../../src/shortcut/gillilandCorrelations";
import { refusal } from "./answerOrRefusal";
import { gap } from "./caseRecords";

const minima = { minimumStages: 8, minimumReflux: 1 };
const correlations = Object.keys(gillilandCorrelations) as GillilandCorrelation[];

describe.each(correlations)("%s", (correlation) => {
  test("stages fall as the reflux rises, down to the minimum at total reflux", () => {
    let last = Infinity;
    for (const refluxRatio of [1.001, 1.02, 1.021, 1.1, 1.5, 3, 18.9, 19.1, 100, 1e6, 1e12]) {
      const { stages } = gilliland({ ...minima, refluxRatio, correlation });
      expect(stages).toBeLessThanOrEqual(last);
      expect(stages).toBeGreaterThanOrEqual(minima.minimumStages);
      last = stages;
    }
    expect(gap(last, minima.minimumStages)).toBeLessThan(1e-10);
  });

  test("the reflux ratio for given stages gives those stages back", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.5, max: 200, noNaN: true }),
        fc.double({ min: 0, max: 50, noNaN: true }),
        fc.double({ min: -3, max: 4, noNaN: true }),
        (minimumStages, minimumReflux, power) => {
          const refluxRatio = minimumReflux + (minimumReflux + 1) * 10 ** power;
          const at = { minimumStages, minimumReflux, correlation };
          const { stages } = gilliland({ ...at, refluxRatio });
          const back = gilliland({ ...at, stages });
          expect(gap(back.refluxRatio, refluxRatio)).toBeLessThan(1e-6);
          expect(gap(gilliland({ ...at, refluxRatio: back.refluxRatio }).stages, stages)).toBeLessThan(1e-9);
        },
      ),
      { numRuns: 500, seed: 1940 },
    );
  });

  test("a minimum reflux of zero", () => {
    expect(
      gilliland({ minimumStages: 5, minimumReflux: 0, refluxRatio: 0.1, correlation }).stages,
    ).toBeGreaterThan(5);
  });
});

test("Molokanov is the default, and the coordinates are Gilliland's", () => {
  const result = gilliland({ ...minima, refluxRatio: 1.5 });
  expect(result).toMatchObject({
    kind: "gilliland",
    correlation: "molokanov",
    refluxRatio: 1.5,
    refluxCoordinate: 0.2,
  });
  expect(gap(result.stagesCoordinate, (result.stages - 8) / (result.stages + 1))).toBeLessThan(1e-15);
  expect(result).toEqual(gilliland({ ...minima, refluxRatio: 1.5, correlation: "molokanov" }));
});

test("Liddle's three pieces meet within the width of a pencil line", () => {
  const { liddle } = gillilandCorrelations;
  for (const join of [0.01, 0.9]) {
    expect(
      Math.abs(Math.exp(liddle(join * (1 + 1e-12))) - Math.exp(liddle(join * (1 - 1e-12)))),
    ).toBeLessThan(1e-4);
  }
});

test("the forms agree within a few percent of the stages over the middle of the chart", () => {
  for (const x of [0.05, 0.1, 0.2, 0.4, 0.6, 0.8]) {
    const refluxRatio = (1 + x) / (1 - x);
    const [molokanov, eduljee, liddle] = correlations.map(
      (correlation) => gilliland({ ...minima, refluxRatio, correlation }).stages,
    );
    expect(gap(eduljee!, molokanov!)).toBeLessThan(0.04);
    expect(gap(liddle!, molokanov!)).toBeLessThan(0.1);
  }
});

describe("cautions", () => {
  test("none inside the data", () => {
    expect(gilliland({ ...minima, refluxRatio: 1.5 }).cautions).toEqual([]);
  });

  test("close to the minimum", () => {
    expect(gilliland({ ...minima, refluxRatio: 1.01 }).cautions).toMatchObject([
      { code: "near-minimum-reflux", severity: "check", limit: 0.01 },
    ]);
  });

  test("outside the columns that the curve rests on", () => {
    const { cautions } = gilliland({ minimumStages: 80, minimumReflux: 0.2, refluxRatio: 0.5 });
    expect(cautions.map(({ code, value, limit }) => [code, value, limit])).toEqual([
      ["outside-gilliland-data", 80, 60.3],
      ["outside-gilliland-data", 0.2, 0.53],
    ]);
  });
});

describe("refusals", () => {
  test.each<[string, object, string[]]>([
    ["the minimum itself", { refluxRatio: 1 }, ["infeasible reflux-below-minimum refluxRatio"]],
    ["less than the minimum", { refluxRatio: 0.9 }, ["infeasible reflux-below-minimum refluxRatio"]],
    [
      "a reflux at the minimum but for rounding",
      { refluxRatio: 1 + 1e-12 },
      ["infeasible too-many-stages refluxRatio"],
    ],
    ["the minimum stages", { stages: 8 }, ["infeasible too-few-stages stages"]],
    [
      "more stages than Eduljee's form reaches",
      { stages: 40, correlation: "eduljee" },
      ["infeasible too-many-stages stages"],
    ],
    ["both", { refluxRatio: 2, stages: 20 }, ["conflicting-fields refluxRatio"]],
    ["neither", {}, ["conflicting-fields refluxRatio"]],
    ["a negative minimum reflux", { minimumReflux: -0.2, refluxRatio: 2 }, ["below-limit minimumReflux"]],
    ["no stages", { minimumStages: 0, refluxRatio: 2 }, ["below-limit minimumStages"]],
    ["another fit", { refluxRatio: 2, correlation: "Gilliland" }, ["unknown-choice correlation"]],
    ["not a number", { refluxRatio: Number.NaN }, ["not-finite refluxRatio"]],
    ["a misspelt field", { reflux: 2, refluxRatio: 2 }, ["unknown-field reflux"]],
  ])("%s", (_, change, expected) => {
    expect(refusal(() => gilliland({ ...minima, ...change } as never))).toEqual(expected);
  });
});
