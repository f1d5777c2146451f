import type { Caution } from "../base/result";
import type { Component, PropertyBlock } from "../components/component";
import { heatOfVaporization, idealGasHeatCapacity, liquidHeatCapacity } from "../components/heats";
import { type Member, type Mixture, presentMembers } from "./mixture";
import type { PhaseState } from "./phaseState";

/** Enthalpies count from the ideal gas of each component at this temperature [K]. */
const referenceTemperature = 298.15;

/** Gauss-Legendre points and weights of five on -1 to 1. */
const nodes = [0, 0.5384693101056831, -0.5384693101056831, 0.906179845938664, -0.906179845938664];
const weights = [
  0.5688888888888889, 0.4786286704993665, 0.4786286704993665, 0.2369268850561891, 0.2369268850561891,
];

type HeatCapacity = (component: Component, temperature: number) => number | undefined;

/** Integral of a heat capacity between two temperatures [J/mol]; NaN when it is not known. */
function integral(capacity: HeatCapacity, component: Component, from: number, to: number): number {
  const half = 0.5 * (to - from);
  let sum = 0;
  for (let i = 0; i < nodes.length; i++) {
    sum += weights[i]! * (capacity(component, from + half * (1 + nodes[i]!)) ?? Number.NaN);
  }
  return half * sum;
}

/** Molar enthalpy of an ideal gas [J/mol]. */
export function idealGasEnthalpy(component: Component, temperature: number): number {
  return integral(idealGasHeatCapacity, component, referenceTemperature, temperature);
}

/**
 * Molar enthalpy of a liquid [J/mol]: at the boiling temperature of interest that of the ideal gas less the heat of
 * vaporization, elsewhere by the liquid's heat capacity from there; without one, as at the boiling temperature.
 */
export function liquidEnthalpy(component: Component, temperature: number, boiling: number): number {
  const capacityKnown = component.liquidHeatCapacity !== undefined;
  const at = capacityKnown ? boiling : temperature;
  const saturated = idealGasEnthalpy(component, at) - heatOfVaporization(component, at).value;
  return capacityKnown
    ? saturated + integral(liquidHeatCapacity, component, boiling, temperature)
    : saturated;
}

/**
 * Molar enthalpy [J/mol] of an ideal mixture in the state given, for heat balances at and below `boiling` [K]; NaN when
 * that of a component present is not known.
 */
export function stateEnthalpy(components: readonly Component[], state: PhaseState, boiling: number): number {
  const { liquid, vapor, temperature, vaporFraction } = state;
  let sum = 0;
  for (let i = 0; i < components.length; i++) {
    const ofLiquid = (1 - vaporFraction) * liquid[i]!;
    const ofVapor = vaporFraction * vapor[i]!;
    if (ofLiquid !== 0) sum += ofLiquid * liquidEnthalpy(components[i]!, temperature, boiling);
    if (ofVapor !== 0) sum += ofVapor * idealGasEnthalpy(components[i]!, temperature);
  }
  return sum;
}

/** Names of the members present whose enthalpy cannot be found. */
export function withoutEnthalpy(mixture: Mixture): string[] {
  return presentMembers(mixture)
    .filter(({ component }) => idealGasHeatCapacity(component, referenceTemperature) === undefined)
    .map(({ name }) => name);
}

/** What is doubtful about the enthalpies of a mixture between two temperatures [K]. */
export function enthalpyCautions(mixture: Mixture, temperatures: readonly number[]): Caution[] {
  const members = presentMembers(mixture);
  const estimated = members.filter(({ component }) => component.heatOfVaporization === undefined);
  const outside = members.filter(({ component }) => {
    const {
      heatOfVaporization: latent,
      liquidHeatCapacity: ofLiquid,
      idealGasHeatCapacity: ofGas,
    } = component;
    return [latent, ofLiquid, ofGas].some((block) => isOutside(block, temperatures));
  });
  return [
    ...heatCaution(
      "heat-of-vaporization-estimated",
      "estimated from the slope of the vapor pressure",
      estimated,
    ),
    ...heatCaution("heat-data-outside-range", "taken at the end of its published range", outside),
  ];
}

function isOutside(block: PropertyBlock | undefined, temperatures: readonly number[]): boolean {
  return block !== undefined && temperatures.some((t) => t < block.range[0] || t > block.range[1]);
}

function heatCaution(code: Caution["code"], what: string, members: readonly Member[]): Caution[] {
  if (members.length === 0) return [];
  const message = `heat data of ${members.map(({ name }) => name).join(", ")}: ${what}`;
  return [{ code, severity: "note", kind: "data", message }];
}
