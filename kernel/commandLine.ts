import { didYouMean } from "../src/base/nearest";
import { UsageError } from "./usageError";

/** An option of a command. */
export interface Option {
  readonly name: string;
  /** What its value is, as help shows it; absent for a switch. */
  readonly value?: string;
  readonly help: string;
}

/** What was typed after a command. */
export interface Arguments {
  readonly positional: readonly string[];
  /** All values given for each option, in order; a switch has the value "". */
  readonly given: ReadonlyMap<string, readonly string[]>;
}

function unknown(what: string, typed: string, known: readonly string[]): UsageError {
  return new UsageError(`no ${what} ${typed}.${didYouMean(typed, known)} Known: ${known.join(", ")}`);
}

/** One of a few words. @throws UsageError that names the nearest */
export function readWord(what: string, typed: string, known: readonly string[]): string {
  if (known.includes(typed)) return typed;
  throw unknown(what, typed, known);
}

/** Reads what was typed: `--option value`, `--option=value`, switches, and the rest in order. */
export function readArguments(typed: readonly string[], options: readonly Option[]): Arguments {
  const positional: string[] = [];
  const given = new Map<string, string[]>();
  const left = [...typed];
  for (let word = left.shift(); word !== undefined; word = left.shift()) {
    if (!word.startsWith("-") || word === "-") {
      positional.push(word);
      continue;
    }
    const [name = word, ...attached] = word.split("=");
    const option = options.find((candidate) => candidate.name === name);
    if (option === undefined)
      throw unknown(
        "option",
        name,
        options.map((candidate) => candidate.name),
      );
    given.set(name, [...(given.get(name) ?? []), valueOf(option, attached, left)]);
  }
  return { positional, given };
}

function valueOf({ name, value }: Option, attached: readonly string[], left: string[]): string {
  if (value === undefined) {
    if (attached.length > 0) throw new UsageError(`${name} takes no value`);
    return "";
  }
  const found = attached.length > 0 ? attached.join("=") : left.shift();
  if (found === undefined || found === "") throw new UsageError(`${name} needs ${value}`);
  return found;
}

/** The last value of an option. */
export function lastValue({ given }: Arguments, name: string): string | undefined {
  return given.get(name)?.at(-1);
}

/** Options as aligned lines of help. */
export function optionHelp(options: readonly Option[]): string {
  const words = options.map(({ name, value }) => (value === undefined ? name : `${name} ${value}`));
  const width = Math.max(...words.map((word) => word.length));
  return options.map(({ help }, i) => `  ${words[i]!.padEnd(width)}  ${help}`).join("\n");
}
