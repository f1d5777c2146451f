import type { Caution } from "../base/result";
import type { Component, Hazards } from "./component";

const advice = "screened from lists only; local codes and licensed practice decide";

interface Group {
  readonly code: Caution["code"];
  readonly severity: Caution["severity"];
  /** Fields of `Hazards.sources` that the statement rests on. */
  readonly fields: readonly string[];
  readonly has: (hazards: Hazards) => boolean;
  readonly says: (members: readonly Component[]) => string;
}

const groups: readonly Group[] = [
  {
    code: "flammable",
    severity: "note",
    fields: ["flashPoint", "flammabilityLimits"],
    has: ({ flashPoint, lowerFlammabilityLimit }) =>
      flashPoint !== undefined || lowerFlammabilityLimit !== undefined,
    says: (members) =>
      `flammable: ${listed(members)}${lowestFlashPoint(members)}. Keep air out, above all under vacuum and in vents`,
  },
  {
    code: "peroxide-former",
    severity: "check",
    fields: ["peroxideClass"],
    has: ({ peroxideClass }) => peroxideClass !== undefined,
    says: (members) =>
      `forms explosive peroxides with air, which collect in the bottoms: ${listed(members)}. Test the feed, inhibit it, never distill to dryness`,
  },
  {
    code: "polymerizes",
    severity: "check",
    fields: ["polymerizes", "peroxideClass"],
    has: ({ polymerizes, peroxideClass }) => polymerizes === true || peroxideClass === "C",
    says: (members) =>
      `may polymerize: ${listed(members)}. Inhibitor stays in the liquid, so feed it at the top as well; keep the reboiler cool and the holdup small`,
  },
  {
    code: "carcinogen",
    severity: "check",
    fields: ["carcinogenGroup"],
    has: ({ carcinogenGroup }) => carcinogenGroup !== undefined && carcinogenGroup !== "3",
    says: (members) =>
      `carcinogenic (group 1), probably (2A) or possibly (2B) so by IARC: ${listed(members, ({ hazards }) => ` (group ${hazards?.carcinogenGroup ?? "unknown"})`)}. Close vents, drains and samples`,
  },
];

const mostNames = 8;

function listed(members: readonly Component[], remark = (_: Component): string => ""): string {
  const names = members.slice(0, mostNames).map((member) => member.name + remark(member));
  const more = members.length - names.length;
  return more > 0 ? `${names.join(", ")} and ${more} more` : names.join(", ");
}

/** ", lowest flash point -11 degC (benzene)". */
function lowestFlashPoint(members: readonly Component[]): string {
  const flashPoint = ({ hazards }: Component): number => hazards?.flashPoint ?? Infinity;
  const lowest = members.reduce((least, each) => (flashPoint(each) < flashPoint(least) ? each : least));
  if (flashPoint(lowest) === Infinity) return "";
  return `, lowest flash point ${Math.round(flashPoint(lowest) - 273.15)} degC (${lowest.name})`;
}

/** The lists that a statement rests on, each once. */
function sourcesOf(members: readonly Component[], fields: readonly string[]): string {
  const sources = members.flatMap(({ hazards }) => fields.map((field) => hazards?.sources[field]));
  return [...new Set(sources.filter((source) => source !== undefined))].join("; ");
}

/**
 * The usual cautions for what is in the pot, one a hazard. A component without any data is named as such, which is no
 * statement that it is harmless; one that was looked for and is in no list is not named.
 */
export function hazardCautions(components: readonly Component[]): Caution[] {
  const cautions: Caution[] = [];
  for (const { code, severity, fields, has, says } of groups) {
    const members = components.filter(({ hazards }) => hazards !== undefined && has(hazards));
    if (members.length === 0) continue;
    const source = sourcesOf(members, fields);
    cautions.push({ code, severity, kind: "hazard", message: `${says(members)}; ${advice}`, source });
  }
  const unknown = components.filter(({ hazards }) => hazards === undefined);
  if (unknown.length > 0) {
    const message = `no hazard data for ${listed(unknown)}: nothing is said of flammability, peroxides, polymerization or cancer; see the safety data sheet`;
    cautions.push({ code: "hazard-data-missing", severity: "note", kind: "hazard", message });
  }
  return cautions;
}
