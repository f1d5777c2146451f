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
  const { components, fractions, flow, mixture, thermal } = feed;
  if (components === undefined || mixture === undefined) return;
  const molarMass = meanMolarMass(components, fractions);
  if (molarMass !== undefined) {
    compare(faults, at, "molarMass", fields, molarMass);
    compare(faults, at, "massFlow", fields, flow * molarMass);
  }
  if (thermal === undefined || thermal.given === "q") return;
  const state = feedState(faults, at, idealMixture(mixture), thermal);
  if (state === undefined) return;
  compare(faults, at, "temperature", fields, state.temperature);
  compare(faults, at, "vaporFraction", fields, state.vaporFraction);
}

function compare(faults: Issue[], at: string, field: string, fields: Fields, expected: number): void {
  const value = fields[field];
  if (
    typeof value !== "number" ||
    Math.abs(value - expected) <= tolerance * Math.max(1e-3, Math.abs(expected))
  )
    return;
  const message = `${at}${field} is ${shown(value)}, but the rest of this stream gives ${expected.toPrecision(7)}; give a changed stream anew, as { flow, composition, ... }`;
  faults.push({ code: "conflicting-fields", path: `${at}${field}`, message, value, limit: expected });
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
