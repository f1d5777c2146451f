import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { fractionText } from "../../src/plots/figureInput";
import { labelHeights } from "../../src/plots/labelHeights";
import { logTicks } from "../../src/plots/logTicks";
import { plainText, shortName, wrapped } from "../../src/plots/plainText";

describe("labels beside lines", () => {
  test("stay where they are when there is room", () => {
    expect(labelHeights([0.9, 0.1, 0.5], 20)).toEqual([
      { index: 1, height: 0.1 },
      { index: 2, height: 0.5 },
      { index: 0, height: 0.9 },
    ]);
  });

  test("keep their order, their distance and the frame, whatever comes", () => {
    const wanted = fc.array(fc.double({ min: -0.2, max: 1.2, noNaN: true }), { minLength: 1, maxLength: 60 });
    fc.assert(
      fc.property(wanted, fc.integer({ min: 2, max: 30 }), (heights, room) => {
        const placed = labelHeights(heights, room);
        expect(placed.length).toBe(Math.min(heights.length, room));
        expect(new Set(placed.map(({ index }) => index)).size).toBe(placed.length);
        for (const [i, { index, height }] of placed.entries()) {
          expect(height).toBeGreaterThanOrEqual(-1e-9);
          expect(height).toBeLessThanOrEqual(1 + 1e-9);
          const before = placed[i - 1];
          if (before === undefined) continue;
          expect(height - before.height).toBeGreaterThan(0.999 / room);
          expect(heights[index]!).toBeGreaterThanOrEqual(heights[before.index]!);
        }
      }),
      { seed: 5, numRuns: 300 },
    );
  });
});

test.each([
  [-1.3, 0, ["0.1", "0.2", "0.5", "1"]],
  [-3.2, 0, ["0.001", "0.01", "0.1", "1"]],
  [-6, 0, ["10<sup>−6</sup>", "10<sup>−5</sup>", "10<sup>−4</sup>"]],
  [-0.5, 1.2, ["0.5", "1", "2", "5", "10"]],
])("ticks between 10^%d and 10^%d", (low, high, start) => {
  const { tickvals, ticktext } = logTicks(low, high) as { tickvals: number[]; ticktext: string[] };
  expect(ticktext.slice(0, start.length)).toEqual(start);
  expect(tickvals.every((value) => Math.log10(value) >= low && Math.log10(value) <= high)).toBe(true);
});

test("ticks over any range are few", () => {
  for (const low of [-300, -40, -7, -2.7])
    expect((logTicks(low, -low) as { tickvals: number[] }).tickvals.length).toBeLessThan(18);
});

test.each([
  [0.95, "0.95"],
  [0.5, "0.50"],
  [0.9990001, "0.999"],
  [0.999999, "0.999999"],
  [1e-6, "0.000001"],
  [0.0123, "0.012"],
  [1 - 1e-12, "1 − 1.0e-12"],
  [1e-12, "1e-12"],
  [1, "1"],
])("the mole fraction %d reads %s", (fraction, text) => {
  expect(fractionText(fraction)).toBe(text);
});

test("names cannot bring markup into a figure, nor crowd it", () => {
  expect(plainText('<b>a</b> & "b"')).toBe('&lt;b&gt;a&lt;/b&gt; &amp; "b"');
  expect(shortName("benzene")).toBe("benzene");
  expect(shortName("x".repeat(40))).toBe(`${"x".repeat(25)}…`);
  expect([...shortName("😀".repeat(40), 5)]).toHaveLength(5);
});

test("long words and long texts are broken to the width", () => {
  expect(wrapped("one two three four", 9, 5)).toEqual(["one two", "three", "four"]);
  expect(wrapped("one two three four", 9, 2)).toEqual(["one two", "three …"]);
  expect(Math.max(...wrapped(`a ${"b".repeat(90)} c`, 20, 9).map((line) => line.length))).toBeLessThanOrEqual(
    20,
  );
});
