import type { Split } from "../balance/split";
import { loadSplit } from "../shortcut/loadSplit";
import type { ShortcutWorkspace } from "../shortcut/shortcutWorkspace";
import { leastReflux, solveLimits } from "../shortcut/shortcutKernel";
import { solveFenske } from "../shortcut/fenskeSplit";
import { largestSingleRootReflux } from "../shortcut/singleRootReflux";
import { rootAt } from "../shortcut/underwoodRoots";

/** Underwood's side of a design. */
export interface RefluxLimit {
  readonly roots: readonly number[];
  /** Positions of the components other than the keys that reach both products at minimum reflux. */
  readonly distributing: readonly number[];
  /** Whether one of them lies between the keys. */
  readonly betweenKeys: boolean;
  readonly underwoodReflux: number;
  /** The larger of Underwood's value and the reflux at which a flow vanishes. */
  readonly minimumReflux: number;
  readonly largestSingleRoot: number;
}

/** Fenske's side of a design: products per mole of feed, in the order of the feed. */
export interface TotalRefluxSplit {
  readonly minimumStages: number;
  readonly distillate: Float64Array;
  readonly bottoms: Float64Array;
  readonly distillateFlow: number;
  readonly bottomsFlow: number;
}

/** Minimum reflux at the volatilities of `split`. */
export function refluxLimit(split: Split, q: number): RefluxLimit {
  const w = loadSplit(split);
  w.q = q;
  solveLimits(w);
  return readRefluxLimit(w);
}

/** Minimum stages and products at the volatilities of `split`. */
export function totalRefluxSplit(split: Split): TotalRefluxSplit {
  const w = loadSplit(split);
  solveFenske(w);
  return readTotalRefluxSplit(w);
}

/** Both sides at one set of volatilities. */
export function bothLimits(split: Split, q: number): { reflux: RefluxLimit; stages: TotalRefluxSplit } {
  const w = loadSplit(split);
  w.q = q;
  solveLimits(w);
  return { reflux: readRefluxLimit(w), stages: readTotalRefluxSplit(w) };
}

function readRefluxLimit(w: ShortcutWorkspace): RefluxLimit {
  const roots = new Array<number>(Math.max(0, w.classes - 1));
  for (let k = 0; k < roots.length; k++) roots[k] = rootAt(w, k);
  const distributing: number[] = [];
  for (let place = 0; place < w.count; place++) {
    const c = w.classOf[place]!;
    const reachesBoth = c >= w.firstDistributing && c <= w.lastDistributing;
    if (reachesBoth && place !== w.lightKey && place !== w.heavyKey) distributing.push(w.order[place]!);
  }
  return {
    roots,
    distributing,
    betweenKeys: w.heavyClass - w.lightClass > 1,
    underwoodReflux: w.minimumReflux,
    minimumReflux: leastReflux(w),
    largestSingleRoot: largestSingleRootReflux(w),
  };
}

function readTotalRefluxSplit(w: ShortcutWorkspace): TotalRefluxSplit {
  const distillate = new Float64Array(w.count);
  const bottoms = new Float64Array(w.count);
  for (let place = 0; place < w.count; place++) {
    distillate[w.order[place]!] = w.distillate[place]!;
    bottoms[w.order[place]!] = w.bottoms[place]!;
  }
  const { minimumStages, distillateFlow, bottomsFlow } = w;
  return { minimumStages, distillate, bottoms, distillateFlow, bottomsFlow };
}
