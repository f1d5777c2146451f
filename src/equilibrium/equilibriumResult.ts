import { type ByComponent, byName, type Judged } from "../base/result";
import type { IdealMixture, PhaseState } from "./phaseState";
import { judgeIdealMixture } from "./raoultGuard";

/** Two phases in equilibrium, by component name as typed. */
export interface Equilibrium extends Judged {
  /** [K] */
  readonly temperature: number;
  /** Absolute [Pa]. */
  readonly pressure: number;
  /** Mole fractions of the liquid. */
  readonly liquid: ByComponent;
  /** Mole fractions of the vapor. */
  readonly vapor: ByComponent;
  /** K_i = y_i/x_i. */
  readonly kValues: ByComponent;
}

/** A solved state as a result, with what has to be said about Raoult's law in this mixture. */
export function equilibriumOf(mixture: IdealMixture, state: PhaseState): Equilibrium {
  const { temperature, pressure } = state;
  return {
    temperature,
    pressure,
    liquid: byName(mixture.names, state.liquid),
    vapor: byName(mixture.names, state.vapor),
    kValues: byName(mixture.names, state.kValues),
    ...judgeIdealMixture(mixture, pressure, [temperature]),
  };
}
