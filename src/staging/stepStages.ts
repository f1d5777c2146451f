import { findRoot } from "../numerics/findRoot";
import { type ColumnFlows, type ColumnSection, operatingVapor } from "./binaryColumn";
import type { EquilibriumCurve } from "./equilibriumCurve";

/** How a staircase is drawn. */
export interface StaircaseRules {
  readonly distillateLightFraction: number;
  /** The liquid at which the count ends. */
  readonly lastLiquid: number;
  /** Stage of each stream from the top; undefined puts it where the operating lines meet. */
  readonly streamStages?: readonly (number | undefined)[];
  /** Murphree vapor efficiency of every stage, above 0. */
  readonly efficiency: number;
  /** The first stage is a partial condenser, of efficiency 1 whatever the trays have. */
  readonly idealFirstStage: boolean;
}

/** A staircase: liquid and vapor leaving each stage from the top, and where the streams join. */
export interface Staircase {
  readonly liquid: Float64Array;
  readonly vapor: Float64Array;
  readonly count: number;
  /** Fractional: the share of the last step that reaches `lastLiquid`. */
  readonly stages: number;
  readonly streamStages: readonly number[];
}

/** Why a staircase cannot be drawn. */
export type StaircaseFault = "leaves-diagram" | "too-many-stages" | "stream-below-bottom";

const mostStages = 100_000;
const evaluationTolerance = 1e-15;

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
  const { sections, intersections } = flows;
  const { lastLiquid, streamStages, efficiency } = rules;
  const liquid: number[] = [];
  const vapor: number[] = [];
  const joined: number[] = [];
  let section = 0;
  let y = rules.distillateLightFraction;
  let before = y;
  for (let stage = 1; stage <= mostStages; stage++) {
    const own = stage === 1 && rules.idealFirstStage ? 1 : efficiency;
    let x = liquidBelow(curve, sections[section]!, y, own, before);
    while (
      section < intersections.length &&
      joins(stage, x, intersections[section]!, streamStages?.[section])
    ) {
      section++;
      joined.push(stage);
      if (own !== 1) x = liquidBelow(curve, sections[section]!, y, own, before);
    }
    if (!(x >= 0 && x <= 1) || !(y <= 1) || (section > 0 && x >= before)) return "leaves-diagram";
    liquid.push(x);
    vapor.push(y);
    if (x <= lastLiquid) {
      if (section < intersections.length) return "stream-below-bottom";
      const stages = stage - 1 + (before - lastLiquid) / (before - x);
      return {
        liquid: Float64Array.from(liquid),
        vapor: Float64Array.from(vapor),
        count: stage,
        stages,
        streamStages: joined,
      };
    }
    before = x;
    y = operatingVapor(sections[section]!, x);
  }
  return "too-many-stages";
}

function joins(stage: number, x: number, meeting: number, given: number | undefined): boolean {
  return given === undefined ? x <= meeting : stage >= given;
}

/** Liquid leaving a stage whose vapor is y. */
function liquidBelow(
  curve: EquilibriumCurve,
  section: ColumnSection,
  y: number,
  efficiency: number,
  above: number,
): number {
  const inEquilibrium = curve.liquid(y);
  if (efficiency === 1) return inEquilibrium;
  const excess = (x: number): number => {
    const rising = operatingVapor(section, x);
    return rising + efficiency * (curve.vapor(x) - rising) - y;
  };
  return findRoot(excess, Math.min(inEquilibrium, above), above, evaluationTolerance) ?? inEquilibrium;
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
