import { refuseAsInfeasible } from "../base/errors";
import type { TypedStream } from "../staging/binaryInput";
import type { CurveTable } from "../staging/curveTable";
import type { StaircaseFault } from "../staging/stepStages";

const short = (value: number): string => (Number.isFinite(value) ? value.toPrecision(4) : "none");

/** Refuses products on two sides of a point where the curve meets the diagonal. */
export function refuseAzeotrope({ x, y }: CurveTable, xD: number): void {
  const at = x.findIndex((each, i) => !(y[i]! > each));
  if (at < 0) return;
  const exchanged = x.every((each, i) => y[i]! < each);
  const reason = exchanged
    ? "all of the curve lies below the diagonal: x and y seem to be of the heavy component"
    : `it lies beyond a point where vapor and liquid are alike (x = ${short(x[at]!)}, y = ${short(y[at]!)}), which no ordinary column gets past; stay on one side, or change the pressure`;
  refuseAsInfeasible({
    code: "azeotrope-in-range",
    path: "distillateLightFraction",
    message: `distillateLightFraction ${xD} cannot be reached: ${reason}`,
    value: xD,
    limit: x[at]!,
  });
}

/** Refuses products that no reflux parts. */
export function refuseNoReflux(xD: number): never {
  return refuseAsInfeasible({
    code: "specification-infeasible",
    path: "distillateLightFraction",
    message: `distillateLightFraction ${xD} cannot be reached at any reflux ratio: the operating lines never leave the equilibrium curve; check the curve near the products`,
    value: xD,
  });
}

/** Refuses products so far apart, or a curve so flat, that total reflux takes more stages than are stepped. */
export function refuseMinimumStages(xD: number): never {
  return refuseAsInfeasible({
    code: "too-many-stages",
    path: "distillateLightFraction",
    message: `distillateLightFraction ${xD} takes more than 100 000 stages even at total reflux; ask for less`,
    value: xD,
    limit: 100_000,
  });
}

/** Turns the reason why no staircase can be drawn into the refusal that the engineer reads. */
export function refuseStaircase(
  { reason, stream }: StaircaseFault,
  streams: readonly TypedStream[],
  reflux: { readonly field: string; readonly value: number },
): never {
  const at = streams[stream];
  const staged = at?.stage === undefined ? streams.find(({ stage }) => stage !== undefined) : at;
  if (reason === "too-many-stages" || (reason === "stands-still" && staged === undefined)) {
    return refuseTooManyStages(reflux);
  }
  if (reason === "stream-below-bottom") return refuseBelowBottom(at!);
  if (staged === undefined) return refuseJoining(at ?? streams[0]!);
  const { stage, stagePath } = staged;
  const why =
    reason === "stands-still"
      ? "below it the staircase stands still at a pinch"
      : "the staircase leaves the diagram, so that no column has its feed there";
  return refuseAsInfeasible({
    code: "feed-stage-infeasible",
    path: stagePath,
    message: `${stagePath} ${stage} is not possible: ${why}; take one farther down or leave it out`,
    value: stage,
  });
}

function refuseTooManyStages({ field, value }: { readonly field: string; readonly value: number }): never {
  return refuseAsInfeasible({
    code: "too-many-stages",
    path: field,
    message: `${field} ${value} takes more than 100 000 stages, which are not stepped one by one; raise it, or take smoker, which counts in closed form`,
    value,
    limit: 100_000,
  });
}

function refuseBelowBottom({ path, stage, stagePath, lightFraction }: TypedStream): never {
  if (stage === undefined) {
    return refuseAsInfeasible({
      code: "specification-infeasible",
      path: `${path}.lightFraction`,
      message: `${path}.lightFraction ${lightFraction} joins nowhere: the stage at which the operating lines meet lies below the bottom of the column; give it a stage`,
      value: lightFraction,
    });
  }
  return refuseAsInfeasible({
    code: "stage-out-of-range",
    path: stagePath,
    message: `${stagePath} ${stage} lies below the bottom of the column: the liquid is bottoms product before it gets there; take one farther up or leave it out`,
    value: stage,
  });
}

function refuseJoining({ path, lightFraction }: TypedStream): never {
  return refuseAsInfeasible({
    code: "feed-stage-infeasible",
    path: `${path}.lightFraction`,
    message: `${path}.lightFraction ${lightFraction}: below the stage at which the operating lines meet the staircase leaves the diagram; give the streams their stages`,
    value: lightFraction,
  });
}
