import type { FeedSource, FileFault, WrittenFeed } from "./feedSource";
import { JsonFault, type PlacedJson, readJson } from "./jsonReader";
import type { Place } from "./place";

const top: Place = { line: 1, column: 1 };

function isFields(value: unknown): value is Record<string, unknown> {
  return typeof value === "object" && value !== null && !Array.isArray(value);
}

/** Fields of one feed; `note` is for people. */
function writtenFeed(value: Record<string, unknown>, { places }: PlacedJson, prefix: string): WrittenFeed {
  const own = new Map<string, Place>();
  for (const [path, place] of places) {
    if (path.startsWith(prefix)) own.set(path.slice(prefix.length).replace(/^\./, ""), place);
  }
  const fields = Object.fromEntries(Object.entries(value).filter(([name]) => name !== "note"));
  return { fields, places: own, start: own.get("") ?? top };
}

function wrongShape(place: Place, message: string, value: unknown): FeedSource {
  return { feeds: [], faults: [{ code: "file-format", place, message, value }] };
}

function parsed(text: string): PlacedJson | FileFault {
  try {
    return readJson(text);
  } catch (error) {
    if (!(error instanceof JsonFault)) throw error;
    return {
      code: "file-format",
      place: error.place,
      message: `not JSON: ${error.message}`,
      value: undefined,
    };
  }
}

/** One feed: a JSON object with the fields of `feed`. */
export function jsonStream(text: string): FeedSource {
  const json = parsed(text);
  if ("code" in json) return { feeds: [], faults: [json] };
  if (Array.isArray(json.value)) {
    return wrongShape(top, "a list of feeds is read by readCases; readStream takes one object", json.value);
  }
  if (!isFields(json.value)) return wrongShape(top, "a feed is an object with named fields", json.value);
  return { feeds: [writtenFeed(json.value, json, "")], faults: [] };
}

/** Several feeds: a JSON list of such objects. */
export function jsonCases(text: string): FeedSource {
  const json = parsed(text);
  if ("code" in json) return { feeds: [], faults: [json] };
  if (!Array.isArray(json.value)) {
    return wrongShape(top, "cases are a list of feeds: [{ ... }, { ... }]", json.value);
  }
  const faults: FileFault[] = [];
  const feeds = json.value.flatMap((value: unknown, i) => {
    if (isFields(value)) return [writtenFeed({ name: `case ${i + 1}`, ...value }, json, `[${i}]`)];
    const place = json.places.get(`[${i}]`) ?? top;
    faults.push({
      code: "file-format",
      place,
      message: `case ${i + 1} must be an object with named fields`,
      value,
    });
    return [];
  });
  return { feeds, faults };
}
