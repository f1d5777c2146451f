import { afterEach, expect, test, vi } from "vitest";
import { notebookSession } from "../../kernel/session";
import { show } from "../../kernel/show";

const result = { kind: "note", cautions: [], methods: [], stages: 8 };

afterEach(() => {
  delete notebookSession().show;
  vi.restoreAllMocks();
});

test("prints the text form in a plain script", () => {
  const write = vi.spyOn(process.stdout, "write").mockReturnValue(true);
  show(result);
  expect(write.mock.calls.map(([text]) => text).join("")).toMatch(/^note\n[\s\S]*equilibrium stages\s+8/);
});

test("hands the value to the notebook it runs in", () => {
  const seen: unknown[] = [];
  notebookSession().show = (value) => seen.push(value);
  show(result);
  expect(seen).toEqual([result]);
});
