import { describe, expect, test } from "vitest";
import { feed } from "../../src/balance/feed";
import { DesignInputError, type Issue } from "../../src/base/errors";
import { readStream } from "../../kernel/readStream";
import { temporaryFolder, written } from "./files";

const folder = temporaryFolder();

function read(text: string, name = "feed.csv") {
  return readStream(written(folder, name, text));
}

function issuesOf(text: unknown, name = "feed.csv"): readonly Issue[] {
  try {
    if (typeof text === "string") read(text, name);
    else readStream(text as string);
  } catch (error) {
    if (error instanceof DesignInputError) return error.issues;
    throw error;
  }
  return [];
}

/** Line and column with which a message begins. */
function placesOf(issues: readonly Issue[]): (string | undefined)[] {
  return issues.map(({ message }) => /feed\.\w+:(\d+:\d+): /.exec(message)?.[1]);
}

const amounts = { benzene: "1450 kg/h", toluene: "8900 kg/h" } as const;
const base = feed({ name: "base", componentFlows: amounts, temperature: "95 degC", pressure: "2.0 bar" });

describe("a stream file says what feed is told", () => {
  test.each([
    ["remarks above", "# name: base\n# temperature: 95 degC\n# pressure: 2.0 bar\n", ","],
    [
      "remarks with other case and a comment",
      "# a free remark\n# Name: base\n# Temperature: 95 degC\n#pressure:2.0 bar\n\n",
      ",",
    ],
    ["semicolons", "# name: base\n# temperature: 95 degC\n# pressure: 2.0 bar\n# note: any: thing\n", ";"],
    ["tabs", "# name: base\r\n# temperature: 95 degC\r\n# pressure: 2.0 bar\r\n", "\t"],
  ])("CSV: %s", (_, remarks, mark) => {
    const rows = [
      ["component", "mass flow [kg/h]"],
      ["benzene", "1450"],
      ['"toluene"', "8900"],
    ];
    expect(read(`\uFEFF${remarks}${rows.map((row) => row.join(mark)).join("\n")}\n`)).toEqual(base);
  });

  test("a cell may bring its own unit", () => {
    const text = "# q: 1\ncomponent,mass flow [kg/h]\nbenzene,1450\ntoluene,8.9 t/h\n";
    expect(read(text)).toEqual(feed({ componentFlows: amounts, q: 1 }));
  });

  test.each([
    ["mole fraction", "0.4", "0.6", "# flow: 120 kmol/h", { flow: "120 kmol/h" }],
    ["mass fraction [wt%]", "40", "60", "# flow: 14 t/h", { massFlow: "14 t/h", basis: "mass" }],
    ["mass fraction", "0.4", "0.6", "# mass flow: 14 t/h", { massFlow: "14 t/h", basis: "mass" }],
    ["mole fraction [mol%]", "40", "60", "# flow: 33", { flow: 33 }],
  ] as const)("CSV: %s", (heading, benzene, toluene, flow, given) => {
    const text = `${flow}\n# q: 1\ncomponent,${heading}\nbenzene,${benzene}\ntoluene,${toluene}\n`;
    expect(read(text).composition["benzene"]).toBeCloseTo(
      feed({ ...given, composition: { benzene: 0.4, toluene: 0.6 }, q: 1 }).composition["benzene"]!,
      12,
    );
  });

  test("fractions that do not add up are scaled when asked", () => {
    const text = "# flow: 100 kmol/h\n# normalize: yes\ncomponent,mole fraction\nbenzene,2\ntoluene,3\n";
    expect(read(text).composition["benzene"]).toBeCloseTo(0.4, 12);
  });

  test("JSON: the fields of feed", () => {
    const fields = {
      name: "base",
      note: "for people",
      componentFlows: amounts,
      temperature: "95 degC",
      pressure: "2 bar",
    };
    expect(read(JSON.stringify(fields), "feed.json")).toEqual(base);
  });
});

describe("all faults of a stream file, with their places", () => {
  test("CSV", () => {
    const text =
      "# name: x\n# temprature: 95 degC\n# q: 1\ncomponent,mass flow [kg/h]\nbenzine,12\ntoluene,abc\ntoluene,13\nxylene\n";
    const issues = issuesOf(text);
    expect(issues.map(({ code }) => code)).toEqual([
      "unknown-field",
      "unknown-component",
      "duplicate-component",
      "file-format",
    ]);
    expect(placesOf(issues)).toEqual(["2:15", "5:9", "7:1", "8:1"]);
    expect(issues[0]!.message).toContain('Did you mean "temperature"?');
  });

  test("CSV: a value that is none", () => {
    const issues = issuesOf("# q: x\ncomponent,mass flow [kg/h]\nbenzene,abc\n");
    expect(issues.map(({ code }) => code)).toEqual(["wrong-type", "wrong-type"]);
    expect(placesOf(issues)).toEqual(["1:6", "3:9"]);
    expect(issues.map(({ path }) => path)).toEqual(["q", "componentFlows.benzene"]);
  });

  test("JSON", () => {
    const text =
      '{\n  "massFlow": "12.3 t",\n  "composition": { "benzene": 0.4,\n    "tolune": 0.6 },\n  "q": 1\n}';
    const issues = issuesOf(text, "feed.json");
    expect(placesOf(issues)).toEqual(["2:15", "4:15"]);
    expect(issues[1]!.code).toBe("unknown-component");
  });

  test.each([
    ["", "1:1"],
    ["component,mass flow [kg/h]\n", "1:1"],
    ["component\nbenzene\n", "1:1"],
    ["component,mass flow [kmol/h]\nbenzene,1\n", "1:11"],
    ["component,mass flow\nbenzene,1\n", "1:11"],
    ["component,mole fraction [kg/h]\nbenzene,1\n", "1:11"],
    ["component,amount\nbenzene,1\n", "1:11"],
    ["# q: 1\n# q: 1\ncomponent,mass flow [kg/h]\nbenzene,1\n", "2:6"],
    ["component,mass flow [kg/h]\nbenzene,\n", "2:1"],
  ])("CSV: %j", (text, place) => {
    expect(placesOf(issuesOf(text))).toContain(place);
  });

  test.each([
    ["{", "1:2"],
    ['{"q": 1,}', "1:9"],
    ['{"q": 01}', "1:7"],
    ['{"q": 1, "q": 1}', "1:10"],
    ['{"q": 1} x', "1:10"],
    ['{"name": "\\q"}', "1:10"],
    ["[1]", "1:1"],
    ["3", "1:1"],
    [`${"[".repeat(100)}`, "1:52"],
  ])("JSON: %s", (text, place) => {
    expect(placesOf(issuesOf(text, "feed.json"))).toEqual([place]);
  });

  test.each([undefined, null, 3, "", {}, "nowhere.csv", folder])("path %j", (path) => {
    const [issue] = (() => {
      try {
        readStream(path as string);
        return [];
      } catch (error) {
        return (error as DesignInputError).issues;
      }
    })();
    expect(issue!.path).toBe("path");
    expect(["wrong-type", "file-not-readable"]).toContain(issue!.code);
  });
});
