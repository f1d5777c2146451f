/** ln K beyond which a trace is a trace; keeps K-values and their inverses finite. */
const largestLogK = 230;

/** Raoult's law for an ideal liquid under an ideal vapor: K_i = P_i(T)/P, from logarithms. */
export function raoultKValues(logVaporPressure: Float64Array, logPressure: number): Float64Array {
  const k = new Float64Array(logVaporPressure.length);
  for (let i = 0; i < k.length; i++) {
    const logK = logVaporPressure[i]! - logPressure;
    k[i] = Math.exp(Math.max(-largestLogK, Math.min(logK, largestLogK)));
  }
  return k;
}
