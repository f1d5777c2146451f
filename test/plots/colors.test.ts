import { describe, expect, test } from "vitest";
import { palette } from "../../src/plots/theme";
import { figures } from "./results";

type Triple = readonly [number, number, number];

/**
 * Full color deficiency in linear RGB, by rows. Source: G. M. Machado, M. M. Oliveira and L. A. F. Fernandes, IEEE Trans.
 * Visualization Comput. Graphics 15 (2009) 1291, matrices of severity 1.0.
 */
const seenBy: Readonly<Record<string, readonly Triple[]>> = {
  "normal vision": [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ],
  protanopia: [
    [0.152286, 1.052583, -0.204868],
    [0.114503, 0.786281, 0.099216],
    [-0.003882, -0.048116, 1.051998],
  ],
  deuteranopia: [
    [0.367322, 0.860646, -0.227968],
    [0.280085, 0.672501, 0.047413],
    [-0.01182, 0.04294, 0.968881],
  ],
  tritanopia: [
    [1.255528, -0.076749, -0.178779],
    [-0.078411, 0.930809, 0.147602],
    [0.004733, 0.691367, 0.3039],
  ],
};

/** sRGB to CIE XYZ (IEC 61966-2-1), white D65. */
const toXyz: readonly Triple[] = [
  [0.4124, 0.3576, 0.1805],
  [0.2126, 0.7152, 0.0722],
  [0.0193, 0.1192, 0.9505],
];
const white: Triple = [0.9505, 1, 1.089];

function linear(color: string): Triple {
  const parts = [1, 3, 5].map((at) => Number.parseInt(color.slice(at, at + 2), 16) / 255);
  return parts.map((v) => (v <= 0.04045 ? v / 12.92 : ((v + 0.055) / 1.055) ** 2.4)) as unknown as Triple;
}

function times(matrix: readonly Triple[], v: Triple): Triple {
  return matrix.map((row) => row[0] * v[0] + row[1] * v[1] + row[2] * v[2]) as unknown as Triple;
}

/** CIE 1976 L*a*b*. */
function lab(rgb: Triple): Triple {
  const inGamut = rgb.map((v) => Math.min(1, Math.max(0, v))) as unknown as Triple;
  const [fx, fy, fz] = times(toXyz, inGamut).map((v, i) => {
    const t = v / white[i]!;
    return t > 0.008856 ? Math.cbrt(t) : 7.787 * t + 16 / 116;
  }) as unknown as Triple;
  return [116 * fy - 16, 500 * (fx - fy), 200 * (fy - fz)];
}

/** Distance in L*a*b*; about 2.3 is just noticeable. */
function distance(one: string, other: string, eyes: readonly Triple[]): number {
  const [a, b] = [lab(times(eyes, linear(one))), lab(times(eyes, linear(other)))];
  return Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);
}

/** Contrast of W3C's accessibility guidelines: 3 for lines, 4.5 for text. */
function contrast(one: string, other: string): number {
  const luminance = (color: string): number => times(toXyz, linear(color))[1];
  const [a, b] = [luminance(one), luminance(other)];
  return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
}

const data = ["ink", "spruce", "rust", "iris", "amber"] as const;
const pairs = data.flatMap((one, i) => data.slice(i + 1).map((other) => [one, other] as const));

describe.each(Object.entries(seenBy))("with %s", (_, eyes) => {
  test.each(pairs)("%s and %s are far apart", (one, other) => {
    expect(distance(palette[one], palette[other], eyes)).toBeGreaterThan(25);
  });
});

test("the measure itself: black to white is 100, red and green meet for deuteranopes", () => {
  const normal = seenBy["normal vision"]!;
  expect(distance("#000000", "#ffffff", normal)).toBeCloseTo(100, 1);
  expect(contrast("#000000", "#ffffff")).toBeCloseTo(21, 1);
  const [red, green] = ["#b05030", "#707030"];
  expect(distance(red, green, seenBy["deuteranopia"]!)).toBeLessThan(0.4 * distance(red, green, normal));
});

test("text and lines stand out from the paper", () => {
  for (const name of ["ink", "spruce", "rust", "iris", "slate"] as const)
    expect(contrast(palette[name], palette.paper)).toBeGreaterThan(4.5);
});

interface StyledLine {
  readonly name: string;
  readonly line: { readonly dash: string; readonly width: number; readonly color: string };
}

test.each(Object.entries(figures))("%s: no two lines differ by color alone", (_, make) => {
  const lines = make().data.filter(({ mode }) => String(mode).includes("lines"));
  const styles = new Map<string, string>();
  for (const { name, line } of lines as unknown as readonly StyledLine[]) {
    const style = `${line.dash} ${line.width} ${lines.length > 7 ? line.color : ""}`;
    const before = styles.get(style);
    expect(before === undefined || before === name, `${name} and ${before}: ${style}`).toBe(true);
    styles.set(style, name);
  }
});
