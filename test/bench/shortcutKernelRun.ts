import { solveFenske } from "../../src/shortcut/fenskeSplit";
import {
  leastReflux,
  gillilandStages,
  rectifyingStages,
  solveLimits,
} from "../../src/shortcut/shortcutKernel";
import { createShortcutWorkspace, type ShortcutWorkspace } from "../../src/shortcut/shortcutWorkspace";
import { singleRootReflux } from "../../src/shortcut/singleRootReflux";
import { rootAt, underwoodRootsInto } from "../../src/shortcut/underwoodRoots";
import { groupByVolatility } from "../../src/shortcut/volatilityClasses";
import type { ShortcutCases } from "./shortcutCases";

/** Sums over the cases: stages + minimum reflux + rectifying stages, the same of the first 2000, and the roots. */
export interface Checksums {
  readonly all: number;
  readonly first2000: number;
  readonly roots: number;
}

/** The least minimum reflux that the reference programs let pass. */
const floor = 0.05;

function load(w: ShortcutWorkspace, cases: ShortcutCases, c: number): number {
  const at = c * cases.components;
  w.count = cases.components;
  w.lightKey = cases.lightKey[c]!;
  w.heavyKey = w.lightKey + 1;
  const heavy = cases.volatility[at + w.heavyKey]!;
  for (let i = 0; i < w.count; i++) {
    w.volatility[i] = cases.volatility[at + i]! / heavy;
    w.fraction[i] = cases.fraction[at + i]!;
  }
  w.q = cases.q[c]!;
  w.lightKeyRecovery = cases.lightKeyRecovery[c]!;
  w.heavyKeyRecovery = cases.heavyKeyRecovery[c]!;
  return heavy;
}

function finish(w: ShortcutWorkspace, minimumReflux: number, refluxOverMinimum: number): number {
  const stages = gillilandStages(w, minimumReflux, refluxOverMinimum * minimumReflux);
  return stages + minimumReflux + rectifyingStages(w, stages);
}

/** The work of the reference programs: minimum reflux from the single root between the keys. */
export function runSingleRoot(cases: ShortcutCases): Checksums {
  const w = createShortcutWorkspace(cases.components);
  let all = 0;
  let first2000 = 0;
  let roots = 0;
  for (let c = 0; c < cases.count; c++) {
    const heavy = load(w, cases, c);
    groupByVolatility(w);
    underwoodRootsInto(w);
    solveFenske(w);
    all += finish(w, Math.max(floor, singleRootReflux(w, w.lightClass)), cases.refluxOverMinimum[c]!);
    for (let k = 0; k < w.classes - 1; k++) roots += heavy * rootAt(w, k);
    if (c === 1999) first2000 = all;
  }
  return { all, first2000, roots };
}

/** The work of `shortcutDesign`: the exact minimum reflux, with all distributing components. */
export function runExact(cases: ShortcutCases): Checksums {
  const w = createShortcutWorkspace(cases.components);
  let all = 0;
  let first2000 = 0;
  let roots = 0;
  for (let c = 0; c < cases.count; c++) {
    const heavy = load(w, cases, c);
    solveLimits(w);
    all += finish(w, Math.max(floor, leastReflux(w)), cases.refluxOverMinimum[c]!);
    for (let k = 0; k < w.classes - 1; k++) roots += heavy * rootAt(w, k);
    if (c === 1999) first2000 = all;
  }
  return { all, first2000, roots };
}
