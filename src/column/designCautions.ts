import type { Caution } from "../base/result";
import type { RefluxLimit } from "./keySplit";
import { closeBoiling, nearMinimumReflux } from "./reflux";

/** What a design is judged on. */
export interface DesignNumbers {
  readonly names: readonly string[];
  readonly keyVolatility: number;
  readonly limit: RefluxLimit;
  readonly refluxRatio: number;
  readonly stages: number;
  readonly stagesRange: readonly [number, number | null];
}

const widestRange = 0.2;

const short = (value: number): string => value.toPrecision(4);

type Judge = (design: DesignNumbers) => Caution | undefined;

/** Measured on 200 random systems by counting stages one by one; see `shortcutDesign`. */
const betweenKeys: Judge = ({ limit, names, refluxRatio }) => {
  if (!limit.betweenKeys) return undefined;
  const who = limit.distributing.map((i) => names[i]!).join(", ");
  return {
    code: "gilliland-with-distributing-component",
    severity: "check",
    kind: "method",
    message: `${who} ${limit.distributing.length === 1 ? "distributes" : "distribute"} between the keys; with the exact minimum reflux Gilliland's correlation is then too hopeful (median 0.64 of the true stages at 1.05 times the minimum, over 200 random systems). The most cautious single root asks for a minimum reflux of ${short(limit.largestSingleRoot)}; count stages one by one before relying on the number`,
    value: refluxRatio,
    limit: limit.largestSingleRoot,
  };
};

const wideRange: Judge = ({ stagesRange: [low, high], stages }) => {
  const width = high === null ? Infinity : (high - low) / stages;
  if (high === null || width <= widestRange) return undefined;
  return {
    code: "stages-range-wide",
    severity: "check",
    kind: "method",
    message: `the correlations and both minimum refluxes give ${low.toFixed(1)} to ${high.toFixed(1)} stages, ${(100 * width).toFixed(0)} % of the number`,
    value: width,
    limit: widestRange,
  };
};

const openRange: Judge = ({ stagesRange: [, high], refluxRatio, limit }) =>
  high !== null
    ? undefined
    : {
        code: "reflux-below-single-root",
        severity: "check",
        kind: "method",
        message: `the reflux ratio ${short(refluxRatio)} lies below the largest single-root minimum ${short(limit.largestSingleRoot)}, so the stages have no upper bound from the correlations; it exceeds the exact minimum ${short(limit.minimumReflux)}`,
        value: refluxRatio,
        limit: limit.largestSingleRoot,
      };

const vanishingFlow: Judge = ({ limit }) =>
  limit.underwoodReflux >= limit.minimumReflux
    ? undefined
    : {
        code: "flow-vanishes-first",
        severity: "check",
        kind: "method",
        message: `Underwood's minimum reflux ${short(limit.underwoodReflux)} would leave a section without liquid or vapor; the larger limit ${short(limit.minimumReflux)} is used as the minimum`,
        value: limit.underwoodReflux,
        limit: limit.minimumReflux,
      };

const judges: readonly Judge[] = [
  vanishingFlow,
  betweenKeys,
  openRange,
  wideRange,
  ({ refluxRatio, limit }) => nearMinimumReflux(refluxRatio, limit.minimumReflux),
  ({ keyVolatility }) => closeBoiling(keyVolatility),
];

/** What is doubtful about a shortcut design, from its own numbers. */
export function judgeDesign(design: DesignNumbers): Caution[] {
  const cautions: Caution[] = [];
  for (const judge of judges) {
    const caution = judge(design);
    if (caution !== undefined) cautions.push(caution);
  }
  return cautions;
}
