import { readChoice, readFields, shown } from "../base/check";
import { type DisplayUnits, displayUnit, formatNumber, toDisplay } from "../base/displayUnits";
import { type Issue, refuseIfFaulty } from "../base/errors";

/** How a figure is drawn. */
export interface FigureOptions {
  /** Units of the axes and words: "metric" (when absent), "SI" or "US". */
  readonly units?: DisplayUnits;
}

/**
 * What a result must have to be drawn: an example of each part. `null` stands for a number or null, [] for any list, the
 * part "*" for every part, and a part "name?" may be null or absent.
 */
export type Shape =
  number | string | null | readonly [] | readonly [Shape] | { readonly [part: string]: Shape };

export const curveShape = { x: [0], y: [0] } as const;
const judgedShape = {
  cautions: [{ code: "", severity: "", kind: "", message: "", "value?": 0, "limit?": 0, "source?": "" }],
  methods: [{ name: "", source: "" }],
} as const;

function fits(value: unknown, shape: Shape): boolean {
  if (typeof shape === "number") return typeof value === "number" && Number.isFinite(value);
  if (typeof shape === "string") return typeof value === "string";
  if (shape === null) return value === null || fits(value, 0);
  if (Array.isArray(shape)) {
    const [item] = shape as readonly Shape[];
    return Array.isArray(value) && (item === undefined || value.every((each) => fits(each, item)));
  }
  if (typeof value !== "object" || value === null || Array.isArray(value)) return false;
  const every = (shape as { readonly [part: string]: Shape })["*"];
  if (every !== undefined) return Object.values(value).every((each) => fits(each, every));
  return Object.entries(shape).every(([part, inner]) => {
    const mayLack = part.endsWith("?");
    const held = (value as Record<string, unknown>)[mayLack ? part.slice(0, -1) : part];
    return (mayLack && (held === null || held === undefined)) || fits(held, inner);
  });
}

/** Reports what is not a result of the function `kind`, or lacks a part that the figure draws. */
export function readResult(faults: Issue[], path: string, value: unknown, kind: string, shape: Shape): void {
  const isResult = typeof value === "object" && value !== null && (value as { kind?: unknown }).kind === kind;
  if (isResult && fits(value, judgedShape) && fits(value, shape)) return;
  const came = isResult ? "one that was changed" : shown(value);
  const message = `${path} must be what ${kind} gives, got ${came}; pass its result as it is`;
  faults.push({ code: "wrong-type", path, message, value: isResult ? undefined : value });
}

const unitSystems: readonly DisplayUnits[] = ["metric", "SI", "US"];

/** Reads the options of a figure; `more` are the further fields it knows. */
export function readOptions(faults: Issue[], options: unknown, more: readonly string[] = []) {
  const fields = readFields(faults, "options", options ?? {}, new Set(["units", ...more])) ?? {};
  return { fields, units: readChoice(faults, "options.units", fields["units"], unitSystems) };
}

/** Checks a result and the options of a figure that has no further ones; gives the units. */
export function readFigureInput(
  path: string,
  result: unknown,
  kind: string,
  shape: Shape,
  options: unknown,
): DisplayUnits {
  const faults: Issue[] = [];
  readResult(faults, path, result, kind, shape);
  const { units } = readOptions(faults, options);
  refuseIfFaulty(faults);
  return units;
}

/** A pressure [Pa] in words. */
export function pressureText(pressure: number, units: DisplayUnits): string {
  return `${formatNumber(toDisplay(pressure, "pressure", units))} ${displayUnit("pressure", units)}`;
}

/** A mole fraction with as many decimals as tell it from 0 and 1. */
export function fractionText(fraction: number): string {
  const toEnd = Math.min(fraction, 1 - fraction);
  if (!(toEnd > 1e-9))
    return fraction > 0.5 && toEnd > 0 ? `1 − ${toEnd.toExponential(1)}` : String(fraction);
  const decimals = Math.max(2, 1 - Math.floor(Math.log10(toEnd)));
  return fraction.toFixed(decimals).replace(/(\.\d\d\d*?)0+$/, "$1");
}
