import type { Component, VaporPressureEquation } from "../components/component";
import { logVaporPressure, logVaporPressureSlope } from "../components/vaporPressure";
import { criticalTemperatureOf } from "./criticalPoint";

/**
 * The vapor-pressure equations of a mixture as flat numbers, for the loops that solve bubble, dew and flash points.
 * `logPressure` and `slope` are scratch space that `evaluateVaporPressures` fills.
 */
export interface VaporPressureTable {
  readonly count: number;
  readonly form: Uint8Array;
  /** Eight numbers a component, by form: see the `flatten...` functions. */
  readonly coefficients: Float64Array;
  /** ln(P/Pa) at the temperature last evaluated. */
  readonly logPressure: Float64Array;
  /** d ln P/dT [1/K] at the temperature last evaluated. */
  readonly slope: Float64Array;
  /** Three numbers a component: ln P = s0 - s1/(T + s2) through one point, from which searches start. */
  readonly start: Float64Array;
}

const stride = 8;
const antoine = 0;
const dippr101 = 1;
const wagner25 = 2;
const wagner36 = 3;

/** Far below any vapor pressure: what an Antoine equation says at and below its pole. */
const noPressure = -1e4;

const pascals = { Pa: 1, kPa: 1e3, bar: 1e5, mmHg: 133.322387415, psia: 6894.757293168361 } as const;

/** Compiles the vapor-pressure equations of components, in their order. */
export function compileVaporPressures(components: readonly Component[]): VaporPressureTable {
  const count = components.length;
  const form = new Uint8Array(count);
  const coefficients = new Float64Array(count * stride);
  const start = new Float64Array(count * 3);
  components.forEach((component, i) => {
    const c = coefficients.subarray(i * stride, (i + 1) * stride);
    form[i] = flatten(component, c);
    start.set(form[i] === antoine ? c.subarray(0, 3) : startingLine(component), 3 * i);
  });
  const logPressure = new Float64Array(count);
  return { count, form, coefficients, logPressure, slope: new Float64Array(count), start };
}

/** An Antoine equation with Thomson's rule for C (from memory) through one point of the component's own equation. */
function startingLine(component: Component): [number, number, number] {
  const { vaporPressure, normalBoilingPoint } = component;
  const t = normalBoilingPoint ?? 0.5 * (vaporPressure.range[0] + vaporPressure.range[1]);
  const c = 18 - 0.19 * t;
  const b = logVaporPressureSlope(vaporPressure, t) * (t + c) ** 2;
  return [logVaporPressure(vaporPressure, t) + b / (t + c), b, c];
}

function flatten(component: Component, c: Float64Array): number {
  const equation = component.vaporPressure;
  if (equation.form === "antoine") return flattenAntoine(equation, c);
  if (equation.form === "dippr101") return flattenDippr101(equation, c, criticalTemperatureOf(component));
  return flattenWagner(equation, c);
}

type EquationOf<F> = Extract<VaporPressureEquation, { form: F }>;

/** ln P = c0 - c1/(T + c2) in Pa and K. */
function flattenAntoine(equation: EquationOf<"antoine">, c: Float64Array): number {
  const toNatural = equation.logBase === 10 ? Math.LN10 : 1;
  const degrees = equation.temperatureUnit === "degF" ? 1.8 : 1;
  const zero = { K: 0, degC: -273.15, degF: -459.67 }[equation.temperatureUnit];
  c[0] = equation.A * toNatural + Math.log(pascals[equation.pressureUnit]);
  c[1] = (equation.B * toNatural) / degrees;
  c[2] = (equation.C + zero) / degrees;
  return antoine;
}

/** ln P = c0 + c1/T + c2 ln T + c3 T^c4 up to the critical temperature c5, then straight in 1/T: c6 + c7/T. */
function flattenDippr101(equation: EquationOf<"dippr101">, c: Float64Array, critical = Infinity): number {
  const { C1, C2, C3, C4, C5 } = equation;
  c.set([C1, C2, C3, C4, C5, critical]);
  if (critical === Infinity) return dippr101;
  const power = C4 * critical ** C5;
  const logPressure = C1 + C2 / critical + C3 * Math.log(critical) + power;
  const slopeTimesT = -C2 / critical + C3 + C5 * power;
  c[6] = logPressure + slopeTimesT;
  c[7] = -slopeTimesT * critical;
  return dippr101;
}

/** Coefficients c0-c3, ln Pc in c4, Tc in c5; above Tc straight in 1/T: c6 + c7/T. */
function flattenWagner(equation: EquationOf<"wagner25" | "wagner36">, c: Float64Array): number {
  const { coefficients, criticalTemperature, criticalPressure } = equation;
  const logCritical = Math.log(criticalPressure);
  c.set(coefficients);
  c[4] = logCritical;
  c[5] = criticalTemperature;
  c[6] = logCritical - coefficients[0];
  c[7] = coefficients[0] * criticalTemperature;
  return equation.form === "wagner25" ? wagner25 : wagner36;
}

/** T^n and its derivative are needed together; the published exponents are mostly whole. */
function powerOf(t: number, exponent: number): number {
  if (exponent === 2) return t * t;
  if (exponent === 1) return t;
  return t ** exponent;
}

/** Fills `logPressure` and `slope` at temperature T [K]. */
export function evaluateVaporPressures(table: VaporPressureTable, t: number): void {
  const { count, form, coefficients: c, logPressure, slope } = table;
  for (let i = 0, at = 0; i < count; i++, at += stride) {
    const kind = form[i]!;
    if (kind === antoine) {
      const above = t + c[at + 2]!;
      const w = 1 / above;
      logPressure[i] = above > 0 ? c[at]! - c[at + 1]! * w : noPressure;
      slope[i] = above > 0 ? c[at + 1]! * w * w : 0;
    } else if (t > c[at + 5]!) {
      logPressure[i] = c[at + 6]! + c[at + 7]! / t;
      slope[i] = -c[at + 7]! / (t * t);
    } else if (kind === dippr101) {
      const power = c[at + 3]! * powerOf(t, c[at + 4]!);
      logPressure[i] = c[at]! + c[at + 1]! / t + c[at + 2]! * Math.log(t) + power;
      slope[i] = (-c[at + 1]! / t + c[at + 2]! + c[at + 4]! * power) / t;
    } else {
      evaluateWagner(table, i, at, t);
    }
  }
}

function evaluateWagner(table: VaporPressureTable, i: number, at: number, t: number): void {
  const c = table.coefficients;
  const critical = c[at + 5]!;
  const x = 1 - t / critical;
  const root = x * Math.sqrt(x);
  const x2 = x * x;
  const is25 = table.form[i] === wagner25;
  const third = is25 ? root * x : x2 * x;
  const fourth = is25 ? x2 * x2 * x : x2 * x2 * x2;
  const sum = c[at]! * x + c[at + 1]! * root + c[at + 2]! * third + c[at + 3]! * fourth;
  // d(sum)/dx times x, by the exponents
  const xSlope =
    c[at]! * x +
    1.5 * c[at + 1]! * root +
    (is25 ? 2.5 : 3) * c[at + 2]! * third +
    (is25 ? 5 : 6) * c[at + 3]! * fourth;
  table.logPressure[i] = c[at + 4]! + (sum * critical) / t;
  table.slope[i] = x > 0 ? -(xSlope / x + (sum * critical) / t) / t : -c[at]! / t;
}
