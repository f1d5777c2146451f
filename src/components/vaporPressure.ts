import { readFields, shown } from "../base/check";
import { type Issue, refuseIfFaulty } from "../base/errors";
import type { Temperature } from "../base/units";
import type { Component, VaporPressureEquation } from "./component";
import { criticalTemperatureOf } from "./criticalPoint";
import { logVaporPressure, logVaporPressureSlope } from "./logVaporPressure";
import type { PropertyResult } from "./propertyResult";
import { readTemperature } from "./readTemperature";
import { readComponent } from "./resolveComponent";
import { judgeVaporPressure, rounding, vaporPressureMethod } from "./vaporPressureQuality";

export { logVaporPressure, logVaporPressureSlope } from "./logVaporPressure";
export type { PropertyResult } from "./propertyResult";

/** What `vaporPressure` takes. */
export interface VaporPressureInput {
  /** A component, or its name in the built-in table. */
  readonly component: Component | string;
  /** [K], or text with a unit. */
  readonly temperature: Temperature;
}

/** P [Pa] at T [K]; NaN where the equation has no value. */
export function vaporPressureAt(equation: VaporPressureEquation, temperature: number): number {
  return Math.exp(logVaporPressure(equation, temperature));
}

/**
 * Vapor pressure of a pure component [Pa], from its published equation.
 *
 *   ln(P/Pc) = (c1 t + c2 t^1.5 + c3 t^2.5 + c4 t^5)/Tr, t = 1 - Tr   (and the other forms of `defineComponent`)
 *
 * Takes the component (or its name) and the temperature (K, or text such as "80 degC"). Outside the published range
 * the equation is continued, with a caution.
 *
 * Source: the publication named in the result's `methods`, component by component.
 *
 * @throws DesignInputError for an unknown name, a temperature above the critical one, or one at which the equation
 * has no value or falls
 * @example vaporPressure({ component: "water", temperature: "100 degC" }).value / 101325 // 1.00
 */
export function vaporPressure(input: VaporPressureInput): PropertyResult {
  const faults: Issue[] = [];
  const fields = readFields(faults, "input", input, new Set(["component", "temperature"]));
  const component = fields && readComponent(faults, "component", fields["component"]);
  const present = component === undefined ? [] : [component];
  const temperature = fields
    ? readTemperature(faults, "temperature", fields["temperature"], present)
    : Number.NaN;
  refuseIfFaulty(faults);
  refuseUndefined(faults, component!, temperature);
  refuseIfFaulty(faults);
  return {
    kind: "vaporPressure",
    value: vaporPressureAt(component!.vaporPressure, temperature),
    cautions: judgeVaporPressure(component!, component!.name, temperature),
    methods: [vaporPressureMethod(component!)],
  };
}

function refuseUndefined(faults: Issue[], component: Component, temperature: number): void {
  const { name, vaporPressure: block } = component;
  const critical = criticalTemperatureOf(component);
  if (critical !== undefined && temperature > critical * (1 + rounding)) {
    const message = `temperature must not exceed the critical temperature of ${name}, ${critical} K, got ${shown(temperature)} K; above it there is no liquid: lower the temperature, or take ${name} as a gas that does not condense`;
    faults.push({
      code: "above-critical",
      path: "temperature",
      message,
      value: temperature,
      limit: critical,
    });
    return;
  }
  const value = vaporPressureAt(block, temperature);
  const rises = logVaporPressureSlope(block, temperature) > 0;
  if (value > 0 && value < Infinity && rises) return;
  const why = value > 0 && value < Infinity ? "falls with the temperature" : "has no value";
  const message = `temperature: the vapor-pressure equation of ${name} ${why} at ${shown(temperature)} K; it was published for ${block.range.join(" to ")} K`;
  faults.push({ code: "vapor-pressure-undefined", path: "temperature", message, value: temperature });
}
