import { shown } from "../base/check";
import { DesignInputError, type Issue } from "../base/errors";
import { nearest } from "../base/nearest";
import { buildComponent, componentIds, storedNames } from "./buildComponent";
import type { Component } from "./component";
import { simplified } from "./componentName";

interface NameIndex {
  /** Id by name as listed. */
  readonly exact: ReadonlyMap<string, string>;
  /** Id by name without case and punctuation. */
  readonly loose: ReadonlyMap<string, string>;
}

function indexNames(): NameIndex {
  const exact = new Map<string, string>();
  const loose = new Map<string, string>();
  for (const id of componentIds) {
    for (const name of storedNames(id)) {
      exact.set(name, id);
      loose.set(simplified(name), id);
    }
  }
  return { exact, loose };
}

let index: NameIndex | undefined;
const built = new Map<string, Component>();

/** Names are indexed, and components built, when first asked for. */
function names(): NameIndex {
  return (index ??= indexNames());
}

function ofId(id: string): Component {
  let component = built.get(id);
  if (component === undefined) built.set(id, (component = buildComponent(id)));
  return component;
}

/** All components of the built-in table, in its order. */
export function allComponents(): readonly Component[] {
  return componentIds.map(ofId);
}

/** The component of that id, name, synonym or CAS number, or undefined. */
export function lookUp(name: string): Component | undefined {
  const { exact, loose } = names();
  const id = exact.get(name) ?? loose.get(simplified(name));
  return id === undefined ? undefined : ofId(id);
}

const mostNamed = 3;

/** Names of up to three components spelled much like this one, none twice. */
export function namedAlike(name: string): string[] {
  const { exact } = names();
  const found = new Map<string, string>();
  for (const candidate of nearest(name, [...exact.keys()], 4 * mostNamed)) {
    const id = exact.get(candidate)!;
    if (candidate !== id && !found.has(id)) found.set(id, candidate);
    if (candidate === id && !found.has(id)) found.set(id, ofId(id).name);
  }
  return [...found.values()].slice(0, mostNamed);
}

/** The fault of a name that is not in the table; names the nearest ones. */
export function unknownComponent(path: string, name: string, alike = namedAlike(name)): Issue {
  const hint = alike.length === 0 ? "" : ` Did you mean ${alike.map((each) => `"${each}"`).join(" or ")}?`;
  const message = `${path}: no component ${shown(name)} in the table.${hint} findComponents searches it; defineComponent adds your own`;
  return { code: "unknown-component", path, message, value: name };
}

/**
 * A component of the built-in table: constants (SI), property equations with range, grade and source, hazards.
 *
 * Takes an id, name, synonym or CAS number; upper and lower case, spaces and hyphens do not matter. What the table does
 * not know of a component is absent.
 *
 * Source: the publications named in the component's `sources` and in each block's `source`.
 *
 * @throws DesignInputError when there is none of that name; the message names the nearest
 * @example component("71-43-2").name // "benzene"
 */
export function component(nameOrCas: string): Component {
  if (typeof nameOrCas !== "string") {
    const message = `component must be named by a text, got ${shown(nameOrCas)}`;
    throw new DesignInputError([{ code: "wrong-type", path: "component", message, value: nameOrCas }]);
  }
  const found = lookUp(nameOrCas);
  if (found === undefined) throw new DesignInputError([unknownComponent("component", nameOrCas)]);
  return found;
}
