import { findRoot } from "../numerics/findRoot";
import type { ColumnStream } from "./binaryColumn";
import type { EquilibriumCurve } from "./equilibriumCurve";

/** The point (x, y) at which the q-line of a stream, (q - 1) y = q x - z, meets the equilibrium curve. */
export function feedPinch(curve: EquilibriumCurve, { lightFraction: z, q }: ColumnStream): [number, number] {
  const excess = (x: number): number => q * x - z - (q - 1) * curve.vapor(x);
  // At x = 0 the excess is -z, at x = 1 it is 1 - z.
  const x = findRoot(excess, 0, 1, 1e-15) ?? z;
  return [x, curve.vapor(x)];
}
