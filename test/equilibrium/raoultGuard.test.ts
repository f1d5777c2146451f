import { describe, expect, test } from "vitest";
import type { Caution } from "../../src/base/result";
import { allAzeotropes } from "../../src/components/azeotropes";
import { component } from "../../src/components/componentTable";
import { defineComponent } from "../../src/components/defineComponent";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { raoultCautions } from "../../src/equilibrium/raoultGuard";

const antoine = {
  form: "antoine",
  A: 8.98523,
  B: 1184.24,
  C: -55.578,
  logBase: 10,
  temperatureUnit: "K",
  pressureUnit: "Pa",
  range: [279, 377],
  source: "test",
} as const;

function cautions(names: readonly string[], pressure = 101325): Caution[] {
  return raoultCautions(
    names.map((name) => ({ name, component: component(name) })),
    pressure,
  );
}

const codes = (list: readonly Caution[]): string[] => list.map(({ severity, code }) => `${severity} ${code}`);

describe("mixtures that Raoult's law fits raise nothing", () => {
  test.each([
    [["benzene", "toluene", "p-xylene"]],
    [["n-hexane", "n-heptane", "isopentane"]],
    [["methanol", "ethanol", "1-propanol"]],
    [["ethyl acetate", "n-propyl acetate"]],
    [["water"]],
  ])("%j at 1 atm", (names) => {
    expect(cautions(names)).toEqual([]);
  });
});

describe("mixtures that it is known not to fit are stopped", () => {
  test.each(allAzeotropes().map((azeotrope) => [azeotrope.components, azeotrope] as const))(
    "the azeotrope of %j",
    ([first, second], { firstMoleFraction, source }) => {
      const found = cautions([second, "n-decane", first]).find(({ code }) => code === "azeotrope");
      expect(found).toMatchObject({ severity: "stop", kind: "method", value: firstMoleFraction, source });
      expect(found!.message).toContain(first);
      expect(found!.message).toContain(second);
    },
  );

  test("water with an organic that has no listed azeotrope, and with an inorganic", () => {
    const list = cautions(["water", "ethanol", "n-decane", "ammonia"]);
    expect(codes(list).slice(0, 3)).toEqual([
      "stop azeotrope",
      "stop water-with-organic",
      "stop water-with-inorganic",
    ]);
    expect(list[1]!.message).toContain("n-decane");
    expect(list[1]!.message).not.toContain("ethanol");
    expect(list[2]!.message).toContain("ammonia");
  });

  test("a carboxylic acid, alone too, but not its anhydride", () => {
    expect(codes(cautions(["acetic acid"]))).toEqual(["stop associating-vapor"]);
    expect(codes(cautions(["acetic acid", "acetic anhydride"]))).toEqual(["stop associating-vapor"]);
    expect(cautions(["acetic acid", "acetic anhydride"])[0]!.message).not.toContain("anhydride");
    expect(cautions(["acetic anhydride", "acetone"])).toEqual([]);
  });

  test("polar with hydrocarbon is to be checked", () => {
    expect(codes(cautions(["methanol", "n-hexane"]))).toEqual(["check polar-with-hydrocarbon"]);
  });
});

describe("pressure", () => {
  test.each([
    [3e5, []],
    [3.01e5, ["check elevated-pressure"]],
    [10e5, ["check elevated-pressure"]],
    [10.1e5, ["stop elevated-pressure"]],
  ])("%d Pa", (pressure, expected) => {
    expect(codes(cautions(["propane", "n-butane"], pressure))).toEqual(expected);
  });

  test("near the critical point of one component", () => {
    const input = { composition: { propane: 0.02, "n-hexane": 0.98 }, pressure: "2.9 bar" };
    const { cautions: list } = bubblePoint(input as never);
    expect(codes(list)).toContain("stop near-critical");
    expect(list.find(({ code }) => code === "near-critical")).toMatchObject({ limit: 0.9 });
  });
});

describe("components of one's own", () => {
  const own = defineComponent({ name: "solvent", vaporPressure: antoine });
  const withSolvent = (members: readonly string[], solvent = own): Caution[] =>
    raoultCautions(
      [
        { name: "solvent", component: solvent },
        ...members.map((name) => ({ name, component: component(name) })),
      ],
      1e5,
    );

  test("no critical temperature, no family: said as notes", () => {
    expect(codes(withSolvent(["toluene"]))).toEqual([
      "note substance-unknown",
      "note critical-temperature-unknown",
    ]);
  });

  test("family and formula given are taken", () => {
    const acid = defineComponent({
      name: "solvent",
      family: "acid",
      formula: "C5H10O2",
      vaporPressure: antoine,
    });
    expect(codes(withSolvent(["toluene"], acid))).toContain("stop associating-vapor");
    const organic = defineComponent({
      name: "solvent",
      family: "ether",
      formula: "C4H10O",
      vaporPressure: antoine,
    });
    expect(codes(withSolvent(["water"], organic))).toContain("stop water-with-organic");
  });

  test("a name or CAS number that the table knows says what the substance is", () => {
    const ethanol = defineComponent({ name: "alcohol", cas: "64-17-5", vaporPressure: antoine });
    const members = [
      { name: "alcohol", component: ethanol },
      { name: "water", component: defineComponent({ name: "water", vaporPressure: antoine }) },
    ];
    expect(codes(raoultCautions(members, 1e5))[0]).toBe("stop azeotrope");
  });
});

describe("in results", () => {
  test("what is absent says nothing", () => {
    expect(
      bubblePoint({ composition: { benzene: 0.4, toluene: 0.6, water: 0 }, pressure: "1 atm" }).cautions,
    ).toEqual([]);
  });

  test("the gravest caution comes first, with value, limit and source", () => {
    const { cautions: list } = bubblePoint({ composition: { ethanol: 0.5, water: 0.5 }, pressure: "4 bar" });
    expect(codes(list)).toEqual(["stop azeotrope", "check elevated-pressure"]);
    expect(list[1]).toMatchObject({ value: 4e5, limit: 3e5, source: "common practice" });
  });

  test("a vapor pressure of low grade, or continued beyond its range, is shown", () => {
    const { cautions: list } = bubblePoint({
      composition: { benzene: 0.5, toluene: 0.5 },
      pressure: "2 kPa",
    });
    expect(list).toMatchObject([{ code: "vapor-pressure-extrapolated", kind: "data", limit: 278.68 }]);
  });

  test("every vapor pressure is cited", () => {
    const { methods } = bubblePoint({ composition: { benzene: 0.5, toluene: 0.5 }, pressure: "1 atm" });
    expect(methods.map(({ name }) => name)).toEqual([
      "Raoult's law",
      "Vapor pressure of benzene: Wagner 2.5-5 equation",
      "Vapor pressure of toluene: Wagner 2.5-5 equation",
    ]);
  });
});
