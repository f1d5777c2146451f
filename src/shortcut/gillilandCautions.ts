import type { Caution } from "../base/result";
import { sources } from "../base/source";

/** Below this X the points are few and the forms part: Eduljee's ends at Y = 0.75. */
const leastCoordinate = 0.01;

/** Range of the 61 columns that the curve was drawn through. */
const published = { minimumStages: [3.4, 60.3], minimumReflux: [0.53, 9.09] } as const;

/** What is doubtful about a point of the Gilliland curve. */
export function judgeGilliland(x: number, minimumStages: number, minimumReflux: number): Caution[] {
  const cautions: Caution[] = [];
  if (x < leastCoordinate) {
    cautions.push({
      code: "near-minimum-reflux",
      severity: "check",
      kind: "method",
      message: `X = (R - Rmin)/(R + 1) is ${x.toPrecision(3)}; below ${leastCoordinate} the correlations part widely: count stages one by one`,
      value: x,
      limit: leastCoordinate,
    });
  }
  const given = { minimumStages, minimumReflux };
  for (const field of ["minimumStages", "minimumReflux"] as const) {
    const [least, most] = published[field];
    const value = given[field];
    if (value >= least && value <= most) continue;
    cautions.push({
      code: "outside-gilliland-data",
      severity: "note",
      kind: "method",
      message: `${field} ${value.toPrecision(4)} is outside ${least} to ${most}, the columns that the correlation rests on`,
      value,
      limit: value < least ? least : most,
      source: sources.gilliland1940,
    });
  }
  return cautions;
}
