const mostIterations = 100;
const step = 1e-14;

/** Which phases a mixture of overall composition z and given K-values forms. */
export type Phase = "liquid" | "two-phase" | "vapor";

/** The phases at a molar vapor fraction; a saturated liquid or vapor counts as one phase. */
export function phaseOf(vaporFraction: number): Phase {
  return vaporFraction === 0 ? "liquid" : vaporFraction === 1 ? "vapor" : "two-phase";
}

/**
 * Splits a mixture z by its K-values, both above zero where z is, and gives the molar vapor fraction: 0 for a liquid at
 * or below its bubble point, 1 for a vapor at or above its dew point, else the root of Rachford and Rice's equation.
 * Fills the phase compositions x and y; of a phase that is absent, that of its first trace (K z or z/K, scaled to 1).
 *
 * Near a vapor fraction of 1 it is the liquid fraction that is solved for, so that its digits survive: the same
 * equation with 1/K in place of K.
 */
export function splitPhases(z: Float64Array, k: Float64Array, x: Float64Array, y: Float64Array): number {
  let atZero = 0;
  let atHalf = 0;
  let atOne = 0;
  for (let i = 0; i < z.length; i++) {
    if (z[i] === 0) continue;
    const excess = z[i]! * (k[i]! - 1);
    atZero += excess;
    atHalf += excess / (1 + k[i]!);
    atOne += excess / k[i]!;
  }
  if (atZero <= 0) return fillSinglePhase(z, k, x, y, false);
  if (atOne >= 0) return fillSinglePhase(z, k, y, x, true);
  const inverted = atHalf > 0;
  const minor = smallerFraction(z, k, inverted);
  for (let i = 0; i < z.length; i++) {
    const ratio = inverted ? 1 / k[i]! : k[i]!;
    const ofMajor = z[i]! / (1 + minor * (ratio - 1));
    x[i] = inverted ? ofMajor * ratio : ofMajor;
    y[i] = inverted ? ofMajor : ofMajor * ratio;
  }
  return inverted ? 1 - minor : minor;
}

function fillSinglePhase(
  z: Float64Array,
  k: Float64Array,
  present: Float64Array,
  absent: Float64Array,
  isVapor: boolean,
): number {
  let sum = 0;
  for (let i = 0; i < z.length; i++) {
    present[i] = z[i]!;
    absent[i] = z[i] === 0 ? 0 : isVapor ? z[i]! / k[i]! : z[i]! * k[i]!;
    sum += absent[i]!;
  }
  for (let i = 0; i < z.length; i++) absent[i] = absent[i]! / sum;
  return isVapor ? 1 : 0;
}

/**
 * The root of f(b) = sum z (K - 1)/(1 + b (K - 1)) in (0, 1/2], for `inverted` with 1/K in place of K, by Newton on
 * (b - lower pole)(upper pole - b) f(b) (Leibovici and Neoschil), inside a bracket.
 */
function smallerFraction(z: Float64Array, k: Float64Array, inverted: boolean): number {
  let largest = 0;
  let smallest = Infinity;
  for (let i = 0; i < z.length; i++) {
    if (z[i] === 0) continue;
    const ki = inverted ? 1 / k[i]! : k[i]!;
    if (ki > largest) largest = ki;
    if (ki < smallest) smallest = ki;
  }
  const lowerPole = -1 / (largest - 1);
  const upperPole = 1 / (1 - smallest);
  let low = 0;
  let high = 0.5;
  let b = 0.25;
  for (let iteration = 0; iteration < mostIterations; iteration++) {
    let f = 0;
    let slope = 0;
    for (let i = 0; i < z.length; i++) {
      if (z[i] === 0) continue;
      const excess = (inverted ? 1 / k[i]! : k[i]!) - 1;
      const term = excess / (1 + b * excess);
      f += z[i]! * term;
      slope -= z[i]! * term * term;
    }
    if (f > 0) low = b;
    else high = b;
    const left = b - lowerPole;
    const right = upperPole - b;
    const next = b - (left * right * f) / ((right - left) * f + left * right * slope);
    if (Math.abs(next - b) <= step * b) return next;
    b = next > low && next < high ? next : middle(low, high);
  }
  return b;
}

/** Between bounds of one sign the geometric mean, which crosses many powers of ten quickly. */
function middle(low: number, high: number): number {
  return low > 0 && high > 16 * low ? Math.sqrt(low * high) : 0.5 * (low + high);
}
