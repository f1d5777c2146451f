import { type Fields, readFields, readNumber, shown } from "../base/check";
import { DesignInfeasibleError, type Issue } from "../base/errors";
import { type MolarFlow, readQuantity } from "../base/units";
import { liquidFractionLimits } from "../balance/feedThermal";
import type { BinaryColumn, ColumnStream } from "./binaryColumn";

/** A feed of two components. */
export interface BinaryFeed {
  /** Mole fraction of the light component, between 0 and 1. */
  readonly lightFraction: number;
  /** Liquid fraction [-]: 1 saturated liquid, 0 saturated vapor, above 1 subcooled, below 0 superheated. */
  readonly q: number;
  /** [mol/s], or text with a unit; flows are per mole of feed when absent. */
  readonly flow?: MolarFlow;
}

/** One of several feeds. */
export interface BinaryFeedAmongSeveral extends BinaryFeed {
  readonly flow: MolarFlow;
  /** From the top; where the operating lines meet when absent. */
  readonly stage?: number;
}

/** A side draw. */
export interface BinarySideDraw {
  readonly flow: MolarFlow;
  /** Mole fraction of the light component in what is drawn. */
  readonly lightFraction: number;
  readonly phase: "liquid" | "vapor";
  readonly stage?: number;
}

/** A stream with the field it was typed in and its stage, if given. */
export interface TypedStream extends ColumnStream {
  readonly path: string;
  readonly stage: number | undefined;
}

const fractionLimits = {
  atLeast: 0,
  atMost: 1,
  code: "fraction-out-of-range",
  hint: "give a mole fraction",
} as const;
const flowLimits = { atMost: 1e12 } as const;
const stageLimits = {
  atLeast: 1,
  atMost: 100_000,
  code: "stage-out-of-range",
  hint: "stage 1 is the top one",
} as const;

/** Reads a mole fraction of the light component. */
export function readLightFraction(faults: Issue[], path: string, value: unknown): number {
  return readNumber(faults, path, value, fractionLimits);
}

/** Reads a stage number: a whole number from 1. */
export function readStage(faults: Issue[], path: string, value: unknown): number {
  const stage = readNumber(faults, path, value, stageLimits);
  if (Number.isNaN(stage) || Number.isInteger(stage)) return stage;
  faults.push({
    code: "stage-out-of-range",
    path,
    message: `${path} must be a whole stage number, got ${shown(value)}`,
    value,
  });
  return Number.NaN;
}

/** Reads the one feed. */
export function readBinaryFeed(faults: Issue[], value: unknown): TypedStream | undefined {
  const fields = readFields(faults, "feed", value, new Set(["lightFraction", "q", "flow"]));
  if (fields === undefined) return undefined;
  const flow = fields["flow"] === undefined ? 1 : readFlow(faults, "feed.flow", fields);
  return { flow, ...readState(faults, "feed", fields), path: "feed", stage: undefined };
}

function readFlow(faults: Issue[], path: string, fields: Fields): number {
  return readQuantity(faults, path, fields["flow"], "molarFlow", flowLimits);
}

function readState(faults: Issue[], path: string, fields: Fields): { lightFraction: number; q: number } {
  return {
    lightFraction: readLightFraction(faults, `${path}.lightFraction`, fields["lightFraction"]),
    q: readNumber(faults, `${path}.q`, fields["q"], liquidFractionLimits),
  };
}

const mostStreams = 50;

function readList(faults: Issue[], path: string, value: unknown): readonly unknown[] {
  if (Array.isArray(value) && value.length > 0 && value.length <= mostStreams) return value;
  const message = `${path} must be a list of 1 to ${mostStreams} entries, got ${shown(value)}`;
  faults.push({
    code: Array.isArray(value) && value.length > 0 ? "too-many" : "wrong-type",
    path,
    message,
    value: shown(value),
  });
  return [];
}

/** Reads several feeds. */
export function readBinaryFeeds(faults: Issue[], value: unknown): TypedStream[] {
  return readList(faults, "feeds", value).flatMap((item, i) => {
    const path = `feeds[${i}]`;
    const fields = readFields(faults, path, item, new Set(["lightFraction", "q", "flow", "stage"]));
    if (fields === undefined) return [];
    const stage =
      fields["stage"] === undefined ? undefined : readStage(faults, `${path}.stage`, fields["stage"]);
    return [
      { flow: readFlow(faults, `${path}.flow`, fields), ...readState(faults, path, fields), path, stage },
    ];
  });
}

/** Reads the side draws as streams of negative flow. */
export function readSideDraws(faults: Issue[], value: unknown): TypedStream[] {
  if (value === undefined) return [];
  return readList(faults, "sideDraws", value).flatMap((item, i) => {
    const path = `sideDraws[${i}]`;
    const fields = readFields(faults, path, item, new Set(["lightFraction", "phase", "flow", "stage"]));
    if (fields === undefined) return [];
    const { phase } = fields;
    if (phase !== "liquid" && phase !== "vapor") {
      const message = `${path}.phase must be "liquid" or "vapor", got ${shown(phase)}`;
      faults.push({ code: "unknown-choice", path: `${path}.phase`, message, value: phase });
    }
    const stage =
      fields["stage"] === undefined ? undefined : readStage(faults, `${path}.stage`, fields["stage"]);
    const lightFraction = readLightFraction(faults, `${path}.lightFraction`, fields["lightFraction"]);
    return [
      {
        flow: -readFlow(faults, `${path}.flow`, fields),
        lightFraction,
        q: phase === "vapor" ? 0 : 1,
        path,
        stage,
      },
    ];
  });
}

function infeasible(path: string, message: string, value: number, limit: number): Issue {
  return { code: "specification-infeasible", path, message, value, limit };
}

/** Refuses products that no column can make of these streams. */
export function refuseImpossibleProducts(column: BinaryColumn, streams: readonly TypedStream[]): void {
  const { distillateLightFraction: xD, bottomsLightFraction: xB } = column;
  const issues: Issue[] = [];
  const bounds: [string, number][] = [
    ["distillateLightFraction", xD],
    ["bottomsLightFraction", xB],
  ];
  for (const [path, value] of bounds) {
    if (value > 0 && value < 1) continue;
    issues.push(
      infeasible(
        path,
        `${path} must lie between 0 and 1, both excluded, got ${value}: a pure product needs endless stages`,
        value,
        value > 0 ? 1 : 0,
      ),
    );
  }
  if (xD <= xB)
    issues.push(
      infeasible(
        "distillateLightFraction",
        `distillateLightFraction must exceed bottomsLightFraction ${xB}, got ${xD}`,
        xD,
        xB,
      ),
    );
  for (const { path, lightFraction, flow } of streams) {
    if (flow > 0 && !(lightFraction > 0 && lightFraction < 1)) {
      issues.push(
        infeasible(
          `${path}.lightFraction`,
          `${path}.lightFraction must lie between 0 and 1, both excluded, got ${lightFraction}: there is nothing to separate`,
          lightFraction,
          lightFraction > 0 ? 1 : 0,
        ),
      );
    }
  }
  if (issues.length === 0) issues.push(...impossibleFlows(column, streams));
  if (issues.length > 0) throw new DesignInfeasibleError(issues);
}

/** The products must be what the streams leave: both flows above zero. */
function impossibleFlows(column: BinaryColumn, streams: readonly TypedStream[]): Issue[] {
  const { distillateLightFraction: xD, bottomsLightFraction: xB } = column;
  let total = 0;
  let light = 0;
  for (const { flow, lightFraction } of streams) {
    total += flow;
    light += flow * lightFraction;
  }
  const draw = streams.find(({ flow }) => flow < 0);
  const mean = light / total;
  if (draw !== undefined && !(total > 0 && light > 0 && light < total && mean > xB && mean < xD)) {
    const path = `${draw.path}.flow`;
    return [
      infeasible(
        path,
        `${path}: the draws leave ${shown(light)} of the light component in ${shown(total)}, from which the two products cannot be made; draw less`,
        -draw.flow,
        -draw.flow,
      ),
    ];
  }
  const from = streams.length === 1 ? "the feed" : "the feeds together";
  const issues: Issue[] = [];
  if (!(xD > mean))
    issues.push(
      infeasible(
        "distillateLightFraction",
        `distillateLightFraction must exceed the light fraction of ${from}, ${mean}, got ${xD}`,
        xD,
        mean,
      ),
    );
  if (!(xB < mean) && !column.openSteam)
    issues.push(
      infeasible(
        "bottomsLightFraction",
        `bottomsLightFraction must be below the light fraction of ${from}, ${mean}, got ${xB}`,
        xB,
        mean,
      ),
    );
  return issues;
}
