import { type Fields, readFields, readNumber, readText, shown } from "../base/check";
import { type Issue, refuseIfFaulty } from "../base/errors";
import { readQuantity, type MolarMass, type Pressure, type Temperature } from "../base/units";
import type { Component, VaporPressureBlock } from "./component";
import { readVaporPressureBlock } from "./readVaporPressure";
import { logVaporPressure } from "./vaporPressure";

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
 * @throws DesignInputError with all faults: a missing name, source or constant, a range that does not rise, a vapor
 * pressure that does not rise over it
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
  if (block !== undefined && faults.length === 0) checkRise(faults, block);
  refuseIfFaulty(faults);
  const sources = { vaporPressure: block!.source };
  return { kind: "component", id: name!, name: name!, ...constants, vaporPressure: block!, sources };
}

function readConstants(faults: Issue[], fields: Fields): Partial<Component> {
  const constants: Record<string, unknown> = {};
  for (const field of ["cas", "formula", "family"]) {
    if (fields[field] !== undefined) constants[field] = readText(faults, field, fields[field]);
  }
  const quantities = {
    normalBoilingPoint: "temperature",
    criticalTemperature: "temperature",
    criticalPressure: "pressure",
  } as const;
  for (const [field, dimension] of Object.entries(quantities)) {
    if (fields[field] !== undefined) constants[field] = readQuantity(faults, field, fields[field], dimension);
  }
  if (fields["molarMass"] !== undefined) {
    const hint = 'write "92.14 g/mol" or 0.09214';
    constants["molarMass"] = readQuantity(faults, "molarMass", fields["molarMass"], "molarMass", {
      above: 0,
      atMost: 5,
      hint,
    });
  }
  if (fields["acentricFactor"] !== undefined) {
    constants["acentricFactor"] = readNumber(faults, "acentricFactor", fields["acentricFactor"], {
      atLeast: -1,
      atMost: 3,
    });
  }
  return constants;
}

/** The vapor pressure must be positive, finite, and rise over its whole range. */
function checkRise(faults: Issue[], block: VaporPressureBlock): void {
  const [low, high] = block.range;
  const points = 20;
  let last = -Infinity;
  for (let i = 0; i <= points; i++) {
    const temperature = low + ((high - low) * i) / points;
    const log = logVaporPressure(block, temperature);
    if (log > last && log < 30) {
      last = log;
      continue;
    }
    const shownPressure = Number.isFinite(log)
      ? `${Math.exp(Math.min(log, 700)).toPrecision(3)} Pa`
      : "no value";
    const message = `vaporPressure must rise over its range ${low} to ${high} K and stay below 1e13 Pa, got ${shownPressure} at ${shown(Math.round(temperature))} K; check constants, logBase and units`;
    faults.push({ code: "vapor-pressure-undefined", path: "vaporPressure", message, value: temperature });
    return;
  }
}
