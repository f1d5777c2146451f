import type { ColumnSection } from "./binaryColumn";

/**
 * Equilibrium stages of one section between the liquids `from` and `to`, in closed form for a constant relative
 * volatility and a straight operating line y = m x + b (Smoker):
 *
 *   k a root of m (alpha - 1) k^2 + [m + b (alpha - 1) - alpha] k + b = 0,   c = 1 + (alpha - 1) k,   X = x - k
 *   n = ln{X0 (1 - beta Xn)/[Xn (1 - beta X0)]}/ln[alpha/(m c^2)],   beta = m c (alpha - 1)/(alpha - m c^2)
 *
 * Both roots are pinch points of the line, one below and one above the liquids of the section, and the ratio of the
 * distances to them changes by the factor c_above/c_below a stage; written with both, every difference keeps its digits
 * down to volatilities near 1. NaN where the line touches the curve.
 */
export function smokerStages(
  relativeVolatility: number,
  section: ColumnSection,
  from: number,
  to: number,
): number {
  const excess = relativeVolatility - 1;
  const { below, above, purityAbove } = pinchesOf(relativeVolatility, section);
  const step = from - to;
  const ratio = Math.log1p(step / (to - below)) + Math.log1p(step / (1 - from - purityAbove));
  return ratio / (Math.log1p(excess * above) - Math.log1p(excess * below));
}

interface Pinches {
  readonly below: number;
  readonly above: number;
  /** 1 - above, to its own digits. */
  readonly purityAbove: number;
}

/**
 * The roots, from the flows of both components: m (alpha - 1) k^2 - B k + b = 0, and the same for 1 - k. The sum of the
 * roots is taken with the discriminant in which nothing cancels.
 */
function pinchesOf(relativeVolatility: number, { liquid, vapor, lightUp, heavyUp }: ColumnSection): Pinches {
  const excess = relativeVolatility - 1;
  const square = (liquid / vapor) * excess;
  const light = lightUp / vapor;
  const heavy = heavyUp / vapor;
  const linear = light + heavy + excess * (1 - light);
  const linearHeavy = light + heavy + excess * heavy - square;
  const constantHeavy = -relativeVolatility * heavy;
  const discriminant =
    light > 0 ? linearHeavy * linearHeavy - 4 * square * constantHeavy : linear * linear - 4 * square * light;
  const [first, second] = roots(square, -linear, light, discriminant);
  const [firstHeavy, secondHeavy] = roots(square, linearHeavy, constantHeavy, discriminant);
  const purityAbove = Math.min(firstHeavy, secondHeavy);
  return { below: Math.min(first, second), above: 1 - purityAbove, purityAbove };
}

/** Both roots of a x^2 + b x + c without cancellation, from its discriminant. */
function roots(a: number, b: number, c: number, discriminant: number): [number, number] {
  const half = -0.5 * (b + (b < 0 ? -1 : 1) * Math.sqrt(discriminant));
  return [half / a, c / half];
}
