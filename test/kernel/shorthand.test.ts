import { expect, test } from "vitest";
import { writeOutShorthand } from "../../kernel/shorthand";

const code = "x;\nf({ feed, q: boom(), alpha, z })";
const found = ["feed", "alpha", "z"].map((name) => ({ name, end: code.indexOf(name) + name.length }));
const { code: written, typed } = writeOutShorthand(code, found);

test("short properties are written out", () => {
  expect(written).toBe("x;\nf({ feed: feed, q: boom(), alpha: alpha, z: z })");
});

test("places are those of the cell as typed", () => {
  const places = ["boom", "alpha", " })", "f("].map((text) => {
    const before = written.slice(0, written.indexOf(text)).split("\n");
    const place = typed({ line: before.length, column: before.at(-1)!.length + 1 });
    return code.split("\n")[place.line - 1]!.slice(place.column - 1, place.column - 1 + text.length);
  });
  expect(places).toEqual(["boom", "alpha", " })", "f("]);
});

test("a cell without any stays as it is", () => {
  const plain = writeOutShorthand("f(a)", []);
  expect(plain.code).toBe("f(a)");
  expect(plain.typed({ line: 1, column: 3 })).toEqual({ line: 1, column: 3 });
});
