import { describe, expect, test } from "vitest";
import type { Issue } from "../../src/base/errors";
import { readSplit } from "../../src/balance/split";

const fields = {
  composition: { toluene: 0.2, benzene: 0.5, xylene: 0.3 },
  relativeVolatility: { xylene: 0.8, toluene: 2, benzene: 5 },
  lightKey: "benzene",
  heavyKey: "toluene",
  lightKeyRecovery: 0.99,
  heavyKeyRecovery: 0.98,
};

function read(change: object): { faults: string[]; split: ReturnType<typeof readSplit> } {
  const faults: Issue[] = [];
  const split = readSplit(faults, { ...fields, ...change });
  return { faults: faults.map(({ code, path }) => `${code} ${path}`), split };
}

test("lists in the order of the composition, volatilities relative to the heavy key, keys as positions", () => {
  const { faults, split } = read({});
  expect(faults).toEqual([]);
  expect(split).toEqual({
    names: ["toluene", "benzene", "xylene"],
    fractions: new Float64Array([0.2, 0.5, 0.3]),
    volatility: new Float64Array([1, 2.5, 0.4]),
    lightKey: 1,
    heavyKey: 0,
    lightKeyRecovery: 0.99,
    heavyKeyRecovery: 0.98,
  });
});

test("the fields that were read stay as they were", () => {
  const typed = structuredClone(fields);
  read({});
  expect(fields).toEqual(typed);
});

describe("faults", () => {
  test.each<[string, object, string[]]>([
    [
      "volatilities too far apart for the arithmetic",
      { relativeVolatility: { xylene: 1e-40, toluene: 2, benzene: 5 } },
      ["below-limit relativeVolatility.xylene"],
    ],
    [
      "volatilities that overflow relative to the heavy key",
      { relativeVolatility: { xylene: 1, toluene: 1e-300, benzene: 1e300 } },
      ["above-limit relativeVolatility.benzene", "above-limit relativeVolatility.xylene"],
    ],
    [
      "keys nearer than one part in a million",
      { relativeVolatility: { xylene: 1, toluene: 2, benzene: 2 + 1e-6 } },
      ["volatility-equal relativeVolatility.benzene"],
    ],
    [
      "a component without its own volatility, whatever objects inherit",
      { composition: { toluene: 0.2, benzene: 0.5, toString: 0.3 } },
      ["length-mismatch relativeVolatility.toString", "length-mismatch relativeVolatility.xylene"],
    ],
    [
      "a composition that is no object still lets the rest be read",
      { composition: 3, lightKeyRecovery: 2, relativeVolatility: { a: -1 } },
      [
        "not-an-object composition",
        "volatility-not-positive relativeVolatility.a",
        "recovery-out-of-range lightKeyRecovery",
      ],
    ],
  ])("%s", (_, change, expected) => {
    expect(read(change)).toEqual({ faults: expected, split: undefined });
  });
});
