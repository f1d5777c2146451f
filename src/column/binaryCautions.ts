import type { Caution } from "../base/result";
import type { TypedStream } from "../staging/binaryInput";
import type { ColumnFlows } from "../staging/binaryColumn";
import type { MinimumReflux } from "../staging/minimumReflux";
import { type Staircase, stepStages } from "../staging/stepStages";
import type { BinaryTask } from "./mccabeThieleInput";
import { closeBoiling, nearMinimumReflux } from "./reflux";

interface Solved {
  readonly minimum: MinimumReflux;
  readonly refluxRatio: number;
  readonly flows: ColumnFlows;
  readonly stairs: Staircase;
}

const short = (value: number): string => value.toPrecision(4);

/** What is doubtful about a binary column, from its own numbers. */
export function judgeBinary(task: BinaryTask, streams: readonly TypedStream[], solved: Solved): Caution[] {
  const cautions = [
    task.equilibrium.relativeVolatility && closeBoiling(task.equilibrium.relativeVolatility),
    pinchCaution(solved),
    nearMinimumReflux(solved.refluxRatio, solved.minimum.minimumReflux),
    offOptimum(task, streams, solved),
    outsideTwoPhases(streams),
  ];
  return cautions.filter((caution) => typeof caution === "object");
}

function pinchCaution({ minimum }: Solved): Caution | undefined {
  if (minimum.limitedBy === "feed-pinch") return undefined;
  const { minimumReflux: value, pinch } = minimum;
  const tangent = minimum.limitedBy === "tangent-pinch";
  return {
    code: tangent ? "tangent-pinch" : "flow-vanishes-first",
    severity: tangent ? "check" : "note",
    kind: "method",
    message: tangent
      ? `an operating line touches the equilibrium curve at x = ${short(pinch[0])}, away from the feed: the minimum reflux ${short(value)} depends on the curve just there`
      : `below the reflux ratio ${short(value)} a section would have no liquid or no vapor; no pinch limits it before`,
    value,
  };
}

/** A given feed stage is stepped once more at its optimum, to say what it costs. */
function offOptimum(
  task: BinaryTask,
  streams: readonly TypedStream[],
  { flows, stairs }: Solved,
): Caution | undefined {
  if (streams.length !== 1 || streams[0]!.stage === undefined) return undefined;
  const best = stepStages(task.curve, flows, {
    distillateLightFraction: task.xD,
    lastLiquid: task.xB,
    efficiency: task.efficiency ?? 1,
    idealFirstStage: task.condenser === "partial",
  });
  if (typeof best === "string" || best.streamStages[0] === streams[0]!.stage) return undefined;
  const cost = stairs.stages - best.stages;
  return {
    code: "feed-stage-off-optimum",
    severity: "note",
    kind: "method",
    message: `the feed on stage ${streams[0]!.stage} instead of its optimum ${best.streamStages[0]} costs ${short(cost)} stages`,
    value: streams[0]!.stage,
    limit: best.streamStages[0]!,
  };
}

function outsideTwoPhases(streams: readonly TypedStream[]): Caution | undefined {
  const odd = streams.find(({ q, flow }) => flow > 0 && (q > 1 || q < 0));
  if (odd === undefined) return undefined;
  return {
    code: "feed-outside-two-phases",
    severity: "note",
    kind: "method",
    message: `q is ${short(odd.q)}: for a ${odd.q > 1 ? "subcooled" : "superheated"} feed the stage where the lines meet need not be the best one; try one or two stages to either side`,
    value: odd.q,
    source: "S. Wang and G. A. Mansoori (1994), as a claim",
  };
}
