import { expect, test } from "vitest";
import { drawShortcutCases } from "../bench/shortcutCases";
import { runExact, runSingleRoot } from "../bench/shortcutKernelRun";

const cases = drawShortcutCases(2000);

test("2000 cases: the checksum of test/bench/shortcutReference.c and shortcutReference.py", () => {
  expect(runSingleRoot(cases).all.toExponential(12)).toBe("8.537571988172e+4");
});

test("two runs of the kernel give the same to the last bit: nothing is carried over from case to case", () => {
  expect(runExact(cases)).toEqual(runExact(cases));
});
