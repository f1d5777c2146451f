import { didYouMean } from "../../src/base/nearest";
import type { Declaration } from "../cellOutput";
import { UsageError } from "../usageError";
import { type CodeCell, hasTag, isCode, type Notebook } from "./notebookFormat";

/** A parameter and the value it shall have. */
export interface Setting {
  readonly name: string;
  readonly value: unknown;
}

/** Reads `name=value`: a JSON literal, or bare text. */
export function readSetting(text: string): Setting {
  const at = text.indexOf("=");
  const name = text.slice(0, Math.max(at, 0)).trim();
  if (!/^[\p{L}_$][\p{L}\p{N}_$]*$/u.test(name)) {
    throw new UsageError(
      `--set needs name=value, such as --set refluxOverMinimum=1.3; got ${JSON.stringify(text)}`,
    );
  }
  const typed = text.slice(at + 1);
  let value: unknown = typed;
  try {
    value = JSON.parse(typed);
  } catch {
    // bare text
  }
  if (value === Infinity || value === -Infinity)
    throw new UsageError(`--set ${text}: the number is too large`);
  return { name, value };
}

/** The cell tagged `parameters`, if there is one. */
export function parametersCell(notebook: Notebook): CodeCell | undefined {
  return notebook.cells.filter(isCode).find((cell) => hasTag(cell, "parameters"));
}

/** Refuses settings for what the parameters cell does not declare, all of them at once. */
export function checkSettings(settings: readonly Setting[], declared: readonly Declaration[]): void {
  const names = declared.map(({ name }) => name);
  const unknown = settings.filter(({ name }) => !names.includes(name));
  if (unknown.length === 0) return;
  const known =
    names.length === 0 ? "It has none: no cell is tagged parameters." : `It has ${names.join(", ")}.`;
  const faults = unknown.map(
    ({ name }) => `the notebook has no parameter "${name}".${didYouMean(name, names)}`,
  );
  throw new UsageError(`${faults.join("\n")}\n${known}`);
}

function declarationOf({ name, value }: Setting, declared: readonly Declaration[]): string {
  const { keyword, type } = declared.find((declaration) => declaration.name === name)!;
  return `${keyword} ${name}${type === undefined ? "" : `: ${type}`} = ${JSON.stringify(value)};`;
}

/**
 * The notebook with a cell of new values right after the one tagged `parameters`; it takes the place of one injected
 * earlier. Each value keeps the declared type.
 */
export function injectParameters(
  notebook: Notebook,
  settings: readonly Setting[],
  declared: readonly Declaration[],
): Notebook {
  checkSettings(settings, declared);
  const cells = notebook.cells.filter((cell) => !hasTag(cell, "injected-parameters"));
  if (settings.length === 0) return { ...notebook, cells };
  const injected: CodeCell = {
    cell_type: "code",
    id: "injected-parameters",
    metadata: { tags: ["injected-parameters"] },
    source: ["// values of this run", ...settings.map((setting) => declarationOf(setting, declared))].join(
      "\n",
    ),
    execution_count: null,
    outputs: [],
  };
  const at = cells.findIndex((cell) => isCode(cell) && hasTag(cell, "parameters")) + 1;
  return { ...notebook, cells: [...cells.slice(0, at), injected, ...cells.slice(at)] };
}

/** Every parameter with the value of this run, as it is written in code. */
export function parameterValues(
  declared: readonly Declaration[],
  settings: readonly Setting[],
): { name: string; value: string }[] {
  return declared.map(({ name, value }) => {
    const setting = settings.find((candidate) => candidate.name === name);
    return { name, value: setting === undefined ? (value ?? "") : JSON.stringify(setting.value) };
  });
}
