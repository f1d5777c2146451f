import { formatNumber } from "../base/displayUnits";
import type { CurveByComponent } from "../equilibrium/volatilityCurve";
import { labelHeights } from "./labelHeights";
import { logTicks } from "./logTicks";
import { plainText, shortName } from "./plainText";
import { palette, wide, words } from "./theme";

const colors = [palette.spruce, palette.rust, palette.iris, palette.ink] as const;
const dashes = [
  "solid",
  "dash",
  "dot",
  "dashdot",
  "longdash",
  "12px,3px,2px,3px,2px,3px",
  "4px,2px",
] as const;

/** Room for the names beside the frame. */
export const volatilityMargin = { l: 72, r: 172, t: 60, b: 52 } as const;
/** A line that ends beyond this share of the width is labeled beside the frame. */
const nearEnd = 0.7;

/** One component's values along the temperatures. */
export interface VolatilityLine {
  readonly name: string;
  readonly label: string;
  readonly values: readonly (number | null)[];
  /** At the lowest and the highest temperature at which there is a value. */
  readonly first: number;
  readonly last: number;
  readonly style: { readonly color: string; readonly dash: string };
}

/** Components with a value somewhere; neighbors differ in color and dash. */
export function volatilityLines(volatility: CurveByComponent): VolatilityLine[] {
  const known = Object.entries(volatility).flatMap(([name, values]) => {
    const numbers = values.filter((value) => value !== null && value > 0) as number[];
    return numbers.length === 0
      ? []
      : [{ name, values, first: numbers[0]!, last: numbers[numbers.length - 1]! }];
  });
  return known.map((each, i) => ({
    ...each,
    label: plainText(shortName(each.name, 18)),
    style: { color: colors[i % colors.length]!, dash: dashes[i % dashes.length]! },
  }));
}

/** The vertical axis of the values. */
export interface ValueAxis {
  readonly ticks: Readonly<Record<string, unknown>>;
  /** A value as annotations take it on this axis. */
  readonly scale: (value: number) => number;
  /** Height of a value, 0 to 1. */
  readonly place: (value: number) => number;
}

/** Logarithmic where the values span more than a factor of four. */
export function valueAxis(lines: readonly VolatilityLine[]): ValueAxis {
  const values = lines.flatMap((each) =>
    each.values.filter((value) => value !== null && value > 0),
  ) as number[];
  const least = values.length === 0 ? 1 : Math.min(...values);
  const most = values.length === 0 ? 1 : Math.max(...values);
  const isLog = most > 4 * least;
  const scale = isLog ? Math.log10 : (value: number) => value;
  const room = 0.06 * (scale(most) - scale(least)) || 0.1;
  const low = scale(least) - 2 * room;
  const high = scale(most) + room;
  return {
    scale,
    place: (value: number): number => (scale(value) - low) / (high - low),
    ticks: { range: [low, high], ...(isLog ? { type: "log", ...logTicks(low, high) } : {}) },
  };
}

/** Name and last value of each line: beside the frame, or where the line ends before it. */
export function volatilityLabels(
  lines: readonly VolatilityLine[],
  temperature: readonly number[],
  axis: ValueAxis,
) {
  const throughout = lines.filter(({ values }) => lastKnown(values) > nearEnd * values.length);
  const heights = labelHeights(
    throughout.map(({ last }) => axis.place(last)),
    (wide.height - volatilityMargin.t - volatilityMargin.b) / 15,
  );
  const beside = heights.map(({ index, height }) =>
    labelOf(throughout[index]!, 1, height, { xref: "paper", yref: "paper", xshift: 4 }),
  );
  const within = lines
    .filter((each) => !throughout.includes(each))
    .map((each) => labelOf(each, temperature[lastKnown(each.values)]!, axis.scale(each.last), { xshift: 5 }));
  return [...beside, ...within];
}

function labelOf({ label, last, style }: VolatilityLine, x: number, y: number, more: object) {
  const font = { size: 12, color: style.color };
  return words(`${label} ${formatNumber(last, 3)}`, x, y, {
    xanchor: "left",
    yanchor: "middle",
    font,
    ...more,
  });
}

function lastKnown(values: readonly (number | null)[]): number {
  let last = values.length - 1;
  while (last > 0 && values[last] === null) last--;
  return last;
}
