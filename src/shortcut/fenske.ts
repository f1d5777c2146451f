import { readFields } from "../base/check";
import { DesignInputError, type Issue, refuseIfFaulty } from "../base/errors";
import { byName, type ByComponent, type Judged } from "../base/result";
import { method } from "../base/source";
import { readSplit, refuseReversedSplit, type SplitInput } from "../balance/split";
import { solveFenske } from "./fenskeSplit";
import { loadSplit } from "./loadSplit";

/** What `fenske` takes. */
export type FenskeInput = SplitInput;

/** What `fenske` gives. */
export interface FenskeResult extends Judged {
  readonly kind: "fenske";
  /** Equilibrium stages at total reflux, the reboiler (and a partial condenser) included [-]. */
  readonly minimumStages: number;
  /** Fraction of each component of the feed that leaves in the distillate at total reflux [-]. */
  readonly distillateRecovery: ByComponent;
}

const fields: ReadonlySet<string> = new Set<keyof FenskeInput>([
  "composition",
  "relativeVolatility",
  "lightKey",
  "heavyKey",
  "lightKeyRecovery",
  "heavyKeyRecovery",
  "normalize",
]);

const methods = [
  method("Fenske minimum stages", "fenske1932"),
  method("Hengstebeck-Geddes distribution of the other components", "hengstebeck1946"),
];

/**
 * Minimum number of equilibrium stages, at total reflux, and how every component then splits.
 *
 *   Nmin = ln[(d_LK / b_LK)(b_HK / d_HK)] / ln(α_LK / α_HK)
 *   dᵢ / bᵢ = (d_HK / b_HK) αᵢ^Nmin,   αᵢ relative to the heavy key
 *
 * Takes the composition (mole fractions), the relative volatilities over any common reference, the two keys and the
 * fraction of each that is recovered: the light key in the distillate, the heavy key in the bottoms. Stages include
 * the reboiler and a partial condenser. Assumes a constant relative volatility; the split at a finite reflux is near
 * to this one for the components beside the keys, less so for one between them.
 *
 * Source: M. R. Fenske, Ind. Eng. Chem. 24 (1932) 482; R. J. Hengstebeck, Trans. AIChE 42 (1946) 309.
 *
 * @throws DesignInputError for a composition that does not add up to 1, names without a volatility, keys that are
 * absent, equal or reversed, recoveries outside 0 to 1
 * @throws DesignInfeasibleError when the recoveries would not enrich the light key
 * @example fenske({ composition: { a: 0.5, b: 0.5 }, relativeVolatility: { a: 2.25, b: 1 }, lightKey: "a", heavyKey: "b", lightKeyRecovery: 0.99, heavyKeyRecovery: 0.99 }).minimumStages // 11.333
 */
export function fenske(input: FenskeInput): FenskeResult {
  const faults: Issue[] = [];
  const given = readFields(faults, "input", input, fields);
  if (given === undefined) throw new DesignInputError(faults);
  const split = readSplit(faults, given);
  refuseIfFaulty(faults);
  refuseReversedSplit(split!);
  const w = loadSplit(split!);
  solveFenske(w);
  const recoveries = new Float64Array(w.count);
  for (let place = 0; place < w.count; place++) recoveries[w.order[place]!] = w.recovery[place]!;
  return {
    kind: "fenske",
    minimumStages: w.minimumStages,
    distillateRecovery: byName(split!.names, recoveries),
    cautions: [],
    methods,
  };
}
