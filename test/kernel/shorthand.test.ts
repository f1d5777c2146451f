import { createRequire } from "node:module";
import { expect, test } from "vitest";
import { writeOutShorthand } from "../../kernel/shorthand";

const fromTslab = createRequire(createRequire(import.meta.url).resolve("tslab/package.json"));
const compiler = fromTslab("@tslab/typescript-for-tslab") as typeof import("@tslab/typescript-for-tslab");

test.each([
  ["f({ feed, q: 1 })", "f({ feed: feed, q: 1 })"],
  ["({ a, b } = c)", "({ a: a, b: b } = c)"],
  ["({ a = 1 } = c)", "({ a: a = 1 } = c)"],
  ["const { a, b } = c", "const { a, b } = c"],
  ["const s = `{ a }`; // { b }", "const s = `{ a }`; // { b }"],
  ["[1].map((a) => ({ a }))", "[1].map((a) => ({ a: a }))"],
])("%s", (code, expected) => {
  expect(writeOutShorthand(compiler, code).code).toBe(expected);
});

test("places are those of the cell as typed", () => {
  const code = "x;\nf({ feed, q: boom(), alpha, z })";
  const { code: written, typed } = writeOutShorthand(compiler, code);
  const places = ["boom", " })", "f("].map((text) => {
    const offset = written.lastIndexOf(text);
    const before = written.slice(0, offset).split("\n");
    const place = typed({ line: before.length, column: before.at(-1)!.length + 1 });
    return code.split("\n")[place.line - 1]!.slice(place.column - 1, place.column - 1 + text.length);
  });
  expect(places).toEqual(["boom", " })", "f("]);
});
