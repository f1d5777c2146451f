import type { VaporPressureEquation } from "./component";

type EquationOf<F> = Extract<VaporPressureEquation, { form: F }>;

/** ln of the pressure units [Pa] of Antoine equations; the millimeter of mercury is the conventional one. */
const logPascals: Readonly<Record<EquationOf<"antoine">["pressureUnit"], number>> = {
  Pa: 0,
  kPa: Math.log(1e3),
  bar: Math.log(1e5),
  mmHg: Math.log(133.322387415),
  psia: Math.log(6894.757293168361),
};

/** ln(P/Pa) at T [K]; NaN where the equation has no value (at and below the pole of an Antoine equation). */
export function logVaporPressure(equation: VaporPressureEquation, temperature: number): number {
  switch (equation.form) {
    case "antoine":
      return antoine(equation, temperature);
    case "dippr101": {
      const { C1, C2, C3, C4, C5 } = equation;
      return C1 + C2 / temperature + C3 * Math.log(temperature) + C4 * temperature ** C5;
    }
    default:
      return wagner(equation, temperature);
  }
}

/** d ln P/dT [1/K] at T [K], in closed form. */
export function logVaporPressureSlope(equation: VaporPressureEquation, temperature: number): number {
  switch (equation.form) {
    case "antoine":
      return antoineSlope(equation, temperature);
    case "dippr101": {
      const { C2, C3, C4, C5 } = equation;
      return (C3 - C2 / temperature + C5 * C4 * temperature ** C5) / temperature;
    }
    default:
      return wagnerSlope(equation, temperature);
  }
}

/** T [K] in the unit of an Antoine equation. */
function ownTemperature(unit: EquationOf<"antoine">["temperatureUnit"], temperature: number): number {
  if (unit === "K") return temperature;
  return unit === "degC" ? temperature - 273.15 : temperature * 1.8 - 459.67;
}

function antoine(equation: EquationOf<"antoine">, temperature: number): number {
  const abovePole = ownTemperature(equation.temperatureUnit, temperature) + equation.C;
  if (!(abovePole > 0)) return Number.NaN;
  const log = equation.A - equation.B / abovePole;
  return (equation.logBase === 10 ? log * Math.LN10 : log) + logPascals[equation.pressureUnit];
}

function antoineSlope(equation: EquationOf<"antoine">, temperature: number): number {
  const { B, C, logBase, temperatureUnit } = equation;
  const abovePole = ownTemperature(temperatureUnit, temperature) + C;
  if (!(abovePole > 0)) return Number.NaN;
  const perKelvin = temperatureUnit === "degF" ? 1.8 : 1;
  return ((logBase === 10 ? Math.LN10 : 1) * B * perKelvin) / (abovePole * abovePole);
}

/** Above the critical point the series has no meaning; its end slope carries ln P on, straight in 1/T. */
function wagner(equation: EquationOf<"wagner25" | "wagner36">, temperature: number): number {
  const { criticalTemperature, criticalPressure } = equation;
  const t = 1 - temperature / criticalTemperature;
  const series = t < 0 ? equation.coefficients[0] * t : wagnerSeries(equation, t);
  return Math.log(criticalPressure) + (series * criticalTemperature) / temperature;
}

function wagnerSlope(equation: EquationOf<"wagner25" | "wagner36">, temperature: number): number {
  const { coefficients: c, criticalTemperature, form } = equation;
  const inverse = criticalTemperature / temperature;
  const t = 1 - temperature / criticalTemperature;
  if (t < 0) return (-c[0] * inverse) / temperature;
  const root = Math.sqrt(t);
  const t2 = t * t;
  const last =
    form === "wagner25" ? 2.5 * c[2] * t * root + 5 * c[3] * t2 * t2 : 3 * c[2] * t2 + 6 * c[3] * t2 * t2 * t;
  const derivativeByT = c[0] + 1.5 * c[1] * root + last;
  return -(derivativeByT + wagnerSeries(equation, t) * inverse) / temperature;
}

/** c1 t + c2 t^1.5 + c3 t^2.5 + c4 t^5, or with the exponents 3 and 6. */
function wagnerSeries(equation: EquationOf<"wagner25" | "wagner36">, t: number): number {
  const c = equation.coefficients;
  const t2 = t * t;
  const power = t * Math.sqrt(t);
  const last =
    equation.form === "wagner25"
      ? c[2] * power * t + c[3] * t2 * t2 * t
      : c[2] * t2 * t + c[3] * t2 * t2 * t2;
  return c[0] * t + c[1] * power + last;
}
