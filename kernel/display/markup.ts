/** Text as HTML content or an attribute value. */
export function escapeHtml(text: string): string {
  return text.replace(/&/g, "&amp;").replace(/</g, "&lt;").replace(/>/g, "&gt;").replace(/"/g, "&quot;");
}

/** JSON that is safe inside a script element. */
export function scriptJson(value: unknown): string {
  return JSON.stringify(value)
    .replace(/</g, "\\u003c")
    .replace(/\u2028/g, "\\u2028")
    .replace(/\u2029/g, "\\u2029");
}

/** Text or bytes as a data URL. */
export function dataUrl(mediaType: string, content: string | Buffer): string {
  return `data:${mediaType};base64,${Buffer.from(content).toString("base64")}`;
}
