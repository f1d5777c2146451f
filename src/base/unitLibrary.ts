import { createRequire } from "node:module";
import type { unit as createUnit } from "mathjs";

/** Loaded on first use: the library takes about a second, and the built-in table covers the trade's units. */
let unit: typeof createUnit | undefined;

/** Converts by mathjs, for units outside the built-in table; undefined when it does not know the unit or the dimension differs. */
export function convertByUnitLibrary(amount: number, from: string, to: string): number | undefined {
  try {
    unit ??= (createRequire(__filename)("mathjs") as { unit: typeof createUnit }).unit;
    const value = unit(amount, from).toNumber(to);
    return Number.isFinite(value) ? value : undefined;
  } catch {
    return undefined;
  }
}
