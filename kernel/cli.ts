#!/usr/bin/env node
import { readWord } from "./commandLine";
import { ownPackage, packageVersion } from "./packageRoot";
import { runCommand } from "./runCommand";
import { UsageError } from "./usageError";

/** A command: what it does in a line, and how it is carried out. */
interface Command {
  readonly help: string;
  readonly run: (words: readonly string[]) => Promise<number>;
}

const commands: Readonly<Record<string, Command>> = {
  run: { help: "run a notebook and write the executed notebook and a report", run: runCommand },
};

function help(): string {
  const lines = Object.entries(commands).map(([name, command]) => `  ${name}  ${command.help}`);
  return `refluxbook <command> [options]

Commands:
${lines.join("\n")}

refluxbook <command> --help tells more; refluxbook --version tells the version.
`;
}

async function main(words: readonly string[]): Promise<number> {
  const [first, ...rest] = words;
  if (first === undefined || first === "--help" || first === "help") {
    (first === undefined ? process.stderr : process.stdout).write(help());
    return first === undefined ? 2 : 0;
  }
  if (first === "--version") {
    process.stdout.write(`${packageVersion(ownPackage())}\n`);
    return 0;
  }
  return commands[readWord("command", first, [...Object.keys(commands), "--help", "--version"])]!.run(rest);
}

main(process.argv.slice(2)).then(
  (code) => {
    process.exitCode = code;
  },
  (error: unknown) => {
    const text = error instanceof UsageError ? error.message : String((error as Error).stack ?? error);
    process.stderr.write(`refluxbook: ${text}\n`);
    process.exitCode = 2;
  },
);
