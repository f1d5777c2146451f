import { evaluateVaporPressures, type VaporPressureTable } from "./vaporPressureTable";

const lowestTemperature = 1;
const highestTemperature = 1e4;
const mostIterations = 200;
/** Relative; Newton's next error is about the square of its step, so this one leaves less than 1e-14. */
const lastStep = 3e-8;
/** ln K beyond which K-values no longer change where the phases are, kept from overflow. */
const largestLogK = 300;

/**
 * Temperature [K] at which an ideal mixture z under the pressure exp(logPressure) [Pa] holds the molar vapor fraction
 * v: 0 gives the bubble point, 1 the dew point. NaN when there is none between 1 and 10 000 K.
 *
 *   h(T) = ln sum(y_i) - ln sum(x_i) = 0,  x_i = z_i/(1 - v + v K_i),  y_i = K_i x_i,  K_i = P_i(T)/P
 *
 * h rises with T; Newton in 1/T, in which h is nearly straight, inside a bracket.
 */
export function saturationTemperature(
  table: VaporPressureTable,
  z: Float64Array,
  logPressure: number,
  v: number,
): number {
  const { count, logPressure: logVaporPressure, slope } = table;
  const w = 1 - v;
  let low = lowestTemperature;
  let high = highestTemperature;
  let t = startingTemperature(table, z, logPressure);
  for (let iteration = 0; iteration < mostIterations; iteration++) {
    evaluateVaporPressures(table, t);
    let liquid = 0;
    let vapor = 0;
    let rise = 0;
    for (let i = 0; i < count; i++) {
      if (z[i] === 0) continue;
      const k = Math.exp(Math.min(logVaporPressure[i]! - logPressure, largestLogK));
      const share = 1 / (w + v * k);
      const x = z[i]! * share;
      liquid += x;
      vapor += k * x;
      rise += slope[i]! * k * x * share;
    }
    const h = Math.log(vapor / liquid);
    const hSlope = rise * (w / vapor + v / liquid);
    if (h > 0) high = t;
    else low = t;
    let next = 1 / (1 / t + h / (hSlope * t * t));
    if (Math.abs(next - t) <= lastStep * t) return next;
    if (!(next > low && next < high)) next = 2 / (1 / low + 1 / high);
    if (high - low <= 1e-14 * high) break;
    t = next;
  }
  return low > lowestTemperature && high < highestTemperature ? t : Number.NaN;
}

/** The mean of the boiling temperatures that the starting lines give. */
function startingTemperature(table: VaporPressureTable, z: Float64Array, logPressure: number): number {
  const line = table.start;
  let t = 0;
  for (let i = 0; i < table.count; i++) {
    if (z[i] !== 0) t += z[i]! * (line[3 * i + 1]! / (line[3 * i]! - logPressure) - line[3 * i + 2]!);
  }
  return t > lowestTemperature && t < highestTemperature ? t : 300;
}
