import MarkdownIt from "markdown-it";
import * as fs from "node:fs";
import * as path from "node:path";
import { dataUrl, escapeHtml } from "../display/markup";
import type { ProseCell } from "../notebook/notebookFormat";

const pictureTypes: Readonly<Record<string, string>> = {
  ".png": "image/png",
  ".jpg": "image/jpeg",
  ".jpeg": "image/jpeg",
  ".gif": "image/gif",
  ".webp": "image/webp",
  ".svg": "image/svg+xml",
};

/** A picture named in prose as a data URL: one pasted into the cell, or a file beside the notebook. */
function embedded(source: string, cell: ProseCell, folder: string): string | undefined {
  if (source.startsWith("data:")) return source;
  if (source.startsWith("attachment:")) {
    const pasted = cell.attachments?.[decodeURIComponent(source.slice("attachment:".length))];
    const [type, content] = Object.entries(pasted ?? {})[0] ?? [];
    return type === undefined ? undefined : `data:${type};base64,${String(content).replace(/\s/g, "")}`;
  }
  const type = pictureTypes[path.extname(source).toLowerCase()];
  const file = path.resolve(folder, decodeURIComponent(source));
  return type !== undefined && fs.existsSync(file) ? dataUrl(type, fs.readFileSync(file)) : undefined;
}

/** Prose as HTML that needs no other file; a picture that cannot be embedded leaves its words. */
export function proseHtml(cell: ProseCell, folder: string): string {
  const markdown = new MarkdownIt({ html: false, linkify: false, typographer: false });
  markdown.validateLink = (url) => !/^(javascript|vbscript|file):/i.test(url.trim());
  markdown.renderer.rules.image = (tokens, index) => {
    const token = tokens[index]!;
    const url = embedded(String(token.attrGet("src") ?? ""), cell, folder);
    const words = escapeHtml(token.content);
    return url === undefined
      ? `<em>[picture: ${words}]</em>`
      : `<img alt="${words}" src="${escapeHtml(url)}">`;
  };
  return markdown.render(cell.source);
}
