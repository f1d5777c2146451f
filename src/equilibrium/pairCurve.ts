import type { Component } from "../components/component";
import { saturationTemperature } from "./saturation";
import { compileVaporPressures, evaluateVaporPressures } from "./vaporPressureTable";

/** Boiling liquid and dew vapor of a pair under one pressure, by Raoult's law; mole fractions of the light component. */
export interface PairCurve {
  /** Vapor over the liquid x. */
  readonly vapor: (x: number) => number;
  /** Liquid under the vapor y. */
  readonly liquid: (y: number) => number;
  /** Bubble temperature of the liquid x [K]. */
  readonly temperature: (x: number) => number;
}

/** The exact Raoult curve of two components at a pressure [Pa]: a bubble or dew point is solved at every call. */
export function raoultPairCurve(light: Component, heavy: Component, pressure: number): PairCurve {
  const table = compileVaporPressures([light, heavy]);
  const logPressure = Math.log(pressure);
  const z = new Float64Array(2);
  const solve = (fraction: number, vaporFraction: number): number => {
    z[0] = fraction;
    z[1] = 1 - fraction;
    const temperature = saturationTemperature(table, z, logPressure, vaporFraction);
    evaluateVaporPressures(table, temperature);
    return temperature;
  };
  /** K of the light component at the point solved last. */
  const lightK = (): number => Math.exp(table.logPressure[0]! - logPressure);
  return {
    vapor: (x) => (solve(x, 0), x * lightK()),
    liquid: (y) => (solve(y, 1), y / lightK()),
    temperature: (x) => solve(x, 0),
  };
}
