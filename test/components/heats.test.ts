import { describe, expect, test } from "vitest";
import { component } from "../../src/components/componentTable";
import { defineComponent } from "../../src/components/defineComponent";
import { liquidDensity, liquidMolarVolume } from "../../src/components/density";
import {
  heatFromVaporPressure,
  heatOfVaporization,
  heatOfVaporizationMethod,
  idealGasHeatCapacity,
  liquidHeatCapacity,
} from "../../src/components/heats";
import { evaluateProperty, isOutsideRange } from "../../src/components/propertyEquation";
import { liquidViscosity, surfaceTension } from "../../src/components/transport";

const own = defineComponent({ name: "own", vaporPressure: component("toluene").vaporPressure });

describe("heat of vaporization", () => {
  test("toluene at its normal boiling point: 33.18 kJ/mol (CRC Handbook)", () => {
    const { value, estimated } = heatOfVaporization(component("toluene"), 383.78);
    expect(estimated).toBe(false);
    expect(Math.abs(value / 33180 - 1)).toBeLessThan(0.02);
    expect(heatOfVaporizationMethod(component("toluene")).source).toContain("VDI Heat Atlas");
  });

  test("without a correlation by Clapeyron's equation, and said so", () => {
    const isoprene = component("isoprene");
    const { value, estimated } = heatOfVaporization(isoprene, 307.2);
    expect(estimated).toBe(true);
    expect(value).toBe(heatFromVaporPressure(isoprene, 307.2));
    expect(value).toBeGreaterThan(24e3);
    expect(value).toBeLessThan(28e3);
    expect(heatOfVaporizationMethod(isoprene)).toEqual({
      name: "Heat of vaporization of isoprene: Clapeyron's equation",
      source: expect.stringContaining("Haggenmacher") as string,
    });
  });

  test("of an ideal vapor when the critical point is not known; none at the critical point", () => {
    const antoine = defineComponent({
      name: "antoine",
      vaporPressure: {
        form: "antoine",
        A: 9,
        B: 1300,
        C: 0,
        logBase: 10,
        temperatureUnit: "K",
        pressureUnit: "Pa",
        range: [250, 400],
        source: "invented",
      },
    });
    // with C = 0 the slope of ln P in 1/T is the constant -B ln 10
    expect(heatFromVaporPressure(antoine, 300)).toBeCloseTo(8.31446261815324 * 1300 * Math.LN10, 6);
    expect(heatFromVaporPressure(own, 591.75)).toBeLessThan(2000);
    expect(heatOfVaporization(component("toluene"), 900).value).toBe(0);
  });
});

describe("other properties", () => {
  test("benzene at 25 degC: 873.6 kg/m3, 0.604 mPa s, 28.2 mN/m, 136 J/(mol K) liquid, 82.4 gas (CRC Handbook)", () => {
    const benzene = component("benzene");
    const near = (value: number | undefined, published: number, share: number): void =>
      expect(Math.abs(value! / published - 1)).toBeLessThan(share);
    near(liquidDensity(benzene, 298.15), 873.6, 0.005);
    near(liquidMolarVolume(benzene, 298.15), 0.078114 / 873.6, 0.005);
    near(liquidViscosity(benzene, 298.15), 0.604e-3, 0.03);
    near(surfaceTension(benzene, 298.15), 0.02822, 0.02);
    near(liquidHeatCapacity(benzene, 298.15), 136, 0.02);
    near(idealGasHeatCapacity(benzene, 298.15), 82.4, 0.02);
  });

  test("a single published heat capacity stands for all temperatures, outside its range", () => {
    const isoprene = component("isoprene");
    expect(liquidHeatCapacity(isoprene, 350)).toBe(liquidHeatCapacity(isoprene, 298.15));
    expect(isOutsideRange(isoprene.liquidHeatCapacity!, 350)).toBe(true);
    expect(isOutsideRange(isoprene.liquidHeatCapacity!, 298.15)).toBe(false);
  });

  test("beyond its range a property keeps its end value", () => {
    const toluene = component("toluene");
    const [low, high] = toluene.liquidHeatCapacity!.range;
    expect(liquidHeatCapacity(toluene, low - 50)).toBe(liquidHeatCapacity(toluene, low));
    expect(liquidHeatCapacity(toluene, high + 50)).toBe(liquidHeatCapacity(toluene, high));
  });

  test("undefined when there is none, or its equation is not known", () => {
    for (const of of [
      liquidDensity,
      liquidViscosity,
      surfaceTension,
      liquidHeatCapacity,
      idealGasHeatCapacity,
    ]) {
      expect(of(own, 300)).toBeUndefined();
    }
    const block = { equation: "constructor", constants: [1], range: [200, 400], source: "none" } as const;
    expect(evaluateProperty(block, 300, own)).toBeNaN();
    expect(liquidDensity({ ...own, liquidDensity: block }, 300)).toBeUndefined();
  });
});
