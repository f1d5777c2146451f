import { gasConstant } from "../base/constants";
import type { MethodUsed } from "../base/result";
import { method } from "../base/source";
import type { Component } from "./component";
import { criticalPressureOf, criticalTemperatureOf } from "./criticalPoint";
import { logVaporPressure, logVaporPressureSlope } from "./logVaporPressure";
import { propertyInRange } from "./propertyEquation";

/** A heat at a temperature: its value, and whether it comes from the slope of the vapor pressure for want of data. */
export interface Heat {
  readonly value: number;
  readonly estimated: boolean;
}

/**
 * Heat of vaporization [J/mol] at T [K], outside its published range at the end of it; without a correlation by
 * Clapeyron's equation from the slope of the vapor pressure.
 */
export function heatOfVaporization(component: Component, temperature: number): Heat {
  const value = propertyInRange(component.heatOfVaporization, temperature, component);
  if (value !== undefined && value >= 0) return { value, estimated: false };
  return { value: heatFromVaporPressure(component, temperature), estimated: true };
}

/**
 * Heat of vaporization [J/mol] by Clapeyron's equation, R T^2 (d ln P/dT) (ZV - ZL), with Haggenmacher's
 * ZV - ZL = (1 - (P/Pc)/(T/Tc)^3)^0.5; of an ideal vapor, ZV - ZL = 1, when the critical point is not known.
 */
export function heatFromVaporPressure(component: Component, temperature: number): number {
  const { vaporPressure } = component;
  const ideal = gasConstant * temperature * temperature * logVaporPressureSlope(vaporPressure, temperature);
  const criticalTemperature = criticalTemperatureOf(component);
  const criticalPressure = criticalPressureOf(component);
  if (criticalTemperature === undefined || criticalPressure === undefined) return ideal;
  const reducedPressure = Math.exp(logVaporPressure(vaporPressure, temperature)) / criticalPressure;
  const reducedTemperature = temperature / criticalTemperature;
  return ideal * Math.sqrt(Math.max(0, 1 - reducedPressure / reducedTemperature ** 3));
}

/** Where the heat of vaporization of a component comes from. */
export function heatOfVaporizationMethod({ name, heatOfVaporization: block }: Component): MethodUsed {
  return block === undefined
    ? method(`Heat of vaporization of ${name}: Clapeyron's equation`, "haggenmacher1946")
    : { name: `Heat of vaporization of ${name}`, source: block.source };
}

/** Heat capacity of the liquid [J/(mol K)] at T [K], outside its published range at the end of it; undefined without data. */
export function liquidHeatCapacity(component: Component, temperature: number): number | undefined {
  return propertyInRange(component.liquidHeatCapacity, temperature, component);
}

/** Heat capacity of the ideal gas [J/(mol K)] at T [K], outside its published range at the end of it; undefined without data. */
export function idealGasHeatCapacity(component: Component, temperature: number): number | undefined {
  return propertyInRange(component.idealGasHeatCapacity, temperature, component);
}
