import type { Component } from "./component";
import { logVaporPressure } from "./logVaporPressure";

/** Critical temperature [K]: the component's own, else that of its Wagner equation; undefined when not known. */
export function criticalTemperatureOf(component: Component): number | undefined {
  const { criticalTemperature, vaporPressure } = component;
  if (criticalTemperature !== undefined) return criticalTemperature;
  return "coefficients" in vaporPressure ? vaporPressure.criticalTemperature : undefined;
}

/** Critical pressure [Pa]: the component's own, else its vapor pressure at the critical temperature. */
export function criticalPressureOf(component: Component): number | undefined {
  if (component.criticalPressure !== undefined) return component.criticalPressure;
  const temperature = criticalTemperatureOf(component);
  if (temperature === undefined) return undefined;
  const pressure = Math.exp(logVaporPressure(component.vaporPressure, temperature));
  return pressure > 0 && pressure < Infinity ? pressure : undefined;
}
