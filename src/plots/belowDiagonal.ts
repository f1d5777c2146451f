import { plainText } from "./plainText";
import { legend, square, squareMargins, words } from "./theme";

const lineHeight = 16;

/** The empty triangle under the diagonal holds the numbers and, over them, the legend. */
export function belowDiagonal(facts: readonly string[], annotations: readonly object[] = []) {
  const height = square.height - squareMargins.t - squareMargins.b;
  const [first, ...others] = facts.map(plainText);
  const text = [`<b>${first}</b>`, ...others].join("<br>");
  const corner = { xref: "paper", yref: "paper", xanchor: "right", yanchor: "bottom" };
  return {
    annotations: [...annotations, words(text, 0.985, 0.025, corner)],
    ...legend({
      x: 0.985,
      xanchor: "right",
      y: 0.045 + (facts.length * lineHeight) / height,
      yanchor: "bottom",
    }),
  };
}
