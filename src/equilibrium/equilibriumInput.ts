import { type Fields, readChoice, readFields, readFlag } from "../base/check";
import { DesignInputError, type Issue } from "../base/errors";
import type { ByComponent } from "../base/result";
import { readQuantity, type Pressure, type Temperature } from "../base/units";
import type { Component } from "../components/component";
import { readOwnComponents } from "../components/resolveComponent";
import { type Mixture, readMixture } from "./mixture";
import { readTemperature } from "./readTemperature";

/** How K-values are found: "raoult", ideal liquid and ideal vapor. */
export type EquilibriumModel = "raoult";

export const equilibriumModels: readonly EquilibriumModel[] = ["raoult"];

/** What bubblePoint, dewPoint, flash and relativeVolatility all take. */
export interface MixtureInput {
  /** Mole fractions by component name; they add up to 1 unless `normalize` is given. */
  readonly composition: ByComponent;
  /** Scale the composition to the sum of 1. */
  readonly normalize?: boolean;
  /** The user's own components; they win over the built-in table. */
  readonly ownComponents?: readonly Component[];
  readonly model?: EquilibriumModel;
}

/** A mixture at a temperature [K], a pressure [Pa], or both. */
export interface StateInput extends MixtureInput {
  /** Absolute [Pa], or text with a unit. */
  readonly pressure?: Pressure;
  /** [K], or text with a unit. */
  readonly temperature?: Temperature;
}

export const mixtureFields = ["composition", "normalize", "ownComponents", "model"] as const;

/** The fields of an input with its mixture read; the mixture is undefined after a reported fault. */
export interface MixtureReading {
  readonly fields: Fields;
  readonly mixture: Mixture | undefined;
  readonly ownComponents: readonly Component[];
}

/**
 * Reads what all equilibrium functions take; `known` lists the fields of the calling function.
 * @throws DesignInputError when the input is no object at all; every other fault is collected
 */
export function readMixtureInput(
  faults: Issue[],
  input: unknown,
  known: ReadonlySet<string>,
): MixtureReading {
  const fields = readFields(faults, "input", input, known);
  if (fields === undefined) throw new DesignInputError(faults);
  const ownComponents = readOwnComponents(faults, "ownComponents", fields["ownComponents"]);
  const normalize = readFlag(faults, "normalize", fields["normalize"]);
  readChoice(faults, "model", fields["model"], equilibriumModels);
  const mixture = readMixture(faults, "composition", fields["composition"], ownComponents, normalize);
  return { fields, mixture, ownComponents };
}

/** A state variable in SI units; NaN after a fault. */
export function readStateVariable(
  faults: Issue[],
  fields: Fields,
  name: "pressure" | "temperature",
  mixture: Mixture | undefined,
): number {
  const value = fields[name];
  return name === "pressure"
    ? readQuantity(faults, name, value, "pressure")
    : readTemperature(faults, name, value, mixture);
}
