import type { ShortcutWorkspace } from "./shortcutWorkspace";

/** ln of the ratio in which a recovery splits a component. */
function logSplit(recovery: number): number {
  return Math.log(recovery / (1 - recovery));
}

/**
 * Fenske's minimum stages and the split of every component at total reflux: ln(dᵢ/bᵢ) is linear in ln αᵢ through
 * both keys. The smaller of dᵢ and bᵢ keeps its digits.
 */
export function solveFenske(w: ShortcutWorkspace): void {
  const { volatility, fraction, recovery, distillate, bottoms, lightKey } = w;
  const lightSplit = logSplit(w.lightKeyRecovery);
  const heavySplit = -logSplit(w.heavyKeyRecovery);
  const lightVolatility = volatility[lightKey]!;
  w.minimumStages = (lightSplit - heavySplit) / Math.log(lightVolatility);
  let distillateFlow = 0;
  let bottomsFlow = 0;
  for (let i = 0; i < w.count; i++) {
    const z = fraction[i]!;
    const alpha = volatility[i]!;
    let kept: number;
    let loss: number;
    if (alpha === lightVolatility) {
      kept = w.lightKeyRecovery;
      loss = 1 - kept;
    } else if (alpha === 1) {
      loss = w.heavyKeyRecovery;
      kept = 1 - loss;
    } else {
      const split = heavySplit + w.minimumStages * Math.log(alpha);
      const smaller = Math.exp(-Math.abs(split));
      const larger = 1 / (1 + smaller);
      kept = split > 0 ? larger : smaller * larger;
      loss = split > 0 ? smaller * larger : larger;
    }
    recovery[i] = kept;
    distillate[i] = z * kept;
    bottoms[i] = z * loss;
    distillateFlow += distillate[i]!;
    bottomsFlow += bottoms[i]!;
  }
  w.distillateFlow = distillateFlow;
  w.bottomsFlow = bottomsFlow;
}
