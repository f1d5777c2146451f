import { shown } from "../base/check";
import { DesignInputError, type Issue } from "../base/errors";
import { didYouMean, editDistance } from "../base/nearest";
import type { Component, Hazards, PropertyBlock, VaporPressureBlock } from "./component";
import constants from "./data/constants.json";
import hazards from "./data/hazards.json";
import heatOfVaporization from "./data/heatOfVaporization.json";
import idealGasHeatCapacity from "./data/idealGasHeatCapacity.json";
import liquidDensity from "./data/liquidDensity.json";
import liquidHeatCapacity from "./data/liquidHeatCapacity.json";
import liquidViscosity from "./data/liquidViscosity.json";
import sources from "./data/sources.json";
import surfaceTension from "./data/surfaceTension.json";
import synonyms from "./data/synonyms.json";
import vaporPressure from "./data/vaporPressure.json";

type Rows<T> = Readonly<Record<string, T>>;
type SourceRow = { readonly source: string };
type ConstantsRow = Omit<Component, "kind" | "id" | "vaporPressure">;

const citations: Rows<string> = sources;

/** A block with its source id replaced by the publication. */
function cited<T extends SourceRow>(row: T | undefined): T | undefined {
  return row === undefined ? undefined : { ...row, source: citations[row.source]! };
}

function citedSources(ids: Rows<string>): Record<string, string> {
  return Object.fromEntries(Object.entries(ids).map(([field, id]) => [field, citations[id]!]));
}

function hazardsOf(id: string): Hazards | undefined {
  const row = (hazards as unknown as Rows<Hazards>)[id];
  return row === undefined ? undefined : { ...row, sources: citedSources(row.sources) };
}

const blocks: Readonly<Record<string, unknown>> = {
  heatOfVaporization,
  liquidDensity,
  liquidHeatCapacity,
  idealGasHeatCapacity,
  liquidViscosity,
  surfaceTension,
};

function build(id: string): Component {
  const row = (constants as unknown as Rows<ConstantsRow>)[id]!;
  const component: Record<string, unknown> = {
    kind: "component",
    id,
    ...row,
    sources: citedSources(row.sources),
    synonyms: (synonyms as Rows<string[]>)[id] ?? [],
    vaporPressure: cited((vaporPressure as unknown as Rows<VaporPressureBlock>)[id]),
  };
  for (const [name, table] of Object.entries(blocks)) {
    const block = cited((table as Rows<PropertyBlock>)[id]);
    if (block !== undefined) component[name] = block;
  }
  const listed = hazardsOf(id);
  if (listed !== undefined) component["hazards"] = listed;
  return component as unknown as Component;
}

/** Lower case without spaces, commas and hyphens: "1,2-Dichloroethane" and "1 2 dichloroethane" are one. */
function simplified(text: string): string {
  return text.toLowerCase().replace(/[\s,_-]+/g, "");
}

/** The name must say the same without its punctuation, but "n-butane" is not "nbutane" by accident: exact names win. */
function index(): { exact: Map<string, Component>; loose: Map<string, Component>; all: Component[] } {
  const exact = new Map<string, Component>();
  const loose = new Map<string, Component>();
  const all = Object.keys(constants).map(build);
  for (const component of all) {
    for (const name of namesOf(component)) {
      exact.set(name, component);
      loose.set(simplified(name), component);
    }
  }
  return { exact, loose, all };
}

/** Every name under which a component is found. */
export function namesOf(component: Component): string[] {
  const names = [component.id, component.name, ...(component.synonyms ?? [])];
  return component.cas === undefined ? names : [...names, component.cas];
}

let built: ReturnType<typeof index> | undefined;

/** The table is built on first use; it never changes afterwards. */
function table(): ReturnType<typeof index> {
  return (built ??= index());
}

/** All components of the built-in table. */
export function allComponents(): readonly Component[] {
  return table().all;
}

/** The component of that id, name, synonym or CAS number, or undefined. */
export function lookUp(name: string): Component | undefined {
  const { exact, loose } = table();
  return exact.get(name) ?? loose.get(simplified(name));
}

/** The fault of a name that is not in the table; names the nearest ones. */
export function unknownComponent(path: string, name: string): Issue {
  const known = [...table().exact.keys()];
  const message = `${path}: no component ${shown(name)} in the table.${didYouMean(name, known, 3)} findComponents searches it; defineComponent adds your own`;
  return { code: "unknown-component", path, message, value: name };
}

/**
 * A component of the built-in table: constants (SI), property equations with range, grade and source, hazards.
 *
 * Takes an id, name, synonym or CAS number; upper and lower case, spaces and hyphens do not matter.
 *
 * Source: the publications named in the component's `sources` and in each block's `source`.
 *
 * @throws DesignInputError when there is none of that name; the message names the nearest
 * @example component("71-43-2").name // "benzene"
 */
export function component(nameOrCas: string): Component {
  const found = typeof nameOrCas === "string" ? lookUp(nameOrCas) : undefined;
  if (found !== undefined) return found;
  if (typeof nameOrCas === "string") throw new DesignInputError([unknownComponent("component", nameOrCas)]);
  const message = `component must be named by a text, got ${shown(nameOrCas)}`;
  throw new DesignInputError([{ code: "wrong-type", path: "component", message, value: nameOrCas }]);
}

const mostFound = 12;

/**
 * Components whose id, name, synonym, CAS number, formula or family contains the text, best match first; without any,
 * the nearest in spelling. At most twelve.
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
  const wanted = simplified(text.slice(0, 100));
  if (wanted === "") return [];
  const rank = (candidate: Component): number => {
    const names = [...namesOf(candidate), candidate.formula ?? ""].map(simplified);
    if (names.includes(wanted)) return 0;
    if (names.some((name) => name.startsWith(wanted))) return 1;
    if (names.some((name) => name.includes(wanted))) return 2;
    return simplified(candidate.family ?? "").includes(wanted) ? 3 : Infinity;
  };
  const ranked = table().all.map((candidate) => ({ candidate, rank: rank(candidate) }));
  const found = ranked.filter((entry) => entry.rank < Infinity).sort((a, b) => a.rank - b.rank);
  return (found.length > 0 ? found.map((entry) => entry.candidate) : nearestBySpelling(wanted)).slice(
    0,
    mostFound,
  );
}

function nearestBySpelling(wanted: string): Component[] {
  return table()
    .all.map((candidate) => ({
      candidate,
      distance: Math.min(...namesOf(candidate).map((name) => editDistance(wanted, simplified(name)))),
    }))
    .filter(({ distance }) => distance <= Math.max(2, wanted.length / 3))
    .sort((a, b) => a.distance - b.distance)
    .map(({ candidate }) => candidate);
}
