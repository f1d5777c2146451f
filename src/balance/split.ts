import { type Fields, readFlag, readNumber, shown } from "../base/check";
import { readComposition } from "../base/composition";
import { type Issue, refuseAsInfeasible } from "../base/errors";
import type { ByComponent } from "../base/result";
import { checkKeyVolatilities, readKey } from "./keys";
import { readVolatilities } from "./volatilities";

/** How a column is to split a feed: two keys, two recoveries, and the volatility of every component. */
export interface SplitInput {
  /** Mole fractions of the feed, by name; they add up to 1 within 1e-6. */
  readonly composition: ByComponent;
  /** K-value or volatility of each component [-], all over one common reference. */
  readonly relativeVolatility: ByComponent;
  /** Name of the light key: the less volatile of the components that go mainly to the distillate. */
  readonly lightKey: string;
  /** Name of the heavy key: the more volatile of the components that go mainly to the bottoms. */
  readonly heavyKey: string;
  /** Fraction of the feed's light key that leaves in the distillate, 0 to 1. */
  readonly lightKeyRecovery: number;
  /** Fraction of the feed's heavy key that leaves in the bottoms, 0 to 1. */
  readonly heavyKeyRecovery: number;
  /** Scale a composition that does not add up to 1. */
  readonly normalize?: boolean;
}

/** A checked split; the lists are in the order of `names`, the keys are positions in them. */
export interface Split {
  readonly names: readonly string[];
  /** Feed mole fractions [-]. */
  readonly fractions: Float64Array;
  /** Relative volatility to the heavy key [-]. */
  readonly volatility: Float64Array;
  readonly lightKey: number;
  readonly heavyKey: number;
  readonly lightKeyRecovery: number;
  readonly heavyKeyRecovery: number;
}

const recoveryLimits = {
  above: 0,
  below: 1,
  code: "recovery-out-of-range",
  hint: "give the fraction that is recovered, such as 0.99; a full recovery needs endless stages",
} as const;

/** Reads the fields of `SplitInput`; undefined after reported faults. */
export function readSplit(faults: Issue[], fields: Fields): Split | undefined {
  const before = faults.length;
  const normalize = readFlag(faults, "normalize", fields["normalize"]);
  const feed = readComposition(faults, "composition", fields["composition"], normalize);
  const names = feed === undefined ? namesOf(fields["composition"]) : feed.names;
  const volatility = readVolatilities(faults, "relativeVolatility", fields["relativeVolatility"], names);
  const keys = readKeysAndRecoveries(faults, fields, names, feed?.fractions, "composition");
  if (volatility !== undefined && keys !== undefined) {
    checkKeyVolatilities(faults, names!, volatility, keys.lightKey, keys.heavyKey);
  }
  if (faults.length > before) return undefined;
  const split = { names: feed!.names, fractions: feed!.fractions, volatility: volatility!, ...keys! };
  return scaleToHeavyKey(faults, split) ? split : undefined;
}

/** The keys, as positions among the names of the feed, and their recoveries. */
export type KeysAndRecoveries = Pick<
  Split,
  "lightKey" | "heavyKey" | "lightKeyRecovery" | "heavyKeyRecovery"
>;

/** Reads keys and recoveries; undefined after a fault of the keys. `path` is where the feed's composition stands. */
export function readKeysAndRecoveries(
  faults: Issue[],
  fields: Fields,
  names: readonly string[] | undefined,
  fractions: Float64Array | undefined,
  path: string,
): KeysAndRecoveries | undefined {
  const before = faults.length;
  const lightKey = readKey(faults, "lightKey", fields["lightKey"], names, fractions);
  const heavyKey = readKey(faults, "heavyKey", fields["heavyKey"], names, fractions);
  if (fractions !== undefined && fractions.length < 2) {
    const message = `${path} must name at least 2 components, got 1; one component cannot be split`;
    faults.push({ code: "empty", path, message, value: 1, limit: 2 });
  }
  if (typeof fields["lightKey"] === "string" && fields["lightKey"] === fields["heavyKey"]) {
    const message = `heavyKey must be another component than lightKey, got ${shown(fields["heavyKey"])} for both`;
    faults.push({ code: "keys-equal", path: "heavyKey", message, value: fields["heavyKey"] });
  }
  const sound = faults.length === before && names !== undefined;
  const lightKeyRecovery = readNumber(faults, "lightKeyRecovery", fields["lightKeyRecovery"], recoveryLimits);
  const heavyKeyRecovery = readNumber(faults, "heavyKeyRecovery", fields["heavyKeyRecovery"], recoveryLimits);
  return sound ? { lightKey, heavyKey, lightKeyRecovery, heavyKeyRecovery } : undefined;
}

/** The names of a composition that has other faults, so that the fields beside it can still be checked. */
function namesOf(composition: unknown): readonly string[] | undefined {
  return typeof composition === "object" && composition !== null && !Array.isArray(composition)
    ? Object.keys(composition)
    : undefined;
}

/** Refuses recoveries that would leave the distillate no richer in the light key than in the heavy one. */
export function refuseReversedSplit(split: Split): void {
  const { lightKeyRecovery, heavyKeyRecovery } = split;
  if (lightKeyRecovery > 1 - heavyKeyRecovery && lightKeyRecovery + heavyKeyRecovery > 1) return;
  refuseAsInfeasible({
    code: "specification-infeasible",
    path: "lightKeyRecovery",
    message: `lightKeyRecovery must exceed ${shown(1 - heavyKeyRecovery)}, the part of the heavy key that heavyKeyRecovery ${shown(heavyKeyRecovery)} sends to the distillate, got ${shown(lightKeyRecovery)}: no column enriches the less volatile component; raise one of the recoveries or swap the products`,
    value: lightKeyRecovery,
    limit: 1 - heavyKeyRecovery,
  });
}

/** Powers of ten between the heavy key and any other component; beyond, the arithmetic would overflow. */
const mostRatio = 1e30;

/** Makes the volatilities relative to the heavy key; false after a reported fault. */
export function scaleToHeavyKey(faults: Issue[], split: Split): boolean {
  const { volatility, heavyKey, names } = split;
  const heavy = volatility[heavyKey]!;
  let complete = true;
  for (let i = 0; i < volatility.length; i++) {
    const ratio = volatility[i]! / heavy;
    if (ratio <= mostRatio && ratio >= 1 / mostRatio) {
      volatility[i] = ratio;
      continue;
    }
    complete = false;
    faults.push({
      code: ratio > 1 ? "above-limit" : "below-limit",
      path: `relativeVolatility.${names[i]!}`,
      message: `relativeVolatility.${names[i]!} must be within a factor of ${mostRatio} of the heavy key's ${heavy}, got ${volatility[i]}; leave out a component that does not boil or does not condense`,
      value: volatility[i],
      limit: ratio > 1 ? mostRatio : 1 / mostRatio,
    });
  }
  return complete;
}
