/** Evaluations after which a root is given up; bisection alone ends in half as many. */
const mostEvaluations = 200;

/** Part of the first bracket below which a root counts as zero. */
const leastWidth = 1e-20;

/**
 * A root of `f` between `lower` and `upper`, where it changes sign; undefined when it does not, or has no value on
 * the way. Inverse quadratic interpolation where it is safe, else bisection; the bracket never widens. Ends when the
 * bracket is narrower than `tolerance` times the root, or than 1e-20 of the first bracket.
 *
 * Source: T. R. Chandrupatla, Adv. Eng. Software 28 (1997) 145.
 */
export function findRoot(
  f: (x: number) => number,
  lower: number,
  upper: number,
  tolerance = 1e-15,
): number | undefined {
  let latest = lower;
  let opposite = upper;
  let fLatest = f(latest);
  let fOpposite = f(opposite);
  if (fLatest === 0) return latest;
  if (fOpposite === 0) return opposite;
  if (!(Math.sign(fLatest) * Math.sign(fOpposite) < 0)) return undefined;
  const zero = leastWidth * Math.abs(upper - lower);
  let share = 0.5;
  for (let evaluation = 0; evaluation < mostEvaluations; evaluation++) {
    const x = latest + share * (opposite - latest);
    const fx = f(x);
    if (Number.isNaN(fx)) return undefined;
    let previous = latest;
    let fPrevious = fLatest;
    if (fx < 0 !== fLatest < 0) {
      previous = opposite;
      fPrevious = fOpposite;
      opposite = latest;
      fOpposite = fLatest;
    }
    latest = x;
    fLatest = fx;
    const best = Math.abs(fLatest) < Math.abs(fOpposite) ? latest : opposite;
    const width = Math.abs(opposite - latest);
    if (fx === 0 || width <= tolerance * Math.abs(best) + zero) return best;
    const least = (0.5 * (tolerance * Math.abs(best) + zero)) / width;
    share = interpolate(latest, opposite, previous, fLatest, fOpposite, fPrevious);
    share = Math.min(1 - least, Math.max(least, share));
  }
  return undefined;
}

/** The share of the bracket at which inverse quadratic interpolation sees the root, or one half. */
function interpolate(a: number, b: number, c: number, fa: number, fb: number, fc: number): number {
  const xi = (a - b) / (c - b);
  const phi = (fa - fb) / (fc - fb);
  if (!(phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi)) return 0.5;
  const share =
    (fa / (fb - fa)) * (fc / (fb - fc)) + (((c - a) / (b - a)) * fa * fb) / ((fc - fa) * (fc - fb));
  return Number.isFinite(share) ? share : 0.5;
}
