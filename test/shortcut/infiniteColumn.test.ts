import { describe, expect, test } from "vitest";
import { findRoot } from "../../src/numerics/findRoot";
import { underwood } from "../../src/shortcut/underwood";
import { listed, records } from "./caseRecords";
import { columnRecoveries } from "./stageColumn";

const base = {
  distributing: [] as string[],
  q: 1,
  light: 1,
  heavy: 2,
  lightRecovery: 0.95,
  heavyRecovery: 0.95,
};

/** Splits of every kind, checked on a column solved stage by stage that knows nothing of Underwood. */
const splits = [
  { ...base, kind: "neighboring keys", volatility: [4, 2, 1], feed: [0.3, 0.3, 0.4] },
  {
    ...base,
    kind: "a component between the keys",
    distributing: ["c2"],
    volatility: [4, 2, 1],
    feed: [0.33, 0.33, 0.34],
    heavy: 3,
  },
  {
    ...base,
    kind: "the next lighter component distributes",
    distributing: ["c1"],
    volatility: [2.2, 1.9, 1],
    feed: [0.3, 0.3, 0.4],
    light: 2,
    heavy: 3,
    lightRecovery: 0.5,
    heavyRecovery: 0.8,
  },
  {
    ...base,
    kind: "the next heavier component distributes",
    distributing: ["c3"],
    volatility: [3, 1.2, 1],
    feed: [0.3, 0.3, 0.4],
    lightRecovery: 0.97,
    heavyRecovery: 0.75,
  },
  {
    ...base,
    kind: "superheated feed",
    volatility: [4, 2, 1],
    feed: [0.3, 0.3, 0.4],
    q: -0.4,
    light: 2,
    heavy: 3,
  },
  {
    ...base,
    kind: "subcooled feed, one between the keys",
    distributing: ["c2"],
    volatility: [4, 2.2, 1.5, 1],
    feed: [0.25, 0.25, 0.25, 0.25],
    q: 1.3,
    heavy: 3,
    heavyRecovery: 0.9,
  },
  {
    ...base,
    kind: "part vapor, the next lighter component distributes",
    distributing: ["c1"],
    volatility: [2.4, 2, 1.5, 1],
    feed: [0.2, 0.3, 0.3, 0.2],
    q: 0.5,
    light: 2,
    heavy: 3,
    lightRecovery: 0.7,
    heavyRecovery: 0.6,
  },
];

const stages = 120;

describe.each(splits)(
  "$kind",
  ({ distributing, volatility, feed, q, light, heavy, lightRecovery, heavyRecovery }) => {
    const minimum = underwood({
      ...records(feed, volatility),
      q,
      lightKey: `c${light}`,
      heavyKey: `c${heavy}`,
      lightKeyRecovery: lightRecovery,
      heavyKeyRecovery: heavyRecovery,
    });
    const recovery = listed(minimum.distillateRecovery);
    const atMinimum = recovery.reduce((sum, r, i) => sum + r * feed[i]!, 0);
    const column = { volatility, feed, q, stages, feedStage: stages / 2 };

    test("with 120 stages at the minimum reflux, the column gives the recoveries of Underwood's solution", () => {
      const found = columnRecoveries({ ...column, distillate: atMinimum, vapor: minimum.minimumVapor });
      expect(minimum.distributing).toEqual(distributing);
      found.forEach((r, i) => expect(Math.abs(r - recovery[i]!)).toBeLessThan(1e-3));
    });

    test("the split is met 2 % above the minimum reflux and missed 2 % below it", () => {
      const heavyKept = (refluxRatio: number): number => {
        const at = (distillate: number) =>
          columnRecoveries({ ...column, distillate, vapor: (refluxRatio + 1) * distillate });
        const lightMissed = (distillate: number) => at(distillate)[light - 1]! - lightRecovery;
        const distillate = findRoot(lightMissed, 0.97 * atMinimum, 1.03 * atMinimum, 1e-6)!;
        return 1 - at(distillate)[heavy - 1]!;
      };
      expect(minimum.minimumReflux).toBeGreaterThan(0);
      expect(heavyKept(1.02 * minimum.minimumReflux)).toBeGreaterThan(heavyRecovery);
      expect(heavyKept(0.98 * minimum.minimumReflux)).toBeLessThan(heavyRecovery);
    });
  },
);
