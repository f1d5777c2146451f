import { refuseAsInfeasible } from "../base/errors";
import type { EquilibriumCurve } from "../staging/equilibriumCurve";
import type { StaircaseFault } from "../staging/stepStages";

const gridPoints = 500;

/** Refuses products on two sides of a point where the curve meets the diagonal. */
export function refuseAzeotrope(curve: EquilibriumCurve, xD: number, xB: number): void {
  if (curve.concave) return;
  const check = (x: number): void => {
    const y = curve.vapor(x);
    if (y > x) return;
    refuseAsInfeasible({
      code: "azeotrope-in-range",
      path: "distillateLightFraction",
      message: `distillateLightFraction ${xD} lies beyond a point where vapor and liquid are alike (x = ${x.toPrecision(4)}, y = ${Number.isFinite(y) ? y.toPrecision(4) : "none"}): no ordinary column gets past it; stay on one side, or change the pressure`,
      value: xD,
      limit: x,
    });
  };
  for (const x of curve.corners ?? []) if (x >= xB && x <= xD && x > 0 && x < 1) check(x);
  for (let i = 0; i <= gridPoints; i++) check(xB + ((xD - xB) * i) / gridPoints);
}

/** Turns the reason why no staircase can be drawn into the refusal that the engineer reads. */
export function refuseStaircase(
  fault: StaircaseFault,
  streamStages: readonly (number | undefined)[],
  refluxRatio: number,
): never {
  const stage = streamStages.find((given) => given !== undefined);
  if (fault === "too-many-stages") {
    return refuseAsInfeasible({
      code: "too-many-stages",
      path: "refluxRatio",
      message: `refluxRatio ${refluxRatio} takes more than 100 000 stages, which are not stepped one by one; raise it, or take smoker, which counts in closed form`,
      value: refluxRatio,
      limit: 100_000,
    });
  }
  const below = fault === "stream-below-bottom";
  return refuseAsInfeasible({
    code: below ? "stage-out-of-range" : "feed-stage-infeasible",
    path: "feedStage",
    message: below
      ? `feedStage ${stage} lies below the bottom of the column: the liquid is bottoms product before it gets there; take one farther up or "optimum"`
      : `feedStage ${stage} is not possible: the staircase leaves the diagram, so that no column has its feed there; take one farther down or "optimum"`,
    value: stage,
  });
}
