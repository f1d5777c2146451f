import type { Component, VaporPressureBlock } from "../../src/components/component";
import { defineComponent } from "../../src/components/defineComponent";

/** Composition and components of one's own, by name. */
export interface OwnMixture {
  readonly composition: Readonly<Record<string, number>>;
  readonly ownComponents: readonly Component[];
}

type Antoine = Extract<VaporPressureBlock, { form: "antoine" }>;
type AntoineForm = Omit<Antoine, "form" | "A" | "B" | "C" | "range" | "source">;
type Constants = readonly [A: number, B: number, C: number];

/** Components with the Antoine constants that a textbook prints, in its units. */
export function antoineMixture(
  form: AntoineForm,
  constants: Readonly<Record<string, Constants>>,
  fractions: readonly number[],
): OwnMixture {
  const names = Object.keys(constants);
  const ownComponents = names.map((name) => {
    const [A, B, C] = constants[name]!;
    const vaporPressure = {
      form: "antoine",
      A,
      B,
      C,
      ...form,
      range: [250, 450],
      source: "textbook",
    } as const;
    return defineComponent({ name, vaporPressure });
  });
  return { composition: Object.fromEntries(names.map((name, i) => [name, fractions[i]!])), ownComponents };
}

/** Temperature [K] at which `atVaporPressures` holds. */
export const printedTemperature = 300;

/** Components that have the vapor pressures [kPa] which a textbook prints, at `printedTemperature`. */
export function atVaporPressures(
  pressures: Readonly<Record<string, number>>,
  fractions: readonly number[],
): OwnMixture {
  const slope = 1000;
  const constants = Object.fromEntries(
    Object.entries(pressures).map(([name, kPa]) => [
      name,
      [Math.log10(kPa) + slope / printedTemperature, slope, 0] as const,
    ]),
  );
  return antoineMixture({ logBase: 10, temperatureUnit: "K", pressureUnit: "kPa" }, constants, fractions);
}
