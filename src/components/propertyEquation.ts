import { gasConstant } from "../base/constants";
import type { Component, PropertyBlock } from "./component";

/**
 * Equations by name, with t = 1 - Tr, Tr = T/Tc; SI results from the constants as published.
 *
 *   heat of vaporization [J/mol]       dippr106  c1 t^(c2 + c3 Tr + c4 Tr^2 + c5 Tr^3)
 *                                      ppds12    R Tc (c1 t^(1/3) + c2 t^(2/3) + c3 t + c4 t^2 + c5 t^6)
 *   liquid density [kg/m3]             dippr105  M c1/c2^(1 + (1 - T/c3)^c4), c1 in kmol/m3
 *                                      ppds116   c1 + c2 t^0.35 + c3 t^(2/3) + c4 t + c5 t^(4/3)
 *                                      rackett   M Pc/(R Tc c1^(1 + t^(2/7)))
 *   liquid heat capacity [J/(mol K)]   dippr100  c1 + c2 T + c3 T^2 + c4 T^3 + c5 T^4
 *                                      dippr114  (c1^2/t + c2 - 2 c1 c3 t - c1 c4 t^2 - c3^2 t^3/3 - c3 c4 t^4/2
 *                                                - c4^2 t^5/5)/1000
 *                                      constant  c1
 *   ideal-gas heat capacity            dippr107  c1 + c2 ((c3/T)/sinh(c3/T))^2 + c4 ((c5/T)/cosh(c5/T))^2
 *                                      polynomialOverR  R (c1 + c2 T + c3 T^2 + c4 T^3 + c5 T^4)
 *   liquid viscosity [Pa s]            dippr101  exp(c1 + c2/T + c3 ln T + c4 T^c5)
 *                                      ppds9     c5 exp(c1 q^(1/3) + c2 q^(4/3)), q = (c3 - T)/(T - c4)
 *                                      vogel     0.001 10^(c1 + c2/(c3 - T))
 *   surface tension [N/m]              powerSum  c1 t^c2 + c3 t^c4 + c5 t^c6
 *                                      linear    c1 - c2 (T - 273.15); also dippr106
 */
type Evaluate = (
  c: readonly number[],
  temperature: number,
  block: PropertyBlock,
  component: Component,
) => number;

/** t = 1 - T/Tc of a block, with the component's Tc where the block has none of its own. */
function distance(temperature: number, block: PropertyBlock, component: Component): number {
  return Math.max(
    0,
    1 - temperature / (block.criticalTemperature ?? component.criticalTemperature ?? Number.NaN),
  );
}

const dippr106: Evaluate = ([c1 = 0, c2 = 0, c3 = 0, c4 = 0, c5 = 0], temperature, block, component) => {
  const t = distance(temperature, block, component);
  const reduced = 1 - t;
  return c1 * t ** (c2 + c3 * reduced + c4 * reduced ** 2 + c5 * reduced ** 3);
};

const polynomial: Evaluate = (c, temperature) => c.reduceRight((sum, each) => sum * temperature + each, 0);

const hyperbolic: Evaluate = ([c1 = 0, c2 = 0, c3 = 0, c4 = 0, c5 = 0], temperature) => {
  const first = c3 / temperature;
  const second = c5 / temperature;
  const sinh = c2 === 0 ? 0 : c2 * (first / Math.sinh(first)) ** 2;
  const cosh = c4 === 0 ? 0 : c4 * (second / Math.cosh(second)) ** 2;
  return c1 + sinh + cosh;
};

const ppds12: Evaluate = ([c1 = 0, c2 = 0, c3 = 0, c4 = 0, c5 = 0], temperature, block, component) => {
  const t = distance(temperature, block, component);
  const critical = block.criticalTemperature ?? component.criticalTemperature ?? Number.NaN;
  return (
    gasConstant * critical * (c1 * t ** (1 / 3) + c2 * t ** (2 / 3) + c3 * t + c4 * t ** 2 + c5 * t ** 6)
  );
};

const dippr114: Evaluate = ([c1 = 0, c2 = 0, c3 = 0, c4 = 0], temperature, block, component) => {
  const t = distance(temperature, block, component);
  const series = -2 * c1 * c3 * t - c1 * c4 * t ** 2 - (c3 * c3 * t ** 3) / 3 - (c3 * c4 * t ** 4) / 2;
  return (c1 ** 2 / t + c2 + series - (c4 * c4 * t ** 5) / 5) / 1000;
};

const dippr105: Evaluate = ([c1 = 0, c2 = 1, c3 = 1, c4 = 1], temperature, _block, component) =>
  (c1 / c2 ** (1 + Math.max(0, 1 - temperature / c3) ** c4)) * 1e3 * (component.molarMass ?? Number.NaN);

const ppds116: Evaluate = ([c1 = 0, c2 = 0, c3 = 0, c4 = 0, c5 = 0], temperature, block, component) => {
  const t = distance(temperature, block, component);
  return c1 + c2 * t ** 0.35 + c3 * t ** (2 / 3) + c4 * t + c5 * t ** (4 / 3);
};

const rackett: Evaluate = ([c1 = 0], temperature, _block, component) => {
  const {
    criticalTemperature = Number.NaN,
    criticalPressure = Number.NaN,
    molarMass = Number.NaN,
  } = component;
  const t = Math.max(0, 1 - temperature / criticalTemperature);
  const volume = ((gasConstant * criticalTemperature) / criticalPressure) * c1 ** (1 + t ** (2 / 7));
  return molarMass / volume;
};

const dippr101: Evaluate = ([c1 = 0, c2 = 0, c3 = 0, c4 = 0, c5 = 0], temperature) =>
  Math.exp(c1 + c2 / temperature + c3 * Math.log(temperature) + c4 * temperature ** c5);

const ppds9: Evaluate = ([c1 = 0, c2 = 0, c3 = 0, c4 = 0, c5 = 0], temperature) => {
  const root = Math.cbrt((c3 - temperature) / (temperature - c4));
  return c5 * Math.exp(c1 * root + c2 * root ** 4);
};

const vogel: Evaluate = ([c1 = 0, c2 = 0, c3 = 0], temperature) =>
  1e-3 * 10 ** (c1 + c2 / (c3 - temperature));

const powerSum: Evaluate = (
  [c1 = 0, c2 = 0, c3 = 0, c4 = 0, c5 = 0, c6 = 0],
  temperature,
  block,
  component,
) => {
  const t = distance(temperature, block, component);
  return c1 * t ** c2 + c3 * t ** c4 + c5 * t ** c6;
};

const linear: Evaluate = ([c1 = 0, c2 = 0], temperature) => c1 - c2 * (temperature - 273.15);

const equations: Readonly<Record<string, Evaluate>> = {
  dippr106,
  ppds12,
  dippr105,
  ppds116,
  rackett,
  dippr100: polynomial,
  dippr114,
  polynomialOverR: (c, temperature, block, component) =>
    gasConstant * polynomial(c, temperature, block, component),
  dippr107: hyperbolic,
  constant: ([c1 = Number.NaN]) => c1,
  dippr101,
  ppds9,
  vogel,
  powerSum,
  linear,
};

/** Value of a property block at T [K], in SI; NaN where its equation has none. */
export function evaluateProperty(block: PropertyBlock, temperature: number, component: Component): number {
  const evaluate = Object.hasOwn(equations, block.equation) ? equations[block.equation] : undefined;
  return evaluate === undefined ? Number.NaN : evaluate(block.constants, temperature, block, component);
}

/**
 * Value of a block with T [K] kept inside its published range, beyond which polynomials run away; undefined when there is
 * no block or its equation has no value.
 */
export function propertyInRange(
  block: PropertyBlock | undefined,
  temperature: number,
  component: Component,
): number | undefined {
  if (block === undefined) return undefined;
  const [low, high] = block.range;
  const value = evaluateProperty(block, Math.min(high, Math.max(low, temperature)), component);
  return Number.isFinite(value) ? value : undefined;
}

/** Whether T [K] lies outside the published range of a block: what `propertyInRange` gives is then its end value. */
export function isOutsideRange(block: PropertyBlock, temperature: number): boolean {
  return temperature < block.range[0] || temperature > block.range[1];
}
