import type { EquilibriumCurve } from "./equilibriumCurve";

/** Points of an equilibrium curve between two products, x rising. */
export interface CurveTable {
  readonly x: Float64Array;
  readonly y: Float64Array;
}

const intervals = 400;

/** Tabulates a curve from xB to xD, denser towards both products, with every corner of the curve between them. */
export function tabulate(curve: EquilibriumCurve, xB: number, xD: number): CurveTable {
  const corners = (curve.corners ?? new Float64Array()).filter((x) => x > xB && x < xD);
  const x = new Float64Array(intervals + 1 + corners.length);
  for (let i = 0; i <= intervals; i++) {
    x[i] = xB + (xD - xB) * Math.sin((0.5 * Math.PI * i) / intervals) ** 2;
  }
  x[intervals] = xD;
  x.set(corners, intervals + 1);
  x.sort();
  return { x, y: x.map((each) => curve.vapor(each)) };
}
