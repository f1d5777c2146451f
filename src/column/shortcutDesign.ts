import { type Issue, refuseAsInfeasible, refuseIfFaulty } from "../base/errors";
import { type MethodUsed, sortCautions } from "../base/result";
import { method, type SourceId } from "../base/source";
import type { Split } from "../balance/split";
import {
  type GillilandCorrelation,
  gillilandCorrelations,
  refluxCoordinate,
  stagesFrom,
} from "../shortcut/gillilandCorrelations";
import { kirkbrideRatio } from "../shortcut/kirkbrideRatio";
import { type DesignBasis, designBasis } from "./designBasis";
import { judgeDesign } from "./designCautions";
import { type DesignTask, readDesignTask, type ShortcutDesignInput } from "./designInput";
import { designProducts } from "./designProducts";
import { gillilandCurve } from "../shortcut/gillilandCurve";
import { stagesAgainstRefluxCurve } from "./stagesAgainstRefluxCurve";
import type { TotalRefluxSplit } from "./keySplit";
import type { Section, ShortcutDesign } from "./shortcutDesignResult";
import { refluxAbove } from "./reflux";
import { stagesRange } from "./stagesRange";

const shortcutMethods: readonly MethodUsed[] = [
  method("Fenske minimum stages", "fenske1932"),
  method("Hengstebeck-Geddes distribution of the other components", "hengstebeck1946"),
  method("Underwood minimum reflux, distributing components solved together", "underwood1948"),
  method("Gilliland correlation", "gilliland1940"),
  method("Kirkbride feed stage", "kirkbride1944"),
];

const withForm = (name: string, source: SourceId): readonly MethodUsed[] => [
  ...shortcutMethods,
  method(`${name} form of the correlation`, source),
];

const ownMethods: Readonly<Record<GillilandCorrelation, readonly MethodUsed[]>> = {
  molokanov: withForm("Molokanov", "molokanov1972"),
  eduljee: withForm("Eduljee", "eduljee1975"),
  liddle: withForm("Liddle", "liddle1968"),
};

/**
 * First-pass column for a multicomponent feed: minimum stages, minimum reflux, stages at a reflux, feed stage, products.
 *
 *   Nmin and the products by Fenske, at the geometric mean of the volatilities at top and bottom
 *   Rmin by Underwood with all distributing components solved together, at the volatilities of the feed
 *   N by Gilliland, X = (R - Rmin)/(R + 1), Y = (N - Nmin)/(N + 1);   feed stage by Kirkbride
 *
 * Takes the feed, the two keys with the recovery of each (0 to 1), the volatilities (given, or from Raoult's law at
 * `pressure`, then iterated with the product temperatures and, with a `pressureDropPerStage`, the bottom pressure), and
 * `refluxRatio` or `refluxOverMinimum`. Flows are mol/s,
 * stages count from the top with the reboiler and a partial condenser. Assumes constant molar overflow and a constant
 * relative volatility, whose drift is shown; the products are those of total reflux.
 *
 * With a component distributing between the keys the correlation was measured on 200 random systems against stage by
 * stage counts: with the exact minimum reflux it gives a median of 0.64 of the true stages at 1.05 times the minimum.
 * `stagesRange` then also spans the largest single-root minimum, and a caution says so.
 *
 * Source: M. R. Fenske, Ind. Eng. Chem. 24 (1932) 482; A. J. V. Underwood, Chem. Eng. Prog. 44 (1948) 603;
 * E. R. Gilliland, Ind. Eng. Chem. 32 (1940) 1220; C. G. Kirkbride, Pet. Refiner 23(9) (1944) 321.
 *
 * @throws DesignInputError with all faults of the input, among them a component above its critical temperature
 * @throws DesignInfeasibleError for a reflux ratio that does not exceed the minimum, recoveries that no column meets
 * @example shortcutDesign({ feed: { flow: 100, composition: { a: 0.3, b: 0.3, c: 0.4 }, q: 1 }, relativeVolatility: { a: 4, b: 2, c: 1 }, lightKey: "a", heavyKey: "b", lightKeyRecovery: 0.99, heavyKeyRecovery: 0.99, refluxOverMinimum: 1.2 }).minimumReflux // 2.2349
 */
export function shortcutDesign(input: ShortcutDesignInput): ShortcutDesign {
  const faults: Issue[] = [];
  const task = readDesignTask(faults, input);
  refuseIfFaulty(faults);
  const design = designOn(task!, designBasis(task!));
  const drop = task!.pressures?.dropPerStage;
  return drop === undefined ? design : settleBottomPressure(task!, design, drop);
}

const mostPasses = 100;
const settled = 1e-10;

/** Designs again with the bottom pressure that the stages give, until the stages no longer change. */
function settleBottomPressure(task: DesignTask, first: ShortcutDesign, drop: number): ShortcutDesign {
  const pressures = task.pressures!;
  let design = first;
  for (let pass = 0; pass < mostPasses; pass++) {
    const bottom = pressures.top + drop * design.stages;
    const next = { ...task, pressures: { ...pressures, bottom } };
    const again = designOn(next, designBasis(next));
    if (Math.abs(again.stages / design.stages - 1) <= settled) return again;
    design = again;
  }
  return refuseAsInfeasible({
    code: "not-converged",
    path: "pressureDropPerStage",
    message: `pressureDropPerStage: stages and bottom pressure did not settle in ${mostPasses} passes at ${drop} Pa a stage; give bottomPressure instead`,
    value: drop,
  });
}

const mostStages = 1e9;

function stagesAt(correlation: GillilandCorrelation, minimumStages: number, x: number): number {
  const stages = Math.max(minimumStages, stagesFrom(minimumStages, gillilandCorrelations[correlation](x)));
  if (stages < mostStages) return stages;
  return refuseAsInfeasible({
    code: "too-many-stages",
    path: "refluxRatio",
    message: `refluxRatio must lie further above its minimum: it takes more than ${mostStages} stages`,
    value: stages,
    limit: mostStages,
  });
}

function designOn(task: DesignTask, basis: DesignBasis): ShortcutDesign {
  const { split, correlation, condenser, pressures } = task;
  const { reflux, stages: products, mean } = basis;
  const { minimumStages } = products;
  const { minimumReflux } = reflux;
  const refluxRatio = refluxAbove(task.reflux, minimumReflux);
  const sections = sectionFlows(task.feed.flow, basis.q, refluxRatio, products);
  const x = refluxCoordinate(minimumReflux, refluxRatio);
  const stages = stagesAt(correlation, minimumStages, x);
  const range = stagesRange(
    minimumStages,
    minimumReflux,
    Math.max(minimumReflux, reflux.largestSingleRoot),
    refluxRatio,
  );
  const strippingStages = stages / (1 + feedRatio(split, products));
  const keyVolatility = mean.volatility[split.lightKey]!;
  const judged = judgeDesign({
    names: split.names,
    keyVolatility,
    limit: reflux,
    refluxRatio,
    stages,
    stagesRange: range,
  });
  const streams = designProducts(task, products, basis.temperatures);
  const curve = gillilandCurve(correlation);
  return {
    kind: "shortcutDesign",
    lightKey: split.names[split.lightKey]!,
    heavyKey: split.names[split.heavyKey]!,
    lightKeyRecovery: split.lightKeyRecovery,
    heavyKeyRecovery: split.heavyKeyRecovery,
    q: basis.q,
    pressure: pressures === undefined ? null : pressures.top,
    condenser,
    correlation,
    minimumStages,
    minimumReflux,
    refluxRatio,
    refluxOverMinimum: minimumReflux > 0 ? refluxRatio / minimumReflux : null,
    stages,
    stagesBasis: "gilliland",
    gillilandStages: stages,
    stagesRange: range,
    stagesWhole: Math.ceil(stages - 1e-9),
    feedStage: stages - strippingStages,
    rectifyingStages: stages - strippingStages,
    strippingStages,
    boilupRatio: sections[1].vapor / (task.feed.flow * products.bottomsFlow),
    roots: reflux.roots,
    distributing: reflux.distributing.map((i) => split.names[i]!),
    sections,
    distillate: streams.distillate,
    bottoms: streams.bottoms,
    relativeVolatility: basis.volatility,
    curves: {
      stagesAgainstReflux: stagesAgainstRefluxCurve(correlation, minimumStages, minimumReflux),
      gilliland: { x: curve.x, y: curve.y, point: [x, (stages - minimumStages) / (stages + 1)] },
    },
    cautions: basis.cautions.length === 0 ? judged : sortCautions(basis.cautions, judged),
    methods:
      basis.methods.length === 0 ? ownMethods[correlation] : [...ownMethods[correlation], ...basis.methods],
  };
}

/** Kirkbride's rectifying over stripping stages with the products of total reflux. */
function feedRatio(
  { fractions, lightKey, heavyKey }: Omit<Split, "volatility">,
  products: TotalRefluxSplit,
): number {
  const { distillate, bottoms, distillateFlow, bottomsFlow } = products;
  const impurities = (bottoms[lightKey]! * distillateFlow) / (distillate[heavyKey]! * bottomsFlow);
  return kirkbrideRatio(
    fractions[heavyKey]! / fractions[lightKey]!,
    impurities,
    bottomsFlow / distillateFlow,
  );
}

/** Constant molar overflow: L = R D, V = (R + 1) D above the feed; q F joins the liquid, (1 - q) F the vapor. */
function sectionFlows(
  flow: number,
  q: number,
  refluxRatio: number,
  products: TotalRefluxSplit,
): [Section, Section] {
  const distillate = flow * products.distillateFlow;
  const liquid = refluxRatio * distillate;
  const vapor = liquid + distillate;
  const strippingVapor = vapor - (1 - q) * flow;
  if (strippingVapor > 0)
    return [
      { liquid, vapor },
      { liquid: liquid + q * flow, vapor: strippingVapor },
    ];
  const least = ((1 - q) * flow) / distillate - 1;
  return refuseAsInfeasible({
    code: "negative-boilup",
    path: "refluxRatio",
    message: `refluxRatio must exceed ${least}, where the vapor of the feed alone fills the rectifying section and the stripping section has none, got ${refluxRatio}`,
    value: refluxRatio,
    limit: least,
  });
}
