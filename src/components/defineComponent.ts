import { type Fields, readFields, readNumber, readText, shown } from "../base/check";
import { standardAtmosphere } from "../base/constants";
import { type Issue, refuseIfFaulty } from "../base/errors";
import { type MolarMass, type Pressure, readQuantity, type Temperature } from "../base/units";
import type { Component, VaporPressureBlock } from "./component";
import { isCasNumber } from "./componentName";
import { logVaporPressure } from "./logVaporPressure";
import { readVaporPressureBlock } from "./readVaporPressure";

/** What `defineComponent` takes. */
export interface ComponentDefinition {
  readonly name: string;
  readonly cas?: string;
  readonly formula?: string;
  /** Family of the substance, such as "alcohol" or "acid/anhydride"; the check of Raoult's law reads it. */
  readonly family?: string;
  /** [kg/mol], or text such as "92.14 g/mol". */
  readonly molarMass?: MolarMass;
  /** [K], or text with a unit. */
  readonly normalBoilingPoint?: Temperature;
  /** [K], or text with a unit. */
  readonly criticalTemperature?: Temperature;
  /** Absolute [Pa], or text with a unit. */
  readonly criticalPressure?: Pressure;
  readonly acentricFactor?: number;
  readonly vaporPressure: VaporPressureBlock;
}

const known = new Set([
  "name",
  "cas",
  "formula",
  "family",
  "molarMass",
  "normalBoilingPoint",
  "criticalTemperature",
  "criticalPressure",
  "acentricFactor",
  "vaporPressure",
]);

/**
 * A component of your own, for use in `ownComponents`; it wins over one of the same name in the table.
 *
 * The vapor pressure is one of
 *   antoine    log P = A - B/(T + C), logarithm, T and P in the units you state
 *   dippr101   ln(P/Pa) = C1 + C2/T + C3 ln T + C4 T^C5, T in K
 *   wagner25   ln(P/Pc) = (c1 t + c2 t^1.5 + c3 t^2.5 + c4 t^5)/Tr, t = 1 - Tr
 *   wagner36   ln(P/Pc) = (c1 t + c2 t^1.5 + c3 t^3 + c4 t^6)/Tr
 * with `range: [Tmin, Tmax]` in K and a `source`. Constants of other kinds are optional: what is not known is said to
 * be missing where a method needs it.
 *
 * Source: your own, carried into every result that uses the component.
 *
 * @throws DesignInputError with all faults: a missing name, source or constant, a CAS number whose check digit is wrong,
 * a range that does not rise, a vapor pressure that does not rise over it or contradicts the normal boiling point
 * @example
 * const solvent = defineComponent({ name: "solvent", vaporPressure: { form: "antoine", A: 8.98523, B: 1184.24, C: -55.578, logBase: 10, temperatureUnit: "K", pressureUnit: "Pa", range: [279, 377], source: "own measurement" } });
 * boilingTemperature({ component: solvent, pressure: 101325 }).value // 353.2
 */
export function defineComponent(input: ComponentDefinition): Component {
  const faults: Issue[] = [];
  const fields = readFields(faults, "input", input, known);
  const name = fields && readText(faults, "name", fields["name"]);
  const constants = fields === undefined ? {} : readConstants(faults, fields);
  const block = fields && readVaporPressureBlock(faults, "vaporPressure", fields["vaporPressure"]);
  if (block !== undefined) {
    checkRise(faults, block);
    checkBoilingPoint(faults, block, constants.normalBoilingPoint);
  }
  refuseIfFaulty(faults);
  const sources = { vaporPressure: block!.source };
  return { kind: "component", id: name!, name: name!, ...constants, vaporPressure: block!, sources };
}

const quantities = {
  normalBoilingPoint: "temperature",
  criticalTemperature: "temperature",
  criticalPressure: "pressure",
} as const;

function readConstants(faults: Issue[], fields: Fields): Partial<Component> {
  const constants: Record<string, unknown> = {};
  for (const field of ["cas", "formula", "family"]) {
    if (fields[field] !== undefined) constants[field] = readText(faults, field, fields[field]);
  }
  if (typeof constants["cas"] === "string" && !isCasNumber(constants["cas"])) {
    const message = `cas must be a CAS number such as "108-88-3" with the right check digit, got ${shown(constants["cas"])}`;
    faults.push({ code: "wrong-type", path: "cas", message, value: constants["cas"] });
  }
  for (const [field, dimension] of Object.entries(quantities)) {
    if (fields[field] !== undefined) constants[field] = readQuantity(faults, field, fields[field], dimension);
  }
  if (fields["molarMass"] !== undefined) {
    const limits = { above: 0, atMost: 5, hint: 'write "92.14 g/mol" or 0.09214' };
    constants["molarMass"] = readQuantity(faults, "molarMass", fields["molarMass"], "molarMass", limits);
  }
  if (fields["acentricFactor"] !== undefined) {
    const limits = { atLeast: -1, atMost: 3 };
    constants["acentricFactor"] = readNumber(faults, "acentricFactor", fields["acentricFactor"], limits);
  }
  return constants;
}

const pointsChecked = 20;
const highestLogPressure = 30;

/** The vapor pressure must be positive, finite, and rise over its whole range. */
function checkRise(faults: Issue[], block: VaporPressureBlock): void {
  const [low, high] = block.range;
  let last = -Infinity;
  for (let i = 0; i <= pointsChecked; i++) {
    const temperature = low + ((high - low) * i) / pointsChecked;
    const log = logVaporPressure(block, temperature);
    if (!(log > last && log < highestLogPressure)) {
      const message = `vaporPressure must rise over its range ${low} to ${high} K and stay below 1e13 Pa, got ${shownPressure(log)} at ${temperature.toFixed(1)} K; check constants, logBase and units`;
      faults.push({
        code: "vapor-pressure-undefined",
        path: "vaporPressure",
        message,
        value: temperature,
      });
      return;
    }
    last = log;
  }
}

function shownPressure(log: number): string {
  return Number.isNaN(log) ? "no value" : `${Math.exp(Math.min(log, 700)).toPrecision(3)} Pa`;
}

/** How far ln P may lie from that of 1 atm at the normal boiling point; wrong units are off by far more. */
const boilingPointTolerance = 0.2;

function checkBoilingPoint(faults: Issue[], block: VaporPressureBlock, boiling: number | undefined): void {
  if (boiling === undefined || !(boiling >= block.range[0] && boiling <= block.range[1])) return;
  const log = logVaporPressure(block, boiling);
  if (Math.abs(log - Math.log(standardAtmosphere)) <= boilingPointTolerance) return;
  const message = `vaporPressure must give 1 atm at normalBoilingPoint ${boiling} K, got ${shownPressure(log)}; check constants, logBase and units`;
  faults.push({ code: "conflicting-fields", path: "vaporPressure", message, value: boiling });
}
