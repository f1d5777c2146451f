import { readFields, shown } from "../base/check";
import { type Issue, refuseIfFaulty } from "../base/errors";
import { readQuantity, type Pressure } from "../base/units";
import type { Component, VaporPressureBlock } from "./component";
import { criticalPressureOf, criticalTemperatureOf } from "./criticalPoint";
import { logVaporPressure, logVaporPressureSlope } from "./logVaporPressure";
import type { PropertyResult } from "./propertyResult";
import { readComponent } from "./resolveComponent";
import { judgeVaporPressure, vaporPressureMethod } from "./vaporPressureQuality";

/** What `boilingTemperature` takes. */
export interface BoilingTemperatureInput {
  /** A component, or its name in the built-in table. */
  readonly component: Component | string;
  /** Absolute [Pa], or text with a unit. */
  readonly pressure: Pressure;
}

const stepFactor = 1.05;
const mostSteps = 150;
const mostIterations = 100;
const highestTemperature = 1e4;

/** T [K] at which the vapor pressure is exp(logPressure) [Pa]; NaN when the equation never gets there. */
export function boilingTemperatureAt(component: Component, logPressure: number): number {
  const block = component.vaporPressure;
  const low = block.range[0];
  const high = block.range[1];
  const start = Math.min(high, Math.max(low, component.normalBoilingPoint ?? 0.5 * (low + high)));
  const isAbove = logVaporPressure(block, start) > logPressure;
  const factor = isAbove ? 1 / stepFactor : stepFactor;
  let t = start;
  for (let i = 0; i < mostSteps && t < highestTemperature; i++) {
    const next = t * factor;
    // At and below the pole of an Antoine equation there is no value, which counts as too cold.
    if (logVaporPressure(block, next) > logPressure !== isAbove) {
      return isAbove ? newton(block, logPressure, next, t) : newton(block, logPressure, t, next);
    }
    t = next;
  }
  return Number.NaN;
}

/** Newton in 1/T, in which ln P is nearly straight, between a temperature too cold and one too hot; else bisection. */
function newton(block: VaporPressureBlock, logPressure: number, cold: number, hot: number): number {
  let low = cold;
  let high = hot;
  let t = 0.5 * (low + high);
  for (let i = 0; i < mostIterations; i++) {
    const excess = logVaporPressure(block, t) - logPressure;
    if (excess > 0) high = t;
    else low = t;
    let next = 1 / (1 / t + excess / (logVaporPressureSlope(block, t) * t * t));
    if (Math.abs(next - t) <= 1e-13 * t) return next;
    if (!(next > low && next < high)) next = 0.5 * (low + high);
    t = next;
  }
  return t;
}

/**
 * Boiling temperature of a pure component [K]: the T at which its vapor pressure equals the pressure.
 *
 * Takes the component (or its name) and the absolute pressure (Pa, or text such as "1.6 bar"). Outside the published
 * range the vapor-pressure equation is continued, with a caution.
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
  const value = boilingTemperatureAt(component!, Math.log(pressure));
  refuseUnreached(faults, component!, pressure, value);
  refuseIfFaulty(faults);
  const cautions = judgeVaporPressure(component!, component!.name, value);
  return { kind: "boilingTemperature", value, cautions, methods: [vaporPressureMethod(component!)] };
}

function refuseUnreached(faults: Issue[], component: Component, pressure: number, boiling: number): void {
  const limit = criticalPressureOf(component) ?? Infinity;
  if (pressure > limit || boiling > (criticalTemperatureOf(component) ?? Infinity)) {
    const message = `pressure must stay below the critical pressure of ${component.name}, ${shown(limit)} Pa, got ${shown(pressure)} Pa; above it nothing boils: lower the pressure`;
    faults.push({ code: "above-critical", path: "pressure", message, value: pressure, limit });
  } else if (!Number.isFinite(boiling)) {
    const message = `pressure: the vapor-pressure equation of ${component.name} does not reach ${shown(pressure)} Pa; it was published for ${component.vaporPressure.range.join(" to ")} K`;
    faults.push({ code: "vapor-pressure-undefined", path: "pressure", message, value: pressure });
  }
}
