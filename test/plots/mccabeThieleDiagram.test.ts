import { describe, expect, test } from "vitest";
import type { McCabeThiele } from "../../src/column/mccabeThiele";
import type { Figure } from "../../src/plots/figure";
import { mccabeThieleDiagram } from "../../src/plots/mccabeThieleDiagram";
import type { Layout } from "./figures.test";
import { aromatics, staircase } from "./results";

interface Trace {
  readonly name: string;
  readonly x: readonly number[];
  readonly y: readonly number[];
}
const traces = (figure: Figure, name: string): Trace[] =>
  (figure.data as unknown as readonly Trace[]).filter((each) => each.name.startsWith(name));
const texts = (figure: Figure): string[] =>
  (figure.layout as unknown as Layout).annotations.map(({ text }) => text);
const onPair = { pair: aromatics, pressure: "1 atm", relativeVolatility: undefined } as never;

test("draws the curves that the result carries, and nothing of its own", () => {
  const result = staircase();
  const figure = mccabeThieleDiagram(result);
  const { equilibrium, operatingLines, qLines, staircase: stairs } = result.curves;
  const drawn = (name: string) => traces(figure, name).map(({ x, y }) => ({ x, y }));
  expect(drawn("equilibrium")).toEqual([equilibrium]);
  expect(drawn("operating lines")).toEqual(operatingLines);
  expect(drawn("q-line")).toEqual(qLines);
  expect(drawn("stages")).toEqual([stairs]);
});

test("does not work the numbers out again: it writes those of the result", () => {
  const result: McCabeThiele = {
    ...staircase(),
    stages: 77.7,
    stagesWhole: 78,
    refluxRatio: 3.21,
    minimumReflux: 2.34,
    refluxOverMinimum: 1.372,
    minimumStages: 5.55,
  };
  const [words] = texts(mccabeThieleDiagram(result)).slice(-1);
  expect(words).toContain("77.7 stages, 78 whole; feed on stage 6");
  expect(words).toContain("reflux ratio 3.210 (1.372 × minimum 2.340)");
  expect(words).toContain("minimum stages 5.55");
  expect(words).toContain("distillate 0.95, bottoms 0.05");
  expect(mccabeThieleDiagram(result).alt).toContain("77.7 stages");
});

test("marks the feed stages and the pinch", () => {
  const result = staircase();
  const figure = mccabeThieleDiagram(result);
  const fed = result.steps[result.feedStage - 1]!;
  expect(traces(figure, "feed stage")).toMatchObject([{ x: [fed.x], y: [fed.y] }]);
  expect(traces(figure, "pinch")).toMatchObject([{ x: [result.pinch[0]], y: [result.pinch[1]] }]);
  const two = staircase({
    feed: undefined,
    feeds: [
      { flow: 60, lightFraction: 0.65, q: 1 },
      { flow: 40, lightFraction: 0.3, q: 0.5 },
    ],
  } as never);
  expect(traces(mccabeThieleDiagram(two), "feed stage")[0]!.x).toHaveLength(2);
  expect(texts(mccabeThieleDiagram(two)).join()).toMatch(/feed on stage \d+ and \d+/);
});

describe("numbers of stages", () => {
  const numbers = (figure: Figure): number[] => texts(figure).slice(0, -1).map(Number);

  test("stand at every stage of a short column", () => {
    expect(numbers(mccabeThieleDiagram(staircase({ relativeVolatility: 12, refluxRatio: 2 })))).toEqual([
      1, 2, 3,
    ]);
  });

  test.each([
    ["a thousand stages", { relativeVolatility: 1.02, refluxRatio: 150 }],
    ["close to the minimum", { refluxRatio: 1.101 }],
    ["high purity", { distillateLightFraction: 0.99999, bottomsLightFraction: 1e-5 }],
  ])("keep apart: %s", (_, more) => {
    for (const zoom of [undefined, "distillate", "bottoms"] as const) {
      const figure = mccabeThieleDiagram(staircase(more), zoom === undefined ? {} : { zoom });
      const { xaxis, yaxis, annotations } = figure.layout as unknown as Layout;
      const place = (value: number, [from, to]: readonly [number, number]) => (value - from) / (to - from);
      const spots = (annotations.slice(0, -1) as unknown as { x: number; y: number }[]).map(
        ({ x, y }) => [place(x, xaxis.range), place(y, yaxis.range)] as const,
      );
      expect(spots.length).toBeGreaterThan(2);
      for (const [i, a] of spots.entries()) {
        expect(Math.min(...a)).toBeGreaterThan(0);
        expect(Math.max(...a)).toBeLessThan(1);
        for (const b of spots.slice(i + 1))
          expect(Math.max(Math.abs(a[0] - b[0]), Math.abs(a[1] - b[1]))).toBeGreaterThan(0.045);
      }
    }
  });

  test("say so where not all stages are drawn", () => {
    const result = staircase({ relativeVolatility: 1.02, refluxRatio: 150 });
    const figure = mccabeThieleDiagram(result);
    const drawn = (result.curves.staircase.x.length - 1) / 2;
    expect(drawn).toBeLessThan(result.stagesWhole);
    expect(traces(figure, "stages")[0]!.name).toBe(`stages (${drawn} of ${result.steps.length})`);
  });
});

describe("one end on logarithmic axes", () => {
  const pure = staircase({ distillateLightFraction: 0.9999, bottomsLightFraction: 1e-4 });

  test("bottoms: the light component, from below the last liquid up to 1", () => {
    const figure = mccabeThieleDiagram(pure, { zoom: "bottoms" });
    const { xaxis } = figure.layout as unknown as Layout;
    expect(xaxis.type).toBe("log");
    expect(10 ** xaxis.range[0]).toBeLessThan(pure.steps.at(-1)!.x);
    expect(xaxis.title.text).toBe("light component in the liquid, x [mol/mol]");
    expect(traces(figure, "stages")).toMatchObject([
      { x: pure.curves.staircase.x, y: pure.curves.staircase.y },
    ]);
  });

  test("distillate: the heavy component, falling to the right and upwards", () => {
    const figure = mccabeThieleDiagram(pure, { zoom: "distillate" });
    const { xaxis, yaxis } = figure.layout as unknown as Layout;
    expect(xaxis.range[0]).toBeGreaterThan(xaxis.range[1]);
    expect(10 ** xaxis.range[1]).toBeLessThan(1e-4);
    expect(yaxis.title.text).toBe("heavy component in the vapor, 1 − y [mol/mol]");
    expect(traces(figure, "stages")[0]!.x[0]).toBeCloseTo(1e-4, 12);
  });

  // y = (R x + xD)/(R + 1) in the rectifying section: a straight line that these axes bend
  test("operating lines keep to their equation between the ends that the result carries", () => {
    const { refluxRatio: r, distillateLightFraction: xD } = pure;
    const [line] = traces(mccabeThieleDiagram(pure, { zoom: "distillate" }), "operating lines");
    expect(line!.x.length).toBeGreaterThan(10);
    for (const [i, heavy] of line!.x.entries())
      expect(1 - line!.y[i]!).toBeCloseTo((r * (1 - heavy) + xD) / (r + 1), 12);
  });

  test("no point of a line is lost below zero", () => {
    for (const zoom of ["distillate", "bottoms"] as const) {
      const figure = mccabeThieleDiagram(staircase({ reboiler: "open-steam" }), { zoom });
      for (const name of ["y = x", "equilibrium", "operating lines", "q-line"])
        for (const { x, y } of traces(figure, name))
          expect(Math.min(...x, ...y), `${zoom} ${name}`).toBeGreaterThan(0);
    }
  });
});

test("pressure is shown in the units asked for, Murphree efficiency and condenser are named", () => {
  const result = staircase({ ...(onPair as object), murphreeVaporEfficiency: 0.7, condenser: "partial" });
  const title = (figure: Figure): string => (figure.layout as unknown as Layout).title.text;
  expect(title(mccabeThieleDiagram(result))).toContain("1.013 bar abs, partial condenser, partial reboiler");
  expect(title(mccabeThieleDiagram(result, { units: "US" }))).toContain("14.70 psi abs");
  expect(title(mccabeThieleDiagram(result, { units: "SI" }))).toContain("101325 Pa");
  expect(texts(mccabeThieleDiagram(result)).at(-1)).toContain("Murphree vapor efficiency 0.700");
  expect((mccabeThieleDiagram(result).layout as unknown as Layout).xaxis.title.text).toBe(
    "benzene in the liquid, x [mol/mol]",
  );
});
