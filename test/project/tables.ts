import { readFileSync } from "node:fs";
import { join } from "node:path";
import { cautionCodes } from "../../src/base/cautionCodes";
import { issueCodes } from "../../src/base/codes";
import { sweepStatus } from "../../src/base/sweepStatus";
import { unitTable } from "../../src/base/unitTable";
import { siUnit } from "../../src/base/units";
import { root } from "./sourceFiles";

/** The file that holds the tables, between `<!-- table name -->` and `<!-- end -->`. */
export const tablesFile = join(root, "DEVELOPERS.md");

function markdownTable(head: readonly string[], rows: readonly (readonly string[])[]): string {
  const line = (cells: readonly string[]): string => `| ${cells.join(" | ")} |`;
  return [line(head), line(head.map(() => "---")), ...rows.map(line)].join("\n");
}

const code = (text: string): string => `\`${text}\``;

/** The tables of the documentation, made from the code that they describe. */
const tables: Readonly<Record<string, () => string>> = {
  issueCodes: () =>
    markdownTable(
      ["code", "rule"],
      Object.entries(issueCodes).map(([name, rule]) => [code(name), rule]),
    ),
  cautionCodes: () =>
    markdownTable(
      ["code", "what it says"],
      Object.entries(cautionCodes).map(([name, meaning]) => [code(name), meaning]),
    ),
  sweepStatus: () =>
    markdownTable(
      ["status", "meaning"],
      sweepStatus.map((meaning, i) => [String(i), i === 0 ? meaning : code(meaning)]),
    ),
  units: () =>
    markdownTable(
      ["quantity", "SI, as results carry it", "read as text"],
      Object.entries(unitTable).map(([dimension, units]) => [
        dimension.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`),
        siUnit[dimension as keyof typeof unitTable],
        Object.keys(units).join(", "),
      ]),
    ),
};

/** The text of the file with its tables made anew; throws for a table that nobody makes. */
export function withTables(text: string): string {
  return text.replace(
    /(<!-- table (\w+) -->\n)[\s\S]*?(\n<!-- end -->)/g,
    (_whole, head, name: string, tail) => {
      const make = tables[name];
      if (make === undefined) throw new Error(`no table is called ${name}`);
      return `${head as string}${make()}${tail as string}`;
    },
  );
}

/** Names of the tables that the file has no place for. */
export function missingTables(text: string): string[] {
  return Object.keys(tables).filter((name) => !text.includes(`<!-- table ${name} -->`));
}

export const tablesText = (): string => readFileSync(tablesFile, "utf8");
