import { describe, expect, test } from "vitest";
import type { Issue } from "../../src/base/errors";
import { component } from "../../src/components/componentTable";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { dewPoint } from "../../src/equilibrium/dewPoint";
import { idealMixture } from "../../src/equilibrium/phaseState";
import { driftCautions, volatilityAlongColumn } from "../../src/equilibrium/volatilityAlongColumn";

const names = ["benzene", "toluene", "p-xylene"];
const fractions = Float64Array.of(0.4, 0.35, 0.25);
const mixture = idealMixture({ names, components: names.map(component), fractions });
const distillate = Float64Array.of(0.98, 0.02, 0);
const bottoms = Float64Array.of(0.01, 0.57, 0.42);
const origin = { path: "pressure", typed: 1.2e5 };
const column = {
  distillate,
  bottoms,
  topPressure: 1.2e5,
  feedPressure: 1.25e5,
  bottomPressure: 1.3e5,
  feedVaporFraction: 0,
  lightKey: 0,
  heavyKey: 1,
};

test("dew point of the distillate, bubble points of feed and bottoms, each at its own pressure", () => {
  const along = volatilityAlongColumn([], mixture, column, origin)!;
  const of = (x: Float64Array) => Object.fromEntries(names.map((name, i) => [name, x[i]!]));
  const top = dewPoint({ composition: of(distillate), pressure: 1.2e5 });
  const feed = bubblePoint({ composition: of(fractions), pressure: 1.25e5 });
  const bottom = bubblePoint({ composition: of(bottoms), pressure: 1.3e5 });
  for (const [point, expected] of [
    [along.top, top],
    [along.feed, feed],
    [along.bottom, bottom],
  ] as const) {
    expect(point.temperature).toBe(expected.temperature);
    expect(point.values[0]).toBeCloseTo(expected.kValues["benzene"]! / expected.kValues["toluene"]!, 12);
    expect(point.values[1]).toBe(1);
  }
  expect(along.mean[0]).toBeCloseTo(Math.sqrt(along.top.values[0]! * along.bottom.values[0]!), 12);
  expect(along.cautions).toEqual([]);
});

test("a column whose ends have no boiling point is refused, not guessed", () => {
  const faults: Issue[] = [];
  expect(volatilityAlongColumn(faults, mixture, { ...column, bottomPressure: 1e7 }, origin)).toBeUndefined();
  expect(faults.map(({ code }) => code)).toEqual(["above-critical"]);
});

describe("drift of the light key's volatility from top to bottom", () => {
  test.each([
    [2.5, 2.4, undefined],
    [2.6, 2, undefined], // 1.30
    [2.7, 2, 1.3],
    [2, 2.7, 1.3], // 0.74
    [4.2, 2, 2],
    [2, 4.2, 2],
  ])("%d at the top, %d at the bottom", (top, bottom, limit) => {
    const [caution] = driftCautions(top, bottom);
    expect(caution?.limit).toBe(limit);
    if (caution !== undefined)
      expect(caution).toMatchObject({ code: "volatility-drift", severity: "check", value: top / bottom });
  });
});
