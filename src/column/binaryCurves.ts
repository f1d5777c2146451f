import { type ColumnFlows, operatingVapor } from "../staging/binaryColumn";
import type { TypedStream } from "../staging/binaryInput";
import { feedPinch } from "../staging/feedLine";
import type { Staircase } from "../staging/stepStages";
import type { Curve } from "../shortcut/gillilandCurve";
import type { BinaryTask } from "./mccabeThieleInput";

/** The lines of a McCabe-Thiele diagram. */
export interface BinaryCurves {
  readonly equilibrium: Curve;
  /** One a section, from the top. */
  readonly operatingLines: readonly Curve[];
  /** From the diagonal to the curve; one a stream. */
  readonly qLines: readonly Curve[];
  readonly staircase: Curve;
}

/** Liquid fractions of the drawn curve, denser towards both pure components. */
const cosines = Array.from({ length: 119 }, (_, i) => 0.5 - 0.5 * Math.cos((Math.PI * (i + 1)) / 120));

/** Fractions from below the impurity of a product up to the first of the grid, even on a logarithmic axis. */
function towardsPure(impurity: number): number[] {
  const first = cosines[0]!;
  const least = Math.max(0.1 * impurity, 1e-16);
  const count = Math.max(0, Math.ceil(3 * Math.log10(first / least)));
  return Array.from({ length: count }, (_, k) => least * (first / least) ** (k / count));
}

function gridOf({ xD, xB }: BinaryTask): number[] {
  const heavyEnd = towardsPure(1 - xD).map((x) => 1 - x);
  return [0, ...towardsPure(xB), ...cosines, ...heavyEnd.reverse(), 1];
}

/** Above this many stages a staircase is a black band; the first ones are drawn. */
const mostDrawn = 400;

/** All lines of the diagram of a solved binary column. */
export function binaryCurves(
  task: BinaryTask,
  streams: readonly TypedStream[],
  flows: ColumnFlows,
  stairs: Staircase,
): BinaryCurves {
  const { sections, intersections } = flows;
  const grid = gridOf(task);
  const ends = [task.xD, ...intersections, task.xB];
  return {
    equilibrium: { x: grid, y: grid.map(task.curve.vapor) },
    operatingLines: sections.map((section, k) => {
      const x = [ends[k]!, ends[k + 1]!];
      return { x, y: x.map((each) => operatingVapor(section, each)) };
    }),
    qLines: streams.map((stream) => {
      const [x, y] = feedPinch(task.curve, stream);
      return { x: [stream.lightFraction, x], y: [stream.lightFraction, y] };
    }),
    staircase: staircaseLine(task, stairs),
  };
}

/** From the distillate on the diagonal: across to the curve, down to the operating line, and so on. */
function staircaseLine({ xD }: BinaryTask, { liquid, vapor, count }: Staircase): Curve {
  const x = [xD];
  const y = [xD];
  const drawn = Math.min(count, mostDrawn);
  for (let i = 0; i < drawn; i++) {
    x.push(liquid[i]!, liquid[i]!);
    y.push(vapor[i]!, i + 1 < count ? vapor[i + 1]! : liquid[i]!);
  }
  return { x, y };
}
