import { gasConstant } from "../base/constants";
import type { Component, PropertyBlock } from "./component";
import { evaluateProperty } from "./propertyEquation";
import { logVaporPressureSlope } from "./vaporPressure";

/** A heat at a temperature: its value, and whether it comes from the slope of the vapor pressure for want of data. */
export interface Heat {
  readonly value: number;
  readonly estimated: boolean;
}

/** A block's value, its temperature kept inside the range for which it was published. */
function within(block: PropertyBlock, temperature: number, component: Component): number {
  const [low, high] = block.range;
  return evaluateProperty(block, Math.min(high, Math.max(low, temperature)), component);
}

/**
 * Heat of vaporization [J/mol] at T [K]; by Clausius and Clapeyron from the slope of the vapor pressure for an ideal
 * vapor, R T² d ln P/dT, when the table has no correlation.
 */
export function heatOfVaporization(component: Component, temperature: number): Heat {
  const block = component.heatOfVaporization;
  const value = block === undefined ? Number.NaN : within(block, temperature, component);
  if (value >= 0) return { value, estimated: false };
  const slope = logVaporPressureSlope(component.vaporPressure, temperature);
  return { value: gasConstant * temperature * temperature * slope, estimated: true };
}

/** Liquid heat capacity [J/(mol K)] at T [K]; undefined when the table has none. */
export function liquidHeatCapacity(component: Component, temperature: number): number | undefined {
  const block = component.liquidHeatCapacity;
  return block === undefined ? undefined : within(block, temperature, component);
}

/** Ideal-gas heat capacity [J/(mol K)] at T [K]; undefined when the table has none. */
export function idealGasHeatCapacity(component: Component, temperature: number): number | undefined {
  const block = component.idealGasHeatCapacity;
  return block === undefined ? undefined : within(block, temperature, component);
}
