import type { Caution, MethodUsed } from "../../src/base/result";
import { escapeHtml } from "./markup";

/** Cautions as a list that names each severity in words. */
export function cautionsHtml(cautions: readonly Caution[]): string {
  if (cautions.length === 0) return "";
  const items = cautions.map(({ severity, message, source }) => {
    const cited = source === undefined ? "" : ` <span class="rb-source">(${escapeHtml(source)})</span>`;
    return `<li class="rb-${escapeHtml(severity)}"><b>${escapeHtml(severity)}</b>${escapeHtml(message)}${cited}</li>`;
  });
  return `<ul class="rb-cautions" aria-label="cautions">${items.join("")}</ul>`;
}

/** Methods with their published sources, folded away. */
export function methodsHtml(methods: readonly MethodUsed[]): string {
  if (methods.length === 0) return "";
  const items = methods.map(({ name, source }) => `<li>${escapeHtml(name)}: ${escapeHtml(source)}</li>`);
  return `<details class="rb-methods"><summary>Methods and sources</summary><ul>${items.join("")}</ul></details>`;
}

/** Cautions as lines of text. */
export function cautionLines(cautions: readonly Caution[]): string[] {
  return cautions.map(({ severity, message }) => `${severity.toUpperCase()}: ${message}`);
}

/** Methods as lines of text. */
export function methodLines(methods: readonly MethodUsed[]): string[] {
  return methods.length === 0
    ? []
    : ["methods and sources:", ...methods.map(({ name, source }) => `  ${name}: ${source}`)];
}
