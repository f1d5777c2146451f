import { type Fields, readFields, shown } from "./check";
import type { Issue } from "./errors";

/** Fractions with their names, in the order typed. */
export interface NamedFractions {
  readonly names: readonly string[];
  readonly fractions: Float64Array;
}

const mostComponents = 500;
const sumTolerance = 1e-6;

const scale: Readonly<Record<string, number>> = {
  "": 1,
  "%": 0.01,
  ppm: 1e-6,
  ppb: 1e-9,
  "mol%": 0.01,
  "mol %": 0.01,
};

function readFraction(faults: Issue[], path: string, typed: unknown): number {
  let value = typed;
  if (typeof typed === "string") {
    const parts = /^\s*([0-9.]+(?:[eE][+-]?\d+)?)\s*(.*?)\s*$/.exec(typed);
    const factor = parts === null ? undefined : scale[parts[2]!];
    value = factor === undefined ? typed : Number(parts![1]) * factor;
  }
  if (typeof value !== "number") {
    const message = `${path} must be a mole fraction (a number, or text such as "12 %" or "500 ppm"), got ${shown(typed)}`;
    faults.push({ code: "wrong-type", path, message, value: typed });
    return Number.NaN;
  }
  if (!Number.isFinite(value)) {
    faults.push({
      code: "not-finite",
      path,
      message: `${path} must be a finite fraction, got ${shown(typed)}`,
      value: typed,
    });
    return Number.NaN;
  }
  if (value < 0) {
    const message = `${path} must be at least 0, got ${shown(typed)}`;
    faults.push({ code: "fraction-out-of-range", path, message, value: typed, limit: 0 });
    return Number.NaN;
  }
  return value;
}

/**
 * Reads a composition: fractions by name that add up to 1 within 1e-6, or any amounts with `normalize`.
 * The fractions returned add up to 1 to rounding. Undefined after a reported fault.
 */
export function readComposition(
  faults: Issue[],
  path: string,
  value: unknown,
  normalize = false,
): NamedFractions | undefined {
  const fields: Fields | undefined = readFields(faults, path, value, undefined);
  if (fields === undefined) return undefined;
  const names = Object.keys(fields);
  const before = faults.length;
  if (names.length === 0 || names.length > mostComponents) {
    const code = names.length === 0 ? "empty" : "too-many";
    const message = `${path} must name 1 to ${mostComponents} components, got ${names.length}`;
    faults.push({ code, path, message, value: names.length, limit: mostComponents });
    return undefined;
  }
  const fractions = new Float64Array(names.length);
  let sum = 0;
  for (let i = 0; i < names.length; i++) {
    const typed = fields[names[i]!];
    const fraction =
      typeof typed === "number" && typed >= 0 && typed < Infinity
        ? typed
        : readFraction(faults, `${path}.${names[i]!}`, typed);
    fractions[i] = fraction;
    sum += fraction;
  }
  if (faults.length > before) return undefined;
  return scaledToOne(faults, path, { names, fractions }, sum, normalize);
}

function scaledToOne(
  faults: Issue[],
  path: string,
  named: NamedFractions,
  sum: number,
  normalize: boolean,
): NamedFractions | undefined {
  if (!(sum > 0) || sum === Infinity) {
    const message = `${path} must hold at least one amount above zero and a finite sum, got the sum ${sum}`;
    faults.push({ code: "composition-sum", path, message, value: sum, limit: 1 });
    return undefined;
  }
  if (!normalize && !(Math.abs(sum - 1) <= sumTolerance)) {
    const message = `${path} must add up to 1, got ${sum.toFixed(6)}; pass normalize: true to scale it`;
    faults.push({ code: "composition-sum", path, message, value: sum, limit: 1 });
    return undefined;
  }
  const { fractions } = named;
  for (let i = 0; i < fractions.length; i++) fractions[i] = fractions[i]! / sum;
  return named;
}
