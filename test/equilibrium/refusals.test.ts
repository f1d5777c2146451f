import { describe, expect, test } from "vitest";
import { defineComponent } from "../../src/components/defineComponent";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { dewPoint } from "../../src/equilibrium/dewPoint";
import { flash } from "../../src/equilibrium/flash";
import { relativeVolatility } from "../../src/equilibrium/relativeVolatility";
import { refusal } from "../shortcut/answerOrRefusal";

const composition = { benzene: 0.5, toluene: 0.5 };

describe("bubble and dew point", () => {
  test.each<[object, string[]]>([
    [{ composition: { benzene: 0.4, toluene: 0.5 }, pressure: 101325 }, ["composition-sum composition"]],
    [
      { composition: { benzene: Number.NaN, toluene: 0.5 }, pressure: 101325 },
      ["not-finite composition.benzene"],
    ],
    [
      { composition: { benzene: -0.1, toluene: 1.1 }, pressure: 101325 },
      ["fraction-out-of-range composition.benzene"],
    ],
    [{ composition: { benzene: 0.5, c2: 0.5 }, pressure: 101325 }, ["unknown-component composition.c2"]],
    [
      { composition: { benzene: 0.5, "71-43-2": 0.5 }, pressure: 101325 },
      ["duplicate-component composition.71-43-2"],
    ],
    [{ composition: {}, pressure: 101325 }, ["empty composition"]],
    [{ pressure: 101325 }, ["missing-field composition"]],
    [{ composition }, ["conflicting-fields pressure"]],
    [{ composition, pressure: 1e5, temperature: 350 }, ["conflicting-fields pressure"]],
    [{ composition, pressure: 0 }, ["pressure-not-positive pressure"]],
    [{ composition, pressure: Number.NaN }, ["not-finite pressure"]],
    [{ composition, pressure: 1.3 }, ["implausible-bare-number pressure"]],
    [{ composition, pressure: "1.3 degC" }, ["wrong-dimension pressure"]],
    [{ composition, pressure: 1e7 }, ["above-critical pressure"]],
    [{ composition, temperature: -20 }, ["temperature-not-positive temperature"]],
    [{ composition, temperature: 95 }, ["implausible-bare-number temperature"]],
    [{ composition, temperature: 600 }, ["above-critical temperature", "above-critical temperature"]],
    [{ composition, pressure: 1e5, model: "wilson" }, ["unknown-choice model"]],
    [{ composition, presure: 1e5, pressure: 1e5 }, ["unknown-field presure"]],
    [{ composition, pressure: 1e5, normalize: "yes" }, ["wrong-type normalize"]],
    [{ composition, pressure: 1e5, ownComponents: "benzene" }, ["wrong-type ownComponents"]],
    [{ composition: { methane: 0.1, "n-hexane": 0.9 }, pressure: "5 bar" }, ["above-critical pressure"]],
  ])("%j", (input, expected) => {
    expect(refusal(() => bubblePoint(input as never))).toEqual(expected);
  });

  test("all faults of a call come together", () => {
    const input = { composition: { benzene: 0.4, tolene: 0.5 }, pressure: "1 ton", model: "x" };
    expect(refusal(() => dewPoint(input as never)).sort()).toEqual([
      "composition-sum composition",
      "unknown-choice model",
      "unknown-component composition.tolene",
      "unknown-unit pressure",
    ]);
  });

  test("a light gas above its critical temperature is named, with the way out", () => {
    expect(() => bubblePoint({ composition: { methane: 0.1, "n-hexane": 0.9 }, pressure: "5 bar" })).toThrow(
      /the bubble point.*critical temperature of methane, 190\.56 K.*lower pressure, leave methane out/,
    );
  });

  test("an equation without a value at a temperature: the pole of an Antoine equation", () => {
    const heavy = defineComponent({
      name: "heavy",
      normalBoilingPoint: 200,
      vaporPressure: {
        form: "antoine",
        A: 9.05043,
        B: 1327.62,
        C: -55.525,
        logBase: 10,
        temperatureUnit: "K",
        pressureUnit: "Pa",
        range: [286, 409],
        source: "test",
      },
    });
    const input = { composition: { heavy: 1 }, ownComponents: [heavy] };
    expect(refusal(() => bubblePoint({ ...input, temperature: 52 }))).toEqual([
      "vapor-pressure-undefined temperature",
    ]);
    expect(refusal(() => bubblePoint({ ...input, temperature: "50 K" }))).toEqual([
      "vapor-pressure-undefined temperature",
    ]);
    expect(refusal(() => bubblePoint({ ...input, pressure: 1e15 }))).toEqual([
      "vapor-pressure-undefined pressure",
    ]);
  });

  test("the upper end of a DIPPR 101 equation of one's own is its critical temperature", () => {
    const own = defineComponent({
      name: "own",
      vaporPressure: {
        form: "dippr101",
        C1: 83.107,
        C2: -6486.2,
        C3: -9.2194,
        C4: 6.9844e-6,
        C5: 2,
        range: [278.68, 562.05],
        source: "test",
      },
    });
    const input = { composition: { own: 1 }, ownComponents: [own] };
    expect(refusal(() => bubblePoint({ ...input, pressure: 1e7 }))).toEqual(["above-critical pressure"]);
    expect(refusal(() => bubblePoint({ ...input, temperature: 563 }))).toEqual([
      "above-critical temperature",
    ]);
  });

  test("what is absent, down to less than a molecule in a mole, may be above its critical temperature", () => {
    for (const none of [0, 1e-25]) {
      const { temperature } = bubblePoint({
        composition: { methane: none, benzene: 0.5, toluene: 0.5 },
        pressure: "1 atm",
      });
      expect(temperature).toBeCloseTo(bubblePoint({ composition, pressure: "1 atm" }).temperature, 9);
    }
  });

  test("normalize scales; percent and ppm are read", () => {
    const kmol = bubblePoint({ composition: { benzene: 3, toluene: 3 }, normalize: true, pressure: 101325 });
    const percent = bubblePoint({
      composition: { benzene: "50 %", toluene: "500000 ppm" } as never,
      pressure: 101325,
    });
    expect(kmol.temperature).toBe(percent.temperature);
  });
});

describe("flash", () => {
  test.each<[object, string[]]>([
    [{ composition, pressure: 101325, vaporFraction: 1.2 }, ["fraction-out-of-range vaporFraction"]],
    [{ composition, pressure: 101325, vaporFraction: "half" }, ["wrong-type vaporFraction"]],
    [{ composition, pressure: 101325 }, ["conflicting-fields pressure"]],
    [{ composition }, ["conflicting-fields temperature"]],
    [
      { composition, pressure: 101325, temperature: 370, vaporFraction: 0.5 },
      ["conflicting-fields temperature"],
    ],
    [{ composition, pressure: 1e7, temperature: 370 }, ["above-critical pressure"]],
    [{ composition, pressure: 1e5, temperature: 570 }, ["above-critical temperature"]],
    [{ composition, vaporFraction: 0.5, temperature: 570 }, ["above-critical temperature"]],
  ])("%j", (input, expected) => {
    expect(refusal(() => flash(input as never))).toEqual(expected);
  });

  test("a pure component exactly at its boiling point says that the split is open", () => {
    const { temperature } = bubblePoint({ composition: { benzene: 1 }, pressure: 101325 });
    const { cautions } = flash({ composition: { benzene: 1 }, pressure: 101325, temperature });
    expect(cautions.map(({ code }) => code)).toContain("vapor-fraction-indeterminate");
  });
});

describe("relative volatility", () => {
  test("the heavy key may be given under another name of it", () => {
    const { values, heavyKey } = relativeVolatility({ composition, heavyKey: "108-88-3", temperature: 370 });
    expect(heavyKey).toBe("toluene");
    expect(values["toluene"]).toBe(1);
  });

  test.each<[unknown, string[]]>([
    ["xylene", ["key-absent heavyKey"]],
    ["benzen", ["key-absent heavyKey"]],
    [undefined, ["missing-field heavyKey"]],
    [3, ["wrong-type heavyKey"]],
  ])("heavyKey %j", (heavyKey, expected) => {
    expect(refusal(() => relativeVolatility({ composition, heavyKey, temperature: 370 } as never))).toEqual(
      expected,
    );
  });

  test("a heavy key of which there is none must still have a vapor pressure", () => {
    const input = { composition: { benzene: 1, ethane: 0 }, heavyKey: "ethane", temperature: 370 };
    expect(refusal(() => relativeVolatility(input))).toEqual(["above-critical temperature"]);
  });
});
