import { describe, expect, test } from "vitest";
import type { DesignInputError } from "../../src/base/errors";
import { defineComponent } from "../../src/components/defineComponent";
import { vaporPressure } from "../../src/components/vaporPressure";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { dewPoint } from "../../src/equilibrium/dewPoint";
import { relativeVolatility } from "../../src/equilibrium/relativeVolatility";
import { volatilityOverTemperature } from "../../src/equilibrium/volatilityCurve";

const composition = { benzene: 0.4, toluene: 0.35, ethylbenzene: 0.25 };
const pressure = 1.3e5;

describe("from a pressure", () => {
  const result = volatilityOverTemperature({ composition, heavyKey: "toluene", pressure });
  const { temperature, relativeVolatility: alpha, kValues } = result.curve;

  test("runs from the lowest to the highest boiling point, where K is 1", () => {
    const { boilingTemperature, temperatureRange } = result;
    expect(temperatureRange).toEqual([boilingTemperature["benzene"], boilingTemperature["ethylbenzene"]]);
    expect([temperature[0], temperature.at(-1)]).toEqual(temperatureRange);
    expect(kValues["benzene"]![0]).toBeCloseTo(1, 9);
    expect(kValues["ethylbenzene"]!.at(-1)).toBeCloseTo(1, 9);
  });

  test("gives what relativeVolatility and vaporPressure give at each temperature", () => {
    for (let i = 0; i < temperature.length; i += 12) {
      const t = temperature[i]!;
      const { values } = relativeVolatility({ composition, heavyKey: "toluene", temperature: t });
      for (const name of Object.keys(composition)) {
        expect(alpha[name]![i]!).toBeCloseTo(values[name]!, 9);
        const { value } = vaporPressure({ component: name, temperature: t });
        expect(kValues[name]![i]! * pressure).toBeCloseTo(value, 3);
      }
    }
  });

  test("carries the values at both ends beside the curve", () => {
    const { atLowest, atHighest } = result.relativeVolatility;
    for (const name of Object.keys(composition))
      expect([atLowest[name], atHighest[name]]).toEqual([alpha[name]![0], alpha[name]!.at(-1)]);
  });

  test("tells the bubble and the dew point of the composition, and none of mere names", () => {
    expect(result.saturation!.bubble).toBeCloseTo(bubblePoint({ composition, pressure }).temperature, 9);
    expect(result.saturation!.dew).toBeCloseTo(dewPoint({ composition, pressure }).temperature, 9);
    const names = volatilityOverTemperature({
      components: Object.keys(composition),
      heavyKey: "toluene",
      pressure,
    });
    expect(names.saturation).toBeNull();
    expect(names.curve).toEqual(result.curve);
  });
});

// C. J. Geankoplis, Example 11.3-1: relative volatilities of benzene to toluene from measured vapor pressures
test.each([
  ["85 degC", 2.54],
  ["105 degC", 2.37],
] as const)("benzene to toluene as in Geankoplis, Example 11.3-1, at %s: %d, to 2 %%", (at, printed) => {
  const { curve } = volatilityOverTemperature({
    components: ["benzene", "toluene"],
    heavyKey: "toluene",
    temperatureRange: [at, "110 degC"],
  });
  expect(Math.abs(curve.relativeVolatility["benzene"]![0]! / printed - 1)).toBeLessThan(0.02);
});

test("temperatures alone: no pressure, no K-values; with a pressure both", () => {
  const input = { components: ["benzene", "toluene"], heavyKey: "toluene" };
  const alone = volatilityOverTemperature({ ...input, temperatureRange: [350, "110 degC"] });
  expect([alone.pressure, alone.temperatureRange]).toEqual([null, [350, 383.15]]);
  expect([alone.curve.kValues, alone.boilingTemperature]).toEqual([{}, {}]);
  const both = volatilityOverTemperature({ ...input, temperatureRange: [350, 383.15], pressure: "1 atm" });
  expect(both.curve.relativeVolatility).toEqual(alone.curve.relativeVolatility);
  expect(both.curve.kValues["benzene"]![0]).toBeCloseTo(0.905, 2);
});

test("a component has no value above its critical temperature, and a caution says so", () => {
  const {
    curve,
    cautions,
    boilingTemperature,
    relativeVolatility: ends,
  } = volatilityOverTemperature({
    components: ["propane", "n-hexane", "n-decane"],
    heavyKey: "n-hexane",
    pressure: "3 bar",
  });
  const first = curve.relativeVolatility["propane"]!.indexOf(null);
  expect(curve.temperature[first - 1]!).toBeLessThanOrEqual(369.83); // critical temperature of propane
  expect(curve.temperature[first]!).toBeGreaterThan(369.83);
  expect(curve.kValues["propane"]!.slice(first).every((value) => value === null)).toBe(true);
  expect(curve.relativeVolatility["n-decane"]).not.toContain(null);
  expect(cautions.find(({ message }) => message.includes("propane"))).toMatchObject({
    code: "near-critical",
    severity: "stop",
  });
  expect(Object.keys(boilingTemperature)).toEqual(["propane", "n-hexane", "n-decane"]);
  expect(Object.keys(ends.atLowest)).toContain("propane");
  expect(Object.keys(ends.atHighest)).toEqual(["n-hexane", "n-decane"]);
});

test("components that boil alike still get ten kelvins", () => {
  const { temperatureRange } = volatilityOverTemperature({
    components: ["m-xylene", "p-xylene"],
    heavyKey: "m-xylene",
    pressure: "1 atm",
  });
  expect(temperatureRange[1] - temperatureRange[0]).toBeCloseTo(10, 9);
});

test("own components win, and the guard speaks of what Raoult's law does not fit", () => {
  const form = { form: "antoine", logBase: 10, temperatureUnit: "K", pressureUnit: "Pa" } as const;
  const range: [number, number] = [300, 420];
  const own = defineComponent({
    name: "toluene",
    vaporPressure: { ...form, A: 9, B: 1300, C: -50, range, source: "invented" },
  });
  const input = {
    components: ["benzene", "toluene"],
    heavyKey: "toluene",
    temperatureRange: [350, 360],
  } as const;
  const [mine, table] = [
    volatilityOverTemperature({ ...input, ownComponents: [own] }),
    volatilityOverTemperature(input),
  ];
  expect(mine.curve.relativeVolatility["benzene"]![0]).not.toBeCloseTo(
    table.curve.relativeVolatility["benzene"]![0]!,
    2,
  );
  const wet = volatilityOverTemperature({ ...input, components: ["water", "toluene"] });
  expect(wet.cautions[0]!.severity).toBe("stop");
});

describe("what it refuses", () => {
  const valid = { components: ["benzene", "toluene"], heavyKey: "toluene", pressure: 1e5 };
  const codes = (input: unknown): string[] => {
    try {
      volatilityOverTemperature(input as never);
    } catch (error) {
      return (error as DesignInputError).issues.map(({ code, path }) => `${code} at ${path}`);
    }
    return [];
  };

  test.each<[string, object, string[]]>([
    ["no pressure and no temperatures", { pressure: undefined }, ["missing-field at pressure"]],
    ["names and a composition", { composition }, ["conflicting-fields at components"]],
    ["no names", { components: [] }, ["empty at components"]],
    ["numbers for names", { components: [1, 2] }, ["wrong-type at components"]],
    ["501 names", { components: new Array(501).fill("benzene") }, ["too-many at components"]],
    ["a key that is not there", { heavyKey: "water" }, ["key-absent at heavyKey"]],
    ["one temperature", { temperatureRange: [350] }, ["wrong-type at temperatureRange"]],
    ["falling temperatures", { temperatureRange: [360, 350] }, ["below-limit at temperatureRange.1"]],
    [
      "degC without saying so",
      { temperatureRange: [80, 370] },
      ["implausible-bare-number at temperatureRange.0"],
    ],
    [
      "a heavy key far above its critical temperature",
      { temperatureRange: [700, 800] },
      ["above-critical at heavyKey"],
    ],
    [
      "a pressure at which nothing boils",
      { pressure: "80 bar" },
      ["above-critical at pressure", "above-critical at pressure"],
    ],
    [
      "an unknown field, and another fault with it",
      { temperatures: 1, pressure: "x" },
      ["unknown-field at temperatures", "wrong-type at pressure"],
    ],
  ])("%s", (_, more, expected) => {
    expect(codes({ ...valid, ...more })).toEqual(expected);
  });

  test("anything that is no object", () => {
    expect(codes(undefined)).toEqual(["missing-field at input"]);
    expect(codes([])).toEqual(["not-an-object at input"]);
  });
});
