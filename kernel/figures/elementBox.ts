import { type Box, type SvgElement, textBox } from "./textBox";

/** x' = a x + c y + e, y' = b x + d y + f. */
type Matrix = readonly [a: number, b: number, c: number, d: number, e: number, f: number];

const none: Box = { x: 0, y: 0, width: 0, height: 0 };
const identity: Matrix = [1, 0, 0, 1, 0, 0];

function product(m: Matrix, n: Matrix): Matrix {
  return [
    m[0] * n[0] + m[2] * n[1],
    m[1] * n[0] + m[3] * n[1],
    m[0] * n[2] + m[2] * n[3],
    m[1] * n[2] + m[3] * n[3],
    m[0] * n[4] + m[2] * n[5] + m[4],
    m[1] * n[4] + m[3] * n[5] + m[5],
  ];
}

function rotation(degrees: number, x: number, y: number): Matrix {
  const cos = Math.cos((degrees * Math.PI) / 180);
  const sin = Math.sin((degrees * Math.PI) / 180);
  return [cos, sin, -sin, cos, x - cos * x + sin * y, y - sin * x - cos * y];
}

/** A transform attribute as one matrix. */
export function transformMatrix(text: string): Matrix {
  let matrix = identity;
  for (const [, name, list] of text.matchAll(/(translate|rotate|scale)\(([^)]*)\)/g)) {
    const [first = 0, second, third = 0] = list!.split(/[\s,]+/).map(Number);
    if (name === "translate") matrix = product(matrix, [1, 0, 0, 1, first, second ?? 0]);
    else if (name === "rotate") matrix = product(matrix, rotation(first, second ?? 0, third));
    else matrix = product(matrix, [first, 0, 0, second ?? first, 0, 0]);
  }
  return matrix;
}

function moved({ x, y, width, height }: Box, [a, b, c, d, e, f]: Matrix): Box {
  const corners = [x, x + width].flatMap((px) => [y, y + height].map((py) => [px, py] as const));
  return around(
    corners.map(([px, py]) => ({ x: a * px + c * py + e, y: b * px + d * py + f, width: 0, height: 0 })),
  );
}

function around(boxes: readonly Box[]): Box {
  if (boxes.length === 0) return none;
  const x = Math.min(...boxes.map((box) => box.x));
  const y = Math.min(...boxes.map((box) => box.y));
  const right = Math.max(...boxes.map((box) => box.x + box.width));
  const bottom = Math.max(...boxes.map((box) => box.y + box.height));
  return { x, y, width: right - x, height: bottom - y };
}

function numbered(element: SvgElement): Box {
  const read = (name: string) => Number(element.getAttribute(name)) || 0;
  return { x: read("x"), y: read("y"), width: read("width"), height: read("height") };
}

/** Box of what an element draws, in its own coordinates: texts and rectangles; curves are left out. */
export function innerBox(element: SvgElement): Box {
  if (element.tagName === "text" || element.tagName === "tspan") return textBox(element);
  if (element.tagName === "rect" || element.tagName === "image") return numbered(element);
  const children = Array.from(element.childNodes).filter((child) => child.nodeType === 1);
  return around(children.map(outerBox).filter(({ width, height }) => width > 0 || height > 0));
}

/** The same in the coordinates of the element around it. */
export function outerBox(element: SvgElement): Box {
  const transform = element.getAttribute("transform");
  return transform === null || transform === ""
    ? innerBox(element)
    : moved(innerBox(element), transformMatrix(transform));
}
