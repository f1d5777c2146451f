/**
 * Scratch memory of the shortcut arithmetic for one case at a time, reused from case to case. Components stand in
 * the order of falling relative volatility. All is per mole of feed.
 */
export interface ShortcutWorkspace {
  readonly capacity: number;

  // The case
  /** Number of components in use. */
  count: number;
  /** Relative volatility to the heavy key [-], falling; equal ones and zero fractions are allowed. */
  readonly volatility: Float64Array;
  /** Feed mole fraction [-]. */
  readonly fraction: Float64Array;
  lightKey: number;
  heavyKey: number;
  /** Position of each component in the lists that the case was read from. */
  readonly order: Int32Array;
  /** Fraction of the feed's light key that leaves in the distillate [-]. */
  lightKeyRecovery: number;
  /** Fraction of the feed's heavy key that leaves in the bottoms [-]. */
  heavyKeyRecovery: number;
  /** Liquid fraction of the feed [-]. */
  q: number;

  // Components of one volatility taken together, absent ones left out
  classes: number;
  readonly classVolatility: Float64Array;
  readonly classFraction: Float64Array;
  /** αᵢ zᵢ of each class. */
  readonly classWeight: Float64Array;
  /** Class of each component; -1 for an absent one. */
  readonly classOf: Int32Array;
  lightClass: number;
  heavyClass: number;

  // Underwood
  /** Root k lies at classVolatility[rootOrigin[k]] + rootOffset[k], between classes k and k + 1. */
  readonly rootOrigin: Int32Array;
  readonly rootOffset: Float64Array;
  /** Recovery in the distillate at minimum reflux, by class [-]. */
  readonly classRecovery: Float64Array;
  /** Part of the lighter components in the solution for the distributing range, and its values at the keys. */
  readonly lighterWeight: Float64Array;
  lightRemainder: number;
  heavyRemainder: number;
  /** The classes that reach both products at minimum reflux run from the first to the last. */
  firstDistributing: number;
  lastDistributing: number;
  minimumVapor: number;
  minimumReflux: number;

  // Fenske
  minimumStages: number;
  /** Recovery of each component in the distillate at total reflux [-]. */
  readonly recovery: Float64Array;
  readonly distillate: Float64Array;
  readonly bottoms: Float64Array;
  distillateFlow: number;
  bottomsFlow: number;
}

/** New scratch memory for up to `capacity` components. */
export function createShortcutWorkspace(capacity: number): ShortcutWorkspace {
  const numbers = (): Float64Array => new Float64Array(capacity);
  return {
    capacity,
    count: 0,
    volatility: numbers(),
    fraction: numbers(),
    lightKey: 0,
    heavyKey: 0,
    order: new Int32Array(capacity),
    lightKeyRecovery: Number.NaN,
    heavyKeyRecovery: Number.NaN,
    q: Number.NaN,
    classes: 0,
    classVolatility: numbers(),
    classFraction: numbers(),
    classWeight: numbers(),
    classOf: new Int32Array(capacity),
    lightClass: 0,
    heavyClass: 0,
    rootOrigin: new Int32Array(capacity),
    rootOffset: numbers(),
    classRecovery: numbers(),
    lighterWeight: numbers(),
    lightRemainder: Number.NaN,
    heavyRemainder: Number.NaN,
    firstDistributing: 0,
    lastDistributing: 0,
    minimumVapor: Number.NaN,
    minimumReflux: Number.NaN,
    minimumStages: Number.NaN,
    recovery: numbers(),
    distillate: numbers(),
    bottoms: numbers(),
    distillateFlow: Number.NaN,
    bottomsFlow: Number.NaN,
  };
}

let shared = createShortcutWorkspace(16);

/** The scratch memory that the public functions share; they fill it anew on every call and never keep it. */
export function sharedShortcutWorkspace(count: number): ShortcutWorkspace {
  if (shared.capacity < count) shared = createShortcutWorkspace(2 * count);
  return shared;
}
