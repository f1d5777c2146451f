import fc from "fast-check";
import { expect, test } from "vitest";
import { DesignInfeasibleError } from "../../src/base/errors";
import { mccabeThiele } from "../../src/column/mccabeThiele";
import { smoker } from "../../src/staging/smoker";
import { refusal } from "../shortcut/answerOrRefusal";

const fraction = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const columns = fc.record({
  relativeVolatility: fraction(1.1, 20),
  feed: fc.record({ lightFraction: fraction(0.1, 0.9), q: fraction(-0.5, 1.5) }),
  distillateLightFraction: fraction(0.92, 0.9999),
  bottomsLightFraction: fraction(0.0001, 0.08),
  refluxOverMinimum: fraction(1.02, 5),
});

/** A minimum of zero (a rich subcooled feed) has no multiple; such columns are refused, which another test shows. */
const columnsWithMinimum = columns.filter((column) => {
  try {
    return mccabeThiele(column).minimumReflux > 0;
  } catch (error) {
    return !(error instanceof DesignInfeasibleError);
  }
});

const runs = { numRuns: 300, seed: 20261201 };

test("minimum reflux is that of the pinch in closed form, where no flow vanishes first", () => {
  fc.assert(
    fc.property(columnsWithMinimum, (column) => {
      const { relativeVolatility: a, feed, distillateLightFraction: xD } = column;
      const result = mccabeThiele(column);
      if (result.minimumRefluxLimitedBy !== "feed-pinch") return;
      const [x, y] = result.pinch;
      expect(y).toBeCloseTo((a * x) / (1 + (a - 1) * x), 12);
      expect((feed.q - 1) * y).toBeCloseTo(feed.q * x - feed.lightFraction, 9);
      expect(result.minimumReflux / ((xD - y) / (y - x))).toBeCloseTo(1, 7);
    }),
    runs,
  );
});

test("stages fall as the reflux rises, towards Fenske's minimum", () => {
  fc.assert(
    fc.property(columnsWithMinimum, (column) => {
      const { minimumStages, stages, minimumReflux } = mccabeThiele(column);
      const more = mccabeThiele({ ...column, refluxOverMinimum: 2 * column.refluxOverMinimum });
      expect(more.stages).toBeLessThanOrEqual(stages + 1);
      if (minimumReflux < 1e-3) return;
      const { refluxOverMinimum: _, ...rest } = column;
      const endless = mccabeThiele({ ...rest, refluxRatio: 1e7 });
      // The last step of a staircase is shared linearly, Fenske's in the logarithm: less than one stage apart.
      expect(Math.abs(endless.stages - minimumStages)).toBeLessThan(1);
    }),
    runs,
  );
});

test("Smoker's closed form and the staircase agree to less than a stage", () => {
  fc.assert(
    fc.property(columnsWithMinimum, (column) => {
      const stepped = mccabeThiele(column);
      const { refluxOverMinimum: _, ...rest } = column;
      const closed = smoker({ ...rest, refluxRatio: stepped.refluxRatio });
      expect(Math.abs(stepped.stages - closed.stages)).toBeLessThan(1);
    }),
    runs,
  );
});

test("the balances close and every stage lies between its neighbors", () => {
  fc.assert(
    fc.property(columnsWithMinimum, (column) => {
      const { feed, distillateLightFraction: xD, bottomsLightFraction: xB } = column;
      const { distillateFlow: d, bottomsFlow: b, steps } = mccabeThiele(column);
      expect(d + b).toBeCloseTo(1, 12);
      expect(d * xD + b * xB).toBeCloseTo(feed.lightFraction, 12);
      for (let i = 1; i < steps.length; i++) expect(steps[i]!.x).toBeLessThan(steps[i - 1]!.x);
      expect(steps[steps.length - 1]!.x).toBeLessThanOrEqual(xB);
    }),
    runs,
  );
});

test("scaling the feed changes nothing but the flows", () => {
  fc.assert(
    fc.property(columnsWithMinimum, fraction(0.01, 1000), (column, flow) => {
      const one = mccabeThiele(column);
      const scaled = mccabeThiele({ ...column, feed: { ...column.feed, flow } });
      expect(scaled.stages / one.stages).toBeCloseTo(1, 4);
      expect(scaled.distillateFlow / flow / one.distillateFlow).toBeCloseTo(1, 12);
    }),
    runs,
  );
});

test("a curve through points of constant volatility counts the same stages as the volatility itself", () => {
  const volatility = 2.5;
  const points = Array.from({ length: 2001 }, (_, i): [number, number] => {
    const x = i / 2000;
    return [x, (volatility * x) / (1 + (volatility - 1) * x)];
  });
  const rest = {
    feed: { lightFraction: 0.4, q: 0.6 },
    distillateLightFraction: 0.97,
    bottomsLightFraction: 0.02,
    refluxRatio: 2.6,
  };
  const byPoints = mccabeThiele({ ...rest, equilibriumCurve: { points, interpolation: "monotone" } });
  const byVolatility = mccabeThiele({ ...rest, relativeVolatility: volatility });
  expect(byPoints.stages).toBeCloseTo(byVolatility.stages, 4);
  expect(byPoints.minimumReflux).toBeCloseTo(byVolatility.minimumReflux, 6);
});

test("a rich subcooled feed needs no reflux: a multiple of that minimum is refused, a reflux ratio is answered", () => {
  const rich = {
    relativeVolatility: 16,
    feed: { lightFraction: 0.9, q: 1.4 },
    distillateLightFraction: 0.93,
    bottomsLightFraction: 0.05,
  };
  expect(refusal(() => mccabeThiele({ ...rich, refluxOverMinimum: 1.3 }))).toEqual([
    "infeasible reflux-below-minimum refluxOverMinimum",
  ]);
  const answered = mccabeThiele({ ...rich, refluxRatio: 0.2 });
  expect(answered.minimumReflux).toBe(0);
  expect(answered.refluxOverMinimum).toBeNull();
});
