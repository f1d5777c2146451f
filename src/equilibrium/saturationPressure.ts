const mostIterations = 200;
/** ln K beyond which K-values no longer change where the phases are, kept from overflow. */
const largestLogK = 300;
/** Of ln P; Newton's next error is about the square of its step. */
const lastStep = 3e-8;

/**
 * ln of the pressure [Pa] at which an ideal mixture z of components with the vapor pressures exp(logVaporPressure)
 * holds the molar vapor fraction v: at the bubble point P = sum(z_i P_i), at the dew point 1/P = sum(z_i/P_i), between
 * them the root of the h of `saturationTemperature` by Newton in ln P, inside the bracket of these two.
 */
export function saturationLogPressure(logVaporPressure: Float64Array, z: Float64Array, v: number): number {
  if (v === 0) return logWeightedSum(logVaporPressure, z, 1);
  const dew = -logWeightedSum(logVaporPressure, z, -1);
  return v === 1 ? dew : search(logVaporPressure, z, v, dew, logWeightedSum(logVaporPressure, z, 1));
}

/** ln sum(z exp(sign a)), scaled by the largest term so that nothing overflows. */
function logWeightedSum(a: Float64Array, z: Float64Array, sign: number): number {
  let largest = -Infinity;
  for (let i = 0; i < z.length; i++) if (z[i] !== 0) largest = Math.max(largest, sign * a[i]!);
  let sum = 0;
  for (let i = 0; i < z.length; i++) if (z[i] !== 0) sum += z[i]! * Math.exp(sign * a[i]! - largest);
  return largest + Math.log(sum);
}

function search(a: Float64Array, z: Float64Array, v: number, dew: number, bubble: number): number {
  const w = 1 - v;
  let low = dew;
  let high = bubble;
  let p = bubble + v * (dew - bubble);
  for (let iteration = 0; iteration < mostIterations; iteration++) {
    let liquid = 0;
    let vapor = 0;
    let rise = 0;
    for (let i = 0; i < z.length; i++) {
      if (z[i] === 0) continue;
      const k = Math.exp(Math.min(a[i]! - p, largestLogK));
      const share = 1 / (w + v * k);
      const x = z[i]! * share;
      liquid += x;
      vapor += k * x;
      rise += k * x * share;
    }
    const h = Math.log(vapor / liquid);
    if (h > 0) low = p;
    else high = p;
    const next = p + h / (rise * (w / vapor + v / liquid));
    if (Math.abs(next - p) <= lastStep) return next;
    p = next > low && next < high ? next : 0.5 * (low + high);
  }
  return p;
}
