/** A place in a file, both numbers from 1. */
export interface Place {
  readonly line: number;
  readonly column: number;
}

/** The place of a character in a text. */
export function placeAt(text: string, offset: number): Place {
  const before = text.slice(0, offset).split("\n");
  return { line: before.length, column: before[before.length - 1]!.length + 1 };
}
