import { type Fields, readChoice, readFlag } from "../base/check";
import { readComposition } from "../base/composition";
import type { Issue } from "../base/errors";
import { readQuantity } from "../base/units";
import { resolveComponents } from "../equilibrium/mixture";
import { readComponentFlows } from "./componentFlows";
import { type FeedAmounts, flowLimits, type NameLookup } from "./feedAmounts";
import { meanOf, molarMasses, moleFractions, refuseMass } from "./massBasis";

const bases = ["mole", "mass"] as const;
const forms = ["flow", "massFlow", "componentFlows"] as const;
type Form = (typeof forms)[number];

/**
 * Reads flow and composition in any of their forms; undefined after a reported fault. A stream out of a result carries
 * its flow in several forms, of which the molar one counts.
 */
export function readAmounts(
  faults: Issue[],
  path: string,
  fields: Fields,
  own: NameLookup,
  isStream: boolean,
): FeedAmounts | undefined {
  const at = path === "input" ? "" : `${path}.`;
  const form = isStream && fields["flow"] !== undefined ? "flow" : onlyForm(faults, path, at, fields);
  if (form === "componentFlows") return readComponentFlows(faults, at, fields, own);
  const before = faults.length;
  const normalize = readFlag(faults, `${at}normalize`, fields["normalize"]);
  const named = readComposition(faults, `${at}composition`, fields["composition"], normalize);
  const components = own && named && resolveComponents(faults, `${at}composition`, named.names, own);
  const flow = form === undefined ? Number.NaN : readFlow(faults, at, form, fields[form]);
  const byMass = readChoice(faults, `${at}basis`, fields["basis"], bases) === "mass";
  if (own === undefined && byMass) refuseMass(faults, `${at}basis`, "mass");
  if (own === undefined && form === "massFlow") refuseMass(faults, `${at}massFlow`, fields[form]);
  if (form === undefined || faults.length > before) return undefined;
  const amounts: FeedAmounts = { names: named!.names, fractions: named!.fractions, flow, components };
  return byMass || form === "massFlow" ? toMoles(faults, `${at}composition`, amounts, form, byMass) : amounts;
}

function readFlow(faults: Issue[], at: string, form: Form, typed: unknown): number {
  return readQuantity(faults, `${at}${form}`, typed, form === "flow" ? "molarFlow" : "massFlow", flowLimits);
}

/** Amounts of which the flow, the fractions or both are by mass, in moles. */
function toMoles(
  faults: Issue[],
  path: string,
  { names, fractions, flow, components }: FeedAmounts,
  form: Form,
  byMass: boolean,
): FeedAmounts | undefined {
  const masses = molarMasses(faults, path, names, components!, fractions);
  if (masses === undefined) return undefined;
  const moles = byMass ? moleFractions(fractions, masses) : fractions;
  return { names, fractions: moles, flow: form === "flow" ? flow : flow / meanOf(moles, masses), components };
}

/** The one form of flow that is given, with its composition; undefined after a reported fault. */
function onlyForm(faults: Issue[], path: string, at: string, fields: Fields): Form | undefined {
  const given = forms.filter((form) => fields[form] !== undefined);
  if (given.length === 1) {
    if (given[0] !== "componentFlows" || fields["composition"] === undefined) return given[0];
    const message = `${path} must have composition or componentFlows, not both: componentFlows say it all`;
    faults.push({
      code: "conflicting-fields",
      path: `${at}composition`,
      message,
      value: fields["composition"],
    });
    return "componentFlows";
  }
  const code = given.length === 0 ? "missing-field" : "conflicting-fields";
  const message = `${path} needs exactly one of ${forms.join(", ")}, got ${given.join(" and ") || "none"}`;
  faults.push({ code, path: `${at}${given[0] ?? "flow"}`, message, value: given });
  return given.includes("componentFlows") && fields["composition"] === undefined
    ? "componentFlows"
    : undefined;
}
