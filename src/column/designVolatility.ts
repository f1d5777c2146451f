import type { Split } from "../balance/split";
import { checkKeyVolatilities } from "../balance/keys";
import { DesignInputError, type Issue, refuseAsInfeasible } from "../base/errors";
import { shown } from "../base/check";
import { type IdealMixture, idealMixture, stateAtPressure } from "../equilibrium/phaseState";
import type { Mixture } from "../equilibrium/mixture";
import { volatilities } from "../equilibrium/relativeVolatility";
import { type ColumnVolatilities, volatilityAlongColumn } from "../equilibrium/volatilityAlongColumn";
import type { ColumnPressures } from "./columnPressures";
import { totalRefluxSplit, type TotalRefluxSplit } from "./keySplit";

/** Volatilities that agree with the products they give. */
export interface SettledVolatilities {
  readonly along: ColumnVolatilities;
  readonly mean: Split;
  readonly products: TotalRefluxSplit;
}

const mostPasses = 100;
const settled = 1e-11;

/**
 * Iterates Fenske's split with the volatilities at the product temperatures: products, their dew and bubble points,
 * the geometric mean of the volatilities there, products again, until the mean stands still.
 */
export function settleVolatilities(
  split: Omit<Split, "volatility">,
  mixture: Mixture,
  pressures: ColumnPressures,
  q: number,
): SettledVolatilities {
  const faults: Issue[] = [];
  const ideal = idealMixture(mixture);
  const origin = { path: "pressure", typed: pressures.top };
  const feed = stateAtPressure(faults, ideal, pressures.top, 0, origin);
  if (feed === undefined) throw new DesignInputError(faults);
  let volatility = volatilities(feed.kValues, split.heavyKey);
  for (let pass = 0; pass < mostPasses; pass++) {
    checkOrder(split, volatility);
    const mean = { ...split, volatility };
    const products = totalRefluxSplit(mean);
    const along = alongColumn(ideal, split, products, pressures, q);
    if (standsStill(along.mean, volatility)) return { along, mean, products };
    volatility = along.mean;
  }
  return refuseAsInfeasible({
    code: "not-converged",
    path: "pressure",
    message: `pressure: volatilities and product temperatures did not settle in ${mostPasses} passes at ${shown(pressures.top)} Pa; give relativeVolatility instead`,
    value: pressures.top,
  });
}

function checkOrder(split: Omit<Split, "volatility">, volatility: Float64Array): void {
  const faults: Issue[] = [];
  checkKeyVolatilities(faults, split.names, volatility, split.lightKey, split.heavyKey);
  if (faults.length > 0) throw new DesignInputError(faults);
}

function alongColumn(
  ideal: IdealMixture,
  split: Omit<Split, "volatility">,
  products: TotalRefluxSplit,
  pressures: ColumnPressures,
  q: number,
): ColumnVolatilities {
  const faults: Issue[] = [];
  const ends = {
    distillate: products.distillate.map((d) => d / products.distillateFlow),
    bottoms: products.bottoms.map((b) => b / products.bottomsFlow),
    topPressure: pressures.top,
    feedPressure: 0.5 * (pressures.top + pressures.bottom),
    bottomPressure: pressures.bottom,
    // Subcooled or superheated, the feed comes to its stage's bubble or dew point there.
    feedVaporFraction: Math.min(1, Math.max(0, 1 - q)),
    lightKey: split.lightKey,
    heavyKey: split.heavyKey,
  };
  const along = volatilityAlongColumn(faults, ideal, ends, { path: "pressure", typed: pressures.top });
  if (along === undefined) throw new DesignInputError(faults);
  return along;
}

function standsStill(now: Float64Array, before: Float64Array): boolean {
  for (let i = 0; i < now.length; i++) if (!(Math.abs(now[i]! / before[i]! - 1) <= settled)) return false;
  return true;
}
