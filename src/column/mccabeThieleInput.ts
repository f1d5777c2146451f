import {
  type Fields,
  readChoice,
  readExactlyOne,
  readFields,
  readFlag,
  readNumber,
  readText,
  shown,
} from "../base/check";
import type { Issue } from "../base/errors";
import type { Caution, MethodUsed } from "../base/result";
import type { Pressure } from "../base/units";
import { readQuantity } from "../base/units";
import type { Component } from "../components/component";
import { readOwnComponents } from "../components/resolveComponent";
import { type EquilibriumModel, equilibriumModels } from "../equilibrium/equilibriumInput";
import { idealMixture, stateAtPressure } from "../equilibrium/phaseState";
import { resolveComponents } from "../equilibrium/mixture";
import { raoultPairCurve } from "../equilibrium/pairCurve";
import { judgeIdealMixture } from "../equilibrium/raoultGuard";
import {
  type BinaryFeed,
  type BinaryFeedAmongSeveral,
  type BinarySideDraw,
  readBinaryFeed,
  readBinaryFeeds,
  readLightFraction,
  readSideDraws,
  readStage,
  type TypedStream,
} from "../staging/binaryInput";
import { constantVolatilityCurve, type EquilibriumCurve } from "../staging/equilibriumCurve";
import { type EquilibriumPoints, readEquilibriumPoints } from "../staging/readEquilibriumPoints";
import { readReflux, type RefluxChoice } from "./reflux";
import { unequalHeats } from "./unequalHeats";

/** What `mccabeThiele` takes: one equilibrium, one or several feeds, both products, the reflux. */
export interface McCabeThieleInput {
  /** Constant, light over heavy, above 1; or */
  readonly relativeVolatility?: number;
  /** a curve given by points; or */
  readonly equilibriumCurve?: EquilibriumPoints;
  /** two components at `pressure`, by Raoult's law. */
  readonly pair?: { readonly light: string; readonly heavy: string };
  /** Absolute [Pa], or text with a unit; goes with `pair`. */
  readonly pressure?: Pressure;
  readonly model?: EquilibriumModel;
  readonly ownComponents?: readonly Component[];
  readonly feed?: BinaryFeed;
  readonly feeds?: readonly BinaryFeedAmongSeveral[];
  readonly sideDraws?: readonly BinarySideDraw[];
  /** Mole fraction of the light component. */
  readonly distillateLightFraction: number;
  readonly bottomsLightFraction: number;
  readonly refluxRatio?: number;
  readonly refluxOverMinimum?: number;
  readonly condenser?: "total" | "partial";
  readonly reboiler?: "partial" | "open-steam";
  /** Above 0, at most 1. */
  readonly murphreeVaporEfficiency?: number;
  /** Whether the efficiency holds for the reboiler as well. */
  readonly efficiencyOnReboiler?: boolean;
  readonly feedStage?: "optimum" | number;
}

/** A checked binary task. */
export interface BinaryTask {
  readonly curve: EquilibriumCurve;
  readonly equilibrium: EquilibriumBasis;
  readonly streams: readonly TypedStream[];
  readonly flowGiven: boolean;
  readonly xD: number;
  readonly xB: number;
  readonly reflux: RefluxChoice;
  readonly condenser: "total" | "partial";
  readonly openSteam: boolean;
  readonly efficiency: number | undefined;
  readonly efficiencyOnReboiler: boolean;
}

/** What the equilibrium rests on. */
export interface EquilibriumBasis {
  readonly relativeVolatility?: number;
  readonly pair?: { readonly light: string; readonly heavy: string };
  readonly pressure?: number;
  readonly temperature?: (x: number) => number;
  readonly cautions: readonly Caution[];
  readonly methods: readonly MethodUsed[];
}

const equilibria = ["relativeVolatility", "equilibriumCurve", "pair"] as const;

const known = new Set<string>([
  ...equilibria,
  "pressure",
  "model",
  "ownComponents",
  "feed",
  "feeds",
  "sideDraws",
  "distillateLightFraction",
  "bottomsLightFraction",
  "refluxRatio",
  "refluxOverMinimum",
  "condenser",
  "reboiler",
  "murphreeVaporEfficiency",
  "efficiencyOnReboiler",
  "feedStage",
]);

/** Reads a binary task; undefined after reported faults. */
export function readBinaryTask(faults: Issue[], input: unknown): BinaryTask | undefined {
  const fields = readFields(faults, "input", input, known);
  if (fields === undefined) return undefined;
  const before = faults.length;
  const equilibrium = readEquilibrium(faults, fields);
  const streams = readStreams(faults, fields);
  const task = {
    xD: readLightFraction(faults, "distillateLightFraction", fields["distillateLightFraction"]),
    xB: readLightFraction(faults, "bottomsLightFraction", fields["bottomsLightFraction"]),
    reflux: readReflux(faults, fields),
    condenser: readChoice(faults, "condenser", fields["condenser"], ["total", "partial"]),
    openSteam: readChoice(faults, "reboiler", fields["reboiler"], ["partial", "open-steam"]) === "open-steam",
    efficiency: readEfficiency(faults, fields),
    efficiencyOnReboiler: readFlag(faults, "efficiencyOnReboiler", fields["efficiencyOnReboiler"]),
  };
  const { reflux } = task;
  if (faults.length > before || equilibrium === undefined || reflux === undefined) return undefined;
  const flowGiven = fields["feeds"] !== undefined || (fields["feed"] as Fields)["flow"] !== undefined;
  return { ...task, ...equilibrium, reflux, streams, flowGiven };
}

type CurveWithBasis = Pick<BinaryTask, "curve" | "equilibrium">;

function readEquilibrium(faults: Issue[], fields: Fields): CurveWithBasis | undefined {
  const basis = readExactlyOne(faults, "input", fields, equilibria);
  if (basis === "pair") return readPair(faults, fields);
  for (const field of ["pressure", "model", "ownComponents"]) {
    if (fields[field] === undefined) continue;
    const message = `${field} goes with pair, but the equilibrium is given by ${basis ?? "something else"}; leave it out`;
    faults.push({ code: "conflicting-fields", path: field, message, value: shown(fields[field]) });
  }
  const nothing = { cautions: [], methods: [] };
  if (basis === "equilibriumCurve") {
    const curve = readEquilibriumPoints(faults, basis, fields[basis]);
    return curve && { curve, equilibrium: nothing };
  }
  if (basis === undefined) return undefined;
  const relativeVolatility = readNumber(faults, basis, fields[basis], {
    above: 1,
    atMost: 1e12,
    code: "volatility-not-above-one",
    hint: "it is that of the light over the heavy component",
  });
  return {
    curve: constantVolatilityCurve(relativeVolatility),
    equilibrium: { relativeVolatility, ...nothing },
  };
}

function readPair(faults: Issue[], fields: Fields): CurveWithBasis | undefined {
  const before = faults.length;
  const pair = readFields(faults, "pair", fields["pair"], new Set(["light", "heavy"]));
  const own = readOwnComponents(faults, "ownComponents", fields["ownComponents"]);
  readChoice(faults, "model", fields["model"], equilibriumModels);
  const light = pair && readText(faults, "pair.light", pair["light"]);
  const heavy = pair && readText(faults, "pair.heavy", pair["heavy"]);
  const pressure = readQuantity(faults, "pressure", fields["pressure"], "pressure");
  if (light === undefined || heavy === undefined) return undefined;
  const components = resolveComponents(faults, "pair", [light, heavy], own);
  if (components === undefined || faults.length > before) return undefined;
  return pairEquilibrium(faults, { light, heavy }, components, pressure);
}

/** The Raoult curve of a pair, once both pure components are known to boil at the pressure, the light one lower. */
function pairEquilibrium(
  faults: Issue[],
  pair: { readonly light: string; readonly heavy: string },
  components: readonly Component[],
  pressure: number,
): CurveWithBasis | undefined {
  const names = [pair.light, pair.heavy];
  const boiling = [0, 1].map((i) => {
    const pure = idealMixture({
      names: [names[i]!],
      components: [components[i]!],
      fractions: Float64Array.of(1),
    });
    return stateAtPressure(faults, pure, pressure, 0, { path: "pressure", typed: pressure })?.temperature;
  });
  const [low, high] = boiling;
  if (low === undefined || high === undefined) return undefined;
  if (!(low < high)) {
    const message = `pair.light must boil below pair.heavy, but at ${pressure} Pa ${pair.light} boils at ${low.toPrecision(6)} K and ${pair.heavy} at ${high.toPrecision(6)} K; swap them`;
    faults.push({ code: "volatility-not-above-one", path: "pair.light", message, value: pair.light });
    return undefined;
  }
  const { vapor, liquid, temperature } = raoultPairCurve(components[0]!, components[1]!, pressure);
  const mixture = { names, components, fractions: Float64Array.of(0.5, 0.5) };
  const judged = judgeIdealMixture(mixture, pressure, [low, high]);
  const unequal = unequalHeats(pair, components, [low, high]);
  return {
    curve: { vapor, liquid, concave: false },
    equilibrium: {
      pair,
      pressure,
      temperature,
      cautions: unequal === undefined ? judged.cautions : [...judged.cautions, unequal],
      methods: judged.methods,
    },
  };
}

function readStreams(faults: Issue[], fields: Fields): TypedStream[] {
  const draws = readSideDraws(faults, fields["sideDraws"]);
  const form = readExactlyOne(faults, "input", fields, ["feed", "feeds"]);
  const stage = readFeedStage(faults, fields["feedStage"]);
  if (form === "feeds") {
    if (stage !== undefined) {
      const message = "feedStage goes with one feed; with feeds, give each its stage";
      faults.push({ code: "conflicting-fields", path: "feedStage", message, value: fields["feedStage"] });
    }
    return [...readBinaryFeeds(faults, fields["feeds"]), ...draws];
  }
  const feed = form === undefined ? undefined : readBinaryFeed(faults, fields["feed"]);
  return feed === undefined ? draws : [{ ...feed, stage }, ...draws];
}

function readEfficiency(faults: Issue[], fields: Fields): number | undefined {
  const value = fields["murphreeVaporEfficiency"];
  if (value === undefined) return undefined;
  return readNumber(faults, "murphreeVaporEfficiency", value, {
    above: 0,
    atMost: 1,
    code: "efficiency-out-of-range",
    hint: "0.5 to 0.8 is usual for trays",
  });
}

function readFeedStage(faults: Issue[], value: unknown): number | undefined {
  return value === undefined || value === "optimum" ? undefined : readStage(faults, "feedStage", value);
}
