import { type BinaryColumn, type DistillateLaw, distillateLaw } from "./binaryColumn";

/** The reflux ratio at which the operating line of section k, 0 the top one, runs through (x, y), y above x. */
export function pinchReflux(column: BinaryColumn, k: number, x: number, y: number): number {
  let added = 0;
  for (let i = 0; i < k; i++) {
    const { flow, lightFraction, q } = column.streams[i]!;
    added += flow * (lightFraction - q * x - (1 - q) * y);
  }
  return leastReflux(distillateLaw(column), y - x, y - column.distillateLightFraction, added);
}

/** The reflux ratio below which a section has no liquid or no vapor. */
export function vanishingFlowReflux(column: BinaryColumn): number {
  const law = distillateLaw(column);
  let liquid = 0;
  let vapor = 0;
  let least = 0;
  for (const { flow, q } of column.streams) {
    liquid += q * flow;
    vapor -= (1 - q) * flow;
    least = Math.max(least, leastReflux(law, 1, 0, liquid), leastReflux(law, 1, 1, vapor));
  }
  return least;
}

/** The least R with (slope R + constant) D + added >= 0, for a D that follows its law; infinite when there is none. */
function leastReflux(law: DistillateLaw, slope: number, constant: number, added: number): number {
  const start = law.light * constant + added * law.constant;
  if (start >= 0) return 0;
  const rise = law.light * slope + added * law.slope;
  return rise > 0 ? -start / rise : Infinity;
}
