import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Component } from "../../src/components/component";
import { allComponents } from "../../src/components/componentTable";
import { defineComponent } from "../../src/components/defineComponent";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { dewPoint } from "../../src/equilibrium/dewPoint";
import { flash } from "../../src/equilibrium/flash";
import { relativeVolatility } from "../../src/equilibrium/relativeVolatility";
import { expectAnswerOrRefusal } from "../shortcut/answerOrRefusal";

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** Whatever constants a person may type: those that defineComponent accepts. */
const oddComponent = fc
  .record({
    form: fc.constantFrom("antoine", "dippr101", "wagner25", "wagner36"),
    a: number(-50, 120),
    b: number(-100, 9000),
    c: number(-300, 300),
    d: number(-20, 20),
    low: number(5, 600),
    width: number(1, 400),
    critical: number(20, 900),
  })
  .map(({ form, a, b, c, d, low, width, critical }) => ({
    form,
    range: [low, low + width],
    source: "odd",
    ...(form === "antoine"
      ? { A: a / 5, B: b, C: c, logBase: 10, temperatureUnit: "K", pressureUnit: "Pa" }
      : form === "dippr101"
        ? { C1: a, C2: -b, C3: d, C4: c * 1e-6, C5: 2 }
        : {
            coefficients: [-a / 10, d / 5, -c / 100, d],
            criticalTemperature: critical,
            criticalPressure: 4e6,
          }),
  }));

function accepted(name: string, vaporPressure: object): Component | undefined {
  try {
    return defineComponent({ name, vaporPressure } as never);
  } catch {
    return undefined;
  }
}

const pressure = fc.oneof(
  number(-6, 12).map((power) => `${10 ** power} Pa`),
  number(1e3, 2e7),
);
const temperature = fc.oneof(
  number(0.1, 5000).map((value) => `${value} K`),
  number(50, 900),
);

describe("odd components at odd states: an answer of finite numbers, or a refusal", () => {
  test("of one's own", () => {
    let answered = 0;
    fc.assert(
      fc.property(
        fc.array(oddComponent, { minLength: 1, maxLength: 4 }),
        fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 4, maxLength: 4 }),
        pressure,
        temperature,
        number(0, 1),
        (blocks, amounts, p, t, vaporFraction) => {
          const ownComponents = blocks.flatMap((block, i) => accepted(`c${i + 1}`, block) ?? []);
          const composition = Object.fromEntries(ownComponents.map(({ name }, i) => [name, amounts[i]!]));
          const mixture = { composition, ownComponents, normalize: true };
          for (const call of [
            () => bubblePoint({ ...mixture, pressure: p } as never),
            () => bubblePoint({ ...mixture, temperature: t } as never),
            () => dewPoint({ ...mixture, pressure: p } as never),
            () => dewPoint({ ...mixture, temperature: t } as never),
            () => flash({ ...mixture, pressure: p, temperature: t } as never),
            () => flash({ ...mixture, pressure: p, vaporFraction } as never),
            () => flash({ ...mixture, temperature: t, vaporFraction } as never),
            () => relativeVolatility({ ...mixture, temperature: t, heavyKey: "c1" } as never),
          ]) {
            expectAnswerOrRefusal(() => {
              const result = call();
              answered++;
              return result;
            });
          }
        },
      ),
      { numRuns: 1000, seed: 13 },
    );
    expect(answered).toBeGreaterThan(200);
  });

  test("of the table", () => {
    const names = allComponents().map(({ name }) => name);
    fc.assert(
      fc.property(
        fc.uniqueArray(fc.constantFrom(...names), { minLength: 1, maxLength: 5 }),
        fc.array(number(0, 1), { minLength: 5, maxLength: 5 }),
        pressure,
        temperature,
        number(0, 1),
        (chosen, amounts, p, t, vaporFraction) => {
          const composition = Object.fromEntries(chosen.map((name, i) => [name, amounts[i]!]));
          const mixture = { composition, normalize: true };
          expectAnswerOrRefusal(() => bubblePoint({ ...mixture, pressure: p } as never));
          expectAnswerOrRefusal(() => dewPoint({ ...mixture, temperature: t } as never));
          expectAnswerOrRefusal(() => flash({ ...mixture, pressure: p, temperature: t } as never));
          expectAnswerOrRefusal(() => flash({ ...mixture, pressure: p, vaporFraction } as never));
        },
      ),
      { numRuns: 500, seed: 17 },
    );
  });
});

test("a mixture of 500 components within a second", () => {
  const { vaporPressure } = allComponents().find(({ name }) => name === "toluene")!;
  const ownComponents = Array.from({ length: 500 }, (_, i) =>
    defineComponent({ name: `c${i + 1}`, vaporPressure }),
  );
  const composition = Object.fromEntries(ownComponents.map(({ name }) => [name, 1 / 500]));
  const start = performance.now();
  const { temperature: boiling } = bubblePoint({ composition, ownComponents, pressure: "1 atm" });
  expect(performance.now() - start).toBeLessThan(1000);
  expect(boiling).toBeCloseTo(bubblePoint({ composition: { toluene: 1 }, pressure: "1 atm" }).temperature, 9);
});
