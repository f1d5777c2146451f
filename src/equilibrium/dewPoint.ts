import { saturatedPoint } from "./saturatedPoint";
import type { StateInput } from "./equilibriumInput";
import type { Equilibrium } from "./equilibriumResult";

/** A vapor that begins to condense and its first liquid. */
export interface DewPoint extends Equilibrium {
  readonly kind: "dewPoint";
}

/**
 * Dew point of a vapor of the given composition: the temperature at a pressure, or the pressure at a temperature, at
 * which its first liquid forms.
 *
 *   sum(y_i P/P_i(T)) = 1,  x_i = y_i/K_i,  K_i = P_i(T)/P     Raoult's law
 *
 * @param input.composition mole fractions of the vapor [-]
 * @param input.pressure absolute pressure [Pa or text with a unit]; or
 * @param input.temperature [K or text with a unit]: exactly one of the two
 * @returns temperature [K], pressure [Pa], liquid, vapor and K-values by component name
 * @throws DesignInputError as `bubblePoint`
 *
 * Assumes an ideal liquid under an ideal vapor; the cautions say where that is known or likely to be wrong.
 * Source: F.-M. Raoult, Comptes rendus 104 (1887) 1430 (citation from memory).
 * @example dewPoint({ composition: { benzene: 0.4, toluene: 0.6 }, pressure: "1 atm" }).temperature // 374.6
 */
export function dewPoint(input: StateInput): DewPoint {
  return { kind: "dewPoint", ...saturatedPoint(input, 1) };
}
