import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Issue } from "../../src/base/errors";
import type { FeedThermal } from "../../src/balance/feedThermal";
import { thermalCondition, type ThermalCondition } from "../../src/balance/thermalCondition";
import { component } from "../../src/components/componentTable";
import { defineComponent } from "../../src/components/defineComponent";
import { heatOfVaporization, idealGasHeatCapacity, liquidHeatCapacity } from "../../src/components/heats";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { dewPoint } from "../../src/equilibrium/dewPoint";
import { flash } from "../../src/equilibrium/flash";
import { type IdealMixture, idealMixture } from "../../src/equilibrium/phaseState";

const fractions = Float64Array.of(0.45, 0.55);
const names = ["benzene", "toluene"];
const composition = { benzene: 0.45, toluene: 0.55 };
const mixture = idealMixture({ names, components: names.map(component), fractions });
const atmosphere = 101325;

type Stated = Exclude<FeedThermal, { given: "q" }>;

function condition(thermal: Stated, pressure: number, of: IdealMixture = mixture): ThermalCondition {
  const faults: Issue[] = [];
  const result = thermalCondition(faults, "feed.", of, thermal, pressure);
  expect(faults).toEqual([]);
  return result!;
}

function at(temperature: number, pressure = atmosphere): Stated {
  return { given: "temperature", temperature, pressure };
}

describe("at the column's own pressure", () => {
  test.each([0, 0.3, 1])("vapor fraction %d", (vaporFraction) => {
    const thermal = { given: "vaporFraction", vaporFraction, pressure: atmosphere } as const;
    expect(condition(thermal, atmosphere).q).toBe(1 - vaporFraction);
  });

  test("a temperature between bubble and dew point: the liquid fraction of the flash", () => {
    const { vaporFraction } = flash({ composition, temperature: 369, pressure: atmosphere });
    expect(vaporFraction).toBeGreaterThan(0.1);
    expect(condition(at(369), atmosphere).q).toBe(1 - vaporFraction);
  });

  test("subcooled: 1 + cp (T_bubble - T)/latent heat, cp at the mean temperature", () => {
    const { temperature } = bubblePoint({ composition, pressure: atmosphere });
    const cold = temperature - 40;
    const mean = (property: (name: string) => number): number =>
      names.reduce((sum, name, i) => sum + fractions[i]! * property(name), 0);
    const cp = mean((name) => liquidHeatCapacity(component(name), temperature - 20)!);
    const dew = dewPoint({ composition, pressure: atmosphere }).temperature;
    const cpVapor = mean((name) => idealGasHeatCapacity(component(name), temperature)!);
    const latent = mean((name) => heatOfVaporization(component(name), temperature).value);
    const expected = 1 + (cp * 40) / (latent + cpVapor * (dew - temperature));
    expect(Math.abs(condition(at(cold), atmosphere).q - expected)).toBeLessThan(5e-4);
  });

  test("Geankoplis, data of Examples 11.6-1 and 11.6-2: feed at 54.5 degC, q 1.19 by its heats", () => {
    const cp = 0.45 * 138 + 0.55 * 167.5;
    const latent = 0.45 * 30820 + 0.55 * 33330;
    const bubble = 93.8; // its boiling curve, at 0.45
    const expected = 1 + (cp * (bubble - 54.5)) / latent;
    expect(Math.abs(condition(at(54.5 + 273.15), 101.32e3).q - expected)).toBeLessThan(0.02);
  });

  test("superheated: -cp (T - T_dew)/latent heat", () => {
    const { temperature } = dewPoint({ composition, pressure: atmosphere });
    const { q } = condition(at(temperature + 30), atmosphere);
    const cp = names.reduce(
      (sum, name, i) => sum + fractions[i]! * idealGasHeatCapacity(component(name), temperature + 15)!,
      0,
    );
    expect(q).toBeLessThan(0);
    expect(Math.abs((cp * 30) / -q - 32900)).toBeLessThan(1500); // between 30820 and 33330, and 6 K of heating
  });
});

describe("brought to the column's pressure", () => {
  test("hotter means less liquid, without a step where the phases change", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 300, max: 470, noNaN: true }),
        fc.double({ min: 0.01, max: 5, noNaN: true }),
        fc.double({ min: 5e4, max: 3e5, noNaN: true }),
        (temperature, step, pressure) => {
          const q = (t: number): number => condition(at(t, 6e5), pressure).q;
          const fall = q(temperature) - q(temperature + step);
          expect(fall).toBeGreaterThan(0);
          // per kelvin no more than the whole range of vaporization at 6 bar, which is 8 K wide
          expect(fall).toBeLessThan(0.25 * step + 1e-9);
        },
      ),
      { numRuns: 100, seed: 1925 },
    );
  });

  test("a saturated liquid flashes by its own sensible heat: pure benzene from 5 to 1 bar, hand calculation", () => {
    const pure = idealMixture({
      names: ["benzene"],
      components: [component("benzene")],
      fractions: Float64Array.of(1),
    });
    const hot = bubblePoint({ composition: { benzene: 1 }, pressure: 5e5 }).temperature;
    const cold = bubblePoint({ composition: { benzene: 1 }, pressure: 1e5 }).temperature;
    const cp = liquidHeatCapacity(component("benzene"), 0.5 * (hot + cold))!;
    const expected = 1 - (cp * (hot - cold)) / heatOfVaporization(component("benzene"), cold).value;
    const { q } = condition({ given: "vaporFraction", vaporFraction: 0, pressure: 5e5 }, 1e5, pure);
    expect(Math.abs(q - expected)).toBeLessThan(1e-3);
  });

  test("from a lower pressure: said, since a pump or compressor adds heat", () => {
    const { cautions } = condition(at(320, 5e4), atmosphere);
    expect(cautions).toMatchObject([
      { code: "feed-pressure-low", severity: "check", value: 5e4, limit: atmosphere },
    ]);
  });
});

describe("without heat data", () => {
  const own = defineComponent({ name: "own", vaporPressure: component("toluene").vaporPressure });
  const withOwn = idealMixture({
    names: ["benzene", "own"],
    components: [component("benzene"), own],
    fractions,
  });

  test.each([
    [at(320), 1, /saturated liquid is taken, so the true q is above 1/],
    [at(420), 0, /saturated vapor is taken, so the true q is below 0/],
  ])("one phase is taken as saturated", (thermal, q, message) => {
    const result = condition(thermal, atmosphere, withOwn);
    expect(result.q).toBe(q);
    expect(result.cautions).toMatchObject([{ code: "heat-data-missing", severity: "check", value: q }]);
    expect(result.cautions[0]!.message).toMatch(message);
    expect(result.cautions[0]!.message).toContain("own");
  });

  test("two phases at another pressure: the liquid fraction at the feed's own", () => {
    const { vaporFraction } = flash({ composition, temperature: 369, pressure: atmosphere });
    const result = condition(at(369), 9e4, withOwn);
    expect(result.q).toBeCloseTo(1 - vaporFraction, 12);
    expect(result.cautions).toMatchObject([{ code: "heat-data-missing" }]);
  });

  test("none are needed at the column's own pressure", () => {
    expect(condition(at(369), atmosphere, withOwn).cautions).toEqual([]);
  });
});

test("a column pressure at which nothing boils is refused", () => {
  const faults: Issue[] = [];
  expect(thermalCondition(faults, "feed.", mixture, at(320), 1e7)).toBeUndefined();
  expect(faults[0]).toMatchObject({ code: "above-critical", path: "pressure" });
});
