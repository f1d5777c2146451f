import { shown } from "../base/check";
import type { Issue } from "../base/errors";
import { didYouMean } from "../base/nearest";

/** Below this mole fraction there is less than one molecule in a mole of feed: the component is absent. */
export const leastFraction = 1e-24;

/** Volatilities nearer to one another than this, relative, are taken as one. */
export const leastVolatilityGap = 1e-6;

/** Position of a key among the names of the feed; -1 after a reported fault or when no names could be read. */
export function readKey(
  faults: Issue[],
  path: string,
  value: unknown,
  names: readonly string[] | undefined,
  fractions: Float64Array | undefined,
): number {
  if (typeof value !== "string") {
    const code = value === undefined ? "missing-field" : "wrong-type";
    faults.push({
      code,
      path,
      message: `${path} must name a component of the feed, got ${shown(value)}`,
      value,
    });
    return -1;
  }
  if (names === undefined) return -1;
  const position = names.indexOf(value);
  if (position >= 0 && (fractions === undefined || fractions[position]! >= leastFraction)) return position;
  const message =
    position < 0
      ? `${path} must be a component of the feed, got ${shown(value)}.${didYouMean(value, names)}`
      : `${path} must be present in the feed, but composition has ${fractions![position]} of ${shown(value)}; choose a component that is there`;
  faults.push({ code: "key-absent", path, message, value });
  return -1;
}

/** Reports keys of one volatility, or in the wrong order. */
export function checkKeyVolatilities(
  faults: Issue[],
  names: readonly string[],
  volatility: Float64Array,
  lightKey: number,
  heavyKey: number,
): void {
  const light = volatility[lightKey]!;
  const heavy = volatility[heavyKey]!;
  if (light - heavy > leastVolatilityGap * light) return;
  const path = `relativeVolatility.${names[lightKey]!}`;
  const equal = heavy - light <= leastVolatilityGap * light;
  const rule = `must exceed that of the heavy key ${shown(names[heavyKey])}, ${heavy}, got ${light}`;
  const wayOut = equal
    ? "these two cannot be told apart by distillation; choose other keys"
    : "the keys stand in the wrong order; swap lightKey and heavyKey";
  faults.push({
    code: equal ? "volatility-equal" : "keys-reversed",
    path: equal ? path : "lightKey",
    message: `${path} ${rule}: ${wayOut}`,
    value: light,
    limit: heavy,
  });
}
