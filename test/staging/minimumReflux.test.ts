import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type BinaryColumn, columnFlows, operatingVapor } from "../../src/staging/binaryColumn";
import { tabulate } from "../../src/staging/curveTable";
import {
  constantVolatilityCurve,
  type EquilibriumCurve,
  functionCurve,
} from "../../src/staging/equilibriumCurve";
import { minimumReflux } from "../../src/staging/minimumReflux";

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const runs = { numRuns: 150, seed: 20261204 };

/** y of a pair with Margules activity coefficients: ln(gamma1/gamma2) = A ((1 - x)^2 - x^2). */
function activityCurve(volatility: number, margules: number): EquilibriumCurve {
  return functionCurve((x) => {
    const k = volatility * Math.exp(margules * ((1 - x) ** 2 - x * x));
    return (k * x) / (1 + (k - 1) * x);
  });
}

function simple(z: number, q: number, xD: number, xB: number): BinaryColumn {
  const streams = [{ flow: 1, lightFraction: z, q }];
  return { streams, distillateLightFraction: xD, bottomsLightFraction: xB, openSteam: false };
}

const simpleColumns = fc
  .tuple(number(0.1, 0.9), number(-0.5, 1.5), number(0.92, 0.9999), number(0.0001, 0.08))
  .map((specification) => simple(...specification));

/** The column upside down: heavy for light, vapor for liquid; its reflux ratio is the boilup ratio of the other. */
function mirrored({ streams, ...column }: BinaryColumn): BinaryColumn {
  return {
    ...column,
    streams: streams.map(({ flow, lightFraction, q }) => ({
      flow,
      lightFraction: 1 - lightFraction,
      q: 1 - q,
    })),
    distillateLightFraction: 1 - column.bottomsLightFraction,
    bottomsLightFraction: 1 - column.distillateLightFraction,
  };
}

test("heavy for light and vapor for liquid: the minimum reflux becomes the minimum boilup", () => {
  fc.assert(
    fc.property(simpleColumns, number(1.05, 20), (column, volatility) => {
      const curve = constantVolatilityCurve(volatility);
      const { sections, bottoms } = columnFlows(column, minimumReflux(curve, column).minimumReflux);
      const boilup = minimumReflux(curve, mirrored(column)).minimumReflux;
      expect(boilup).toBeCloseTo(Math.max(0, sections[1]!.vapor / bottoms), 7);
    }),
    runs,
  );
});

describe("tangent pinches, by the definition: a line through the product may not cross the curve", () => {
  const bends = fc.tuple(simpleColumns, number(2.2, 5), number(-0.4, 0.7));

  /** The largest multiple of what is allowed that a fine grid finds on a line, 1 where the line just touches. */
  function crossing(curve: EquilibriumCurve, column: BinaryColumn, reflux: number): number {
    const { sections, intersections } = columnFlows(column, reflux);
    let least = Infinity;
    for (let i = 1; i < 20_000; i++) {
      const { bottomsLightFraction: xB, distillateLightFraction: xD } = column;
      const x = xB + ((xD - xB) * i) / 20_000;
      const section = sections[x > intersections[0]! ? 0 : 1]!;
      least = Math.min(least, curve.vapor(x) - operatingVapor(section, x));
    }
    return least;
  }

  test("just above the minimum no line crosses; just below it one does, or a flow is gone", () => {
    const limits = new Set<string>();
    fc.assert(
      fc.property(bends, ([column, volatility, margules]) => {
        const curve = activityCurve(volatility, margules);
        const { distillateLightFraction: xD, bottomsLightFraction: xB } = column;
        const table = tabulate(curve, xB, xD);
        fc.pre(table.x.every((x, i) => table.y[i]! > x));
        const found = minimumReflux(curve, column, table);
        limits.add(found.limitedBy);
        expect(crossing(curve, column, found.minimumReflux * 1.0001 + 1e-9)).toBeGreaterThan(0);
        if (found.limitedBy !== "tangent-pinch") return;
        expect(crossing(curve, column, found.minimumReflux * 0.999)).toBeLessThan(0);
      }),
      { ...runs, numRuns: 60 },
    );
    expect([...limits].sort()).toEqual(["feed-pinch", "tangent-pinch", "vanishing-flow"]);
  });

  test("rectifying R/(R + 1) is the largest (xD - y)/(xD - x), found on a grid a thousand times finer", () => {
    const curve = activityCurve(4.5, 1.07);
    const column = simple(0.45, 1, 0.95, 0.07);
    const found = minimumReflux(curve, column, tabulate(curve, 0.07, 0.95));
    let slope = 0;
    for (let x = 0.5; x < 0.949; x += 1e-6) slope = Math.max(slope, (0.95 - curve.vapor(x)) / (0.95 - x));
    expect(found.limitedBy).toBe("tangent-pinch");
    expect(found.minimumReflux / (slope / (1 - slope))).toBeCloseTo(1, 9);
  });
});

test("a concave curve through its table gives what its closed form gives", () => {
  fc.assert(
    fc.property(simpleColumns, number(1.1, 20), (column, volatility) => {
      const curve = constantVolatilityCurve(volatility);
      const table = tabulate(curve, column.bottomsLightFraction, column.distillateLightFraction);
      const searched = minimumReflux(curve, column, table);
      const closed = minimumReflux(curve, column);
      expect(searched.minimumReflux).toBeCloseTo(closed.minimumReflux, 10);
      expect(searched.limitedBy).toBe(closed.limitedBy);
    }),
    runs,
  );
});
