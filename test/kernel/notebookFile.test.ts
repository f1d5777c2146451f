import { existsSync, readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, test } from "vitest";
import { notebookText, readNotebook, writeWhole } from "../../kernel/notebook/notebookFile";
import { saveNotebook } from "../../kernel/notebook/saveNotebook";
import type { Notebook } from "../../kernel/notebook/notebookFormat";
import { notebookOf, temporaryFolder, written } from "./files";

const folder = temporaryFolder();

describe("reading a notebook", () => {
  test("joins lines, drops old outputs, keeps tags and pasted pictures", () => {
    const file = written(
      folder,
      "lines.ipynb",
      JSON.stringify({
        nbformat: 4,
        nbformat_minor: 4,
        metadata: { kernelspec: { language: "typescript" } },
        cells: [
          { cell_type: "markdown", metadata: {}, source: ["# A\n", "b"], attachments: { "p.png": {} } },
          {
            cell_type: "code",
            metadata: { tags: ["parameters"] },
            execution_count: 7,
            outputs: [{ output_type: "stream", name: "stdout", text: "old" }],
            source: ["1\n", "2"],
          },
        ],
      }),
    );
    const { cells } = readNotebook(file);
    expect(cells).toEqual([
      { cell_type: "markdown", id: "cell-1", metadata: {}, source: "# A\nb", attachments: { "p.png": {} } },
      {
        cell_type: "code",
        id: "cell-2",
        metadata: { tags: ["parameters"] },
        source: "1\n2",
        execution_count: null,
        outputs: [],
      },
    ]);
  });

  test.each([
    ["{", /is not a notebook/],
    ["[]", /format 4/],
    ['{"nbformat":3,"cells":[]}', /format 4/],
    ['{"nbformat":4,"cells":[3]}', /cells\[0\] must be an object/],
    ['{"nbformat":4,"cells":[{"cell_type":"code"}]}', /source must be text/],
    ['{"nbformat":4,"cells":[{"cell_type":"slide","source":""}]}', /cell_type/],
    ['{"nbformat":4,"metadata":{"kernelspec":{"language":"python"}},"cells":[]}', /a python notebook/],
  ])("%s is refused", (text, message) => {
    expect(() => readNotebook(written(folder, "wrong.ipynb", text))).toThrow(message);
  });

  test("a missing file is named", () => {
    expect(() => readNotebook(join(folder, "nowhere.ipynb"))).toThrow(/cannot read the notebook .*nowhere/);
  });
});

describe("writing a notebook", () => {
  const figure = {
    "application/vnd.plotly.v1+json": { data: [] },
    "text/html": "<b></b><script>(1)</script>",
  };
  const notebook: Notebook = {
    metadata: {},
    cells: [
      {
        cell_type: "code",
        id: "a",
        metadata: {},
        source: "1\n2",
        execution_count: 1,
        outputs: [
          { output_type: "stream", name: "stdout", text: "x\ny\n" },
          { output_type: "display_data", data: figure, metadata: {} },
          { output_type: "execute_result", execution_count: 1, data: figure, metadata: {} },
        ],
      },
    ],
  };

  test("splits text into lines and is of format 4.5", () => {
    const {
      cells,
      nbformat,
      nbformat_minor: minor,
    } = JSON.parse(notebookText(notebook)) as {
      cells: { source: string[]; outputs: { text: string[] }[] }[];
      nbformat: number;
      nbformat_minor: number;
    };
    expect([nbformat, minor]).toEqual([4, 5]);
    expect(cells[0]!.source).toEqual(["1\n", "2"]);
    expect(cells[0]!.outputs[0]!.text).toEqual(["x\n", "y\n"]);
  });

  test("plotly.js comes once, with the first figure", () => {
    const file = join(folder, "live.ipynb");
    saveNotebook(file, notebook, false);
    const text = readFileSync(file, "utf8");
    expect(text.match(/DecompressionStream/g)).toHaveLength(1);
    expect(text.length - text.indexOf("DecompressionStream")).toBeGreaterThan(1_000_000);
  });

  test("still figures need no script", () => {
    const file = join(folder, "still.ipynb");
    saveNotebook(file, notebook, true);
    expect(readFileSync(file, "utf8")).not.toContain("script");
  });

  test("makes the folder and leaves no unfinished file", () => {
    const file = join(folder, "new", "deep", "file.txt");
    writeWhole(file, "text");
    expect(existsSync(file)).toBe(true);
    expect(readdirSync(join(folder, "new", "deep"))).toEqual(["file.txt"]);
  });

  test("a notebook read back is the one written", () => {
    const file = written(folder, "back.ipynb", notebookOf("# A", "1 + 1"));
    const read = readNotebook(file);
    writeWhole(file, notebookText(read));
    expect(readNotebook(file)).toEqual(read);
  });
});
