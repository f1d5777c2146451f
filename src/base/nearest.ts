/** Edits (insert, delete, replace, swap of neighbors) that turn one text into the other, compared without case. */
export function editDistance(a: string, b: string): number {
  const from = a.toLowerCase();
  const to = b.toLowerCase();
  let beforeLast: number[] = [];
  let last = Array.from({ length: to.length + 1 }, (_, j) => j);
  for (let i = 1; i <= from.length; i++) {
    const row = [i];
    for (let j = 1; j <= to.length; j++) {
      const cost = from[i - 1] === to[j - 1] ? 0 : 1;
      let least = Math.min(last[j]! + 1, row[j - 1]! + 1, last[j - 1]! + cost);
      if (i > 1 && j > 1 && from[i - 1] === to[j - 2] && from[i - 2] === to[j - 1]) {
        least = Math.min(least, beforeLast[j - 2]! + 1);
      }
      row.push(least);
    }
    beforeLast = last;
    last = row;
  }
  return last[to.length]!;
}

/** Up to `most` candidates nearest in spelling, nearest first; only those that a slip could explain. */
export function nearest(text: string, candidates: readonly string[], most = 1): string[] {
  const typed = text.slice(0, 60);
  const slack = Math.max(2, Math.floor(typed.length / 3));
  return candidates
    .filter((candidate) => Math.abs(candidate.length - typed.length) <= slack)
    .map((candidate) => ({ candidate, distance: editDistance(typed, candidate) }))
    .filter(({ distance }) => distance <= slack)
    .sort((a, b) => a.distance - b.distance)
    .slice(0, most)
    .map(({ candidate }) => candidate);
}

/** " Did you mean x?" or nothing. */
export function didYouMean(text: string, candidates: readonly string[], most = 1): string {
  const found = nearest(text, candidates, most);
  return found.length === 0 ? "" : ` Did you mean ${found.map((name) => `"${name}"`).join(" or ")}?`;
}
