import { describe, expect, test } from "vitest";
import type { Issue } from "../../src/base/errors";
import type { Component } from "../../src/components/component";
import { allComponents, component, lookUp } from "../../src/components/componentTable";
import { defineComponent } from "../../src/components/defineComponent";
import { findComponents } from "../../src/components/findComponents";
import { isComponent } from "../../src/components/isComponent";
import { readOwnComponents, resolveComponent } from "../../src/components/resolveComponent";
import { messageOf, refusalOf } from "./refusal";

describe("component", () => {
  test.each<[string, string]>([
    ["benzene", "benzene"],
    ["71-43-2", "benzene"],
    ["MEK", "methyl-ethyl-ketone"],
    ["mek", "methyl-ethyl-ketone"],
    ["IPA", "2-propanol"],
    ["isopropyl alcohol", "2-propanol"],
    ["ethene", "ethylene"],
    ["propene", "propylene"],
    ["1,2-dimethylbenzene", "o-xylene"],
    ["o xylene", "o-xylene"],
    ["isooctane", "2-2-4-trimethylpentane"],
    ["iso-octane", "2-2-4-trimethylpentane"],
    ["2,2,4-Trimethyl pentane", "2-2-4-trimethylpentane"],
    ["n-Butane", "n-butane"],
    ["butane", "n-butane"],
    ["tert. butanol", "tert-butanol"],
    ["n‑hexane", "n-hexane"], // non-breaking hyphen
    ["1 2 dichloroethane", "1-2-dichloroethane"],
    ["α-methylstyrene", "alpha-methylstyrene"],
    ["H2O", "water"],
    ["THF", "tetrahydrofuran"],
  ])("%s", (name, id) => {
    expect(component(name).id).toBe(id);
  });

  test("carries constants in SI, blocks with range and source, and a source for each constant", () => {
    const benzene = component("benzene");
    expect(benzene.kind).toBe("component");
    expect(benzene.molarMass).toBeCloseTo(0.078114, 9);
    expect(benzene.liquidDensity!.range[0]).toBeGreaterThan(270);
    expect(benzene.sources["criticalPressure"]).toContain("Perry");
    expect(benzene.sources["vaporPressure"]).toBe(benzene.vaporPressure.source);
  });

  test("an equation fitted for the table says to what and how well", () => {
    expect(component("vinyl chloride").vaporPressure.source).toMatch(
      /^fitted for this table, within 0\.\d+ %, to: equation of state of Thol/,
    );
  });

  test("is the same object each time, and cannot be changed", () => {
    const benzene = component("benzene");
    expect(component("71-43-2")).toBe(benzene);
    expect(() => ((benzene as { molarMass: number }).molarMass = 1)).toThrow(TypeError);
    expect(() => ((benzene.vaporPressure.range as [number, number])[0] = 1)).toThrow(TypeError);
  });

  test("an unknown name is refused, and the nearest named", () => {
    expect(refusalOf(() => component("tolueen"))).toEqual(["unknown-component component"]);
    expect(messageOf(() => component("tolueen"))).toContain('Did you mean "toluene"');
    expect(messageOf(() => component("1,3-butadeine"))).toContain('"1,3-butadiene"');
    for (const name of ["", "__proto__", "constructor", "x".repeat(1e6)]) {
      expect(refusalOf(() => component(name))).toEqual(["unknown-component component"]);
    }
    for (const odd of [null, undefined, 7, {}, ["benzene"]]) {
      expect(refusalOf(() => component(odd as never))).toEqual(["wrong-type component"]);
    }
  });

  test("a lookup by exact name takes less than a microsecond, best of ten rounds", () => {
    const rounds = Array.from({ length: 10 }, () => {
      const started = performance.now();
      for (let i = 0; i < 1e4; i++) lookUp("ethylbenzene");
      return performance.now() - started;
    });
    expect(Math.min(...rounds)).toBeLessThan(10);
  });
});

describe("findComponents", () => {
  const ids = (text: string): string[] => findComponents(text).map(({ id }) => id);

  test("by part of a name, formula, CAS number or family, the best match first", () => {
    expect(ids("xylene")).toEqual(["o-xylene", "m-xylene", "p-xylene"]);
    expect(ids("C8H10").slice(0, 4).sort()).toEqual(["ethylbenzene", "m-xylene", "o-xylene", "p-xylene"]);
    expect(ids("butanol")[0]).toBe("1-butanol");
    expect(ids("108-88-3")).toEqual(["toluene"]);
    expect(ids("aldehyde")).toContain("acrolein");
  });

  test("by spelling when nothing contains the text", () => {
    expect(ids("cyclohexan0ne")[0]).toBe("cyclohexanone");
    expect(ids("zzzzzzzz")).toEqual([]);
    expect(ids("  ")).toEqual([]);
  });

  test("refuses what is no text", () => {
    expect(refusalOf(() => findComponents(7 as never))).toEqual(["wrong-type text"]);
  });
});

describe("the user's own components", () => {
  const own = defineComponent({
    name: "Benzene",
    cas: "71-43-2",
    vaporPressure: component("benzene").vaporPressure,
  });
  const solvent = defineComponent({ name: "solvent A", vaporPressure: component("toluene").vaporPressure });
  const resolve = (name: string, faults: Issue[] = []): Component | undefined =>
    resolveComponent(faults, "composition", name, [own, solvent]);

  test("win over the table, however their name is spelled", () => {
    for (const name of ["Benzene", "benzene", "71-43-2"]) expect(resolve(name)).toBe(own);
    expect(resolve("Solvent-A")).toBe(solvent);
    expect(resolve("toluene")).toBe(component("toluene"));
  });

  test("are named when a name is misspelled", () => {
    const faults: Issue[] = [];
    expect(resolve("solvnt A", faults)).toBeUndefined();
    expect(faults[0]!.code).toBe("unknown-component");
    expect(faults[0]!.message).toContain('"solvent A"');
  });

  test("500 unknown names are refused within a second", () => {
    const faults: Issue[] = [];
    const started = performance.now();
    for (let i = 0; i < 500; i++) resolve(`unknown ${i}`, faults);
    expect(faults.length).toBe(500);
    expect(performance.now() - started).toBeLessThan(1000);
  });

  test("each has its own name, and is a component", () => {
    const read = (value: unknown): string[] => {
      const faults: Issue[] = [];
      readOwnComponents(faults, "ownComponents", value);
      return faults.map(({ code, path }) => `${code} ${path}`);
    };
    expect(read(undefined)).toEqual([]);
    expect(read([own, solvent])).toEqual([]);
    expect(read("benzene")).toEqual(["wrong-type ownComponents"]);
    expect(read([own, { ...own, id: "other" }, null])).toEqual([
      "duplicate-component ownComponents[1]",
      "wrong-type ownComponents[2]",
    ]);
  });

  test("what is broken is no component", () => {
    expect(allComponents().every(isComponent)).toBe(true);
    const broken: unknown[] = [
      { ...own, molarMass: "78" },
      { ...own, criticalTemperature: -1 },
      { ...own, vaporPressure: { ...own.vaporPressure, coefficients: [1, 2, 3] } },
      { ...own, vaporPressure: { ...own.vaporPressure, form: "toString" } },
      { ...own, vaporPressure: { ...own.vaporPressure, range: [1] } },
      { ...own, liquidDensity: { equation: "linear", constants: [null], range: [1, 2] } },
      { ...own, hazards: {} },
      { ...own, synonyms: [1] },
      [own],
    ];
    expect(broken.filter(isComponent)).toEqual([]);
  });
});
