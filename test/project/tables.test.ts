import { expect, test } from "vitest";
import { missingTables, tablesText, withTables } from "./tables";

test("the tables of the documentation are those of the code (npm run tables writes them)", () => {
  const text = tablesText();
  expect(missingTables(text)).toEqual([]);
  expect(withTables(text)).toBe(text);
});
