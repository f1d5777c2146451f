import ts from "typescript";
import { describe, expect, test } from "vitest";
import { issueCodes } from "../../src/base/codes";
import { parseFolders, walk } from "./sourceFiles";

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

/** The literal values of a field `code` in object literals; cautions have a severity, issues have none. */
function literalCodes(kind: "caution" | "issue"): { code: string; at: string }[] {
  const found: { code: string; at: string }[] = [];
  for (const { path, tree } of files) {
    walk(tree, (node) => {
      if (!ts.isObjectLiteralExpression(node)) return;
      const fieldOf = (name: string): ts.ObjectLiteralElementLike | undefined =>
        node.properties.find((property) => property.name?.getText() === name);
      const code = fieldOf("code");
      const isCaution = fieldOf("severity") !== undefined;
      if (code === undefined || isCaution !== (kind === "caution")) return;
      if (!isCaution && fieldOf("path") === undefined) return;
      if (ts.isPropertyAssignment(code)) {
        for (const text of textsOf(code.initializer)) found.push({ code: text, at: path });
      }
    });
  }
  return found;
}

describe("codes of errors", () => {
  const used = new Set(files.flatMap(({ tree }) => [...textsOf(tree)]));

  test("every code that the project reports is documented", () => {
    const unknown = literalCodes("issue").filter(({ code }) => !Object.hasOwn(issueCodes, code));
    expect(unknown).toEqual([]);
  });

  test("every documented code is reported somewhere, or listed with a reason", () => {
    const idle = Object.keys(issueCodes).filter((code) => !used.has(code) && !(code in notYetUsed));
    expect(idle).toEqual([]);
  });

  test("no reason is kept for a code that is in use", () => {
    expect(Object.keys(notYetUsed).filter((code) => used.has(code))).toEqual([]);
  });

  test("codes are words joined by hyphens, each with its rule", () => {
    expect(Object.keys(issueCodes).filter((code) => !/^[a-z]+(-[a-z]+)*$/.test(code))).toEqual([]);
    expect(Object.values(issueCodes).filter((rule) => rule.length < 10)).toEqual([]);
  });
});
