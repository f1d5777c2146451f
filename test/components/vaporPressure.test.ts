import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Component, VaporPressureEquation } from "../../src/components/component";
import { allComponents, component } from "../../src/components/componentTable";
import { defineComponent } from "../../src/components/defineComponent";
import { logVaporPressure, logVaporPressureSlope, vaporPressure } from "../../src/components/vaporPressure";
import { messageOf, refusalOf } from "./refusal";

const forms: Readonly<Record<string, VaporPressureEquation>> = {
  antoine: {
    form: "antoine",
    A: 4.01814,
    B: 1203.835,
    C: -53.226,
    logBase: 10,
    temperatureUnit: "K",
    pressureUnit: "bar",
  },
  natural: {
    form: "antoine",
    A: 9.2,
    B: 2771.2,
    C: 219.9,
    logBase: "e",
    temperatureUnit: "degC",
    pressureUnit: "kPa",
  },
  fahrenheit: {
    form: "antoine",
    A: 5.2,
    B: 2200,
    C: 400,
    logBase: 10,
    temperatureUnit: "degF",
    pressureUnit: "psia",
  },
  dippr101: { form: "dippr101", C1: 83.107, C2: -6486.2, C3: -9.2194, C4: 6.9844e-6, C5: 2 },
  wagner25: {
    form: "wagner25",
    coefficients: [-7.01433, 1.5525, -1.8479, -3.713],
    criticalTemperature: 562.16,
    criticalPressure: 4.898e6,
  },
  wagner36: {
    form: "wagner36",
    coefficients: [-6.98273, 1.33213, -2.62863, -3.33399],
    criticalTemperature: 562.2,
    criticalPressure: 4.89e6,
  },
};

function own(equation: VaporPressureEquation): Component {
  return defineComponent({ name: "own", vaporPressure: { ...equation, range: [280, 380], source: "own" } });
}

describe("equations", () => {
  test.each(Object.entries(forms))(
    "%s: the slope is the derivative, above the critical point too",
    (_, equation) => {
      fc.assert(
        fc.property(fc.double({ min: 250, max: 700, noNaN: true }), (t) => {
          const h = 1e-3;
          const critical = "coefficients" in equation ? equation.criticalTemperature : 0;
          fc.pre(Math.abs(t - critical) > 1);
          const difference =
            (logVaporPressure(equation, t + h) - logVaporPressure(equation, t - h)) / (2 * h);
          expect(logVaporPressureSlope(equation, t) / difference).toBeCloseTo(1, 6);
        }),
        { seed: 1, numRuns: 300 },
      );
    },
  );

  test.each(["wagner25", "wagner36"])("%s: continuous with its slope at the critical point", (form) => {
    const equation = forms[form] as VaporPressureEquation & {
      criticalTemperature: number;
      criticalPressure: number;
    };
    const { criticalTemperature: critical, criticalPressure } = equation;
    expect(logVaporPressure(equation, critical)).toBeCloseTo(Math.log(criticalPressure), 12);
    const [below, above] = [-1e-9, 1e-9].map((shift) => logVaporPressureSlope(equation, critical + shift));
    expect(below! / above!).toBeCloseTo(1, 4);
  });

  test("one Antoine equation in all units is one curve", () => {
    // benzene, Poling, Prausnitz and O'Connell (2000): log10(P/bar) = 3.98523 - 1184.24/(T/K - 55.578)
    const [A, B, C] = [3.98523, 1184.24, -55.578];
    const bar = Math.log(1e5);
    const unit = { Pa: 1, kPa: 1e3, bar: 1e5, mmHg: 133.322387415, psia: 6894.757293168361 } as const;
    const expected = Math.LN10 * (A - B / (353.15 + C)) + bar;
    for (const [pressureUnit, pascal] of Object.entries(unit)) {
      const a = A + Math.log10(1e5 / pascal);
      const common = { form: "antoine", pressureUnit: pressureUnit as keyof typeof unit } as const;
      const curves: VaporPressureEquation[] = [
        { ...common, A: a, B, C, logBase: 10, temperatureUnit: "K" },
        { ...common, A: a, B, C: C + 273.15, logBase: 10, temperatureUnit: "degC" },
        { ...common, A: a, B: 1.8 * B, C: 1.8 * C + 459.67, logBase: 10, temperatureUnit: "degF" },
        { ...common, A: a * Math.LN10, B: B * Math.LN10, C, logBase: "e", temperatureUnit: "K" },
      ];
      for (const curve of curves) expect(logVaporPressure(curve, 353.15)).toBeCloseTo(expected, 11);
    }
  });

  test("no value at and below the pole of an Antoine equation", () => {
    expect(logVaporPressure(forms["antoine"]!, 53.226)).toBeNaN();
    expect(logVaporPressure(forms["antoine"]!, 20)).toBeNaN();
  });
});

describe("vaporPressure", () => {
  test("of benzene at its normal boiling point, by name and by component", () => {
    const byName = vaporPressure({ component: "Benzene", temperature: "80.09 degC" });
    expect(byName.value / 101325).toBeCloseTo(1, 2);
    expect(byName.cautions).toEqual([]);
    expect(byName.methods[0]!.source).toContain("The Properties of Gases and Liquids");
    expect(vaporPressure({ component: component("71-43-2"), temperature: 353.24 })).toEqual(byName);
  });

  test("outside the published range: continued, with a caution that gives the limit", () => {
    const { value, cautions } = vaporPressure({ component: "benzene", temperature: 270 });
    expect(value).toBeGreaterThan(0);
    expect(cautions.map(({ code, value: at, limit }) => [code, at, limit])).toEqual([
      ["vapor-pressure-extrapolated", 270, component("benzene").vaporPressure.range[0]],
    ]);
  });

  test("a preliminary grade is said, with what it was compared with", () => {
    const { cautions } = vaporPressure({ component: "n-butyl acrylate", temperature: 400 });
    expect(cautions.map(({ code }) => code)).toEqual(["vapor-pressure-preliminary"]);
    expect(cautions[0]!.message).toContain("median of 3 published sets");
  });

  test("refusals", () => {
    // ln P = 5 ln T - 0.02 T has its maximum at 250 K
    const dippr101 = { form: "dippr101", C1: 0, C2: 0, C3: 5, C4: -0.02, C5: 1 } as const;
    const block = { ...dippr101, range: [100, 200], source: "invented" } as const;
    const turning = defineComponent({ name: "turning", vaporPressure: block });
    const refused = (temperature: unknown, name: unknown = "benzene"): string[] =>
      refusalOf(() => vaporPressure({ component: name, temperature } as never));
    expect(refused(600)).toEqual(["above-critical temperature"]);
    expect(refused(95)).toEqual(["implausible-bare-number temperature"]);
    expect(refused("50 K", own(forms["antoine"]!))).toEqual(["vapor-pressure-undefined temperature"]);
    expect(refused("300 K", turning)).toEqual(["vapor-pressure-undefined temperature"]);
    expect(refused(350, "benzen")).toEqual(["unknown-component component"]);
    expect(refused(Number.NaN, 7)).toEqual(["wrong-type component", "not-finite temperature"]);
    expect(refusalOf(() => vaporPressure(null as never))).toEqual(["not-an-object input"]);
    expect(messageOf(() => vaporPressure({ component: "benzene", temperature: 600 }))).toContain("562.05 K");
  });

  test("the critical temperature of an own Wagner equation is known", () => {
    const component = own(forms["wagner25"]!);
    expect(refusalOf(() => vaporPressure({ component, temperature: 570 }))).toEqual([
      "above-critical temperature",
    ]);
  });

  test("answers all components over their range, without a caution on the range", () => {
    for (const each of allComponents()) {
      const [low, high] = each.vaporPressure.range;
      const top = Math.min(high, each.criticalTemperature!);
      for (const share of [0, 0.3, 0.7, 1]) {
        const { value, cautions } = vaporPressure({
          component: each,
          temperature: `${low + share * (top - low)} K`,
        });
        expect(value).toBeGreaterThan(0);
        expect(cautions.filter(({ code }) => code === "vapor-pressure-extrapolated")).toEqual([]);
      }
    }
  });
});
