import * as rb from "../../kernel/index";

/**
 * Calls that are answered, by function: each row is the list of arguments. test/project/anyInput.test.ts starts from
 * them to make wrong ones, and fails when an exported function has no row here.
 */
export const validInputs: Readonly<Record<string, () => readonly (readonly unknown[])[]>> = {
  component: () => [["benzene"], ["71-43-2"]],
  findComponents: () => [["xyl"]],
  defineComponent: () => [[ownComponent], [{ ...ownComponent, vaporPressure: wagner }]],
  vaporPressure: () => [[{ component: "benzene", temperature: "80 degC" }]],
  boilingTemperature: () => [[{ component: "toluene", pressure: 101325 }]],
  bubblePoint: () => [
    [{ composition: aromatics, pressure: "1.5 bar" }],
    [{ composition: aromatics, temperature: 370 }],
  ],
  dewPoint: () => [
    [{ composition: aromatics, pressure: "20 psig" }],
    [{ composition: aromatics, temperature: "100 degC" }],
  ],
  flash: () => [
    [{ composition: aromatics, temperature: "95 degC", pressure: 1e5 }],
    [{ composition: aromatics, vaporFraction: 0.4, pressure: 1e5 }],
    [{ composition: aromatics, vaporFraction: 0.4, temperature: 380 }],
  ],
  rachfordRice: () => [[{ composition: { a: 0.5, b: 0.3, c: 0.2 }, kValues: { a: 2, b: 1.1, c: 0.3 } }]],
  relativeVolatility: () => [
    [{ composition: aromatics, heavyKey: "toluene", pressure: "1.3 bar" }],
    [{ composition: aromatics, heavyKey: "toluene", temperature: 380 }],
  ],
  bubblePointSweep: () => [
    [
      {
        components: ["benzene", "toluene"],
        composition: Float64Array.of(0.4, 0.6, 0.5, 0.5),
        pressure: Float64Array.of(101325, 2e5),
      },
    ],
  ],
  mccabeThiele: () => [
    [{ ...staircase, feed: { lightFraction: 0.5, q: 1 } }],
    [
      {
        ...staircase,
        relativeVolatility: undefined,
        equilibriumCurve: {
          points: [
            [0, 0],
            [0.2, 0.4],
            [0.5, 0.72],
            [0.8, 0.91],
            [1, 1],
          ],
          interpolation: "monotone",
        },
        feed: { lightFraction: 0.45, q: 0.5, flow: "100 kmol/h" },
        condenser: "partial",
        murphreeVaporEfficiency: 0.7,
      },
    ],
    [
      {
        ...staircase,
        relativeVolatility: undefined,
        pair,
        pressure: "1 atm",
        feed: { lightFraction: 0.5, q: 1 },
      },
    ],
  ],
  smoker: () => [
    [
      {
        relativeVolatility: 1.3,
        feed: { lightFraction: 0.5, q: 1 },
        distillateLightFraction: 0.95,
        bottomsLightFraction: 0.05,
        refluxRatio: 10,
      },
    ],
  ],
  feed: () => [
    [{ massFlow: "9.2 t/h", composition: aromatics, basis: "mass", q: 1 }],
    [
      {
        componentFlows: { benzene: "40 kmol/h", toluene: "5 t/h" },
        temperature: "95 degC",
        pressure: "1.3 bar",
      },
    ],
    [{ flow: 30, composition: aromatics, vaporFraction: 0.4, pressure: 1e5, name: "base" }],
  ],
  feedThermalCondition: () => [
    [{ feed: { flow: 1, composition: aromatics, vaporFraction: 0.4, pressure: "1 atm" }, pressure: "1 atm" }],
    [{ feed: { flow: 1, composition: aromatics, temperature: "60 degC", pressure: "3 bar" }, pressure: 1e5 }],
  ],
  fenske: () => [[split]],
  underwood: () => [[{ ...split, q: 1 }], [{ ...split, q: 0.4 }]],
  gilliland: () => [
    [{ minimumStages: 8, minimumReflux: 1, refluxRatio: 1.5 }],
    [{ minimumStages: 8, minimumReflux: 1, stages: 16, correlation: "eduljee" }],
  ],
  kirkbride: () => [
    [
      {
        composition: { a: 0.3, b: 0.4, c: 0.3 },
        lightKey: "a",
        heavyKey: "b",
        distillate: { a: 0.95, b: 0.05, c: 0 },
        bottoms: { a: 0.01, b: 0.55, c: 0.44 },
        distillateFlow: 30,
        bottomsFlow: 70,
        stages: 20,
      },
    ],
  ],
  shortcutDesign: () => [[design], [{ ...designWithVolatility, refluxRatio: 3 }], [designAtTemperature]],
  binaryEquilibrium: () => [[{ pair, pressure: "1 atm" }]],
  volatilityOverTemperature: () => [
    [{ composition: aromatics, heavyKey: "toluene", pressure: "1.3 bar" }],
    [{ components: ["benzene", "toluene"], heavyKey: "toluene", temperatureRange: [330, "120 degC"] }],
  ],
  mccabeThieleDiagram: () => [[rb.mccabeThiele({ ...staircase, feed: { lightFraction: 0.5, q: 1 } })]],
  equilibriumDiagram: () => [[rb.binaryEquilibrium({ pair, pressure: "1 atm" })]],
  temperatureCompositionDiagram: () => [[rb.binaryEquilibrium({ pair, pressure: "1 atm" })]],
  stagesAgainstReflux: () => [[rb.shortcutDesign(design as never)]],
  gillilandDiagram: () => [[rb.shortcutDesign(design as never)]],
  volatilityDiagram: () => [
    [rb.volatilityOverTemperature({ composition: aromatics, heavyKey: "toluene", pressure: "1.3 bar" })],
  ],
  readStream: () => [["notebooks/feeds/mixed-aromatics.csv"]],
  readCases: () => [["test/data/cases.csv"]],
  displayUnits: () => [["US"], ["metric"]],
  show: () => [[rb.gilliland({ minimumStages: 8, minimumReflux: 1, refluxRatio: 1.5 })], ["text"]],
  resultTable: () => [
    [rb.gilliland({ minimumStages: 8, minimumReflux: 1, refluxRatio: 1.5 }), "metric"],
    [rb.shortcutDesign(design as never), "US"],
  ],
};

const aromatics = { benzene: 0.4, toluene: 0.35, ethylbenzene: 0.25 };

const pair = { light: "benzene", heavy: "toluene" };

const ownComponent = {
  name: "solvent",
  molarMass: 0.1,
  vaporPressure: {
    form: "antoine",
    A: 9.1,
    B: 1300,
    C: -50,
    logBase: 10,
    temperatureUnit: "K",
    pressureUnit: "Pa",
    range: [280, 420],
    source: "invented",
  },
};

const wagner = {
  form: "wagner25",
  coefficients: [-7, 1.5, -2, -3],
  criticalTemperature: 560,
  criticalPressure: 4.9e6,
  range: [280, 560],
  source: "invented",
};

const staircase = {
  relativeVolatility: 2.5,
  distillateLightFraction: 0.95,
  bottomsLightFraction: 0.05,
  refluxRatio: 2,
};

const split = {
  composition: { a: 0.2, b: 0.3, c: 0.1, d: 0.4 },
  relativeVolatility: { a: 5, b: 2.5, c: 1.6, d: 1 },
  lightKey: "b",
  heavyKey: "d",
  lightKeyRecovery: 0.99,
  heavyKeyRecovery: 0.98,
};

const keys = {
  lightKey: "benzene",
  heavyKey: "toluene",
  lightKeyRecovery: 0.99,
  heavyKeyRecovery: 0.98,
};

const design = {
  ...keys,
  feed: { flow: "120 kmol/h", composition: aromatics, q: 1 },
  pressure: "1.3 bar",
  refluxOverMinimum: 1.3,
};

const designWithVolatility = {
  ...keys,
  feed: { flow: 30, composition: aromatics, q: 0.5 },
  relativeVolatility: { benzene: 5, toluene: 2.2, ethylbenzene: 1 },
  condenser: "partial",
};

const designAtTemperature = {
  ...keys,
  feed: {
    massFlow: "10 t/h",
    composition: aromatics,
    basis: "mass",
    temperature: "60 degC",
    pressure: "3 bar",
  },
  pressure: 2e5,
  refluxOverMinimum: 1.2,
};
