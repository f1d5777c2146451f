import { logTicks } from "./logTicks";
import { axis } from "./theme";

/** The square of a McCabe-Thiele diagram: what is drawn on its axes, and where a point comes to lie. */
export interface DiagramAxes {
  readonly xaxis: Readonly<Record<string, unknown>>;
  readonly yaxis: Readonly<Record<string, unknown>>;
  /** What is drawn for a mole fraction of the light component. */
  readonly drawn: (fraction: number) => number;
  /** The same as annotations take it on these axes. */
  readonly annotated: (fraction: number) => number;
  /** Place of a fraction along the axis: 0 at its start, 1 at its end; both axes are alike. */
  readonly place: (fraction: number) => number;
  /** Lines that are straight in mole fractions, with points enough for these axes. */
  readonly curve: (line: Line) => Line;
}

interface Line {
  readonly x: readonly number[];
  readonly y: readonly number[];
}

/** Room beside the corners, for their marks [of the range]. */
const edge = 0.03;

/** Mole fractions from 0 to 1. */
export function wholeAxes(light: string): DiagramAxes {
  const range = [-edge, 1 + edge];
  const ticks = { range, tick0: 0, dtick: 0.2 };
  return {
    xaxis: axis(`${light} in the liquid, x`, "mol/mol", ticks),
    yaxis: axis(`${light} in the vapor, y`, "mol/mol", ticks),
    drawn: (fraction) => fraction,
    annotated: (fraction) => fraction,
    place: (fraction) => (fraction + edge) / (1 + 2 * edge),
    curve: (line) => line,
  };
}

/**
 * One end on logarithmic axes, where the steps of a high purity are as wide as all others: the light component towards
 * the bottoms, the heavy one (1 - x, 1 - y, falling to the right and upwards) towards the distillate.
 */
export function endAxes(
  end: "distillate" | "bottoms",
  least: number,
  light: string,
  heavy: string,
): DiagramAxes {
  const low = Math.log10(0.45 * least);
  const margin = -edge * low;
  const towardsTop = end === "distillate";
  const range = towardsTop ? [margin, low] : [low, margin];
  const more = { type: "log", range, ...logTicks(low, 0) };
  const name = towardsTop ? heavy : light;
  const drawn = (fraction: number): number => (towardsTop ? 1 - fraction : fraction);
  const annotated = (fraction: number): number => Math.log10(drawn(fraction));
  const place = (fraction: number): number => (annotated(fraction) - range[0]!) / (range[1]! - range[0]!);
  return {
    xaxis: axis(`${name} in the liquid, ${towardsTop ? "1 − x" : "x"}`, "mol/mol", more),
    yaxis: axis(`${name} in the vapor, ${towardsTop ? "1 − y" : "y"}`, "mol/mol", more),
    drawn,
    annotated,
    place,
    curve: ({ x, y }) => bent({ x: x.map(drawn), y: y.map(drawn) }, 10 ** (low - 1)),
  };
}

/** Adds points to the segments of a line so that logarithmic axes bend it as they must; drops what is below `least`. */
function bent({ x, y }: Line, least: number): Line {
  const points: [number, number][] = [];
  for (let i = 1; i < x.length; i++) {
    const [x1, y1, x2, y2] = [x[i - 1]!, y[i - 1]!, x[i]!, y[i]!];
    for (const t of shares(
      Math.max(x1, least) / Math.max(x2, least),
      Math.max(y1, least) / Math.max(y2, least),
    ))
      points.push([x1 + t * (x2 - x1), y1 + t * (y2 - y1)]);
  }
  points.push([x[x.length - 1]!, y[y.length - 1]!]);
  const seen = points.filter(([px, py]) => px >= least && py >= least);
  return { x: seen.map(([px]) => px), y: seen.map(([, py]) => py) };
}

/** Shares of a segment, 1 excluded, that lie evenly on a logarithmic axis; few where the segment is short there. */
function shares(xRatio: number, yRatio: number): number[] {
  const ratio = Math.abs(Math.log(xRatio)) > Math.abs(Math.log(yRatio)) ? xRatio : yRatio;
  const count = Math.min(60, Math.ceil(4 * Math.abs(Math.log(ratio))));
  const even = (k: number): number => (ratio ** (-k / count) - 1) / (1 / ratio - 1);
  return Array.from({ length: Math.max(1, count) }, (_, k) => (k === 0 ? 0 : even(k)));
}
