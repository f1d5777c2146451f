import { describe, expect, test } from "vitest";
import type { Issue } from "../../src/base/errors";
import { type Dimension, readQuantity } from "../../src/base/units";

function read(value: unknown, dimension: Dimension): { si: number; faults: Issue[] } {
  const faults: Issue[] = [];
  return { si: readQuantity(faults, "field", value, dimension), faults };
}

describe("units of the trade to SI", () => {
  // Exact by definition: BIPM SI brochure (9th ed.), NIST SP 811 Appendix B.
  test.each<[string, Dimension, number]>([
    ["1.6 bar", "pressure", 160000],
    ["0 barg", "pressure", 101325],
    ["25 psig", "pressure", 25 * 6894.757293168361 + 101325],
    ["14.6959487755 psia", "pressure", 101325],
    ["760 mmHg", "pressure", 101325.0144],
    ["760 torr", "pressure", 101325],
    ["1 kgf/cm2", "pressure", 98066.5],
    ["95 degC", "temperature", 368.15],
    ["212 degF", "temperature", 373.15],
    ["671.67 degR", "temperature", 373.15],
    ["10 degC", "temperatureDifference", 10],
    ["18 degF", "temperatureDifference", 10],
    ["120 kmol/h", "molarFlow", 120 / 3.6],
    ["1 lbmol/h", "molarFlow", 453.59237 / 3600],
    ["3.6 t/h", "massFlow", 1],
    ["1 short ton/h", "massFlow", 907.18474 / 3600],
    ["1 MMBtu/h", "power", 293071.07017],
    ["1 cP", "viscosity", 0.001],
    ["20 mN/m", "surfaceTension", 0.02],
    ["1e2 kPa", "pressure", 1e5],
    ["1000 cmH2O", "pressure", 98066.5], // outside the table: through the unit library
  ])("%s as %s", (text, dimension, si) => {
    const { si: value, faults } = read(text, dimension);
    expect(faults).toEqual([]);
    expect(value / si).toBeCloseTo(1, 6);
  });

  test("a standard gas volume needs its reference state", () => {
    expect(read("22.41396954 Nm3/h at 0 degC, 1 atm", "molarFlow").si * 3600).toBeCloseTo(1000, 4);
    expect(read("100 sm3/h", "molarFlow").faults[0]!.message).toContain("reference state");
  });

  test.each<[unknown, Dimension, string]>([
    [1.3, "pressure", "implausible-bare-number"],
    [95, "temperature", ""],
    [30, "temperature", "implausible-bare-number"],
    [0, "pressure", "pressure-not-positive"],
    ["-1 bar", "pressure", "pressure-not-positive"],
    ["-300 degC", "temperature", "temperature-not-positive"],
    ["10 ton/h", "massFlow", "unknown-unit"],
    ["10 kg/h", "molarFlow", "wrong-dimension"],
    ["10 furlongs", "pressure", "unknown-unit"],
    ["bar", "pressure", "wrong-type"],
    ["NaN", "pressure", "wrong-type"],
    ["12", "pressure", "wrong-type"],
    [Number.NaN, "pressure", "not-finite"],
    [null, "pressure", "wrong-type"],
    [undefined, "pressure", "missing-field"],
    [{}, "temperature", "wrong-type"],
  ])("%j as %s gives the code %s", (value, dimension, code) => {
    expect(read(value, dimension).faults.map((fault) => fault.code)).toEqual(code === "" ? [] : [code]);
  });
});
