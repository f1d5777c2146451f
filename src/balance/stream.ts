import { type ByComponent, byName } from "../base/result";
import type { Component } from "../components/component";

/** A stream of a result: what flows, of what, in which state. Mass figures whenever all molar masses are known. */
export interface Stream {
  /** [mol/s] */
  readonly flow: number;
  /** [kg/s] */
  readonly massFlow?: number;
  /** [kg/mol] */
  readonly molarMass?: number;
  /** Mole fractions. */
  readonly composition: ByComponent;
  /** Mass fractions. */
  readonly massComposition?: ByComponent;
  /** [K] */
  readonly temperature?: number;
  /** Absolute [Pa]. */
  readonly pressure?: number;
  /** Moles of vapor per mole [-]. */
  readonly vaporFraction?: number;
}

/** State of a stream, as far as known. */
export type StreamState = Pick<Stream, "temperature" | "pressure" | "vaporFraction">;

/** Builds a stream from its molar flow [mol/s] and mole fractions, in the order of the names. */
export function stream(
  names: readonly string[],
  flow: number,
  fractions: Float64Array,
  components?: readonly Component[],
  state?: StreamState,
): Stream {
  const composition = byName(names, fractions);
  return { flow, ...massOf(names, flow, fractions, components), composition, ...state };
}

function massOf(
  names: readonly string[],
  flow: number,
  fractions: Float64Array,
  components: readonly Component[] | undefined,
): Pick<Stream, "massFlow" | "molarMass" | "massComposition"> {
  const molarMass = components && meanMolarMass(components, fractions);
  if (molarMass === undefined || components === undefined) return {};
  const masses = fractions.map((x, i) => (x === 0 ? 0 : (x * components[i]!.molarMass!) / molarMass));
  return { massFlow: flow * molarMass, molarMass, massComposition: byName(names, masses) };
}

/** Mean molar mass [kg/mol] of a mixture; undefined when that of a component present is not known. */
export function meanMolarMass(components: readonly Component[], fractions: Float64Array): number | undefined {
  let sum = 0;
  for (let i = 0; i < fractions.length; i++) {
    if (fractions[i] !== 0) sum += fractions[i]! * (components[i]!.molarMass ?? Number.NaN);
  }
  return Number.isNaN(sum) ? undefined : sum;
}
