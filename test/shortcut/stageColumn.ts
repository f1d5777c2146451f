/** A column of constant relative volatility and constant molar overflow, total condenser, one mole of feed. */
export interface StageColumn {
  readonly volatility: readonly number[];
  readonly feed: readonly number[];
  readonly q: number;
  readonly stages: number;
  readonly feedStage: number;
  readonly distillate: number;
  readonly vapor: number;
}

type Matrix = number[][];

const mostIterations = 300;

/**
 * Recoveries in the distillate: Newton's method on the component balances of all stages at once, with the liquid flow
 * of each component on each stage as unknowns (block tridiagonal). Written apart from the closed forms it checks.
 */
export function columnRecoveries(column: StageColumn): number[] {
  const { volatility, feed, distillate, vapor } = column;
  const liquids = startingLiquids(column);
  for (let iteration = 0; iteration < mostIterations; iteration++) {
    const steps = newtonSteps(column, liquids);
    let change = 0;
    steps.forEach((step, j) => {
      step.forEach((s, i) => {
        const old = liquids[j]![i]!;
        change = Math.max(change, Math.abs(s));
        liquids[j]![i] = Math.min(2 * old, Math.max(0.5 * old, old + s));
      });
    });
    if (change < 1e-10) {
      const top = vaporFlows(volatility, liquids[0]!, vapor);
      return top.map((v, i) => (v * distillate) / vapor / feed[i]!);
    }
  }
  throw new Error("the column did not converge");
}

function vaporOf(column: StageColumn, stage: number): number {
  return stage < column.feedStage ? column.vapor : column.vapor - (1 - column.q);
}

/** Compositions between a sharp split's distillate and bottoms, in even steps. */
function startingLiquids({ feed, q, stages, feedStage, distillate, vapor }: StageColumn): Matrix {
  let left = distillate;
  const top = feed.map((z) => {
    const taken = Math.min(0.97 * z, left);
    left -= taken;
    return taken + 0.01 * z;
  });
  const sums = { top: total(top), bottom: total(feed.map((z, i) => z - 0.97 * top[i]!)) };
  return Array.from({ length: stages }, (_, j) => {
    const share = j / (stages - 1);
    const liquid = j === stages - 1 ? 1 - distillate : vapor - distillate + (j < feedStage - 1 ? 0 : q);
    return feed.map(
      (z, i) => liquid * (((1 - share) * top[i]!) / sums.top + (share * (z - 0.97 * top[i]!)) / sums.bottom),
    );
  });
}

function total(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0);
}

function vaporFlows(volatility: readonly number[], liquid: readonly number[], vapor: number): number[] {
  const weighted = liquid.map((l, i) => volatility[i]! * l);
  return weighted.map((w) => (vapor * w) / total(weighted));
}

/** Derivatives of the vapor of each component (row) by the liquid of each (column). */
function vaporSlopes(volatility: readonly number[], liquid: readonly number[], vapor: number): Matrix {
  const weight = total(liquid.map((l, i) => volatility[i]! * l));
  return liquid.map((l, i) =>
    volatility.map((a, k) => (vapor * volatility[i]! * ((i === k ? weight : 0) - l * a)) / weight ** 2),
  );
}

/** One Newton step for all stages by block elimination from the top; the liquid from above enters with factor 1. */
function newtonSteps(column: StageColumn, liquids: Matrix): Matrix {
  const { volatility, feed, stages, feedStage, distillate, vapor } = column;
  const reflux = 1 - distillate / vapor;
  const eliminated: Matrix[] = [];
  for (let j = 0; j < stages; j++) {
    const own = vaporFlows(volatility, liquids[j]!, vaporOf(column, j));
    const ownSlopes = vaporSlopes(volatility, liquids[j]!, vaporOf(column, j));
    const below =
      j + 1 < stages ? vaporFlows(volatility, liquids[j + 1]!, vaporOf(column, j + 1)) : undefined;
    const belowSlopes =
      j + 1 < stages ? vaporSlopes(volatility, liquids[j + 1]!, vaporOf(column, j + 1)) : undefined;
    const kept = j === 0 ? 1 - reflux : 1;
    const above = eliminated[j - 1];
    eliminated.push(
      solved(
        feed.map((z, i) => {
          const balance =
            (j > 0 ? liquids[j - 1]![i]! : 0) +
            (below?.[i] ?? 0) +
            (j === feedStage - 1 ? z : 0) -
            liquids[j]![i]! -
            kept * own[i]!;
          const row = feed.map(
            (_, k) => (i === k ? 1 : 0) + kept * ownSlopes[i]![k]! - (above?.[i]![k] ?? 0),
          );
          const right = feed.map((_, k) => belowSlopes?.[i]![k] ?? 0);
          return [...row, ...right, balance + (above?.[i]!.at(-1) ?? 0)];
        }),
      ),
    );
  }
  const steps: Matrix = [];
  for (let j = stages - 1; j >= 0; j--) {
    const next = steps[0];
    steps.unshift(
      eliminated[j]!.map(
        (row) => row.at(-1)! + (next === undefined ? 0 : total(next.map((s, k) => row[k]! * s))),
      ),
    );
  }
  return steps;
}

/** Gauss-Jordan elimination with pivoting: the columns to the right of the square part, solved. */
function solved(rows: Matrix): Matrix {
  const n = rows.length;
  for (let p = 0; p < n; p++) {
    const best = rows
      .slice(p)
      .reduce((b, row, i) => (Math.abs(row[p]!) > Math.abs(rows[b]![p]!) ? i + p : b), p);
    [rows[p], rows[best]] = [rows[best]!, rows[p]!];
    const pivot = rows[p]![p]!;
    rows[p] = rows[p]!.map((value) => value / pivot);
    for (let i = 0; i < n; i++) {
      const factor = rows[i]![p]!;
      if (i !== p && factor !== 0) rows[i] = rows[i]!.map((value, k) => value - factor * rows[p]![k]!);
    }
  }
  return rows.map((row) => row.slice(n));
}
