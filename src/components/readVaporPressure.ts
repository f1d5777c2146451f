import { type Fields, readChoice, readFields, readNumber, readText, shown } from "../base/check";
import type { Issue } from "../base/errors";
import type { VaporPressureBlock, VaporPressureEquation } from "./component";

const forms = ["antoine", "dippr101", "wagner25", "wagner36"] as const;
const grades = ["A", "B", "C", "D"] as const;
const common = ["form", "range", "source", "grade", "deviation"];
const own: Readonly<Record<(typeof forms)[number], readonly string[]>> = {
  antoine: ["A", "B", "C", "logBase", "temperatureUnit", "pressureUnit"],
  dippr101: ["C1", "C2", "C3", "C4", "C5"],
  wagner25: ["coefficients", "criticalTemperature", "criticalPressure"],
  wagner36: ["coefficients", "criticalTemperature", "criticalPressure"],
};

/** Reads a vapor-pressure equation with its range and source; undefined after reported faults. */
export function readVaporPressureBlock(
  faults: Issue[],
  path: string,
  value: unknown,
): VaporPressureBlock | undefined {
  const before = faults.length;
  const fields = readFields(faults, path, value, undefined);
  if (fields === undefined) return undefined;
  const form = readChoice(faults, `${path}.form`, fields["form"] ?? "none", forms);
  if (faults.length > before) return undefined;
  readFields(faults, path, value, new Set([...common, ...own[form]]));
  const equation = readEquation(faults, path, fields, form);
  const range = readRange(faults, `${path}.range`, fields["range"]);
  const source = readText(faults, `${path}.source`, fields["source"]);
  const quality = readQuality(faults, path, fields);
  if (faults.length > before) return undefined;
  return { ...equation, range: range!, source: source!, ...quality };
}

/** Grade and deviation, which an equation copied from a component of the table carries. */
function readQuality(
  faults: Issue[],
  path: string,
  fields: Fields,
): Pick<VaporPressureBlock, "grade" | "deviation"> {
  const { grade, deviation } = fields;
  const text = deviation === undefined ? undefined : readText(faults, `${path}.deviation`, deviation);
  return {
    ...(grade === undefined ? {} : { grade: readChoice(faults, `${path}.grade`, grade, grades) }),
    ...(text === undefined ? {} : { deviation: text }),
  };
}

function readEquation(
  faults: Issue[],
  path: string,
  fields: Fields,
  form: (typeof forms)[number],
): VaporPressureEquation {
  const number = (name: string): number => readNumber(faults, `${path}.${name}`, fields[name]);
  if (form === "antoine") return readAntoine(faults, path, fields, number);
  if (form === "dippr101") {
    return { form, C1: number("C1"), C2: number("C2"), C3: number("C3"), C4: number("C4"), C5: number("C5") };
  }
  const above = { above: 0 };
  return {
    form,
    coefficients: readCoefficients(faults, `${path}.coefficients`, fields["coefficients"]),
    criticalTemperature: readNumber(
      faults,
      `${path}.criticalTemperature`,
      fields["criticalTemperature"],
      above,
    ),
    criticalPressure: readNumber(faults, `${path}.criticalPressure`, fields["criticalPressure"], above),
  };
}

function readAntoine(
  faults: Issue[],
  path: string,
  fields: Fields,
  number: (name: string) => number,
): VaporPressureEquation {
  const logBase = fields["logBase"];
  if (logBase !== 10 && logBase !== "e") {
    const message = `${path}.logBase must be 10 or "e", got ${shown(logBase)}`;
    faults.push({ code: "unknown-choice", path: `${path}.logBase`, message, value: logBase });
  }
  return {
    form: "antoine",
    A: number("A"),
    B: number("B"),
    C: number("C"),
    logBase: logBase === "e" ? "e" : 10,
    temperatureUnit: readUnit(faults, `${path}.temperatureUnit`, fields["temperatureUnit"], [
      "K",
      "degC",
      "degF",
    ]),
    pressureUnit: readUnit(faults, `${path}.pressureUnit`, fields["pressureUnit"], [
      "Pa",
      "kPa",
      "bar",
      "mmHg",
      "psia",
    ]),
  };
}

/** A unit has no default: leaving it out is a fault. */
function readUnit<T extends string>(faults: Issue[], path: string, value: unknown, units: readonly T[]): T {
  return readChoice(faults, path, value ?? null, units);
}

function readCoefficients(faults: Issue[], path: string, value: unknown): [number, number, number, number] {
  if (!Array.isArray(value) || value.length !== 4) {
    const message = `${path} must be a list of four numbers, got ${shown(value)}`;
    faults.push({ code: value === undefined ? "missing-field" : "wrong-type", path, message, value });
    return [0, 0, 0, 0];
  }
  return value.map((each, i) => readNumber(faults, `${path}[${i}]`, each)) as [
    number,
    number,
    number,
    number,
  ];
}

const highestTemperature = 1e4;

function readRange(faults: Issue[], path: string, value: unknown): [number, number] | undefined {
  if (!Array.isArray(value) || value.length !== 2) {
    const message = `${path} must be [Tmin, Tmax] in K, got ${shown(value)}`;
    faults.push({ code: value === undefined ? "missing-field" : "wrong-type", path, message, value });
    return undefined;
  }
  const limits = { above: 0, atMost: highestTemperature };
  const low = readNumber(faults, `${path}[0]`, value[0], limits);
  const high = readNumber(faults, `${path}[1]`, value[1], limits);
  if (low < high) return [low, high];
  if (low >= high) {
    const message = `${path} must rise from Tmin to Tmax, got ${low} to ${high} K`;
    faults.push({ code: "above-limit", path: `${path}[0]`, message, value: low, limit: high });
  }
  return undefined;
}
