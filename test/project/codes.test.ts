import ts from "typescript";
import { describe, expect, test } from "vitest";
import { cautionCodes } from "../../src/base/cautionCodes";
import { issueCodes } from "../../src/base/codes";
import { parseFolders, walk } from "./sourceFiles";

// That every code in use is documented is the compiler's to say: `Issue` and `Caution` take no other.

/** Codes that the published contract lists and that no function needs yet, with what will use them. */
const notYetUsed: Readonly<Record<string, string>> = {};

const files = parseFolders("src", "kernel").filter(
  (file) => !/base\/(codes|cautionCodes)\.ts$/.test(file.path),
);

/** Every text literal of src outside the tables themselves; template texts without a hole included. */
function textsOf(node: ts.Node): Set<string> {
  const texts = new Set<string>();
  walk(node, (inner) => {
    if (ts.isStringLiteralLike(inner)) texts.add(inner.text);
  });
  return texts;
}

const used = new Set(files.flatMap(({ tree }) => [...textsOf(tree)]));

describe("codes of errors", () => {
  test("every documented code is reported somewhere, or listed with a reason", () => {
    const idle = Object.keys(issueCodes).filter((code) => !used.has(code) && !(code in notYetUsed));
    expect(idle).toEqual([]);
  });

  test("no reason is kept for a code that is in use", () => {
    expect(Object.keys(notYetUsed).filter((code) => used.has(code))).toEqual([]);
  });
});

describe("codes of cautions", () => {
  test("every documented code is given somewhere", () => {
    expect(Object.keys(cautionCodes).filter((code) => !used.has(code))).toEqual([]);
  });
});

test("codes are words joined by hyphens, each with its meaning", () => {
  const all = Object.entries({ ...issueCodes, ...cautionCodes });
  expect(all.filter(([code, meaning]) => !/^[a-z]+(-[a-z]+)*$/.test(code) || meaning.length < 10)).toEqual(
    [],
  );
});
