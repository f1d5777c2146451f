import { shown } from "../base/check";
import type { Issue } from "../base/errors";
import { readQuantity } from "../base/units";
import type { Component } from "../components/component";
import { resolveComponents } from "./mixture";

const mostComponents = 500;

/** Reads the names of a sweep's components and looks them up. */
export function readComponentList(
  faults: Issue[],
  value: unknown,
  ownComponents: readonly Component[],
): { names: readonly string[]; components: readonly Component[] } | undefined {
  const path = "components";
  if (!Array.isArray(value) || !value.every((name) => typeof name === "string")) {
    const code = value === undefined ? "missing-field" : "wrong-type";
    faults.push({ code, path, message: `${path} must be a list of names, got ${shown(value)}`, value });
    return undefined;
  }
  if (value.length === 0 || value.length > mostComponents) {
    const code = value.length === 0 ? "empty" : "too-many";
    const message = `${path} must name 1 to ${mostComponents} components, got ${value.length}`;
    faults.push({ code, path, message, value: value.length, limit: mostComponents });
    return undefined;
  }
  const names: readonly string[] = value;
  const components = resolveComponents(faults, path, names, ownComponents);
  return components && { names, components };
}

/** Reads numbers case by case: a Float64Array, or a list of numbers. What is no number stays NaN and fails its case. */
function readNumbers(faults: Issue[], path: string, value: unknown): Float64Array | undefined {
  if (isFloat64Array(value)) return value;
  if (Array.isArray(value)) return Float64Array.from(value, (x) => (typeof x === "number" ? x : Number.NaN));
  const code = value === undefined ? "missing-field" : "wrong-type";
  faults.push({ code, path, message: `${path} must be a Float64Array, got ${shown(value)}`, value });
  return undefined;
}

/** By tag: a notebook's cells have their own Float64Array, of which ours makes no instance. */
function isFloat64Array(value: unknown): value is Float64Array {
  return ArrayBuffer.isView(value) && Object.prototype.toString.call(value) === "[object Float64Array]";
}

/** Reads the fractions of all cases, as many as components for each. */
export function readCaseFractions(
  faults: Issue[],
  value: unknown,
  components: number | undefined,
): Float64Array | undefined {
  const fractions = readNumbers(faults, "composition", value);
  if (fractions === undefined || components === undefined) return undefined;
  if (fractions.length > 0 && fractions.length % components === 0) return fractions;
  const message = `composition must hold ${components} fractions for each case, got ${fractions.length} numbers`;
  const code = fractions.length === 0 ? "empty" : "length-mismatch";
  faults.push({ code, path: "composition", message, value: fractions.length, limit: components });
  return undefined;
}

/** Reads the pressures [Pa]: one for all, or one a case. */
export function readCasePressures(
  faults: Issue[],
  value: unknown,
  fractions: Float64Array | undefined,
  components: number | undefined,
): Float64Array | undefined {
  if (typeof value !== "object" || value === null) {
    return Float64Array.of(readQuantity(faults, "pressure", value, "pressure"));
  }
  const pressures = readNumbers(faults, "pressure", value);
  if (pressures === undefined || fractions === undefined || components === undefined) return undefined;
  const cases = fractions.length / components;
  if (pressures.length === cases) return pressures;
  const message = `pressure must hold one number for each of the ${cases} cases, got ${pressures.length}`;
  faults.push({ code: "length-mismatch", path: "pressure", message, value: pressures.length, limit: cases });
  return undefined;
}
