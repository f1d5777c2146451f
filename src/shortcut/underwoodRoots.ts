import type { ShortcutWorkspace } from "./shortcutWorkspace";

/** Far more than the three or four evaluations that a root takes; bisection alone would end in this many. */
const mostIterations = 200;

/**
 * All roots of Underwood's feed equation, one between each two neighboring classes:
 *
 *   f(θ) = Σ αᵢ zᵢ / (αᵢ − θ) − (1 − q) = 0
 *
 * f rises from −∞ to +∞ between two neighbors, so there is exactly one root whatever q is. A root is kept as its
 * distance from the nearer of the two volatilities, so that αᵢ − θ keeps its digits for traces and close volatilities.
 */
export function underwoodRootsInto(w: ShortcutWorkspace): void {
  for (let k = 0; k < w.classes - 1; k++) {
    startRoot(w, k);
    refineRoot(w, k);
  }
}

/** θ of root k. */
export function rootAt(w: ShortcutWorkspace, k: number): number {
  return w.classVolatility[w.rootOrigin[k]!]! + w.rootOffset[k]!;
}

/** All roots, falling. */
export function rootsOf(w: ShortcutWorkspace): number[] {
  const roots: number[] = [];
  for (let k = 0; k < w.classes - 1; k++) roots.push(rootAt(w, k));
  return roots;
}

/** αᵢ − θ of class i and root k. */
export function distanceToRoot(w: ShortcutWorkspace, i: number, k: number): number {
  return w.classVolatility[i]! - w.classVolatility[w.rootOrigin[k]!]! - w.rootOffset[k]!;
}

/**
 * A first value of root k: the value of f half way tells which of the two volatilities is the nearer one, and the
 * distance from it follows from a quadratic if the other components' part of f is taken as constant over the gap.
 */
function startRoot(w: ShortcutWorkspace, k: number): void {
  const { classVolatility: alpha, classWeight: weight } = w;
  const lower = alpha[k + 1]!;
  const gap = alpha[k]! - lower;
  const middle = 0.5 * gap;
  let others = w.q - 1;
  for (let i = 0; i < k; i++) others += weight[i]! / (alpha[i]! - lower - middle);
  for (let i = k + 2; i < w.classes; i++) others += weight[i]! / (alpha[i]! - lower - middle);
  const fromLower = others * middle + weight[k]! > weight[k + 1]!;
  if (!fromLower) others = -others;
  const b = others * gap + weight[k]! + weight[k + 1]!;
  const c = (fromLower ? weight[k + 1]! : weight[k]!) * gap;
  const root = Math.sqrt(Math.max(0, b * b - 4 * others * c));
  const distance = b > 0 ? (2 * c) / (b + root) : (b - root) / (2 * others);
  w.rootOrigin[k] = fromLower ? k + 1 : k;
  w.rootOffset[k] = distance > 0 && distance < middle ? distance : 0.5 * middle;
}

/**
 * Refines the distance τ of root k from its nearer volatility: Halley's iteration on g(τ) = f τ (gap − τ), which has
 * no poles, within a bisection bracket. From the upper volatility the axis is mirrored, so that f always rises.
 */
function refineRoot(w: ShortcutWorkspace, k: number): void {
  const { classVolatility: alpha, classWeight: weight, classes } = w;
  const origin = alpha[w.rootOrigin[k]!]!;
  const direction = w.rootOrigin[k] === k ? -1 : 1;
  const gap = alpha[k]! - alpha[k + 1]!;
  const constant = direction * (w.q - 1);
  let low = 0;
  let high = 0.5 * gap * (1 + 1e-9);
  let tau = w.rootOffset[k]!;
  for (let iteration = 0; iteration < mostIterations && high - low > 1e-15 * high; iteration++) {
    let f = constant;
    let slope = 0;
    let bend = 0;
    for (let i = 0; i < classes; i++) {
      const r = 1 / (direction * (alpha[i]! - origin) - tau);
      const term = weight[i]! * r;
      f += term;
      slope += term * r;
      bend += term * r * r;
    }
    if (f < 0) low = tau;
    else high = tau;
    const p = tau * (gap - tau);
    const dp = gap - 2 * tau;
    const g = f * p;
    const dg = slope * p + f * dp;
    const step = (g * dg) / (dg * dg - g * (bend * p + slope * dp - f));
    const next = tau - step;
    // Convergence is cubic: after a step of 4e-6 nothing is left to gain.
    const converged = Math.abs(step) <= 4e-6 * tau;
    tau = converged || (next > low && next < high) ? next : 0.5 * (low + high);
    if (converged) break;
  }
  w.rootOffset[k] = direction * tau;
}
