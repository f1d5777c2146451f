import { type Fields, shown } from "../base/check";
import type { Issue } from "../base/errors";
import { idealMixture } from "../equilibrium/phaseState";
import type { FeedReading } from "./feedAmounts";
import { feedState } from "./feedState";
import type { FeedThermal } from "./feedThermal";
import { meanMolarMass } from "./stream";

/** Relative; results carry all their digits, so only a changed field differs by more. */
const tolerance = 1e-6;

/** Refuses a stream out of a result of which one field was changed, so that its parts no longer agree. */
export function checkStream(faults: Issue[], at: string, fields: Fields, feed: FeedReading): void {
  const { names, components, fractions, flow, mixture, thermal } = feed;
  const known = components && meanMolarMass(components, fractions);
  const molarMass = known ?? fields["molarMass"];
  compareAll(faults, `${at}componentFlows`, fields["componentFlows"], names, fractions, () => flow);
  if (typeof molarMass === "number") {
    compare(faults, `${at}molarMass`, fields["molarMass"], molarMass);
    compare(faults, `${at}massFlow`, fields["massFlow"], flow * molarMass);
  }
  if (known !== undefined) {
    const weight = (i: number): number => (components![i]!.molarMass ?? 0) / known;
    compareAll(faults, `${at}massComposition`, fields["massComposition"], names, fractions, weight);
  }
  if (mixture === undefined || thermal === undefined || thermal.given === "q") return;
  const state = feedState(faults, at, idealMixture(mixture), thermal);
  if (state === undefined) return;
  compare(faults, `${at}temperature`, fields["temperature"], state.temperature);
  compare(faults, `${at}vaporFraction`, fields["vaporFraction"], state.vaporFraction);
}

/** Compares the numbers of a record with the mole fractions times a factor. */
function compareAll(
  faults: Issue[],
  path: string,
  record: unknown,
  names: readonly string[],
  fractions: Float64Array,
  factor: (i: number) => number,
): void {
  if (typeof record !== "object" || record === null) return;
  names.forEach((name, i) => {
    compare(faults, `${path}.${name}`, (record as Fields)[name] ?? 0, fractions[i]! * factor(i));
  });
}

/** Anything but a number is something that no result holds: it cannot agree. */
function compare(faults: Issue[], path: string, value: unknown, expected: number): void {
  if (value === undefined) return;
  const allowed = tolerance * Math.max(1e-3, Math.abs(expected));
  if (typeof value === "number" && Math.abs(value - expected) <= allowed) return;
  const message = `${path} is ${shown(value)}, but the rest of this stream gives ${expected.toPrecision(7)}; give a changed stream anew, as { flow, composition, ... }`;
  faults.push({ code: "conflicting-fields", path, message, value, limit: expected });
}

/** A temperature this near the saturated one, relative, is the saturated one. */
const saturation = 1e-9;

/**
 * The thermal condition of a stream out of a result. At its bubble or dew point it is the vapor fraction that counts:
 * temperature and pressure leave it to rounding which phase is there.
 */
export function settledThermal(fields: Fields, feed: FeedReading): FeedThermal | undefined {
  const { thermal, mixture } = feed;
  const { vaporFraction } = fields;
  if (thermal?.given !== "temperature" || mixture === undefined) return thermal;
  if (vaporFraction !== 0 && vaporFraction !== 1) return thermal;
  const { temperature, pressure } = thermal;
  const saturated = { given: "vaporFraction", vaporFraction, pressure } as const;
  const state = feedState([], "", idealMixture(mixture), saturated);
  const isThere =
    state !== undefined && Math.abs(temperature - state.temperature) <= saturation * temperature;
  return isThere ? saturated : thermal;
}
