import type { Caution, Judged } from "../base/result";
import { palette } from "./theme";

/** A picture of a result: plotly's data and layout as plain JSON, and what it shows in words. */
export interface Figure extends Judged {
  readonly kind: "figure";
  /** The function that made it. */
  readonly name: string;
  readonly title: string;
  readonly data: readonly Readonly<Record<string, unknown>>[];
  readonly layout: Readonly<Record<string, unknown>>;
  /** The picture in words, with the numbers that matter. */
  readonly alt: string;
}

/** Puts a figure together; a `stop` caution of its result is written into the picture itself. */
export function figure(parts: Omit<Figure, "kind" | "cautions" | "methods">, result: Judged): Figure {
  const stop = result.cautions.find(({ severity }) => severity === "stop");
  const layout = stop === undefined ? parts.layout : withWarning(parts.layout, stop);
  // Notes and hazards stand at the result itself; beside its picture they would only repeat.
  const cautions = result.cautions.filter(({ severity, kind }) => severity !== "note" && kind !== "hazard");
  return { kind: "figure", ...parts, layout, cautions, methods: result.methods };
}

/** What fits on one line over the plot: about 5.6 px a character, less the margins and the opening words. */
function fitting(message: string, width: unknown): string {
  const most = Math.floor(((typeof width === "number" ? width : 700) - 100) / 5.6) - 24;
  return message.length > most ? `${message.slice(0, most - 3)}...` : message;
}

function withWarning(layout: Figure["layout"], { message }: Caution): Figure["layout"] {
  const text = fitting(message, layout["width"]);
  const warning = {
    text: `<b>not to be relied on:</b> ${text}`,
    xref: "paper",
    yref: "paper",
    x: 0,
    y: 1.005,
    xanchor: "left",
    yanchor: "bottom",
    showarrow: false,
    font: { size: 11, color: palette.brick },
  };
  return { ...layout, annotations: [...((layout["annotations"] as object[] | undefined) ?? []), warning] };
}
