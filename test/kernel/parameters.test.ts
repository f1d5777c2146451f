import { describe, expect, test } from "vitest";
import type { Declaration } from "../../kernel/cellOutput";
import type { CodeCell, Notebook } from "../../kernel/notebook/notebookFormat";
import { injectParameters, parameterValues, readSetting } from "../../kernel/notebook/parameters";

function code(id: string, source: string, tags: readonly string[] = []): CodeCell {
  return { cell_type: "code", id, metadata: { tags }, source, execution_count: null, outputs: [] };
}

const declared: readonly Declaration[] = [
  { keyword: "const", name: "feedFile", value: '"feeds/base.csv"' },
  { keyword: "const", name: "refluxOverMinimum", value: "1.25" },
  { keyword: "let", name: "multiples", type: "number[]", value: "[1.1, 1.2]" },
];
const notebook: Notebook = {
  metadata: {},
  cells: [
    { cell_type: "markdown", id: "a", metadata: {}, source: "# Title" },
    code("b", "const feedFile = ...", ["parameters"]),
    code("c", "rb.readStream(feedFile)"),
  ],
};

describe("name=value", () => {
  test.each([
    ["refluxOverMinimum=1.3", "refluxOverMinimum", 1.3],
    ["flag=true", "flag", true],
    ["multiples=[1.1, 1.3]", "multiples", [1.1, 1.3]],
    ["pressure=1.6 bar", "pressure", "1.6 bar"],
    ['pressure="1.6 bar"', "pressure", "1.6 bar"],
    ["label=a=b", "label", "a=b"],
    ["empty=", "empty", ""],
    ["nothing=null", "nothing", null],
  ])("%s", (text, name, value) => {
    expect(readSetting(text)).toEqual({ name, value });
  });

  test.each(["refluxOverMinimum", "=1", "1x=2", "a b=1", "a=1e999"])("%s is refused", (text) => {
    expect(() => readSetting(text)).toThrow(/--set/);
  });
});

describe("injected parameters", () => {
  const settings = [readSetting("refluxOverMinimum=1.4"), readSetting("multiples=[2]")];
  const injected = injectParameters(notebook, settings, declared);

  test("stand right after the cell tagged parameters, with keyword and type as declared", () => {
    expect(injected.cells.map((cell) => cell.id)).toEqual(["a", "b", "injected-parameters", "c"]);
    expect(injected.cells[2]!.source).toBe(
      "// values of this run\nconst refluxOverMinimum = 1.4;\nlet multiples: number[] = [2];",
    );
    expect(injected.cells[2]!.metadata).toEqual({ tags: ["injected-parameters"] });
  });

  test("take the place of those of an earlier run", () => {
    const again = injectParameters(injected, [readSetting("feedFile=other.csv")], declared);
    expect(again.cells.map((cell) => cell.id)).toEqual(["a", "b", "injected-parameters", "c"]);
    expect(again.cells[2]!.source).toContain('const feedFile = "other.csv";');
    expect(injectParameters(injected, [], declared).cells.map((cell) => cell.id)).toEqual(["a", "b", "c"]);
  });

  test("the given notebook stays as it is", () => {
    expect(notebook.cells).toHaveLength(3);
  });

  test("unknown names are refused together, with the nearest", () => {
    const wrong = [readSetting("refluxOverMinium=1"), readSetting("preasure=2")];
    expect(() => injectParameters(notebook, wrong, declared)).toThrow(
      /"refluxOverMinium".*"refluxOverMinimum"[\s\S]*"preasure"[\s\S]*It has feedFile, refluxOverMinimum, multiples/,
    );
    expect(() => injectParameters(notebook, wrong, [])).toThrow(/no cell is tagged parameters/);
  });

  test("every parameter is told with the value of the run", () => {
    expect(parameterValues(declared, settings)).toEqual([
      { name: "feedFile", value: '"feeds/base.csv"' },
      { name: "refluxOverMinimum", value: "1.4" },
      { name: "multiples", value: "[2]" },
    ]);
  });
});
