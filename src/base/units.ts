import { shown, withinLimits, type Limits } from "./check";
import { gasConstant, standardAtmosphere } from "./constants";
import type { Issue } from "./errors";
import { convertByUnitLibrary } from "./unitLibrary";
import { type Dimension, type Unit, unitTable } from "./unitTable";

export type {
  ComponentFlow,
  Dimension,
  MassFlow,
  MolarFlow,
  MolarMass,
  Pressure,
  PressureDifference,
  Temperature,
} from "./unitTable";

const numberAndUnit = /^\s*([+-]?(?:\d+(?:\.\d*)?|\.\d+)(?:[eE][+-]?\d+)?)\s*(\S.*?)?\s*$/;

/** SI unit of each dimension, as results carry it. */
export const siUnit: Readonly<Record<Dimension, string>> = {
  pressure: "Pa",
  pressureDifference: "Pa",
  temperature: "K",
  temperatureDifference: "K",
  molarFlow: "mol/s",
  massFlow: "kg/s",
  molarMass: "kg/mol",
  density: "kg/m3",
  molarEnergy: "J/mol",
  molarHeatCapacity: "J/(mol K)",
  power: "W",
  length: "m",
  area: "m2",
  velocity: "m/s",
  viscosity: "Pa s",
  surfaceTension: "N/m",
};

const example: Readonly<Partial<Record<Dimension, string>>> = {
  pressure: '"1.6 bar"',
  temperature: '"95 degC"',
  molarFlow: '"120 kmol/h"',
  massFlow: '"14.2 t/h"',
  molarMass: '"92.14 g/mol"',
};

/** The unit of the built-in table, or undefined. */
export function findUnit(dimension: Dimension, name: string): Unit | undefined {
  const units: Readonly<Record<string, Unit>> = unitTable[dimension];
  return Object.hasOwn(units, name) ? units[name] : undefined;
}

/** All unit names of a dimension. */
export function unitNames(dimension: Dimension): string[] {
  return Object.keys(unitTable[dimension]);
}

/** The dimension that a unit of the built-in table measures, or undefined. */
export function dimensionOfUnit(name: string): Dimension | undefined {
  return (Object.keys(unitTable) as Dimension[]).find((dimension) => findUnit(dimension, name) !== undefined);
}

/** Absolute quantities that cannot be zero or negative. */
const positive: Readonly<Partial<Record<Dimension, Issue["code"]>>> = {
  pressure: "pressure-not-positive",
  temperature: "temperature-not-positive",
  molarFlow: "flow-not-positive",
  massFlow: "flow-not-positive",
};

/**
 * Reads a physical quantity: an SI number, or text of a number and a unit. Gives the SI value, or NaN after a
 * reported fault. Gauge pressures are read on the standard atmosphere, 101 325 Pa. A bare pressure below 1 kPa
 * and a bare temperature below 50 K are taken for a forgotten unit and refused.
 */
export function readQuantity(
  faults: Issue[],
  path: string,
  value: unknown,
  dimension: Dimension,
  limits?: Limits,
): number {
  const si =
    typeof value === "string"
      ? readText(faults, path, value, dimension)
      : readBare(faults, path, value, dimension);
  if (Number.isNaN(si)) return si;
  const code = positive[dimension];
  if (code !== undefined && !(si > 0) && limits?.atLeast === undefined) {
    const message = `${path} must be above zero${dimension === "pressure" ? " (absolute)" : ""}, got ${shown(value)}`;
    faults.push({ code, path, message, value, limit: 0 });
    return Number.NaN;
  }
  if (typeof value === "number" && isForgottenUnit(faults, path, value, dimension)) return Number.NaN;
  return limits === undefined || withinLimits(faults, path, si, limits, value) ? si : Number.NaN;
}

function readBare(faults: Issue[], path: string, value: unknown, dimension: Dimension): number {
  if (typeof value === "number") {
    if (Number.isFinite(value)) return value;
    faults.push({
      code: "not-finite",
      path,
      message: `${path} must be a finite number, got ${value}`,
      value,
    });
    return Number.NaN;
  }
  const sample = example[dimension] === undefined ? "" : ` such as ${example[dimension]}`;
  faults.push({
    code: value === undefined ? "missing-field" : "wrong-type",
    path,
    message: `${path} must be a number in ${siUnit[dimension]} or text with a unit${sample}, got ${shown(value)}`,
    value,
  });
  return Number.NaN;
}

const leastBarePressure = 1000;
const leastBareTemperature = 50;

function isForgottenUnit(faults: Issue[], path: string, value: number, dimension: Dimension): boolean {
  const least =
    dimension === "pressure" ? leastBarePressure : dimension === "temperature" ? leastBareTemperature : 0;
  if (value >= least || least === 0) return false;
  const choices = dimension === "pressure" ? ["bar", "Pa"] : ["degC", "K"];
  faults.push({
    code: "implausible-bare-number",
    path,
    message: `${path} is read in ${siUnit[dimension]}, and ${value} ${siUnit[dimension]} is hardly meant; write ${choices
      .map((unit) => `"${value} ${unit}"`)
      .join(" or ")}`,
    value,
    limit: least,
  });
  return true;
}

function readText(faults: Issue[], path: string, text: string, dimension: Dimension): number {
  const parts = numberAndUnit.exec(text);
  const amount = parts === null ? Number.NaN : Number(parts[1]);
  const unitName = parts?.[2]?.replace(/\s+/g, " ");
  if (!Number.isFinite(amount) || unitName === undefined) {
    const sample = example[dimension] ?? `"2 ${siUnit[dimension]}"`;
    const message = `${path} must be a number and a unit such as ${sample}, got ${shown(text)}`;
    faults.push({ code: "wrong-type", path, message, value: text });
    return Number.NaN;
  }
  const unit = findUnit(dimension, unitName);
  if (unit !== undefined) return amount * unit.factor + (unit.offset ?? 0);
  return readOtherUnit(faults, path, text, amount, unitName, dimension);
}

/** Units outside the table: gas volumes at a reference state, ambiguous ones, and those of the unit library. */
function readOtherUnit(
  faults: Issue[],
  path: string,
  text: string,
  amount: number,
  unitName: string,
  dimension: Dimension,
): number {
  if (/^(sm3|Nm3)\/h\b/.test(unitName)) return readGasVolume(faults, path, text, amount, unitName, dimension);
  if (/\btons?\b/.test(unitName) && !unitName.startsWith("short ton")) {
    const message = `${path}: "ton" means different masses; write "tonne" (1000 kg) or "short ton" (2000 lb), got ${shown(text)}`;
    faults.push({ code: "unknown-unit", path, message, value: text });
    return Number.NaN;
  }
  const other = dimensionOfUnit(unitName);
  const si = other === undefined ? convertByUnitLibrary(amount, unitName, siUnit[dimension]) : undefined;
  if (si !== undefined) return si;
  const known = unitNames(dimension).join(", ");
  faults.push({
    code: other === undefined ? "unknown-unit" : "wrong-dimension",
    path,
    message:
      other === undefined
        ? `${path}: no unit ${shown(unitName)} for this quantity in ${shown(text)}. Known units: ${known}`
        : `${path} must be a ${spelled(dimension)}, but ${shown(text)} is a ${spelled(other)}. Known units: ${known}`,
    value: text,
  });
  return Number.NaN;
}

/** "molarFlow" as "molar flow". */
function spelled(dimension: Dimension): string {
  return dimension.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
}

/** A standard gas volume is a molar flow only with its reference state: "120 sm3/h at 15 degC, 1 atm"; ideal gas. */
function readGasVolume(
  faults: Issue[],
  path: string,
  text: string,
  amount: number,
  unitName: string,
  dimension: Dimension,
): number {
  const state = /^\S+ (?:at|@) (.+?), (.+)$/.exec(unitName);
  if (dimension === "molarFlow" && state !== null) {
    const temperature = readQuantity(faults, path, state[1], "temperature");
    const pressure = readQuantity(faults, path, state[2], "pressure");
    return ((amount / 3600) * pressure) / (gasConstant * temperature);
  }
  const message = `${path}: a standard gas volume needs its reference state, such as "${amount} sm3/h at 15 degC, ${
    standardAtmosphere / 1000
  } kPa", got ${shown(text)}`;
  faults.push({ code: "unknown-unit", path, message, value: text });
  return Number.NaN;
}
