import { describe, expect, test } from "vitest";
import { allAzeotropes, findAzeotrope } from "../../src/components/azeotropes";
import type { Component } from "../../src/components/component";
import { isCasNumber, namesOf, simplified } from "../../src/components/componentName";
import { allComponents, lookUp } from "../../src/components/componentTable";
import { normalBoilingPointOf } from "../../src/components/readTemperature";
import citations from "../../src/components/data/sources.json";
import { atomsOfFormula, atomsOfSmiles, massOf } from "./atoms";

const components = allComponents();
const gasConstant = 8.31446261815324;

/** Ids of the components for which a statement does not hold. */
function failing(holds: (component: Component) => boolean): string[] {
  return components.filter((component) => !holds(component)).map(({ id }) => id);
}

const blocks = [
  "vaporPressure",
  "heatOfVaporization",
  "liquidDensity",
  "liquidHeatCapacity",
  "idealGasHeatCapacity",
  "liquidViscosity",
  "surfaceTension",
] as const;

describe("names", () => {
  test("174 components", () => {
    expect(components.length).toBe(174);
  });

  test("no two share a name, synonym or CAS number, without case and punctuation either", () => {
    const owner = new Map<string, string>();
    const clashes: string[] = [];
    for (const component of components) {
      for (const name of namesOf(component).map(simplified)) {
        const other = owner.get(name) ?? component.id;
        if (other !== component.id) clashes.push(`${name}: ${other} and ${component.id}`);
        owner.set(name, component.id);
      }
    }
    expect(clashes).toEqual([]);
  });

  test("every name finds its component", () => {
    expect(failing((each) => namesOf(each).every((name) => lookUp(name) === each))).toEqual([]);
    expect(failing(({ synonyms }) => synonyms!.length > 0)).toEqual([]);
  });

  test("CAS numbers have the right check digit", () => {
    expect(failing(({ cas }) => isCasNumber(cas!))).toEqual([]);
  });
});

describe("constants", () => {
  test("molar mass is that of the formula", () => {
    const holds = ({ formula, molarMass }: Component): boolean =>
      Math.abs(massOf(atomsOfFormula(formula!)) - 1e3 * molarMass!) <= 0.02;
    expect(failing(holds)).toEqual([]);
  });

  test("the structure has the atoms of the formula", () => {
    const holds = ({ formula, structure }: Component): boolean =>
      JSON.stringify(Object.entries(atomsOfSmiles(structure!)).sort()) ===
      JSON.stringify(Object.entries(atomsOfFormula(formula!)).sort());
    expect(failing(holds)).toEqual([]);
  });

  test("the critical point is whole and its compressibility factor plausible", () => {
    const holds = ({
      criticalTemperature,
      criticalPressure,
      criticalVolume,
      acentricFactor,
    }: Component): boolean => {
      const factor = (criticalPressure! * criticalVolume!) / (gasConstant * criticalTemperature!);
      return factor > 0.14 && factor < 0.345 && acentricFactor! > -0.3 && acentricFactor! < 1.2;
    };
    expect(failing(holds)).toEqual([]);
  });

  test("carbon dioxide and acetylene sublime at 1 atm: no normal boiling point", () => {
    expect(failing(({ normalBoilingPoint }) => normalBoilingPoint !== undefined)).toEqual([
      "acetylene",
      "carbon-dioxide",
    ]);
  });
});

describe("sources and ranges", () => {
  const constants = [
    "molarMass",
    "normalBoilingPoint",
    "criticalTemperature",
    "criticalPressure",
    "criticalVolume",
    "acentricFactor",
    "rackettParameter",
  ] as const;

  test("every constant and block names a publication", () => {
    const holds = (component: Component): boolean =>
      [...constants, ...blocks].every(
        (field) => (component[field] !== undefined) === (component.sources[field]?.length ?? 0) > 10,
      );
    expect(failing(holds)).toEqual([]);
  });

  test("every block has a range that does not fall", () => {
    const holds = (component: Component): boolean =>
      blocks.every((name) => {
        const range = component[name]?.range;
        return range === undefined || (range[0] > 0 && range[0] <= range[1]);
      });
    expect(failing(holds)).toEqual([]);
  });

  test("every vapor pressure has a grade", () => {
    const grades = components.map(({ vaporPressure }) => vaporPressure.grade);
    expect(["A", "B", "C", "D"].map((grade) => grades.filter((each) => each === grade).length)).toEqual([
      68, 77, 26, 3,
    ]);
  });

  test("every hazard names the list it is from", () => {
    const holds = ({ hazards }: Component): boolean => {
      if (hazards === undefined) return true;
      const { sources, ...facts } = hazards;
      const fields = Object.keys(facts).map((field) =>
        field.endsWith("FlammabilityLimit") ? "flammabilityLimits" : field,
      );
      return fields.length === 0 ? "noneListed" in sources : fields.every((field) => field in sources);
    };
    expect(failing(holds)).toEqual([]);
  });

  test("no citation is idle", () => {
    const text = JSON.stringify(components);
    const idle = Object.entries(citations).filter(
      ([, citation]) => !text.includes(JSON.stringify(citation).slice(1, -1)),
    );
    expect(idle).toEqual([]);
  });
});

describe("azeotropes", () => {
  test("50 pairs of components of the table, each once, at 1 atm, with a source", () => {
    const listed = allAzeotropes();
    expect(listed.length).toBe(50);
    for (const azeotrope of listed) {
      const [first, second] = azeotrope.components;
      expect(findAzeotrope(second, first)).toBe(azeotrope);
      expect([lookUp(first)?.id, lookUp(second)?.id]).toEqual([first, second]);
      expect(azeotrope.pressure).toBe(101325);
      expect(azeotrope.firstMoleFraction > 0 && azeotrope.firstMoleFraction < 1).toBe(true);
      expect(azeotrope.source.length).toBeGreaterThan(10);
    }
  });

  test("a minimum boils below both components, a maximum above", () => {
    const wrong = allAzeotropes().filter(({ components: ids, boiling, temperature }) => {
      const points = ids.map((id) => normalBoilingPointOf(lookUp(id)!));
      return boiling === "minimum"
        ? temperature > Math.min(...points) + 0.3
        : temperature < Math.max(...points) - 0.3;
    });
    expect(wrong).toEqual([]);
  });

  test("ethanol and water: 95.5 % by mass at 78.1 degC (CRC Handbook, 44th ed.)", () => {
    const { firstMoleFraction: x, temperature } = findAzeotrope("water", "ethanol")!;
    const [ethanol, water] = [lookUp("ethanol")!.molarMass!, lookUp("water")!.molarMass!];
    expect((x * ethanol) / (x * ethanol + (1 - x) * water)).toBeCloseTo(0.955, 3);
    expect(temperature).toBeCloseTo(351.25, 6);
    expect(findAzeotrope("benzene", "toluene")).toBeUndefined();
  });
});
