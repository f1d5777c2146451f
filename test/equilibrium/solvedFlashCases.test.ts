import { describe, expect, test } from "vitest";
import { type ComponentDefinition, defineComponent } from "../../src/components/defineComponent";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { dewPoint } from "../../src/equilibrium/dewPoint";
import { flash } from "../../src/equilibrium/flash";
import { relativeVolatility } from "../../src/equilibrium/relativeVolatility";
import solved from "../data/solvedFlashCases.json";
import { largestGap } from "../shortcut/caseRecords";

const tolerance = 1e-11;
const functions = { bubblePoint, dewPoint, flash } as const;

interface Solved {
  readonly function: keyof typeof functions;
  readonly composition: readonly number[];
  readonly given: {
    readonly pressure?: number;
    readonly temperature?: number;
    readonly vaporFraction?: number;
  };
  readonly answer: {
    readonly temperature?: number;
    readonly pressure?: number;
    readonly vaporFraction?: number;
    readonly phase?: string;
    readonly liquid?: readonly number[];
    readonly vapor?: readonly number[];
    readonly kValues?: readonly number[];
    readonly relativeVolatilityToLast?: readonly number[];
  };
  readonly extrapolated: readonly string[];
  readonly components: readonly ComponentDefinition[];
}

const cases = (solved.cases as unknown as Solved[]).map((each, i) => ({ ...each, number: i + 1 }));

describe.each(cases)("solved case $number: $function of $composition at $given", (each) => {
  const names = each.components.map(({ name }) => name);
  const composition = Object.fromEntries(names.map((name, i) => [name, each.composition[i]!]));
  const ownComponents = each.components.map(defineComponent);
  const result = functions[each.function]({ composition, ownComponents, ...each.given });
  const inOrder = (values: Readonly<Record<string, number>>): number[] => names.map((name) => values[name]!);

  test("temperature, pressure, vapor fraction and phase", () => {
    for (const field of ["temperature", "pressure"] as const) {
      expect(Math.abs(result[field] / (each.answer[field] ?? each.given[field]!) - 1)).toBeLessThan(
        tolerance,
      );
    }
    if (result.kind !== "flash") return;
    const { vaporFraction = each.given.vaporFraction!, phase = "two-phase" } = each.answer;
    expect(Math.abs(result.vaporFraction - vaporFraction)).toBeLessThan(tolerance);
    expect(result.phase).toBe(phase);
  });

  test("phases and K-values", () => {
    for (const field of ["liquid", "vapor", "kValues"] as const) {
      const expected = each.answer[field];
      if (expected !== undefined)
        expect(largestGap(inOrder(result[field]), expected)).toBeLessThan(tolerance);
    }
    for (const phase of [result.liquid, result.vapor]) {
      expect(Math.abs(inOrder(phase).reduce((sum, x) => sum + x, 0) - 1)).toBeLessThan(tolerance);
    }
  });

  test("relative volatility at that temperature", () => {
    const { relativeVolatilityToLast } = each.answer;
    const { values } = relativeVolatility({
      composition,
      ownComponents,
      heavyKey: names.at(-1)!,
      temperature: result.temperature,
    });
    expect(inOrder(values).at(-1)).toBe(1);
    if (relativeVolatilityToLast !== undefined) {
      expect(largestGap(inOrder(values), relativeVolatilityToLast)).toBeLessThan(tolerance);
    }
  });

  test("a caution for every equation that is continued beyond its range", () => {
    const extrapolated = result.cautions.filter(({ code }) => code === "vapor-pressure-extrapolated");
    expect(
      extrapolated.map(({ message }) => names.find((name) => message.includes(` ${name} `))).sort(),
    ).toEqual([...each.extrapolated].sort());
  });
});

test("0.1 + 0.2 + 0.7 style rounding of fractions is accepted", () => {
  const [first] = cases;
  const ownComponents = first!.components.map(defineComponent);
  const composition = { benzene: 0.49999995, toluene: 0.50000005 };
  const { temperature } = bubblePoint({ composition, ownComponents, pressure: 101325 });
  expect(Math.abs(temperature / 365.302343227104 - 1)).toBeLessThan(1e-6); // answer of the equimolar liquid
});
