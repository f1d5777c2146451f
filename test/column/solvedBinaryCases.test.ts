import { describe, expect, test } from "vitest";
import { mccabeThiele } from "../../src/column/mccabeThiele";
import type { McCabeThieleInput } from "../../src/column/mccabeThieleInput";
import { columnFlows } from "../../src/staging/binaryColumn";
import { type EquilibriumCurve, functionCurve } from "../../src/staging/equilibriumCurve";
import { minimumReflux } from "../../src/staging/minimumReflux";
import { tabulate } from "../../src/staging/curveTable";
import { smoker } from "../../src/staging/smoker";
import { stepStages, totalRefluxStages } from "../../src/staging/stepStages";
import solved from "../data/solvedBinaryCases.json";
import { gap, largestGap } from "../shortcut/caseRecords";

const tolerance = 1e-9;

interface SolvedCase {
  readonly kind: string;
  readonly note: string;
  readonly activityCurve?: { readonly volatility: number; readonly margules: number };
  readonly equilibriumPoints?: [number, number][];
  readonly answer: Readonly<Record<string, number>> & {
    readonly limitedBy?: string;
    readonly pinch?: number[];
    readonly sections?: number[][];
    readonly steps?: number[][];
    readonly streamStages?: number[];
  };
}

const cases = solved.cases as unknown as (SolvedCase & McCabeThieleInput)[];

const notInput = new Set(["kind", "note", "answer", "activityCurve", "title", "equilibriumPoints"]);

function inputOf(each: SolvedCase & McCabeThieleInput): McCabeThieleInput {
  const fields = Object.entries(each).filter(([name]) => !notInput.has(name));
  const input = Object.fromEntries(fields) as unknown as McCabeThieleInput;
  const { equilibriumPoints: points } = each;
  return points === undefined ? input : { ...input, equilibriumCurve: { points, interpolation: "linear" } };
}

const numbered = cases.map((each, i) => ({
  ...each,
  title: `solved case ${i + 1}, ${each.kind} ${each.note}`,
}));
const columns = numbered.filter(
  ({ kind }) => kind === "column" || kind === "given_feed_stage" || kind === "equilibrium_table",
);

describe.each(columns)("$title", (each) => {
  const { answer } = each;
  const result = mccabeThiele(inputOf(each));

  test("stages and feed stage", () => {
    expect(gap(result.stages, answer["stages"]!)).toBeLessThan(tolerance);
    expect(result.stagesWhole).toBe(answer["stagesWhole"]);
    expect(result.feedStage).toBe(answer["feedStage"] ?? each.feedStage);
  });

  test("limits and flows, where they are given", () => {
    for (const field of ["minimumStages", "minimumReflux", "distillateFlow", "bottomsFlow"] as const) {
      if (answer[field] !== undefined) expect(gap(result[field], answer[field])).toBeLessThan(tolerance);
    }
    if (answer.limitedBy !== undefined) expect(result.minimumRefluxLimitedBy).toBe(answer.limitedBy);
    if (answer.pinch !== undefined) expect(largestGap(result.pinch, answer.pinch)).toBeLessThan(tolerance);
    answer.sections?.forEach((section, k) => {
      const { liquid, vapor } = result.sections[k]!;
      expect(largestGap([liquid, vapor], section)).toBeLessThan(tolerance);
    });
    expect(result.minimumReflux).toBeLessThan(result.refluxRatio);
  });

  test("the compositions printed agree", () => {
    for (const [stage, x, y] of answer.steps ?? []) {
      const step = result.steps[stage! - 1]!;
      expect(largestGap([step.x, step.y], [x!, y!])).toBeLessThan(tolerance);
    }
    expect(result.steps.length).toBe(result.stagesWhole);
  });

  test("Smoker's closed form, for a constant volatility and an optimum feed", () => {
    if (answer["smokerRectifying"] === undefined) return expect(each.kind).not.toBe("column");
    const { relativeVolatility, feed, distillateLightFraction, bottomsLightFraction, refluxRatio } = each;
    const closed = smoker({
      relativeVolatility: relativeVolatility!,
      feed: feed!,
      distillateLightFraction,
      bottomsLightFraction,
      refluxRatio: refluxRatio!,
    });
    expect(gap(closed.rectifyingStages, answer["smokerRectifying"])).toBeLessThan(tolerance);
    expect(gap(closed.strippingStages, answer["smokerStripping"]!)).toBeLessThan(tolerance);
  });
});

describe.each(numbered.filter(({ kind }) => kind === "minimum_reflux"))("$title", (each) => {
  test("the larger of feed pinch and vanishing flow", () => {
    const result = mccabeThiele({ ...inputOf(each), refluxOverMinimum: 1.2 });
    expect(gap(result.minimumReflux, each.answer["minimumReflux"]!)).toBeLessThan(tolerance);
    expect(result.minimumRefluxLimitedBy).toBe(each.answer.limitedBy);
    expect(largestGap(result.pinch, each.answer.pinch!)).toBeLessThan(tolerance);
  });
});

describe.each(numbered.filter(({ kind }) => kind === "total_reflux"))("$title", (each) => {
  test("Fenske's closed form", () => {
    const result = mccabeThiele({
      ...inputOf(each),
      feed: { lightFraction: 0.5, q: 1 },
      refluxOverMinimum: 1.5,
    });
    expect(gap(result.minimumStages, each.answer["minimumStages"]!)).toBeLessThan(tolerance);
    expect(Math.ceil(result.minimumStages)).toBe(each.answer["stagesWhole"]);
  });
});

describe.each(numbered.filter(({ kind }) => kind === "murphree"))("$title", (each) => {
  const { answer } = each;

  test("trays with the efficiency over an ideal reboiler", () => {
    const result = mccabeThiele(inputOf(each));
    expect(gap(result.stages, answer["trays"]! + 1)).toBeLessThan(tolerance);
    expect(result.feedStage).toBe(answer["feedTray"]);
    expect(result.steps.length).toBe(answer["traysWhole"]);
  });

  test("the efficiency on the reboiler as well", () => {
    const result = mccabeThiele({ ...inputOf(each), efficiencyOnReboiler: true });
    expect(gap(result.stages, answer["allStages"]!)).toBeLessThan(tolerance);
    expect(result.stagesWhole).toBe(answer["allStagesWhole"]);
    expect(result.feedStage).toBe(answer["allFeedStage"]);
  });
});

const complex = numbered.filter(({ kind }) => ["two_feeds", "side_draw", "open_steam"].includes(kind));

describe.each(complex)("$title", (each) => {
  const { answer } = each;
  test.each([false, true])("stages, streams and flows; feeds typed in reverse: %s", (reversed) => {
    const input = inputOf(each);
    const result = mccabeThiele(reversed ? { ...input, feeds: [...input.feeds!].reverse() } : input);
    expect(gap(result.stages, answer["stages"]!)).toBeLessThan(tolerance);
    expect(
      largestGap(
        [result.distillateFlow, result.bottomsFlow],
        [answer["distillateFlow"]!, answer["bottomsFlow"]!],
      ),
    ).toBeLessThan(tolerance);
    const flows = result.sections.map(({ liquid, vapor }) => [liquid, vapor]);
    expect(largestGap(flows.flat(), answer.sections!.flat())).toBeLessThan(tolerance);
    const draws = each.sideDraws?.length ?? 0;
    expect(result.feedStages).toEqual(answer.streamStages!.slice(draws));
    expect(result.feedStage).toBe(answer.streamStages![draws]);
    expect(result.sideDrawStages ?? []).toEqual(answer.streamStages!.slice(0, draws));
    if (answer["minimumReflux"] !== undefined) {
      expect(gap(result.minimumReflux, answer["minimumReflux"])).toBeLessThan(tolerance);
    }
  });
});

describe.each(numbered.filter(({ kind }) => kind === "equilibrium_function"))("$title", (each) => {
  test("a curve with activity coefficients, through the same kernel", () => {
    const { volatility, margules } = each.activityCurve!;
    const curve: EquilibriumCurve = functionCurve((x) => {
      const alpha = volatility * Math.exp(margules * ((1 - x) ** 2 - x * x));
      return (alpha * x) / (1 + (alpha - 1) * x);
    });
    const { distillateLightFraction, bottomsLightFraction, feed, refluxRatio, answer } = each;
    const streams = [{ flow: 1, lightFraction: feed!.lightFraction, q: feed!.q }];
    const column = { streams, distillateLightFraction, bottomsLightFraction, openSteam: false };
    const table = tabulate(curve, bottomsLightFraction, distillateLightFraction);
    const least = minimumReflux(curve, column, table).minimumReflux;
    expect(gap(least, answer["minimumReflux"]!)).toBeLessThan(tolerance);
    const stairs = stepStages(curve, columnFlows(column, refluxRatio!), {
      distillateLightFraction,
      bottomsLightFraction,
      efficiency: 1,
      idealFirstStage: false,
      idealReboiler: false,
    });
    if ("reason" in stairs) throw new Error(stairs.reason);
    expect(gap(stairs.stages, answer["stages"]!)).toBeLessThan(tolerance);
    expect(stairs.streamStages).toEqual([answer["feedStage"]]);
    const total = totalRefluxStages(curve, distillateLightFraction, bottomsLightFraction)!;
    expect(gap(total, answer["totalRefluxStages"]!)).toBeLessThan(tolerance);
  });
});
