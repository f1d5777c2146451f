import type { Figure } from "../../src/plots/figure";
import { cautionLines, methodLines } from "../display/judgment";

/** A figure in words. */
export function figureText({ title, alt, cautions, methods }: Figure): string {
  return [`Figure: ${title}`, alt, ...cautionLines(cautions), ...methodLines(methods)].join("\n");
}
