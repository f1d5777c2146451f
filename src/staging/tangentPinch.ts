import { findRoot } from "../numerics/findRoot";
import { type BinaryColumn, type ColumnFlows, columnFlows } from "./binaryColumn";
import type { CurveTable } from "./curveTable";
import type { EquilibriumCurve } from "./equilibriumCurve";
import { pinchReflux } from "./limitingReflux";

/** A liquid at which an operating line touches the equilibrium curve, and the reflux ratio of that line. */
export interface TangentPinch {
  readonly reflux: number;
  readonly x: number;
}

const mostReflux = 1e15;
/** A gap within rounding of zero, in parts of the vapor. */
const noGap = 1e-13;

/**
 * The tangent pinch that asks for more reflux than `known`; undefined when there is none. The table tells the reflux to
 * the width of its intervals; around every narrowest place the reflux that just touches is then maximized.
 */
export function tangentPinch(
  curve: EquilibriumCurve,
  column: BinaryColumn,
  table: CurveTable,
  known: number,
): TangentPinch | undefined {
  const start = refluxOnTable(column, table, known * (1 + 1e-12));
  if (start === undefined) return { reflux: Infinity, x: column.distillateLightFraction };
  const flows = columnFlows(column, start);
  let highest: TangentPinch | undefined;
  let limit = known * (1 + 1e-12) + 1e-15;
  for (let k = 0; k < flows.sections.length; k++) {
    for (const [from, at, to] of narrowPlaces(column, flows, table, k)) {
      const refluxAt = (x: number): number => pinchReflux(column, k, x, curve.vapor(x));
      // A corner of the curve is a point of the table, which the search between its neighbors only comes close to.
      const candidates = [{ reflux: refluxAt(at), x: at }, largest(refluxAt, from, to)];
      for (const touching of candidates) {
        if (!(touching.reflux > limit)) continue;
        highest = touching;
        limit = touching.reflux;
      }
    }
  }
  return highest;
}

/** The least reflux, from `known` up, at which no point of the table is above the curve. */
function refluxOnTable(column: BinaryColumn, table: CurveTable, known: number): number | undefined {
  const gap = (reflux: number): number => leastGap(column, columnFlows(column, reflux), table);
  if (gap(known) >= -noGap) return known;
  let high = Math.max(1, 2 * known);
  while (!(gap(high) > 0)) {
    high *= 2;
    if (high > mostReflux) return undefined;
  }
  return findRoot(gap, known, high, 1e-13);
}

/** Liquids between which section k is in force. */
function sectionEnds(column: BinaryColumn, { intersections }: ColumnFlows, k: number): [number, number] {
  const upper = k === 0 ? column.distillateLightFraction : intersections[k - 1]!;
  const lower = k === intersections.length ? column.bottomsLightFraction : intersections[k]!;
  return [lower, upper];
}

/** Positions of the table inside a section: first, and one past the last. */
function range(column: BinaryColumn, flows: ColumnFlows, { x }: CurveTable, k: number): [number, number] {
  const [lower, upper] = sectionEnds(column, flows, k);
  return [positionAfter(x, lower), positionAfter(x, upper)];
}

/** The first position whose x exceeds a value. */
function positionAfter(x: Float64Array, value: number): number {
  let low = 0;
  let high = x.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (x[middle]! <= value) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** Least of curve minus operating line over the table, in parts of the top vapor. */
function leastGap(column: BinaryColumn, flows: ColumnFlows, table: CurveTable): number {
  const { x, y } = table;
  let least = Infinity;
  for (let k = 0; k < flows.sections.length; k++) {
    const { liquid, vapor, lightUp } = flows.sections[k]!;
    const [first, end] = range(column, flows, table, k);
    for (let i = first; i < end; i++) {
      const gap = vapor * y[i]! - liquid * x[i]! - lightUp;
      if (gap < least) least = gap;
    }
  }
  return least / flows.sections[0]!.vapor;
}

/** Points of a section at which the gap is no wider than on both sides, each between its neighbors. */
function narrowPlaces(
  column: BinaryColumn,
  flows: ColumnFlows,
  table: CurveTable,
  k: number,
): [number, number, number][] {
  const { x, y } = table;
  const { liquid, vapor, lightUp } = flows.sections[k]!;
  const [first, end] = range(column, flows, table, k);
  const gap = (i: number): number =>
    i < first || i >= end ? Infinity : vapor * y[i]! - liquid * x[i]! - lightUp;
  const places: [number, number, number][] = [];
  for (let i = first; i < end; i++) {
    if (gap(i) > gap(i - 1) || gap(i) > gap(i + 1)) continue;
    const [lower, upper] = sectionEnds(column, flows, k);
    places.push([Math.max(lower, x[i - 1] ?? lower), x[i]!, Math.min(upper, x[i + 1] ?? upper)]);
  }
  return places;
}

const golden = (Math.sqrt(5) - 1) / 2;

/** Golden-section search for the largest reflux between two liquids. */
function largest(refluxAt: (x: number) => number, from: number, to: number): TangentPinch {
  let low = from;
  let high = to;
  let left = high - golden * (high - low);
  let right = low + golden * (high - low);
  let atLeft = refluxAt(left);
  let atRight = refluxAt(right);
  for (let i = 0; i < 45; i++) {
    if (atLeft > atRight) {
      high = right;
      right = left;
      atRight = atLeft;
      left = high - golden * (high - low);
      atLeft = refluxAt(left);
    } else {
      low = left;
      left = right;
      atLeft = atRight;
      right = low + golden * (high - low);
      atRight = refluxAt(right);
    }
  }
  return atLeft > atRight ? { reflux: atLeft, x: left } : { reflux: atRight, x: right };
}
