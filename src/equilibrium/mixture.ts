import { readText, shown } from "../base/check";
import { readComposition } from "../base/composition";
import type { Issue } from "../base/errors";
import { didYouMean } from "../base/nearest";
import type { Component } from "../components/component";
import { resolveComponent } from "../components/resolveComponent";

/** Components with their mole fractions, in the order and under the names typed. */
export interface Mixture {
  readonly names: readonly string[];
  readonly components: readonly Component[];
  readonly fractions: Float64Array;
}

/** A component with the name under which a result shows it. */
export interface Member {
  readonly component: Component;
  readonly name: string;
}

/** Below this mole fraction there is less than one molecule in a mole: the component is absent. */
export const leastFraction = 1e-24;

/** Members that are there at all: components that are absent say nothing about a mixture. */
export function presentMembers({ names, components, fractions }: Mixture): Member[] {
  const members: Member[] = [];
  for (let i = 0; i < names.length; i++) {
    if (fractions[i]! >= leastFraction) members.push({ component: components[i]!, name: names[i]! });
  }
  return members;
}

/**
 * Reads a composition and looks its components up, those of the user first. Undefined after a reported fault; two
 * names of one component are one.
 */
export function readMixture(
  faults: Issue[],
  path: string,
  composition: unknown,
  ownComponents: readonly Component[],
  normalize: boolean,
): Mixture | undefined {
  const named = readComposition(faults, path, composition, normalize);
  // The names are looked up even when the fractions are at fault, so that all faults are reported at once.
  const names = named?.names ?? namesOf(composition);
  const components = resolveComponents(faults, path, names, ownComponents);
  return named === undefined || components === undefined ? undefined : { ...named, components };
}

function namesOf(composition: unknown): readonly string[] {
  const isRecord = typeof composition === "object" && composition !== null && !Array.isArray(composition);
  const names = isRecord ? Object.keys(composition) : [];
  return names.length > 500 ? [] : names;
}

/** Looks names up; reports unknown names and names that mean one component. */
export function resolveComponents(
  faults: Issue[],
  path: string,
  names: readonly string[],
  ownComponents: readonly Component[],
): readonly Component[] | undefined {
  const before = faults.length;
  const nameOf = new Map<Component, string>();
  const components: Component[] = [];
  for (const name of names) {
    const component = resolveComponent(faults, `${path}.${name}`, name, ownComponents);
    if (component === undefined) continue;
    const earlier = nameOf.get(component);
    if (earlier !== undefined) {
      const message = `${path} must name each component once, but "${earlier}" and "${name}" are both ${component.name}; add their fractions together`;
      faults.push({ code: "duplicate-component", path: `${path}.${name}`, message, value: name });
    }
    nameOf.set(component, name);
    components.push(component);
  }
  return faults.length > before ? undefined : components;
}

/** Position of a member of the mixture under the name typed or another name of the same component; -1 after a fault. */
export function findMember(
  faults: Issue[],
  path: string,
  name: unknown,
  mixture: Mixture,
  ownComponents: readonly Component[],
): number {
  const typed = readText(faults, path, name);
  if (typed === undefined) return -1;
  const at = mixture.names.indexOf(typed);
  if (at >= 0) return at;
  const found = resolveComponent([], path, typed, ownComponents);
  const other = found === undefined ? -1 : mixture.components.indexOf(found);
  if (other < 0) {
    const message = `${path} must be a component of the composition, got ${shown(typed)}.${didYouMean(typed, mixture.names)}`;
    faults.push({ code: "key-absent", path, message, value: typed });
  }
  return other;
}
