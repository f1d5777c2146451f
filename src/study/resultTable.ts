import { type DisplayUnits, displayUnit, formatNumber, toDisplay } from "../base/displayUnits";
import { readChoice, readFields } from "../base/check";
import { DesignInputError, type Issue, refuseIfFaulty } from "../base/errors";
import type { Caution, MethodUsed } from "../base/result";
import { type FieldLabel, labelOf } from "./fieldLabels";

/** One block of rows; `numeric` tells which columns are numbers. */
export interface TableSection {
  readonly heading?: string;
  readonly columns: readonly string[];
  readonly rows: readonly (readonly string[])[];
  readonly numeric: readonly boolean[];
}

/** A result as a document: cautions first, then the sections, then methods with their sources. */
export interface ResultTable {
  readonly title: string;
  readonly cautions: readonly Caution[];
  readonly sections: readonly TableSection[];
  readonly methods: readonly MethodUsed[];
}

type Fields = Readonly<Record<string, unknown>>;

/** Fields that a table does not list: tags, what is shown apart, and the curves that figures draw. */
const unlisted = new Set(["kind", "cautions", "methods", "curve", "curves", "sources", "title", "status"]);

const mostRows = 60;

function isFields(value: unknown): value is Fields {
  return typeof value === "object" && value !== null && !Array.isArray(value);
}

function isNumbers(value: unknown): value is Readonly<Record<string, number>> {
  return (
    isFields(value) &&
    Object.values(value).length > 0 &&
    Object.values(value).every((v) => typeof v === "number")
  );
}

/** In which units numbers are shown; flows per mole of feed are pure numbers. */
interface Display {
  readonly units: DisplayUnits;
  readonly perMoleOfFeed: boolean;
}

function isPerMole({ dimension }: FieldLabel, { perMoleOfFeed }: Display): boolean {
  return perMoleOfFeed && dimension === "molarFlow";
}

function cell(value: unknown, label: FieldLabel, display: Display): string {
  if (typeof value === "number") {
    const pure = label.dimension === undefined || isPerMole(label, display);
    const shown = pure ? value : toDisplay(value, label.dimension, display.units);
    return Number.isInteger(shown) && Math.abs(shown) < 1e6
      ? String(shown)
      : formatNumber(shown, label.significant);
  }
  if (Array.isArray(value))
    return value.length === 0 ? "none" : value.map((v) => cell(v, label, display)).join(", ");
  if (value === null) return "not bounded";
  return typeof value === "string" ? value : (JSON.stringify(value) ?? "");
}

function unitOf(label: FieldLabel, display: Display): string {
  if (isPerMole(label, display)) return "mol/mol feed";
  return label.dimension === undefined ? "" : displayUnit(label.dimension, display.units);
}

function headed(label: FieldLabel, display: Display): string {
  const unit = unitOf(label, display);
  return unit === "" ? label.label : `${label.label} [${unit}]`;
}

function isScalar(value: unknown): boolean {
  return (
    !isFields(value) && !(Array.isArray(value) && value.some((v) => typeof v === "object" && v !== null))
  );
}

/** Single values, one a row. */
function scalarSection(fields: Fields, display: Display): TableSection[] {
  const rows = Object.entries(fields)
    .filter(
      ([field, value]) => !unlisted.has(field) && value !== undefined && value !== null && isScalar(value),
    )
    .map(([field, value]) => [
      labelOf(field).label,
      cell(value, labelOf(field), display),
      unitOf(labelOf(field), display),
    ]);
  return rows.length === 0
    ? []
    : [{ columns: ["quantity", "value", "unit"], rows, numeric: [false, true, false] }];
}

/** Records by component side by side: a component a row, a field a column. */
function componentSection(fields: Fields, display: Display, heading?: string): TableSection[] {
  const records = Object.entries(fields).filter(
    ([field, v]) => labelOf(field).byComponent === true && isNumbers(v),
  );
  if (records.length === 0) return [];
  const names = [...new Set(records.flatMap(([, record]) => Object.keys(record as Fields)))];
  const section = {
    columns: ["component", ...records.map(([field]) => headed(labelOf(field), display))],
    rows: names.map((name) => [
      name,
      ...records.map(([field, record]) => {
        const value = (record as Fields)[name];
        return value === undefined ? "" : cell(value, labelOf(field), display);
      }),
    ]),
    numeric: [false, ...records.map(() => true)],
  };
  return [heading === undefined ? section : { heading, ...section }];
}

/** Liquid and vapor of a section are flows; elsewhere the same words name compositions. */
const sectionLabel = (key: string): FieldLabel => ({ label: `${key} flow`, dimension: "molarFlow" });

/** A list of like objects, one a row; long lists keep their two ends. */
function listSection(field: string, list: readonly Fields[], display: Display): TableSection {
  const keys = Object.keys(list[0]!).filter((key) => isScalar(list[0]![key]));
  const labels = keys.map((key) => (field === "sections" ? sectionLabel(key) : labelOf(key)));
  const row = (item: Fields) => keys.map((key, i) => cell(item[key], labels[i]!, display));
  const half = mostRows / 2;
  const rows =
    list.length <= mostRows
      ? list.map(row)
      : [...list.slice(0, half).map(row), keys.map(() => "..."), ...list.slice(-half).map(row)];
  return {
    heading: labelOf(field).label,
    columns: labels.map((label) => headed(label, display)),
    rows,
    numeric: keys.map(() => true),
  };
}

function nestedSections(fields: Fields, display: Display): TableSection[] {
  return Object.entries(fields).flatMap(([field, value]) => {
    if (unlisted.has(field) || isScalar(value)) return [];
    if (Array.isArray(value)) return [listSection(field, value as Fields[], display)];
    if (labelOf(field).byComponent === true && isNumbers(value)) return [];
    return sectionsOf(value as Fields, display, labelOf(field).label);
  });
}

function sectionsOf(fields: Fields, display: Display, heading?: string): TableSection[] {
  const own = [...scalarSection(fields, display), ...componentSection(fields, display)];
  const named = own.map((section, i) =>
    heading !== undefined && i === 0 ? { heading, ...section } : section,
  );
  return [...named, ...nestedSections(fields, display)];
}

/** The entries of a list that have these words; a result read from a file may hold anything. */
function worded<T>(list: unknown, words: readonly (keyof T & string)[]): T[] {
  if (!Array.isArray(list)) return [];
  const isWorded = (each: unknown): boolean =>
    isFields(each) && words.every((word) => typeof each[word] === "string");
  return list.filter(isWorded) as T[];
}

/**
 * A result as rows and columns in display units: cautions, single values, values by component, lists, methods.
 * Works on any result of this library, read back from JSON too.
 *
 * @param result - a result: an object with `kind`, and `cautions` and `methods` where it has any
 * @param units - "SI", "metric" or "US"
 * @returns the document as data; the notebook side writes it as HTML or text
 * @throws DesignInputError for what is no object, or units that are not known
 * @example resultTable(gilliland({ minimumStages: 8, minimumReflux: 1, refluxRatio: 1.5 }), "metric").title // "gilliland"
 * Source: own layout.
 */
export function resultTable(result: object, units: DisplayUnits): ResultTable {
  const faults: Issue[] = [];
  const fields = readFields(faults, "result", result, undefined);
  readChoice(faults, "units", units ?? null, ["metric", "SI", "US"]);
  refuseIfFaulty(faults);
  if (fields === undefined) throw new DesignInputError(faults);
  const display = { units, perMoleOfFeed: fields["flowBasis"] === "per mole of feed" };
  const name = typeof fields["name"] === "string" ? `: ${fields["name"]}` : "";
  const kind = typeof fields["kind"] === "string" ? fields["kind"] : "result";
  return {
    title: `${labelOf(kind).label}${name}`,
    cautions: worded<Caution>(fields["cautions"], ["code", "severity", "kind", "message"]),
    sections: sectionsOf(fields, display),
    methods: worded<MethodUsed>(fields["methods"], ["name", "source"]),
  };
}
