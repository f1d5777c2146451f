import { describe, expect, test } from "vitest";
import { feed } from "../../src/balance/feed";
import type { DesignInputError, Issue } from "../../src/base/errors";
import { readCases } from "../../kernel/readCases";
import { temporaryFolder, written } from "./files";

const folder = temporaryFolder();

function read(text: string, name = "cases.csv") {
  return readCases(written(folder, name, text));
}

function issuesOf(text: string, name?: string): readonly Issue[] {
  try {
    read(text, name);
    return [];
  } catch (error) {
    return (error as DesignInputError).issues;
  }
}

const base = feed({
  name: "base",
  componentFlows: { benzene: "1450 kg/h", toluene: "8900 kg/h" },
  temperature: "95 degC",
  pressure: "2 bar",
});

describe("a file of cases", () => {
  test("has a row for each feed", () => {
    const cases = read(
      "case,benzene [kg/h],toluene [kg/h],temperature [degC],pressure [bar]\nbase,1450,8900,95,2\nhot,1450,8900,102,2\n",
    );
    expect(cases).toHaveLength(2);
    expect(cases[0]).toEqual(base);
    expect(cases[1]!.temperature).toBeCloseTo(375.15, 10);
  });

  test("remarks hold for all cases, an empty cell leaves a component out", () => {
    const cases = read("# q: 1\ncase;benzene [mol%];toluene [mol%];flow [kmol/h]\na;40;60;100\nb;;100;50\n");
    expect(cases.map(({ q }) => q)).toEqual([1, 1]);
    expect(cases[0]!.composition["benzene"]).toBeCloseTo(0.4, 12);
    expect(cases[1]!.composition).toEqual({ toluene: 1 });
  });

  test("by mass", () => {
    const [first] = read("case,benzene [wt%],toluene [wt%],flow [t/h],q\na,40,60,9.2,1\n");
    expect(first!.massFlow! * 3.6).toBeCloseTo(9.2, 9);
    expect(first!.massComposition!["benzene"]).toBeCloseTo(0.4, 12);
  });

  test("as a JSON list", () => {
    const cases = read('[{"componentFlows": {"benzene": "1 kmol/h"}, "q": 1}]', "cases.json");
    expect(cases.map(({ name }) => name)).toEqual(["case 1"]);
  });
});

describe("faults of a file of cases", () => {
  test("are all told, with the case and the place", () => {
    const issues = issuesOf(
      "case,benzene [mol%],toluene [mol%],flow [kmol/h],q\na,40,60,100,1\nb,30,60,100,x\n",
    );
    expect(issues.map(({ path }) => path)).toEqual(["cases[1].composition", "cases[1].q"]);
    expect(issues[1]!.message).toMatch(/cases\.csv:3:13: q must be a number/);
  });

  test.each([
    ["case,benzene,q\na,1,1\n", "unknown-unit"],
    ["case,benzene [%],q\na,1,1\n", "unknown-unit"],
    ["case,benzene [kg/h],toluene [mol%],q\na,1,1,1\n", "conflicting-fields"],
    ["case,benzene [kg/h],benzene [kg/h],q\na,1,1,1\n", "duplicate-component"],
    ["case,benzene [kg/h],q\na,1,1\na,2,1\n", "file-format"],
    ["case,benzene [kg/h],q\n,1,1\n", "file-format"],
    ["case,benzene [kg/h],q\na,1\n", "file-format"],
    ["case,q\na,1\n", "missing-field"],
    ["", "file-format"],
  ])("%j", (text, code) => {
    expect(issuesOf(text).map((issue) => issue.code)).toContain(code);
  });

  test.each([
    ["{}", "file-format"],
    ["[3]", "file-format"],
    ['[{"q": 1}]', "missing-field"],
  ])("JSON %s", (text, code) => {
    expect(issuesOf(text, "cases.json").map((issue) => issue.code)).toContain(code);
  });
});
