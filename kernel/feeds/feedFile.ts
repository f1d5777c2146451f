import * as fs from "node:fs";
import * as path from "node:path";
import { shown } from "../../src/base/check";
import { DesignInputError, type Issue } from "../../src/base/errors";
import { type Feed, feed } from "../../src/balance/feed";
import type { FeedSource, WrittenFeed } from "./feedSource";
import type { Place } from "./place";

const largest = 5 * 1024 * 1024; // bytes

/** The readers of a kind of file, by how the file is written. */
export interface FeedReaders {
  readonly json: (text: string) => FeedSource;
  readonly csv: (text: string) => FeedSource;
}

function refuse(message: string, value: unknown, code: Issue["code"] = "file-not-readable"): never {
  throw new DesignInputError([{ code, path: "path", message, value }]);
}

function readText(file: unknown): string {
  if (typeof file !== "string" || file.trim() === "") {
    return refuse(`path must be the name of a feed file, got ${shown(file)}`, file, "wrong-type");
  }
  try {
    const status = fs.statSync(file);
    if (status.isDirectory()) refuse(`cannot read ${file}: it is a folder`, file);
    const { size } = status;
    if (size > largest)
      refuse(`${file} has ${size} bytes; a feed file has at most ${largest}`, size, "too-many");
    return fs.readFileSync(file, "utf8").replace(/^\uFEFF/, "");
  } catch (error) {
    if (error instanceof DesignInputError) throw error;
    const why =
      (error as NodeJS.ErrnoException).code === "ENOENT" ? "there is no such file" : (error as Error).message;
    return refuse(`cannot read ${file}: ${why} (looked in ${path.dirname(path.resolve(file))})`, file);
  }
}

/** A fault with its place, which decides the order in which faults are told. */
interface PlacedIssue {
  readonly place: Place;
  readonly issue: Issue;
}

/** Where a field stands; a field that is missing, where what holds it stands. */
function placeOf(issue: Issue, { places, start }: WrittenFeed): Place {
  for (let at = issue.path; at !== ""; at = at.slice(0, Math.max(at.lastIndexOf("."), 0))) {
    const place = places.get(at);
    if (place !== undefined) return place;
  }
  return start;
}

function workOut(written: WrittenFeed, prefix: string, faults: PlacedIssue[]): Feed | undefined {
  try {
    return feed(written.fields);
  } catch (error) {
    if (!(error instanceof DesignInputError)) throw error;
    for (const issue of error.issues) {
      faults.push({ place: placeOf(issue, written), issue: { ...issue, path: prefix + issue.path } });
    }
    return undefined;
  }
}

/** Faults in the order of the file, each message with its place. */
function located(file: string, faults: readonly PlacedIssue[]): Issue[] {
  return [...faults]
    .sort((a, b) => a.place.line - b.place.line || a.place.column - b.place.column)
    .map(({ place, issue }) => ({
      ...issue,
      message: `${file}:${place.line}:${place.column}: ${issue.message}`,
    }));
}

/** Reads a feed file and works its feeds out; all faults of the file are reported together. */
export function readFeedFile(file: unknown, readers: FeedReaders, pathOf: (index: number) => string): Feed[] {
  const text = readText(file);
  const name = file as string;
  const isJson = /\.json$/i.test(name) || /^\s*[[{]/.test(text);
  const source = isJson ? readers.json(text) : readers.csv(text);
  const faults: PlacedIssue[] = source.faults.map(({ code, place, message, value }) => ({
    place,
    issue: { code, path: "path", message, value },
  }));
  const feeds = source.feeds.map((written, i) => workOut(written, pathOf(i), faults));
  if (faults.length > 0) throw new DesignInputError(located(name, faults));
  return feeds as Feed[];
}
