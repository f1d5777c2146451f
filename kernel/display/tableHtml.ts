import type { ResultTable, TableSection } from "../../src/study/resultTable";
import { cautionsHtml, methodsHtml } from "./judgment";
import { escapeHtml } from "./markup";
import { resultStyle } from "./resultStyle";

function sectionHtml(section: TableSection, title: string): string {
  const css = (column: number) => (section.numeric[column] === true ? ' class="rb-number"' : "");
  const caption =
    section.heading === undefined
      ? `<span class="rb-unseen">${escapeHtml(title)}</span>`
      : escapeHtml(section.heading);
  const head = section.columns.map((text, i) => `<th scope="col"${css(i)}>${escapeHtml(text)}</th>`);
  const rows = section.rows.map((row) => {
    const cells = row.map((text, i) =>
      i === 0 ? `<th scope="row"${css(0)}>${escapeHtml(text)}</th>` : `<td${css(i)}>${escapeHtml(text)}</td>`,
    );
    return `<tr>${cells.join("")}</tr>`;
  });
  return `<table class="rb-table"><caption>${caption}</caption><thead><tr>${head.join("")}</tr></thead><tbody>${rows.join("")}</tbody></table>`;
}

/** A result table as HTML: cautions first, then the numbers, methods and sources last. */
export function tableHtml(table: ResultTable): string {
  return [
    `<div class="rb-result">${resultStyle}`,
    `<div class="rb-title">${escapeHtml(table.title)}</div>`,
    cautionsHtml(table.cautions),
    ...table.sections.map((section) => sectionHtml(section, table.title)),
    methodsHtml(table.methods),
    "</div>",
  ].join("");
}
