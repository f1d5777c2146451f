import { JSDOM } from "jsdom";
import { describe, expect, test } from "vitest";
import { transformMatrix } from "../../kernel/figures/elementBox";
import { sizedLayout } from "../../kernel/figures/figure";
import { figureSvg } from "../../kernel/figures/svg";
import { type Box, type SvgElement, textBox } from "../../kernel/figures/textBox";
import { figures } from "../plots/results";

interface PlacedText extends Box {
  readonly text: string;
}

function transformed({ x, y, width, height }: Box, transform: string): Box {
  const [a, b, c, d, e, f] = transformMatrix(transform);
  const corners = [x, x + width].flatMap((px) => [y, y + height].map((py) => [px, py] as const));
  const xs = corners.map(([px, py]) => a * px + c * py + e);
  const ys = corners.map(([px, py]) => b * px + d * py + f);
  const [left, top] = [Math.min(...xs), Math.min(...ys)];
  return { x: left, y: top, width: Math.max(...xs) - left, height: Math.max(...ys) - top };
}

/** Every text of a picture with its place in it. */
function textsOf(svg: string): PlacedText[] {
  const { document } = new JSDOM(svg, { contentType: "image/svg+xml" }).window;
  return Array.from(document.querySelectorAll("text")).flatMap((element) => {
    const text = element.textContent ?? "";
    let box = textBox(element as unknown as SvgElement);
    for (let at: Element | null = element; at !== null; at = at.parentElement)
      box = transformed(box, at.getAttribute("transform") ?? "");
    return text.trim() === "" ? [] : [{ ...box, text }];
  });
}

function overlap(a: Box, b: Box): boolean {
  const slack = 2; // px; heights of lines are generous
  return (
    a.x + a.width - slack > b.x &&
    b.x + b.width - slack > a.x &&
    a.y + a.height - slack > b.y &&
    b.y + b.height - slack > a.y
  );
}

describe.each(Object.entries(figures))("%s", (_, make) => {
  const figure = make();
  const layout = sizedLayout(figure);
  const texts = textsOf(figureSvg({ data: figure.data, layout }) ?? "");

  test("no text is cut off", () => {
    expect(texts.length).toBeGreaterThan(10);
    const outside = texts.filter(
      ({ x, y, width, height }) =>
        x < -1 || y < -1 || x + width > layout.width + 1 || y + height > layout.height + 1,
    );
    expect(outside.map(({ text }) => text)).toEqual([]);
  });

  test("no text runs into another", () => {
    const clashes = texts.flatMap((one, i) =>
      texts
        .slice(i + 1)
        .filter((other) => overlap(one, other))
        .map((other) => `${one.text} / ${other.text}`),
    );
    expect(clashes).toEqual([]);
  });
});
