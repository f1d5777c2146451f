/** A feed of a binary column; a draw is a negative flow, its q 1 for liquid and 0 for vapor. */
export interface ColumnStream {
  /** [mol/s], or per mole of feed. */
  readonly flow: number;
  /** Mole fraction of the light component. */
  readonly lightFraction: number;
  readonly q: number;
}

/** A binary column apart from its reflux: streams from the top, products, how vapor enters at the bottom. */
export interface BinaryColumn {
  readonly streams: readonly ColumnStream[];
  readonly distillateLightFraction: number;
  readonly bottomsLightFraction: number;
  readonly openSteam: boolean;
}

/** One section of a column: its flows, and the light component it carries up, V y - L x, the same at every level. */
export interface ColumnSection {
  readonly liquid: number;
  readonly vapor: number;
  readonly lightUp: number;
}

/** Flows of a column at a reflux ratio. */
export interface ColumnFlows {
  readonly distillate: number;
  readonly bottoms: number;
  /** From the top: one more than there are streams. */
  readonly sections: readonly ColumnSection[];
  /** x at which the operating lines of neighboring sections meet, from the top. */
  readonly intersections: readonly number[];
}

/**
 * Constant molar overflow from the top down: L = R D, V = (R + 1) D, then q F joins the liquid and (1 - q) F leaves the
 * vapor at every stream. With open steam the vapor of the last section is the steam, and its liquid the bottoms.
 */
export function columnFlows(column: BinaryColumn, refluxRatio: number): ColumnFlows {
  const { distillateLightFraction: xD } = column;
  const distillate = distillateOf(column, refluxRatio);
  const sections: ColumnSection[] = [
    { liquid: refluxRatio * distillate, vapor: (refluxRatio + 1) * distillate, lightUp: distillate * xD },
  ];
  const intersections: number[] = [];
  let total = 0;
  for (const { flow, lightFraction, q } of column.streams) {
    const above = sections[sections.length - 1]!;
    const below = {
      liquid: above.liquid + q * flow,
      vapor: above.vapor - (1 - q) * flow,
      lightUp: above.lightUp - flow * lightFraction,
    };
    sections.push(below);
    intersections.push(meeting(above, below));
    total += flow;
  }
  const last = sections[sections.length - 1]!;
  return {
    distillate,
    bottoms: column.openSteam ? last.liquid : total - distillate,
    sections,
    intersections,
  };
}

/** Distillate from the balances of all and of the light component. */
function distillateOf(column: BinaryColumn, refluxRatio: number): number {
  const { distillateLightFraction: xD, bottomsLightFraction: xB, openSteam } = column;
  let light = 0;
  for (const { flow, lightFraction, q } of column.streams) {
    light += flow * (lightFraction - (openSteam ? q * xB : xB));
  }
  return light / (openSteam ? xD + refluxRatio * xB : xD - xB);
}

/** x where V y = L x + N of two sections meet. */
function meeting(above: ColumnSection, below: ColumnSection): number {
  const x =
    (above.vapor * below.lightUp - below.vapor * above.lightUp) /
    (above.liquid * below.vapor - below.liquid * above.vapor);
  return x;
}

/** y of the vapor that rises past the liquid x. */
export function operatingVapor({ liquid, vapor, lightUp }: ColumnSection, x: number): number {
  return (liquid * x + lightUp) / vapor;
}
