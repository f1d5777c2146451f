import { readFields } from "../base/check";
import { type Issue, refuseIfFaulty } from "../base/errors";
import type { Caution, Judged, MethodUsed } from "../base/result";
import { readQuantity, type Temperature } from "../base/units";
import type { Component, VaporPressureBlock, VaporPressureEquation } from "./component";
import { readComponent } from "./resolveComponent";
import { judgeVaporPressure, vaporPressureMethod } from "./vaporPressureQuality";

/** What `vaporPressure` takes. */
export interface VaporPressureInput {
  /** A component, or its name in the built-in table. */
  readonly component: Component | string;
  /** [K], or text with a unit. */
  readonly temperature: Temperature;
}

/** A property of a pure component at a state. */
export interface PropertyResult extends Judged {
  readonly kind: "vaporPressure" | "boilingTemperature";
  readonly value: number;
}

type EquationOf<F> = Extract<VaporPressureEquation, { form: F }>;

const pascals = { Pa: 1, kPa: 1e3, bar: 1e5, mmHg: 133.322387415, psia: 6894.757293168361 } as const;

/** ln(P/Pa) at T [K]; NaN where the equation has no value (at and below the pole of an Antoine equation). */
export function logVaporPressure(block: VaporPressureEquation, temperature: number): number {
  switch (block.form) {
    case "antoine":
      return antoine(block, temperature);
    case "dippr101":
      return (
        block.C1 +
        block.C2 / temperature +
        block.C3 * Math.log(temperature) +
        block.C4 * temperature ** block.C5
      );
    default:
      return wagner(block, temperature);
  }
}

/** d ln P/dT [1/K] at T [K]. */
export function logVaporPressureSlope(block: VaporPressureEquation, temperature: number): number {
  switch (block.form) {
    case "antoine": {
      const own = ownTemperature(block, temperature);
      const perKelvin = block.temperatureUnit === "degF" ? 1.8 : 1;
      const toNatural = block.logBase === 10 ? Math.LN10 : 1;
      return (toNatural * block.B * perKelvin) / (own + block.C) ** 2;
    }
    case "dippr101":
      return (
        (-block.C2 / temperature + block.C3 + block.C5 * block.C4 * temperature ** block.C5) / temperature
      );
    default:
      return wagnerSlope(block, temperature);
  }
}

/** T [K] in the unit of an Antoine equation. */
function ownTemperature(block: EquationOf<"antoine">, temperature: number): number {
  if (block.temperatureUnit === "K") return temperature;
  const celsius = temperature - 273.15;
  return block.temperatureUnit === "degC" ? celsius : celsius * 1.8 + 32;
}

function antoine(block: EquationOf<"antoine">, temperature: number): number {
  const abovePole = ownTemperature(block, temperature) + block.C;
  if (!(abovePole > 0)) return Number.NaN;
  const log = block.A - block.B / abovePole;
  return log * (block.logBase === 10 ? Math.LN10 : 1) + Math.log(pascals[block.pressureUnit]);
}

function wagner(block: EquationOf<"wagner25" | "wagner36">, temperature: number): number {
  const [c1, c2, c3, c4] = block.coefficients;
  const reduced = temperature / block.criticalTemperature;
  const t = 1 - reduced;
  // Above the critical point the series has no meaning; its end slope carries ln P on, straight in 1/T.
  if (t < 0) return Math.log(block.criticalPressure) + (c1 * t) / reduced;
  const root = Math.sqrt(t);
  const sum =
    block.form === "wagner25"
      ? c1 * t + c2 * t * root + c3 * t * t * root + c4 * t ** 5
      : c1 * t + c2 * t * root + c3 * t ** 3 + c4 * t ** 6;
  return Math.log(block.criticalPressure) + sum / reduced;
}

function wagnerSlope(block: EquationOf<"wagner25" | "wagner36">, temperature: number): number {
  const [c1, c2, c3, c4] = block.coefficients;
  const reduced = temperature / block.criticalTemperature;
  const t = Math.max(0, 1 - reduced);
  const root = Math.sqrt(t);
  const is25 = block.form === "wagner25";
  const sum = is25
    ? c1 * t + c2 * t * root + c3 * t * t * root + c4 * t ** 5
    : c1 * t + c2 * t * root + c3 * t ** 3 + c4 * t ** 6;
  const dSum = is25
    ? c1 + 1.5 * c2 * root + 2.5 * c3 * t * root + 5 * c4 * t ** 4
    : c1 + 1.5 * c2 * root + 3 * c3 * t * t + 6 * c4 * t ** 5;
  if (reduced > 1) return (-c1 * block.criticalTemperature) / (temperature * temperature);
  return -(dSum + sum / reduced) / temperature;
}

/** Whether a temperature [K] lies in the published range of a block. */
export function isInRange(block: VaporPressureBlock, temperature: number): boolean {
  return temperature >= block.range[0] && temperature <= block.range[1];
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
 * has no value
 * @example vaporPressure({ component: "water", temperature: "100 degC" }).value / 101325 // 1.00
 */
export function vaporPressure(input: VaporPressureInput): PropertyResult {
  const faults: Issue[] = [];
  const fields = readFields(faults, "input", input, new Set(["component", "temperature"]));
  const component = fields && readComponent(faults, "component", fields["component"]);
  const temperature = fields
    ? readQuantity(faults, "temperature", fields["temperature"], "temperature")
    : Number.NaN;
  refuseIfFaulty(faults);
  const value = vaporPressureOf(faults, "temperature", component!, temperature);
  refuseIfFaulty(faults);
  const cautions: Caution[] = judgeVaporPressure(component!, component!.name, temperature);
  const methods: MethodUsed[] = [vaporPressureMethod(component!)];
  return { kind: "vaporPressure", value, cautions, methods };
}

/** P [Pa] at T [K] with the refusals that go with it; NaN after a reported fault. */
export function vaporPressureOf(
  faults: Issue[],
  path: string,
  component: Component,
  temperature: number,
): number {
  const critical = component.criticalTemperature;
  if (critical !== undefined && temperature > critical) {
    const message = `${path} must not exceed the critical temperature of ${component.name}, ${critical} K, got ${temperature} K; above it there is no vapor pressure: lower the temperature, or treat the component as a gas that does not condense`;
    faults.push({ code: "above-critical", path, message, value: temperature, limit: critical });
    return Number.NaN;
  }
  const value = Math.exp(logVaporPressure(component.vaporPressure, temperature));
  if (Number.isFinite(value) && value > 0) return value;
  const [low, high] = component.vaporPressure.range;
  const message = `${path}: the vapor-pressure equation of ${component.name} has no value at ${temperature} K; it was published for ${low} to ${high} K`;
  faults.push({ code: "vapor-pressure-undefined", path, message, value: temperature });
  return Number.NaN;
}
