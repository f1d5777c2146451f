import { readFields, shown } from "../base/check";
import { type Issue, refuseIfFaulty } from "../base/errors";
import { readQuantity, type Pressure } from "../base/units";
import type { Component } from "./component";
import { readComponent } from "./resolveComponent";
import { logVaporPressure, logVaporPressureSlope, type PropertyResult } from "./vaporPressure";
import { judgeVaporPressure, vaporPressureMethod } from "./vaporPressureQuality";

/** What `boilingTemperature` takes. */
export interface BoilingTemperatureInput {
  /** A component, or its name in the built-in table. */
  readonly component: Component | string;
  /** Absolute [Pa], or text with a unit. */
  readonly pressure: Pressure;
}

const mostIterations = 200;
const highestTemperature = 1e4;

/**
 * T [K] at which the vapor pressure is exp(logPressure) [Pa]: Newton in 1/T, in which ln P is nearly straight,
 * inside a bracket that is widened step by step from the published range. NaN when the equation never gets there.
 */
export function boilingTemperatureAt(component: Component, logPressure: number): number {
  const block = component.vaporPressure;
  const excess = (t: number): number => logVaporPressure(block, t) - logPressure;
  let low = block.range[0];
  let high = block.range[1];
  for (let i = 0; i < mostIterations && excess(low) > 0; i++) low *= 0.97;
  for (let i = 0; i < mostIterations && !(excess(high) >= 0) && high < highestTemperature; i++) high *= 1.03;
  // At and below the pole of an Antoine equation the excess is NaN, which counts as "too cold".
  if (!(excess(high) >= 0) || excess(low) > 0) return Number.NaN;
  let t = Math.min(high, Math.max(low, component.normalBoilingPoint ?? 0.5 * (low + high)));
  for (let i = 0; i < mostIterations; i++) {
    const e = excess(t);
    if (e > 0) high = t;
    else low = t;
    let next = 1 / (1 / t + e / (logVaporPressureSlope(block, t) * t * t));
    if (Math.abs(next - t) <= 1e-14 * t) return next;
    if (!(next > low && next < high)) next = 0.5 * (low + high);
    if (high - low <= 1e-15 * high) return next;
    t = next;
  }
  return t;
}

/**
 * Boiling temperature of a pure component [K]: the T at which its vapor pressure equals the pressure.
 *
 * Takes the component (or its name) and the absolute pressure (Pa, or text such as "1.6 bar").
 *
 * Source: the publication named in the result's `methods`, component by component.
 *
 * @throws DesignInputError for an unknown name, a pressure above the critical one, or one that the vapor-pressure
 * equation does not reach
 * @example boilingTemperature({ component: "water", pressure: "1 atm" }).value // 373.1
 */
export function boilingTemperature(input: BoilingTemperatureInput): PropertyResult {
  const faults: Issue[] = [];
  const fields = readFields(faults, "input", input, new Set(["component", "pressure"]));
  const component = fields && readComponent(faults, "component", fields["component"]);
  const pressure = fields ? readQuantity(faults, "pressure", fields["pressure"], "pressure") : Number.NaN;
  refuseIfFaulty(faults);
  const critical = component!.criticalPressure;
  const value = boilingTemperatureAt(component!, Math.log(pressure));
  if (critical !== undefined && pressure > critical) {
    const message = `pressure must not exceed the critical pressure of ${component!.name}, ${critical} Pa, got ${shown(pressure)}; above it nothing boils: lower the pressure`;
    faults.push({ code: "above-critical", path: "pressure", message, value: pressure, limit: critical });
  } else if (!Number.isFinite(value)) {
    const message = `pressure: the vapor-pressure equation of ${component!.name} does not reach ${shown(pressure)} Pa`;
    faults.push({ code: "vapor-pressure-undefined", path: "pressure", message, value: pressure });
  }
  refuseIfFaulty(faults);
  const cautions = judgeVaporPressure(component!, component!.name, value);
  return { kind: "boilingTemperature", value, cautions, methods: [vaporPressureMethod(component!)] };
}
