import type { ShortcutWorkspace } from "./shortcutWorkspace";
import { distanceToRoot } from "./underwoodRoots";

/**
 * Underwood's reflux from root k alone, with the distillate that Fenske gives at total reflux:
 * Σ αᵢ dᵢ / (αᵢ − θ) / D − 1. Needs the roots and the Fenske split.
 */
export function singleRootReflux(w: ShortcutWorkspace, k: number): number {
  const { classOf, classVolatility, distillate } = w;
  let vapor = 0;
  for (let i = 0; i < w.count; i++) {
    const c = classOf[i]!;
    if (c >= 0) vapor += (classVolatility[c]! * distillate[i]!) / distanceToRoot(w, c, k);
  }
  return vapor / w.distillateFlow - 1;
}

/** The largest of the single-root values at the roots between the keys: the cautious minimum. */
export function largestSingleRootReflux(w: ShortcutWorkspace): number {
  let largest = -Infinity;
  for (let k = w.lightClass; k < w.heavyClass; k++) largest = Math.max(largest, singleRootReflux(w, k));
  return largest;
}
