import { solveFenske } from "./fenskeSplit";
import { molokanov, refluxCoordinate, stagesFrom } from "./gillilandCorrelations";
import { kirkbrideRatio } from "./kirkbrideRatio";
import { solveMinimumReflux, vanishingFlowReflux } from "./minimumReflux";
import type { ShortcutWorkspace } from "./shortcutWorkspace";
import { underwoodRootsInto } from "./underwoodRoots";
import { groupByVolatility } from "./volatilityClasses";

/**
 * The limits of the case in the workspace: Underwood's roots and exact minimum reflux, Fenske's minimum stages and
 * split. The results are left in the workspace; nothing is allocated.
 */
export function solveLimits(w: ShortcutWorkspace): void {
  groupByVolatility(w);
  underwoodRootsInto(w);
  solveMinimumReflux(w);
  solveFenske(w);
}

/** The reflux that a column must exceed: Underwood's, or the larger one at which a flow vanishes. */
export function leastReflux(w: ShortcutWorkspace): number {
  return Math.max(w.minimumReflux, vanishingFlowReflux(w));
}

/** Stages by Gilliland (Molokanov's form) at a reflux ratio above the given minimum. */
export function gillilandStages(w: ShortcutWorkspace, minimumReflux: number, refluxRatio: number): number {
  return stagesFrom(w.minimumStages, molokanov(refluxCoordinate(minimumReflux, refluxRatio)));
}

/** Kirkbride's rectifying stages out of `stages`, with the Fenske products. */
export function rectifyingStages(w: ShortcutWorkspace, stages: number): number {
  const { fraction, distillate, bottoms, lightKey, heavyKey, distillateFlow, bottomsFlow } = w;
  const impurities = (bottoms[lightKey]! * distillateFlow) / (distillate[heavyKey]! * bottomsFlow);
  const ratio = kirkbrideRatio(
    fraction[heavyKey]! / fraction[lightKey]!,
    impurities,
    bottomsFlow / distillateFlow,
  );
  return stages - stages / (1 + ratio);
}
