import { type Fields, readFields, readFlag, readNumber } from "../base/check";
import { readComposition } from "../base/composition";
import { DesignInputError, type Issue, refuseIfFaulty } from "../base/errors";
import { type ByComponent, byName, type Caution, type Judged } from "../base/result";
import { method } from "../base/source";
import { type Phase, phaseOf, splitPhases } from "./phaseSplit";

/** A mixture with K-values; the names are free labels. */
export interface RachfordRiceInput {
  /** Mole fractions of the whole by name; they add up to 1 unless `normalize` is given. */
  readonly composition: ByComponent;
  /** K_i = y_i/x_i by the same names. */
  readonly kValues: ByComponent;
  /** Scale the composition to the sum of 1. */
  readonly normalize?: boolean;
}

/** The phases that K-values give. */
export interface RachfordRice extends Judged {
  readonly kind: "rachfordRice";
  /** Moles of vapor per mole of mixture [-]. */
  readonly vaporFraction: number;
  readonly phase: Phase;
  readonly liquid: ByComponent;
  readonly vapor: ByComponent;
}

const known = new Set(["composition", "kValues", "normalize"]);
const kLimits = { above: 0, code: "volatility-not-positive" } as const;
const plausible = { atLeast: 1e-100, atMost: 1e100 } as const;

/**
 * Splits a mixture into liquid and vapor by given K-values.
 *
 *   sum(z_i (K_i - 1)/(1 + V (K_i - 1))) = 0,  x_i = z_i/(1 + V (K_i - 1)),  y_i = K_i x_i
 *
 * Solved on (V - V_low)(V_high - V) times the sum, V_low = -1/(K_max - 1), V_high = 1/(1 - K_min), which has no poles.
 * sum(z K) <= 1 is a liquid (vapor fraction 0), sum(z/K) <= 1 a vapor (1); the composition given for the absent phase
 * is then that of its first trace. Components of zero fraction take no part.
 *
 * @param input.composition mole fractions of the whole [-]
 * @param input.kValues K-values [-], above 0
 * @returns vapor fraction [-], phase, liquid and vapor mole fractions
 * @throws DesignInputError for a wrong input
 *
 * Sources: H. H. Rachford and J. D. Rice, J. Pet. Technol. 4(10) (1952) 19; C. F. Leibovici and J. Neoschil, Fluid
 * Phase Equilib. 74 (1992) 303.
 * @example rachfordRice({ composition: { a: 0.5, b: 0.3, c: 0.2 }, kValues: { a: 1.685, b: 0.742, c: 0.532 } }).vaporFraction // 0.69073026
 */
export function rachfordRice(input: RachfordRiceInput): RachfordRice {
  const faults: Issue[] = [];
  const fields = readFields(faults, "input", input, known);
  if (fields === undefined) throw new DesignInputError(faults);
  const normalize = readFlag(faults, "normalize", fields["normalize"]);
  const named = readComposition(faults, "composition", fields["composition"], normalize);
  const kValues = readKValues(faults, fields["kValues"], named?.names);
  refuseIfFaulty(faults);
  const { names, fractions } = named!;
  const liquid = new Float64Array(names.length);
  const vapor = new Float64Array(names.length);
  const vaporFraction = splitPhases(fractions, kValues!, liquid, vapor);
  return {
    kind: "rachfordRice",
    vaporFraction,
    phase: phaseOf(vaporFraction),
    liquid: byName(names, liquid),
    vapor: byName(names, vapor),
    cautions: indeterminateSplit(fractions, kValues!),
    methods: [
      method("Rachford-Rice flash", "rachfordRice1952"),
      method("solution without poles", "leiboviciNeoschil1992"),
    ],
  };
}

function readKValues(
  faults: Issue[],
  value: unknown,
  names: readonly string[] | undefined,
): Float64Array | undefined {
  const fields: Fields | undefined = readFields(faults, "kValues", value, names && new Set(names));
  if (fields === undefined || names === undefined) return undefined;
  const kValues = new Float64Array(names.length);
  names.forEach((name, i) => {
    const path = `kValues.${name}`;
    const k = readNumber(faults, path, fields[name], kLimits);
    kValues[i] = Number.isNaN(k) ? k : readNumber(faults, path, k, plausible);
  });
  return kValues;
}

/** Of one volatility throughout, at its boiling point: every vapor fraction is a solution. */
export function indeterminateSplit(z: Float64Array, kValues: Float64Array): Caution[] {
  let farthest = 0;
  for (let i = 0; i < z.length; i++) {
    if (z[i] !== 0) farthest = Math.max(farthest, Math.abs(kValues[i]! - 1));
  }
  if (farthest > 1e-9) return [];
  const message =
    "all K-values are 1: temperature and pressure do not set the vapor fraction; give it instead";
  return [
    {
      code: "vapor-fraction-indeterminate",
      severity: "check",
      kind: "method",
      message,
      value: farthest,
      limit: 1e-9,
    },
  ];
}
