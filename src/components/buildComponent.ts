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

/** A block as stored: the id of its source, and the largest deviation [%] when it was fitted for this table. */
type Stored<T> = T & { readonly source: string; readonly fit?: number };
type ConstantsRow = Omit<Component, "kind" | "id" | "vaporPressure">;

const citations: Rows<string> = sources;
const constantsRows = constants as unknown as Rows<ConstantsRow>;
const hazardRows = hazards as unknown as Rows<Hazards>;
const vaporPressures = vaporPressure as unknown as Rows<Stored<VaporPressureBlock>>;
const properties = {
  heatOfVaporization,
  liquidDensity,
  liquidHeatCapacity,
  idealGasHeatCapacity,
  liquidViscosity,
  surfaceTension,
} as unknown as Rows<Rows<Stored<PropertyBlock>>>;

/** Ids of the built-in table, in its order. */
export const componentIds: readonly string[] = Object.keys(constants);

/** Every name under which a component of the table is found: id, name, synonyms, CAS number. */
export function storedNames(id: string): string[] {
  const { name, cas } = constantsRows[id]!;
  return [id, name, ...((synonyms as Rows<string[]>)[id] ?? []), cas!];
}

/** The component of that id from the data files, with publications in place of their ids; frozen. */
export function buildComponent(id: string): Component {
  const { sources: constantSources, ...row } = constantsRows[id]!;
  const blocks: Record<string, PropertyBlock | VaporPressureBlock> = {
    vaporPressure: cited(vaporPressures[id]!),
  };
  for (const [name, rows] of Object.entries(properties)) {
    if (rows[id] !== undefined) blocks[name] = cited(rows[id]);
  }
  const blockSources = Object.entries(blocks).map(([name, { source }]) => [name, source] as const);
  const hazard = hazardRows[id];
  const component = {
    kind: "component",
    id,
    ...row,
    synonyms: (synonyms as Rows<string[]>)[id] ?? [],
    ...blocks,
    ...(hazard === undefined ? {} : { hazards: { ...hazard, sources: citedEach(hazard.sources) } }),
    sources: { ...citedConstants(constantSources), ...Object.fromEntries(blockSources) },
  };
  return freeze(component as unknown as Component);
}

function cited<T extends object>(stored: Stored<T>): T {
  const { source, fit, ...block } = stored;
  const citation = citations[source]!;
  const text = fit === undefined ? citation : `fitted for this table, within ${fit} %, to: ${citation}`;
  return { ...block, source: text } as unknown as T;
}

function citedEach(ids: Rows<string>): Record<string, string> {
  return Object.fromEntries(Object.entries(ids).map(([field, id]) => [field, citations[id]!]));
}

/** The critical point is stored with one source for temperature, pressure and volume. */
function citedConstants(ids: Rows<string>): Record<string, string> {
  const { criticalPoint, ...others } = citedEach(ids);
  return {
    molarMass: citations["atomic-masses"]!,
    ...others,
    ...(criticalPoint === undefined
      ? {}
      : {
          criticalTemperature: criticalPoint,
          criticalPressure: criticalPoint,
          criticalVolume: criticalPoint,
        }),
  };
}

/** Every caller gets the same component, so that none may change it. */
function freeze<T extends object>(value: T): T {
  for (const part of Object.values(value))
    if (typeof part === "object" && part !== null) freeze(part as object);
  return Object.freeze(value);
}
