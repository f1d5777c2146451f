import { type Issue, refuseIfFaulty } from "../base/errors";
import { type Judged, type MethodUsed, sortCautions } from "../base/result";
import { method } from "../base/source";
import { type BinaryColumn, type ColumnFlows, columnFlows } from "../staging/binaryColumn";
import type { TypedStream } from "../staging/binaryInput";
import { tabulate } from "../staging/curveTable";
import { refuseImpossibleProducts } from "../staging/impossibleProducts";
import { type MinimumReflux, minimumReflux, type RefluxLimitedBy } from "../staging/minimumReflux";
import { type Staircase, stepStages, totalRefluxStages } from "../staging/stepStages";
import { streamsFromTheTop } from "../staging/streamOrder";
import { refuseVanishingFlow } from "../staging/vanishingFlow";
import { judgeBinary } from "./binaryCautions";
import { type BinaryCurves, binaryCurves } from "./binaryCurves";
import { refuseAzeotrope, refuseMinimumStages, refuseNoReflux, refuseStaircase } from "./binaryRefusals";
import { type BinaryTask, type McCabeThieleInput, readBinaryTask } from "./mccabeThieleInput";
import { refluxAbove } from "./reflux";
import type { Section } from "./shortcutDesignResult";
import { rulesOf } from "./staircaseRules";

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
  /** From the top, of the topmost feed. */
  readonly feedStage: number;
  /** Of every feed, from the top. */
  readonly feedStages: readonly number[];
  /** Of every side draw, from the top. */
  readonly sideDrawStages?: readonly number[];
  /** What the flows below are in. */
  readonly flowBasis: "mol/s" | "per mole of feed";
  readonly distillateFlow: number;
  readonly bottomsFlow: number;
  /** Vapor of the last section over the bottoms [-]. */
  readonly boilupRatio: number;
  readonly sections: readonly Section[];
  /** With an efficiency, of the trays alone. */
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
 * and the reboiler is one more equilibrium stage. Streams keep to the stages given; the others join where the operating
 * lines meet. Minimum reflux is where an operating line first touches the curve, at a feed or as a tangent, or where a
 * flow vanishes. Assumes constant molar overflow; a pair whose heats of vaporization part is told so.
 *
 * Source: W. L. McCabe and E. W. Thiele, Ind. Eng. Chem. 17 (1925) 605.
 *
 * @throws DesignInputError with all faults of the input
 * @throws DesignInfeasibleError for products that the feed cannot give, a reflux ratio that does not exceed the
 * minimum, an azeotrope between the products, a feed stage that no column can have, more than 100 000 stages
 * @example mccabeThiele({ relativeVolatility: 2.5, feed: { lightFraction: 0.5, q: 1 }, distillateLightFraction: 0.95, bottomsLightFraction: 0.05, refluxRatio: 1.8 }).stages // 11.0
 */
export function mccabeThiele(input: McCabeThieleInput): McCabeThiele {
  const faults: Issue[] = [];
  const task = readBinaryTask(faults, input);
  refuseIfFaulty(faults);
  return solve(task!);
}

function solve(task: BinaryTask): McCabeThiele {
  const { curve, reflux, xD, xB } = task;
  const streams = streamsFromTheTop(task.streams, curve);
  const column: BinaryColumn = {
    streams,
    distillateLightFraction: xD,
    bottomsLightFraction: xB,
    openSteam: task.openSteam,
  };
  refuseImpossibleProducts(column, streams);
  const table = curve.concave ? undefined : tabulate(curve, xB, xD);
  if (table !== undefined) refuseAzeotrope(table, xD);
  const minimum = minimumReflux(curve, column, table);
  if (!Number.isFinite(minimum.minimumReflux)) return refuseNoReflux(xD);
  if (reflux.field === "refluxRatio") refuseVanishingFlow(column, reflux.value, minimum);
  const refluxRatio = refluxAbove(reflux, minimum.minimumReflux);
  const flows = columnFlows(column, refluxRatio);
  const stairs = stepStages(curve, flows, rulesOf(task, streams));
  if ("reason" in stairs) return refuseStaircase(stairs, streams, reflux);
  return describe(task, streams, { minimum, refluxRatio, flows, stairs });
}

/** Fenske's closed form for a constant volatility, stepped along the diagonal for any other curve. */
function minimumStagesOf({ equilibrium, curve, xD, xB }: BinaryTask): number {
  const { relativeVolatility } = equilibrium;
  if (relativeVolatility === undefined) return totalRefluxStages(curve, xD, xB) ?? refuseMinimumStages(xD);
  const logarithms = Math.log(xD) - Math.log1p(-xD) + Math.log1p(-xB) - Math.log(xB);
  return logarithms / Math.log1p(relativeVolatility - 1);
}

interface Solution {
  readonly minimum: MinimumReflux;
  readonly refluxRatio: number;
  readonly flows: ColumnFlows;
  readonly stairs: Staircase;
}

/** What a result repeats of its task. */
function echoOf({ equilibrium, efficiency, condenser, openSteam, xD, xB }: BinaryTask) {
  const { pair, pressure, relativeVolatility } = equilibrium;
  return {
    ...(relativeVolatility === undefined ? {} : { relativeVolatility }),
    ...(pair === undefined ? {} : { pair }),
    ...(pressure === undefined ? {} : { pressure }),
    distillateLightFraction: xD,
    bottomsLightFraction: xB,
    condenser,
    reboiler: openSteam ? ("open-steam" as const) : ("partial" as const),
    ...(efficiency === undefined ? {} : { murphreeVaporEfficiency: efficiency }),
  };
}

function describe(task: BinaryTask, streams: readonly TypedStream[], solution: Solution): McCabeThiele {
  const { equilibrium } = task;
  const { minimum, refluxRatio, flows, stairs } = solution;
  const last = flows.sections[flows.sections.length - 1]!;
  const feedStages = stairs.streamStages.filter((_, i) => streams[i]!.flow > 0);
  const sideDrawStages = stairs.streamStages.filter((_, i) => streams[i]!.flow < 0);
  return {
    kind: "mccabeThiele",
    ...echoOf(task),
    minimumStages: minimumStagesOf(task),
    minimumReflux: minimum.minimumReflux,
    minimumRefluxLimitedBy: minimum.limitedBy,
    pinch: minimum.pinch,
    refluxRatio,
    refluxOverMinimum: minimum.minimumReflux > 0 ? refluxRatio / minimum.minimumReflux : null,
    stages: stairs.stages,
    stagesWhole: Math.ceil(stairs.stages - 1e-9),
    feedStage: feedStages[0]!,
    feedStages,
    ...(sideDrawStages.length === 0 ? {} : { sideDrawStages }),
    flowBasis: task.flowGiven ? "mol/s" : "per mole of feed",
    distillateFlow: flows.distillate,
    bottomsFlow: flows.bottoms,
    boilupRatio: last.vapor / flows.bottoms,
    sections: flows.sections.map(({ liquid, vapor }) => ({ liquid, vapor })),
    steps: stepsOf(stairs),
    curves: binaryCurves(task, streams, flows, stairs),
    cautions: sortCautions(equilibrium.cautions, judgeBinary(task, streams, solution)),
    methods: [...methods, ...equilibrium.methods],
  };
}

function stepsOf({ liquid, vapor, count }: Staircase): BinaryStage[] {
  const steps: BinaryStage[] = [];
  for (let i = 0; i < count; i++) steps.push({ stage: i + 1, x: liquid[i]!, y: vapor[i]! });
  return steps;
}
