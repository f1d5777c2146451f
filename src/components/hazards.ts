import type { Caution } from "../base/result";
import type { Component, Hazards } from "./component";

const advice = "first-pass results are not for construction; local codes and licensed practice decide";

interface Group {
  readonly code: string;
  readonly has: (hazards: Hazards) => boolean;
  readonly says: (names: string) => string;
}

const groups: readonly Group[] = [
  {
    code: "flammable",
    has: ({ flashPoint, lowerFlammabilityLimit }) =>
      flashPoint !== undefined || lowerFlammabilityLimit !== undefined,
    says: (names) => `flammable: ${names}. Keep air out, provide relief and inerting; ${advice}`,
  },
  {
    code: "peroxide-former",
    has: ({ peroxideClass }) => peroxideClass !== undefined,
    says: (names) => `forms peroxides: ${names}. Test and inhibit, never distill to dryness; ${advice}`,
  },
  {
    code: "polymerizes",
    has: ({ polymerizes }) => polymerizes === true,
    says: (names) =>
      `may polymerize: ${names}. Inhibit the top as well as the bottoms, keep the reboiler cool; ${advice}`,
  },
  {
    code: "carcinogen",
    has: ({ carcinogenGroup }) => carcinogenGroup === "1" || carcinogenGroup === "2A",
    says: (names) => `listed by IARC in group 1 or 2A: ${names}. Contain vents and samples; ${advice}`,
  },
];

const unlisted: Group = {
  code: "hazard-data-missing",
  has: () => true,
  says: (names) =>
    `no hazard data in the table for ${names}: that is not a statement that there is no hazard; ${advice}`,
};

function caution(group: Group, names: readonly string[]): Caution {
  const severity = group.code === "flammable" || group.code === "hazard-data-missing" ? "note" : "check";
  return {
    code: group.code,
    severity,
    kind: "hazard",
    message: group.says(names.join(", ")),
    source: "common practice",
  };
}

/** The usual cautions for what is in the pot, one a hazard; components without data are named as such. */
export function hazardCautions(components: readonly Component[]): Caution[] {
  const cautions: Caution[] = [];
  for (const group of groups) {
    const names = components
      .filter(({ hazards }) => hazards !== undefined && group.has(hazards))
      .map(({ name }) => name);
    if (names.length > 0) cautions.push(caution(group, names));
  }
  const missing = components.filter(({ hazards }) => hazards === undefined).map(({ name }) => name);
  return missing.length > 0 ? [...cautions, caution(unlisted, missing)] : cautions;
}
