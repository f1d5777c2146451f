import type { TypedStream } from "../staging/binaryInput";
import type { StaircaseRules } from "../staging/stepStages";
import type { BinaryTask } from "./mccabeThieleInput";

/** How the staircase of a task is drawn; without `streams` they all join where the operating lines meet. */
export function rulesOf(task: BinaryTask, streams?: readonly TypedStream[]): StaircaseRules {
  const { xD, xB, efficiency, efficiencyOnReboiler, condenser, openSteam } = task;
  return {
    distillateLightFraction: xD,
    bottomsLightFraction: xB,
    ...(streams === undefined ? {} : { streamStages: streams.map(({ stage }) => stage) }),
    efficiency: efficiency ?? 1,
    idealFirstStage: condenser === "partial",
    idealReboiler: efficiency !== undefined && !efficiencyOnReboiler && !openSteam,
  };
}
