import { DesignInputError, type Issue } from "../base/errors";
import { type Stream, stream } from "../balance/stream";
import { idealMixture, stateAtPressure } from "../equilibrium/phaseState";
import type { DesignTask } from "./designInput";
import type { TotalRefluxSplit } from "./keySplit";

/** Temperatures at the ends of the column [K]: dew point of the distillate, bubble point of the bottoms. */
export interface EndTemperatures {
  readonly top: number;
  readonly bottom: number;
}

/** The two products as they leave the column: saturated, liquid from a total condenser, vapor from a partial one. */
export function designProducts(
  task: DesignTask,
  split: TotalRefluxSplit,
  temperatures: EndTemperatures | undefined,
): { distillate: Stream; bottoms: Stream } {
  const { names, components, flow } = task.feed;
  const distillate = split.distillate.map((d) => d / split.distillateFlow);
  const bottoms = split.bottoms.map((b) => b / split.bottomsFlow);
  const distillateFlow = flow * split.distillateFlow;
  const bottomsFlow = flow * split.bottomsFlow;
  if (temperatures === undefined) {
    return {
      distillate: stream(names, distillateFlow, distillate),
      bottoms: stream(names, bottomsFlow, bottoms),
    };
  }
  const bottom = { temperature: temperatures.bottom, pressure: task.pressures!.bottom, vaporFraction: 0 };
  return {
    distillate: stream(
      names,
      distillateFlow,
      distillate,
      components,
      distillateState(task, distillate, temperatures),
    ),
    bottoms: stream(names, bottomsFlow, bottoms, components, bottom),
  };
}

function distillateState(
  { condenser, pressures, feed }: DesignTask,
  fractions: Float64Array,
  ends: EndTemperatures,
) {
  if (condenser === "partial") return { temperature: ends.top, pressure: pressures!.top, vaporFraction: 1 };
  const faults: Issue[] = [];
  const pressure = pressures!.condenser;
  const mixture = idealMixture({ ...feed.mixture!, fractions });
  const state = stateAtPressure(faults, mixture, pressure, 0, { path: "pressure", typed: pressure });
  if (state === undefined) throw new DesignInputError(faults);
  return { temperature: state.temperature, pressure, vaporFraction: 0 };
}
