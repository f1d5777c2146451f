import { readChoice, readFields, readText, shown } from "../base/check";
import { type Issue, refuseIfFaulty } from "../base/errors";
import type { Judged } from "../base/result";
import { type Pressure, readQuantity } from "../base/units";
import type { Component } from "../components/component";
import { readOwnComponents } from "../components/resolveComponent";
import { type EquilibriumModel, equilibriumModels } from "./equilibriumInput";
import { resolveComponents } from "./mixture";
import { raoultPairCurve } from "./pairCurve";
import { idealMixture, stateAtPressure } from "./phaseState";
import { judgeIdealMixture } from "./raoultGuard";

/** What `binaryEquilibrium` takes. */
export interface BinaryEquilibriumInput {
  /** Names of the two components. */
  readonly pair: { readonly light: string; readonly heavy: string };
  /** Absolute [Pa], or text with a unit. */
  readonly pressure: Pressure;
  readonly model?: EquilibriumModel;
  readonly ownComponents?: readonly Component[];
}

/** What `binaryEquilibrium` gives: the boiling and dew lines of a pair, and how constant its volatility is. */
export interface BinaryEquilibrium extends Judged {
  readonly kind: "binaryEquilibrium";
  readonly pair: { readonly light: string; readonly heavy: string };
  /** Absolute [Pa]. */
  readonly pressure: number;
  /** Boiling temperatures of the pure components [K]. */
  readonly boilingTemperature: { readonly light: number; readonly heavy: number };
  /** Light over heavy [-], at the boiling points of the pure light and the pure heavy component; geometric mean. */
  readonly relativeVolatility: {
    readonly atLightEnd: number;
    readonly atHeavyEnd: number;
    readonly mean: number;
  };
  /** Liquid and vapor mole fractions of the light component, and temperature [K]. */
  readonly curve: {
    readonly liquid: readonly number[];
    readonly vapor: readonly number[];
    readonly temperature: readonly number[];
    /** Vapor mole fractions that the mean relative volatility would give over the same liquids. */
    readonly vaporAtMeanVolatility: readonly number[];
  };
}

/** Liquid fractions of the curve, denser towards both pure components. */
const grid = Array.from({ length: 81 }, (_, i) => 0.5 - 0.5 * Math.cos((Math.PI * i) / 80));

/**
 * Boiling and dew lines of two components under one pressure, by Raoult's law, and their relative volatility at both
 * ends.
 *
 *   x P1(T) + (1 - x) P2(T) = P,   y = x P1(T)/P,   alpha = P1(T)/P2(T)
 *
 * Takes the names of the light and the heavy component and the absolute pressure (Pa, or text). Which one is the light
 * one must agree with the boiling points. Assumes an ideal liquid under an ideal vapor; the cautions say where that is
 * known or likely to be wrong.
 *
 * Source: F.-M. Raoult, Comptes rendus 104 (1887) 1430 (citation from memory).
 *
 * @throws DesignInputError with all faults of the input, among them a pressure above a critical pressure
 * @example binaryEquilibrium({ pair: { light: "benzene", heavy: "toluene" }, pressure: "1 atm" }).boilingTemperature.heavy // 383.8
 */
export function binaryEquilibrium(input: BinaryEquilibriumInput): BinaryEquilibrium {
  const faults: Issue[] = [];
  const { names, components, pressure } = readPair(faults, input);
  refuseIfFaulty(faults);
  const [low, high] = [0, 1].map((i) => {
    const pure = idealMixture({
      names: [names[i]!],
      components: [components[i]!],
      fractions: Float64Array.of(1),
    });
    return (
      stateAtPressure(faults, pure, pressure, 0, { path: "pressure", typed: pressure })?.temperature ??
      Number.NaN
    );
  }) as [number, number];
  if (low >= high) {
    const message = `pair.light must boil below pair.heavy, but at ${shown(pressure)} Pa ${names[0]} boils at ${low.toPrecision(6)} K and ${names[1]} at ${high.toPrecision(6)} K; swap them`;
    faults.push({ code: "volatility-not-above-one", path: "pair.light", message, value: names[0] });
  }
  refuseIfFaulty(faults);
  const line = raoultPairCurve(components[0]!, components[1]!, pressure);
  const vapor = grid.map(line.vapor);
  const trace = 1e-9;
  const volatilityAt = (x: number): number => (line.vapor(x) / (1 - line.vapor(x))) * ((1 - x) / x);
  const atLightEnd = volatilityAt(1 - trace);
  const atHeavyEnd = volatilityAt(trace);
  const mean = Math.sqrt(atLightEnd * atHeavyEnd);
  const mixture = { names, components, fractions: Float64Array.of(0.5, 0.5) };
  return {
    kind: "binaryEquilibrium",
    pair: { light: names[0]!, heavy: names[1]! },
    pressure,
    boilingTemperature: { light: low, heavy: high },
    relativeVolatility: { atLightEnd, atHeavyEnd, mean },
    curve: {
      liquid: grid,
      vapor,
      temperature: grid.map(line.temperature),
      vaporAtMeanVolatility: grid.map((x) => (mean * x) / (1 + (mean - 1) * x)),
    },
    ...judgeIdealMixture(mixture, pressure, [low, high]),
  };
}

function readPair(faults: Issue[], input: unknown) {
  const known = new Set(["pair", "pressure", "model", "ownComponents"]);
  const fields = readFields(faults, "input", input, known) ?? {};
  const pair = readFields(faults, "pair", fields["pair"], new Set(["light", "heavy"])) ?? {};
  const own = readOwnComponents(faults, "ownComponents", fields["ownComponents"]);
  readChoice(faults, "model", fields["model"], equilibriumModels);
  const typed = [
    readText(faults, "pair.light", pair["light"]),
    readText(faults, "pair.heavy", pair["heavy"]),
  ];
  const names = typed.filter((name) => name !== undefined);
  const components = names.length === 2 ? (resolveComponents(faults, "pair", names, own) ?? []) : [];
  return { names, components, pressure: readQuantity(faults, "pressure", fields["pressure"], "pressure") };
}
