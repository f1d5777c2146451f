import { findRoot } from "../numerics/findRoot";
import type { EquilibriumCurve } from "./equilibriumCurve";

/** Liquid leaving a tray of Murphree vapor efficiency E from which the vapor y rises. */
export type TrayLiquid = (slope: number, intercept: number, y: number, before: number) => number;

/**
 * y = (1 - E)(m x + b) + E y*(x), which rises with x: between the liquid in equilibrium with y and the one that comes
 * `before`, as a rule; a tray on which a stream joins may lie outside.
 */
export function trayLiquid(curve: EquilibriumCurve, efficiency: number): TrayLiquid {
  let m = 0;
  let b = 0;
  let leaving = 0;
  const excess = (x: number): number =>
    (1 - efficiency) * (m * x + b) + efficiency * curve.vapor(x) - leaving;
  return (slope, intercept, y, before) => {
    m = slope;
    b = intercept;
    leaving = y;
    return findRoot(excess, curve.liquid(y), before) ?? findRoot(excess, 0, 1) ?? Number.NaN;
  };
}
