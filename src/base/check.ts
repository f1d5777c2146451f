import type { Issue } from "./errors";
import { didYouMean } from "./nearest";

/** An input object whose fields are still to be checked. */
export type Fields = Readonly<Record<string, unknown>>;

/** A number or text as it appears in a message: short, and never a crash. */
export function shown(value: unknown): string {
  if (typeof value === "string")
    return JSON.stringify(value.length > 60 ? `${value.slice(0, 57)}...` : value);
  if (typeof value === "number") return String(value);
  if (value === null || value === undefined || typeof value === "boolean") return String(value);
  return Array.isArray(value)
    ? `a list of ${value.length}`
    : typeof value === "object"
      ? "an object"
      : `a ${typeof value}`;
}

/** Reads an object and reports every field it should not have; undefined when it is no object. */
export function readFields(
  faults: Issue[],
  path: string,
  value: unknown,
  known: ReadonlySet<string> | undefined,
): Fields | undefined {
  if (typeof value !== "object" || value === null || Array.isArray(value)) {
    const code = value === undefined ? "missing-field" : "not-an-object";
    faults.push({
      code,
      path,
      message: `${path} must be an object with named fields, got ${shown(value)}`,
      value,
    });
    return undefined;
  }
  if (known !== undefined) {
    for (const field in value) {
      if (!known.has(field)) reportUnknownField(faults, path, field, value as Fields, known);
    }
  }
  return value as Fields;
}

function reportUnknownField(
  faults: Issue[],
  path: string,
  field: string,
  value: Fields,
  known: ReadonlySet<string>,
): void {
  if (value[field] === undefined) return;
  faults.push({
    code: "unknown-field",
    path: path === "input" ? field : `${path}.${field}`,
    message: `${path} has no field ${shown(field)}.${didYouMean(field, [...known])} Known fields: ${[...known].join(", ")}`,
    value: value[field],
  });
}

/** Bounds of a number; `above` and `below` exclude the bound itself. */
export interface Limits {
  readonly above?: number;
  readonly below?: number;
  readonly atLeast?: number;
  readonly atMost?: number;
  /** Code reported instead of below-limit and above-limit. */
  readonly code?: Issue["code"];
  /** The way out, appended to the message. */
  readonly hint?: string;
}

/** Reads a finite number within limits; NaN after a reported fault, so that reading can go on. */
export function readNumber(faults: Issue[], path: string, value: unknown, limits?: Limits): number {
  if (typeof value !== "number") {
    const code = value === undefined ? "missing-field" : "wrong-type";
    faults.push({
      code,
      path,
      message: `${path} must be a number, got ${shown(value)}${hintOf(limits)}`,
      value,
    });
    return Number.NaN;
  }
  if (!Number.isFinite(value)) {
    faults.push({
      code: "not-finite",
      path,
      message: `${path} must be a finite number, got ${value}`,
      value,
    });
    return Number.NaN;
  }
  return limits === undefined || withinLimits(faults, path, value, limits, value) ? value : Number.NaN;
}

/** Reports a number outside its limits; `typed` is what the caller wrote. */
export function withinLimits(
  faults: Issue[],
  path: string,
  value: number,
  limits: Limits,
  typed: unknown,
): boolean {
  const { above, below, atLeast, atMost } = limits;
  const tooLow = (above !== undefined && !(value > above)) || (atLeast !== undefined && !(value >= atLeast));
  const tooHigh = (below !== undefined && !(value < below)) || (atMost !== undefined && !(value <= atMost));
  if (!tooLow && !tooHigh) return true;
  const limit = tooLow ? (above ?? atLeast!) : (below ?? atMost!);
  const word = tooLow
    ? above !== undefined
      ? "above"
      : "at least"
    : below !== undefined
      ? "below"
      : "at most";
  const code = limits.code ?? (tooLow ? "below-limit" : "above-limit");
  const message = `${path} must be ${word} ${limit}, got ${shown(typed)}${hintOf(limits)}`;
  faults.push({ code, path, message, value: typed, limit });
  return false;
}

function hintOf(limits: Limits | undefined): string {
  return limits?.hint === undefined ? "" : `; ${limits.hint}`;
}

/** Reads one of a few words; the first is the default when the field is absent. */
export function readChoice<T extends string>(
  faults: Issue[],
  path: string,
  value: unknown,
  choices: readonly T[],
): T {
  if (value === undefined) return choices[0]!;
  if (typeof value === "string" && (choices as readonly string[]).includes(value)) return value as T;
  const hint = typeof value === "string" ? didYouMean(value, choices) : "";
  const message = `${path} must be one of ${choices.map((c) => `"${c}"`).join(", ")}, got ${shown(value)}.${hint}`;
  faults.push({ code: "unknown-choice", path, message, value });
  return choices[0]!;
}

/** Reads a non-empty text. */
export function readText(faults: Issue[], path: string, value: unknown): string | undefined {
  if (typeof value === "string" && value.trim() !== "") return value;
  const code = value === undefined ? "missing-field" : "wrong-type";
  faults.push({ code, path, message: `${path} must be a text, got ${shown(value)}`, value });
  return undefined;
}

/** Reads true or false; false when absent. */
export function readFlag(faults: Issue[], path: string, value: unknown): boolean {
  if (value === undefined || typeof value === "boolean") return value === true;
  faults.push({
    code: "wrong-type",
    path,
    message: `${path} must be true or false, got ${shown(value)}`,
    value,
  });
  return false;
}

/** The one field of `alternatives` that is given; a fault when there is none or more than one. */
export function readExactlyOne<T extends string>(
  faults: Issue[],
  path: string,
  fields: Fields,
  alternatives: readonly T[],
): T | undefined {
  const given = alternatives.filter((name) => fields[name] !== undefined);
  if (given.length === 1) return given[0];
  const got = given.length === 0 ? "none" : given.join(" and ");
  const field = given[0] ?? alternatives[0]!;
  faults.push({
    code: "conflicting-fields",
    path: path === "input" ? field : `${path}.${field}`,
    message: `${path} needs exactly one of ${alternatives.join(", ")}, got ${got}`,
    value: given.length === 0 ? undefined : given,
  });
  return undefined;
}
