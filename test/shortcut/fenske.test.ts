import fc from "fast-check";
import { expect, test } from "vitest";
import { fenske } from "../../src/shortcut/fenske";
import { refusal } from "./answerOrRefusal";
import { gap, listed, record, records } from "./caseRecords";
import { anySplit } from "./splitArbitrary";

const split = {
  ...records([0.05, 0.25, 0.3, 0.3, 0.1], [8.2, 5.1, 2.1, 1, 0.4]),
  lightKey: "c3",
  heavyKey: "c4",
  lightKeyRecovery: 0.985,
  heavyKeyRecovery: 0.99,
};

test("at total reflux ln(d/b) is a straight line in ln of the volatility, its slope the minimum stages", () => {
  fc.assert(
    fc.property(anySplit, ({ q: _, ...input }) => {
      const { minimumStages, distillateRecovery } = fenske(input);
      const heavy = input.relativeVolatility[input.heavyKey]!;
      const atHeavy = Math.log((1 - input.heavyKeyRecovery) / input.heavyKeyRecovery);
      for (const [name, r] of Object.entries(distillateRecovery)) {
        expect(r >= 0 && r <= 1).toBe(true);
        if (r < 1e-6 || r > 1 - 1e-6) continue;
        const line = atHeavy + minimumStages * Math.log(input.relativeVolatility[name]! / heavy);
        expect(Math.abs(Math.log(r / (1 - r)) - line)).toBeLessThan(1e-8);
      }
    }),
    { numRuns: 1000, seed: 1932 },
  );
});

test("traces far from the keys keep their digits instead of vanishing", () => {
  const { minimumStages, distillateRecovery } = fenske({ ...split, heavyKeyRecovery: 0.9999999 });
  const heavier = (1e-7 / 0.9999999) * 0.4 ** minimumStages;
  expect(gap(distillateRecovery["c5"]!, heavier)).toBeLessThan(1e-6);
});

test("a component as volatile as a key gets the key's recovery, a zero fraction its place on the line", () => {
  const { distillateRecovery } = fenske({
    ...split,
    composition: record([0.05, 0.25, 0.3, 0.4, 0]),
    relativeVolatility: record([2.1, 5.1, 2.1, 1, 1]),
  });
  expect(distillateRecovery["c1"]).toBe(0.985);
  expect(distillateRecovery["c5"]).toBe(1 - 0.99);
});

test("a wide volatility range neither overflows nor divides zero by zero", () => {
  const { distillateRecovery } = fenske({
    ...split,
    relativeVolatility: record([1e29, 1e10, 1.000002, 1, 1e-29]),
  });
  expect(listed(distillateRecovery)).toEqual([1, 1, 0.985, 1 - 0.99, 0]);
});

test("normalize scales amounts", () => {
  const amounts = record(listed(split.composition).map((z) => 40 * z));
  expect(
    gap(
      fenske({ ...split, composition: amounts, normalize: true }).minimumStages,
      fenske(split).minimumStages,
    ),
  ).toBeLessThan(1e-12);
  expect(refusal(() => fenske({ ...split, composition: amounts }))).toEqual(["composition-sum composition"]);
});

test("every fault of a call is reported at once", () => {
  expect(
    refusal(() =>
      fenske({
        composition: { a: 0.5, b: 0.6 },
        relativeVolatility: { a: 2, b: -1, c: 1 },
        lightKey: "a",
        heavyKey: "d",
        lightKeyRecovery: 1.2,
        heavyKeyRecovery: 0.9,
      }),
    ),
  ).toEqual([
    "composition-sum composition",
    "volatility-not-positive relativeVolatility.b",
    "length-mismatch relativeVolatility.c",
    "key-absent heavyKey",
    "recovery-out-of-range lightKeyRecovery",
  ]);
});

test("one component cannot be split", () => {
  const one = { a: 1 };
  const input = { ...split, composition: one, relativeVolatility: one, lightKey: "a", heavyKey: "a" };
  expect(refusal(() => fenske(input))).toEqual(["empty composition", "keys-equal heavyKey"]);
});

test("no recovery below the other key's loss, not even by a rounding error", () => {
  expect(refusal(() => fenske({ ...split, lightKeyRecovery: 0.1, heavyKeyRecovery: 0.9 }))).toEqual([
    "infeasible specification-infeasible lightKeyRecovery",
  ]);
});
