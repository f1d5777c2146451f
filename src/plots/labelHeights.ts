/** A label of those given, and where along the axis it stands (0 to 1). */
export interface PlacedLabel {
  readonly index: number;
  readonly height: number;
}

/**
 * Moves labels that would overlap apart, as little as their order allows; `room` is how many fit. Where there are more,
 * some between the first and the last are left out.
 */
export function labelHeights(wanted: readonly number[], room: number): PlacedLabel[] {
  const sorted = wanted.map((height, index) => ({ index, height })).sort((a, b) => a.height - b.height);
  const fitting = Math.max(1, Math.floor(room));
  const every = Math.max(1, (sorted.length - 1) / Math.max(1, fitting - 1));
  const count = Math.min(fitting, sorted.length);
  const kept = Array.from({ length: count }, (_, k) => sorted[Math.round(k * every)]!);
  const gap = 1 / room;
  const heights = kept.map(({ height }) => Math.min(1, Math.max(0, height)));
  for (let i = 1; i < count; i++) heights[i] = Math.max(heights[i]!, heights[i - 1]! + gap);
  // what was pushed over the top comes back down
  for (let i = count - 1; i >= 0; i--) {
    heights[i] = Math.min(heights[i]!, i === count - 1 ? 1 : heights[i + 1]! - gap);
  }
  return kept.map(({ index }, i) => ({ index, height: heights[i]! }));
}
