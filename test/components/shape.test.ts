import { expect, test } from "vitest";
import type { Component } from "../../src/components/component";
import { allComponents } from "../../src/components/componentTable";
import { evaluateProperty } from "../../src/components/propertyEquation";
import { liquidViscosity, surfaceTension } from "../../src/components/transport";
import { vaporPressureAt } from "../../src/components/vaporPressure";
import { associating, grid, rangeWithin } from "./propertyChecks";

const components = allComponents();
const gasConstant = 8.31446261815324;

function rises(values: readonly number[]): boolean {
  return values.every((value, i) => value > 0 && (i === 0 || value > values[i - 1]!));
}

function falls(values: readonly number[], slack = 0): boolean {
  return values.every((value, i) => value > 0 && (i === 0 || value < values[i - 1]! * (1 + slack)));
}

/** Ids of the components that have the block and for which a statement on it does not hold. */
function failing<B extends keyof Component>(
  block: B,
  holds: (block: NonNullable<Component[B]>, component: Component) => boolean,
): string[] {
  const known = components.filter((component) => component[block] !== undefined);
  expect(known.length).toBeGreaterThan(150);
  return known.filter((each) => !holds(each[block]!, each)).map(({ id }) => id);
}

test("vapor pressure rises over its range", () => {
  const wrong = failing("vaporPressure", (block, { criticalTemperature }) => {
    const [low, high] = [block.range[0], Math.min(block.range[1], criticalTemperature!)];
    return rises(grid(low, high).map((t) => vaporPressureAt(block, t)));
  });
  expect(wrong).toEqual([]);
});

test("heat of vaporization is positive and falls, but for associating vapors, where it has a maximum", () => {
  const wrong = failing("heatOfVaporization", (block, component) => {
    const [low, high] = rangeWithin(
      block,
      0.45 * block.criticalTemperature!,
      0.98 * block.criticalTemperature!,
    );
    const values = grid(low, high).map((t) => evaluateProperty(block, t, component));
    return associating.has(component.id) ? values.every((value) => value > 0) : falls(values, 0.003);
  });
  expect(wrong).toEqual([]);
});

test("liquid density falls; that of water from 278 K on", () => {
  const wrong = failing("liquidDensity", (block, component) => {
    const critical = block.criticalTemperature ?? component.criticalTemperature!;
    const least = component.id === "water" ? 278 : 0;
    const [low, high] = rangeWithin(block, Math.max(0.4 * critical, least), 0.98 * critical);
    return falls(grid(low, high).map((t) => evaluateProperty(block, t, component)));
  });
  expect(wrong).toEqual([]);
});

test("liquid heat capacity is positive over its range", () => {
  const wrong = failing("liquidHeatCapacity", (block, component) =>
    grid(...block.range).every((t) => evaluateProperty(block, t, component) > 10),
  );
  expect(wrong).toEqual([]);
});

test("ideal-gas heat capacity is at least that of a monatomic gas, 5/2 R", () => {
  const wrong = failing("idealGasHeatCapacity", (block, component) =>
    grid(...rangeWithin(block, 200, 1000)).every(
      (t) => evaluateProperty(block, t, component) >= 2.49 * gasConstant,
    ),
  );
  expect(wrong).toEqual([]);
});

test("liquid viscosity falls, and is 0.005 to 3 mPa s at the normal boiling point", () => {
  const wrong = failing("liquidViscosity", (block, component) => {
    const boiling = component.normalBoilingPoint;
    if (boiling === undefined) return true;
    const [low, high] = rangeWithin(block, 0.6 * boiling, 1.1 * boiling);
    const there = liquidViscosity(component, boiling)!;
    return (
      falls(grid(low, high, 12).map((t) => evaluateProperty(block, t, component))) &&
      there > 5e-6 &&
      there < 3e-3
    );
  });
  expect(wrong).toEqual([]);
});

test("surface tension at the normal boiling point is 1 to 70 mN/m", () => {
  const wrong = failing("surfaceTension", (_, component) => {
    const tension = surfaceTension(
      component,
      component.normalBoilingPoint ?? component.surfaceTension!.range[0],
    )!;
    return tension > 1e-3 && tension < 0.07;
  });
  expect(wrong).toEqual([]);
});

test("flammability limits and flash points are in order", () => {
  const wrong = failing("hazards", ({ flashPoint, autoignitionTemperature, ...limits }) => {
    const { lowerFlammabilityLimit: lower = 0, upperFlammabilityLimit: upper = 1 } = limits;
    const ignites = (flashPoint ?? 0) < (autoignitionTemperature ?? Infinity);
    return lower >= 0 && lower < upper && upper <= 1 && ignites;
  });
  expect(wrong).toEqual([]);
});
