import { describe, expect, test } from "vitest";
import { kirkbride } from "../../src/shortcut/kirkbride";
import { refusal } from "./answerOrRefusal";
import { gap } from "./caseRecords";

const column = {
  composition: { a: 0.5, b: 0.5 },
  lightKey: "a",
  heavyKey: "b",
  distillate: { a: 0.98, b: 0.02 },
  bottoms: { a: 0.02, b: 0.98 },
  distillateFlow: 1,
  bottomsFlow: 1,
  stages: 20,
};

test("a symmetrical split has its feed in the middle", () => {
  expect(kirkbride(column)).toMatchObject({
    kind: "kirkbride",
    rectifyingOverStripping: 1,
    feedStage: 10,
    rectifyingStages: 10,
    strippingStages: 10,
    cautions: [],
  });
});

test("a purer distillate moves the feed down", () => {
  const { feedStage } = kirkbride({
    ...column,
    distillate: { a: 0.999, b: 0.001 },
    distillateFlow: 0.489,
    bottomsFlow: 0.511,
  });
  expect(feedStage).toBeGreaterThan(12);
});

test("flows may carry units, and only their ratio counts", () => {
  const { rectifyingOverStripping } = kirkbride({ ...column, distillateFlow: "36 kmol/h", bottomsFlow: 10 });
  expect(gap(rectifyingOverStripping, 1)).toBeLessThan(1e-12);
});

test("a component that a product does not name is absent from it", () => {
  const { rectifyingOverStripping } = kirkbride({
    ...column,
    composition: { a: 0.4, b: 0.4, c: 0.2 },
    distillate: { b: 0.02, a: 0.98 },
    bottoms: { c: 1 / 3, a: 0.02, b: 0.98 - 1 / 3 },
    distillateFlow: 0.4,
    bottomsFlow: 0.6,
  });
  expect(gap(rectifyingOverStripping, 1.5 ** 0.206)).toBeLessThan(1e-12);
});

test("products that do not hold the feed's keys are a caution", () => {
  const { cautions } = kirkbride({ ...column, distillateFlow: 3 });
  expect(cautions.map(({ code }) => code)).toEqual(["balance-not-closed", "balance-not-closed"]);
  expect(cautions[0]!.value).toBeCloseTo(0.48, 12);
});

describe("refusals", () => {
  test.each<[string, object, string[]]>([
    ["no heavy key in the distillate", { distillate: { a: 1 } }, ["key-absent distillate.b"]],
    ["no light key in the bottoms", { bottoms: { a: 0, b: 1 } }, ["key-absent bottoms.a"]],
    [
      "a product component that is not fed",
      { bottoms: { a: 0.02, b: 0.9, c: 0.08 } },
      ["missing-component bottoms.c"],
    ],
    ["one key twice", { heavyKey: "a" }, ["keys-equal heavyKey"]],
    ["no such key", { lightKey: "x" }, ["key-absent lightKey"]],
    ["no flow", { distillateFlow: 0 }, ["flow-not-positive distillateFlow"]],
    ["no bottoms to speak of", { bottomsFlow: 1e-20 }, ["below-limit bottomsFlow"]],
    ["no stages", { stages: 0 }, ["below-limit stages"]],
    ["fractions that do not add up", { distillate: { a: 0.9, b: 0.2 } }, ["composition-sum distillate"]],
    [
      "everything missing",
      Object.fromEntries(Object.keys(column).map((field) => [field, undefined])),
      [
        "missing-field composition",
        "missing-field lightKey",
        "missing-field heavyKey",
        "missing-field distillate",
        "missing-field bottoms",
        "missing-field distillateFlow",
        "missing-field bottomsFlow",
        "missing-field stages",
      ],
    ],
  ])("%s", (_, change, expected) => {
    expect(refusal(() => kirkbride({ ...column, ...change }))).toEqual(expected);
  });
});
