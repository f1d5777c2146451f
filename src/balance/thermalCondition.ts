import type { Issue } from "../base/errors";
import { type Caution, type Judged, sortCautions } from "../base/result";
import { method } from "../base/source";
import { enthalpyCautions, stateEnthalpy, withoutEnthalpy } from "../equilibrium/enthalpy";
import { type IdealMixture, type PhaseState, stateAtPressure } from "../equilibrium/phaseState";
import { findRoot } from "../numerics/findRoot";
import { feedState, type StatedThermal } from "./feedState";

/** How much of a feed joins the liquid of its stage. */
export interface ThermalCondition extends Judged {
  /** Liquid fraction on the molar-overflow definition [-]. */
  readonly q: number;
}

/** A column pressure this near the feed's, relative, is the same. */
const samePressure = 1e-9;

const byFlash = [method("Thermal condition of the feed by adiabatic flash", "commonPractice")];

/**
 * Thermal condition q of a feed on a stage at `columnPressure` [Pa], from its state at its own pressure by an adiabatic
 * flash: the liquid fraction of what arrives. Beyond the two phases, by heat,
 *
 *   q = 1 + (h_bubble - h_feed)/(h_dew - h_bubble)  subcooled,  q = (h_dew - h_feed)/(h_dew - h_bubble)  superheated
 *
 * with the molar enthalpies of the saturated liquid and vapor of the feed's composition at the column's pressure.
 * Without heat data a single-phase feed is taken as saturated, and a caution says so. Undefined after a reported fault;
 * `at` prefixes the paths of the feed's fields.
 */
export function thermalCondition(
  faults: Issue[],
  at: string,
  mixture: IdealMixture,
  thermal: StatedThermal,
  columnPressure: number,
): ThermalCondition | undefined {
  const feed = feedState(faults, at, mixture, thermal);
  if (feed === undefined) return undefined;
  const { vaporFraction, pressure } = feed;
  const isThere = Math.abs(columnPressure - pressure) <= samePressure * pressure;
  const isSaturated = thermal.given === "vaporFraction" || (vaporFraction > 0 && vaporFraction < 1);
  if (isThere && isSaturated) return { q: 1 - vaporFraction, cautions: [], methods: byFlash };
  const lacking = withoutEnthalpy(mixture);
  if (lacking.length === 0) return adiabaticFlash(faults, mixture, feed, columnPressure);
  const caution = withoutHeatData(lacking, vaporFraction, isSaturated);
  return { q: 1 - vaporFraction, cautions: [caution], methods: byFlash };
}

function adiabaticFlash(
  faults: Issue[],
  mixture: IdealMixture,
  feed: PhaseState,
  columnPressure: number,
): ThermalCondition | undefined {
  const origin = { path: "pressure", typed: columnPressure };
  const bubble = stateAtPressure(faults, mixture, columnPressure, 0, origin);
  const dew = stateAtPressure(faults, mixture, columnPressure, 1, origin);
  if (bubble === undefined || dew === undefined) return undefined;
  const cautions = sortCautions(
    enthalpyCautions(mixture, [feed.temperature, bubble.temperature, dew.temperature]),
    pressureCautions(feed.pressure, columnPressure),
  );
  return { q: liquidFraction(mixture, feed, bubble, dew), cautions, methods: byFlash };
}

/** The liquid fraction of a feed brought to the pressure of the saturated states at its own enthalpy. */
function liquidFraction(
  mixture: IdealMixture,
  feed: PhaseState,
  bubble: PhaseState,
  dew: PhaseState,
): number {
  const of = (state: PhaseState): number => stateEnthalpy(mixture.components, state, bubble.temperature);
  const [ofFeed, ofBubble, ofDew] = [of(feed), of(bubble), of(dew)];
  if (ofFeed <= ofBubble) return 1 + (ofBubble - ofFeed) / (ofDew - ofBubble);
  if (ofFeed >= ofDew) return (ofDew - ofFeed) / (ofDew - ofBubble);
  const excess = (vaporFraction: number): number => {
    const state = stateAtPressure([], mixture, bubble.pressure, vaporFraction, {
      path: "",
      typed: undefined,
    });
    return state === undefined ? Number.NaN : of(state) - ofFeed;
  };
  return 1 - (findRoot(excess, 0, 1, 1e-12) ?? (ofFeed - ofBubble) / (ofDew - ofBubble));
}

function withoutHeatData(lacking: readonly string[], vaporFraction: number, isSaturated: boolean): Caution {
  const q = 1 - vaporFraction;
  const taken = isSaturated
    ? `the liquid fraction at the feed's own pressure, ${q.toPrecision(4)}, is taken`
    : `a saturated ${q === 1 ? "liquid" : "vapor"} is taken, so the true q is ${q === 1 ? "above 1" : "below 0"}`;
  return {
    code: "heat-data-missing",
    severity: "check",
    kind: "data",
    message: `no heat capacity of ${lacking.join(", ")}: ${taken}; give q if you know it`,
    value: q,
  };
}

function pressureCautions(feed: number, column: number): Caution[] {
  if (feed >= column * (1 - samePressure)) return [];
  return [
    {
      code: "feed-pressure-low",
      severity: "check",
      kind: "method",
      message: `the feed's pressure, ${feed.toPrecision(4)} Pa, is below the column's, ${column.toPrecision(4)} Pa: the work of the pump or compressor is not counted`,
      value: feed,
      limit: column,
    },
  ];
}
