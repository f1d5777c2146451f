import { JSDOM } from "jsdom";
import { afterEach, describe, expect, test } from "vitest";
import { feed } from "../../src/balance/feed";
import { component } from "../../src/components/componentTable";
import { displayUnits } from "../../kernel/displayUnits";
import { represent, representAsText } from "../../kernel/display/represent";
import { tableHtml } from "../../kernel/display/tableHtml";
import { tableText } from "../../kernel/display/tableText";
import type { ResultTable } from "../../src/study/resultTable";

const table: ResultTable = {
  title: 'fenske <"&',
  cautions: [
    { code: "azeotrope", severity: "stop", kind: "method", message: "an azeotrope <x>", source: "Gmehling" },
    { code: "vapor-pressure-extrapolated", severity: "note", kind: "data", message: "extrapolated" },
  ],
  sections: [
    {
      columns: ["quantity", "value"],
      rows: [
        ["stages", "8.1"],
        ["reflux", "12"],
      ],
      numeric: [false, true],
    },
    { heading: "streams", columns: ["component", "x"], rows: [["benzene", "0.4"]], numeric: [false, true] },
  ],
  methods: [{ name: "Fenske", source: "Ind. Eng. Chem. 24 (1932) 482" }],
};

afterEach(() => displayUnits("metric"));

describe("a table as HTML", () => {
  const { document } = new JSDOM(tableHtml(table)).window;
  const texts = (selector: string) =>
    [...document.querySelectorAll(selector)].map((each) => each.textContent);

  test("puts cautions first with the severity in words, methods last", () => {
    expect(texts(".rb-cautions li")).toEqual(["stopan azeotrope <x> (Gmehling)", "noteextrapolated"]);
    const order = [...document.querySelectorAll("ul.rb-cautions, table, details")].map(
      (each) => each.tagName,
    );
    expect(order).toEqual(["UL", "TABLE", "TABLE", "DETAILS"]);
    expect(texts("details li")).toEqual(["Fenske: Ind. Eng. Chem. 24 (1932) 482"]);
  });

  test("says what every table and cell is", () => {
    expect(texts("caption")).toEqual(['fenske <"&', "streams"]);
    expect(texts('thead th[scope="col"]')).toEqual(["quantity", "value", "component", "x"]);
    expect(texts('tbody th[scope="row"]')).toEqual(["stages", "reflux", "benzene"]);
    expect(texts("tbody td.rb-number")).toEqual(["8.1", "12", "0.4"]);
  });

  test("colors follow the page: no color is fixed for plain ink", () => {
    const style = document.querySelector("style")!.textContent;
    expect(style).toContain("color:var(--jp-content-font-color1,inherit)");
  });
});

test("a table as text is aligned", () => {
  expect(tableText(table)).toBe(
    [
      'fenske <"&',
      "STOP: an azeotrope <x>",
      "NOTE: extrapolated",
      "",
      "quantity  value",
      "stages      8.1",
      "reflux       12",
      "",
      "streams",
      "component    x",
      "benzene    0.4",
      "",
      "methods and sources:",
      "  Fenske: Ind. Eng. Chem. 24 (1932) 482",
    ].join("\n"),
  );
});

describe("what a value shows", () => {
  const given = feed({ name: "base", flow: "100 kmol/h", composition: { benzene: 0.4, toluene: 0.6 }, q: 1 });

  test.each([
    ["a result", given, "feed: base"],
    ["a component", component("toluene"), "toluene"],
    ["a list of results", [given, { ...given, name: "other" }], "feed: other"],
  ])("%s: a table", (_, value, words) => {
    const bundle = represent(value);
    expect(bundle["text/html"]).toContain('<table class="rb-table">');
    expect(bundle["text/plain"]).toContain(words);
  });

  test("many results: the first twenty", () => {
    const text = representAsText(Array.from({ length: 23 }, () => given));
    expect(text.match(/feed: base/g)).toHaveLength(20);
    expect(text).toContain("... and 3 more");
  });

  test.each([
    [3, "3"],
    ["text", "'text'"],
    [{ kind: "other", value: [1, 2] }, "{ kind: 'other', value: [ 1, 2 ] }"],
    [[], "[]"],
    [new Float64Array([1]), "Float64Array(1) [ 1 ]"],
    [true, "true"],
  ])("%j: its structure", (value, text) => {
    expect(represent(value)).toEqual({ "text/plain": text });
  });

  test("units are those of the notebook", () => {
    expect(representAsText(given)).toMatch(/molar flow\s+100\s+kmol\/h/);
    displayUnits("SI");
    expect(representAsText(given)).toMatch(/molar flow\s+27\.78\s+mol\/s/);
    displayUnits("US");
    expect(representAsText(given)).toMatch(/molar flow\s+220\.5\s+lbmol\/h/);
  });

  test.each(["feet", undefined, null, 3, {}])("units %j are refused", (system) => {
    expect(() => displayUnits(system as "SI")).toThrow(/system must be one of "metric", "SI", "US"/);
  });
});
