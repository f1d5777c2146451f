import { cautionLines, methodLines } from "../display/judgment";
import type { Figure } from "./figure";

/** A figure in words. */
export function figureText({ title, alt, cautions, methods }: Figure): string {
  return [
    `Figure: ${title}`,
    ...(alt === undefined ? [] : [alt]),
    ...cautionLines(cautions ?? []),
    ...methodLines(methods ?? []),
  ].join("\n");
}
