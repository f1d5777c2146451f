import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { allComponents } from "../../src/components/componentTable";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { dewPoint } from "../../src/equilibrium/dewPoint";
import { flash } from "../../src/equilibrium/flash";
import { relativeVolatility } from "../../src/equilibrium/relativeVolatility";

/** Components of a like kind boil at like temperatures, so that none is near its critical point. */
const names = allComponents()
  .filter(({ normalBoilingPoint: boiling = 0 }) => boiling > 310 && boiling < 400)
  .map(({ name }) => name);

const composition = fc
  .uniqueArray(fc.constantFrom(...names), { minLength: 1, maxLength: 8 })
  .chain((chosen) =>
    fc
      .array(fc.double({ min: 1e-4, max: 1, noNaN: true }), {
        minLength: chosen.length,
        maxLength: chosen.length,
      })
      .map((amounts) => {
        const total = amounts.reduce((sum, each) => sum + each, 0);
        return Object.fromEntries(chosen.map((name, i) => [name, amounts[i]! / total]));
      }),
  );
const pressure = fc.double({ min: 2e4, max: 2e5, noNaN: true });
const share = fc.double({ min: 0, max: 1, noNaN: true });
const runs = { numRuns: 200, seed: 1887 };

function gapOf(a: number, b: number): number {
  return Math.abs(a / b - 1);
}

function sum(fractions: Readonly<Record<string, number>>): number {
  return Object.values(fractions).reduce((total, each) => total + each, 0);
}

describe("any mixture of the table that boils between 310 and 400 K", () => {
  test("a bubble point's temperature gives its pressure back, and the phases add up to 1", () => {
    fc.assert(
      fc.property(composition, pressure, (z, p) => {
        for (const point of [bubblePoint, dewPoint]) {
          const there = point({ composition: z, pressure: p });
          const back = point({ composition: z, temperature: `${there.temperature} K` });
          expect(gapOf(back.pressure, p)).toBeLessThan(1e-11);
          expect(Math.abs(sum(there.liquid) - 1)).toBeLessThan(1e-12);
          expect(Math.abs(sum(there.vapor) - 1)).toBeLessThan(1e-12);
        }
      }),
      runs,
    );
  });

  test("a flash lies between bubble and dew point, closes its balance, and is found again from any two variables", () => {
    fc.assert(
      fc.property(composition, pressure, share, (z, p, vaporFraction) => {
        const bubble = bubblePoint({ composition: z, pressure: p });
        const dew = dewPoint({ composition: z, pressure: p });
        const state = flash({ composition: z, pressure: p, vaporFraction });
        expect(state.temperature).toBeGreaterThanOrEqual(bubble.temperature * (1 - 1e-12));
        expect(state.temperature).toBeLessThanOrEqual(dew.temperature * (1 + 1e-12));
        for (const name of Object.keys(z)) {
          const back = vaporFraction * state.vapor[name]! + (1 - vaporFraction) * state.liquid[name]!;
          expect(Math.abs(back - z[name]!)).toBeLessThan(1e-12);
        }
        const atTemperature = flash({ composition: z, temperature: `${state.temperature} K`, vaporFraction });
        expect(gapOf(atTemperature.pressure, p)).toBeLessThan(1e-11);
        if (dew.temperature - bubble.temperature < 0.1) return; // of one volatility, T and P do not set the split
        const both = flash({ composition: z, temperature: `${state.temperature} K`, pressure: p });
        expect(Math.abs(both.vaporFraction - vaporFraction)).toBeLessThan(1e-9);
      }),
      runs,
    );
  });

  test("vapor fractions of exactly 0 and 1 are the bubble and the dew point", () => {
    fc.assert(
      fc.property(composition, pressure, (z, p) => {
        const liquid = flash({ composition: z, pressure: p, vaporFraction: 0 });
        const vapor = flash({ composition: z, pressure: p, vaporFraction: 1 });
        expect(liquid.temperature).toBe(bubblePoint({ composition: z, pressure: p }).temperature);
        expect(vapor.temperature).toBe(dewPoint({ composition: z, pressure: p }).temperature);
        expect([liquid.phase, vapor.phase]).toEqual(["liquid", "vapor"]);
      }),
      runs,
    );
  });

  test("below the bubble point all liquid, above the dew point all vapor", () => {
    fc.assert(
      fc.property(composition, pressure, fc.double({ min: 0.01, max: 20, noNaN: true }), (z, p, away) => {
        const cold = bubblePoint({ composition: z, pressure: p }).temperature - away;
        const hot = dewPoint({ composition: z, pressure: p }).temperature + away;
        expect(flash({ composition: z, pressure: p, temperature: `${cold} K` })).toMatchObject({
          phase: "liquid",
          vaporFraction: 0,
        });
        expect(flash({ composition: z, pressure: p, temperature: `${hot} K` })).toMatchObject({
          phase: "vapor",
          vaporFraction: 1,
        });
      }),
      runs,
    );
  });

  test("the order of the names does not matter, nor does a component of which there is none", () => {
    fc.assert(
      fc.property(composition, pressure, share, (z, p, vaporFraction) => {
        const turned = Object.fromEntries(Object.entries(z).reverse());
        const withNone = Object.hasOwn(z, "ethane") ? z : { ethane: 0, ...z };
        const expected = flash({ composition: z, pressure: p, vaporFraction }).temperature;
        expect(
          gapOf(flash({ composition: turned, pressure: p, vaporFraction }).temperature, expected),
        ).toBeLessThan(1e-13);
        expect(
          gapOf(flash({ composition: withNone, pressure: p, vaporFraction }).temperature, expected),
        ).toBeLessThan(1e-13);
      }),
      runs,
    );
  });

  test("relative volatility: the ratio of K-values, whatever the reference", () => {
    fc.assert(
      fc.property(composition, pressure, (z, p) => {
        const [first] = Object.keys(z);
        const { values, kValues, temperature } = relativeVolatility({
          composition: z,
          heavyKey: first!,
          pressure: p,
        });
        expect(temperature).toBe(bubblePoint({ composition: z, pressure: p }).temperature);
        for (const name of Object.keys(z))
          expect(gapOf(values[name]!, kValues[name]! / kValues[first!]!)).toBeLessThan(1e-14);
      }),
      runs,
    );
  });
});
