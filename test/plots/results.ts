import { mccabeThiele } from "../../src/column/mccabeThiele";
import { shortcutDesign } from "../../src/column/shortcutDesign";
import { binaryEquilibrium } from "../../src/equilibrium/binaryEquilibrium";
import { volatilityOverTemperature } from "../../src/equilibrium/volatilityCurve";
import type { Figure } from "../../src/plots/figure";
import { equilibriumDiagram } from "../../src/plots/equilibriumDiagram";
import { gillilandDiagram } from "../../src/plots/gillilandDiagram";
import { mccabeThieleDiagram } from "../../src/plots/mccabeThieleDiagram";
import { stagesAgainstReflux } from "../../src/plots/stagesAgainstReflux";
import { temperatureCompositionDiagram } from "../../src/plots/temperatureCompositionDiagram";
import { volatilityDiagram } from "../../src/plots/volatilityDiagram";
import { gilliland } from "../../src/shortcut/gilliland";

type Staircase = Parameters<typeof mccabeThiele>[0];
type Design = Parameters<typeof shortcutDesign>[0];

/** A staircase of eleven stages, or what `more` makes of it. */
export function staircase(more: Partial<Staircase> = {}) {
  const plain = { relativeVolatility: 2.5, feed: { lightFraction: 0.5, q: 1 }, refluxRatio: 1.8 };
  return mccabeThiele({
    ...plain,
    distillateLightFraction: 0.95,
    bottomsLightFraction: 0.05,
    ...more,
  });
}

/** A design on given volatilities, or what `more` makes of it. */
export function design(more: Partial<Design> = {}) {
  return shortcutDesign({
    feed: { flow: 100, composition: { a: 0.3, b: 0.3, c: 0.4 }, q: 1 },
    relativeVolatility: { a: 4, b: 2, c: 1 },
    lightKey: "a",
    heavyKey: "b",
    lightKeyRecovery: 0.99,
    heavyKeyRecovery: 0.99,
    refluxOverMinimum: 1.2,
    ...more,
  });
}

export const aromatics = { light: "benzene", heavy: "toluene" } as const;
export const equilibrium = () => binaryEquilibrium({ pair: aromatics, pressure: "1 atm" });
export const azeotrope = () =>
  binaryEquilibrium({ pair: { light: "ethanol", heavy: "water" }, pressure: "1 atm" });
export const volatility = () =>
  volatilityOverTemperature({
    composition: { benzene: 0.4, toluene: 0.35, ethylbenzene: 0.25 },
    heavyKey: "toluene",
    pressure: "1.3 bar",
  });

const pure = { distillateLightFraction: 0.999999, bottomsLightFraction: 1e-6 };
const near = { refluxRatio: undefined, refluxOverMinimum: 1.001 } as unknown as Partial<Staircase>;
const close = { ...near, relativeVolatility: 1.05, refluxOverMinimum: 1.25 };
const longNames = {
  a: "a component with a name that goes on & on, <b>far too long</b>",
  b: "another one of those that nobody can ever read to its end",
};
const named = (record: Readonly<Record<string, number>>) => ({
  [longNames.a]: record["a"]!,
  [longNames.b]: record["b"]!,
  c: record["c"]!,
});

/** Every figure, at its ordinary and at its extreme. */
export const figures: Readonly<Record<string, () => Figure>> = {
  "eleven stages": () => mccabeThieleDiagram(staircase()),
  "three stages": () => mccabeThieleDiagram(staircase({ relativeVolatility: 12, refluxRatio: 2 })),
  "volatility 1.05, two hundred stages": () => mccabeThieleDiagram(staircase(close)),
  "volatility 1.02, a thousand stages": () =>
    mccabeThieleDiagram(staircase({ ...close, relativeVolatility: 1.02 })),
  "reflux at 1.001 of its minimum": () => mccabeThieleDiagram(staircase(near)),
  "subcooled feed": () => mccabeThieleDiagram(staircase({ feed: { lightFraction: 0.5, q: 1.3 } })),
  "superheated feed": () =>
    mccabeThieleDiagram(staircase({ feed: { lightFraction: 0.5, q: -0.3 }, refluxRatio: 4 })),
  "Murphree efficiency, partial condenser": () =>
    mccabeThieleDiagram(staircase({ murphreeVaporEfficiency: 0.6, condenser: "partial" })),
  "open steam": () => mccabeThieleDiagram(staircase({ reboiler: "open-steam" })),
  "high purity, whole": () => mccabeThieleDiagram(staircase(pure)),
  "high purity, distillate": () => mccabeThieleDiagram(staircase(pure), { zoom: "distillate" }),
  "high purity, bottoms": () => mccabeThieleDiagram(staircase(pure), { zoom: "bottoms" }),
  "a pair that Raoult's law does not fit": () =>
    mccabeThieleDiagram(
      staircase({
        relativeVolatility: undefined,
        pair: { light: "ethanol", heavy: "water" },
        pressure: "1 atm",
        feed: { lightFraction: 0.3, q: 1 },
        distillateLightFraction: 0.8,
      } as unknown as Partial<Staircase>),
    ),
  "y-x": () => equilibriumDiagram(equilibrium()),
  "y-x, azeotrope": () => equilibriumDiagram(azeotrope()),
  "T-x-y": () => temperatureCompositionDiagram(equilibrium()),
  "T-x-y, azeotrope, US": () => temperatureCompositionDiagram(azeotrope(), { units: "US" }),
  "stages against reflux": () => stagesAgainstReflux(design()),
  "stages against reflux, near the minimum": () => stagesAgainstReflux(design({ refluxOverMinimum: 1.01 })),
  "stages against reflux, far from it": () => stagesAgainstReflux(design({ refluxOverMinimum: 6 })),
  "stages against reflux, high minimum": () =>
    stagesAgainstReflux(design({ relativeVolatility: { a: 1.1, b: 1.02, c: 1 } })),
  "stages against reflux, superheated": () =>
    stagesAgainstReflux(design({ feed: { flow: 100, composition: { a: 0.3, b: 0.3, c: 0.4 }, q: -0.4 } })),
  "stages against reflux, range open above": () =>
    stagesAgainstReflux(
      design({
        feed: {
          flow: 100,
          composition: { a: 0.2, b: 0.2, c: 0.3, d: 0.3 },
          q: 1,
        } as unknown as Design["feed"],
        relativeVolatility: { a: 6, b: 3, c: 2, d: 1 },
        lightKey: "b",
        heavyKey: "d",
        refluxOverMinimum: 1.05,
      }),
    ),
  "stages against reflux, long names": () =>
    stagesAgainstReflux(
      design({
        feed: {
          flow: 100,
          composition: named({ a: 0.3, b: 0.3, c: 0.4 }),
          q: 1,
        } as unknown as Design["feed"],
        relativeVolatility: named({ a: 4, b: 2, c: 1 }),
        lightKey: longNames.a,
        heavyKey: longNames.b,
      }),
    ),
  "Gilliland, design": () => gillilandDiagram(design()),
  "Gilliland, near the minimum": () => gillilandDiagram(design({ refluxOverMinimum: 1.005 })),
  "Gilliland, far from it": () => gillilandDiagram(design({ refluxOverMinimum: 30 })),
  "Gilliland, alone": () =>
    gillilandDiagram(gilliland({ minimumStages: 8, minimumReflux: 1, refluxRatio: 1.5 })),
  volatility: () => volatilityDiagram(volatility()),
  "volatility, K-values": () => volatilityDiagram(volatility(), { values: "kValues" }),
  "volatility, light ends": () =>
    volatilityDiagram(
      volatilityOverTemperature({
        components: ["propane", "n-butane", "n-pentane", "n-hexane", "n-heptane", "n-octane", "n-decane"],
        heavyKey: "n-hexane",
        pressure: "3 bar",
      }),
    ),
  "volatility, isomers": () =>
    volatilityDiagram(
      volatilityOverTemperature({
        components: ["ethylbenzene", "p-xylene", "m-xylene", "o-xylene"],
        heavyKey: "p-xylene",
        pressure: "1 atm",
      }),
    ),
};
