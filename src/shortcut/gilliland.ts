import { readChoice, readExactlyOne, readFields, readNumber } from "../base/check";
import { DesignInputError, type Issue, refuseAsInfeasible, refuseIfFaulty } from "../base/errors";
import type { Judged, MethodUsed } from "../base/result";
import { method } from "../base/source";
import { findRoot } from "../numerics/findRoot";
import { judgeGilliland } from "./gillilandCautions";
import { type Curve, gillilandCurve } from "./gillilandCurve";
import {
  type GillilandCorrelation,
  gillilandCorrelations,
  refluxCoordinate,
  stagesFrom,
} from "./gillilandCorrelations";

/** What `gilliland` takes: the two minima, one of reflux and stages, and the correlation. */
export type GillilandInput = {
  /** Stages at total reflux, the reboiler included [-], above 0. */
  readonly minimumStages: number;
  /** Minimum reflux ratio [-], 0 or more. */
  readonly minimumReflux: number;
  /** Fit of Gilliland's points; "molokanov" when absent. */
  readonly correlation?: GillilandCorrelation;
} & (
  | {
      /** External reflux ratio L/D [-], above the minimum. */
      readonly refluxRatio: number;
      readonly stages?: never;
    }
  | {
      /** Equilibrium stages, the reboiler included [-], above the minimum. */
      readonly stages: number;
      readonly refluxRatio?: never;
    }
);

/** What `gilliland` gives. */
export interface GillilandResult extends Judged {
  readonly kind: "gilliland";
  /** Equilibrium stages, the reboiler (and a partial condenser) included [-]. */
  readonly stages: number;
  /** External reflux ratio L/D [-]. */
  readonly refluxRatio: number;
  /** Gilliland's X = (R − Rmin)/(R + 1) [-]. */
  readonly refluxCoordinate: number;
  /** Gilliland's Y = (N − Nmin)/(N + 1) [-]. */
  readonly stagesCoordinate: number;
  readonly correlation: GillilandCorrelation;
  /** Y against X. */
  readonly curve: Curve;
}

const fields: ReadonlySet<string> = new Set([
  "minimumStages",
  "minimumReflux",
  "refluxRatio",
  "stages",
  "correlation",
]);

const methods: Readonly<Record<GillilandCorrelation, readonly MethodUsed[]>> = {
  molokanov: [
    method("Gilliland correlation", "gilliland1940"),
    method("Molokanov form of the correlation", "molokanov1972"),
  ],
  eduljee: [
    method("Gilliland correlation", "gilliland1940"),
    method("Eduljee form of the correlation", "eduljee1975"),
  ],
  liddle: [
    method("Gilliland correlation", "gilliland1940"),
    method("Liddle form of the correlation", "liddle1968"),
  ],
};

/** Far above any column: the reflux stands at its minimum to within the accuracy of the correlation. */
const mostStages = 1e9;

const most = { refluxRatio: 1e30, stages: mostStages } as const;

/**
 * Stages at a reflux ratio, or the reflux ratio for a number of stages, from the two minima.
 *
 *   X = (R − Rmin)/(R + 1),   Y = (N − Nmin)/(N + 1),   N = (Nmin + Y)/(1 − Y)
 *   molokanov   Y = 1 − exp{[(1 + 54.4 X)/(11 + 117.2 X)] (X − 1)/√X}
 *   eduljee     Y = 0.75 (1 − X^0.5668)
 *   liddle      Y = 1 − 18.5715 X                           up to X = 0.01
 *               Y = 0.545827 − 0.591422 X + 0.002743/X      up to X = 0.9
 *               Y = 0.16595 (1 − X)                         above
 *
 * Stages and minimum stages both include the reboiler. Gilliland drew the curve through 61 calculated columns of 2 to
 * 11 components with Rmin 0.53 to 9.09 and Nmin 3.4 to 60.3; they scatter by several percent of N.
 *
 * Source: E. R. Gilliland, Ind. Eng. Chem. 32 (1940) 1220; Y. K. Molokanov et al., Int. Chem. Eng. 12 (1972) 209;
 * H. E. Eduljee, Hydrocarbon Process. 54(9) (1975) 120; C. J. Liddle, Chem. Eng. 75(23) (1968) 137.
 *
 * @throws DesignInputError for a number out of range, or for both or neither of refluxRatio and stages
 * @throws DesignInfeasibleError for a reflux ratio or stages that do not exceed the minimum
 * @example gilliland({ minimumStages: 8, minimumReflux: 1, refluxRatio: 1.5 }).stages // 15.68
 */
export function gilliland(input: GillilandInput): GillilandResult {
  const faults: Issue[] = [];
  const given = readFields(faults, "input", input, fields);
  if (given === undefined) throw new DesignInputError(faults);
  const minimumStages = readNumber(faults, "minimumStages", given["minimumStages"], {
    above: 0,
    atMost: mostStages,
  });
  const minimumReflux = readNumber(faults, "minimumReflux", given["minimumReflux"], minimumRefluxLimits);
  const correlation = readChoice(faults, "correlation", given["correlation"], [
    "molokanov",
    "eduljee",
    "liddle",
  ]);
  const known = readExactlyOne(faults, "input", given, ["refluxRatio", "stages"]);
  const value =
    known === undefined ? Number.NaN : readNumber(faults, known, given[known], { atMost: most[known] });
  refuseIfFaulty(faults);
  const refluxRatio =
    known === "refluxRatio" ? value : refluxFor(correlation, minimumStages, minimumReflux, value);
  const stages = known === "stages" ? value : stagesAt(correlation, minimumStages, minimumReflux, value);
  const x = refluxCoordinate(minimumReflux, refluxRatio);
  return {
    kind: "gilliland",
    stages,
    refluxRatio,
    refluxCoordinate: x,
    stagesCoordinate: (stages - minimumStages) / (stages + 1),
    correlation,
    curve: gillilandCurve(correlation),
    cautions: judgeGilliland(x, minimumStages, minimumReflux),
    methods: methods[correlation],
  };
}

const minimumRefluxLimits = {
  atLeast: 0,
  atMost: 1e12,
  hint: "where Underwood's value is negative a flow vanishes first; give the larger limit, 0 or more",
} as const;

function stagesAt(
  correlation: GillilandCorrelation,
  minimumStages: number,
  minimumReflux: number,
  refluxRatio: number,
): number {
  if (!(refluxRatio > minimumReflux)) {
    refuseAsInfeasible({
      code: "reflux-below-minimum",
      path: "refluxRatio",
      message: `refluxRatio must exceed the minimum ${minimumReflux}, got ${refluxRatio}; 1.1 to 1.5 times the minimum is usual`,
      value: refluxRatio,
      limit: minimumReflux,
    });
  }
  const x = refluxCoordinate(minimumReflux, refluxRatio);
  const stages = x > 0 ? stagesFrom(minimumStages, gillilandCorrelations[correlation](x)) : Infinity;
  if (stages < mostStages) return Math.max(stages, minimumStages);
  return refuseAsInfeasible({
    code: "too-many-stages",
    path: "refluxRatio",
    message: `refluxRatio must lie further above the minimum ${minimumReflux}, got ${refluxRatio}: it takes more than ${mostStages} stages`,
    value: refluxRatio,
    limit: minimumReflux,
  });
}

/** R = Rmin + (Rmin + 1) s with s = X/(1 − X), found in ln s so that both ends of the curve keep their digits. */
function refluxFor(
  correlation: GillilandCorrelation,
  minimumStages: number,
  minimumReflux: number,
  stages: number,
): number {
  if (!(stages > minimumStages)) {
    refuseAsInfeasible({
      code: "too-few-stages",
      path: "stages",
      message: `stages must exceed the minimum ${minimumStages} at total reflux, got ${stages}; twice the minimum is usual`,
      value: stages,
      limit: minimumStages,
    });
  }
  const target = Math.log1p(-(stages - minimumStages) / (stages + 1));
  const curve = gillilandCorrelations[correlation];
  const logS = findRoot((t) => curve(1 / (1 + Math.exp(-t))) - target, -40, 40);
  if (logS !== undefined) return minimumReflux + (minimumReflux + 1) * Math.exp(logS);
  const limit = stagesFrom(minimumStages, curve(1e-17));
  return refuseAsInfeasible({
    code: "too-many-stages",
    path: "stages",
    message: `stages must be below ${limit.toPrecision(4)}, where the ${correlation} correlation ends at minimum reflux, got ${stages}; use "molokanov"`,
    value: stages,
    limit,
  });
}
