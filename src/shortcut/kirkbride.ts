import { readFields, readNumber, withinLimits } from "../base/check";
import { DesignInputError, type Issue, refuseIfFaulty } from "../base/errors";
import type { ByComponent, Judged } from "../base/result";
import { method } from "../base/source";
import { type MolarFlow, readQuantity } from "../base/units";
import { judgeBalance, readKeyFractions } from "./keyFractions";
import { kirkbrideRatio } from "./kirkbrideRatio";

/** What `kirkbride` takes. */
export interface KirkbrideInput {
  /** Mole fractions of the feed. */
  readonly composition: ByComponent;
  readonly lightKey: string;
  readonly heavyKey: string;
  /** Mole fractions of the distillate; it must hold the heavy key. A component that is not named is absent. */
  readonly distillate: ByComponent;
  /** Mole fractions of the bottoms; it must hold the light key. */
  readonly bottoms: ByComponent;
  /** [mol/s], or text with a unit; only the ratio of the two flows matters. */
  readonly distillateFlow: MolarFlow;
  readonly bottomsFlow: MolarFlow;
  /** Equilibrium stages, the reboiler included [-], above 0. */
  readonly stages: number;
  /** Scale compositions that do not add up to 1. */
  readonly normalize?: boolean;
}

/** What `kirkbride` gives. */
export interface KirkbrideResult extends Judged {
  readonly kind: "kirkbride";
  /** Rectifying over stripping stages [-]. */
  readonly rectifyingOverStripping: number;
  /** Feed stage from the top [-]: the rectifying stages, fractional. */
  readonly feedStage: number;
  readonly rectifyingStages: number;
  readonly strippingStages: number;
}

const fields: ReadonlySet<string> = new Set<keyof KirkbrideInput>([
  "composition",
  "lightKey",
  "heavyKey",
  "distillate",
  "bottoms",
  "distillateFlow",
  "bottomsFlow",
  "stages",
  "normalize",
]);

const methods = [method("Kirkbride feed stage", "kirkbride1944")];

const flowRatioLimits = {
  atLeast: 1e-12,
  atMost: 1e12,
  hint: "as a ratio to distillateFlow; one of the products is missing",
} as const;

/**
 * Where the feed belongs among the stages.
 *
 *   N_R / N_S = [(z_HK / z_LK) (x_LK,B / x_HK,D)² (B / D)]^0.206,   N_R + N_S = N
 *
 * Takes the mole fractions of feed, distillate and bottoms, the flows of the products and the stages. An empirical
 * fit: give the column nozzles two or three stages to either side.
 *
 * Source: C. G. Kirkbride, Pet. Refiner 23(9) (1944) 321.
 *
 * @throws DesignInputError for compositions that do not add up to 1, a key that is missing where the formula divides by
 * it or takes its logarithm, flows or stages that are not above zero
 * @example kirkbride({ composition: { a: 0.5, b: 0.5 }, lightKey: "a", heavyKey: "b", distillate: { a: 0.98, b: 0.02 }, bottoms: { a: 0.01, b: 0.99 }, distillateFlow: 0.505, bottomsFlow: 0.495, stages: 20 }).feedStage // 8.56
 */
export function kirkbride(input: KirkbrideInput): KirkbrideResult {
  const faults: Issue[] = [];
  const given = readFields(faults, "input", input, fields);
  if (given === undefined) throw new DesignInputError(faults);
  const keys = readKeyFractions(faults, given);
  const distillateFlow = readQuantity(faults, "distillateFlow", given["distillateFlow"], "molarFlow");
  const bottomsFlow = readQuantity(faults, "bottomsFlow", given["bottomsFlow"], "molarFlow");
  const stages = readNumber(faults, "stages", given["stages"], { above: 0, atMost: 1e9 });
  const flows = bottomsFlow / distillateFlow;
  if (!Number.isNaN(flows)) withinLimits(faults, "bottomsFlow", flows, flowRatioLimits, given["bottomsFlow"]);
  refuseIfFaulty(faults);
  const { light, heavy } = keys!;
  const ratio = kirkbrideRatio(heavy.feed / light.feed, light.bottoms / heavy.distillate, flows);
  const strippingStages = stages / (1 + ratio);
  return {
    kind: "kirkbride",
    rectifyingOverStripping: ratio,
    feedStage: stages - strippingStages,
    rectifyingStages: stages - strippingStages,
    strippingStages,
    cautions: judgeBalance(light, heavy, flows),
    methods,
  };
}
