/** Records over c1, c2, ... from lists. */
export function records(
  composition: ArrayLike<number>,
  relativeVolatility: ArrayLike<number>,
): { readonly composition: Record<string, number>; readonly relativeVolatility: Record<string, number> } {
  return { composition: record(composition), relativeVolatility: record(relativeVolatility) };
}

/** A record over c1, c2, ... */
export function record(values: ArrayLike<number>): Record<string, number> {
  return Object.fromEntries(Array.from(values, (value, i) => [`c${i + 1}`, value]));
}

/** The values of a record over c1, c2, ..., in that order. */
export function listed(values: Readonly<Record<string, number>>): number[] {
  return Object.keys(values).map((_, i) => values[`c${i + 1}`]!);
}

/** |a / b − 1|, or |a| where b is 0. */
export function gap(a: number, b: number): number {
  return b === 0 ? Math.abs(a) : Math.abs(a / b - 1);
}

/** The largest relative gap between two lists; infinite when they differ in length. */
export function largestGap(a: readonly number[], b: readonly number[]): number {
  if (a.length !== b.length) return Infinity;
  return a.reduce((largest, value, i) => Math.max(largest, gap(value, b[i]!)), 0);
}
