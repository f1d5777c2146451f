import { readFields } from "../base/check";
import { DesignInputError, type Issue, refuseIfFaulty } from "../base/errors";
import type { Judged } from "../base/result";
import { type Pressure, readQuantity } from "../base/units";
import type { FeedReading } from "../balance/feedAmounts";
import type { FeedInput } from "../balance/feed";
import { readFeed } from "../balance/readFeed";
import { thermalCondition } from "../balance/thermalCondition";
import { idealMixture } from "../equilibrium/phaseState";
import { judgeIdealMixture } from "../equilibrium/raoultGuard";

/** What `feedThermalCondition` takes. */
export interface FeedThermalConditionInput {
  readonly feed: FeedInput;
  /** On the feed stage, absolute [Pa], or text with a unit. */
  readonly pressure: Pressure;
}

/** How much of a feed joins the liquid of its stage. */
export interface FeedThermalCondition extends Judged {
  readonly kind: "feedThermalCondition";
  /** Liquid fraction on the molar-overflow definition [-]: above 1 subcooled, below 0 superheated. */
  readonly q: number;
  /** On the feed stage [Pa]. */
  readonly pressure: number;
}

/** q of a feed on a stage at `pressure` [Pa]. */
export function conditionOnFeedStage(
  feed: FeedReading,
  pressure: number,
): Omit<FeedThermalCondition, "kind" | "pressure"> {
  const { thermal, mixture } = feed;
  if (thermal?.given === "q") return { q: thermal.q, cautions: [], methods: [] };
  const faults: Issue[] = [];
  const condition = thermalCondition(faults, "feed.", idealMixture(mixture!), thermal!, pressure);
  if (condition === undefined) throw new DesignInputError(faults);
  const { q, cautions, methods } = condition;
  return { q, cautions, methods };
}

/**
 * Thermal condition q of a feed on a stage of a column: how much of it joins the liquid there, by an adiabatic flash
 * from the feed's own state to the pressure of the stage.
 *
 *   q = 1 + (h_bubble - h_feed)/(h_dew - h_bubble)  subcooled,  q = (h_dew - h_feed)/(h_dew - h_bubble)  superheated,
 *   else the liquid fraction after the flash
 *
 * Takes a feed with its state (temperature and pressure, vapor fraction and pressure, or q itself, which is returned)
 * and the pressure on the feed stage (Pa absolute, or text). Assumes ideal liquid and vapor; without heat data a
 * single-phase feed is taken as saturated, with a caution.
 *
 * Source: W. L. McCabe and E. W. Thiele, Ind. Eng. Chem. 17 (1925) 605 for q; energy balance, own.
 *
 * @throws DesignInputError for a wrong input, or as `flash` where Raoult's law has no answer
 * @example feedThermalCondition({ feed: { flow: 1, composition: { benzene: 0.5, toluene: 0.5 }, vaporFraction: 0.4, pressure: "1 atm" }, pressure: "1 atm" }).q // 0.6
 */
export function feedThermalCondition(input: FeedThermalConditionInput): FeedThermalCondition {
  const faults: Issue[] = [];
  const fields = readFields(faults, "input", input, new Set(["feed", "pressure"]));
  const feed =
    fields && readFeed(faults, "feed", fields["feed"], { components: "required", thermalRequired: true });
  const pressure = fields ? readQuantity(faults, "pressure", fields["pressure"], "pressure") : Number.NaN;
  refuseIfFaulty(faults);
  const condition = conditionOnFeedStage(feed!, pressure);
  const judged = judgeIdealMixture(feed!.mixture!, pressure, []);
  return {
    kind: "feedThermalCondition",
    q: condition.q,
    pressure,
    cautions: [...judged.cautions, ...condition.cautions],
    methods: [...condition.methods, ...judged.methods],
  };
}
