import { readExactlyOne } from "../base/check";
import { DesignInputError, type Issue, refuseIfFaulty } from "../base/errors";
import { type ByComponent, byName, type Judged } from "../base/result";
import { mixtureFields, readMixtureInput, readStateVariable, type StateInput } from "./equilibriumInput";
import { findMember } from "./mixture";
import { type IdealMixture, idealMixture, stateAtPressure, stateAtTemperature } from "./phaseState";
import { judgeIdealMixture } from "./raoultGuard";
import { type Origin, refuseTemperature } from "./validity";

/** A liquid with the component to which volatilities refer, at a temperature or at its bubble point. */
export interface RelativeVolatilityInput extends StateInput {
  /** The component whose volatility is 1. */
  readonly heavyKey: string;
}

/** Volatilities of a mixture's components relative to one of them. */
export interface RelativeVolatility extends Judged {
  readonly kind: "relativeVolatility";
  readonly heavyKey: string;
  /** K_i/K_heavyKey [-] */
  readonly values: ByComponent;
  readonly kValues: ByComponent;
  /** [K] */
  readonly temperature: number;
  /** Absolute, of the bubble point [Pa]. */
  readonly pressure: number;
}

const known = new Set<string>([...mixtureFields, "pressure", "temperature", "heavyKey"]);

/**
 * Volatility of every component relative to the heavy key, at a temperature, or at the bubble point of the composition
 * under a pressure.
 *
 *   alpha_i = K_i/K_heavyKey = P_i(T)/P_heavyKey(T)        Raoult's law
 *
 * @param input.composition mole fractions of the liquid [-]
 * @param input.heavyKey name of the reference component
 * @param input.pressure absolute pressure [Pa or text with a unit]; or
 * @param input.temperature [K or text with a unit]: exactly one of the two
 * @returns volatilities [-], K-values, temperature [K] and pressure [Pa] of the bubble point
 * @throws DesignInputError for a wrong input, or as `bubblePoint` where Raoult's law has no answer
 *
 * Assumes an ideal liquid under an ideal vapor; the cautions say where that is known or likely to be wrong.
 * Source: F.-M. Raoult, Comptes rendus 104 (1887) 1430 (citation from memory).
 * @example relativeVolatility({ composition: { benzene: 0.5, toluene: 0.5 }, heavyKey: "toluene", temperature: 370 }).values.benzene // 2.452
 */
export function relativeVolatility(input: RelativeVolatilityInput): RelativeVolatility {
  const faults: Issue[] = [];
  const { fields, mixture, ownComponents } = readMixtureInput(faults, input, known);
  const given = readExactlyOne(faults, "input", fields, ["pressure", "temperature"]);
  const value = given === undefined ? Number.NaN : readStateVariable(faults, fields, given, mixture);
  const heavy =
    mixture === undefined ? -1 : findMember(faults, "heavyKey", fields["heavyKey"], mixture, ownComponents);
  refuseIfFaulty(faults);
  const compiled = idealMixture(mixture!);
  const solve = given === "pressure" ? stateAtPressure : stateAtTemperature;
  const origin = { path: given!, typed: fields[given!] };
  const state = solve(faults, compiled, value, 0, origin);
  if (state !== undefined) refuseReference(faults, compiled, heavy, state.temperature, origin);
  if (state === undefined || faults.length > 0) throw new DesignInputError(faults);
  const { temperature, pressure, kValues } = state;
  return {
    kind: "relativeVolatility",
    heavyKey: compiled.names[heavy]!,
    values: byName(compiled.names, volatilities(kValues, heavy)),
    kValues: byName(compiled.names, kValues),
    temperature,
    pressure,
    ...judgeIdealMixture(compiled, pressure, [temperature]),
  };
}

/** The reference needs a vapor pressure even where there is none of it in the liquid. */
function refuseReference(
  faults: Issue[],
  { names, components, table }: IdealMixture,
  heavy: number,
  temperature: number,
  origin: Origin,
): void {
  const alone = {
    names: [names[heavy]!],
    components: [components[heavy]!],
    fractions: Float64Array.of(1),
  };
  refuseTemperature(faults, alone, temperature, table.logPressure.subarray(heavy, heavy + 1), origin);
}

/** K-values over that of the component at `reference`. */
export function volatilities(kValues: Float64Array, reference: number): Float64Array {
  const k = kValues[reference]!;
  return kValues.map((value) => value / k);
}
