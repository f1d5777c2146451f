import { describe, expect, test } from "vitest";
import { formatNumber } from "../../src/base/displayUnits";
import { mccabeThiele } from "../../src/column/mccabeThiele";
import { shortcutDesign } from "../../src/column/shortcutDesign";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { resultTable } from "../../src/study/resultTable";

const boiling = bubblePoint({ composition: { benzene: 0.4, toluene: 0.6 }, pressure: "1 atm" });
const rows = (table: ReturnType<typeof resultTable>): string[][] =>
  table.sections.flatMap((each) => each.rows.map((row) => [...row]));

const kelvin = boiling.temperature;

describe("units of the tables", () => {
  test.each([
    ["SI", kelvin, "K", "101325", "Pa"],
    ["metric", kelvin - 273.15, "degC", "1.013", "bar abs"],
    ["US", kelvin * 1.8 - 459.67, "degF", "14.70", "psi abs"],
  ] as const)("%s", (units, temperature, degrees, pressure, unit) => {
    const table = rows(resultTable(boiling, units));
    expect(table).toContainEqual(["temperature", formatNumber(temperature), degrees]);
    expect(table).toContainEqual(["pressure", pressure, unit]);
  });
});

test("values by component stand side by side, a component a row", () => {
  const section = resultTable(boiling, "metric").sections.find(({ columns }) => columns[0] === "component")!;
  expect(section.columns).toEqual(["component", "liquid x", "vapor y", "K = y/x"]);
  expect(section.rows[0]!.slice(0, 2)).toEqual(["benzene", "0.4000"]);
});

test("flows per mole of feed are not given a unit of flow; flows in mol/s are", () => {
  const column = {
    relativeVolatility: 2.5,
    distillateLightFraction: 0.95,
    bottomsLightFraction: 0.05,
    refluxRatio: 2,
  };
  const perMole = rows(
    resultTable(mccabeThiele({ ...column, feed: { lightFraction: 0.5, q: 1 } }), "metric"),
  );
  expect(perMole).toContainEqual(["distillate", "0.5000", "mol/mol feed"]);
  const flowing = mccabeThiele({ ...column, feed: { lightFraction: 0.5, q: 1, flow: "120 kmol/h" } });
  expect(rows(resultTable(flowing, "metric"))).toContainEqual(["distillate", "60.00", "kmol/h"]);
});

test("a design as a table: cautions apart, sections with headings, every method with its source", () => {
  const design = shortcutDesign({
    feed: { flow: 100, composition: { a: 0.1, b: 0.25, c: 0.3, d: 0.2, e: 0.15 }, q: 0.5 },
    relativeVolatility: { a: 5, b: 3, c: 2.2, d: 1.5, e: 1 },
    lightKey: "b",
    heavyKey: "d",
    lightKeyRecovery: 0.97,
    heavyKeyRecovery: 0.96,
    refluxOverMinimum: 1.1,
  });
  const table = resultTable(design, "metric");
  expect(table.cautions).toEqual(design.cautions);
  expect(table.methods.every(({ source }) => source.length > 10)).toBe(true);
  expect(table.sections.map(({ heading }) => heading)).toEqual(
    expect.arrayContaining(["distillate", "bottoms", "relative volatility"]),
  );
  const numbers = rows(table).flat().join(" ");
  expect(numbers).not.toMatch(/NaN|undefined|\[object/);
});

test("a result read back from JSON makes the same table", () => {
  const again = JSON.parse(JSON.stringify(boiling)) as typeof boiling;
  expect(resultTable(again, "US")).toEqual(resultTable(boiling, "US"));
});

test("long lists keep their two ends", () => {
  const many = mccabeThiele({
    relativeVolatility: 1.1,
    feed: { lightFraction: 0.5, q: 1 },
    distillateLightFraction: 0.99,
    bottomsLightFraction: 0.01,
    refluxOverMinimum: 1.2,
  });
  const stages = resultTable(many, "metric").sections.find(({ columns }) => columns[0] === "stage")!;
  expect(many.stagesWhole).toBeGreaterThan(60);
  expect(stages.rows).toHaveLength(61);
  expect(stages.rows[60]![0]).toBe(String(many.stagesWhole));
});
