import { dimensionOfUnit } from "../../src/base/units";
import type { PlacedText } from "./csvTable";
import type { FileFault } from "./feedSource";

/** What a column holds for a component: its flow, or its fraction by mole or mass; `unit` as `feed` reads it. */
export interface AmountColumn {
  readonly amount: "componentFlows" | "composition";
  readonly basis?: "mole" | "mass";
  readonly unit?: string;
}

/** A heading such as "mass flow [kg/h]" in its two parts. */
export function splitHeading(text: string): { words: string; unit?: string } {
  const found = /^(.*?)\s*\[\s*(.*?)\s*\]$/.exec(text);
  return found === null ? { words: text } : { words: found[1]!, unit: found[2]! };
}

const fractionUnits: Readonly<Record<string, AmountColumn>> = {
  "mole fraction": { amount: "composition", basis: "mole" },
  "mol/mol": { amount: "composition", basis: "mole" },
  "mol%": { amount: "composition", basis: "mole", unit: "%" },
  "mol %": { amount: "composition", basis: "mole", unit: "%" },
  "mass fraction": { amount: "composition", basis: "mass" },
  "kg/kg": { amount: "composition", basis: "mass" },
  "mass%": { amount: "composition", basis: "mass", unit: "%" },
  "wt%": { amount: "composition", basis: "mass", unit: "%" },
  "wt %": { amount: "composition", basis: "mass", unit: "%" },
  ppmw: { amount: "composition", basis: "mass", unit: "ppm" },
};

/** The column that a unit alone tells: a flow, or a fraction by mole or mass. */
export function columnOfUnit(unit: string): AmountColumn | undefined {
  if (Object.hasOwn(fractionUnits, unit)) return fractionUnits[unit];
  const dimension = dimensionOfUnit(unit);
  return dimension === "massFlow" || dimension === "molarFlow"
    ? { amount: "componentFlows", unit }
    : undefined;
}

const units = ["kg/h", "kmol/h", "mole fraction", "mass fraction", "mol%", "wt%"].join("], [");

/** The amount column of a stream file: "mass flow [kg/h]", "molar flow [kmol/h]", "mole fraction", "mass fraction [wt%]". */
export function readAmountHeading(
  { text, place }: PlacedText,
  faults: FileFault[],
): AmountColumn | undefined {
  const { words, unit } = splitHeading(text);
  const fraction = /^(mole|mass) fractions?$/i.exec(words)?.[1]?.toLowerCase() as "mole" | "mass" | undefined;
  const told = unit === undefined ? undefined : columnOfUnit(unit);
  if (fraction !== undefined && (told === undefined || told.basis === fraction)) {
    const shown = told === undefined ? unit : told.unit;
    return { amount: "composition", basis: fraction, ...(shown === undefined ? {} : { unit: shown }) };
  }
  const flow = /^(mass |molar )?flows?$/i.exec(words);
  const named = flow?.[1]?.trim().toLowerCase();
  const agrees = named === undefined || unit === undefined || dimensionOfUnit(unit) === `${named}Flow`;
  if (flow !== null && told?.amount === "componentFlows" && agrees) return told;
  const message = `the second column must be "mass flow [kg/h]", "molar flow [kmol/h]", "mole fraction" or "mass fraction", each with a unit of its kind, got ${JSON.stringify(text)}`;
  faults.push({ code: unit === undefined ? "file-format" : "unknown-unit", place, message, value: text });
  return undefined;
}

/** The amount column of one component in a table of cases: "toluene [kg/h]". */
export function readComponentHeading(
  { text, place }: PlacedText,
  faults: FileFault[],
): AmountColumn | undefined {
  const { unit } = splitHeading(text);
  const told = unit === undefined ? undefined : columnOfUnit(unit);
  if (told === undefined) {
    const message = `the column ${JSON.stringify(text)} needs its unit in brackets, such as [${units}]`;
    faults.push({ code: "unknown-unit", place, message, value: text });
  }
  return told;
}
