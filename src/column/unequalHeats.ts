import type { Caution } from "../base/result";
import { sources } from "../base/source";
import type { Component } from "../components/component";
import { heatOfVaporization } from "../components/heats";

/** Constant molar overflow is taken for granted up to this difference. */
const largestDifference = 0.15;

/** A caution when the molar heats of vaporization of a pair, each at its own boiling temperature [K], lie far apart. */
export function unequalHeats(
  { light, heavy }: { readonly light: string; readonly heavy: string },
  [lightComponent, heavyComponent]: readonly Component[],
  [lightBoils, heavyBoils]: readonly number[],
): Caution | undefined {
  const ofLight = heatOfVaporization(lightComponent!, lightBoils!).value;
  const ofHeavy = heatOfVaporization(heavyComponent!, heavyBoils!).value;
  const difference = Math.abs(ofLight - ofHeavy) / Math.min(ofLight, ofHeavy);
  if (!(difference > largestDifference) || !Number.isFinite(difference)) return undefined;
  const kilojoules = (heat: number): string => `${(heat / 1000).toPrecision(3)} kJ/mol`;
  return {
    code: "unequal-heats-of-vaporization",
    severity: "check",
    kind: "method",
    message: `${light} takes ${kilojoules(ofLight)} to vaporize and ${heavy} ${kilojoules(ofHeavy)}, ${(100 * difference).toFixed(0)} % apart: the flows in a section are not quite constant, as the straight operating lines have them`,
    value: difference,
    limit: largestDifference,
    source: sources.commonPractice,
  };
}
