import { expect, test } from "vitest";
import { toDisplay } from "../../src/base/displayUnits";
import { volatilityOverTemperature } from "../../src/equilibrium/volatilityCurve";
import type { Figure } from "../../src/plots/figure";
import { equilibriumDiagram } from "../../src/plots/equilibriumDiagram";
import { gillilandDiagram } from "../../src/plots/gillilandDiagram";
import { stagesAgainstReflux } from "../../src/plots/stagesAgainstReflux";
import { temperatureCompositionDiagram } from "../../src/plots/temperatureCompositionDiagram";
import { volatilityDiagram } from "../../src/plots/volatilityDiagram";
import { gilliland } from "../../src/shortcut/gilliland";
import type { Layout } from "./figures.test";
import { design, equilibrium, volatility } from "./results";

const trace = (figure: Figure, name: string) =>
  figure.data.find((each) => each["name"] === name) as { x: number[]; y: number[] } | undefined;
const texts = (figure: Figure): string =>
  (figure.layout as unknown as Layout).annotations.map(({ text }) => text).join("\n");
const layout = (figure: Figure): Layout => figure.layout as unknown as Layout;

test("equilibriumDiagram: both curves of the result, the volatilities at both ends and in the mean", () => {
  const result = equilibrium();
  const figure = equilibriumDiagram({
    ...result,
    relativeVolatility: { atLightEnd: 3.1, atHeavyEnd: 2.2, mean: 2.612 },
  });
  const { liquid, vapor, vaporAtMeanVolatility } = result.curve;
  expect(trace(figure, "Raoult's law")).toMatchObject({ x: liquid, y: vapor });
  expect(trace(figure, "mean relative volatility")).toMatchObject({ x: liquid, y: vaporAtMeanVolatility });
  expect(texts(figure)).toContain("relative volatility 2.612 in the mean");
  expect(texts(figure)).toContain("3.100 in pure benzene<br>2.200 in pure toluene");
  expect(layout(equilibriumDiagram(result, { units: "US" })).title.text).toContain("14.70 psi abs");
});

test.each([
  ["metric", "degC", "bar abs"],
  ["SI", "K", "Pa"],
  ["US", "degF", "psi abs"],
] as const)("temperatureCompositionDiagram in %s units: %s, %s", (units, unit, pressureUnit) => {
  const result = equilibrium();
  const figure = temperatureCompositionDiagram(result, { units });
  const temperature = result.curve.temperature.map((kelvin) => toDisplay(kelvin, "temperature", units));
  expect(trace(figure, "boiling line, liquid x")).toMatchObject({ x: result.curve.liquid, y: temperature });
  expect(trace(figure, "dew line, vapor y")).toMatchObject({ x: result.curve.vapor, y: temperature });
  const boils = toDisplay(result.boilingTemperature.heavy, "temperature", units).toFixed(1);
  expect(texts(figure)).toContain(`toluene boils at ${boils} ${unit}`);
  expect(layout(figure).yaxis.title.text).toBe(`temperature [${unit}]`);
  expect(layout(figure).title.text).toContain(` ${pressureUnit}<`);
});

test("stagesAgainstReflux: the curve, both limits, the point and the range of the design", () => {
  const result = { ...design(), minimumStages: 11.11, stages: 33.3, stagesRange: [30, 36.6] } as const;
  const figure = stagesAgainstReflux(result);
  const { refluxRatio, stages } = result.curves.stagesAgainstReflux;
  expect(trace(figure, "Gilliland's correlation")).toMatchObject({ x: refluxRatio, y: stages });
  expect(trace(figure, "minimum stages")!.y).toEqual([11.11, 11.11]);
  expect(trace(figure, "minimum reflux")!.x).toEqual([result.minimumReflux, result.minimumReflux]);
  expect(trace(figure, "this design")).toMatchObject({ x: [result.refluxRatio], y: [33.3] });
  expect(trace(figure, "range of the estimates")!.y).toEqual([30, 36.6]);
  expect(texts(figure)).toContain("33.3 stages at reflux ratio 2.682");
  expect(texts(figure)).toContain("1.200 × the minimum reflux<br>range of the estimates: 30.0 to 36.6");
  expect(texts(figure)).toContain("minimum stages 11.1, at total reflux");
  const { xaxis, yaxis } = layout(figure);
  expect(xaxis.range[0]).toBeLessThan(result.minimumReflux);
  expect(yaxis.range[1]).toBeGreaterThan(36.6);
  const open = stagesAgainstReflux({ ...result, stagesRange: [30, null] });
  expect(texts(open)).toContain("30.0 upward, not bounded");
  expect(trace(open, "range, open above")!.y[1]).toBeLessThanOrEqual(layout(open).yaxis.range[1]);
});

test("gillilandDiagram: the curve and point of a design, or of gilliland itself", () => {
  const result = design();
  const { x, y, point } = result.curves.gilliland;
  const figure = gillilandDiagram(result);
  expect(trace(figure, "form of Molokanov")).toMatchObject({ x, y });
  expect(trace(figure, "operating point")).toMatchObject({ x: [point[0]], y: [point[1]] });
  const alone = gilliland({ minimumStages: 8, minimumReflux: 1, refluxRatio: 1.5, correlation: "eduljee" });
  const drawn = gillilandDiagram({ ...alone, refluxCoordinate: 0.222, stagesCoordinate: 0.444 });
  expect(trace(drawn, "form of Eduljee")).toMatchObject(alone.curve);
  expect(trace(drawn, "operating point")).toMatchObject({ x: [0.222], y: [0.444] });
  expect(texts(drawn)).toContain("X 0.222, Y 0.444");
});

test("volatilityDiagram: a line a component, named with its last value, in the units asked for", () => {
  const result = volatility();
  const figure = volatilityDiagram(result, { units: "US" });
  const temperature = result.curve.temperature.map((kelvin) => toDisplay(kelvin, "temperature", "US"));
  for (const [name, values] of Object.entries(result.curve.relativeVolatility)) {
    expect(trace(figure, name)).toMatchObject({ x: temperature, y: values });
    expect(texts(figure)).toContain(`${name} ${values.at(-1)!.toPrecision(3)}`);
  }
  expect(texts(figure)).toContain("bubble to dew point");
  expect(layout(figure).xaxis.title.text).toBe("temperature [degF]");
  expect(layout(figure).yaxis.title.text).toBe("relative volatility, toluene = 1 [-]");
});

test("volatilityDiagram of K-values needs a pressure", () => {
  const { curve } = volatility();
  expect(trace(volatilityDiagram(volatility(), { values: "kValues" }), "benzene")!.y).toEqual(
    curve.kValues["benzene"],
  );
  const bare = volatilityOverTemperature({
    components: ["benzene", "toluene"],
    heavyKey: "toluene",
    temperatureRange: [350, 380],
  });
  expect(() => volatilityDiagram(bare, { values: "kValues" })).toThrow(/without a pressure/);
});
