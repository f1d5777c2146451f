import { type Fields, readFields, withinLimits } from "../base/check";
import type { Issue } from "../base/errors";
import { dimensionOfUnit, readQuantity } from "../base/units";
import { resolveComponents } from "../equilibrium/mixture";
import { type FeedAmounts, flowLimits, type NameLookup } from "./feedAmounts";
import { molarMasses, refuseMass } from "./massBasis";

const mostComponents = 500;
const notNegative = { atLeast: 0, code: "flow-not-positive" } as const;

/** Reads flows by component, molar or by mass one by one; undefined after a reported fault. */
export function readComponentFlows(
  faults: Issue[],
  at: string,
  fields: Fields,
  own: NameLookup,
): FeedAmounts | undefined {
  const path = `${at}componentFlows`;
  const before = faults.length;
  const flows = readFields(faults, path, fields["componentFlows"], undefined);
  if (flows === undefined) return undefined;
  const names = Object.keys(flows);
  if (names.length === 0 || names.length > mostComponents) {
    const code = names.length === 0 ? "empty" : "too-many";
    const message = `${path} must name 1 to ${mostComponents} components, got ${names.length}`;
    faults.push({ code, path, message, value: names.length, limit: mostComponents });
    return undefined;
  }
  const components = own && resolveComponents(faults, path, names, own);
  const amounts = Float64Array.from(names, (name) =>
    readOneFlow(faults, `${path}.${name}`, flows[name], own),
  );
  const isMass = names.map((name) => unitMeasuresMass(flows[name]));
  if (faults.length > before) return undefined;
  const byMass = amounts.map((amount, i) => (isMass[i] === true ? amount : 0));
  const masses = components && molarMasses(faults, path, names, components, byMass);
  if (components !== undefined && masses === undefined) return undefined;
  const moles = amounts.map((amount, i) => (isMass[i] === true ? amount / masses![i]! : amount));
  return sumUp(faults, path, { names, fractions: moles, flow: 0, components });
}

/** Fractions and flow from component flows [mol/s]. */
function sumUp(faults: Issue[], path: string, amounts: FeedAmounts): FeedAmounts | undefined {
  const flow = amounts.fractions.reduce((total, each) => total + each, 0);
  if (flow > 0 && flow < Infinity) {
    return { ...amounts, flow, fractions: amounts.fractions.map((each) => each / flow) };
  }
  const message = `${path} must add up to a flow above zero, got ${flow}`;
  faults.push({ code: "flow-not-positive", path, message, value: flow, limit: 0 });
  return undefined;
}

function readOneFlow(faults: Issue[], path: string, typed: unknown, own: NameLookup): number {
  const isMass = unitMeasuresMass(typed);
  if (isMass && own === undefined) refuseMass(faults, path, typed);
  const flow = readQuantity(faults, path, typed, isMass ? "massFlow" : "molarFlow", notNegative);
  return Number.isNaN(flow) || withinLimits(faults, path, flow, flowLimits, typed) ? flow : Number.NaN;
}

const unitOfQuantity = /^\s*[+-]?[\d.]+(?:[eE][+-]?\d+)?\s*(\S.*?)\s*$/;

/** Whether a text such as "14.2 t/h" carries a unit of mass flow. */
function unitMeasuresMass(typed: unknown): boolean {
  const unit = typeof typed === "string" ? unitOfQuantity.exec(typed)?.[1] : undefined;
  return unit !== undefined && dimensionOfUnit(unit) === "massFlow";
}
