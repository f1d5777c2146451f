import { describe, expect, test } from "vitest";
import { component } from "../../src/components/componentTable";
import { idealGasHeatCapacity } from "../../src/components/heats";
import { idealGasEnthalpy, liquidEnthalpy } from "../../src/equilibrium/enthalpy";

describe("Geankoplis, Examples 11.6-1 and 11.6-2: enthalpies from liquid at 80.1 degC, kJ/kmol", () => {
  const benzene = component("benzene");
  const toluene = component("toluene");
  const reference = 80.1 + 273.15;
  const boiling = 110.6 + 273.15;

  test("benzene boils with 30820", () => {
    const latent = idealGasEnthalpy(benzene, reference) - liquidEnthalpy(benzene, reference, reference);
    expect(Math.abs(latent / 30820 - 1)).toBeLessThan(0.01);
  });

  test("toluene: liquid 5109, vapor 38439 at 110.6 degC", () => {
    const cold = liquidEnthalpy(toluene, reference, boiling);
    expect(Math.abs((liquidEnthalpy(toluene, boiling, boiling) - cold) / 5109 - 1)).toBeLessThan(0.1); // its cp is that of the boiling point
    expect(Math.abs((idealGasEnthalpy(toluene, boiling) - cold) / 38439 - 1)).toBeLessThan(0.02);
  });
});

test("the integral of the heat capacity has its slope", () => {
  for (const name of ["benzene", "water", "methanol", "n-decane"]) {
    const of = component(name);
    for (const temperature of [300, 350, 450]) {
      const step = 0.01;
      const slope =
        (idealGasEnthalpy(of, temperature + step) - idealGasEnthalpy(of, temperature - step)) / (2 * step);
      expect(Math.abs(slope / idealGasHeatCapacity(of, temperature)! - 1)).toBeLessThan(1e-6);
    }
  }
});
