import { readChoice, readExactlyOne, readFields, readFlag, shown } from "../base/check";
import { DesignInputError, type Issue } from "../base/errors";
import type { ByComponent } from "../base/result";
import { type Pressure, readQuantity, type Temperature } from "../base/units";
import type { Component } from "../components/component";
import { readOwnComponents } from "../components/resolveComponent";
import { type EquilibriumModel, equilibriumModels, mixtureFields } from "./equilibriumInput";
import { findMember, type Mixture, readMixture, resolveComponents } from "./mixture";
import { readTemperature } from "./readTemperature";

/** What `volatilityOverTemperature` takes: the components, the one of reference, a pressure, temperatures, or both. */
export interface VolatilityInput {
  /** Names; or */
  readonly components?: readonly string[];
  /** mole fractions by name, which add up to 1 unless `normalize` is given. */
  readonly composition?: ByComponent;
  readonly normalize?: boolean;
  /** The component whose volatility is 1. */
  readonly heavyKey: string;
  /** Absolute [Pa], or text with a unit. */
  readonly pressure?: Pressure;
  /** Lowest and highest [K], or texts with a unit. */
  readonly temperatureRange?: readonly [Temperature, Temperature];
  readonly ownComponents?: readonly Component[];
  readonly model?: EquilibriumModel;
}

/** The same, checked. */
export interface VolatilityTask {
  readonly mixture: Mixture;
  readonly hasComposition: boolean;
  readonly heavyKey: number;
  readonly pressure: number | null;
  readonly temperatureRange: readonly [number, number] | undefined;
}

const known = new Set<string>([...mixtureFields, "components", "heavyKey", "pressure", "temperatureRange"]);
const mostComponents = 500;

/** Reads the input; undefined after a reported fault. */
export function readVolatilityTask(faults: Issue[], input: unknown): VolatilityTask | undefined {
  const fields = readFields(faults, "input", input, known);
  if (fields === undefined) throw new DesignInputError(faults);
  const own = readOwnComponents(faults, "ownComponents", fields["ownComponents"]);
  const normalize = readFlag(faults, "normalize", fields["normalize"]);
  readChoice(faults, "model", fields["model"], equilibriumModels);
  const given = readExactlyOne(faults, "input", fields, ["components", "composition"]);
  const mixture =
    given === "composition"
      ? readMixture(faults, "composition", fields["composition"], own, normalize)
      : given === "components"
        ? mixtureOf(faults, fields["components"], own)
        : undefined;
  const heavyKey =
    mixture === undefined ? -1 : findMember(faults, "heavyKey", fields["heavyKey"], mixture, own);
  const { pressure: typed, temperatureRange } = fields;
  if (typed === undefined && temperatureRange === undefined) {
    const message = "pressure or temperatureRange must be given, or both: over which temperatures, else?";
    faults.push({ code: "missing-field", path: "pressure", message, value: undefined });
  }
  const pressure = typed === undefined ? null : readQuantity(faults, "pressure", typed, "pressure");
  const range = temperatureRange === undefined ? undefined : readRange(faults, temperatureRange, mixture);
  if (mixture === undefined || faults.length > 0) return undefined;
  return { mixture, hasComposition: given === "composition", heavyKey, pressure, temperatureRange: range };
}

/** Components by name; in equal parts, since no composition is asked for. */
function mixtureOf(faults: Issue[], names: unknown, own: readonly Component[]): Mixture | undefined {
  const isList =
    Array.isArray(names) && names.every((name) => typeof name === "string" && name.trim() !== "");
  if (!isList || names.length === 0 || names.length > mostComponents) {
    const code = !isList ? "wrong-type" : names.length === 0 ? "empty" : "too-many";
    const message = `components must be a list of 1 to ${mostComponents} names, got ${shown(names)}; write them as ["benzene", "toluene"]`;
    faults.push({ code, path: "components", message, value: names });
    return undefined;
  }
  const components = resolveComponents(faults, "components", names as string[], own);
  const fractions = new Float64Array(names.length).fill(1 / names.length);
  return components === undefined ? undefined : { names: names as string[], components, fractions };
}

function readRange(faults: Issue[], value: unknown, mixture: Mixture | undefined): [number, number] {
  if (!Array.isArray(value) || value.length !== 2) {
    const message = `temperatureRange must be a list of two temperatures, the lower one first, got ${shown(value)}`;
    faults.push({ code: "wrong-type", path: "temperatureRange", message, value });
    return [Number.NaN, Number.NaN];
  }
  const [low, high] = value.map((each, i) => readTemperature(faults, `temperatureRange.${i}`, each, mixture));
  if (high! <= low!) {
    const message = `temperatureRange must rise, got ${shown(value[0])} and ${shown(value[1])}; write the lower one first`;
    faults.push({ code: "below-limit", path: "temperatureRange.1", message, value: value[1], limit: low! });
  }
  return [low!, high!];
}
