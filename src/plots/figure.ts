import type { Caution, Judged } from "../base/result";
import { plainText, wrapped } from "./plainText";
import { type margins, palette } from "./theme";

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

interface Parts {
  readonly name: string;
  readonly title: string;
  /** On what the picture rests, under the title. */
  readonly subtitle: string;
  /** The numbers that matter, for those who do not see the picture. */
  readonly facts: readonly string[];
  readonly data: Figure["data"];
  readonly layout: Figure["layout"];
}

/** Puts a figure together; a `stop` caution of its result is written into the picture itself, under the title. */
export function figure({ name, title, subtitle, facts, data, layout }: Parts, result: Judged): Figure {
  const { width, height, margin } = layout as { width: number; height: number; margin: typeof margins };
  const lineLength = Math.floor((width - 32) / 5.8);
  const stops = stopLines(result.cautions, lineLength);
  const under = wrapped(subtitle, lineLength, 1);
  const room = stops.length * lineHeight + (stops.length > 0 ? 4 : 0);
  const small = (color: string) => (text: string) =>
    `<span style="font-size:12px;color:${color}">${plainText(text)}</span>`;
  const lines = [
    `<b>${plainText(title)}</b>`,
    ...under.map(small(palette.slate)),
    ...stops.map(small(palette.rust)),
  ];
  const whole = height + room;
  return {
    kind: "figure",
    name,
    title,
    data,
    layout: {
      ...layout,
      height: whole,
      margin: { ...margin, t: margin.t + room },
      title: {
        text: lines.join("<br>"),
        x: 16 / width,
        xanchor: "left",
        y: 1 - 18 / whole,
        yanchor: "top",
        font: { size: 15, color: palette.ink },
      },
    },
    alt: [title, subtitle, ...facts].join(". ") + ".",
    // Notes and hazards stand at the result itself; beside its picture they would only repeat.
    cautions: result.cautions.filter(({ severity, kind }) => severity !== "note" && kind !== "hazard"),
    methods: result.methods,
  };
}

/** Distance of the small lines of the title [px]. */
const lineHeight = 19.5;

function stopLines(cautions: readonly Caution[], lineLength: number): string[] {
  const [first, ...others] = cautions.filter(({ severity }) => severity === "stop");
  if (first === undefined) return [];
  const more = others.length === 0 ? "" : ` (and ${others.length} more)`;
  return wrapped(`Not to be relied on${more}: ${first.message}`, lineLength, 3);
}
