import { shown } from "../base/check";
import type { Issue } from "../base/errors";
import { nearest } from "../base/nearest";
import type { Component } from "./component";
import { namesOf, simplified } from "./componentName";
import { lookUp, namedAlike, unknownComponent } from "./componentTable";
import { isComponent } from "./isComponent";

/** The user's own components by name: as written first, without case and punctuation second. */
interface OwnNames {
  readonly exact: ReadonlyMap<string, Component>;
  readonly loose: ReadonlyMap<string, Component>;
}

const indexed = new WeakMap<readonly Component[], OwnNames>();

function ownNames(ownComponents: readonly Component[]): OwnNames {
  const known = indexed.get(ownComponents);
  if (known !== undefined) return known;
  const exact = new Map<string, Component>();
  const loose = new Map<string, Component>();
  for (const component of ownComponents) {
    for (const name of namesOf(component)) {
      if (!exact.has(name)) exact.set(name, component);
      if (!loose.has(simplified(name))) loose.set(simplified(name), component);
    }
  }
  const names = { exact, loose };
  indexed.set(ownComponents, names);
  return names;
}

/** Beyond this many faults no nearest names are sought: it takes time, and nobody reads them. */
const mostSuggested = 20;

/** The user's own component of that name, else that of the built-in table; undefined after a reported fault. */
export function resolveComponent(
  faults: Issue[],
  path: string,
  name: string,
  ownComponents: readonly Component[] = [],
): Component | undefined {
  const found = (ownComponents.length === 0 ? undefined : findOwn(ownComponents, name)) ?? lookUp(name);
  if (found === undefined) {
    const suggest = faults.length < mostSuggested;
    const own =
      suggest && ownComponents.length > 0 ? nearest(name, [...ownNames(ownComponents).exact.keys()]) : [];
    faults.push(unknownComponent(path, name, suggest ? [...own, ...namedAlike(name)] : []));
  }
  return found;
}

function findOwn(ownComponents: readonly Component[], name: string): Component | undefined {
  const { exact, loose } = ownNames(ownComponents);
  return exact.get(name) ?? loose.get(simplified(name));
}

/** A component given as such or by name. */
export function readComponent(faults: Issue[], path: string, value: unknown): Component | undefined {
  if (typeof value === "string") return resolveComponent(faults, path, value);
  if (isComponent(value)) return value;
  const code = value === undefined ? "missing-field" : "wrong-type";
  const message = `${path} must be a component's name, or what component() or defineComponent() gave, got ${shown(value)}`;
  faults.push({ code, path, message, value });
  return undefined;
}

/** Reads the list of the user's own components; empty when absent. */
export function readOwnComponents(faults: Issue[], path: string, value: unknown): readonly Component[] {
  if (value === undefined) return [];
  if (!Array.isArray(value)) {
    const message = `${path} must be a list of components made by defineComponent, got ${shown(value)}`;
    faults.push({ code: "wrong-type", path, message, value });
    return [];
  }
  const own = new Map<string, Component>();
  value.forEach((item: unknown, i) => {
    const at = `${path}[${i}]`;
    if (!isComponent(item)) {
      const message = `${at} must be a component made by defineComponent, got ${shown(item)}`;
      faults.push({ code: "wrong-type", path: at, message, value: item });
    } else if (own.has(item.name)) {
      const message = `${at} is a second component of the name ${shown(item.name)}; give each its own name`;
      faults.push({ code: "duplicate-component", path: at, message, value: item.name });
    } else own.set(item.name, item);
  });
  return [...own.values()];
}
