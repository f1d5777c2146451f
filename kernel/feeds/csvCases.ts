import { type AmountColumn, readComponentHeading, splitHeading } from "./columnHeading";
import { type PlacedText, readCsv } from "./csvTable";
import { type FeedSource, type FileFault, withUnit, type WrittenFeed } from "./feedSource";
import { fieldOf, flowField, readRemarks } from "./feedWords";
import type { Place } from "./place";

/** A column of a table of cases: a field of every feed, or the amount of a component. */
type CaseColumn =
  | { readonly field: string; readonly unit: string | undefined }
  | { readonly component: string; readonly column: AmountColumn };

function readHeading(heading: PlacedText, faults: FileFault[]): CaseColumn | undefined {
  const { words, unit } = splitHeading(heading.text);
  const field = fieldOf(words);
  if (field !== undefined) return { field: flowField(field, unit), unit: unit === "-" ? undefined : unit };
  const column = readComponentHeading(heading, faults);
  return column === undefined ? undefined : { component: words, column };
}

/** Amounts of one kind only: flows, or fractions on one basis. */
function checkOneKind(
  headings: readonly PlacedText[],
  columns: readonly CaseColumn[],
  faults: FileFault[],
): void {
  const kindOf = (column: CaseColumn): string | undefined =>
    "field" in column ? undefined : (column.column.basis ?? "flow");
  const first = columns.map(kindOf).find((kind) => kind !== undefined);
  const other = columns.findIndex((column) => kindOf(column) !== undefined && kindOf(column) !== first);
  if (other < 0) return;
  const message = "all components must be given alike: as flows, or as fractions by mole, or by mass";
  faults.push({
    code: "conflicting-fields",
    place: headings[other]!.place,
    message,
    value: headings[other]!.text,
  });
}

function checkComponents(
  headings: readonly PlacedText[],
  columns: readonly CaseColumn[],
  faults: FileFault[],
): void {
  columns.forEach((column, i) => {
    if ("field" in column) return;
    const first = columns.findIndex((other) => "component" in other && other.component === column.component);
    if (first === i) return;
    const message = `${column.component} has two columns`;
    faults.push({ code: "duplicate-component", place: headings[i]!.place, message, value: column.component });
  });
}

/** One row as a feed; an empty cell leaves its component or field out. */
function readRow(
  row: readonly PlacedText[],
  columns: readonly CaseColumn[],
  common: { fields: Record<string, unknown>; places: ReadonlyMap<string, Place> },
): WrittenFeed {
  const fields: Record<string, unknown> = { ...common.fields, name: row[0]!.text };
  const places = new Map(common.places);
  const amounts = new Map<string, number | string>();
  let amount: AmountColumn | undefined;
  columns.forEach((column, i) => {
    const { text, place } = row[i + 1]!;
    if (text === "") return;
    if ("field" in column) {
      fields[column.field] = withUnit(text, column.unit);
      places.set(column.field, place);
    } else {
      amount = column.column;
      amounts.set(column.component, withUnit(text, amount.unit));
      places.set(`${amount.amount}.${column.component}`, place);
    }
  });
  if (amount !== undefined) fields[amount.amount] = Object.fromEntries(amounts);
  if (amount?.basis !== undefined) fields["basis"] = amount.basis;
  return { fields, places, start: row[0]!.place };
}

function checkNames(rows: readonly (readonly PlacedText[])[], faults: FileFault[]): void {
  const seen = new Set<string>();
  for (const [name] of rows) {
    const { text, place } = name!;
    if (text === "" || seen.has(text)) {
      const message = text === "" ? "the case has no name" : `two cases are called ${text}`;
      faults.push({ code: "file-format", place, message, value: text });
    }
    seen.add(text);
  }
}

/** Several feeds: a row each, the first column its name. */
export function csvCases(text: string): FeedSource {
  const table = readCsv(text);
  const faults = [...table.faults];
  const common = readRemarks(table.remarks, faults);
  const headings = table.header.slice(1);
  const columns = headings.map((heading) => readHeading(heading, faults));
  checkNames(table.rows, faults);
  const known = columns.filter((column) => column !== undefined);
  if (known.length < columns.length) return { feeds: [], faults };
  const before = faults.length;
  checkOneKind(headings, known, faults);
  checkComponents(headings, known, faults);
  if (faults.length > before) return { feeds: [], faults };
  return { feeds: table.rows.map((row) => readRow(row, known, common)), faults };
}
