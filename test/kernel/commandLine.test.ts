import { describe, expect, test } from "vitest";
import { lastValue, optionHelp, readArguments, readWord } from "../../kernel/commandLine";

const options = [
  { name: "--set", value: "name=value", help: "set" },
  { name: "--still-figures", help: "small" },
];

describe("reading a command line", () => {
  test("values after a space or an equals sign, switches, the rest in order", () => {
    const typed = readArguments(["a", "--set", "x=1", "b", "--set=y=2", "--still-figures"], options);
    expect(typed.positional).toEqual(["a", "b"]);
    expect(typed.given.get("--set")).toEqual(["x=1", "y=2"]);
    expect(typed.given.has("--still-figures")).toBe(true);
    expect(lastValue(typed, "--set")).toBe("y=2");
    expect(lastValue(typed, "--out")).toBeUndefined();
  });

  test.each([
    [["--sett", "x=1"], /no option --sett\. Did you mean "--set"\?/],
    [["-x"], /no option -x/],
    [["--set"], /--set needs name=value/],
    [["--still-figures=1"], /takes no value/],
  ])("%j is refused", (words, message) => {
    expect(() => readArguments(words, options)).toThrow(message);
  });

  test("an unknown word is told with the nearest", () => {
    expect(readWord("command", "run", ["run"])).toBe("run");
    expect(() => readWord("command", "rnu", ["run"])).toThrow(
      'no command rnu. Did you mean "run"? Known: run',
    );
  });

  test("help is aligned", () => {
    expect(optionHelp(options)).toBe("  --set name=value  set\n  --still-figures   small");
  });
});
