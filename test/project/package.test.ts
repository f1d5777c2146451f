import { execFileSync, spawnSync } from "node:child_process";
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { gilliland } from "../../src/shortcut/gilliland";
import { root } from "./sourceFiles";

const folder = mkdtempSync(join(tmpdir(), "refluxbook-package-"));
const version = (JSON.parse(readFileSync(join(root, "package.json"), "utf8")) as { version: string }).version;

interface Packed {
  readonly filename: string;
  readonly files: readonly { readonly path: string }[];
}

let packed: Packed;
let installed = "";

/** A notebook of one cell, as a user would write it: no import line. */
const notebook = {
  nbformat: 4,
  nbformat_minor: 5,
  metadata: { kernelspec: { name: "refluxbook", display_name: "refluxbook", language: "typescript" } },
  cells: [
    {
      id: "one",
      cell_type: "code",
      metadata: {},
      execution_count: null,
      outputs: [],
      source:
        "rb.fenske({ composition: { a: 0.5, b: 0.5 }, relativeVolatility: { a: 2.25, b: 1 },\n  lightKey: 'a', heavyKey: 'b', lightKeyRecovery: 0.99, heavyKeyRecovery: 0.99 }).minimumStages",
    },
  ],
};

/** A plain script of a few lines. */
const script = `const rb = require("refluxbook");
const { stages } = rb.gilliland({ minimumStages: 8, minimumReflux: 1, refluxRatio: 1.5 });
const { temperature } = rb.bubblePoint({ composition: { benzene: 0.5, toluene: 0.5 }, pressure: "1 atm" });
console.log(JSON.stringify({ stages, temperature }));
`;

function inFolder(command: string, ...words: readonly string[]): string {
  const { status, stdout, stderr } = spawnSync(command, words, { cwd: folder, encoding: "utf8" });
  if (status !== 0)
    throw new Error(`${command} ${words.join(" ")} ended with ${status}\n${stdout}\n${stderr}`);
  return stdout;
}

beforeAll(() => {
  // dist/ is up to date here, and other tests are reading it: no build of its own
  const words = ["pack", "--ignore-scripts", "--json", "--pack-destination", folder];
  [packed] = JSON.parse(execFileSync("npm", words, { cwd: root, encoding: "utf8" })) as [Packed];
  writeFileSync(join(folder, "package.json"), JSON.stringify({ name: "somebody", private: true }));
  writeFileSync(join(folder, "one.ipynb"), JSON.stringify(notebook));
  writeFileSync(join(folder, "script.js"), script);
  installed = inFolder("npm", "install", "--prefer-offline", "--no-audit", "--no-fund", packed.filename);
});

afterAll(() => {
  rmSync(folder, { recursive: true, force: true });
});

describe("the package as a user installs it", () => {
  test("holds what is needed and nothing else", () => {
    const top = new Set(packed.files.map(({ path }) => path.split("/")[0]!));
    const expected = [
      "CHANGELOG.md",
      "DEVELOPERS.md",
      "LICENSE",
      "README.md",
      "dist",
      "notebooks",
      "package.json",
    ];
    expect([...top].sort()).toEqual(expected);
    expect(packed.files.filter(({ path }) => /\.test\.|(^|\/)test\//.test(path))).toEqual([]);
  });

  test("installs", () => {
    expect(installed).toMatch(/added \d+ packages/);
  });

  test("says its version", () => {
    expect(inFolder("npx", "refluxbook", "--version").trim()).toBe(version);
  });

  test("answers a plain script", () => {
    const { stages, temperature } = JSON.parse(inFolder("node", "script.js")) as Record<string, number>;
    expect(stages).toBe(gilliland({ minimumStages: 8, minimumReflux: 1, refluxRatio: 1.5 }).stages);
    // benzene and toluene boil at 353.2 and 383.8 K (NIST Chemistry WebBook)
    expect(temperature).toBeGreaterThan(360);
    expect(temperature).toBeLessThan(369);
  });

  test("runs a notebook", () => {
    inFolder("npx", "refluxbook", "run", "one.ipynb", "--out", "out");
    const ran = readFileSync(join(folder, "out/one.ipynb"), "utf8");
    expect(ran).toContain("11.33");
    expect(existsSync(join(folder, "out/one.html"))).toBe(true);
  });
});
