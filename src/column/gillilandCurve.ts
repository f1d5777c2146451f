import { type GillilandCorrelation, gillilandCorrelations } from "../shortcut/gillilandCorrelations";

/** A line for a figure. */
export interface Curve {
  readonly x: readonly number[];
  readonly y: readonly number[];
}

/** X from close to minimum reflux to close to total reflux, denser where the curve bends. */
const coordinates = Array.from({ length: 48 }, (_, i) => 0.002 + 0.948 * (i / 47) ** 2);

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

/** Stages against reflux ratio between the two minima: R = (Rmin + X)/(1 - X), N = (Nmin + Y)/(1 - Y). */
export function stagesAgainstRefluxCurve(
  correlation: GillilandCorrelation,
  minimumStages: number,
  minimumReflux: number,
): { readonly refluxRatio: readonly number[]; readonly stages: readonly number[] } {
  const { x, y } = gillilandCurve(correlation);
  const refluxRatio = new Array<number>(x.length);
  const stages = new Array<number>(x.length);
  for (let i = 0; i < x.length; i++) {
    refluxRatio[i] = (minimumReflux + x[i]!) / (1 - x[i]!);
    stages[i] = (minimumStages + y[i]!) / (1 - y[i]!);
  }
  return { refluxRatio, stages };
}
