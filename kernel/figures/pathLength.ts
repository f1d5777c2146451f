/** A point in a drawing. */
export interface Point {
  readonly x: number;
  readonly y: number;
}

/** Corners of a path made of straight lines between absolute points, which is how plotly.js draws arrows. */
function corners(path: string): Point[] {
  const numbers = (path.match(/-?\d*\.?\d+(?:e[+-]?\d+)?/gi) ?? []).map(Number);
  return Array.from({ length: Math.floor(numbers.length / 2) }, (_, i) => ({
    x: numbers[2 * i]!,
    y: numbers[2 * i + 1]!,
  }));
}

function distance(from: Point, to: Point): number {
  return Math.hypot(to.x - from.x, to.y - from.y);
}

/** Length along the path. */
export function pathLength(path: string): number {
  const points = corners(path);
  return points.reduce((sum, point, i) => (i === 0 ? 0 : sum + distance(points[i - 1]!, point)), 0);
}

/** The point at a length along the path. */
export function pointAtLength(path: string, length: number): Point {
  const points = corners(path);
  let left = length;
  for (let i = 1; i < points.length; i++) {
    const from = points[i - 1]!;
    const to = points[i]!;
    const step = distance(from, to);
    if (left <= step && step > 0) {
      return { x: from.x + (left / step) * (to.x - from.x), y: from.y + (left / step) * (to.y - from.y) };
    }
    left -= step;
  }
  return points[points.length - 1] ?? { x: 0, y: 0 };
}
