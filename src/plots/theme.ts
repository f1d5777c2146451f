/**
 * One look for all figures. The five data colors stay apart for readers with any of the common color deficiencies (a
 * test measures it), and no two lines of a figure differ by color alone: dash or marker differs too.
 */
export const palette = {
  ink: "#1d2430",
  spruce: "#1c7c62",
  rust: "#a63d0b",
  iris: "#4f3cc9",
  amber: "#d59d14",
  /** For guides, frames and quiet words, never for data. */
  slate: "#6c737d",
  grid: "#e4e2da",
  /** Opaque, so that a figure reads on a dark page as well. */
  paper: "#fbfaf6",
} as const;

type Json = Readonly<Record<string, unknown>>;

/** Of this design, with the metrics that the still pictures are measured with. */
const family = "Arial, Helvetica, Liberation Sans, sans-serif";

export const wide = { width: 700, height: 450 } as const;
export const square = { width: 560, height: 560 } as const;

/** Room around the plot [px]; that of a square figure leaves a square, and room for the title above both. */
export const margins = { l: 72, r: 28, t: 60, b: 52 } as const;
export const squareMargins = { l: 72, r: 40, t: 60, b: 52 } as const;

/** Size, paper, fonts. */
export function baseLayout({ width, height }: typeof wide | typeof square): Json {
  return {
    width,
    height,
    margin: width === height ? squareMargins : margins,
    paper_bgcolor: palette.paper,
    plot_bgcolor: palette.paper,
    font: { family, size: 12, color: palette.ink },
    showlegend: false,
    hovermode: "closest",
  };
}

/** An axis; its title ends in the unit. */
export function axis(title: string, unit: string, more: Json = {}): Json {
  return {
    title: { text: `${title} [${unit}]`, font: { size: 13 }, standoff: 8 },
    showline: true,
    mirror: true,
    linecolor: palette.slate,
    gridcolor: palette.grid,
    zeroline: false,
    ticks: "outside",
    ticklen: 4,
    tickcolor: palette.slate,
    ...more,
  };
}

/** A data line. */
export function line(
  { x, y }: { readonly x: readonly (number | null)[]; readonly y: readonly (number | null)[] },
  name: string,
  style: { readonly color: string; readonly dash?: string; readonly width?: number },
  more: Json = {},
): Json {
  return {
    type: "scatter",
    mode: "lines",
    x,
    y,
    name,
    line: { dash: "solid", width: 2.2, simplify: false, ...style },
    hoverinfo: "skip",
    ...more,
  };
}

/** A marker or several of one kind. */
export function marks(
  x: readonly number[],
  y: readonly number[],
  name: string,
  marker: Json,
  more: Json = {},
): Json {
  return { type: "scatter", mode: "markers", x, y, name, marker, hoverinfo: "skip", ...more };
}

/** The mark of what was chosen: the design's point, the feed stage. */
export const chosen: Json = {
  symbol: "diamond",
  size: 11,
  color: palette.amber,
  line: { color: palette.ink, width: 1.2 },
};

/** Words in the plot; positions are those of the axes unless `more` says "paper". */
export function words(text: string, x: number, y: number, more: Json = {}): Json {
  return {
    text,
    x,
    y,
    showarrow: false,
    align: "left",
    bgcolor: palette.paper,
    borderpad: 2,
    font: { size: 12, color: palette.ink },
    ...more,
  };
}

/** A legend inside the plot or under it. */
export function legend(more: Json): Json {
  return {
    showlegend: true,
    legend: { bgcolor: palette.paper, font: { size: 12, color: palette.ink }, tracegroupgap: 0, ...more },
  };
}
