import { describe, expect, test } from "vitest";
import { boilingTemperature } from "../../src/components/boilingTemperature";
import { component } from "../../src/components/componentTable";
import { defineComponent, type ComponentDefinition } from "../../src/components/defineComponent";
import { isComponent } from "../../src/components/isComponent";
import { vaporPressure } from "../../src/components/vaporPressure";
import { messageOf, refusalOf } from "./refusal";

/** Toluene in mmHg and degC; constants of Poling, Prausnitz and O'Connell (2000) with the units changed. */
const antoine = {
  form: "antoine",
  A: 6.92552,
  B: 1327.62,
  C: 217.625,
  logBase: 10,
  temperatureUnit: "degC",
  pressureUnit: "mmHg",
  range: [286, 410],
  source: "Poling, Prausnitz and O'Connell (2000)",
} as const;

const toluene: ComponentDefinition = { name: "my toluene", vaporPressure: antoine };

function refused(change: object): string[] {
  return refusalOf(() => defineComponent({ ...toluene, ...change }));
}

describe("a component of one's own", () => {
  test("boils where the table's does", () => {
    const own = boilingTemperature({ component: defineComponent(toluene), pressure: "1 atm" });
    const listed = boilingTemperature({ component: "toluene", pressure: "1 atm" });
    expect(own.value).toBeCloseTo(listed.value, 1);
    expect(own.methods[0]!.source).toBe(antoine.source);
  });

  test("constants in any unit", () => {
    const own = defineComponent({
      ...toluene,
      cas: "108-88-3",
      formula: "C7H8",
      family: "aromatic",
      molarMass: "92.14 g/mol",
      normalBoilingPoint: "110.6 degC",
      criticalTemperature: 591.75,
      criticalPressure: "41.08 bar",
      acentricFactor: 0.264,
    });
    expect(own.molarMass).toBeCloseTo(0.09214, 12);
    expect(own.normalBoilingPoint).toBeCloseTo(383.75, 12);
    expect(own.criticalPressure).toBeCloseTo(4.108e6, 6);
  });

  test("every form of the table comes back as it was", () => {
    for (const name of ["benzene", "allyl alcohol", "1-hexene", "n-butyl acrylate", "isoprene"]) {
      const { vaporPressure: block } = component(name);
      const own = defineComponent({ name: `my ${name}`, vaporPressure: block });
      expect(own.vaporPressure).toEqual(block);
      const at = { temperature: `${block.range[0] + 20} K` } as const;
      const value = vaporPressure({ component: own, ...at }).value;
      expect(value).toBe(vaporPressure({ component: name, ...at }).value);
    }
  });

  test("survives being written to a file and read back", () => {
    const own = defineComponent(toluene);
    const back: unknown = JSON.parse(JSON.stringify(own));
    expect(back).toEqual(own);
    expect(isComponent(back)).toBe(true);
    expect(isComponent(JSON.parse(JSON.stringify(component("styrene"))))).toBe(true);
  });
});

describe("refusals", () => {
  test("all faults at once", () => {
    const input = {
      nam: "x",
      molarMass: 92.14,
      vaporPressure: { ...antoine, A: "6.9", logBase: 2, source: "" },
    };
    expect(refusalOf(() => defineComponent(input as never))).toEqual([
      "unknown-field nam",
      "missing-field name",
      "above-limit molarMass",
      "unknown-choice vaporPressure.logBase",
      "wrong-type vaporPressure.A",
      "wrong-type vaporPressure.source",
    ]);
  });

  test.each<[string, object, string]>([
    ["no vapor pressure", { vaporPressure: undefined }, "missing-field vaporPressure"],
    [
      "a form not known",
      { vaporPressure: { ...antoine, form: "antione" } },
      "unknown-choice vaporPressure.form",
    ],
    [
      "a missing unit",
      { vaporPressure: { ...antoine, pressureUnit: undefined } },
      "unknown-choice vaporPressure.pressureUnit",
    ],
    ["another form's constant", { vaporPressure: { ...antoine, C1: 3 } }, "unknown-field vaporPressure.C1"],
    [
      "a range that falls",
      { vaporPressure: { ...antoine, range: [410, 286] } },
      "above-limit vaporPressure.range[0]",
    ],
    ["half a range", { vaporPressure: { ...antoine, range: [286] } }, "wrong-type vaporPressure.range"],
    [
      "a range over the pole",
      { vaporPressure: { ...antoine, range: [20, 410] } },
      "vapor-pressure-undefined vaporPressure",
    ],
    ["a sign slip", { vaporPressure: { ...antoine, B: -1327.62 } }, "vapor-pressure-undefined vaporPressure"],
    [
      "the wrong logarithm",
      { normalBoilingPoint: 383.8, vaporPressure: { ...antoine, logBase: "e" } },
      "conflicting-fields vaporPressure",
    ],
    [
      "the wrong pressure unit",
      { normalBoilingPoint: 383.8, vaporPressure: { ...antoine, pressureUnit: "Pa" } },
      "conflicting-fields vaporPressure",
    ],
    ["a wrong check digit", { cas: "108-88-4" }, "wrong-type cas"],
    ["a bare temperature in degC", { normalBoilingPoint: 42 }, "implausible-bare-number normalBoilingPoint"],
    [
      "three coefficients",
      {
        vaporPressure: {
          form: "wagner25",
          coefficients: [1, 2, 3],
          criticalTemperature: 590,
          criticalPressure: 4e6,
          range: [300, 590],
          source: "s",
        },
      },
      "wrong-type vaporPressure.coefficients",
    ],
  ])("%s", (_, change, expected) => {
    expect(refused(change)).toEqual([expected]);
  });

  test("the message says what came and the way out", () => {
    const slip = { ...toluene, vaporPressure: { ...antoine, temperatureUnit: "K" } } as ComponentDefinition;
    expect(messageOf(() => defineComponent({ ...slip, normalBoilingPoint: 383.8 }))).toMatch(
      /must give 1 atm at normalBoilingPoint 383.8 K, got .* Pa; check constants, logBase and units/,
    );
  });
});
