import type { Figure } from "../../src/plots/figure";
import { cautionLines, methodLines } from "../display/judgment";

/** A figure in words; the picture's own words mostly open with the title. */
export function figureText({ title, alt, cautions, methods }: Figure): string {
  const words = alt.startsWith(title) ? [`Figure: ${alt}`] : [`Figure: ${title}`, alt];
  return [...words, ...cautionLines(cautions), ...methodLines(methods)].join("\n");
}
