import type { Caution, MethodUsed } from "../../src/base/result";

/** A figure as the library makes it: plotly's data and layout as plain JSON, with its words. */
export interface Figure {
  readonly kind: "figure";
  readonly name: string;
  readonly title: string;
  readonly data: readonly object[];
  readonly layout: Readonly<Record<string, unknown>>;
  readonly cautions?: readonly Caution[];
  readonly methods?: readonly MethodUsed[];
  /** What the picture shows, for those who do not see it. */
  readonly alt?: string;
}

/** Whether a value is a figure, from this copy of the library or another. */
export function isFigure(value: unknown): value is Figure {
  if (typeof value !== "object" || value === null) return false;
  const { kind, data, layout } = value as Record<string, unknown>;
  return kind === "figure" && Array.isArray(data) && typeof layout === "object" && layout !== null;
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
