import type { ColumnFlows } from "./binaryColumn";
import type { EquilibriumCurve } from "./equilibriumCurve";
import { trayLiquid } from "./trayLiquid";

/** How a staircase is drawn. */
export interface StaircaseRules {
  readonly distillateLightFraction: number;
  readonly bottomsLightFraction: number;
  /** Stage of each stream from the top; undefined puts it where the operating lines meet. */
  readonly streamStages?: readonly (number | undefined)[];
  /** Murphree vapor efficiency of every stage, above 0. */
  readonly efficiency: number;
  /** The first stage is a partial condenser, of efficiency 1 whatever the trays have. */
  readonly idealFirstStage: boolean;
  /** The last stage is a reboiler of efficiency 1 below the stages stepped: they end at the liquid that feeds it. */
  readonly idealReboiler: boolean;
}

/** A staircase: liquid and vapor leaving each stage from the top, without an ideal reboiler, and where the streams join. */
export interface Staircase {
  readonly liquid: Float64Array;
  readonly vapor: Float64Array;
  readonly count: number;
  /** Fractional: the share of the last step that reaches the end. An ideal reboiler counts one more. */
  readonly stages: number;
  readonly streamStages: readonly number[];
}

/** Why a staircase cannot be drawn, and the stream, from 0, that it fails on. */
export interface StaircaseFault {
  readonly reason: "leaves-diagram" | "stands-still" | "too-many-stages" | "stream-below-bottom";
  readonly stream: number;
}

const mostStages = 100_000;
const firstLength = 64;
/** Part of x by which rounding may raise it where a staircase stands still at a pinch. */
const rounding = 1e-12;

/**
 * Steps off stages from the top. The liquid leaving a stage is in equilibrium with its vapor (or, with an efficiency E,
 * y_n = y_(n+1) + E (y*(x_n) - y_(n+1))); the vapor rising from the stage below lies on the operating line in force,
 * which changes on the first stage whose liquid is at or below the meeting point of the lines, or on the stage given.
 */
export function stepStages(
  curve: EquilibriumCurve,
  flows: ColumnFlows,
  rules: StaircaseRules,
): Staircase | StaircaseFault {
  const { slope, intercept, meeting, due, end } = prepare(curve, flows, rules);
  const ideal = rules.efficiency === 1;
  const onTray = trayLiquid(curve, rules.efficiency);
  const joined: number[] = [];
  let liquid = new Float64Array(firstLength);
  let vapor = new Float64Array(firstLength);
  let y = rules.distillateLightFraction;
  let before = y;
  // Vapor gains no more than E on a stage.
  if (rules.efficiency * mostStages < before - curve.vapor(rules.bottomsLightFraction)) {
    return { reason: "too-many-stages", stream: -1 };
  }
  if (before <= end[0]!) return finish(flows, rules, joined, { liquid, vapor, count: 0, stages: 0 });
  // The section in force, in plain numbers: this loop is the whole cost of a long staircase.
  let [m, b, meets, fed, last] = [slope[0]!, intercept[0]!, meeting[0]!, due[0]!, end[0]!];
  for (let stage = 1; stage <= mostStages; stage++) {
    const inEquilibrium = ideal || (stage === 1 && rules.idealFirstStage);
    let x = inEquilibrium ? curve.liquid(y) : onTray(m, b, y, before);
    let joins = false;
    while (stage >= fed || x <= meets) {
      joins = true;
      const k = joined.push(stage);
      [m, b, meets, fed, last] = [slope[k]!, intercept[k]!, meeting[k]!, due[k]!, end[k]!];
      if (!inEquilibrium) x = onTray(m, b, y, before);
    }
    if (!(x >= 0 && y >= 0 && y <= 1)) return { reason: "leaves-diagram", stream: joined.length - 1 };
    if (x >= before && !joins) {
      const stream = joined.length - 1;
      if (x > before * (1 + rounding)) return { reason: "leaves-diagram", stream };
      if (fed === Infinity) return { reason: "stands-still", stream };
    }
    if (stage > liquid.length) {
      liquid = doubled(liquid);
      vapor = doubled(vapor);
    }
    liquid[stage - 1] = x;
    vapor[stage - 1] = y;
    if (x <= last) {
      // A stage on which a stream joins late may start below the end; it is needed all the same.
      const stages = stage - 1 + (before > last ? (before - last) / (before - x) : 1);
      return finish(flows, rules, joined, { liquid, vapor, count: stage, stages });
    }
    before = x;
    y = m * x + b;
  }
  return { reason: "too-many-stages", stream: joined.length - 1 };
}

interface Prepared {
  readonly slope: Float64Array;
  readonly intercept: Float64Array;
  /** x at which the next stream joins where it has no stage of its own; -1 where it has, and after the last. */
  readonly meeting: Float64Array;
  /** Stage on which the next stream joins at the latest: its own, or that of one below it. */
  readonly due: Float64Array;
  /** Liquid at which the count ends. */
  readonly end: Float64Array;
}

function prepare(curve: EquilibriumCurve, flows: ColumnFlows, rules: StaircaseRules): Prepared {
  const { sections, intersections } = flows;
  const { bottomsLightFraction: xB, streamStages, idealReboiler } = rules;
  const last = intersections.length;
  const meeting = new Float64Array(last + 1).fill(-1);
  const due = new Float64Array(last + 1).fill(Infinity);
  for (let k = last - 1; k >= 0; k--) {
    const given = streamStages?.[k];
    if (given === undefined) meeting[k] = intersections[k]!;
    due[k] = Math.min(given ?? Infinity, due[k + 1]!);
  }
  const reboiled = idealReboiler ? curve.vapor(xB) : xB;
  return {
    slope: Float64Array.from(sections, ({ liquid, vapor }) => liquid / vapor),
    intercept: Float64Array.from(sections, ({ lightUp, vapor }) => lightUp / vapor),
    meeting,
    due,
    end: Float64Array.from(sections, ({ liquid, vapor, lightUp }) =>
      idealReboiler ? (vapor * reboiled - lightUp) / liquid : xB,
    ),
  };
}

/** Closes a staircase; streams that have not joined go to an ideal reboiler, unless their stage is another. */
function finish(
  flows: ColumnFlows,
  { idealReboiler, streamStages }: StaircaseRules,
  joined: readonly number[],
  steps: Pick<Staircase, "liquid" | "vapor" | "count" | "stages">,
): Staircase | StaircaseFault {
  const { liquid, vapor, count, stages } = steps;
  const all = [...joined];
  for (let k = joined.length; k < flows.intersections.length; k++) {
    const given = streamStages?.[k] ?? count + 1;
    if (!idealReboiler || given !== count + 1) return { reason: "stream-below-bottom", stream: k };
    all.push(given);
  }
  return {
    liquid: liquid.subarray(0, count),
    vapor: vapor.subarray(0, count),
    count,
    stages: idealReboiler ? stages + 1 : stages,
    streamStages: all,
  };
}

function doubled(values: Float64Array<ArrayBuffer>): Float64Array<ArrayBuffer> {
  const longer = new Float64Array(2 * values.length);
  longer.set(values);
  return longer;
}

/** Stages at total reflux between two liquids, where the operating line is the diagonal. */
export function totalRefluxStages(curve: EquilibriumCurve, from: number, to: number): number | undefined {
  let before = from;
  for (let stage = 1; stage <= mostStages; stage++) {
    const x = curve.liquid(before);
    if (!(x < before)) return undefined;
    if (x <= to) return stage - 1 + (before - to) / (before - x);
    before = x;
  }
  return undefined;
}
