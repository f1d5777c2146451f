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

/** One section of a column: its flows, and what of each component it carries up, the same at every level. */
export interface ColumnSection {
  readonly liquid: number;
  readonly vapor: number;
  /** V y - L x. */
  readonly lightUp: number;
  /** V (1 - y) - L (1 - x). */
  readonly heavyUp: number;
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

/** Distillate as it depends on the reflux ratio R: D = light/(constant + slope R). */
export interface DistillateLaw {
  readonly light: number;
  readonly constant: number;
  readonly slope: number;
}

/** From the balances of all and of the light component; with open steam the bottoms grow with the reflux. */
export function distillateLaw(column: BinaryColumn): DistillateLaw {
  const { distillateLightFraction: xD, bottomsLightFraction: xB, openSteam } = column;
  let light = 0;
  for (const { flow, lightFraction, q } of column.streams) {
    light += flow * (lightFraction - (openSteam ? q * xB : xB));
  }
  return openSteam ? { light, constant: xD, slope: xB } : { light, constant: xD - xB, slope: 0 };
}

/**
 * Constant molar overflow from the top down: L = R D, V = (R + 1) D, then q F joins the liquid and (1 - q) F leaves the
 * vapor at every stream. With open steam the vapor of the last section is the steam, and its liquid the bottoms.
 */
export function columnFlows(column: BinaryColumn, refluxRatio: number): ColumnFlows {
  const { distillateLightFraction: xD, streams } = column;
  const { light, constant, slope } = distillateLaw(column);
  const distillate = light / (constant + slope * refluxRatio);
  const sections: ColumnSection[] = [
    {
      liquid: refluxRatio * distillate,
      vapor: (refluxRatio + 1) * distillate,
      lightUp: distillate * xD,
      heavyUp: distillate * (1 - xD),
    },
  ];
  const intersections: number[] = [];
  for (const stream of streams) {
    const above = sections[sections.length - 1]!;
    sections.push(below(above, stream));
    intersections.push(meeting(above, stream));
  }
  const last = sections.pop()!;
  const bottoms = column.openSteam ? last.liquid : bottomsOf(column);
  sections.push(closedAtBottom(column, last, bottoms));
  return { distillate, bottoms, sections, intersections };
}

/** The section under a stream. */
function below(above: ColumnSection, { flow, lightFraction, q }: ColumnStream): ColumnSection {
  return {
    liquid: above.liquid + q * flow,
    vapor: above.vapor - (1 - q) * flow,
    lightUp: above.lightUp - flow * lightFraction,
    heavyUp: above.heavyUp - flow * (1 - lightFraction),
  };
}

/** Bottoms over a reboiler, from the balances without a difference of large flows. */
function bottomsOf({ streams, distillateLightFraction: xD, bottomsLightFraction: xB }: BinaryColumn): number {
  let heavy = 0;
  for (const { flow, lightFraction } of streams) heavy += flow * (xD - lightFraction);
  return heavy / (xD - xB);
}

/** What the last section carries, from the bottoms: exact where they are nearly pure. */
function closedAtBottom(column: BinaryColumn, last: ColumnSection, bottoms: number): ColumnSection {
  const { bottomsLightFraction: xB, openSteam } = column;
  const heavyDown = bottoms * (1 - xB);
  return { ...last, lightUp: -bottoms * xB, heavyUp: openSteam ? last.vapor - heavyDown : -heavyDown };
}

/** x where the operating line of a section, V y = L x + N, meets the q-line of the stream under it. */
function meeting({ liquid, vapor, lightUp }: ColumnSection, { lightFraction, q }: ColumnStream): number {
  return (vapor * lightFraction - (1 - q) * lightUp) / ((1 - q) * liquid + q * vapor);
}

/** y of the vapor that rises past the liquid x. */
export function operatingVapor({ liquid, vapor, lightUp }: ColumnSection, x: number): number {
  return (liquid * x + lightUp) / vapor;
}
