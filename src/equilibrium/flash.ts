import { type Fields, type Limits, readNumber } from "../base/check";
import { DesignInputError, type Issue, refuseIfFaulty } from "../base/errors";
import { collectMethods, sortCautions } from "../base/result";
import { method } from "../base/source";
import { mixtureFields, readMixtureInput, readStateVariable, type StateInput } from "./equilibriumInput";
import { type Equilibrium, equilibriumOf } from "./equilibriumResult";
import {
  type IdealMixture,
  idealMixture,
  type PhaseState,
  stateAt,
  stateAtPressure,
  stateAtTemperature,
} from "./phaseState";
import type { Mixture } from "./mixture";
import { type Phase, phaseOf } from "./phaseSplit";
import { indeterminateSplit } from "./rachfordRice";

/** A mixture with exactly two of temperature, pressure and vapor fraction. */
export interface FlashInput extends StateInput {
  /** Moles of vapor per mole of mixture, 0 to 1 [-]. */
  readonly vaporFraction?: number;
}

/** The phases of a flashed mixture. */
export interface Flash extends Equilibrium {
  readonly kind: "flash";
  /** Moles of vapor per mole of mixture [-]. */
  readonly vaporFraction: number;
  readonly phase: Phase;
}

const known = new Set<string>([...mixtureFields, "pressure", "temperature", "vaporFraction"]);
const variables = ["temperature", "pressure", "vaporFraction"] as const;
type Variable = (typeof variables)[number];

/** Limits of a molar vapor fraction. */
export const vaporFractionLimits: Limits = {
  atLeast: 0,
  atMost: 1,
  code: "fraction-out-of-range",
  hint: "0 is all liquid, 1 all vapor",
};

/**
 * Equilibrium flash of a mixture by Raoult's law, from any two of temperature, pressure and vapor fraction.
 *
 *   sum(z_i (K_i - 1)/(1 + V (K_i - 1))) = 0,  K_i = P_i(T)/P,  x_i = z_i/(1 + V (K_i - 1)),  y_i = K_i x_i
 *
 * A mixture below its bubble point answers phase "liquid" with vapor fraction 0, one above its dew point "vapor" with
 * 1; the composition given for the absent phase is then that of its first trace. Vapor fractions of exactly 0 and 1
 * are the bubble and the dew point.
 *
 * @param input.composition mole fractions of the whole [-]
 * @param input.temperature [K or text with a unit]
 * @param input.pressure absolute pressure [Pa or text with a unit]
 * @param input.vaporFraction 0 to 1 [-]
 * @returns temperature [K], pressure [Pa], vapor fraction, phase, liquid, vapor and K-values by component name
 * @throws DesignInputError for a wrong input, or as `bubblePoint` where Raoult's law has no answer
 *
 * Assumes an ideal liquid under an ideal vapor; the cautions say where that is known or likely to be wrong.
 * Source: H. H. Rachford and J. D. Rice, J. Pet. Technol. 4(10) (1952) 19.
 * @example flash({ composition: { benzene: 0.5, toluene: 0.3, "p-xylene": 0.2 }, temperature: 372, pressure: "1 atm" }).vaporFraction // 0.367
 */
export function flash(input: FlashInput): Flash {
  const faults: Issue[] = [];
  const { fields, mixture } = readMixtureInput(faults, input, known);
  const given = readTwoOfThree(faults, fields, mixture);
  refuseIfFaulty(faults);
  const compiled = idealMixture(mixture!);
  const state = solve(faults, compiled, given, fields);
  if (state === undefined) throw new DesignInputError(faults);
  const { vaporFraction } = state;
  const equilibrium = equilibriumOf(compiled, state);
  const split =
    given.vaporFraction === undefined ? indeterminateSplit(compiled.fractions, state.kValues) : [];
  return {
    kind: "flash",
    phase: phaseOf(vaporFraction),
    vaporFraction,
    ...equilibrium,
    cautions: sortCautions(equilibrium.cautions, split),
    methods: collectMethods([method("Rachford-Rice flash", "rachfordRice1952")], equilibrium.methods),
  };
}

type Given = { readonly [V in Variable]?: number };

function readTwoOfThree(faults: Issue[], fields: Fields, mixture: Mixture | undefined): Given {
  const named = variables.filter((name) => fields[name] !== undefined);
  if (named.length !== 2) {
    const got = named.length === 0 ? "none" : named.join(", ");
    const message = `flash needs exactly two of ${variables.join(", ")}, got ${got}`;
    faults.push({ code: "conflicting-fields", path: named[0] ?? "temperature", message, value: named });
  }
  const given: { [V in Variable]?: number } = {};
  for (const name of named) {
    given[name] =
      name === "vaporFraction"
        ? readNumber(faults, name, fields[name], vaporFractionLimits)
        : readStateVariable(faults, fields, name, mixture);
  }
  return given;
}

function solve(faults: Issue[], mixture: IdealMixture, given: Given, typed: Fields): PhaseState | undefined {
  const { temperature, pressure, vaporFraction } = given;
  const ofTemperature = { path: "temperature", typed: typed["temperature"] };
  const ofPressure = { path: "pressure", typed: typed["pressure"] };
  if (temperature === undefined)
    return stateAtPressure(faults, mixture, pressure!, vaporFraction!, ofPressure);
  if (pressure === undefined)
    return stateAtTemperature(faults, mixture, temperature, vaporFraction!, ofTemperature);
  return stateAt(faults, mixture, temperature, pressure, ofTemperature, ofPressure);
}
