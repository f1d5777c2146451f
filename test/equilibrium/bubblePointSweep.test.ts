import { runInNewContext } from "node:vm";
import { describe, expect, test } from "vitest";
import { sweepStatus } from "../../src/base/sweepStatus";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { bubblePointSweep } from "../../src/equilibrium/bubblePointSweep";
import { refusal } from "../shortcut/answerOrRefusal";

const components = ["benzene", "toluene", "p-xylene"];

test("each case as a single call answers it", () => {
  const composition = Float64Array.of(0.5, 0.3, 0.2, 0.1, 0, 0.9, 0, 1, 0);
  const pressure = Float64Array.of(101325, 2e5, 5e4);
  const { temperature, status } = bubblePointSweep({ components, composition, pressure });
  expect([...status]).toEqual([0, 0, 0]);
  for (let i = 0; i < 3; i++) {
    const fractions = [...composition.subarray(3 * i, 3 * i + 3)];
    const single = bubblePoint({
      composition: Object.fromEntries(components.map((name, k) => [name, fractions[k]!])),
      pressure: pressure[i]!,
    });
    expect(Math.abs(temperature[i]! / single.temperature - 1)).toBeLessThan(1e-14);
  }
});

test("one pressure for all cases, also as text; an ordinary list; an array out of another context", () => {
  const list = [0.5, 0.3, 0.2];
  const elsewhere = runInNewContext("Float64Array.of(0.5, 0.3, 0.2)") as Float64Array;
  const expected = bubblePoint({
    composition: { benzene: 0.5, toluene: 0.3, "p-xylene": 0.2 },
    pressure: 2e5,
  });
  for (const composition of [Float64Array.from(list), list, elsewhere]) {
    for (const pressure of [2e5, "2 bar", [2e5]]) {
      const { temperature } = bubblePointSweep({ components, composition, pressure } as never);
      expect(temperature[0]).toBeCloseTo(expected.temperature, 10);
    }
  }
});

test("a case that a single call refuses has a status, temperature 0, and does not hold up the others", () => {
  const rows: readonly [fractions: number[], pressure: number, status: string][] = [
    [[0.5, 0.5, 0], 101325, "answered"],
    [[Number.NaN, 0.5, 0.5], 101325, "not-finite"],
    [[Infinity, 0.5, 0.5], 101325, "not-finite"],
    [[-0.5, 1, 0.5], 101325, "fraction-out-of-range"],
    [[0.5, 0.3, 0.1], 101325, "composition-sum"],
    [[0, 0, 0], 101325, "composition-sum"],
    [[0.5, 0.5, 0], -1, "pressure-not-positive"],
    [[0.5, 0.5, 0], Number.NaN, "not-finite"],
    [[0.5, 0.5, 0], 1.3, "implausible-bare-number"],
    [[0.5, 0.5, 0], 1e7, "above-critical"],
    [[0.01, 0, 0.99], 4.8e6, "above-critical"],
    [[0.4, 0.6, 0], 101325, "answered"],
  ];
  const result = bubblePointSweep({
    components,
    composition: Float64Array.from(rows.flatMap(([fractions]) => fractions)),
    pressure: Float64Array.from(rows, ([, pressure]) => pressure),
  });
  expect([...result.status].map((code) => sweepStatus[code])).toEqual(rows.map(([, , status]) => status));
  rows.forEach(([, , status], i) => expect(result.temperature[i]! > 0).toBe(status === "answered"));
});

test("the cautions are those of the sweep as a whole", () => {
  const sweep = (pressure: number) =>
    bubblePointSweep({ components: ["ethanol", "water"], composition: Float64Array.of(0.5, 0.5), pressure });
  expect(sweep(1e5).cautions.map(({ code }) => code)).toEqual(["azeotrope"]);
  expect(sweep(4e5).cautions.map(({ code }) => code)).toEqual(["azeotrope", "elevated-pressure"]);
});

describe("refusals", () => {
  const composition = Float64Array.of(0.5, 0.3, 0.2);
  test.each<[object, string[]]>([
    [{ components, composition, pressure: Float64Array.of(1e5, 2e5) }, ["length-mismatch pressure"]],
    [{ components, composition: Float64Array.of(0.5, 0.5), pressure: 1e5 }, ["length-mismatch composition"]],
    [{ components, composition: new Float64Array(0), pressure: 1e5 }, ["empty composition"]],
    [{ components: [], composition, pressure: 1e5 }, ["empty components"]],
    [{ components: "benzene", composition, pressure: 1e5 }, ["wrong-type components"]],
    [{ components: ["benzene", 3, null], composition, pressure: 1e5 }, ["wrong-type components"]],
    [
      { components: ["benzene", "tolune", "p-xylene"], composition, pressure: 1e5 },
      ["unknown-component components.tolune"],
    ],
    [
      { components: ["benzene", "71-43-2", "p-xylene"], composition, pressure: 1e5 },
      ["duplicate-component components.71-43-2"],
    ],
    [{ components, composition, pressure: 1.3 }, ["implausible-bare-number pressure"]],
    [{ components }, ["missing-field composition", "missing-field pressure"]],
    [{ components, composition: {}, pressure: {} }, ["wrong-type composition", "wrong-type pressure"]],
  ])("%j", (input, expected) => {
    expect(refusal(() => bubblePointSweep(input as never))).toEqual(expected);
  });
});
