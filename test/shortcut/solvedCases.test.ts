import { describe, expect, test } from "vitest";
import { fenske } from "../../src/shortcut/fenske";
import { gilliland } from "../../src/shortcut/gilliland";
import { kirkbride } from "../../src/shortcut/kirkbride";
import { underwood } from "../../src/shortcut/underwood";
import solved from "../data/solvedShortcutCases.json";
import { gap, largestGap, listed, record, records } from "./caseRecords";

const tolerance = 1e-9;

describe.each(solved.cases.map((each, i) => ({ ...each, number: i + 1 })))(
  "solved case $number, $lightKey from $heavyKey at q $q",
  (each) => {
    const { lightKey, heavyKey, lightKeyRecovery, heavyKeyRecovery, q, refluxRatio } = each;
    const split = {
      ...records(each.composition, each.relativeVolatility),
      lightKey,
      heavyKey,
      lightKeyRecovery,
      heavyKeyRecovery,
    };
    const heavy = split.relativeVolatility[heavyKey]!;
    const limit = fenske(split);
    const minimum = underwood({ ...split, q });

    test("Fenske", () => {
      expect(gap(limit.minimumStages, each.totalReflux.stages)).toBeLessThan(tolerance);
      expect(largestGap(listed(limit.distillateRecovery), each.totalReflux.recovery)).toBeLessThan(tolerance);
    });

    test("Underwood", () => {
      const roots = each.roots.map((root) => root / heavy);
      expect(largestGap(minimum.roots, roots)).toBeLessThan(tolerance);
      expect(
        largestGap(
          minimum.activeRoots,
          each.minimumReflux.active.map((k) => roots[k]!),
        ),
      ).toBeLessThan(tolerance);
      expect(gap(minimum.minimumReflux, each.minimumReflux.value)).toBeLessThan(tolerance);
      expect(gap(minimum.minimumVapor, each.minimumReflux.vapor)).toBeLessThan(tolerance);
      expect(largestGap(listed(minimum.distillateRecovery), each.minimumReflux.recovery)).toBeLessThan(
        tolerance,
      );
      expect(largestGap(minimum.singleRootReflux, each.singleRoot)).toBeLessThan(tolerance);
    });

    test("distributing components", () => {
      const { recovery } = each.minimumReflux;
      const expected = recovery.flatMap((r, i) => (r > 0 && r < 1 ? [`c${i + 1}`] : []));
      expect([...minimum.distributing].sort()).toEqual(
        expected.filter((name) => name !== lightKey && name !== heavyKey).sort(),
      );
    });

    test.each(["molokanov", "eduljee"] as const)("Gilliland, %s, both ways", (correlation) => {
      const minima = {
        minimumStages: limit.minimumStages,
        minimumReflux: minimum.minimumReflux,
        correlation,
      };
      const { stages } = gilliland({ ...minima, refluxRatio });
      expect(gap(stages, each.stages[correlation])).toBeLessThan(tolerance);
      expect(gap(gilliland({ ...minima, stages }).refluxRatio, refluxRatio)).toBeLessThan(tolerance);
    });

    test("Kirkbride", () => {
      const kept = each.composition.map((z, i) => z * limit.distillateRecovery[`c${i + 1}`]!);
      const lost = each.composition.map((z, i) => z - kept[i]!);
      const { rectifyingOverStripping, rectifyingStages } = kirkbride({
        composition: split.composition,
        lightKey,
        heavyKey,
        distillate: record(kept),
        bottoms: record(lost),
        normalize: true,
        distillateFlow: kept.reduce((sum, d) => sum + d, 0),
        bottomsFlow: lost.reduce((sum, b) => sum + b, 0),
        stages: each.stages.molokanov,
      });
      expect(gap(rectifyingOverStripping, each.kirkbride.ratio)).toBeLessThan(tolerance);
      expect(gap(rectifyingStages, each.kirkbride.rectifyingStages)).toBeLessThan(tolerance);
    });
  },
);
