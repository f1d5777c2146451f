import type { BinaryColumn } from "./binaryColumn";
import type { CurveTable } from "./curveTable";
import type { EquilibriumCurve } from "./equilibriumCurve";
import { feedPinch } from "./feedLine";
import { pinchReflux, vanishingFlowReflux } from "./limitingReflux";
import { tangentPinch } from "./tangentPinch";

/** What keeps the reflux from going lower. */
export type RefluxLimitedBy = "feed-pinch" | "tangent-pinch" | "vanishing-flow";

/** The least reflux ratio with which the operating lines stay under the equilibrium curve. */
export interface MinimumReflux {
  /** Infinite when no reflux does. */
  readonly minimumReflux: number;
  readonly limitedBy: RefluxLimitedBy;
  /** (x, y) where operating line and equilibrium curve touch; of the topmost stream when no pinch sets the limit. */
  readonly pinch: readonly [number, number];
}

/**
 * Minimum reflux of a binary column with any streams and any equilibrium curve: the largest of
 *
 *   the reflux at which the flow of a section vanishes
 *   the reflux at which two operating lines meet on the curve, one for every stream
 *   the reflux at which an operating line touches the curve between such points, searched from the curve's table;
 *   on a concave curve there is none, and no table is needed
 *
 * The first two in closed form: at a given point V y - L x - N is linear in the reflux ratio.
 */
export function minimumReflux(
  curve: EquilibriumCurve,
  column: BinaryColumn,
  table?: CurveTable,
): MinimumReflux {
  const pinches = column.streams.map((stream) => feedPinch(curve, stream));
  let least: MinimumReflux = {
    minimumReflux: vanishingFlowReflux(column),
    limitedBy: "vanishing-flow",
    pinch: pinches[0]!,
  };
  pinches.forEach((pinch, k) => {
    const reflux = pinchReflux(column, k, pinch[0], pinch[1]);
    if (reflux > least.minimumReflux) least = { minimumReflux: reflux, limitedBy: "feed-pinch", pinch };
  });
  if (table === undefined || !Number.isFinite(least.minimumReflux)) return least;
  const tangent = tangentPinch(curve, column, table, least.minimumReflux);
  if (tangent === undefined) return least;
  const { reflux, x } = tangent;
  return { minimumReflux: reflux, limitedBy: "tangent-pinch", pinch: [x, curve.vapor(x)] };
}
