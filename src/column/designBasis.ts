import {
  type ByComponent,
  byName,
  type Caution,
  collectMethods,
  type MethodUsed,
  sortCautions,
} from "../base/result";
import { refuseReversedSplit, type Split } from "../balance/split";
import { hazardCautions } from "../components/hazards";
import { judgeIdealMixture } from "../equilibrium/raoultGuard";
import { judgePressures } from "./columnPressures";
import type { DesignTask } from "./designInput";
import type { EndTemperatures } from "./designProducts";
import { settleVolatilities } from "./designVolatility";
import { conditionOnFeedStage } from "./feedThermalCondition";
import { bothLimits, type RefluxLimit, refluxLimit, type TotalRefluxSplit } from "./keySplit";
import type { ShortcutDesign } from "./shortcutDesignResult";

/** The volatilities of a design with what follows from them. */
export interface DesignBasis {
  readonly q: number;
  readonly mean: Split;
  readonly reflux: RefluxLimit;
  readonly stages: TotalRefluxSplit;
  readonly volatility: ShortcutDesign["relativeVolatility"];
  readonly temperatures?: EndTemperatures;
  readonly cautions: readonly Caution[];
  readonly methods: readonly MethodUsed[];
}

/** Volatilities as given, or by Raoult's law at the temperatures of the column. */
export function designBasis(task: DesignTask): DesignBasis {
  return task.volatility === undefined ? basisByTemperature(task) : basisGiven(task, task.volatility);
}

function basisGiven(task: DesignTask, volatility: Float64Array): DesignBasis {
  const { names, fractions, lightKey, heavyKey, lightKeyRecovery, heavyKeyRecovery } = task.split;
  const mean = { names, fractions, volatility, lightKey, heavyKey, lightKeyRecovery, heavyKeyRecovery };
  refuseReversedSplit(mean);
  const { thermal } = task.feed;
  // Without components the reader has made sure of q.
  const q = thermal?.given === "q" ? thermal.q : Number.NaN;
  const { reflux, stages } = bothLimits(mean, q);
  const given = byName(mean.names, volatility);
  return {
    q,
    mean,
    reflux,
    stages,
    volatility: { top: given, feed: given, bottom: given, mean: given },
    cautions: [],
    methods: [],
  };
}

function basisByTemperature(task: DesignTask): DesignBasis {
  const { split, feed, pressures } = task;
  refuseReversedSplit({ ...split, volatility: feed.fractions });
  const { top, bottom } = pressures!;
  const mixture = feed.mixture!;
  const thermal = conditionOnFeedStage(feed, 0.5 * (top + bottom));
  const { along, mean, products } = settleVolatilities(split, mixture, pressures!, thermal.q);
  const judged = judgeIdealMixture(mixture, bottom, [along.top.temperature, along.bottom.temperature]);
  const named = (values: Float64Array): ByComponent => byName(split.names, values);
  return {
    q: thermal.q,
    mean,
    reflux: refluxLimit({ ...split, volatility: along.feed.values }, thermal.q),
    stages: products,
    volatility: {
      top: named(along.top.values),
      feed: named(along.feed.values),
      bottom: named(along.bottom.values),
      mean: named(along.mean),
    },
    temperatures: { top: along.top.temperature, bottom: along.bottom.temperature },
    cautions: sortCautions(
      judged.cautions,
      along.cautions,
      thermal.cautions,
      judgePressures(pressures!),
      hazardCautions(mixture.components.filter((_, i) => mixture.fractions[i]! > 0)),
    ),
    methods: collectMethods(thermal.methods, judged.methods),
  };
}
