import { type Fields, readFlag, shown } from "../base/check";
import { type NamedFractions, readComposition } from "../base/composition";
import type { Issue } from "../base/errors";
import { didYouMean } from "../base/nearest";
import type { Caution } from "../base/result";
import { leastFraction, readKey } from "../balance/keys";

/** Mole fractions of one key in the feed and in both products [-]. */
export interface KeyFractions {
  readonly name: string;
  readonly feed: number;
  readonly distillate: number;
  readonly bottoms: number;
}

/** Reads the two keys in feed and products; undefined after reported faults. */
export function readKeyFractions(
  faults: Issue[],
  fields: Fields,
): { readonly light: KeyFractions; readonly heavy: KeyFractions } | undefined {
  const before = faults.length;
  const normalize = readFlag(faults, "normalize", fields["normalize"]);
  const feed = readComposition(faults, "composition", fields["composition"], normalize);
  const lightKey = readKey(faults, "lightKey", fields["lightKey"], feed?.names, feed?.fractions);
  const heavyKey = readKey(faults, "heavyKey", fields["heavyKey"], feed?.names, feed?.fractions);
  if (lightKey >= 0 && lightKey === heavyKey) {
    const message = `heavyKey must be another component than lightKey, got ${shown(fields["heavyKey"])} for both`;
    faults.push({ code: "keys-equal", path: "heavyKey", message, value: fields["heavyKey"] });
  }
  const distillate = readProduct(faults, "distillate", fields["distillate"], normalize, feed);
  const bottoms = readProduct(faults, "bottoms", fields["bottoms"], normalize, feed);
  if (feed === undefined || distillate === undefined || bottoms === undefined || faults.length > before) {
    return undefined;
  }
  const of = (position: number): KeyFractions => {
    const name = feed.names[position]!;
    return {
      name,
      feed: feed.fractions[position]!,
      distillate: fractionOf(distillate, name),
      bottoms: fractionOf(bottoms, name),
    };
  };
  const light = of(lightKey);
  const heavy = of(heavyKey);
  requirePresent(faults, "bottoms", light.name, light.bottoms);
  requirePresent(faults, "distillate", heavy.name, heavy.distillate);
  return { light, heavy };
}

function fractionOf(product: NamedFractions, name: string): number {
  const position = product.names.indexOf(name);
  return position < 0 ? 0 : product.fractions[position]!;
}

/** Reads a product; a name that the feed has not is a fault. */
function readProduct(
  faults: Issue[],
  path: string,
  value: unknown,
  normalize: boolean,
  feed: NamedFractions | undefined,
): NamedFractions | undefined {
  const product = readComposition(faults, path, value, normalize);
  if (product === undefined || feed === undefined) return product;
  for (const name of product.names) {
    if (feed.names.includes(name)) continue;
    const message = `${path} names ${shown(name)}, which is not in the feed.${didYouMean(name, feed.names)}`;
    faults.push({ code: "missing-component", path: `${path}.${name}`, message, value: name });
  }
  return product;
}

function requirePresent(faults: Issue[], path: string, name: string, fraction: number): void {
  if (fraction >= leastFraction) return;
  const message = `${path} must hold some ${shown(name)}, got ${fraction}; a perfect separation has no feed stage`;
  faults.push({
    code: "key-absent",
    path: `${path}.${name}`,
    message,
    value: fraction,
    limit: leastFraction,
  });
}

/** Relative gap of a component balance that is more than rounding of the data. */
const noticeableGap = 0.02;

/** A caution for each key whose amount in the products is not that in the feed; `flows` is bottoms over distillate. */
export function judgeBalance(light: KeyFractions, heavy: KeyFractions, flows: number): Caution[] {
  const cautions: Caution[] = [];
  for (const key of [light, heavy]) {
    const out = (key.distillate + flows * key.bottoms) / (1 + flows);
    const gap = out / key.feed - 1;
    if (Math.abs(gap) <= noticeableGap) continue;
    cautions.push({
      code: "balance-not-closed",
      severity: "check",
      kind: "data",
      message: `the products hold ${(100 * Math.abs(gap)).toPrecision(3)} % ${gap > 0 ? "more" : "less"} ${key.name} than the feed`,
      value: gap,
      limit: noticeableGap,
    });
  }
  return cautions;
}
