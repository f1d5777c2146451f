import { findRoot } from "../numerics/findRoot";

/** Equilibrium of a binary: mole fractions of the light component. */
export interface EquilibriumCurve {
  /** Vapor in equilibrium with the liquid x. */
  readonly vapor: (x: number) => number;
  /** Liquid in equilibrium with the vapor y. */
  readonly liquid: (y: number) => number;
  /** Liquid fractions between which the curve has no bend inward: one pinch can only lie at an end of a section. */
  readonly concave: boolean;
  /** Liquid fractions at which the curve may have a corner. */
  readonly corners?: Float64Array;
}

/** y = alpha x/(1 + (alpha - 1) x). */
export function constantVolatilityCurve(relativeVolatility: number): EquilibriumCurve {
  const alpha = relativeVolatility;
  return {
    vapor: (x) => (alpha * x) / (1 + (alpha - 1) * x),
    liquid: (y) => y / (alpha - (alpha - 1) * y),
    concave: true,
  };
}

/** Any rising vapor(x); liquid(y) is found by bracketing. */
export function functionCurve(vapor: (x: number) => number): EquilibriumCurve {
  return { vapor, liquid: (y) => findRoot((x) => vapor(x) - y, 0, 1, 1e-15) ?? Number.NaN, concave: false };
}

/** Position k with xs[k] <= x <= xs[k + 1]. */
function interval(xs: Float64Array, x: number): number {
  let low = 0;
  let high = xs.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (xs[middle]! <= x) low = middle;
    else high = middle;
  }
  return low;
}

/** Straight lines between points that rise in x and y, from (0, 0) to (1, 1). */
export function linearCurve(xs: Float64Array, ys: Float64Array): EquilibriumCurve {
  const between = (from: Float64Array, to: Float64Array) => (value: number) => {
    const k = interval(from, value);
    const share = (value - from[k]!) / (from[k + 1]! - from[k]!);
    return to[k]! + share * (to[k + 1]! - to[k]!);
  };
  return { vapor: between(xs, ys), liquid: between(ys, xs), concave: false, corners: xs };
}

/** Monotone cubic through the points: slopes limited so that no piece overshoots (Fritsch and Carlson). */
export function monotoneCurve(xs: Float64Array, ys: Float64Array): EquilibriumCurve {
  const slopes = monotoneSlopes(xs, ys);
  /** y at the part t of piece k. */
  const piece = (k: number, t: number): number => {
    const h = xs[k + 1]! - xs[k]!;
    const u = 1 - t;
    return (
      u * u * (1 + 2 * t) * ys[k]! +
      t * u * u * h * slopes[k]! +
      t * t * (3 - 2 * t) * ys[k + 1]! -
      t * t * u * h * slopes[k + 1]!
    );
  };
  const vapor = (x: number): number => {
    const k = interval(xs, x);
    return piece(k, (x - xs[k]!) / (xs[k + 1]! - xs[k]!));
  };
  const liquid = (y: number): number => {
    const k = interval(ys, y);
    const t = findRoot((part) => piece(k, part) - y, 0, 1, 1e-15) ?? (y <= ys[k]! ? 0 : 1);
    return xs[k]! + t * (xs[k + 1]! - xs[k]!);
  };
  return { vapor, liquid, concave: false, corners: xs };
}

/** Slopes at the points: harmonic means of the neighbors, which keep each piece monotone. */
function monotoneSlopes(xs: Float64Array, ys: Float64Array): Float64Array {
  const last = xs.length - 1;
  const secant = (k: number): number => (ys[k + 1]! - ys[k]!) / (xs[k + 1]! - xs[k]!);
  const slopes = new Float64Array(xs.length);
  slopes[0] = secant(0);
  slopes[last] = secant(last - 1);
  for (let k = 1; k < last; k++) {
    const left = secant(k - 1);
    const right = secant(k);
    const w1 = 2 * (xs[k + 1]! - xs[k]!) + (xs[k]! - xs[k - 1]!);
    const w2 = xs[k + 1]! - xs[k]! + 2 * (xs[k]! - xs[k - 1]!);
    slopes[k] = left > 0 && right > 0 ? (w1 + w2) / (w1 / left + w2 / right) : 0;
  }
  return slopes;
}
