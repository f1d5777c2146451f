import { readChoice, readFields, shown } from "../base/check";
import type { Issue } from "../base/errors";
import { type EquilibriumCurve, linearCurve, monotoneCurve } from "./equilibriumCurve";

/** A measured or computed equilibrium curve: points (x, y) of the light component, and how to read between them. */
export interface EquilibriumPoints {
  /** x and y rise from point to point; (0, 0) and (1, 1) are added where they are missing. */
  readonly points: readonly (readonly [number, number])[];
  readonly interpolation: "linear" | "monotone";
}

const mostPoints = 10_000;
/** Points nearer than this are one point: a slope between them would be noise. */
const leastStep = 1e-12;

/** Reads an equilibrium curve given by points; undefined after a reported fault. */
export function readEquilibriumPoints(
  faults: Issue[],
  path: string,
  value: unknown,
): EquilibriumCurve | undefined {
  const before = faults.length;
  const fields = readFields(faults, path, value, new Set(["points", "interpolation"]));
  if (fields === undefined) return undefined;
  const interpolation = readChoice(faults, `${path}.interpolation`, fields["interpolation"] ?? null, [
    "linear",
    "monotone",
  ]);
  const points = readPoints(faults, `${path}.points`, fields["points"]);
  if (faults.length > before) return undefined;
  const xs = Float64Array.from(points, ([x]) => x);
  const ys = Float64Array.from(points, ([, y]) => y);
  return interpolation === "linear" ? linearCurve(xs, ys) : monotoneCurve(xs, ys);
}

function readPoints(faults: Issue[], path: string, value: unknown): [number, number][] {
  if (!Array.isArray(value) || value.length === 0 || value.length > mostPoints) {
    const message = `${path} must be a list of 1 to ${mostPoints} points [x, y], got ${shown(value)}`;
    faults.push({
      code: value === undefined ? "missing-field" : "wrong-type",
      path,
      message,
      value: shown(value),
    });
    return [];
  }
  const points: [number, number][] = [];
  for (let i = 0; i < value.length && faults.length < 20; i++) {
    const point = readPoint(faults, `${path}[${i}]`, value[i], points[points.length - 1]);
    if (point !== undefined) points.push(point);
  }
  if (points[0] === undefined || points[0][0] > 0) points.unshift([0, 0]);
  if (points[points.length - 1]![0] < 1) points.push([1, 1]);
  return points;
}

function readPoint(
  faults: Issue[],
  path: string,
  value: unknown,
  last: [number, number] | undefined,
): [number, number] | undefined {
  const isPoint =
    Array.isArray(value) && value.length === 2 && value.every((v) => Number.isFinite(v) && v >= 0 && v <= 1);
  const [x, y] = isPoint ? (value as [number, number]) : [Number.NaN, Number.NaN];
  const rises = last === undefined || (x - last[0] > leastStep && y - last[1] > leastStep);
  // The ends of a binary are its pure components: (0, 0) and (1, 1), and nothing else on the edges.
  const isEdge = (x === 0) !== (y === 0) || (x === 1) !== (y === 1);
  if (isPoint && rises && !isEdge) return [x, y];
  const rule = isPoint
    ? "x and y must rise from (0, 0) to (1, 1), point by point"
    : "must be [x, y], two mole fractions from 0 to 1";
  const message = `${path}: ${rule}, got ${JSON.stringify(value)?.slice(0, 60) ?? shown(value)}`;
  faults.push({ code: "curve-not-valid", path, message, value });
  return undefined;
}
