import { type Caution, collectMethods, type Judged, type MethodUsed, sortCautions } from "../base/result";
import { method, sources } from "../base/source";
import { judgeVaporPressure, vaporPressureMethod } from "../components/vaporPressureQuality";
import { criticalTemperatureOf } from "./criticalPoint";
import { type Member, type Mixture, presentMembers } from "./mixture";
import { substanceCautions } from "./unfitSubstances";

const idealVaporTo = 3e5;
const idealVaporNotAbove = 1e6;
const nearCritical = 0.9;

/** Why Raoult's law may not fit these components under this pressure [Pa]. */
export function raoultCautions(members: readonly Member[], pressure: number): Caution[] {
  return sortCautions(substanceCautions(members), pressureCautions(pressure), unknownCriticalPoints(members));
}

/** Why Raoult's law may not fit at these temperatures [K]: near a critical point, or outside an equation's range. */
export function temperatureCautions(members: readonly Member[], temperatures: readonly number[]): Caution[] {
  const extremes = temperatures.length === 0 ? [] : [Math.min(...temperatures), Math.max(...temperatures)];
  const cautions: Caution[] = [];
  for (const { component, name } of members) {
    for (const temperature of extremes) cautions.push(...judgeVaporPressure(component, name, temperature));
    const reduced = (extremes[1] ?? 0) / (criticalTemperatureOf(component) ?? Infinity);
    if (reduced <= nearCritical) continue;
    cautions.push({
      code: "near-critical",
      severity: "stop",
      kind: "method",
      message: `${name} is at ${reduced.toFixed(3)} of its critical temperature; Raoult's law is accepted to ${nearCritical}`,
      value: reduced,
      limit: nearCritical,
      source: sources.commonPractice,
    });
  }
  return sortCautions(cautions);
}

/** The cautions and methods of a result that rests on Raoult's law for this mixture in this state. */
export function judgeIdealMixture(
  mixture: Mixture,
  pressure: number,
  temperatures: readonly number[],
): Judged {
  const members = presentMembers(mixture);
  return {
    cautions: sortCautions(raoultCautions(members, pressure), temperatureCautions(members, temperatures)),
    methods: raoultMethods(members),
  };
}

/** Raoult's law and the published vapor pressures behind it. */
export function raoultMethods(members: readonly Member[]): MethodUsed[] {
  const pressures = members.map(({ component }) => vaporPressureMethod(component));
  return collectMethods([method("Raoult's law", "raoult")], pressures);
}

function pressureCautions(pressure: number): Caution[] {
  if (!(pressure > idealVaporTo)) return [];
  const far = pressure > idealVaporNotAbove;
  const limit = far ? idealVaporNotAbove : idealVaporTo;
  return [
    {
      code: "elevated-pressure",
      severity: far ? "stop" : "check",
      kind: "method",
      message: `at ${(pressure / 1e5).toPrecision(3)} bar the vapor is ${far ? "far from" : "no longer quite"} ideal; Raoult's law is accepted to ${idealVaporTo / 1e5} bar, to be checked to ${idealVaporNotAbove / 1e5} bar`,
      value: pressure,
      limit,
      source: sources.commonPractice,
    },
  ];
}

function unknownCriticalPoints(members: readonly Member[]): Caution[] {
  return members
    .filter(({ component }) => criticalTemperatureOf(component) === undefined)
    .map(({ name }) => ({
      code: "critical-temperature-unknown",
      severity: "note",
      kind: "data",
      message: `no critical temperature is given for ${name}: whether it can be a liquid at all at the temperatures met is not checked`,
    }));
}
