import { JSDOM } from "jsdom";
import { describe, expect, test } from "vitest";
import { represent } from "../../kernel/display/represent";
import { innerBox, outerBox } from "../../kernel/figures/elementBox";
import type { Figure } from "../../src/plots/figure";
import { stillHtml } from "../../kernel/figures/figureBundle";
import { pathLength, pointAtLength } from "../../kernel/figures/pathLength";
import type { SvgElement } from "../../kernel/figures/textBox";
import { textWidth } from "../../kernel/figures/textWidth";
import { showsFigure } from "../../kernel/figures/plotlyLoader";

const figure: Figure = {
  kind: "figure",
  name: "stagesAgainstReflux",
  title: "Stages against reflux",
  data: [{ type: "scatter", mode: "lines", name: "</script>", x: [1, 2, 3], y: [30, 20, 18] }],
  layout: {
    title: { text: "Stages against reflux" },
    width: 640,
    annotations: [{ x: 2, y: 20, text: "chosen" }],
  },
  cautions: [{ code: "stages-range-wide", severity: "check", kind: "method", message: "wide range" }],
  methods: [{ name: "Gilliland", source: "Ind. Eng. Chem. 32 (1940) 1220" }],
  alt: "A curve that falls",
};

describe("a figure", () => {
  const bundle = represent(figure);
  const html = String(bundle["text/html"]);
  const { document } = new JSDOM(html).window;

  test("has the plot as data, 450 high unless its layout says otherwise", () => {
    const plot = bundle["application/vnd.plotly.v1+json"] as { layout: { width: number; height: number } };
    expect([plot.layout.width, plot.layout.height]).toEqual([640, 450]);
    expect(showsFigure(bundle)).toBe(true);
  });

  test("has a still picture, also inside the HTML, with words for it", () => {
    const svg = String(bundle["image/svg+xml"]);
    expect(svg).toMatch(/^<svg[^>]* width="640" height="450"/);
    expect(svg).toContain("Stages against reflux");
    expect(svg).toContain("chosen");
    const picture = document.querySelector("figure img")!;
    expect(picture.getAttribute("alt")).toBe("A curve that falls");
    expect(picture.getAttribute("src")).toMatch(/^data:image\/svg\+xml;base64,/);
  });

  test("tells cautions and methods in HTML and in text", () => {
    expect(document.querySelector(".rb-cautions")!.textContent).toBe("checkwide range");
    expect(bundle["text/plain"]).toBe(
      "Figure: Stages against reflux\nA curve that falls\nCHECK: wide range\nmethods and sources:\n  Gilliland: Ind. Eng. Chem. 32 (1940) 1220",
    );
  });

  test("is the same in every run", () => {
    expect(JSON.stringify(represent(figure)) === JSON.stringify(bundle)).toBe(true);
  });

  test("carries no text that ends its script early", () => {
    expect(html.match(/<\/script>/g)).toHaveLength(1);
    expect(stillHtml(html)).not.toContain("script");
    expect(stillHtml(html)).toContain("<img");
  });

  test("that cannot be drawn still shows its data and words", () => {
    const broken = represent({
      ...figure,
      data: [{ type: "scatter", x: 3 }],
      layout: { xaxis: { range: 7 } },
    });
    expect(broken["application/vnd.plotly.v1+json"]).toBeDefined();
    expect(broken["text/html"]).toContain("A curve that falls");
  });
});

describe("measuring in a drawing", () => {
  const { document } = new JSDOM("<svg id='s'></svg>").window;
  const element = (markup: string): SvgElement => {
    document.body.innerHTML = `<svg>${markup}</svg>`;
    return document.querySelector("svg")!.firstElementChild as unknown as SvgElement;
  };

  // Liberation Sans, units of 2048 an em: R 1479, e 1139, f 569, l 455, u 1139, x 1024.
  test("text is as wide as its letters", () => {
    const reflux = (1479 + 1139 + 569 + 455 + 1139 + 1024) / 2048;
    expect(textWidth("Reflux", 12, "Arial", false)).toBeCloseTo(12 * reflux, 1);
    expect(textWidth("Reflux", 12, "Open Sans, verdana", false)).toBeGreaterThan(12 * reflux);
    expect(textWidth("Reflux", 12, "Arial", true)).toBeGreaterThan(12 * reflux);
  });

  test("the anchor moves a text, lines stack, spans have their own size", () => {
    const start = innerBox(element('<text font-family="Arial" font-size="10">Reflux</text>'));
    const end = innerBox(
      element('<text font-family="Arial" font-size="10" text-anchor="end" x="50">Reflux</text>'),
    );
    expect(end.x + end.width).toBeCloseTo(50, 9);
    expect(end.width).toBeCloseTo(start.width, 9);
    const lines = innerBox(
      element(
        '<text font-family="Arial" font-size="10"><tspan class="line">Reflux</tspan><tspan class="line">ab</tspan></text>',
      ),
    );
    expect(lines.width).toBeCloseTo(start.width, 9);
    expect(lines.height).toBeGreaterThan(2 * 10);
    const small = innerBox(
      element('<text font-family="Arial" font-size="10"><tspan style="font-size:50%">Reflux</tspan></text>'),
    );
    expect(small.width).toBeCloseTo(start.width / 2, 9);
  });

  test("groups hold what they hold, turned and moved", () => {
    const box = outerBox(
      element(
        '<g transform="translate(10,20)"><rect x="1" y="2" width="3" height="4"/><g transform="rotate(90)"><rect width="5" height="6"/></g></g>',
      ),
    );
    expect(box.x).toBeCloseTo(4, 9);
    expect(box.y).toBeCloseTo(20, 9);
    expect(box.x + box.width).toBeCloseTo(14, 9);
    expect(box.y + box.height).toBeCloseTo(26, 9);
  });

  test("paths of straight lines", () => {
    expect(pathLength("M0,0L3,4L3,14")).toBeCloseTo(15, 12);
    expect(pointAtLength("M0,0L3,4L3,14", 10)).toEqual({ x: 3, y: 9 });
    expect(pointAtLength("M0,0L3,4", 99)).toEqual({ x: 3, y: 4 });
    expect(pointAtLength("", 1)).toEqual({ x: 0, y: 0 });
  });
});
