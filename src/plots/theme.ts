/**
 * One look for all figures. The five line colors stay apart for readers with any of the common color deficiencies (a
 * test measures it), and no two lines of a figure differ by color alone.
 */
export const palette = {
  ink: "#1c2530",
  lake: "#00677d",
  brick: "#b3412e",
  ochre: "#d9a03f",
  plum: "#6b3f87",
  stone: "#7d8894",
  grid: "#dfe4e8",
  paper: "#fcfcfa",
} as const;

const fontFamily = "Helvetica, Arial, DejaVu Sans, sans-serif";

/** Title over a figure, in bold, with a lighter second line. */
export function titled(title: string, subtitle: string): Record<string, unknown> {
  return {
    text: `<b>${title}</b><br><span style="font-size:12px;color:${palette.stone}">${subtitle}</span>`,
    x: 0.02,
    xanchor: "left",
    y: 0.96,
    yanchor: "top",
    font: { size: 15, color: palette.ink },
  };
}

/** An axis with its words and unit. */
export function axis(title: string, more: Readonly<Record<string, unknown>> = {}): Record<string, unknown> {
  return {
    title: { text: title, standoff: 10 },
    showline: true,
    linecolor: palette.stone,
    mirror: true,
    gridcolor: palette.grid,
    zeroline: false,
    ticks: "outside",
    tickcolor: palette.stone,
    ...more,
  };
}

const margin = { l: 70, r: 24, t: 70, b: 108 } as const;
/** From the axis line down to the legend, past tick labels and axis title [px]. */
const legendDrop = 62;

/** Height at which the plot area of a figure of this width is square. */
export function squareHeight(width: number): number {
  return width - margin.l - margin.r + margin.t + margin.b;
}

/** What all figures share: size, fonts, paper, margins, legend under the plot. */
export function baseLayout(width: number, height: number): Record<string, unknown> {
  return {
    width,
    height,
    paper_bgcolor: palette.paper,
    plot_bgcolor: palette.paper,
    font: { family: fontFamily, size: 13, color: palette.ink },
    margin,
    legend: {
      orientation: "h",
      x: 0,
      y: -legendDrop / (height - margin.t - margin.b),
      yanchor: "top",
      font: { size: 12 },
    },
    hovermode: "closest",
  };
}

/** A note with a quiet frame, for the numbers that matter. */
export function note(text: string, more: Readonly<Record<string, unknown>>): Record<string, unknown> {
  return {
    text,
    align: "left",
    showarrow: false,
    bgcolor: palette.paper,
    bordercolor: palette.stone,
    borderwidth: 1,
    borderpad: 5,
    font: { size: 12, color: palette.ink },
    ...more,
  };
}
