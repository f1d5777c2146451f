import type { Component, PropertyBlock } from "../../src/components/component";
import { liquidDensity } from "../../src/components/density";
import { heatOfVaporization, idealGasHeatCapacity, liquidHeatCapacity } from "../../src/components/heats";
import { vaporPressureAt } from "../../src/components/vaporPressure";

export type PropertyName =
  "vaporPressure" | "liquidDensity" | "heatOfVaporization" | "liquidHeatCapacity" | "idealGasHeatCapacity";

/** A property of a component [SI] at T [K]; undefined when the table has none. */
export function valueOf(
  property: PropertyName,
  component: Component,
  temperature: number,
): number | undefined {
  switch (property) {
    case "vaporPressure":
      return vaporPressureAt(component.vaporPressure, temperature);
    case "liquidDensity":
      return liquidDensity(component, temperature);
    case "heatOfVaporization": {
      const { value, estimated } = heatOfVaporization(component, temperature);
      return estimated ? undefined : value;
    }
    case "liquidHeatCapacity":
      return liquidHeatCapacity(component, temperature);
    case "idealGasHeatCapacity":
      return idealGasHeatCapacity(component, temperature);
  }
}

/** Evenly spaced values from `low` to `high`. */
export function grid(low: number, high: number, count = 25): number[] {
  return Array.from({ length: count }, (_, i) => low + ((high - low) * i) / (count - 1));
}

/** Vapors that pair: the ideal-gas form of Clapeyron's equation does not apply. */
export const associating: ReadonlySet<string> = new Set([
  "formic-acid",
  "acetic-acid",
  "propionic-acid",
  "n-butyric-acid",
  "acrylic-acid",
]);

/** The range of a block cut to `low` and `high`. */
export function rangeWithin({ range }: PropertyBlock, low: number, high: number): [number, number] {
  return [Math.max(range[0], low), Math.min(range[1], high)];
}
