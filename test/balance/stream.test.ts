import { expect, test } from "vitest";
import { component } from "../../src/components/componentTable";
import { defineComponent } from "../../src/components/defineComponent";
import { stream } from "../../src/balance/stream";

const names = ["benzene", "toluene"];
const components = names.map(component);

test("mass figures follow from the molar masses", () => {
  const result = stream(names, 10, Float64Array.of(0.4, 0.6), components, { temperature: 350 });
  const molarMass = 0.4 * components[0]!.molarMass! + 0.6 * components[1]!.molarMass!;
  expect(result.molarMass).toBeCloseTo(molarMass, 15);
  expect(result.massFlow).toBeCloseTo(10 * molarMass, 13);
  expect(result.massComposition!["benzene"]).toBeCloseTo((0.4 * components[0]!.molarMass!) / molarMass, 14);
  expect(result.temperature).toBe(350);
  expect(JSON.parse(JSON.stringify(result))).toEqual(result);
});

test("free labels, or a component without a molar mass, have no mass figures", () => {
  const own = defineComponent({ name: "own", vaporPressure: components[0]!.vaporPressure });
  const plain = { flow: 2, composition: { own: 0.5, benzene: 0.5 } };
  expect(stream(["own", "benzene"], 2, Float64Array.of(0.5, 0.5))).toEqual(plain);
  expect(stream(["own", "benzene"], 2, Float64Array.of(0.5, 0.5), [own, components[0]!])).toEqual(plain);
  expect(stream(["own", "benzene"], 2, Float64Array.of(0, 1), [own, components[0]!]).molarMass).toBe(
    components[0]!.molarMass,
  );
});
