import { readFields, readNumber, shown } from "../base/check";
import type { Issue } from "../base/errors";
import { didYouMean } from "../base/nearest";

/**
 * Reads one positive number for each name, in the order of `names`; a name too few or too many is a fault. Without
 * names (they could not be read) only the numbers are checked. Undefined after a reported fault.
 */
export function readVolatilities(
  faults: Issue[],
  path: string,
  value: unknown,
  names: readonly string[] | undefined,
): Float64Array | undefined {
  const before = faults.length;
  const fields = readFields(faults, path, value, undefined);
  if (fields === undefined) return undefined;
  if (names === undefined) {
    for (const name of Object.keys(fields)) readVolatility(faults, `${path}.${name}`, fields[name]);
    return undefined;
  }
  const volatilities = new Float64Array(names.length);
  for (let i = 0; i < names.length; i++) {
    const name = names[i]!;
    const typed = fields[name];
    if (typeof typed === "number" && typed > 0 && typed < Infinity) volatilities[i] = typed;
    else if (Object.hasOwn(fields, name)) readVolatility(faults, `${path}.${name}`, typed);
    else reportMissing(faults, path, name, fields);
  }
  let given = 0;
  for (const name in fields) if (fields[name] !== undefined) given++;
  if (given > names.length || faults.length > before) reportExtra(faults, path, fields, names);
  return faults.length > before ? undefined : volatilities;
}

function readVolatility(faults: Issue[], path: string, typed: unknown): void {
  readNumber(faults, path, typed, { above: 0, code: "volatility-not-positive" });
}

function reportMissing(faults: Issue[], path: string, name: string, fields: object): void {
  const message = `${path} must have a number for every component, got none for ${shown(name)}.${didYouMean(name, Object.keys(fields))}`;
  faults.push({ code: "length-mismatch", path: `${path}.${name}`, message, value: undefined });
}

function reportExtra(faults: Issue[], path: string, fields: object, names: readonly string[]): void {
  const known = new Set(names);
  for (const name of Object.keys(fields)) {
    if (known.has(name)) continue;
    const message = `${path} names ${shown(name)}, which is not in the composition.${didYouMean(name, names)}`;
    faults.push({ code: "length-mismatch", path: `${path}.${name}`, message, value: name });
  }
}
