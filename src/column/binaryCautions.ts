import type { Caution } from "../base/result";
import type { TypedStream } from "../staging/binaryInput";
import type { ColumnFlows } from "../staging/binaryColumn";
import type { MinimumReflux } from "../staging/minimumReflux";
import { type Staircase, stepStages } from "../staging/stepStages";
import type { BinaryTask } from "./mccabeThieleInput";
import { closeBoiling, nearMinimumReflux } from "./reflux";
import { rulesOf } from "./staircaseRules";

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
    closeBoiling(leastVolatility(task)),
    pinchCaution(solved),
    nearMinimumReflux(solved.refluxRatio, solved.minimum.minimumReflux),
    offOptimum(task, streams, solved),
    outsideTwoPhases(streams),
  ];
  return cautions.filter((caution) => caution !== undefined);
}

/** The constant volatility, or the lesser of a pair's at its two products; a curve by points gives none worth judging. */
function leastVolatility({ equilibrium, curve, xD, xB }: BinaryTask): number {
  if (equilibrium.pair === undefined) return equilibrium.relativeVolatility ?? Infinity;
  const at = (x: number): number => (curve.vapor(x) * (1 - x)) / (x * (1 - curve.vapor(x)));
  return Math.min(at(xB), at(xD));
}

function pinchCaution({ minimum }: Solved): Caution | undefined {
  const { limitedBy, minimumReflux: value, pinch } = minimum;
  if (limitedBy === "feed-pinch") return undefined;
  if (limitedBy === "tangent-pinch") {
    const message = `an operating line touches the equilibrium curve at x = ${short(pinch[0])}, away from the feed: the minimum reflux ${short(value)} depends on the curve just there`;
    return { code: "tangent-pinch", severity: "check", kind: "method", message, value };
  }
  const message =
    value > 0
      ? `below the reflux ratio ${short(value)} a section would have no liquid or no vapor; no pinch limits it before`
      : "any reflux ratio above 0 will do: no pinch asks for reflux";
  return { code: "flow-vanishes-first", severity: "note", kind: "method", message, value };
}

/** Given stages are stepped once more at their optimum, to say what they cost. */
function offOptimum(
  task: BinaryTask,
  streams: readonly TypedStream[],
  { flows, stairs }: Solved,
): Caution | undefined {
  if (streams.every(({ stage }) => stage === undefined)) return undefined;
  const best = stepStages(task.curve, flows, rulesOf(task));
  if ("reason" in best) return undefined;
  const i = streams.findIndex(({ stage }, k) => stage !== undefined && stage !== best.streamStages[k]);
  const cost = stairs.stages - best.stages;
  if (i < 0 || !(cost > 0)) return undefined;
  const [given, optimum] = [stairs.streamStages[i]!, best.streamStages[i]!];
  const what = streams.length === 1 ? "the feed" : streams[i]!.path;
  return {
    code: "feed-stage-off-optimum",
    severity: "note",
    kind: "method",
    message: `${what} on stage ${given} instead of its optimum ${optimum} costs ${short(cost)} stages`,
    value: given,
    limit: optimum,
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
