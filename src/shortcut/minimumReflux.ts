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
 * gives more than V: the vapor only falls by that, so that none has to be given back.
 */
export function solveMinimumReflux(w: ShortcutWorkspace): void {
  w.firstDistributing = w.lightClass;
  w.lastDistributing = w.heavyClass;
  for (let i = 0; i < w.lightClass; i++) w.classRecovery[i] = 1;
  for (let i = w.heavyClass + 1; i < w.classes; i++) w.classRecovery[i] = 0;
  for (;;) {
    solveRange(w);
    const lighter = w.firstDistributing > 0 && exceedsVapor(w, w.firstDistributing - 1);
    const heavier = w.lastDistributing < w.classes - 1 && exceedsVapor(w, w.lastDistributing);
    if (!lighter && !heavier) break;
    if (lighter) w.firstDistributing--;
    if (heavier) w.lastDistributing++;
  }
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

/**
 * Vapor and recoveries for the range a..b. A sum with poles at the volatilities down to b and zeros at the roots
 * between a and b can only be
 *
 *   Σ αᵢ dᵢ / (αᵢ − t) − V = Π (t − θ) / Π (t − α) · [A − V t + Σ wⱼ / (αⱼ − t)],   j the lighter components,
 *
 * with wⱼ from αⱼ zⱼ. The residues at the two keys give A and V, those at the others their recoveries.
 */
function solveRange(w: ShortcutWorkspace): void {
  const { classVolatility: alpha, classWeight: weight, classRecovery: recovery, lightClass, heavyClass } = w;
  recovery[lightClass] = w.lightKeyRecovery;
  recovery[heavyClass] = 1 - w.heavyKeyRecovery;
  const lightResidue = (weight[lightClass]! * recovery[lightClass]!) / poleProduct(w, lightClass);
  const heavyResidue = (weight[heavyClass]! * recovery[heavyClass]!) / poleProduct(w, heavyClass);
  weighLighter(w);
  const vapor =
    (lightResidue - heavyResidue) / (alpha[lightClass]! - alpha[heavyClass]!) +
    lighterSum(w, lightClass, heavyClass);
  for (let i = w.firstDistributing; i <= w.lastDistributing; i++) {
    if (i === lightClass || i === heavyClass) continue;
    // From the key below, so that the two terms add up without cancelling.
    const key = i < lightClass ? lightClass : heavyClass;
    const slope = vapor - lighterSum(w, i, key);
    const residue = (i < lightClass ? lightResidue : heavyResidue) + (alpha[i]! - alpha[key]!) * slope;
    recovery[i] = (residue * poleProduct(w, i)) / weight[i]!;
  }
  w.minimumVapor = vapor;
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

/** wⱼ of the components lighter than the range. */
function weighLighter(w: ShortcutWorkspace): void {
  const { classVolatility: alpha, classWeight: weight, firstDistributing: first } = w;
  for (let j = 0; j < first; j++) {
    let product = weight[j]! * (alpha[j]! - alpha[first]!);
    for (let m = first + 1; m <= w.lastDistributing; m++) {
      product *= (alpha[j]! - alpha[m]!) / distanceToRoot(w, j, m - 1);
    }
    w.lighterWeight[j] = product;
  }
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

/** Whether Underwood's sum at root k is more than the vapor: then the components on both sides of it distribute. */
function exceedsVapor(w: ShortcutWorkspace, k: number): boolean {
  const { classWeight: weight, classRecovery: recovery } = w;
  let sum = -w.minimumVapor;
  let size = Math.abs(sum);
  for (let i = 0; i <= w.lastDistributing; i++) {
    const term = (weight[i]! * recovery[i]!) / distanceToRoot(w, i, k);
    sum += term;
    size += Math.abs(term);
  }
  return sum > rounding * size;
}
