import type { ColumnSection } from "./binaryColumn";

/**
 * Equilibrium stages of one section between the liquids `from` and `to`, in closed form for a constant relative
 * volatility and a straight operating line y = m x + b (Smoker):
 *
 *   k a root of m (alpha - 1) k^2 + [m + b (alpha - 1) - alpha] k + b = 0,   c = 1 + (alpha - 1) k,   X = x - k
 *   n = ln{X0 (1 - beta Xn)/[Xn (1 - beta X0)]}/ln[alpha/(m c^2)],   beta = m c (alpha - 1)/(alpha - m c^2)
 *
 * Either root gives the same n; both stand for the pinch points of the line. NaN where the line touches the curve.
 */
export function smokerStages(
  relativeVolatility: number,
  section: ColumnSection,
  from: number,
  to: number,
): number {
  const excess = relativeVolatility - 1;
  const m = section.liquid / section.vapor;
  const b = section.lightUp / section.vapor;
  const linear = m + b * excess - relativeVolatility;
  const discriminant = linear * linear - 4 * m * excess * b;
  if (!(discriminant > 0)) return Number.NaN;
  const sum = -0.5 * (linear + Math.sign(linear || 1) * Math.sqrt(discriminant));
  // The upper and the lower pinch of the line, without cancellation: sum/(m excess) and b/sum.
  const first = sum / (m * excess);
  const second = b / sum;
  // Ratio of the distances to both pinches changes by a constant factor a stage.
  const ratio = ((from - second) * (to - first)) / ((to - second) * (from - first));
  const factor = (1 + excess * first) / (1 + excess * second);
  return Math.log(ratio) / Math.log(factor);
}
