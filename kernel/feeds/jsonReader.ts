import { type Place, placeAt } from "./place";

/** A JSON value with the place of every value in it, by path: `a.b`, `[2].a`. */
export interface PlacedJson {
  readonly value: unknown;
  readonly places: ReadonlyMap<string, Place>;
}

/** Text that is not JSON, or an object with a name twice. */
export class JsonFault extends Error {
  constructor(
    message: string,
    readonly place: Place,
  ) {
    super(message);
  }
}

const space = /[ \t\r\n]*/y;
const literal = /"(?:[^"\\\u0000-\u001f]|\\.)*"|-?\d+(?:\.\d+)?(?:[eE][+-]?\d+)?|true|false|null/y;
const deepest = 50;

/** Reads JSON and remembers where each value stands. @throws JsonFault */
export function readJson(text: string): PlacedJson {
  const places = new Map<string, Place>();
  let at = 0;

  function fail(message: string, offset = at): never {
    throw new JsonFault(message, placeAt(text, offset));
  }

  function skip(): void {
    space.lastIndex = at;
    space.exec(text);
    at = space.lastIndex;
  }

  function take(mark: string): boolean {
    skip();
    if (text[at] !== mark) return false;
    at += 1;
    return true;
  }

  function expect(mark: string): void {
    if (!take(mark)) fail(`${mark} expected, found ${at < text.length ? text[at] : "the end of the file"}`);
  }

  function readLiteral(): unknown {
    literal.lastIndex = at;
    const found = literal.exec(text);
    if (found === null)
      fail(at < text.length ? `a value expected, found ${text[at]}` : "the file ends too early");
    try {
      const value: unknown = JSON.parse(found[0]);
      at = literal.lastIndex;
      return value;
    } catch {
      return fail(`${found[0]} is no JSON text`);
    }
  }

  function readObject(path: string, depth: number): Record<string, unknown> {
    const entries = new Map<string, unknown>();
    while (!take("}")) {
      if (entries.size > 0) expect(",");
      skip();
      const offset = at;
      if (text[at] !== '"') fail("a name in double quotes expected");
      const name = readLiteral() as string;
      if (entries.has(name)) fail(`${JSON.stringify(name)} is there twice`, offset);
      expect(":");
      entries.set(name, readValue(path === "" ? name : `${path}.${name}`, depth));
    }
    return Object.fromEntries(entries);
  }

  function readList(path: string, depth: number): unknown[] {
    const list: unknown[] = [];
    while (!take("]")) {
      if (list.length > 0) expect(",");
      list.push(readValue(`${path}[${list.length}]`, depth));
    }
    return list;
  }

  function readValue(path: string, depth: number): unknown {
    skip();
    if (depth > deepest) fail("nested too deeply");
    places.set(path, placeAt(text, at));
    if (take("{")) return readObject(path, depth + 1);
    if (take("[")) return readList(path, depth + 1);
    return readLiteral();
  }

  const value = readValue("", 0);
  skip();
  if (at < text.length) fail(`nothing may follow, found ${text[at]}`);
  return { value, places };
}
