import { readAmountHeading } from "./columnHeading";
import { type PlacedText, readCsv } from "./csvTable";
import { type FeedSource, type FileFault, withUnit } from "./feedSource";
import { readRemarks } from "./feedWords";
import type { Place } from "./place";

/** Amounts by component from the two columns of a stream. */
function readRows(
  rows: readonly (readonly PlacedText[])[],
  unit: string | undefined,
  faults: FileFault[],
): { amounts: Map<string, number | string>; places: Map<string, Place> } {
  const amounts = new Map<string, number | string>();
  const places = new Map<string, Place>();
  for (const [name, value] of rows as readonly [PlacedText, PlacedText][]) {
    const { text, place } = name;
    if (amounts.has(text)) {
      faults.push({ code: "duplicate-component", place, message: `${text} is there twice`, value: text });
    }
    if (text === "" || value.text === "") {
      const message = text === "" ? "the row has no component" : `${text} has no value`;
      faults.push({ code: "file-format", place, message, value: value.text });
      continue;
    }
    amounts.set(text, withUnit(value.text, unit));
    places.set(text, value.place);
  }
  return { amounts, places };
}

/** One feed: remarks above a table of components. */
export function csvStream(text: string): FeedSource {
  const table = readCsv(text);
  const faults = [...table.faults];
  const { fields, places } = readRemarks(table.remarks, faults);
  const start = table.header[0]?.place ?? { line: 1, column: 1 };
  if (table.header.length === 0) return { feeds: [], faults };
  if (table.header.length !== 2) {
    const message = `a stream has two columns, component and amount, got ${table.header.length}; cases side by side are read by readCases`;
    faults.push({ code: "file-format", place: start, message, value: table.header.length });
    return { feeds: [], faults };
  }
  const column = readAmountHeading(table.header[1]!, faults);
  if (column === undefined) return { feeds: [], faults };
  const read = readRows(table.rows, column.unit, faults);
  for (const [name, place] of read.places) places.set(`${column.amount}.${name}`, place);
  const amounts = { [column.amount]: Object.fromEntries(read.amounts) };
  const basis = column.basis === undefined ? {} : { basis: column.basis };
  return { feeds: [{ fields: { ...fields, ...basis, ...amounts }, places, start }], faults };
}
