import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { boilingTemperature, boilingTemperatureAt } from "../../src/components/boilingTemperature";
import { allComponents } from "../../src/components/componentTable";
import { defineComponent } from "../../src/components/defineComponent";
import { logVaporPressure, logVaporPressureSlope, vaporPressure } from "../../src/components/vaporPressure";
import { grid } from "./propertyChecks";
import { messageOf, refusalOf } from "./refusal";

const components = allComponents();

const solvent = defineComponent({
  name: "solvent",
  vaporPressure: {
    form: "antoine",
    A: 8.98523,
    B: 1184.24,
    C: -55.578,
    logBase: 10,
    temperatureUnit: "K",
    pressureUnit: "Pa",
    range: [279, 377],
    source: "own measurement",
  },
});

describe("boilingTemperatureAt", () => {
  test("all components from 100 Pa to near the critical pressure, to 1e-12", () => {
    for (const component of components) {
      const { vaporPressure: block, criticalPressure } = component;
      for (const log of grid(Math.log(100), Math.log(0.99 * criticalPressure!))) {
        const t = boilingTemperatureAt(component, log);
        const error = (logVaporPressure(block, t) - log) / (t * logVaporPressureSlope(block, t));
        if (!(Math.abs(error) < 1e-12))
          expect.fail(`${component.id} at ${Math.exp(log)} Pa: T ${t}, off by ${error}`);
      }
    }
  });

  test("an Antoine equation is inverted exactly: T = B/(A - log10 P) - C", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 7, noNaN: true }), (log10) => {
        const exact = 1184.24 / (8.98523 - log10) + 55.578;
        expect(boilingTemperatureAt(solvent, log10 * Math.LN10) / exact).toBeCloseTo(1, 12);
      }),
      { seed: 2, numRuns: 300 },
    );
  });

  test("NaN where the equation never gets there", () => {
    expect(boilingTemperatureAt(solvent, 9 * Math.LN10)).toBeNaN();
    expect(boilingTemperatureAt(solvent, Infinity)).toBeNaN();
  });
});

describe("boilingTemperature", () => {
  test("undoes vaporPressure, for any component", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...components),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (component, share) => {
          const [low, high] = component.vaporPressure.range;
          const temperature = low + share * (Math.min(high, 0.98 * component.criticalTemperature!) - low);
          const { value: pressure } = vaporPressure({ component, temperature: `${temperature} K` });
          fc.pre(pressure < component.criticalPressure!);
          const back = boilingTemperature({ component, pressure: `${pressure} Pa` });
          expect(back.value / temperature).toBeCloseTo(1, 12);
        },
      ),
      { seed: 3, numRuns: 1000 },
    );
  });

  test("normal boiling points within 0.6 K of those listed", () => {
    const off = components
      .filter(({ normalBoilingPoint }) => normalBoilingPoint !== undefined)
      .map((component) => ({
        id: component.id,
        kelvin: boilingTemperature({ component, pressure: "1 atm" }).value - component.normalBoilingPoint!,
      }));
    expect(off.length).toBe(172);
    expect(off.filter(({ kelvin }) => Math.abs(kelvin) > 0.6)).toEqual([]);
  });

  test("refusals", () => {
    const refused = (pressure: unknown, component: unknown = "toluene"): string[] =>
      refusalOf(() => boilingTemperature({ component, pressure } as never));
    expect(refused(5e6)).toEqual(["above-critical pressure"]);
    expect(refused(1.3)).toEqual(["implausible-bare-number pressure"]);
    expect(refused("-1 bar")).toEqual(["pressure-not-positive pressure"]);
    expect(refused("20000 bar", solvent)).toEqual(["vapor-pressure-undefined pressure"]);
    expect(refused(undefined, null)).toEqual(["wrong-type component", "missing-field pressure"]);
    expect(messageOf(() => boilingTemperature({ component: "toluene", pressure: 5e6 }))).toContain(
      "4108000 Pa",
    );
  });

  test("outside the published range: continued, with a caution", () => {
    const { value, cautions } = boilingTemperature({ component: solvent, pressure: "3 bar" });
    expect(value).toBeGreaterThan(377);
    expect(cautions.map(({ code }) => code)).toEqual(["vapor-pressure-extrapolated"]);
  });
});
