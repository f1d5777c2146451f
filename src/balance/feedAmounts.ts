import type { Component } from "../components/component";
import type { Mixture } from "../equilibrium/mixture";
import type { FeedThermal } from "./feedThermal";

/** How much flows, of what: molar flow [mol/s] and mole fractions in the order of the names. */
export interface FeedAmounts {
  readonly names: readonly string[];
  readonly fractions: Float64Array;
  readonly flow: number;
  /** Undefined where names are free labels. */
  readonly components: readonly Component[] | undefined;
}

/** The user's own components, when names are to be looked up; undefined when they are free labels. */
export type NameLookup = readonly Component[] | undefined;

/** No plant is this large [mol/s or kg/s]; keeps every product of a flow finite. */
export const flowLimits = { atMost: 1e12 } as const;

/** A feed as read: amounts in moles, and its thermal condition as given. */
export interface FeedReading extends FeedAmounts {
  readonly name: string | undefined;
  /** The components with their fractions; undefined where names are free labels. */
  readonly mixture: Mixture | undefined;
  readonly thermal: FeedThermal | undefined;
}
