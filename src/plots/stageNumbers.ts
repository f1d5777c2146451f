import type { BinaryStage, McCabeThiele } from "../column/mccabeThiele";
import type { DiagramAxes } from "./diagramAxes";
import { marks, palette, words } from "./theme";

/** Steps between two numbered stages, so that about sixteen are numbered. */
function spacing(count: number): number {
  return [1, 2, 5, 10, 20, 50, 100, 200].find((each) => count / each <= 16) ?? 500;
}

/** Least distance between two numbers, of the width of the diagram. */
const apart = 0.05;

/** The stages whose numbers have room: first, last and feed stages before the round ones. */
function numbered(
  steps: readonly BinaryStage[],
  feedStages: readonly number[],
  axes: DiagramAxes,
): Set<number> {
  const every = spacing(steps.length);
  const first = [1, steps.length, ...feedStages].map((stage) => steps[stage - 1]);
  const taken: { readonly stage: number; readonly at: readonly [number, number] }[] = [];
  for (const step of [...first, ...steps.filter(({ stage }) => stage % every === 0)]) {
    if (step === undefined) continue;
    const at = [axes.place(step.x), axes.place(step.y)] as const;
    const inside = Math.min(...at) > 0 && Math.max(...at) < 1;
    const free = taken.every(({ at: [x, y] }) => Math.max(Math.abs(x - at[0]), Math.abs(y - at[1])) >= apart);
    if (inside && free) taken.push({ stage: step.stage, at });
  }
  return new Set(taken.map(({ stage }) => stage));
}

/** Numbers of stages at the corners of the staircase, over whatever runs there. */
export function stageNumbers(result: McCabeThiele, drawn: number, axes: DiagramAxes) {
  const { feedStages } = result;
  const steps = result.steps.slice(0, drawn);
  const withNumber = numbered(steps, feedStages, axes);
  return steps
    .filter(({ stage }) => withNumber.has(stage))
    .map(({ stage, x, y }) =>
      words(String(stage), axes.annotated(x), axes.annotated(y), {
        xanchor: "right",
        yanchor: "bottom",
        xshift: feedStages.includes(stage) ? -5 : -1,
        yshift: 1,
        borderpad: 1,
        font: { size: 11, color: palette.ink },
      }),
    );
}

/** Corners of the staircase, which tell x and y of a stage when pointed at. */
export function stageCorners({ steps }: McCabeThiele, drawn: number, axes: DiagramAxes) {
  const shown = steps.slice(0, drawn);
  const marker = { size: 3, color: palette.ink };
  const hovertemplate =
    "stage %{customdata[0]}<br>x %{customdata[1]:.5f}<br>y %{customdata[2]:.5f}<extra></extra>";
  return marks(
    shown.map(({ x }) => axes.drawn(x)),
    shown.map(({ y }) => axes.drawn(y)),
    "stage",
    marker,
    {
      customdata: shown.map(({ stage, x, y }) => [stage, x, y]),
      hovertemplate,
      hoverinfo: "all",
      showlegend: false,
    },
  );
}
