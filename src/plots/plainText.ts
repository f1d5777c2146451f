/** Text for a figure, where `<` and `&` would be read as markup. */
export function plainText(text: string): string {
  return text.replace(/&/g, "&amp;").replace(/</g, "&lt;").replace(/>/g, "&gt;");
}

/** A name that leaves room for other words. */
export function shortName(name: string, longest = 26): string {
  const characters = [...name];
  return characters.length <= longest ? name : `${characters.slice(0, longest - 1).join("")}…`;
}

/** Breaks a text into lines of at most `width` characters, and ends it with an ellipsis after `most` lines. */
export function wrapped(text: string, width: number, most: number): string[] {
  const lines: string[] = [];
  let line = "";
  for (const word of text.split(/\s+/).map((each) => shortName(each, width))) {
    if (line !== "" && line.length + 1 + word.length > width) {
      lines.push(line);
      line = word;
    } else line = line === "" ? word : `${line} ${word}`;
  }
  lines.push(line);
  if (lines.length <= most) return lines;
  return [...lines.slice(0, most - 1), `${lines[most - 1]!.slice(0, width - 2)} …`];
}
