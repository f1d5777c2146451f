import type { ShortcutWorkspace } from "./shortcutWorkspace";
import { leastVolatilityGap } from "../balance/keys";

/**
 * Recovery at minimum reflux of a component that is absent from the feed, as the limit of an ever smaller trace of
 * it: a root is pinned to its volatility α, and where that root binds
 *
 *   r = (V − Σ αᵢ dᵢ / (αᵢ − α)) / (1 − q − Σ αᵢ zᵢ / (αᵢ − α)).
 */
export function traceRecovery(w: ShortcutWorkspace, alpha: number): number {
  const { classVolatility, classWeight, classRecovery, firstDistributing: first, lastDistributing: last } = w;
  let vapor = w.minimumVapor;
  let change = 1 - w.q;
  let size = Math.abs(change);
  let vaporSlope = 0;
  let changeSlope = 0;
  for (let i = 0; i < w.classes; i++) {
    const distance = classVolatility[i]! - alpha;
    if (Math.abs(distance) <= leastVolatilityGap * alpha) return classRecovery[i]!;
    const term = classWeight[i]! / distance;
    vapor -= term * classRecovery[i]!;
    change -= term;
    size += Math.abs(term);
    vaporSlope += (term * classRecovery[i]!) / distance;
    changeSlope += term / distance;
  }
  if (first > 0 && alpha > classVolatility[first - 1]!) return 1;
  if (last < w.classes - 1 && alpha < classVolatility[last + 1]!) return 0;
  if (alpha > classVolatility[first]! && !(change > 0)) return 1;
  if (alpha < classVolatility[last]! && !(change < 0)) return 0;
  // A root of the feed exactly at this volatility leaves 0/0; the slopes give its limit.
  const recovery = Math.abs(change) > 1e-8 * size ? vapor / change : vaporSlope / changeSlope;
  return Math.min(1, Math.max(0, recovery));
}
