import azeotropes from "./data/azeotropes.json";

/** A binary azeotrope as listed. */
export interface Azeotrope {
  /** Ids of the two components. */
  readonly components: readonly [string, string];
  /** Mole fraction of the first component. */
  readonly firstMoleFraction: number;
  /** [K] */
  readonly temperature: number;
  /** [Pa] */
  readonly pressure: number;
  readonly boiling: "minimum" | "maximum";
  /** 2 when the liquid parts into two. */
  readonly liquidPhases: 1 | 2;
  /** Where the numbers were read, or that they are from memory. */
  readonly source: string;
}

const listed = azeotropes as unknown as readonly Azeotrope[];
const byPair = new Map(listed.map((azeotrope) => [pairKey(...azeotrope.components), azeotrope]));

function pairKey(first: string, second: string): string {
  return first < second ? `${first}|${second}` : `${second}|${first}`;
}

/** The listed azeotrope of two components by their ids, or undefined: none listed, which does not mean none exists. */
export function findAzeotrope(firstId: string, secondId: string): Azeotrope | undefined {
  return byPair.get(pairKey(firstId, secondId));
}

/** All listed azeotropes. */
export function allAzeotropes(): readonly Azeotrope[] {
  return listed;
}
