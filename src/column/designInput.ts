import { type Fields, readChoice, readExactlyOne, readFields } from "../base/check";
import type { Issue } from "../base/errors";
import type { ByComponent } from "../base/result";
import type { FeedInput } from "../balance/feed";
import { checkKeyVolatilities } from "../balance/keys";
import type { FeedReading } from "../balance/feedAmounts";
import { readFeed } from "../balance/readFeed";
import { type KeysAndRecoveries, readKeysAndRecoveries, scaleToHeavyKey, type Split } from "../balance/split";
import { readVolatilities } from "../balance/volatilities";
import type { Component } from "../components/component";
import { readOwnComponents } from "../components/resolveComponent";
import { type EquilibriumModel, equilibriumModels } from "../equilibrium/equilibriumInput";
import type { GillilandCorrelation } from "../shortcut/gillilandCorrelations";
import { readReflux, type RefluxChoice } from "./reflux";
import {
  type ColumnPressureInput,
  type ColumnPressures,
  pressureFields,
  readColumnPressures,
  refuseBesideVolatility,
} from "./columnPressures";

/** What `shortcutDesign` takes. */
export interface ShortcutDesignInput extends ColumnPressureInput {
  readonly feed: FeedInput;
  readonly lightKey: string;
  readonly heavyKey: string;
  /** Fraction of the feed's light key that leaves in the distillate, between 0 and 1. */
  readonly lightKeyRecovery: number;
  /** Fraction of the feed's heavy key that leaves in the bottoms, between 0 and 1. */
  readonly heavyKeyRecovery: number;
  /** Constant volatilities over any common reference; or `pressure`, for volatilities by Raoult's law. */
  readonly relativeVolatility?: ByComponent;
  readonly model?: EquilibriumModel;
  readonly ownComponents?: readonly Component[];
  /** External reflux ratio L/D; or `refluxOverMinimum`, its multiple of the minimum, above 1. */
  readonly refluxRatio?: number;
  readonly refluxOverMinimum?: number;
  readonly condenser?: "total" | "partial";
  readonly correlation?: GillilandCorrelation;
}

const known = new Set<string>([
  "feed",
  "lightKey",
  "heavyKey",
  "lightKeyRecovery",
  "heavyKeyRecovery",
  "relativeVolatility",
  ...pressureFields,
  "model",
  "ownComponents",
  "refluxRatio",
  "refluxOverMinimum",
  "condenser",
  "correlation",
]);

/** A checked design task; lists in the order of the feed's names. */
export interface DesignTask {
  readonly feed: FeedReading;
  readonly split: Omit<Split, "volatility">;
  /** Volatilities relative to the heavy key when they are given; else the pressures count. */
  readonly volatility: Float64Array | undefined;
  readonly pressures: ColumnPressures | undefined;
  readonly reflux: RefluxChoice;
  readonly condenser: "total" | "partial";
  readonly correlation: GillilandCorrelation;
}

/** Reads a design task; undefined after reported faults. */
export function readDesignTask(faults: Issue[], input: unknown): DesignTask | undefined {
  const fields = readFields(faults, "input", input, known);
  if (fields === undefined) return undefined;
  const before = faults.length;
  const basis = readExactlyOne(faults, "input", fields, ["relativeVolatility", "pressure"]);
  const feed = readDesignFeed(faults, fields, basis === "relativeVolatility");
  const keys = readKeysAndRecoveries(faults, fields, feed?.names, feed?.fractions, "feed.composition");
  const volatility = basis === "relativeVolatility" ? readVolatility(faults, fields, feed, keys) : undefined;
  if (basis === "relativeVolatility") refuseBesideVolatility(faults, fields);
  const pressures = basis === "pressure" ? readColumnPressures(faults, fields) : undefined;
  const reflux = readReflux(faults, fields);
  readChoice(faults, "model", fields["model"], equilibriumModels);
  const condenser = readChoice(faults, "condenser", fields["condenser"], ["total", "partial"]);
  const correlation = readChoice(faults, "correlation", fields["correlation"], [
    "molokanov",
    "eduljee",
    "liddle",
  ]);
  if (faults.length > before || feed === undefined || keys === undefined || reflux === undefined)
    return undefined;
  const { lightKey, heavyKey, lightKeyRecovery, heavyKeyRecovery } = keys;
  const { names, fractions } = feed;
  const split = { names, fractions, lightKey, heavyKey, lightKeyRecovery, heavyKeyRecovery };
  return { feed, split, volatility, pressures, reflux, condenser, correlation };
}

function readDesignFeed(faults: Issue[], fields: Fields, free: boolean): FeedReading | undefined {
  const thermalRequired = true;
  if (free) return readFeed(faults, "feed", fields["feed"], { components: "free", thermalRequired });
  const ownComponents = readOwnComponents(faults, "ownComponents", fields["ownComponents"]);
  return readFeed(faults, "feed", fields["feed"], { components: "required", ownComponents, thermalRequired });
}

function readVolatility(
  faults: Issue[],
  fields: Fields,
  feed: FeedReading | undefined,
  keys: KeysAndRecoveries | undefined,
): Float64Array | undefined {
  const volatility = readVolatilities(
    faults,
    "relativeVolatility",
    fields["relativeVolatility"],
    feed?.names,
  );
  if (volatility === undefined || feed === undefined || keys === undefined) return undefined;
  checkKeyVolatilities(faults, feed.names, volatility, keys.lightKey, keys.heavyKey);
  const { lightKey, heavyKey, lightKeyRecovery, heavyKeyRecovery } = keys;
  const { names, fractions } = feed;
  const split = { names, fractions, volatility, lightKey, heavyKey, lightKeyRecovery, heavyKeyRecovery };
  return scaleToHeavyKey(faults, split) ? volatility : undefined;
}
