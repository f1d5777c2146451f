import { spawn } from "node:child_process";
import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { beforeAll, describe, expect, test } from "vitest";
import { notebookOf, temporaryFolder, written } from "./files";

const folder = temporaryFolder();
const cli = join(import.meta.dirname, "../../dist/kernel/cli.js");

interface Ended {
  readonly code: number | null;
  readonly stdout: string;
  readonly stderr: string;
}

/** Runs the command line as a user does, in the test's folder. */
function refluxbook(...words: readonly string[]): Promise<Ended> {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, [cli, ...words], { cwd: folder });
    const said = { stdout: "", stderr: "" };
    child.stdout.on("data", (text: Buffer) => (said.stdout += text.toString()));
    child.stderr.on("data", (text: Buffer) => (said.stderr += text.toString()));
    child.on("close", (code) => resolve({ code, ...said }));
  });
}

interface Stored {
  readonly output_type: string;
  readonly text?: string[];
  readonly ename?: string;
  readonly evalue?: string;
  readonly traceback?: string[];
  readonly data?: Readonly<Record<string, unknown>>;
}

interface StoredCell {
  readonly source: string[];
  readonly execution_count: number | null;
  readonly outputs: Stored[];
  readonly metadata: { readonly tags?: string[] };
}

function executed(name: string): { cells: StoredCell[]; metadata: Record<string, unknown> } {
  return JSON.parse(readFileSync(join(folder, "out", `${name}.ipynb`), "utf8")) as ReturnType<
    typeof executed
  >;
}

const expectedToFail = ["raises-exception"];
const figure =
  '({ kind: "figure", name: "f", title: "Stages", alt: "falls", data: [{ x: [1, 2], y: [2, 1] }], layout: {}, cautions: [], methods: [] })';

describe("a whole run", () => {
  let ended: Ended;
  let cells: StoredCell[];

  beforeAll(async () => {
    const notebook = notebookOf(
      "# How many stages?",
      { source: 'const feedFile = "none.csv";\nconst factor: number = 1;', tags: ["parameters"] },
      "## Feed",
      "const feed = rb.readStream(feedFile);\nfeed",
      "const again = { feed, factor };\nagain.factor",
      "rb.show(feed);\nrb.displayUnits('US');\nconsole.log('shown');\nfeed",
      figure,
      "for (let i = 0; i < 20000; i++) console.log('line', i);",
      { source: "\nthrow new Error('boom');", tags: expectedToFail },
      {
        source: "rb.gilliland({ minimumStages: -1, minimumReflux: 1, refluxRatio: 2 })",
        tags: expectedToFail,
      },
      { source: "const text: string = factor;", tags: expectedToFail },
      { source: "process.exit(0)", tags: expectedToFail },
      { source: "void Promise.reject(new Error('lost'));", tags: expectedToFail },
      "await new Promise((resolve) => setTimeout(resolve, 10));\n'end'",
    );
    written(folder, "study.ipynb", notebook);
    written(folder, "given.csv", "# name: given\n# q: 1\ncomponent,mass flow [kg/h]\nbenzene,1\ntoluene,2\n");
    ended = await refluxbook("run", "study.ipynb", "--set", "factor=2.5", "--feed", "given.csv");
    ({ cells } = executed("study"));
  });

  const outputs = (text: string): Stored[] =>
    cells.find(({ source }) => source.join("").includes(text))!.outputs;
  const shown = (output: Stored, type: string): string => (output.data![type] as string[]).join("");

  test("ends well, tells each cell and the two files", () => {
    expect(ended.stderr).toMatch(/cell 2 of 13 {2}\d+\.\d s {2}How many stages\?/);
    expect(ended.stdout).toBe(`${join("out", "study.ipynb")}\n${join("out", "study.html")}\n`);
    expect(ended.code).toBe(0);
  });

  test("puts the parameters right after their cell, the feed file as the cells find it", () => {
    expect(cells[2]!.metadata.tags).toEqual(["injected-parameters"]);
    expect(cells[2]!.source.join("")).toContain('const factor: number = 2.5;\nconst feedFile = "given.csv";');
    expect(shown(outputs("again.factor")[0]!, "text/plain")).toBe("2.5");
  });

  test("shows results as tables, in the units of the moment", () => {
    const [result] = outputs("readStream(feedFile)");
    expect(result!.output_type).toBe("execute_result");
    expect(shown(result!, "text/html")).toContain("kmol/h");
    const kinds = outputs("rb.show(feed)").map(({ output_type: type }) => type);
    expect(kinds).toEqual(["display_data", "stream", "execute_result"]);
    expect(shown(outputs("rb.show(feed)")[2]!, "text/plain")).toContain("lbmol/h");
  });

  test("shows a figure live, as a picture and in words", () => {
    const [result] = outputs('kind: "figure"');
    expect(Object.keys(result!.data!)).toEqual([
      "application/vnd.plotly.v1+json",
      "text/html",
      "image/svg+xml",
      "text/plain",
    ]);
    expect(shown(result!, "text/html")).toContain("DecompressionStream");
  });

  test("keeps all 20,000 lines as one output", () => {
    const printed = outputs("20000");
    expect(printed).toHaveLength(1);
    expect(printed[0]!.text).toHaveLength(20_000);
  });

  test("tells an error with the line as typed, without frames of the machinery", () => {
    expect(outputs("boom")[0]!.traceback).toEqual([
      "Error: boom",
      "  at cell 8, line 2",
      "    throw new Error('boom');",
      "          ^",
    ]);
    const [design] = outputs("minimumStages: -1");
    expect(design!.ename).toBe("DesignInputError");
    expect(design!.traceback!.filter((line) => line.includes(" at "))).toEqual(["  at cell 9, line 1"]);
  });

  test("checks types before a cell runs", () => {
    const [error] = outputs("const text: string");
    expect(error!.ename).toBe("TypeScriptError");
    expect(error!.evalue).toBe("line 1: Type 'number' is not assignable to type 'string'.");
  });

  test("a cell cannot end the process, and a lost promise fails its cell", () => {
    expect(outputs("process.exit")[0]!.evalue).toContain("not allowed in a cell");
    expect(outputs("Promise.reject")[0]!.evalue).toBe("lost");
    expect(shown(outputs("'end'")[0]!, "text/plain")).toBe("'end'");
  });

  test("names kernel and language", () => {
    expect(executed("study").metadata).toMatchObject({
      kernelspec: { name: "refluxbook", language: "typescript" },
      language_info: { name: "typescript" },
    });
  });

  test("writes the report", () => {
    const report = readFileSync(join(folder, "out", "study.html"), "utf8");
    expect(report).toContain("How many stages?</h1>");
    expect(report.length).toBeLessThan(6_000_000);
  });
});

describe("a run that does not end well", () => {
  test("a failing cell: exit 1, the cell named, what ran is written", async () => {
    written(
      folder,
      "fails.ipynb",
      notebookOf("const a = 1;\na", "## Reflux", "// why\nJSON.parse('{')", "2"),
    );
    const { code, stderr } = await refluxbook("run", "fails.ipynb", "--name", "case");
    expect(code).toBe(1);
    expect(stderr).toContain("cell 2 failed, under \"Reflux\": JSON.parse('{')\nSyntaxError");
    const { cells } = executed("case");
    expect(cells.map((cell) => cell.outputs?.length)).toEqual([1, undefined, 1, 0]);
    expect(readFileSync(join(folder, "out", "case.html"), "utf8")).toContain("This run did not finish.");
  });

  test("a busy cell over its time: exit 3", async () => {
    written(folder, "slow.ipynb", notebookOf("1", "while (true) {}"));
    const { code, stderr } = await refluxbook("run", "slow.ipynb", "--time-limit", "1");
    expect(stderr).toContain("the cell ran longer than 1 s");
    expect(code).toBe(3);
    expect(executed("slow").cells[1]!.outputs[0]!.ename).toBe("TimeLimit");
  });

  test("a cell that no interrupt reaches is ended: exit 3", async () => {
    written(folder, "stuck.ipynb", notebookOf("await null;\nwhile (true) {}"));
    const { code } = await refluxbook("run", "stuck.ipynb", "--time-limit", "1");
    expect(code).toBe(3);
    expect(existsSync(join(folder, "out", "stuck.html"))).toBe(true);
  });

  test("a process that dies: exit 3, the earlier cells are kept", async () => {
    written(folder, "dies.ipynb", notebookOf("1", "process.kill(process.pid, 'SIGKILL')"));
    const { code, stderr } = await refluxbook("run", "dies.ipynb");
    expect(code).toBe(3);
    expect(stderr).toContain("the process that runs the cells ended (signal SIGKILL)");
    expect(executed("dies").cells.map((cell) => cell.outputs.length)).toEqual([1, 1]);
  });

  test("an error after the last cell: exit 1", async () => {
    written(folder, "late.ipynb", notebookOf("setTimeout(() => { throw new Error('later'); }, 20);\n1"));
    const { code, stderr } = await refluxbook("run", "late.ipynb");
    expect(stderr).toContain("an error surfaced after its cell had ended");
    expect(code).toBe(1);
    expect(
      executed("late").cells[0]!.outputs.some(({ text }) => text?.join("").includes("Error: later")),
    ).toBe(true);
  });
});

describe("wrong usage: exit 2 and a way out", () => {
  beforeAll(() => {
    written(folder, "set.ipynb", notebookOf({ source: "const refluxRatio = 2;", tags: ["parameters"] }));
  });

  test.each([
    [
      ["run", "set.ipynb", "--set", "refluxRatoi=3"],
      /no parameter "refluxRatoi"\. Did you mean "refluxRatio"\?/,
    ],
    [["run", "set.ipynb", "--feed", "set.ipynb"], /no parameter "feedFile"/],
    [["run", "set.ipynb", "--feed", "none.csv"], /there is no file none\.csv/],
    [["run", "set.ipynb", "--set", "refluxRatio=1", "--set", "refluxRatio=2"], /set twice/],
    [["run", "set.ipynb", "--time-limit", "soon"], /--time-limit needs seconds/],
    [["run", "set.ipynb", "--out", "."], /would overwrite the notebook/],
    [["run", "set.ipynb", "--name", "a/b"], /without a folder/],
    [["run", "set.ipynb", "other.ipynb"], /one notebook at a time/],
    [["run", "none.ipynb"], /cannot read the notebook/],
    [["run"], /which notebook\?/],
    [["run", "--otu", "x"], /no option --otu\. Did you mean "--out"\?/],
    [["rnu"], /no command rnu\. Did you mean "run"\?/],
    [[], /Commands:/],
  ])("%j", async (words, message) => {
    const { code, stderr, stdout } = await refluxbook(...words);
    expect(stderr).toMatch(message);
    expect(stdout).toBe("");
    expect(code).toBe(2);
  });

  test("help and version", async () => {
    expect((await refluxbook("--help")).stdout).toContain("run a notebook");
    const help = await refluxbook("run", "--help");
    expect(help.stdout).toContain("Exit codes: 0 all cells ran; 1 a cell failed; 2 wrong usage");
    expect(help.code).toBe(0);
    expect((await refluxbook("--version")).stdout).toMatch(/^\d+\.\d+\.\d+\n$/);
  });
});
