import { readFields, readNumber } from "../base/check";
import { DesignInputError, type Issue, refuseIfFaulty } from "../base/errors";
import { byName, type ByComponent, type Judged } from "../base/result";
import { method } from "../base/source";
import { readSplit, refuseReversedSplit, type Split, type SplitInput } from "../balance/split";
import { distributingNames } from "./distributingNames";
import { loadSplit } from "./loadSplit";
import { solveLimits } from "./shortcutKernel";
import type { ShortcutWorkspace } from "./shortcutWorkspace";
import { singleRootReflux } from "./singleRootReflux";
import { traceRecovery } from "./traceRecovery";
import { judgeMinimumReflux } from "./underwoodCautions";
import { rootsOf } from "./underwoodRoots";

/** What `underwood` takes. */
export interface UnderwoodInput extends SplitInput {
  /** Liquid fraction of the feed [-]: 1 saturated liquid, 0 saturated vapor, above 1 subcooled, below 0 superheated. */
  readonly q: number;
}

/** What `underwood` gives. */
export interface UnderwoodResult extends Judged {
  readonly kind: "underwood";
  /** Minimum of the external reflux ratio L/D [-]. */
  readonly minimumReflux: number;
  /** Every root of the feed equation between two neighboring volatilities [-], relative to the heavy key, falling. */
  readonly roots: readonly number[];
  /** The roots that bind at minimum reflux [-], falling. */
  readonly activeRoots: readonly number[];
  /** Components other than the keys that reach both products at minimum reflux, as the volatilities fall. */
  readonly distributing: readonly string[];
  /** Fraction of each component of the feed that leaves in the distillate at minimum reflux [-]. */
  readonly distillateRecovery: ByComponent;
  /** Vapor of the rectifying section at minimum reflux [mol per mol of feed]. */
  readonly minimumVapor: number;
  /** Reflux from each root between the keys alone, with the Fenske distillate [-], in the order of the roots. */
  readonly singleRootReflux: readonly number[];
}

const fields: ReadonlySet<string> = new Set<keyof UnderwoodInput>([
  "composition",
  "relativeVolatility",
  "q",
  "lightKey",
  "heavyKey",
  "lightKeyRecovery",
  "heavyKeyRecovery",
  "normalize",
]);

/** No real feed comes near: superheated by 100 heats of vaporization, or subcooled by as much. */
export const liquidFractionLimits = {
  atLeast: -100,
  atMost: 100,
  hint: "q is the liquid fraction of the feed: 1 saturated liquid, 0 saturated vapor",
} as const;

const methods = [
  method("Underwood minimum reflux, distributing components solved together", "underwood1948"),
  method("Class of the separation (which components distribute)", "shiras1950"),
];

/**
 * Minimum reflux of a column with infinitely many stages, all components that distribute solved together.
 *
 *   Σ αᵢ zᵢ / (αᵢ − θ) = 1 − q                        one root θ between each two neighboring volatilities
 *   Σ αᵢ dᵢ / (αᵢ − θ) = V   at each active root,     < V at every other;   Rmin = V / D − 1
 *
 * The active roots are those between neighbors that both distribute; the distributing components are the keys, all
 * between them, and as many beside them as it takes for no root to ask for more than V. Takes mole fractions, relative
 * volatilities over any common reference, the liquid fraction q of the feed (−100 to 100), the two keys and their
 * recoveries. Volatilities within 1e-6 of one another count as one; absent components have no root, their recovery
 * is that of a trace. Assumes constant relative volatility and constant molar overflow. Where a flow would vanish
 * first (superheated feed, richly subcooled feed), the value is still Underwood's, with a caution.
 *
 * Source: A. J. V. Underwood, Chem. Eng. Prog. 44 (1948) 603; R. N. Shiras, D. N. Hanson and C. H. Gibson,
 * Ind. Eng. Chem. 42 (1950) 871.
 *
 * @throws DesignInputError as `fenske`, and for q out of range
 * @throws DesignInfeasibleError when the recoveries would not enrich the light key
 * @example underwood({ composition: { a: 0.5, b: 0.5 }, relativeVolatility: { a: 2.5, b: 1 }, q: 1, lightKey: "a", heavyKey: "b", lightKeyRecovery: 0.95, heavyKeyRecovery: 0.95 }).minimumReflux // 1.1
 */
export function underwood(input: UnderwoodInput): UnderwoodResult {
  const faults: Issue[] = [];
  const given = readFields(faults, "input", input, fields);
  if (given === undefined) throw new DesignInputError(faults);
  const split = readSplit(faults, given);
  const q = readNumber(faults, "q", given["q"], liquidFractionLimits);
  refuseIfFaulty(faults);
  refuseReversedSplit(split!);
  const w = loadSplit(split!);
  w.q = q;
  solveLimits(w);
  return describe(w, split!);
}

function describe(w: ShortcutWorkspace, split: Split): UnderwoodResult {
  const recoveries = new Float64Array(w.count);
  for (let place = 0; place < w.count; place++) {
    const c = w.classOf[place]!;
    recoveries[w.order[place]!] = c < 0 ? traceRecovery(w, w.volatility[place]!) : w.classRecovery[c]!;
  }
  const roots = rootsOf(w);
  const distributing = distributingNames(w, split.names);
  const single: number[] = [];
  for (let k = w.lightClass; k < w.heavyClass; k++) single.push(singleRootReflux(w, k));
  return {
    kind: "underwood",
    minimumReflux: w.minimumReflux,
    roots,
    activeRoots: roots.slice(w.firstDistributing, w.lastDistributing),
    distributing,
    distillateRecovery: byName(split.names, recoveries),
    minimumVapor: w.minimumVapor,
    singleRootReflux: single,
    cautions: judgeMinimumReflux(w, distributing, single),
    methods,
  };
}
