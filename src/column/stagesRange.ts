import {
  type GillilandCorrelation,
  gillilandCorrelations,
  refluxCoordinate,
  stagesFrom,
} from "../shortcut/gillilandCorrelations";

const names = Object.keys(gillilandCorrelations) as GillilandCorrelation[];

/** Eduljee's form ends at Y = 0.75 and says nothing below this X. */
const leastCoordinate = 0.01;

/**
 * Least and most stages over the correlations, fed with the exact minimum reflux and with the cautious one (the
 * largest single-root value). The upper end is null where the reflux lies below the cautious minimum.
 */
export function stagesRange(
  minimumStages: number,
  exactMinimum: number,
  cautiousMinimum: number,
  refluxRatio: number,
): [number, number | null] {
  let low = Infinity;
  let high = 0;
  for (const minimum of [exactMinimum, cautiousMinimum]) {
    const x = refluxCoordinate(minimum, refluxRatio);
    if (!(x > 0)) return [low, null];
    for (const name of names) {
      if (name === "eduljee" && x < leastCoordinate) continue;
      const stages = Math.max(minimumStages, stagesFrom(minimumStages, gillilandCorrelations[name](x)));
      low = Math.min(low, stages);
      high = Math.max(high, stages);
    }
  }
  return [low, high];
}
