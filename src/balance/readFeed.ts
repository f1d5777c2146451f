import { type Fields, readFields, readText } from "../base/check";
import type { Issue } from "../base/errors";
import type { Component } from "../components/component";
import { readOwnComponents } from "../components/resolveComponent";
import type { Mixture } from "../equilibrium/mixture";
import type { FeedAmounts, FeedReading } from "./feedAmounts";
import { type FeedThermal, readThermal } from "./feedThermal";
import { readAmounts } from "./readAmounts";
import { checkStream, settledThermal } from "./streamAgreement";

export type { FeedReading } from "./feedAmounts";

/** How a feed is read. */
export interface FeedRules {
  /** "required": names are looked up; "free": they are labels, as where volatilities are given. */
  readonly components: "required" | "free";
  readonly ownComponents?: readonly Component[];
  /** Whether a feed without a thermal condition is at fault. */
  readonly thermalRequired: boolean;
}

/** What a caller writes. */
const inputFields = [
  "name",
  "flow",
  "massFlow",
  "composition",
  "basis",
  "normalize",
  "componentFlows",
  "q",
  "temperature",
  "pressure",
  "vaporFraction",
  "ownComponents",
];
/** What a stream or feed out of a result carries besides. */
const resultFields = ["kind", "molarMass", "massComposition", "phase", "cautions", "methods"];
const knownOfInput = new Set(inputFields);
const knownOfStream = new Set([...inputFields, ...resultFields]);

/**
 * Reads a feed; undefined after a reported fault. A stream or feed out of a result is taken as it is: its molar flow
 * and mole fractions count, and the rest must agree with them.
 */
export function readFeed(
  faults: Issue[],
  path: string,
  value: unknown,
  rules: FeedRules,
): FeedReading | undefined {
  const isStream = isResult(value);
  const fields = readFields(faults, path, value, isStream ? knownOfStream : knownOfInput);
  if (fields === undefined) return undefined;
  const before = faults.length;
  const at = path === "input" ? "" : `${path}.`;
  const name = fields["name"] === undefined ? undefined : readText(faults, `${at}name`, fields["name"]);
  const amounts = readAmounts(faults, path, fields, ownComponentsOf(faults, at, fields, rules), isStream);
  const mixture = amounts === undefined ? undefined : mixtureOf(amounts);
  const thermal = readThermal(faults, path, fields, mixture, isStream, rules.thermalRequired);
  if (rules.components === "free") requireLiquidFraction(faults, at, thermal);
  if (faults.length > before) return undefined;
  const { names, fractions, flow, components } = amounts!;
  const reading: FeedReading = { names, fractions, flow, components, name, mixture, thermal };
  if (!isStream) return reading;
  const stream = { ...reading, thermal: settledThermal(fields, reading) };
  checkStream(faults, at, fields, stream);
  return faults.length > before ? undefined : stream;
}

function mixtureOf({ names, fractions, components }: FeedAmounts): Mixture | undefined {
  return components && { names, fractions, components };
}

/** Streams and feeds out of results carry what no caller writes. */
function isResult(value: unknown): boolean {
  if (typeof value !== "object" || value === null) return false;
  const { kind, molarMass, massComposition } = value as Fields;
  return kind === "feed" || molarMass !== undefined || massComposition !== undefined;
}

/** The user's own components, the feed's before the caller's; undefined where names are free labels. */
function ownComponentsOf(
  faults: Issue[],
  at: string,
  fields: Fields,
  rules: FeedRules,
): readonly Component[] | undefined {
  if (rules.components === "free") return undefined;
  const own = rules.ownComponents ?? [];
  const feeds = fields["ownComponents"];
  return feeds === undefined ? own : [...readOwnComponents(faults, `${at}ownComponents`, feeds), ...own];
}

/** Without components there is nothing to flash: only q says how much of a feed is liquid. */
function requireLiquidFraction(faults: Issue[], at: string, thermal: FeedThermal | undefined): void {
  if (thermal === undefined || thermal.given === "q") return;
  const message = `${at}q must be given where relativeVolatility is: without components a ${thermal.given} cannot be turned into a liquid fraction`;
  faults.push({ code: "missing-field", path: `${at}q`, message, value: undefined });
}
