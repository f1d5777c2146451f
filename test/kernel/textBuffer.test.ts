import { afterEach, beforeEach, expect, test, vi } from "vitest";
import { createTextBuffer } from "../../kernel/textBuffer";

let pieces: [string, string, number][] = [];

function bufferOf(most?: number) {
  return createTextBuffer<number>((name, text, cell) => pieces.push([name, text, cell]), most);
}

beforeEach(() => {
  pieces = [];
  vi.useFakeTimers();
});
afterEach(() => vi.useRealTimers());

test("joins writes of one stream and cell", () => {
  const buffer = bufferOf();
  buffer.write("stdout", "a", 1);
  buffer.write("stdout", "b", 1);
  buffer.write("stderr", "c", 1);
  buffer.write("stderr", "d", 2);
  expect(pieces).toEqual([
    ["stdout", "ab", 1],
    ["stderr", "c", 1],
  ]);
  vi.advanceTimersByTime(60);
  expect(pieces.at(-1)).toEqual(["stderr", "d", 2]);
});

test("20,000 lines come in few pieces and whole", () => {
  const buffer = bufferOf();
  for (let i = 0; i < 20_000; i++) buffer.write("stdout", `line ${i}\n`, 1);
  buffer.flush();
  expect(pieces.length).toBeLessThan(10);
  expect(
    pieces
      .map(([, text]) => text)
      .join("")
      .split("\n"),
  ).toHaveLength(20_001);
});

test("a busy loop does not hold text back", () => {
  const buffer = bufferOf();
  buffer.write("stdout", "a", 1);
  vi.setSystemTime(Date.now() + 300);
  buffer.write("stdout", "b", 1);
  expect(pieces).toEqual([["stdout", "ab", 1]]);
});

test("what one cell prints is cut with a note, and the next begins anew", () => {
  const buffer = bufferOf(10);
  buffer.write("stdout", "12345678", 1);
  buffer.write("stdout", "abcdef", 1);
  buffer.write("stdout", "never", 1);
  buffer.startCell();
  buffer.write("stdout", "next", 2);
  buffer.flush();
  expect(pieces.map(([, text]) => text)).toEqual([
    "12345678ab\n[the rest is cut: a cell may print 10 characters]\n",
    "next",
  ]);
});
