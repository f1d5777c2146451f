import { refuseAsInfeasible } from "../base/errors";
import { type BinaryColumn, columnFlows } from "./binaryColumn";
import type { MinimumReflux } from "./minimumReflux";

/** Refuses a reflux ratio at which a section runs out of liquid or vapor although no pinch forbids it. */
export function refuseVanishingFlow(
  column: BinaryColumn,
  refluxRatio: number,
  { limitedBy, minimumReflux }: MinimumReflux,
): void {
  if (limitedBy !== "vanishing-flow" || refluxRatio > minimumReflux) return;
  const { sections } = columnFlows(column, refluxRatio);
  const noVapor = sections.findIndex(({ vapor }) => !(vapor > 0));
  const noLiquid = sections.findIndex(({ liquid }) => !(liquid > 0));
  if (noVapor < 0 && noLiquid < 0) return;
  const k = noVapor < 0 ? noLiquid : noVapor;
  const flow = noVapor < 0 ? sections[k]!.liquid : sections[k]!.vapor;
  refuseAsInfeasible({
    code: noVapor < 0 ? "negative-liquid" : "negative-boilup",
    path: "refluxRatio",
    message: `refluxRatio must exceed ${Number(minimumReflux.toPrecision(12))}, got ${refluxRatio}: the ${noVapor < 0 ? "liquid" : "vapor"} in section ${k + 1} from the top would be ${Number(flow.toPrecision(4))}; raise the reflux`,
    value: refluxRatio,
    limit: minimumReflux,
  });
}
