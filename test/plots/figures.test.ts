import { describe, expect, test } from "vitest";
import { DesignInputError } from "../../src/base/errors";
import * as rb from "../../src/index";
import { azeotrope, design, equilibrium, figures, staircase, volatility } from "./results";

/** A layout as far as the tests look into it. */
export interface Layout {
  readonly width: number;
  readonly height: number;
  readonly title: { readonly text: string };
  readonly xaxis: Axis;
  readonly yaxis: Axis;
  readonly annotations: readonly { readonly text: string }[];
}
interface Axis {
  readonly title: { readonly text: string };
  readonly range: readonly [number, number];
  readonly type?: string;
}

const layoutOf = (figure: rb.Figure): Layout => figure.layout as unknown as Layout;

describe.each(Object.entries(figures))("%s", (_, make) => {
  const figure = make();
  const layout = layoutOf(figure);

  test("is plain JSON, the same each time", () => {
    expect(JSON.parse(JSON.stringify(figure))).toEqual(figure);
    expect(JSON.stringify(make())).toBe(JSON.stringify(figure));
    expect(figure.kind).toBe("figure");
    expect(rb).toHaveProperty(figure.name);
  });

  test("has a unit on every axis", () => {
    expect(layout.xaxis.title.text).toMatch(/ \[(mol\/mol|-|degC|degF|K)\]$/);
    expect(layout.yaxis.title.text).toMatch(/ \[(mol\/mol|-|degC|degF|K)\]$/);
  });

  test("fits a notebook, on opaque paper, drawn with plain scatter traces", () => {
    expect(layout.width).toBeLessThanOrEqual(700);
    expect(figure.layout["paper_bgcolor"]).toMatch(/^#[0-9a-f]{6}$/);
    expect(new Set(figure.data.map(({ type }) => type))).toEqual(new Set(["scatter"]));
  });

  test("tells in words what it shows, without markup", () => {
    expect(figure.alt.startsWith(`${figure.title}. `)).toBe(true);
    expect(figure.alt).toMatch(/\d/);
    expect(figure.alt).not.toMatch(/<br>|<b>\d|<span|&lt;/);
    expect(figure.title.length).toBeLessThan(0.115 * layout.width);
  });

  test("writes what must not be relied on under its title", () => {
    const stop = figure.cautions.find(({ severity }) => severity === "stop");
    if (stop === undefined) expect(layout.title.text).not.toContain("Not to be relied on");
    else {
      const start = stop.message.split(" ").slice(0, 4).join(" ");
      expect(layout.title.text.replace(/<[^>]+>/g, " ")).toContain("Not to be relied on");
      expect(layout.title.text).toContain(start);
    }
  });
});

test("a figure repeats what bears on the method, not notes and hazards", () => {
  const { cautions, methods } = figures["y-x, azeotrope"]!();
  expect(cautions.map(({ code }) => code)).toContain("azeotrope");
  expect(cautions.filter(({ severity, kind }) => severity === "note" || kind === "hazard")).toEqual([]);
  expect(methods).toEqual(azeotrope().methods);
});

describe("what figures refuse", () => {
  const results = {
    mccabeThieleDiagram: staircase(),
    equilibriumDiagram: equilibrium(),
    temperatureCompositionDiagram: equilibrium(),
    stagesAgainstReflux: design(),
    gillilandDiagram: design(),
    volatilityDiagram: volatility(),
  };
  type Draw = (result: unknown, options?: unknown) => rb.Figure;
  const cases = Object.entries(results).map(([name, result]) => ({
    name,
    result,
    draw: (rb as unknown as Record<string, Draw>)[name]!,
  }));

  test.each(cases)("$name: another result, a result that lost a part, no result", ({ draw, result }) => {
    const { cautions: _cautions, ...others } = result;
    const wrong = [undefined, null, [], "x", { kind: "fenske" }, { kind: result.kind }, others];
    for (const each of wrong) expect(() => draw(each)).toThrow(DesignInputError);
    for (const part of ["curve", "curves"].filter((each) => each in result))
      expect(() => draw({ ...result, [part]: "changed" })).toThrow(/one that was changed/);
  });

  test.each(cases)("$name: options that it does not know, all at once", ({ draw, result }) => {
    expect(() => draw(result, { unit: "SI" })).toThrow(/units/);
    expect(() => draw(result, { units: "imperial" })).toThrow(/"metric", "SI", "US"/);
    expect(() => draw(result, [])).toThrow(DesignInputError);
    try {
      draw({}, { units: "imperial" });
      expect.unreachable();
    } catch (error) {
      expect((error as DesignInputError).issues.map(({ code }) => code)).toEqual([
        "wrong-type",
        "unknown-choice",
      ]);
    }
  });
});
