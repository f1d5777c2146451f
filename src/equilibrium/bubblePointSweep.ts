import { readFields } from "../base/check";
import { DesignInputError, type Issue, refuseIfFaulty } from "../base/errors";
import type { Judged } from "../base/result";
import { statusOf } from "../base/sweepStatus";
import type { Component } from "../components/component";
import { readOwnComponents } from "../components/resolveComponent";
import { criticalPressureOf, criticalTemperatureOf } from "./criticalPoint";
import { judgeIdealMixture } from "./raoultGuard";
import { saturationTemperature } from "./saturation";
import { readCaseFractions, readCasePressures, readComponentList } from "./sweepInput";
import { compileVaporPressures, type VaporPressureTable } from "./vaporPressureTable";

/** Many liquids of the same components, each at a pressure. */
export interface BubblePointSweepInput {
  /** Names, in the order of the fractions. */
  readonly components: readonly string[];
  readonly ownComponents?: readonly Component[];
  /** Mole fractions of the liquids, case by case: as many as components for each case [-]. */
  readonly composition: Float64Array;
  /** Absolute [Pa], one a case or one for all. */
  readonly pressure: Float64Array | number;
}

/** Bubble temperatures, case by case. */
export interface BubblePointSweep extends Judged {
  readonly kind: "bubblePointSweep";
  /** [K]; 0 where the status is not 0. */
  readonly temperature: Float64Array;
  /** 0 answered, else the position in `sweepStatus` of the reason. */
  readonly status: Uint8Array;
}

/** What a sweep looks up once for all its cases. */
interface Sweep {
  readonly table: VaporPressureTable;
  readonly criticalTemperature: Float64Array;
  readonly criticalPressure: Float64Array;
}

const known = new Set(["components", "ownComponents", "composition", "pressure"]);
const sumTolerance = 1e-6;
const leastBarePressure = 1000;

const notFinite = statusOf("not-finite");
const fractionOutOfRange = statusOf("fraction-out-of-range");
const compositionSum = statusOf("composition-sum");
const pressureNotPositive = statusOf("pressure-not-positive");
const implausible = statusOf("implausible-bare-number");
const aboveCritical = statusOf("above-critical");
const noPressure = statusOf("vapor-pressure-undefined");

/**
 * Bubble temperatures of many liquids of the same components: the arithmetic of `bubblePoint`, for sweeps and sampling.
 * A case that `bubblePoint` would refuse has temperature 0 and a status that says why; the others are not held up.
 *
 * @param input.components names, n of them
 * @param input.composition mole fractions of the liquids, n a case [-]
 * @param input.pressure absolute [Pa], one a case or one for all
 * @returns temperature [K] and status of each case; cautions that hold for the sweep as a whole
 * @throws DesignInputError for unknown components or lists that do not belong together
 *
 * Assumes an ideal liquid under an ideal vapor.
 * Source: F.-M. Raoult, Comptes rendus 104 (1887) 1430 (citation from memory).
 * @example bubblePointSweep({ components: ["benzene", "toluene"], composition: Float64Array.of(0.4, 0.6, 0.5, 0.5), pressure: 101325 }).temperature[0] // 368.3
 */
export function bubblePointSweep(input: BubblePointSweepInput): BubblePointSweep {
  const faults: Issue[] = [];
  const fields = readFields(faults, "input", input, known);
  if (fields === undefined) throw new DesignInputError(faults);
  const ownComponents = readOwnComponents(faults, "ownComponents", fields["ownComponents"]);
  const list = readComponentList(faults, fields["components"], ownComponents);
  const composition = readCaseFractions(faults, fields["composition"], list?.names.length);
  const pressure = readCasePressures(faults, fields["pressure"], composition, list?.names.length);
  refuseIfFaulty(faults);
  const { names, components } = list!;
  const sweep: Sweep = {
    table: compileVaporPressures(components),
    criticalTemperature: Float64Array.from(components, (c) => criticalTemperatureOf(c) ?? Infinity),
    criticalPressure: Float64Array.from(components, (c) => criticalPressureOf(c) ?? Infinity),
  };
  const { temperature, status, extremes } = solveCases(sweep, composition!, pressure!);
  const equal = new Float64Array(names.length).fill(1 / names.length);
  const judged = judgeIdealMixture(
    { names, components, fractions: equal },
    extremes.pressure,
    extremes.temperatures,
  );
  return { kind: "bubblePointSweep", temperature, status, ...judged };
}

/** The highest pressure and the range of temperatures among the cases answered. */
interface Extremes {
  readonly pressure: number;
  readonly temperatures: readonly number[];
}

function solveCases(
  sweep: Sweep,
  composition: Float64Array,
  pressure: Float64Array,
): { temperature: Float64Array; status: Uint8Array; extremes: Extremes } {
  const n = sweep.table.count;
  const cases = composition.length / n;
  const temperature = new Float64Array(cases);
  const status = new Uint8Array(cases);
  const z = new Float64Array(n);
  const last = pressure.length - 1;
  let [coldest, hottest, highest] = [Infinity, 0, 0];
  for (let i = 0; i < cases; i++) {
    const p = pressure[i < last ? i : last]!;
    let code = readCase(composition, i * n, z) || checkPressure(sweep, z, p);
    if (code === 0) {
      const t = saturationTemperature(sweep.table, z, Math.log(p), 0);
      code = checkTemperature(sweep, z, t);
      if (code === 0) {
        temperature[i] = t;
        if (t < coldest) coldest = t;
        if (t > hottest) hottest = t;
        if (p > highest) highest = p;
      }
    }
    status[i] = code;
  }
  const temperatures = hottest === 0 ? [] : [coldest, hottest];
  return { temperature, status, extremes: { pressure: highest, temperatures } };
}

/** Copies the fractions of one case, scaled to add up to 1 exactly; gives the status. */
function readCase(composition: Float64Array, at: number, z: Float64Array): number {
  let sum = 0;
  let least = 0;
  for (let i = 0; i < z.length; i++) {
    const fraction = composition[at + i]!;
    z[i] = fraction;
    sum += fraction;
    if (fraction < least) least = fraction;
  }
  if (!(Math.abs(sum) < Infinity)) return notFinite;
  if (least < 0) return fractionOutOfRange;
  if (Math.abs(sum - 1) > sumTolerance) return compositionSum;
  for (let i = 0; i < z.length; i++) z[i] = z[i]! / sum;
  return 0;
}

function checkPressure({ criticalPressure }: Sweep, z: Float64Array, p: number): number {
  if (!(Math.abs(p) < Infinity)) return notFinite;
  if (!(p > 0)) return pressureNotPositive;
  if (p < leastBarePressure) return implausible;
  for (let i = 0; i < z.length; i++) if (z[i] !== 0 && p <= criticalPressure[i]!) return 0;
  return aboveCritical;
}

function checkTemperature({ criticalTemperature }: Sweep, z: Float64Array, t: number): number {
  if (Number.isNaN(t)) return noPressure;
  for (let i = 0; i < z.length; i++) if (z[i] !== 0 && t > criticalTemperature[i]!) return aboveCritical;
  return 0;
}
