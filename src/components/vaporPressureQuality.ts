import type { Caution, MethodUsed } from "../base/result";
import type { Component, VaporPressureBlock } from "./component";

const formNames: Readonly<Record<VaporPressureBlock["form"], string>> = {
  antoine: "Antoine equation",
  dippr101: "DIPPR 101 equation",
  wagner25: "Wagner 2.5-5 equation",
  wagner36: "Wagner 3-6 equation",
};

/** The equation behind a vapor pressure, with its published source. */
export function vaporPressureMethod(component: Component): MethodUsed {
  const block = component.vaporPressure;
  return { name: `Vapor pressure of ${component.name}: ${formNames[block.form]}`, source: block.source };
}

const gradeMeaning = {
  C: "published sets agree over a part of the range only",
  D: "one published set, or an equation of short range",
} as const;

/** A unit conversion takes no temperature out of a range. */
export const rounding = 1e-9;

/** What is doubtful about a vapor pressure at T [K]: its grade, and a temperature outside the published range. */
export function judgeVaporPressure(component: Component, name: string, temperature: number): Caution[] {
  const { grade, deviation, range, source } = component.vaporPressure;
  const cautions: Caution[] = [];
  if (grade === "C" || grade === "D") {
    cautions.push({
      code: "vapor-pressure-preliminary",
      severity: "check",
      kind: "data",
      message: `vapor pressure of ${name} is of grade ${grade}: ${gradeMeaning[grade]}${deviation === undefined ? "" : ` (this one ${deviation})`}; treat it as preliminary`,
      source,
    });
  }
  if (temperature < range[0] * (1 - rounding) || temperature > range[1] * (1 + rounding)) {
    cautions.push({
      code: "vapor-pressure-extrapolated",
      severity: "check",
      kind: "data",
      message: `vapor pressure of ${name} at ${temperature.toFixed(1)} K is extrapolated; published for ${range[0]} to ${range[1]} K`,
      value: temperature,
      limit: temperature < range[0] ? range[0] : range[1],
      source,
    });
  }
  return cautions;
}
