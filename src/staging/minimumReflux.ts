import { findRoot } from "../numerics/findRoot";
import { type BinaryColumn, type ColumnFlows, columnFlows, operatingVapor } from "./binaryColumn";
import type { EquilibriumCurve } from "./equilibriumCurve";
import { feedPinch } from "./feedLine";

/** What keeps the reflux from going lower. */
export type RefluxLimitedBy = "feed-pinch" | "tangent-pinch" | "vanishing-flow";

/** The least reflux ratio with which the operating lines stay under the equilibrium curve. */
export interface MinimumReflux {
  readonly minimumReflux: number;
  readonly limitedBy: RefluxLimitedBy;
  /** (x, y) where operating line and equilibrium curve touch. */
  readonly pinch: readonly [number, number];
}

interface Gap {
  readonly value: number;
  readonly x: number;
  readonly inside: boolean;
}

const mostReflux = 1e9;
const gridPoints = 400;

/**
 * Minimum reflux of a binary column with any streams and any equilibrium curve: the reflux at which the least distance
 * of the operating lines from the curve is zero. On a concave curve that distance is least where two lines meet; on any
 * other the whole section is searched. Undefined when no reflux up to 1e9 opens a gap.
 */
export function minimumReflux(curve: EquilibriumCurve, column: BinaryColumn): MinimumReflux | undefined {
  const vanishing = vanishingFlowReflux(column);
  const gap = (reflux: number): Gap => leastGap(curve, column, columnFlows(column, reflux));
  const above = (reflux: number): number => reflux + 1e-12 * (1 + Math.abs(reflux));
  if (gap(above(vanishing)).value > 0) {
    return { minimumReflux: vanishing, limitedBy: "vanishing-flow", pinch: richestPinch(curve, column) };
  }
  let high = Math.max(1, 2 * vanishing);
  while (!(gap(high).value > 0)) {
    high *= 2;
    if (high > mostReflux) return undefined;
  }
  const reflux = findRoot((r) => gap(r).value, above(vanishing), high, 1e-14);
  if (reflux === undefined) return undefined;
  const { x, inside } = gap(reflux);
  const touching = { minimumReflux: reflux, pinch: [x, curve.vapor(x)] as const };
  return { ...touching, limitedBy: inside ? "tangent-pinch" : "feed-pinch" };
}

/** The pinch at the stream nearest the top, for a column that no pinch limits. */
function richestPinch(curve: EquilibriumCurve, column: BinaryColumn): [number, number] {
  return feedPinch(curve, column.streams[0]!);
}

/** The reflux below which a section has no liquid or no vapor. */
export function vanishingFlowReflux(column: BinaryColumn): number {
  const spare = (reflux: number): number => {
    const { distillate, sections } = columnFlows(column, reflux);
    return Math.min(distillate, ...sections.map(({ liquid, vapor }) => Math.min(liquid, vapor)));
  };
  if (spare(1e-300) >= 0) return 0;
  let high = 1;
  while (!(spare(high) >= 0) && high < mostReflux) high *= 2;
  return findRoot(spare, 0, high, 1e-15) ?? high;
}

/** Least of curve minus operating line over all sections between the two products. */
function leastGap(curve: EquilibriumCurve, column: BinaryColumn, flows: ColumnFlows): Gap {
  const { sections, intersections } = flows;
  let least: Gap = { value: Infinity, x: 0, inside: false };
  sections.forEach((section, k) => {
    if (!(section.vapor > 0) || !(section.liquid > 0)) least = { value: -Infinity, x: 0, inside: false };
    const distance = (x: number): number => curve.vapor(x) - operatingVapor(section, x);
    const x = intersections[k];
    if (x !== undefined && distance(clip(x)) < least.value) {
      least = { value: distance(clip(x)), x: clip(x), inside: false };
    }
    if (curve.concave) return;
    const upper = k === 0 ? column.distillateLightFraction : clip(intersections[k - 1]!);
    const lower = x === undefined ? column.bottomsLightFraction : clip(x);
    const found = leastInside(distance, lower, upper, curve.corners);
    if (found.value < least.value) least = found;
  });
  return least;
}

const clip = (x: number): number => Math.min(1, Math.max(0, x));

/** Least distance strictly inside a section: over a grid and the corners of the curve, then refined. */
function leastInside(
  distance: (x: number) => number,
  lower: number,
  upper: number,
  corners?: Float64Array,
): Gap {
  let best = { value: Infinity, x: lower };
  const step = (upper - lower) / gridPoints;
  if (!(step > 0)) return { ...best, inside: true };
  for (let i = 1; i < gridPoints; i++) {
    const x = lower + i * step;
    const value = distance(x);
    if (value < best.value) best = { value, x };
  }
  best = refined(distance, best, Math.max(lower, best.x - step), Math.min(upper, best.x + step));
  for (const x of corners ?? []) {
    if (x > lower && x < upper && distance(x) < best.value) best = { value: distance(x), x };
  }
  return { ...best, inside: true };
}

/** Golden-section search for the least distance between two neighbors of a grid point. */
function refined(
  distance: (x: number) => number,
  best: { value: number; x: number },
  from: number,
  to: number,
) {
  const golden = (Math.sqrt(5) - 1) / 2;
  let low = from;
  let high = to;
  let found = best;
  for (let i = 0; i < 60; i++) {
    const left = high - golden * (high - low);
    const right = low + golden * (high - low);
    const [valueLeft, valueRight] = [distance(left), distance(right)];
    if (valueLeft < found.value) found = { value: valueLeft, x: left };
    if (valueRight < found.value) found = { value: valueRight, x: right };
    if (valueLeft < valueRight) high = right;
    else low = left;
  }
  return found;
}
