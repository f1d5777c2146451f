import { shown } from "../base/check";
import { DesignInfeasibleError, type Issue } from "../base/errors";
import type { BinaryColumn } from "./binaryColumn";
import type { TypedStream } from "./binaryInput";

/** Refuses products that no column can make of these streams. */
export function refuseImpossibleProducts(column: BinaryColumn, streams: readonly TypedStream[]): void {
  const issues = [...impossibleFractions(column), ...pureFeeds(streams)];
  if (issues.length === 0) issues.push(...impossibleFlows(column, streams));
  if (issues.length === 0) issues.push(...impossibleDraws(column, streams));
  if (issues.length > 0) throw new DesignInfeasibleError(issues);
}

/** What a product holds at least of either component: numbers near 1 are told apart to about this. */
const purest = 1e-15;

function infeasible(path: string, rule: string, value: number, limit: number): Issue {
  return { code: "specification-infeasible", path, message: `${path} ${rule}`, value, limit };
}

function impossibleFractions(column: BinaryColumn): Issue[] {
  const { distillateLightFraction: xD, bottomsLightFraction: xB } = column;
  const issues: Issue[] = [];
  for (const [path, value] of [
    ["distillateLightFraction", xD],
    ["bottomsLightFraction", xB],
  ] as const) {
    if (value >= purest && value <= 1 - purest) continue;
    const rule = `must lie between 0 and 1, by at least ${purest}, got ${value}: a pure product needs endless stages`;
    issues.push(infeasible(path, rule, value, value < purest ? purest : 1 - purest));
  }
  if (xD <= xB) {
    const rule = `must exceed bottomsLightFraction ${xB}, got ${xD}`;
    issues.push(infeasible("distillateLightFraction", rule, xD, xB));
  }
  return issues;
}

function pureFeeds(streams: readonly TypedStream[]): Issue[] {
  return streams
    .filter(({ flow, lightFraction: z }) => flow > 0 && !(z > 0 && z < 1))
    .map(({ path, lightFraction: z }) => {
      const rule = `must lie between 0 and 1, both excluded, got ${z}: there is nothing to separate`;
      return infeasible(`${path}.lightFraction`, rule, z, z > 0 ? 1 : 0);
    });
}

/** The products must be what the streams leave: both flows above zero. */
function impossibleFlows(column: BinaryColumn, streams: readonly TypedStream[]): Issue[] {
  const { distillateLightFraction: xD, bottomsLightFraction: xB } = column;
  let total = 0;
  let light = 0;
  let liquid = 0;
  for (const { flow, lightFraction, q } of streams) {
    total += flow;
    light += flow * lightFraction;
    liquid += flow * q;
  }
  const draw = streams.find(({ flow }) => flow < 0);
  const mean = light / total;
  if (draw !== undefined && !(total > 0 && light > 0 && light < total && mean > xB && mean < xD)) {
    const rule = `is too much: the draws leave ${shown(light)} of the light component in ${shown(total)}, from which the two products cannot be made; draw less`;
    return [infeasible(`${draw.path}.flow`, rule, -draw.flow, -draw.flow)];
  }
  const from = streams.length === 1 ? "the feed" : "the feeds together";
  const issues: Issue[] = [];
  if (!(xD > mean)) {
    const rule = `must exceed the light fraction of ${from}, ${mean}, got ${xD}`;
    issues.push(infeasible("distillateLightFraction", rule, xD, mean));
  }
  if (!(xB < mean)) {
    const rule = `must be below the light fraction of ${from}, ${mean}, got ${xB}`;
    issues.push(infeasible("bottomsLightFraction", rule, xB, mean));
  }
  // With open steam the bottoms hold all the liquid that is fed.
  if (issues.length === 0 && column.openSteam && !(light > liquid * xB)) {
    const rule = `must be below ${shown(light / liquid)}, got ${xB}: over open steam all liquid fed leaves as bottoms, which would hold more of the light component than is fed`;
    issues.push(infeasible("bottomsLightFraction", rule, xB, light / liquid));
  }
  return issues;
}

function impossibleDraws(column: BinaryColumn, streams: readonly TypedStream[]): Issue[] {
  const { distillateLightFraction: xD, bottomsLightFraction: xB } = column;
  return streams
    .filter(({ flow, lightFraction: x }) => flow < 0 && !(x > xB && x < xD))
    .map(({ path, lightFraction: x }) => {
      const rule = `must lie between bottomsLightFraction ${xB} and distillateLightFraction ${xD}, got ${x}: no stage holds it`;
      return infeasible(`${path}.lightFraction`, rule, x, x > xB ? xD : xB);
    });
}
