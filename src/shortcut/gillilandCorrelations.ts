/** A correlation of Gilliland's points, as ln(1 − Y) against X; Y = (N − Nmin)/(N + 1), X = (R − Rmin)/(R + 1). */
export type GillilandCorrelation = "molokanov" | "eduljee" | "liddle";

/** ln(1 − Y) of Molokanov et al. (1972); exact at both ends. */
export function molokanov(x: number): number {
  return (((1 + 54.4 * x) / (11 + 117.2 * x)) * (x - 1)) / Math.sqrt(x);
}

/** ln(1 − Y) of Eduljee (1975), Y = 0.75 (1 − X^0.5668); no good below X = 0.01, where Y ends at 0.75. */
export function eduljee(x: number): number {
  return Math.log1p(-0.75 * (1 - x ** 0.5668));
}

/** ln(1 − Y) of Liddle (1968), in three pieces. */
export function liddle(x: number): number {
  if (x <= 0.01) return Math.log(18.5715 * x);
  return Math.log1p(x < 0.9 ? 0.591422 * x - 0.545827 - 0.002743 / x : 0.16595 * (x - 1));
}

/** Each correlation by its name. */
export const gillilandCorrelations: Readonly<Record<GillilandCorrelation, (x: number) => number>> = {
  molokanov,
  eduljee,
  liddle,
};

/** N from ln(1 − Y): N = (Nmin + Y)/(1 − Y). */
export function stagesFrom(minimumStages: number, logOneMinusY: number): number {
  return (minimumStages + 1) * Math.exp(-logOneMinusY) - 1;
}

/** Gilliland's X. */
export function refluxCoordinate(minimumReflux: number, refluxRatio: number): number {
  return (refluxRatio - minimumReflux) / (refluxRatio + 1);
}
