import type { Issue } from "../base/errors";
import { type IdealMixture, type PhaseState, stateAt, stateAtPressure } from "../equilibrium/phaseState";
import type { FeedThermal } from "./feedThermal";

/** A thermal condition that names a state: all but q. */
export type StatedThermal = Exclude<FeedThermal, { given: "q" }>;

/** The equilibrium state of a feed at its own pressure; undefined after a reported fault. `at` prefixes the paths. */
export function feedState(
  faults: Issue[],
  at: string,
  mixture: IdealMixture,
  thermal: StatedThermal,
): PhaseState | undefined {
  const { pressure } = thermal;
  const ofPressure = { path: `${at}pressure`, typed: pressure };
  if (thermal.given === "vaporFraction") {
    return stateAtPressure(faults, mixture, pressure, thermal.vaporFraction, ofPressure);
  }
  const { temperature } = thermal;
  const ofTemperature = { path: `${at}temperature`, typed: temperature };
  return stateAt(faults, mixture, temperature, pressure, ofTemperature, ofPressure);
}
