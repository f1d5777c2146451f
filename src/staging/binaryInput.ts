import { type Fields, readFields, readNumber, shown } from "../base/check";
import type { Issue } from "../base/errors";
import { type MolarFlow, readQuantity } from "../base/units";
import { liquidFractionLimits } from "../balance/feedThermal";
import type { ColumnStream } from "./binaryColumn";

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

/** A stream with the field it was typed in, and its stage with the field of that, if given. */
export interface TypedStream extends ColumnStream {
  readonly path: string;
  readonly stage: number | undefined;
  readonly stagePath: string;
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
  return {
    flow,
    ...readState(faults, "feed", fields),
    path: "feed",
    stage: undefined,
    stagePath: "feedStage",
  };
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

function readList(faults: Issue[], path: string, value: unknown, fewest: number): readonly unknown[] {
  if (Array.isArray(value) && value.length >= fewest && value.length <= mostStreams) return value;
  const code = !Array.isArray(value) ? "wrong-type" : value.length > mostStreams ? "too-many" : "empty";
  const message = `${path} must be a list of ${fewest} to ${mostStreams} entries, got ${shown(value)}`;
  faults.push({ code, path, message, value: shown(value) });
  return [];
}

function readStageOf(faults: Issue[], path: string, fields: Fields) {
  const stagePath = `${path}.stage`;
  const value = fields["stage"];
  return { path, stagePath, stage: value === undefined ? undefined : readStage(faults, stagePath, value) };
}

const feedFields = new Set(["lightFraction", "q", "flow", "stage"]);

/** Reads several feeds. */
export function readBinaryFeeds(faults: Issue[], value: unknown): TypedStream[] {
  return readList(faults, "feeds", value, 1).flatMap((item, i) => {
    const path = `feeds[${i}]`;
    const fields = readFields(faults, path, item, feedFields);
    if (fields === undefined) return [];
    const flow = readFlow(faults, `${path}.flow`, fields);
    return [{ flow, ...readState(faults, path, fields), ...readStageOf(faults, path, fields) }];
  });
}

const drawFields = new Set(["lightFraction", "phase", "flow", "stage"]);

/** Reads the side draws as streams of negative flow. */
export function readSideDraws(faults: Issue[], value: unknown): TypedStream[] {
  if (value === undefined) return [];
  return readList(faults, "sideDraws", value, 0).flatMap((item, i) => {
    const path = `sideDraws[${i}]`;
    const fields = readFields(faults, path, item, drawFields);
    if (fields === undefined) return [];
    const flow = -readFlow(faults, `${path}.flow`, fields);
    const lightFraction = readLightFraction(faults, `${path}.lightFraction`, fields["lightFraction"]);
    const q = readPhase(faults, `${path}.phase`, fields["phase"]);
    return [{ flow, lightFraction, q, ...readStageOf(faults, path, fields) }];
  });
}

/** q of what is drawn: 1 liquid, 0 vapor. */
function readPhase(faults: Issue[], path: string, value: unknown): number {
  if (value === "liquid" || value === "vapor") return value === "liquid" ? 1 : 0;
  const code = value === undefined ? "missing-field" : "unknown-choice";
  faults.push({ code, path, message: `${path} must be "liquid" or "vapor", got ${shown(value)}`, value });
  return Number.NaN;
}
