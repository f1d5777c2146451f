import type { Component, PropertyBlock, VaporPressureBlock } from "./component";

type Parts = Readonly<Record<string, unknown>>;

const positives = [
  "molarMass",
  "normalBoilingPoint",
  "criticalTemperature",
  "criticalPressure",
  "criticalVolume",
  "rackettParameter",
];
const texts = ["cas", "formula", "family", "structure"];
const properties = [
  "heatOfVaporization",
  "liquidDensity",
  "liquidHeatCapacity",
  "idealGasHeatCapacity",
  "liquidViscosity",
  "surfaceTension",
];

/**
 * Whether a value, perhaps read back from a file, has all parts of a component that the equations rely on, and none of
 * the wrong type.
 */
export function isComponent(value: unknown): value is Component {
  if (!isRecord(value)) return false;
  const { kind, id, name, synonyms, acentricFactor } = value;
  const isNamed = kind === "component" && typeof id === "string" && typeof name === "string";
  return (
    isNamed &&
    isVaporPressure(value["vaporPressure"]) &&
    positives.every((field) => isAbsentOr(value[field], isPositive)) &&
    texts.every((field) => isAbsentOr(value[field], isText)) &&
    properties.every((field) => isAbsentOr(value[field], isProperty)) &&
    isAbsentOr(acentricFactor, Number.isFinite) &&
    isAbsentOr(synonyms, (list) => Array.isArray(list) && list.every(isText)) &&
    isAbsentOr(value["hazards"], isHazards)
  );
}

function isRecord(value: unknown): value is Parts {
  return typeof value === "object" && value !== null && !Array.isArray(value);
}

function isAbsentOr(value: unknown, is: (value: unknown) => boolean): boolean {
  return value === undefined || is(value);
}

function isText(value: unknown): boolean {
  return typeof value === "string";
}

function isPositive(value: unknown): boolean {
  return typeof value === "number" && value > 0 && value < Infinity;
}

function isRange(value: unknown): boolean {
  return Array.isArray(value) && value.length === 2 && value.every(isPositive) && value[0] <= value[1];
}

function isProperty(value: unknown): boolean {
  if (!isRecord(value)) return false;
  const { equation, constants, criticalTemperature, range } = value as Partial<PropertyBlock>;
  return (
    isText(equation) &&
    Array.isArray(constants) &&
    constants.every(Number.isFinite) &&
    isAbsentOr(criticalTemperature, isPositive) &&
    isRange(range)
  );
}

function isHazards(value: unknown): boolean {
  if (!isRecord(value) || !isRecord(value["sources"])) return false;
  const { flashPoint, lowerFlammabilityLimit, peroxideClass, carcinogenGroup, sources } = value;
  return (
    [flashPoint, lowerFlammabilityLimit].every((each) => isAbsentOr(each, isPositive)) &&
    [peroxideClass, carcinogenGroup, ...Object.values(sources)].every((each) => isAbsentOr(each, isText))
  );
}

function isVaporPressure(value: unknown): boolean {
  if (!isRecord(value) || !isRange(value["range"]) || !isText(value["source"])) return false;
  const block = value as unknown as VaporPressureBlock;
  switch (block.form) {
    case "antoine":
      return (
        [block.A, block.B, block.C].every(Number.isFinite) &&
        (block.logBase === 10 || block.logBase === "e") &&
        ["K", "degC", "degF"].includes(block.temperatureUnit) &&
        ["Pa", "kPa", "bar", "mmHg", "psia"].includes(block.pressureUnit)
      );
    case "dippr101":
      return [block.C1, block.C2, block.C3, block.C4, block.C5].every(Number.isFinite);
    case "wagner25":
    case "wagner36":
      return (
        Array.isArray(block.coefficients) &&
        block.coefficients.length === 4 &&
        block.coefficients.every(Number.isFinite) &&
        isPositive(block.criticalTemperature) &&
        isPositive(block.criticalPressure)
      );
    default:
      return false;
  }
}
