// What a user's program may and may not write. Compiled against the built declarations, never run.
import * as rb from "refluxbook";

const feed = {
  flow: "120 kmol/h",
  composition: { benzene: 0.4, toluene: 0.35, ethylbenzene: 0.25 },
  q: 1,
} as const;

const design = rb.shortcutDesign({
  feed,
  lightKey: "benzene",
  heavyKey: "toluene",
  lightKeyRecovery: 0.99,
  heavyKeyRecovery: 0.98,
  pressure: "1.3 bar",
  refluxOverMinimum: 1.3,
});
export const numbers: number[] = [
  design.stages,
  design.minimumReflux,
  design.relativeVolatility.mean["benzene"] ?? 0,
];
export const high: number | null = design.stagesRange[1];

for (const caution of design.cautions) {
  const severity: "note" | "check" | "stop" = caution.severity;
  numbers.push(severity === "stop" ? 1 : 0);
}
// @ts-expect-error results are read-only
design.stages = 3;

const staircase = rb.mccabeThiele({
  relativeVolatility: 2.5,
  feed: { lightFraction: 0.5, q: 1 },
  distillateLightFraction: 0.95,
  bottomsLightFraction: 0.05,
  refluxRatio: 2,
});
numbers.push(...staircase.steps.map((step) => step.x));

rb.vaporPressure({ component: "benzene", temperature: "80 degC" });
rb.vaporPressure({ component: "benzene", temperature: 353.15 });
// @ts-expect-error a misspelt unit
rb.vaporPressure({ component: "benzene", temperature: "80 degX" });
// @ts-expect-error a unit of another dimension
rb.boilingTemperature({ component: "benzene", pressure: "80 degC" });
// @ts-expect-error a misspelt field
rb.boilingTemperature({ component: "benzene", pressures: "1 bar" });

rb.bubblePoint({ composition: feed.composition, pressure: "1.5 bar" });
rb.flash({ composition: feed.composition, temperature: "95 degC", pressure: "25 psig" });
rb.relativeVolatility({ composition: feed.composition, heavyKey: "toluene", pressure: 130000 });

const split = {
  composition: { a: 0.5, b: 0.5 },
  relativeVolatility: { a: 2.25, b: 1 },
  lightKey: "a",
  heavyKey: "b",
  lightKeyRecovery: 0.99,
  heavyKeyRecovery: 0.99,
};
const { minimumReflux } = rb.underwood({ ...split, q: 1 });
const { minimumStages } = rb.fenske(split);
rb.gilliland({ minimumStages, minimumReflux, refluxRatio: 2, correlation: "eduljee" });
// @ts-expect-error a misspelt correlation
rb.gilliland({ minimumStages, minimumReflux, refluxRatio: 2, correlation: "eduljea" });

rb.shortcutDesign({
  feed,
  lightKey: "benzene",
  heavyKey: "toluene",
  lightKeyRecovery: 0.99,
  heavyKeyRecovery: 0.98,
  pressure: "1.3 bar",
  refluxOverMinimum: 1.3,
  // @ts-expect-error a misspelt option
  condensor: "partial",
});

try {
  rb.fenske(split);
} catch (error) {
  if (error instanceof rb.DesignInputError) {
    const code: rb.IssueCode = error.issues[0]!.code;
    numbers.push(code.length);
  }
}
