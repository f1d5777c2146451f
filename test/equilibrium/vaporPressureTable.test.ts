import { describe, expect, test } from "vitest";
import { allComponents } from "../../src/components/componentTable";
import { defineComponent } from "../../src/components/defineComponent";
import { logVaporPressure, logVaporPressureSlope } from "../../src/components/vaporPressure";
import { criticalTemperatureOf } from "../../src/equilibrium/criticalPoint";
import { compileVaporPressures, evaluateVaporPressures } from "../../src/equilibrium/vaporPressureTable";

const components = allComponents();
const table = compileVaporPressures(components);

test.each([0, 0.1, 0.35, 0.6, 0.9, 0.999])(
  "compiled equations agree with the component's own at %d of its range",
  (share) => {
    components.forEach(({ name, vaporPressure }, i) => {
      const [low, high] = vaporPressure.range;
      const temperature = low + share * (high - low);
      evaluateVaporPressures(table, temperature);
      const log = logVaporPressure(vaporPressure, temperature);
      const slope = logVaporPressureSlope(vaporPressure, temperature);
      expect(Math.abs(table.logPressure[i]! - log), name).toBeLessThan(1e-12 * Math.max(10, Math.abs(log)));
      expect(Math.abs(table.slope[i]! / slope - 1), name).toBeLessThan(1e-9);
    });
  },
);

test("above the critical temperature ln P goes on without a step, rising", () => {
  components.forEach((component, i) => {
    const { form } = component.vaporPressure;
    const critical = criticalTemperatureOf(component);
    if (form === "antoine" || critical === undefined) return;
    const end = form === "dippr101" ? critical : component.vaporPressure.criticalTemperature;
    const at = (temperature: number): number => {
      evaluateVaporPressures(table, temperature);
      return table.logPressure[i]!;
    };
    expect(Math.abs(at(end * (1 + 1e-9)) - at(end)), component.name).toBeLessThan(1e-6);
    expect(at(1.5 * end), component.name).toBeGreaterThan(at(1.2 * end));
  });
});

describe("Antoine constants in every unit give one pressure", () => {
  const range = [280, 380] as const;
  const own = (name: string, block: object) =>
    defineComponent({
      name,
      vaporPressure: { form: "antoine", range, source: "conversion", ...block } as never,
    });
  // log10(P/Pa) = 8.98523 - 1184.24/(T/K - 55.578)
  const [A, B, C] = [8.98523, 1184.24, -55.578];
  const variants = [
    own("SI", { A, B, C, logBase: 10, temperatureUnit: "K", pressureUnit: "Pa" }),
    own("bar", { A: A - 5, B, C, logBase: 10, temperatureUnit: "K", pressureUnit: "bar" }),
    own("ln kPa", {
      A: (A - 3) * Math.LN10,
      B: B * Math.LN10,
      C,
      logBase: "e",
      temperatureUnit: "K",
      pressureUnit: "kPa",
    }),
    own("degC mmHg", {
      A: A - Math.log10(133.322387415),
      B,
      C: C + 273.15,
      logBase: 10,
      temperatureUnit: "degC",
      pressureUnit: "mmHg",
    }),
    own("degF psia", {
      A: A - Math.log10(6894.757293168361),
      B: 1.8 * B,
      C: 1.8 * C + 459.67,
      logBase: 10,
      temperatureUnit: "degF",
      pressureUnit: "psia",
    }),
  ];

  test.each(variants.map((variant, i) => [variant.name, i] as const))("%s", (_name, i) => {
    const compiled = compileVaporPressures(variants);
    evaluateVaporPressures(compiled, 353);
    expect(Math.abs(compiled.logPressure[i]! - compiled.logPressure[0]!)).toBeLessThan(1e-12);
    expect(Math.abs(compiled.slope[i]! / compiled.slope[0]! - 1)).toBeLessThan(1e-12);
  });
});
