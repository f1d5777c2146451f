import { type GillilandCorrelation, gillilandCorrelations } from "./gillilandCorrelations";

/** A line for a figure. */
export interface Curve {
  readonly x: readonly number[];
  readonly y: readonly number[];
}

/** X from close to minimum reflux to close to total reflux, even in the logarithm of X/(1 - X). */
const coordinates = Array.from({ length: 85 }, (_, i) => {
  const overMinimum = 3e-4 * 10 ** (i / 14);
  return overMinimum / (1 + overMinimum);
});

const drawn = new Map<GillilandCorrelation, Curve>();

/** Gilliland's Y against X; the same for every column, so it is worked out once. */
export function gillilandCurve(correlation: GillilandCorrelation): Curve {
  let curve = drawn.get(correlation);
  if (curve === undefined) {
    curve = { x: coordinates, y: coordinates.map((x) => -Math.expm1(gillilandCorrelations[correlation](x))) };
    drawn.set(correlation, curve);
  }
  return curve;
}
