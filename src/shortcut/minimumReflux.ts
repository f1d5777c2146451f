import type { ShortcutWorkspace } from "./shortcutWorkspace";
import { distanceToRoot } from "./underwoodRoots";

/** Relative rounding error below which a root's sum counts as equal to the vapor. */
const rounding = 1e-12;

/**
 * Minimum reflux of the column with infinitely many stages, all distributing components solved together. Needs the
 * roots. With dᵢ the distillate per mole of feed and a..b the classes that reach both products,
 *
 *   Σ αᵢ dᵢ / (αᵢ − θ) = V   at each root between a and b,   < V at every other root,
 *
 * everything lighter than a wholly in the distillate and everything heavier than b wholly in the bottoms. The range
 * starts as the keys with all between them and takes in the next component on a side while the root on that side
 * asks for more than V: the vapor only falls by that, so that none has to be given back.
 *
 * For a given range, a sum with poles at the volatilities down to b and zeros at the roots between a and b can only be
 *
 *   Σ αᵢ dᵢ / (αᵢ − t) − V = −Π (t − θ) / Π (t − α) · g(t),   g(t) = A + V t − Σ wⱼ / (αⱼ − t),
 *
 * products over the range, j the components lighter than it, wⱼ from αⱼ zⱼ. The poles of the two keys give A and V, the
 * other poles the recoveries, and the sign of g at a root beside the range tells whether its sum exceeds V.
 */
export function solveMinimumReflux(w: ShortcutWorkspace): void {
  startRange(w);
  for (;;) {
    solveVapor(w);
    const { firstDistributing: first, lastDistributing: last } = w;
    const lighter = first > 0 && remainderAtRoot(w, first - 1, w.lightClass) < 0;
    const heavier = last < w.classes - 1 && remainderAtRoot(w, last, w.heavyClass) > 0;
    if (!lighter && !heavier) break;
    if (lighter) takeIn(w, --w.firstDistributing, first - 1);
    if (heavier) takeIn(w, ++w.lastDistributing, last);
  }
  solveRecoveries(w);
  w.minimumReflux = w.minimumVapor / distillateAtMinimum(w) - 1;
}

/** Distillate at minimum reflux per mole of feed. */
function distillateAtMinimum(w: ShortcutWorkspace): number {
  let distillate = 0;
  for (let i = 0; i <= w.lastDistributing; i++) distillate += w.classFraction[i]! * w.classRecovery[i]!;
  return distillate;
}

/**
 * The reflux below which a section would run dry, whatever Underwood says: no liquid above the feed (R = 0), or no
 * vapor below it, (R + 1) D = 1 − q.
 */
export function vanishingFlowReflux(w: ShortcutWorkspace): number {
  return Math.max(0, (1 - w.q) / distillateAtMinimum(w) - 1);
}

/** The keys and all between them: g at the keys, and wⱼ. */
function startRange(w: ShortcutWorkspace): void {
  const { classVolatility: alpha, classWeight: weight, lightClass, heavyClass } = w;
  w.firstDistributing = lightClass;
  w.lastDistributing = heavyClass;
  w.lightRemainder = (weight[lightClass]! * w.lightKeyRecovery) / poleProduct(w, lightClass);
  w.heavyRemainder = (weight[heavyClass]! * (1 - w.heavyKeyRecovery)) / poleProduct(w, heavyClass);
  for (let j = 0; j < lightClass; j++) {
    let product = weight[j]! * (alpha[j]! - alpha[lightClass]!);
    for (let m = lightClass + 1; m <= heavyClass; m++) {
      product *= (alpha[j]! - alpha[m]!) / distanceToRoot(w, j, m - 1);
    }
    w.lighterWeight[j] = product;
  }
}

/** Extends the products over the range by a class and the root between it and the range. */
function takeIn(w: ShortcutWorkspace, added: number, root: number): void {
  const { classVolatility: alpha, lightClass, heavyClass } = w;
  w.lightRemainder *= (alpha[lightClass]! - alpha[added]!) / distanceToRoot(w, lightClass, root);
  w.heavyRemainder *= (alpha[heavyClass]! - alpha[added]!) / distanceToRoot(w, heavyClass, root);
  for (let j = 0; j < w.firstDistributing; j++) {
    w.lighterWeight[j] = (w.lighterWeight[j]! * (alpha[j]! - alpha[added]!)) / distanceToRoot(w, j, root);
  }
}

/** V from g at the two keys. */
function solveVapor(w: ShortcutWorkspace): void {
  const { classVolatility: alpha, lightClass, heavyClass } = w;
  const slope = (w.lightRemainder - w.heavyRemainder) / (alpha[lightClass]! - alpha[heavyClass]!);
  w.minimumVapor = slope + lighterSum(w, lightClass, heavyClass);
}

/** Σ wⱼ / ((αⱼ − α)(αⱼ − α′)) with the volatilities of two classes. */
function lighterSum(w: ShortcutWorkspace, one: number, other: number): number {
  const { classVolatility: alpha, lighterWeight } = w;
  let sum = 0;
  for (let j = 0; j < w.firstDistributing; j++) {
    sum += lighterWeight[j]! / ((alpha[j]! - alpha[one]!) * (alpha[j]! - alpha[other]!));
  }
  return sum;
}

/** g at root k, reckoned from g at a key; 0 where it is lost in rounding. */
function remainderAtRoot(w: ShortcutWorkspace, k: number, key: number): number {
  const { classVolatility: alpha, lighterWeight } = w;
  let slope = 0;
  for (let j = 0; j < w.firstDistributing; j++) {
    slope += lighterWeight[j]! / (distanceToRoot(w, j, k) * (alpha[j]! - alpha[key]!));
  }
  const fromKey = key === w.lightClass ? w.lightRemainder : w.heavyRemainder;
  const distance = -distanceToRoot(w, key, k);
  const value = fromKey + distance * (w.minimumVapor - slope);
  const size = Math.abs(fromKey) + Math.abs(distance) * (Math.abs(w.minimumVapor) + slope);
  return Math.abs(value) <= rounding * size ? 0 : value;
}

/** Recoveries of all classes from g at their poles. */
function solveRecoveries(w: ShortcutWorkspace): void {
  const { classVolatility: alpha, classWeight: weight, classRecovery: recovery, lightClass, heavyClass } = w;
  for (let i = 0; i < w.classes; i++) {
    if (i < w.firstDistributing) recovery[i] = 1;
    else if (i > w.lastDistributing) recovery[i] = 0;
    else if (i === lightClass) recovery[i] = w.lightKeyRecovery;
    else if (i === heavyClass) recovery[i] = 1 - w.heavyKeyRecovery;
    else {
      // From the key below, so that the two terms add up without cancelling.
      const key = i < lightClass ? lightClass : heavyClass;
      const fromKey = i < lightClass ? w.lightRemainder : w.heavyRemainder;
      const remainder = fromKey + (alpha[i]! - alpha[key]!) * (w.minimumVapor - lighterSum(w, i, key));
      recovery[i] = (remainder * poleProduct(w, i)) / weight[i]!;
    }
  }
}

/** Π (αᵢ − θ) / Π (αᵢ − αₘ) over the range without i: each pole paired with the root on its near side. */
function poleProduct(w: ShortcutWorkspace, i: number): number {
  const alpha = w.classVolatility;
  let product = 1;
  for (let m = w.firstDistributing; m < i; m++) product *= distanceToRoot(w, i, m) / (alpha[i]! - alpha[m]!);
  for (let m = i + 1; m <= w.lastDistributing; m++) {
    product *= distanceToRoot(w, i, m - 1) / (alpha[i]! - alpha[m]!);
  }
  return product;
}
