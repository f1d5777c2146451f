import type { TypedStream } from "./binaryInput";
import type { EquilibriumCurve } from "./equilibriumCurve";
import { feedPinch } from "./feedLine";

interface Leveled {
  readonly stream: TypedStream;
  readonly x: number;
}

/**
 * Streams in the order in which the column meets them from the top, whatever the order in which they were typed: those
 * with a stage by stage, the others put between them by the liquid at which their q-line meets the curve.
 */
export function streamsFromTheTop(streams: readonly TypedStream[], curve: EquilibriumCurve): TypedStream[] {
  const leveled = streams.map((stream) => ({ stream, x: feedPinch(curve, stream)[0] })).sort(richerFirst);
  const staged = leveled
    .filter(({ stream }) => stream.stage !== undefined)
    .sort((a, b) => a.stream.stage! - b.stream.stage!);
  const ordered: Leveled[] = [];
  for (const free of leveled) {
    if (free.stream.stage !== undefined) continue;
    while (staged[0] !== undefined && staged[0].x >= free.x) ordered.push(staged.shift()!);
    ordered.push(free);
  }
  return [...ordered, ...staged].map(({ stream }) => stream);
}

function richerFirst(a: Leveled, b: Leveled): number {
  return b.x - a.x || b.stream.q - a.stream.q || b.stream.flow - a.stream.flow;
}
