/**
 * Advance widths of the characters from space to tilde, in thousandths of the font size: Liberation Sans, which has
 * those of the common sans-serif faces of the same design; read from its horizontal metrics table.
 */
const advances = [
  278, 278, 355, 556, 556, 889, 667, 191, 333, 333, 389, 584, 278, 333, 278, 278, 556, 556, 556, 556, 556,
  556, 556, 556, 556, 556, 278, 278, 584, 584, 584, 556, 1015, 667, 667, 722, 722, 667, 611, 778, 722, 278,
  500, 667, 556, 833, 722, 778, 667, 778, 722, 667, 611, 722, 667, 944, 667, 667, 611, 278, 278, 278, 469,
  556, 333, 556, 556, 500, 556, 556, 278, 556, 556, 222, 222, 500, 222, 833, 556, 556, 556, 556, 333, 500,
  278, 556, 500, 722, 500, 500, 500, 334, 260, 334, 584,
];
const otherAdvance = 600;
const boldOverRegular = 1.07;
/** Wide faces (DejaVu Sans, Verdana) over the one of the table; used when the font asked for is not of its design. */
const wideOverTable = 1.15;
const tableFaces = /^\s*["']?(arial|helvetica|liberation sans|arimo)/i;

/** Width of a text in the unit of `size`. */
export function textWidth(text: string, size: number, family: string, bold: boolean): number {
  let thousandths = 0;
  for (const character of text) thousandths += advances[character.codePointAt(0)! - 32] ?? otherAdvance;
  const face = tableFaces.test(family) ? 1 : wideOverTable;
  return (thousandths / 1000) * size * face * (bold ? boldOverRegular : 1);
}
