import type { Issue } from "../base/errors";
import { raoultKValues } from "./kValues";
import type { Mixture } from "./mixture";
import { splitPhases } from "./phaseSplit";
import { saturationTemperature } from "./saturation";
import { saturationLogPressure } from "./saturationPressure";
import { type Origin, refusePressure, refuseTemperature } from "./validity";
import { compileVaporPressures, evaluateVaporPressures, type VaporPressureTable } from "./vaporPressureTable";

/** A mixture with its vapor-pressure equations compiled. */
export interface IdealMixture extends Mixture {
  readonly table: VaporPressureTable;
}

/** An equilibrium state of a mixture; arrays in the order of its components. */
export interface PhaseState {
  readonly temperature: number;
  readonly pressure: number;
  readonly vaporFraction: number;
  readonly kValues: Float64Array;
  readonly liquid: Float64Array;
  readonly vapor: Float64Array;
}

/** Compiles the vapor-pressure equations of a mixture. */
export function idealMixture(mixture: Mixture): IdealMixture {
  return { ...mixture, table: compileVaporPressures(mixture.components) };
}

const pointName: Readonly<Record<number, string>> = { 0: "the bubble point", 1: "the dew point" };

/** The state with a given vapor fraction at a pressure [Pa]; undefined after a reported fault. */
export function stateAtPressure(
  faults: Issue[],
  mixture: IdealMixture,
  pressure: number,
  vaporFraction: number,
  origin: Origin,
): PhaseState | undefined {
  const before = faults.length;
  refusePressure(faults, mixture, pressure, origin);
  if (faults.length > before) return undefined;
  const solvedFor = pointName[vaporFraction] ?? `the vapor fraction ${vaporFraction}`;
  const temperature = saturationTemperature(
    mixture.table,
    mixture.fractions,
    Math.log(pressure),
    vaporFraction,
  );
  if (Number.isNaN(temperature)) {
    const message = `${origin.path}: the vapor-pressure equations give no temperature for ${solvedFor} at ${pressure} Pa; use a pressure within their ranges`;
    faults.push({ code: "vapor-pressure-undefined", path: origin.path, message, value: origin.typed });
    return undefined;
  }
  evaluateVaporPressures(mixture.table, temperature);
  refuseTemperature(faults, mixture, temperature, mixture.table.logPressure, { ...origin, solvedFor });
  return faults.length > before ? undefined : stateOf(mixture, temperature, pressure, vaporFraction);
}

/** The state with a given vapor fraction at a temperature [K]; undefined after a reported fault. */
export function stateAtTemperature(
  faults: Issue[],
  mixture: IdealMixture,
  temperature: number,
  vaporFraction: number,
  origin: Origin,
): PhaseState | undefined {
  const before = faults.length;
  evaluateVaporPressures(mixture.table, temperature);
  refuseTemperature(faults, mixture, temperature, mixture.table.logPressure, origin);
  if (faults.length > before) return undefined;
  const logPressure = saturationLogPressure(mixture.table.logPressure, mixture.fractions, vaporFraction);
  return stateOf(mixture, temperature, Math.exp(logPressure), vaporFraction);
}

/** The state at a temperature [K] and a pressure [Pa]; undefined after a reported fault. */
export function stateAt(
  faults: Issue[],
  mixture: IdealMixture,
  temperature: number,
  pressure: number,
  ofTemperature: Origin,
  ofPressure: Origin,
): PhaseState | undefined {
  const before = faults.length;
  const { table, fractions } = mixture;
  refusePressure(faults, mixture, pressure, ofPressure);
  evaluateVaporPressures(table, temperature);
  refuseTemperature(faults, mixture, temperature, table.logPressure, ofTemperature);
  if (faults.length > before) return undefined;
  const kValues = raoultKValues(table.logPressure, Math.log(pressure));
  const liquid = new Float64Array(table.count);
  const vapor = new Float64Array(table.count);
  const vaporFraction = splitPhases(fractions, kValues, liquid, vapor);
  return { temperature, pressure, vaporFraction, kValues, liquid, vapor };
}

/** The phases of a saturated mixture whose vapor pressures were evaluated last at `temperature`. */
function stateOf(
  { table, fractions: z }: IdealMixture,
  temperature: number,
  pressure: number,
  vaporFraction: number,
): PhaseState {
  const kValues = raoultKValues(table.logPressure, Math.log(pressure));
  const liquid = new Float64Array(z.length);
  const vapor = new Float64Array(z.length);
  for (let i = 0; i < z.length; i++) {
    const share = z[i]! / (1 - vaporFraction + vaporFraction * kValues[i]!);
    liquid[i] = vaporFraction === 0 ? z[i]! : share;
    vapor[i] = vaporFraction === 1 ? z[i]! : share * kValues[i]!;
  }
  return { temperature, pressure, vaporFraction, kValues, liquid, vapor };
}
