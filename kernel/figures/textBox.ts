import { textWidth } from "./textWidth";

/** Position and size of what an element draws. */
export interface Box {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** The part of the page's element interface that measuring needs. */
export interface SvgElement {
  readonly tagName: string;
  readonly textContent: string | null;
  readonly parentNode: SvgElement | null;
  readonly childNodes: ArrayLike<SvgElement & { readonly nodeType: number }>;
  readonly style?: Readonly<Record<string, string>>;
  getAttribute(name: string): string | null;
}

const lineHeight = 1.3;
const ascent = 0.93;

/** A text property of the element or the nearest one around it. */
function inherited(element: SvgElement | null, property: string, attribute: string): string {
  for (let at = element; at !== null && at.getAttribute !== undefined; at = at.parentNode) {
    const value = at.style?.[property] || at.getAttribute(attribute);
    if (value !== null && value !== undefined && value !== "") return value;
  }
  return "";
}

function fontSize(element: SvgElement | null): number {
  const text = inherited(element, "fontSize", "font-size");
  const size = Number.parseFloat(text);
  if (text.endsWith("%") || text.endsWith("em")) {
    return fontSize(element?.parentNode ?? null) * (text.endsWith("%") ? size / 100 : size);
  }
  return Number.isFinite(size) ? size : 12;
}

function advance(element: SvgElement): number {
  let sum = 0;
  for (const child of Array.from(element.childNodes)) {
    if (child.nodeType === 1) sum += advance(child);
    else if (child.nodeType === 3) {
      const weight = inherited(element, "fontWeight", "font-weight");
      const family = inherited(element, "fontFamily", "font-family");
      const bold = weight === "bold" || Number(weight) >= 600;
      sum += textWidth(child.textContent ?? "", fontSize(element), family, bold);
    }
  }
  return sum;
}

/** Box of a text element; lines are the children that plotly.js marks as such. */
export function textBox(element: SvgElement): Box {
  const lines = Array.from(element.childNodes).filter(
    (child) => child.nodeType === 1 && /\bline\b/.test(child.getAttribute("class") ?? ""),
  );
  const width = Math.max(...(lines.length > 0 ? lines : [element]).map(advance));
  const size = fontSize(element);
  const anchor = inherited(element, "textAnchor", "text-anchor");
  const shift = anchor === "middle" ? 0.5 : anchor === "end" ? 1 : 0;
  const x = Number(element.getAttribute("x") ?? 0) || 0;
  const y = Number(element.getAttribute("y") ?? 0) || 0;
  const height = width === 0 ? 0 : size * (1.15 + lineHeight * Math.max(0, lines.length - 1));
  return { x: x - shift * width, y: y - ascent * size, width, height };
}
