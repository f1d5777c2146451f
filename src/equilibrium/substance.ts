import type { Component } from "../components/component";
import { lookUp } from "../components/componentTable";

/** What kind of substance a component is, as far as known. */
export interface Substance {
  readonly id: string;
  readonly formula?: string | undefined;
  readonly family?: string | undefined;
}

/** Kind of a component; a component of the user's own that the table also has, by CAS number or name, is that one. */
export function substanceOf(component: Component): Substance {
  const { id, cas, name, formula, family } = component;
  if (family !== undefined && formula !== undefined) return { id, formula, family };
  const listed = lookUp(cas ?? name);
  return { id: listed?.id ?? id, formula: formula ?? listed?.formula, family: family ?? listed?.family };
}

export function isWater({ formula }: Substance): boolean {
  return formula === "H2O";
}

/** Whether a formula holds carbon, which chlorine, calcium and their like do not. */
export function isCarbonCompound({ formula }: Substance): boolean {
  return formula !== undefined && /C(?![a-z])/.test(formula);
}

/** Carboxylic acids pair in the vapor; their anhydrides, of the same family, have a third oxygen and do not. */
export function isCarboxylicAcid({ family, formula }: Substance): boolean {
  return family !== undefined && /\bacid\b/.test(family) && !/O3$/.test(formula ?? "");
}

export function isHydrocarbon({ formula }: Substance): boolean {
  return formula !== undefined && /^C\d*H\d+$/.test(formula);
}

const polar = /\b(alcohol|phenol|acid|ketone|aldehyde|ester|nitrile|amide|amine)\b/;

export function isPolar({ family }: Substance): boolean {
  return family !== undefined && polar.test(family);
}
