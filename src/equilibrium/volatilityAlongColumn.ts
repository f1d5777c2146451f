import type { Issue } from "../base/errors";
import type { Caution } from "../base/result";
import { sources } from "../base/source";
import { type IdealMixture, type PhaseState, stateAtPressure } from "./phaseState";
import { volatilities } from "./relativeVolatility";
import type { Origin } from "./validity";

/** Where in a column the volatilities are taken; fractions in the order of the mixture, pressures [Pa]. */
export interface ColumnEnds {
  readonly distillate: Float64Array;
  readonly bottoms: Float64Array;
  readonly topPressure: number;
  readonly feedPressure: number;
  readonly bottomPressure: number;
  /** Vapor fraction of the feed on its stage, 0 to 1. */
  readonly feedVaporFraction: number;
  readonly lightKey: number;
  readonly heavyKey: number;
}

/** A temperature [K] and the volatilities relative to the heavy key there, in the order of the mixture. */
export interface ColumnPoint {
  readonly temperature: number;
  readonly values: Float64Array;
}

/** Volatilities down a column. */
export interface ColumnVolatilities {
  /** At the dew point of the distillate. */
  readonly top: ColumnPoint;
  /** Where the feed holds its vapor fraction: its bubble point when it is a liquid. */
  readonly feed: ColumnPoint;
  /** At the bubble point of the bottoms. */
  readonly bottom: ColumnPoint;
  /** Geometric mean of top and bottom [-]. */
  readonly mean: Float64Array;
  readonly cautions: readonly Caution[];
}

/**
 * Volatilities at the top, the feed and the bottom of a column and their geometric mean, with a caution when that of
 * the light key drifts so far that a constant one is doubtful. Undefined after a reported fault.
 */
export function volatilityAlongColumn(
  faults: Issue[],
  mixture: IdealMixture,
  column: ColumnEnds,
  origin: Origin,
): ColumnVolatilities | undefined {
  const { distillate, bottoms, heavyKey, lightKey } = column;
  const at = (fractions: Float64Array, pressure: number, vaporFraction: number): PhaseState | undefined =>
    stateAtPressure(faults, { ...mixture, fractions }, pressure, vaporFraction, origin);
  const states = [
    at(distillate, column.topPressure, 1),
    at(mixture.fractions, column.feedPressure, column.feedVaporFraction),
    at(bottoms, column.bottomPressure, 0),
  ];
  if (states.includes(undefined)) return undefined;
  const [top, feed, bottom] = states.map((state) => pointOf(state!, heavyKey));
  const mean = top!.values.map((value, i) => Math.sqrt(value * bottom!.values[i]!));
  const cautions = driftCautions(top!.values[lightKey]!, bottom!.values[lightKey]!);
  return { top: top!, feed: feed!, bottom: bottom!, mean, cautions };
}

function pointOf(state: PhaseState, heavyKey: number): ColumnPoint {
  return { temperature: state.temperature, values: volatilities(state.kValues, heavyKey) };
}

const largestDrift = 1.3;
const farthestDrift = 2;

/** What a change of the light key's volatility from top to bottom means for methods with a constant one. */
export function driftCautions(top: number, bottom: number): Caution[] {
  const ratio = top / bottom;
  const drift = Math.max(ratio, 1 / ratio);
  if (drift <= largestDrift) return [];
  const far = drift > farthestDrift;
  const advice = far
    ? "a constant mean is not to be relied on; use Winn's method or count stage by stage"
    : "a constant mean is approximate; check stage by stage";
  return [
    {
      code: "volatility-drift",
      severity: "check",
      kind: "method",
      message: `the light key's relative volatility is ${top.toPrecision(4)} at the top and ${bottom.toPrecision(4)} at the bottom, a ratio of ${ratio.toPrecision(3)}: ${advice}`,
      value: ratio,
      limit: far ? farthestDrift : largestDrift,
      source: sources.commonPractice,
    },
  ];
}
