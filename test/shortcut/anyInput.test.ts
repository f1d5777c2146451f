import fc from "fast-check";
import { describe, test } from "vitest";
import { fenske } from "../../src/shortcut/fenske";
import { gilliland } from "../../src/shortcut/gilliland";
import { kirkbride } from "../../src/shortcut/kirkbride";
import { underwood } from "../../src/shortcut/underwood";
import { expectAnswerOrRefusal } from "./answerOrRefusal";

const split = {
  composition: { a: 0.3, b: 0.3, c: 0.4 },
  relativeVolatility: { a: 4, b: 2, c: 1 },
  lightKey: "a",
  heavyKey: "b",
  lightKeyRecovery: 0.99,
  heavyKeyRecovery: 0.98,
};
const products = { distillate: { a: 0.9, b: 0.1 }, bottoms: { a: 0.1, b: 0.4, c: 0.5 } };
const functions: [string, (input: never) => unknown, object][] = [
  ["fenske", fenske, split],
  ["underwood", underwood, { ...split, q: 1 }],
  ["gilliland", gilliland, { minimumStages: 8, minimumReflux: 1, refluxRatio: 1.5 }],
  [
    "kirkbride",
    kirkbride,
    {
      composition: split.composition,
      lightKey: "a",
      heavyKey: "b",
      ...products,
      distillateFlow: 1,
      bottomsFlow: 2,
      stages: 9,
    },
  ],
];

/** Numbers from the ends of the range and beyond, and whatever else JSON or a careless caller can bring. */
const anyNumber = fc.oneof(
  fc.double(),
  fc.constantFrom(
    0,
    -0,
    1,
    -1,
    5e-324,
    1e-300,
    1e-25,
    1e-24,
    1e-12,
    1 - 1e-16,
    1 + 1e-15,
    1e16,
    1e30,
    1e300,
    1.7e308,
    NaN,
    Infinity,
  ),
);
const anyRecord = fc.dictionary(fc.constantFrom("a", "b", "c", "d", "__proto__", "toString"), anyNumber, {
  maxKeys: 6,
});
const anyValue = fc.oneof(
  anyNumber,
  anyRecord,
  fc.anything(),
  fc.constantFrom("NaN", "a", "b", "c", null, [], [1], undefined),
);

describe.each(functions)("%s answers or refuses", (_, call, good) => {
  test("whatever it is given", () => {
    fc.assert(
      fc.property(fc.anything(), (input) => expectAnswerOrRefusal(() => call(input as never))),
      { numRuns: 500, seed: 1 },
    );
  });

  test("a good input with some fields replaced, added or gone", () => {
    const fields = fc.constantFrom(...Object.keys(good), "normalize", "stages", "correlation", "other");
    fc.assert(
      fc.property(fc.dictionary(fields, anyValue, { minKeys: 1, maxKeys: 3 }), (change) =>
        expectAnswerOrRefusal(() => call({ ...good, ...change } as never)),
      ),
      { numRuns: 3000, seed: 2 },
    );
  });

  test("a good input with numbers of any size in its records", () => {
    const records = Object.entries(good).filter(([, value]) => typeof value === "object") as [
      string,
      object,
    ][];
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.nat(9), fc.nat(9), anyNumber), { maxLength: 4 }),
        fc.boolean(),
        (changes, normalize) => {
          const input: Record<string, unknown> = structuredClone({
            ...good,
            ...(records.length > 0 && { normalize }),
          });
          for (const [which, member, value] of changes) {
            const [field, record] = records[which % Math.max(1, records.length)] ?? [
              Object.keys(good)[which % 3]!,
              undefined,
            ];
            if (record === undefined) input[field] = value;
            else
              (input[field] as Record<string, number>)[
                Object.keys(record)[member % Object.keys(record).length]!
              ] = value;
          }
          expectAnswerOrRefusal(() => call(input as never));
        },
      ),
      { numRuns: 3000, seed: 3 },
    );
  });
});
