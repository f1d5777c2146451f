import { expect, test } from "vitest";
import type { Caution } from "../../src/base/result";
import { allComponents, component } from "../../src/components/componentTable";
import { defineComponent } from "../../src/components/defineComponent";
import { hazardCautions } from "../../src/components/hazards";

function cautionsOf(...names: readonly string[]): Map<string, Caution> {
  return new Map(hazardCautions(names.map(component)).map((caution) => [caution.code, caution]));
}

test("flammables in one caution, with the lowest flash point and the standard", () => {
  const cautions = cautionsOf("benzene", "toluene", "water");
  const { message, source } = cautions.get("flammable")!;
  expect(message).toContain("flammable: benzene, toluene, lowest flash point -11 degC (benzene)");
  expect(message).toContain("local codes and licensed practice decide");
  expect(source).toBe("IEC 60079-20-1:2010");
  expect(cautions.get("carcinogen")!.message).toContain("benzene (group 1)");
  expect(cautions.get("carcinogen")!.message).not.toContain("toluene");
  expect(cautions.has("hazard-data-missing")).toBe(false);
});

test("peroxide formers, monomers, and gases without a flash point", () => {
  expect(cautionsOf("diisopropyl ether").get("peroxide-former")!.message).toContain("diisopropyl ether");
  const butadiene = cautionsOf("1,3-butadiene");
  expect([...butadiene.keys()]).toEqual(["flammable", "peroxide-former", "polymerizes", "carcinogen"]);
  expect(butadiene.get("polymerizes")!.message).toContain("Inhibitor stays in the liquid");
  expect(cautionsOf("ethane").get("flammable")!.message).not.toContain("flash point");
});

test("IARC groups as changed after the list that was read (IARC Monographs vol. 128, 130, 136)", () => {
  const group = (name: string): string | undefined => component(name).hazards?.carcinogenGroup;
  expect([group("acrolein"), group("1,1,1-trichloroethane"), group("acrylonitrile")]).toEqual([
    "2A",
    "2A",
    "1",
  ]);
});

test("no data is said; none listed is not no data", () => {
  expect([...cautionsOf("water", "nitrogen", "argon", "carbon dioxide").keys()]).toEqual([]);
  const own = defineComponent({ name: "novel", vaporPressure: component("toluene").vaporPressure });
  const [caution] = hazardCautions([own, component("water")]);
  expect(caution!.code).toBe("hazard-data-missing");
  expect(caution!.message).toContain("no hazard data for novel:");
});

test("long lists are cut, and every caution is of kind hazard", () => {
  const cautions = hazardCautions(allComponents());
  expect(cautions.map(({ kind }) => kind)).toEqual(Array(5).fill("hazard"));
  expect(cautions.every(({ message }) => /and \d+ more|no hazard data/.test(message))).toBe(true);
  expect(cautions.find(({ code }) => code === "hazard-data-missing")!.message).toContain("n-dodecane");
});
