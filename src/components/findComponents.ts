import { shown } from "../base/check";
import { DesignInputError } from "../base/errors";
import { editDistance } from "../base/nearest";
import type { Component } from "./component";
import { namesOf, simplified } from "./componentName";
import { allComponents } from "./componentTable";

const mostFound = 12;
const longestText = 100;

/**
 * Components whose id, name, synonym, CAS number, formula or family contains the text, best match first; without any,
 * the nearest in spelling. At most twelve.
 *
 * Takes any part of a name or a formula; upper and lower case, spaces and hyphens do not matter.
 *
 * Source: own search.
 *
 * @throws DesignInputError when `text` is no text
 * @example findComponents("xylene").length // 3
 */
export function findComponents(text: string): readonly Component[] {
  if (typeof text !== "string") {
    const message = `text must be a text to search for, got ${shown(text)}`;
    throw new DesignInputError([{ code: "wrong-type", path: "text", message, value: text }]);
  }
  const wanted = simplified(text.slice(0, longestText));
  if (wanted === "") return [];
  const found = sorted((each) => rank(each, wanted), 3);
  const slack = Math.max(2, wanted.length / 3);
  return found.length > 0 ? found : sorted((each) => distance(each, wanted), slack);
}

/** The components for which a number is at most `limit`, lowest first. */
function sorted(of: (component: Component) => number, limit: number): Component[] {
  return allComponents()
    .map((component) => ({ component, order: of(component) }))
    .filter(({ order }) => order <= limit)
    .sort((a, b) => a.order - b.order)
    .slice(0, mostFound)
    .map(({ component }) => component);
}

/** 0: is a name; 1: begins one; 2: is in one; 3: is in the family's name. */
function rank(component: Component, wanted: string): number {
  const names = [...namesOf(component), component.formula ?? ""].map(simplified);
  if (names.includes(wanted)) return 0;
  if (names.some((name) => name.startsWith(wanted))) return 1;
  if (names.some((name) => name.includes(wanted))) return 2;
  return simplified(component.family ?? "").includes(wanted) ? 3 : Infinity;
}

function distance(component: Component, wanted: string): number {
  return Math.min(...namesOf(component).map((name) => editDistance(wanted, simplified(name))));
}
