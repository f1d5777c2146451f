import { saturatedPoint } from "./saturatedPoint";
import type { StateInput } from "./equilibriumInput";
import type { Equilibrium } from "./equilibriumResult";

/** A boiling liquid and its first vapor. */
export interface BubblePoint extends Equilibrium {
  readonly kind: "bubblePoint";
}

/**
 * Bubble point of a liquid of the given composition: the temperature at a pressure, or the pressure at a temperature,
 * at which its first vapor forms.
 *
 *   sum(x_i P_i(T)) = P,  y_i = K_i x_i,  K_i = P_i(T)/P       Raoult's law
 *
 * @param input.composition mole fractions of the liquid [-]
 * @param input.pressure absolute pressure [Pa or text with a unit]; or
 * @param input.temperature [K or text with a unit]: exactly one of the two
 * @returns temperature [K], pressure [Pa], liquid, vapor and K-values by component name
 * @throws DesignInputError for a wrong input; `above-critical` when a component that is present is above its critical
 * temperature, or the pressure above every critical pressure; `vapor-pressure-undefined` where an equation has no value
 *
 * Assumes an ideal liquid under an ideal vapor; the cautions say where that is known or likely to be wrong.
 * Source: F.-M. Raoult, Comptes rendus 104 (1887) 1430 (citation from memory).
 * @example bubblePoint({ composition: { benzene: 0.4, toluene: 0.6 }, pressure: "1 atm" }).temperature // 368.3
 */
export function bubblePoint(input: StateInput): BubblePoint {
  return { kind: "bubblePoint", ...saturatedPoint(input, 0) };
}
