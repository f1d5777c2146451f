import type { Figure } from "../../src/plots/figure";

/** Whether a value is a figure, from this copy of the library or another. */
export function isFigure(value: unknown): value is Figure {
  if (typeof value !== "object" || value === null) return false;
  const { kind, data, layout, cautions, methods } = value as Record<string, unknown>;
  const lists = [data, cautions, methods].every(Array.isArray);
  return kind === "figure" && lists && typeof layout === "object" && layout !== null;
}

/** The layout with the size at which the figure is drawn. */
export function sizedLayout(figure: Figure): Record<string, unknown> & { width: number; height: number } {
  const { width, height } = figure.layout;
  return {
    ...figure.layout,
    width: typeof width === "number" ? width : 700,
    height: typeof height === "number" ? height : 450,
  };
}
