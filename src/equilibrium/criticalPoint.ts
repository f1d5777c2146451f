import type { Component } from "../components/component";
import { logVaporPressure } from "../components/vaporPressure";

/** Compilations give DIPPR 101 equations up to the critical point; only an end at such a pressure [Pa] can be one. */
const leastCriticalPressure = 1.5e6;

/**
 * Critical temperature [K]: the component's own, else that of its Wagner equation, else the upper end of a DIPPR 101
 * equation, which the compilations set at the critical point (common practice). Undefined when not known.
 */
export function criticalTemperatureOf(component: Component): number | undefined {
  if (component.criticalTemperature !== undefined) return component.criticalTemperature;
  const block = component.vaporPressure;
  if (block.form === "wagner25" || block.form === "wagner36") return block.criticalTemperature;
  if (block.form !== "dippr101") return undefined;
  const end = block.range[1];
  return logVaporPressure(block, end) > Math.log(leastCriticalPressure) ? end : undefined;
}

/** Critical pressure [Pa]: the component's own, else its vapor pressure at the critical temperature. */
export function criticalPressureOf(component: Component): number | undefined {
  if (component.criticalPressure !== undefined) return component.criticalPressure;
  const temperature = criticalTemperatureOf(component);
  return temperature === undefined
    ? undefined
    : Math.exp(logVaporPressure(component.vaporPressure, temperature));
}
