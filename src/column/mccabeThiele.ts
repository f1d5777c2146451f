import { type Issue, refuseAsInfeasible, refuseIfFaulty } from "../base/errors";
import { type Caution, type Judged, type MethodUsed, sortCautions } from "../base/result";
import { method } from "../base/source";
import { type BinaryColumn, type ColumnFlows, columnFlows } from "../staging/binaryColumn";
import { refuseImpossibleProducts, type TypedStream } from "../staging/binaryInput";
import { feedPinch } from "../staging/feedLine";
import { type MinimumReflux, minimumReflux, type RefluxLimitedBy } from "../staging/minimumReflux";
import { type Staircase, stepStages, totalRefluxStages } from "../staging/stepStages";
import { type BinaryCurves, binaryCurves } from "./binaryCurves";
import { judgeBinary } from "./binaryCautions";
import { type BinaryTask, type McCabeThieleInput, readBinaryTask } from "./mccabeThieleInput";
import { refuseAzeotrope, refuseStaircase } from "./binaryRefusals";
import { refluxAbove } from "./reflux";
import type { Section } from "./shortcutDesignResult";

/** Compositions leaving a stage, mole fractions of the light component. */
export interface BinaryStage {
  readonly stage: number;
  readonly x: number;
  readonly y: number;
}

/** What `mccabeThiele` gives. Flows are per mole of feed unless a flow is given. */
export interface McCabeThiele extends Judged {
  readonly kind: "mccabeThiele";
  readonly relativeVolatility?: number;
  readonly pair?: { readonly light: string; readonly heavy: string };
  /** Absolute [Pa]. */
  readonly pressure?: number;
  readonly distillateLightFraction: number;
  readonly bottomsLightFraction: number;
  readonly condenser: "total" | "partial";
  readonly reboiler: "partial" | "open-steam";
  readonly murphreeVaporEfficiency?: number;
  /** At total reflux. */
  readonly minimumStages: number;
  readonly minimumReflux: number;
  readonly minimumRefluxLimitedBy: RefluxLimitedBy;
  readonly pinch: readonly [number, number];
  readonly refluxRatio: number;
  readonly refluxOverMinimum: number | null;
  /** Equilibrium stages with a fractional last one; with an efficiency, trays and the reboiler. */
  readonly stages: number;
  readonly stagesWhole: number;
  /** From the top, of the first stream. */
  readonly feedStage: number;
  /** Of every stream, from the top. */
  readonly feedStages: readonly number[];
  /** What the flows below are in. */
  readonly flowBasis: "mol/s" | "per mole of feed";
  readonly distillateFlow: number;
  readonly bottomsFlow: number;
  /** Vapor of the last section over the bottoms [-]. */
  readonly boilupRatio: number;
  readonly sections: readonly Section[];
  readonly steps: readonly BinaryStage[];
  readonly curves: BinaryCurves;
}

const methods: readonly MethodUsed[] = [method("McCabe-Thiele staircase", "mccabeThiele1925")];

/**
 * Equilibrium stages of a binary column, stepped off between the operating lines and the equilibrium curve.
 *
 *   V y = L x + D xD - (feeds above),   L = R D, V = (R + 1) D at the top; q F joins the liquid at a feed
 *   the line in force changes on the first stage whose liquid is at or below the meeting point of the lines
 *   N = (n - 1) + (x(n-1) - xB)/(x(n-1) - x(n)),   n the first stage at or below xB
 *
 * Takes the equilibrium (a constant relative volatility above 1, a curve by points, or a pair of components at a
 * pressure), the feed (mole fraction of the light component, q, flow) or several feeds and side draws, the light
 * fraction of both products, and the reflux ratio or its multiple of the minimum. Stages count from the top, with a
 * partial condenser and the partial reboiler, without a total condenser. With a Murphree efficiency the trays have it
 * and the reboiler is one more equilibrium stage. Minimum reflux is where an operating line first touches the curve, at
 * a feed or as a tangent, or where a flow vanishes. Assumes constant molar overflow.
 *
 * Source: W. L. McCabe and E. W. Thiele, Ind. Eng. Chem. 17 (1925) 605.
 *
 * @throws DesignInputError with all faults of the input
 * @throws DesignInfeasibleError for products that the feed cannot give, a reflux ratio that does not exceed the
 * minimum, an azeotrope between the products, a feed stage that no column can have
 * @example mccabeThiele({ relativeVolatility: 2.5, feed: { lightFraction: 0.5, q: 1 }, distillateLightFraction: 0.95, bottomsLightFraction: 0.05, refluxRatio: 1.8 }).stages // 11.0
 */
export function mccabeThiele(input: McCabeThieleInput): McCabeThiele {
  const faults: Issue[] = [];
  const task = readBinaryTask(faults, input);
  refuseIfFaulty(faults);
  return solve(task!);
}

function solve(task: BinaryTask): McCabeThiele {
  const { curve, xD, xB } = task;
  const streams = fromTheTop(task);
  const column: BinaryColumn = {
    streams,
    distillateLightFraction: xD,
    bottomsLightFraction: xB,
    openSteam: task.openSteam,
  };
  refuseImpossibleProducts(column, streams);
  refuseAzeotrope(curve, xD, xB);
  const minimum = minimumReflux(curve, column);
  if (minimum === undefined) return refuseNoReflux();
  const refluxRatio = refluxAbove(task.reflux, minimum.minimumReflux);
  const flows = columnFlows(column, refluxRatio);
  const stairs = stairsOf(task, flows, given(task, streams), refluxRatio);
  return describe(task, streams, { minimum, refluxRatio, flows, stairs });
}

/** Streams in the order in which the column meets them: by stage where stages are given, else by their pinch. */
function fromTheTop({ streams, curve, feedStage }: BinaryTask): TypedStream[] {
  const staged = streams.map((stream) =>
    streams.length === 1 && feedStage !== "optimum" ? { ...stream, stage: feedStage } : stream,
  );
  const level = (stream: TypedStream): number => feedPinch(curve, stream)[0];
  return staged
    .map((stream) => ({ stream, x: level(stream) }))
    .sort((a, b) =>
      a.stream.stage !== undefined && b.stream.stage !== undefined
        ? a.stream.stage - b.stream.stage
        : b.x - a.x,
    )
    .map(({ stream }) => stream);
}

function given(task: BinaryTask, streams: readonly TypedStream[]): (number | undefined)[] {
  return streams.map(({ stage, path }) =>
    stage !== undefined
      ? stage
      : path === "feed" && task.feedStage !== "optimum"
        ? task.feedStage
        : undefined,
  );
}

function refuseNoReflux(): never {
  return refuseAsInfeasible({
    code: "specification-infeasible",
    path: "distillateLightFraction",
    message:
      "distillateLightFraction cannot be reached at any reflux ratio up to 1e9: the operating lines never leave the equilibrium curve; check the curve near the products",
    value: undefined,
  });
}

function stairsOf(
  task: BinaryTask,
  flows: ColumnFlows,
  streamStages: readonly (number | undefined)[],
  refluxRatio: number,
): Staircase {
  const { curve, xD, efficiency = 1, condenser } = task;
  const stairs = stepStages(curve, flows, {
    distillateLightFraction: xD,
    lastLiquid: lastLiquidOf(task, flows),
    streamStages,
    efficiency,
    idealFirstStage: condenser === "partial",
  });
  return typeof stairs === "string" ? refuseStaircase(stairs, streamStages, refluxRatio) : stairs;
}

/** With an efficiency on the trays alone the count ends at the liquid that feeds the reboiler, one stage by itself. */
function lastLiquidOf(task: BinaryTask, flows: ColumnFlows): number {
  if (!hasIdealReboiler(task)) return task.xB;
  const { liquid, vapor, lightUp } = flows.sections[flows.sections.length - 1]!;
  return (vapor * task.curve.vapor(task.xB) - lightUp) / liquid;
}

function hasIdealReboiler({ efficiency, efficiencyOnReboiler, openSteam }: BinaryTask): boolean {
  return efficiency !== undefined && !efficiencyOnReboiler && !openSteam;
}

interface Solution {
  readonly minimum: MinimumReflux;
  readonly refluxRatio: number;
  readonly flows: ColumnFlows;
  readonly stairs: Staircase;
}

/** Fenske's closed form for a constant volatility, stepped along the diagonal for any other curve. */
function minimumStagesOf({ equilibrium, curve, xD, xB }: BinaryTask): number {
  const { relativeVolatility } = equilibrium;
  if (relativeVolatility === undefined)
    return totalRefluxStages(curve, xD, xB) ?? refuseStaircase("too-many-stages", [], 0);
  return Math.log(((xD / (1 - xD)) * (1 - xB)) / xB) / Math.log(relativeVolatility);
}

function describe(task: BinaryTask, streams: readonly TypedStream[], solution: Solution): McCabeThiele {
  const { equilibrium, efficiency, condenser, openSteam, xD, xB } = task;
  const { minimum, refluxRatio, flows, stairs } = solution;
  const stages = stairs.stages + (hasIdealReboiler(task) ? 1 : 0);
  const { pair, pressure, relativeVolatility } = equilibrium;
  const last = flows.sections[flows.sections.length - 1]!;
  const cautions: Caution[] = judgeBinary(task, streams, solution);
  const steps: BinaryStage[] = [];
  for (let i = 0; i < stairs.count; i++)
    steps.push({ stage: i + 1, x: stairs.liquid[i]!, y: stairs.vapor[i]! });
  return {
    kind: "mccabeThiele",
    ...(relativeVolatility === undefined ? {} : { relativeVolatility }),
    ...(pair === undefined ? {} : { pair }),
    ...(pressure === undefined ? {} : { pressure }),
    distillateLightFraction: xD,
    bottomsLightFraction: xB,
    condenser,
    reboiler: openSteam ? "open-steam" : "partial",
    ...(efficiency === undefined ? {} : { murphreeVaporEfficiency: efficiency }),
    minimumStages: minimumStagesOf(task),
    minimumReflux: minimum.minimumReflux,
    minimumRefluxLimitedBy: minimum.limitedBy,
    pinch: minimum.pinch,
    refluxRatio,
    refluxOverMinimum: minimum.minimumReflux > 0 ? refluxRatio / minimum.minimumReflux : null,
    stages,
    stagesWhole: Math.ceil(stages - 1e-9),
    feedStage: stairs.streamStages[0]!,
    feedStages: feedStagesAsListed(task, streams, stairs),
    flowBasis: task.flowGiven ? "mol/s" : "per mole of feed",
    distillateFlow: flows.distillate,
    bottomsFlow: flows.bottoms,
    boilupRatio: last.vapor / flows.bottoms,
    sections: flows.sections.map(({ liquid, vapor }) => ({ liquid, vapor })),
    steps,
    curves: binaryCurves(task, streams, flows, stairs),
    cautions: sortCautions(equilibrium.cautions, cautions),
    methods: [...methods, ...equilibrium.methods],
  };
}

/** Stages of the feeds from the top: the order in which they were typed never matters. */
function feedStagesAsListed(_task: BinaryTask, streams: readonly TypedStream[], stairs: Staircase): number[] {
  return stairs.streamStages.filter((_, i) => streams[i]!.flow > 0);
}
