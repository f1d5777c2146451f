import type { IssueCode } from "../../src/base/codes";
import type { Place } from "./place";

/** A feed as a file gives it: the fields for `feed`, and where each stands, by its path such as `composition.toluene`. */
export interface WrittenFeed {
  readonly fields: Readonly<Record<string, unknown>>;
  readonly places: ReadonlyMap<string, Place>;
  readonly start: Place;
}

/** What is wrong with a file itself. */
export interface FileFault {
  readonly code: IssueCode;
  readonly place: Place;
  readonly message: string;
  readonly value: unknown;
}

/** All that was read from a file, faults with it. */
export interface FeedSource {
  readonly feeds: readonly WrittenFeed[];
  readonly faults: readonly FileFault[];
}

/** A text that is a number as that number, anything else as it is; the reader of the field judges it. */
export function numberOrText(text: string): number | string {
  return /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(text) ? Number(text) : text;
}

/** A number with the unit that its column states; other text as it is, so that a cell may bring its own unit. */
export function withUnit(text: string, unit: string | undefined): number | string {
  const value = numberOrText(text);
  return typeof value === "number" && unit !== undefined ? `${text} ${unit}` : value;
}
