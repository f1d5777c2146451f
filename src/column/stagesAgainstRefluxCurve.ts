import { gillilandCurve } from "../shortcut/gillilandCurve";
import type { GillilandCorrelation } from "../shortcut/gillilandCorrelations";

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
