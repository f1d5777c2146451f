import { byName, type ByComponent, type Caution, type Judged, sortCautions } from "../base/result";
import { type Issue, refuseIfFaulty } from "../base/errors";
import type { Component } from "../components/component";
import { criticalTemperatureOf } from "./criticalPoint";
import { type IdealMixture, idealMixture, stateAtPressure } from "./phaseState";
import { raoultCautions, raoultMethods, temperatureCautions } from "./raoultGuard";
import { evaluateVaporPressures } from "./vaporPressureTable";
import { readVolatilityTask, type VolatilityInput, type VolatilityTask } from "./volatilityCurveInput";

/** Values along the curve by component; null where a component is above its critical temperature. */
export type CurveByComponent = Readonly<Record<string, readonly (number | null)[]>>;

/** What `volatilityOverTemperature` gives. */
export interface VolatilityOverTemperature extends Judged {
  readonly kind: "volatilityOverTemperature";
  readonly heavyKey: string;
  /** Absolute [Pa]; null when only temperatures were given. */
  readonly pressure: number | null;
  /** Lowest and highest [K]. */
  readonly temperatureRange: readonly [number, number];
  /** At the pressure [K], of the components that boil there. */
  readonly boilingTemperature: ByComponent;
  /** Bubble and dew point of the composition at the pressure [K]; null without one, or where it has none. */
  readonly saturation: { readonly bubble: number; readonly dew: number } | null;
  /** At the lowest and the highest temperature [-], of the components that have a value there. */
  readonly relativeVolatility: { readonly atLowest: ByComponent; readonly atHighest: ByComponent };
  readonly curve: {
    /** Rising [K]. */
    readonly temperature: readonly number[];
    /** K over that of the heavy key [-]. */
    readonly relativeVolatility: CurveByComponent;
    /** At the pressure [-]; empty without one. */
    readonly kValues: CurveByComponent;
  };
}

const points = 61;
/** Least width of a range found from boiling points [K]. */
const leastRange = 10;
/** Beyond this ln(P/Pa) a vapor-pressure equation has left its meaning. */
const largestLogPressure = 690;

/**
 * K-values and volatilities relative to the heavy key over a range of temperatures: how far a constant relative
 * volatility holds.
 *
 *   K_i = P_i(T)/P,   alpha_i = P_i(T)/P_heavyKey(T)        Raoult's law
 *
 * Takes the components by name, or a composition, and the pressure (absolute, Pa or text), the temperatures (two, K or
 * text), or both. From a pressure alone the range goes from the lowest to the highest boiling point, and is at least
 * 10 K wide; without a pressure there are no K-values. A component has no value above its critical temperature (null).
 * With a composition and a pressure its bubble and dew points are given too. Assumes an ideal liquid under an ideal
 * vapor; the cautions say where that is known or likely to be wrong.
 *
 * Source: F.-M. Raoult, Comptes rendus 104 (1887) 1430 (citation from memory).
 *
 * @throws DesignInputError with all faults of the input, among them a pressure at which no component boils
 * @example volatilityOverTemperature({ components: ["benzene", "toluene"], heavyKey: "toluene", temperatureRange: [350, 370] }).curve.relativeVolatility.benzene[60] // 2.452
 */
export function volatilityOverTemperature(input: VolatilityInput): VolatilityOverTemperature {
  const faults: Issue[] = [];
  const task = readVolatilityTask(faults, input);
  refuseIfFaulty(faults);
  const { mixture, heavyKey, pressure, hasComposition } = task!;
  const compiled = idealMixture(mixture);
  const boiling = pressure === null ? [] : boilingTemperatures(faults, compiled, pressure);
  const [low, high] = task!.temperatureRange ?? rangeOf(faults, boiling);
  refuseIfFaulty(faults);
  refuseHeavyKey(faults, mixture.components[heavyKey]!, mixture.names[heavyKey]!, low);
  refuseIfFaulty(faults);
  const curve = curveOf(compiled, task!, low, high);
  const boils = mixture.names.map((_, i) => i).filter((i) => boiling[i] !== undefined);
  return {
    kind: "volatilityOverTemperature",
    heavyKey: mixture.names[heavyKey]!,
    pressure,
    temperatureRange: [low, high],
    boilingTemperature: byName(
      boils.map((i) => mixture.names[i]!),
      boils.map((i) => boiling[i]!),
    ),
    saturation: hasComposition && pressure !== null ? saturationOf(compiled, pressure) : null,
    relativeVolatility: { atLowest: valuesAt(curve, 0), atHighest: valuesAt(curve, points - 1) },
    curve,
    cautions: cautionsOf(compiled, pressure, low, high),
    methods: raoultMethods(membersOf(compiled)),
  };
}

/** Of each component alone; undefined for one that does not boil under this pressure. */
function boilingTemperatures(
  faults: Issue[],
  mixture: IdealMixture,
  pressure: number,
): (number | undefined)[] {
  const refused: Issue[] = [];
  const boiling = mixture.components.map((component, i) => {
    const pure = idealMixture({
      names: [mixture.names[i]!],
      components: [component],
      fractions: Float64Array.of(1),
    });
    return stateAtPressure(refused, pure, pressure, 0, { path: "pressure", typed: pressure })?.temperature;
  });
  if (boiling.every((temperature) => temperature === undefined)) faults.push(...refused);
  return boiling;
}

function rangeOf(faults: readonly Issue[], boiling: readonly (number | undefined)[]): [number, number] {
  if (faults.length > 0) return [Number.NaN, Number.NaN];
  const known = boiling.filter((temperature) => temperature !== undefined);
  const low = Math.min(...known);
  const high = Math.max(...known);
  const widening = Math.max(0, (leastRange - (high - low)) / 2);
  return [low - widening, high + widening];
}

/** Nothing can be relative to a component that is above its critical temperature throughout. */
function refuseHeavyKey(faults: Issue[], component: Component, name: string, low: number): void {
  const critical = criticalTemperatureOf(component) ?? Infinity;
  if (low <= critical) return;
  const message = `heavyKey must have a vapor pressure, but from ${low.toPrecision(5)} K on ${name} is above its critical temperature, ${critical.toPrecision(5)} K; take a heavier component`;
  faults.push({ code: "above-critical", path: "heavyKey", message, value: name, limit: critical });
}

function saturationOf(mixture: IdealMixture, pressure: number): VolatilityOverTemperature["saturation"] {
  const at = (vaporFraction: number): number | undefined =>
    stateAtPressure([], mixture, pressure, vaporFraction, { path: "pressure", typed: pressure })?.temperature;
  const bubble = at(0);
  const dew = at(1);
  return bubble === undefined || dew === undefined ? null : { bubble, dew };
}

function curveOf(
  { names, components, table }: IdealMixture,
  { heavyKey, pressure }: VolatilityTask,
  low: number,
  high: number,
): VolatilityOverTemperature["curve"] {
  const critical = components.map((component) => criticalTemperatureOf(component) ?? Infinity);
  const temperature = Array.from({ length: points }, (_, k) => low + ((high - low) * k) / (points - 1));
  const volatility: (number | null)[][] = names.map(() => []);
  const kValues: (number | null)[][] = names.map(() => []);
  const logOf = (i: number, t: number): number => {
    const value = table.logPressure[i]!;
    return t <= critical[i]! && Math.abs(value) < largestLogPressure ? value : Number.NaN;
  };
  for (const t of temperature) {
    evaluateVaporPressures(table, t);
    const reference = logOf(heavyKey, t);
    for (let i = 0; i < names.length; i++) {
      volatility[i]!.push(known(Math.exp(logOf(i, t) - reference)));
      if (pressure !== null) kValues[i]!.push(known(Math.exp(logOf(i, t) - Math.log(pressure))));
    }
  }
  return {
    temperature,
    relativeVolatility: byName(names, volatility),
    kValues: pressure === null ? {} : byName(names, kValues),
  };
}

function valuesAt({ relativeVolatility }: VolatilityOverTemperature["curve"], k: number): ByComponent {
  const there = Object.entries(relativeVolatility).filter(([, values]) => values[k] !== null);
  return byName(
    there.map(([name]) => name),
    there.map(([, values]) => values[k] as number),
  );
}

function known(value: number): number | null {
  return Number.isFinite(value) ? value : null;
}

function membersOf({ names, components }: IdealMixture) {
  return names.map((name, i) => ({ name, component: components[i]! }));
}

/** Each component is judged over the temperatures at which it has a value. */
function cautionsOf(mixture: IdealMixture, pressure: number | null, low: number, high: number): Caution[] {
  const members = membersOf(mixture);
  const ofTemperature = members.map((member) => {
    const last = Math.min(high, criticalTemperatureOf(member.component) ?? Infinity);
    return temperatureCautions([member], [low, Math.max(low, last)]);
  });
  return sortCautions(raoultCautions(members, pressure ?? 0), ...ofTemperature);
}
