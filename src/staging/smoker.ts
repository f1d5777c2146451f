import { readFields, readNumber } from "../base/check";
import { type Issue, refuseAsInfeasible, refuseIfFaulty } from "../base/errors";
import { type Judged, sortCautions } from "../base/result";
import { method } from "../base/source";
import { closeBoiling, nearMinimumReflux } from "../balance/refluxCautions";
import { columnFlows } from "./binaryColumn";
import { type BinaryFeed, readBinaryFeed, readLightFraction } from "./binaryInput";
import { constantVolatilityCurve } from "./equilibriumCurve";
import { refuseImpossibleProducts } from "./impossibleProducts";
import { minimumReflux } from "./minimumReflux";
import { smokerStages } from "./smokerStages";
import { refuseVanishingFlow } from "./vanishingFlow";

/** What `smoker` takes. */
export interface SmokerInput {
  /** Constant, light over heavy, above 1. */
  readonly relativeVolatility: number;
  readonly feed: BinaryFeed;
  /** Mole fraction of the light component. */
  readonly distillateLightFraction: number;
  readonly bottomsLightFraction: number;
  /** External reflux ratio L/D. */
  readonly refluxRatio: number;
}

/** What `smoker` gives: stages as real numbers, with the reboiler. */
export interface Smoker extends Judged {
  readonly kind: "smoker";
  readonly rectifyingStages: number;
  readonly strippingStages: number;
  readonly stages: number;
}

const known = new Set([
  "relativeVolatility",
  "feed",
  "distillateLightFraction",
  "bottomsLightFraction",
  "refluxRatio",
]);
/** A reflux that equals the minimum to rounding stands at the pinch. */
const leastExcess = 1e-12;
const methods = [method("Smoker's closed form", "smoker1938")];

/**
 * Equilibrium stages of a binary column in closed form, for a constant relative volatility; the way to count hundreds
 * of stages of a close-boiling pair.
 *
 *   n = ln{X0 (1 - beta Xn)/[Xn (1 - beta X0)]}/ln[alpha/(m c^2)]   in each section, y = m x + b, X = x - k
 *   k a root of m (alpha - 1) k^2 + [m + b (alpha - 1) - alpha] k + b = 0,   c = 1 + (alpha - 1) k
 *   beta = m c (alpha - 1)/(alpha - m c^2)
 *
 * Takes the volatility (above 1), the feed (light fraction, q), both products and the reflux ratio. Rectifying stages
 * run from the distillate to the meeting point of the operating lines, stripping stages from there to the bottoms, the
 * reboiler included. Assumes constant molar overflow.
 *
 * Source: E. H. Smoker, Trans. AIChE 34 (1938) 165.
 *
 * @throws DesignInputError with all faults of the input
 * @throws DesignInfeasibleError for products that the feed cannot give, or a reflux ratio not above the minimum
 * @example smoker({ relativeVolatility: 2.5, feed: { lightFraction: 0.5, q: 1 }, distillateLightFraction: 0.95, bottomsLightFraction: 0.05, refluxRatio: 1.8 }).rectifyingStages // 5.1385
 */
export function smoker(input: SmokerInput): Smoker {
  const faults: Issue[] = [];
  const fields = readFields(faults, "input", input, known);
  const of = (name: string): unknown => fields?.[name];
  const alpha = readNumber(faults, "relativeVolatility", of("relativeVolatility"), {
    above: 1,
    atMost: 1e12,
    code: "volatility-not-above-one",
    hint: "it is that of the light over the heavy component",
  });
  const feed = readBinaryFeed(faults, of("feed"));
  const xD = readLightFraction(faults, "distillateLightFraction", of("distillateLightFraction"));
  const xB = readLightFraction(faults, "bottomsLightFraction", of("bottomsLightFraction"));
  const refluxRatio = readNumber(faults, "refluxRatio", of("refluxRatio"), { above: 0, atMost: 1e9 });
  refuseIfFaulty(faults);
  const column = {
    streams: [feed!],
    distillateLightFraction: xD,
    bottomsLightFraction: xB,
    openSteam: false,
  };
  refuseImpossibleProducts(column, [feed!]);
  const minimum = minimumReflux(constantVolatilityCurve(alpha), column);
  refuseVanishingFlow(column, refluxRatio, minimum);
  if (!(refluxRatio > minimum.minimumReflux * (1 + leastExcess)))
    refuseReflux(refluxRatio, minimum.minimumReflux);
  const { sections, intersections } = columnFlows(column, refluxRatio);
  const rectifyingStages = smokerStages(alpha, sections[0]!, xD, intersections[0]!);
  const strippingStages = smokerStages(alpha, sections[1]!, intersections[0]!, xB);
  const stages = rectifyingStages + strippingStages;
  if (!Number.isFinite(stages)) refuseReflux(refluxRatio, minimum.minimumReflux);
  const cautions = [closeBoiling(alpha), nearMinimumReflux(refluxRatio, minimum.minimumReflux)];
  return {
    kind: "smoker",
    rectifyingStages,
    strippingStages,
    stages,
    cautions: sortCautions(cautions.filter((caution) => caution !== undefined)),
    methods,
  };
}

function refuseReflux(refluxRatio: number, minimum: number): never {
  const rule = Number.isFinite(minimum)
    ? `must exceed the minimum ${Number(minimum.toPrecision(12))}, got ${refluxRatio}; 1.1 to 1.5 times the minimum is usual`
    : `cannot be large enough, got ${refluxRatio}: relativeVolatility is 1 to the last digit`;
  return refuseAsInfeasible({
    code: "reflux-below-minimum",
    path: "refluxRatio",
    message: `refluxRatio ${rule}`,
    value: refluxRatio,
    ...(Number.isFinite(minimum) ? { limit: minimum } : {}),
  });
}
