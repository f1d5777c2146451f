import { spawn } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, statSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, describe, expect, test } from "vitest";

const root = join(import.meta.dirname, "../..");
const out = mkdtempSync(join(tmpdir(), "studies-"));
afterAll(() => rmSync(out, { recursive: true, force: true }));

interface Cell {
  readonly cell_type: string;
  readonly outputs?: { readonly output_type: string; readonly data?: Readonly<Record<string, unknown>> }[];
}

/** Runs a study as a user does; gives its code cells. */
async function run(notebook: string, name: string, ...options: string[]): Promise<Cell[]> {
  const words = [
    "dist/kernel/cli.js",
    "run",
    `notebooks/${notebook}.ipynb`,
    "--out",
    out,
    "--name",
    name,
    ...options,
  ];
  const said: string[] = [];
  const code = await new Promise((resolve) => {
    const child = spawn(process.execPath, words, { cwd: root });
    child.stderr.on("data", (text: Buffer) => said.push(text.toString()));
    child.on("close", resolve);
  });
  expect(said.join("").match(/error.*/i)?.[0] ?? "no error").toBe("no error");
  expect(code).toBe(0);
  const { cells } = JSON.parse(readFileSync(join(out, `${name}.ipynb`), "utf8")) as { cells: Cell[] };
  return cells.filter(({ cell_type }) => cell_type === "code");
}

/** Figures and tables among the outputs. */
function shown(cells: readonly Cell[]): { figures: number; tables: number } {
  const outputs = cells.flatMap(({ outputs: each }) => each ?? []);
  const holding = (mime: string) => outputs.filter(({ data }) => data?.[mime] !== undefined).length;
  const figures = holding("application/vnd.plotly.v1+json");
  const html = outputs.filter(({ data }) => JSON.stringify(data?.["text/html"] ?? "").includes("<table"));
  return { figures, tables: html.length };
}

const textOf = (cells: readonly Cell[]): string => JSON.stringify(cells.map(({ outputs }) => outputs));

describe("the main study", () => {
  test("as it stands: every cell runs, five figures, the tables of its steps; small enough to keep", async () => {
    const cells = await run("01-toluene-column", "main", "--still-figures");
    const { figures, tables } = shown(cells);
    expect(figures).toBe(5);
    expect(tables).toBeGreaterThanOrEqual(9);
    expect(statSync(join(out, "main.ipynb")).size).toBeLessThan(1.5e6);
    const report = readFileSync(join(out, "main.html"), "utf8");
    expect(report.length).toBeLessThan(6e6);
    expect(report).not.toMatch(/(src|href)="https?:/);
  });

  test("with one changed parameter the number of stages changes", async () => {
    const cells = await run(
      "01-toluene-column",
      "changed",
      "--still-figures",
      "--set",
      "refluxOverMinimum=1.5",
    );
    const before = JSON.parse(readFileSync(join(out, "main.ipynb"), "utf8")) as { cells: Cell[] };
    expect(textOf(cells)).not.toBe(textOf(before.cells.filter(({ cell_type }) => cell_type === "code")));
    expect(textOf(cells)).toContain("1.500");
  });

  test("on the second feed", async () => {
    const feed = ["--feed", "notebooks/feeds/mixed-aromatics-lean.csv"];
    const cells = await run("01-toluene-column", "lean", "--still-figures", ...feed);
    expect(textOf(cells)).toContain("toluene-lean crude");
  });
});

describe("the binary study", () => {
  test("as it stands", async () => {
    expect(shown(await run("02-alkane-splitter", "binary", "--still-figures")).figures).toBe(3);
  });

  test("on the second feed and with a purer distillate", async () => {
    const feed = ["--feed", "notebooks/feeds/alkane-cut-heavy.csv", "--set", "distillateLightFraction=0.99"];
    expect(shown(await run("02-alkane-splitter", "heavy", "--still-figures", ...feed)).figures).toBe(3);
  });
});
