import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { splitPhases } from "../../src/equilibrium/phaseSplit";
import { rachfordRice } from "../../src/equilibrium/rachfordRice";
import { record } from "../shortcut/caseRecords";
import { expectAnswerOrRefusal, refusal } from "../shortcut/answerOrRefusal";

test("three components, a value in circulation: 0.6907302627738544", () => {
  const composition = { a: 0.5, b: 0.3, c: 0.2 };
  const { vaporFraction, phase } = rachfordRice({ composition, kValues: { a: 1.685, b: 0.742, c: 0.532 } });
  expect(Math.abs(vaporFraction - 0.6907302627738544)).toBeLessThan(1e-15);
  expect(phase).toBe("two-phase");
});

test("two components: the root in closed form, V = -(z1/(K2 - 1) + z2/(K1 - 1))", () => {
  const share = fc.double({ min: 1e-6, max: 1 - 1e-6, noNaN: true });
  const power = fc.double({ min: 0.01, max: 20, noNaN: true });
  fc.assert(
    fc.property(share, power, power, (z, above, below) => {
      const [k1, k2] = [Math.exp(above), Math.exp(-below)];
      const expected = -(z / (k2 - 1) + (1 - z) / (k1 - 1));
      const { vaporFraction } = rachfordRice({ composition: { a: z, b: 1 - z }, kValues: { a: k1, b: k2 } });
      expect(Math.abs(vaporFraction - Math.min(1, Math.max(0, expected)))).toBeLessThan(1e-12);
    }),
    { numRuns: 1000, seed: 1952 },
  );
});

describe("any mixture, K-values over twenty powers of ten, fractions down to 1e-10", () => {
  const component = fc.record({
    amount: fc.double({ min: -10, max: 0, noNaN: true }).map((power) => 10 ** power),
    k: fc.double({ min: -10, max: 10, noNaN: true }).map((power) => 10 ** power),
  });
  const mixture = fc.array(component, { minLength: 1, maxLength: 12 });

  test("fractions add up to 1 and the balance closes", () => {
    fc.assert(
      fc.property(mixture, (components) => {
        const total = components.reduce((sum, { amount }) => sum + amount, 0);
        const z = Float64Array.from(components, ({ amount }) => amount / total);
        const k = Float64Array.from(components, (each) => each.k);
        const x = new Float64Array(z.length);
        const y = new Float64Array(z.length);
        const v = splitPhases(z, k, x, y);
        const sum = (values: Float64Array): number => values.reduce((total_, each) => total_ + each, 0);
        expect(Math.abs(sum(x) - 1)).toBeLessThan(1e-12);
        expect(Math.abs(sum(y) - 1)).toBeLessThan(1e-12);
        z.forEach((zi, i) => {
          const present = v === 0 ? x[i]! : v === 1 ? y[i]! : (1 - v) * x[i]! + v * y[i]!;
          expect(Math.abs(present - zi)).toBeLessThan(1e-12);
          if (v > 0 && v < 1) expect(Math.abs(y[i]! / (k[i]! * x[i]!) - 1)).toBeLessThan(1e-12);
        });
      }),
      { numRuns: 1500, seed: 1992 },
    );
  });

  test("a liquid below its bubble point, a vapor above its dew point", () => {
    fc.assert(
      fc.property(mixture, (components) => {
        const composition = record(components.map(({ amount }) => amount));
        const total = components.reduce((sum, { amount }) => sum + amount, 0);
        const kValues = record(components.map(({ k }) => k));
        const boils = components.reduce((sum, { amount, k }) => sum + (amount / total) * k, 0);
        const condenses = components.reduce((sum, { amount, k }) => sum + amount / total / k, 0);
        const { phase } = rachfordRice({ composition, kValues, normalize: true });
        if (boils < 1 - 1e-9) expect(phase).toBe("liquid");
        else if (condenses < 1 - 1e-9) expect(phase).toBe("vapor");
        else if (boils > 1 + 1e-9 && condenses > 1 + 1e-9) expect(phase).toBe("two-phase");
      }),
      { numRuns: 1000, seed: 7 },
    );
  });
});

describe("ends", () => {
  test.each([
    [[0.5, 0.5], [2, 3], "vapor", 1],
    [[0.5, 0.5], [0.2, 0.3], "liquid", 0],
    [[0.5, 0.5], [1.5, 0.5], "liquid", 0], // at its bubble point
    [[0.75, 0.25], [1.5, 0.5], "vapor", 1], // at its dew point
    [[1], [1.2], "vapor", 1],
    [[1, 0], [0.9, 1e6], "liquid", 0], // what is absent does not boil
    [[0, 1], [1e-9, 1.1], "vapor", 1],
  ])("z %j, K %j: %s", (z, k, phase, vaporFraction) => {
    expect(rachfordRice({ composition: record(z), kValues: record(k) })).toMatchObject({
      phase,
      vaporFraction,
    });
  });

  test("the absent phase is that of its first trace", () => {
    const { liquid, vapor } = rachfordRice({ composition: { a: 0.5, b: 0.5 }, kValues: { a: 0.9, b: 0.3 } });
    expect(liquid).toEqual({ a: 0.5, b: 0.5 });
    expect(vapor["a"]).toBeCloseTo(0.75, 14);
  });

  test("one volatility at its boiling point: any vapor fraction is a solution, and that is said", () => {
    const { cautions } = rachfordRice({ composition: { a: 0.5, b: 0.5 }, kValues: { a: 1, b: 1 } });
    expect(cautions.map(({ code }) => code)).toEqual(["vapor-fraction-indeterminate"]);
  });
});

describe("refusals", () => {
  test.each<[unknown, string[]]>([
    [{ composition: { a: 0.5, b: 0.4 }, kValues: { a: 1, b: 2 } }, ["composition-sum composition"]],
    [{ composition: { a: 0.5, b: 0.5 }, kValues: { a: 0, b: 2 } }, ["volatility-not-positive kValues.a"]],
    [{ composition: { a: 0.5, b: 0.5 }, kValues: { a: 1 } }, ["missing-field kValues.b"]],
    [{ composition: { a: 1 }, kValues: { a: 1, b: 2 } }, ["unknown-field kValues.b"]],
    [{ composition: { a: 1 }, kValues: { a: 1e300 } }, ["above-limit kValues.a"]],
    [{ composition: { a: 1 }, kValues: { a: Number.NaN } }, ["not-finite kValues.a"]],
    [{ composition: { a: 1 }, kValues: { a: 2 }, kvalues: {} }, ["unknown-field kvalues"]],
    [{ kValues: [] }, ["missing-field composition", "not-an-object kValues"]],
    [null, ["not-an-object input"]],
  ])("%j", (input, expected) => {
    expect(refusal(() => rachfordRice(input as never))).toEqual(expected);
  });

  test("any JSON is answered or refused", () => {
    const value = fc.oneof(fc.double(), fc.jsonValue(), fc.constantFrom("NaN", null, 1e308, 5e-324, -1));
    const named = fc.dictionary(fc.constantFrom("a", "b", "__proto__"), value);
    fc.assert(
      fc.property(
        fc.oneof(named, value),
        fc.oneof(named, value),
        value,
        (composition, kValues, normalize) => {
          expectAnswerOrRefusal(() => rachfordRice({ composition, kValues, normalize } as never));
        },
      ),
      { numRuns: 1000, seed: 3 },
    );
  });
});
