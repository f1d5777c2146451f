import { didYouMean } from "../../src/base/nearest";
import { dimensionOfUnit } from "../../src/base/units";
import type { Remark } from "./csvTable";
import { type FileFault, numberOrText } from "./feedSource";
import type { Place } from "./place";

/** What people write for a field of a feed, in remarks and column headings. */
const fieldOfWord: Readonly<Record<string, string>> = {
  name: "name",
  temperature: "temperature",
  pressure: "pressure",
  q: "q",
  "liquid fraction": "q",
  "vapor fraction": "vaporFraction",
  flow: "flow",
  "molar flow": "flow",
  "mass flow": "massFlow",
  basis: "basis",
  normalize: "normalize",
};

/** Remarks that are for people alone. */
const forPeople = new Set(["note", "source", "date"]);

/** "vaporFraction" and "Vapor Fraction" as "vapor fraction". */
function plainWord(word: string): string {
  return word
    .replace(/([a-z])([A-Z])/g, "$1 $2")
    .replace(/\s+/g, " ")
    .trim()
    .toLowerCase();
}

/** The field that a word means, or undefined. */
export function fieldOf(word: string): string | undefined {
  const plain = plainWord(word);
  return Object.hasOwn(fieldOfWord, plain) ? fieldOfWord[plain] : undefined;
}

/** A flow by the unit it is in, whichever way it was called. */
export function flowField(field: string, unit: string | undefined): string {
  if (field !== "flow" || unit === undefined) return field;
  return dimensionOfUnit(unit) === "massFlow" ? "massFlow" : "flow";
}

const unitOfText = /^[+-]?[\d.]+(?:e[+-]?\d+)?\s*(.*)$/i;

function valueOf(field: string, text: string): unknown {
  if (field === "normalize")
    return /^(true|yes)$/i.test(text) ? true : /^(false|no)$/i.test(text) ? false : text;
  return field === "name" ? text : numberOrText(text);
}

/** Reads `# key: value` lines into fields of a feed. */
export function readRemarks(
  remarks: readonly Remark[],
  faults: FileFault[],
): { fields: Record<string, unknown>; places: Map<string, Place> } {
  const fields: Record<string, unknown> = {};
  const places = new Map<string, Place>();
  for (const { key, value, place } of remarks) {
    if (forPeople.has(plainWord(key))) continue;
    const meant = fieldOf(key);
    if (meant === undefined) {
      const words = Object.keys(fieldOfWord);
      const message = `no remark "${key}".${didYouMean(plainWord(key), words)} Known: ${words.join(", ")}; note for what is for people`;
      faults.push({ code: "unknown-field", place, message, value: key });
      continue;
    }
    const field = flowField(meant, unitOfText.exec(value)?.[1]);
    if (places.has(field)) {
      faults.push({ code: "file-format", place, message: `${field} is given twice`, value });
    }
    fields[field] = valueOf(field, value);
    places.set(field, place);
  }
  return { fields, places };
}
