import type { Caution } from "../base/result";
import { sources } from "../base/source";
import { allAzeotropes, type Azeotrope } from "../components/azeotropes";
import type { Member } from "./mixture";
import {
  isCarbonCompound,
  isCarboxylicAcid,
  isHydrocarbon,
  isPolar,
  isWater,
  type Substance,
  substanceOf,
} from "./substance";

interface Known extends Member {
  readonly substance: Substance;
}

/** Why Raoult's law is known, or likely, not to fit these substances together. */
export function substanceCautions(members: readonly Member[]): Caution[] {
  if (members.length < 2) return associationCautions(members.map(withSubstance));
  const known = members.map(withSubstance);
  const azeotropes = azeotropesAmong(known);
  return [
    ...azeotropes.map(({ caution }) => caution),
    ...waterCautions(known, azeotropes),
    ...associationCautions(known),
    ...unlikeCautions(known),
    ...unknownKinds(known),
  ];
}

function withSubstance(member: Member): Known {
  return { ...member, substance: substanceOf(member.component) };
}

interface Found {
  readonly pair: readonly [Known, Known];
  readonly caution: Caution;
}

function azeotropesAmong(known: readonly Known[]): Found[] {
  const byId = new Map(known.map((member) => [member.substance.id, member]));
  const found: Found[] = [];
  for (const azeotrope of allAzeotropes()) {
    const [first, second] = [byId.get(azeotrope.components[0]), byId.get(azeotrope.components[1])];
    if (first === undefined || second === undefined) continue;
    found.push({ pair: [first, second], caution: azeotropeCaution(azeotrope, first.name, second.name) });
  }
  return found;
}

function azeotropeCaution(azeotrope: Azeotrope, first: string, second: string): Caution {
  const { firstMoleFraction, temperature, pressure, boiling, liquidPhases, source } = azeotrope;
  const liquids = liquidPhases === 2 ? " over two liquid phases" : "";
  return {
    code: "azeotrope",
    severity: "stop",
    kind: "method",
    message: `${first} and ${second} form a ${boiling}-boiling azeotrope${liquids} at ${firstMoleFraction} mole fraction ${first} (${temperature.toFixed(1)} K, ${(pressure / 1e5).toPrecision(4)} bar), which Raoult's law does not know; do not rely on these numbers`,
    value: firstMoleFraction,
    source,
  };
}

/** Water with anything whose azeotrope is not listed: strongly non-ideal, often two liquids, or dissociating. */
function waterCautions(known: readonly Known[], azeotropes: readonly Found[]): Caution[] {
  const water = known.find(({ substance }) => isWater(substance));
  if (water === undefined) return [];
  const withAzeotrope = new Set(
    azeotropes.filter(({ pair }) => pair.includes(water)).flatMap(({ pair }) => pair),
  );
  const others = known.filter((member) => member !== water && !withAzeotrope.has(member));
  const organics = others.filter(({ substance }) => isCarbonCompound(substance));
  const inorganics = others.filter(
    ({ substance }) => substance.formula !== undefined && !isCarbonCompound(substance),
  );
  return [
    ...waterCaution("water-with-organic", water, organics, "far from ideal, often two liquids"),
    ...waterCaution("water-with-inorganic", water, inorganics, "far from ideal, often dissociating"),
  ];
}

function waterCaution(code: Caution["code"], water: Known, others: readonly Known[], why: string): Caution[] {
  if (others.length === 0) return [];
  const message = `${water.name} with ${listed(others)} is ${why}: Raoult's law does not hold; do not rely on these numbers`;
  return [{ code, severity: "stop", kind: "method", message, source: sources.commonPractice }];
}

function associationCautions(known: readonly Known[]): Caution[] {
  const acids = known.filter(({ substance }) => isCarboxylicAcid(substance));
  if (acids.length === 0) return [];
  const message = `the vapor of ${listed(acids)} associates to dimers: an ideal vapor does not describe it; do not rely on these numbers`;
  return [
    { code: "associating-vapor", severity: "stop", kind: "method", message, source: sources.commonPractice },
  ];
}

function unlikeCautions(known: readonly Known[]): Caution[] {
  const polar = known.filter(({ substance }) => isPolar(substance));
  const hydrocarbons = known.filter(({ substance }) => isHydrocarbon(substance));
  if (polar.length === 0 || hydrocarbons.length === 0) return [];
  const message = `${listed(polar)} with ${listed(hydrocarbons)}: polar with hydrocarbon, where Raoult's law is often far off though no azeotrope is listed; check against measured equilibria`;
  return [
    {
      code: "polar-with-hydrocarbon",
      severity: "check",
      kind: "method",
      message,
      source: sources.commonPractice,
    },
  ];
}

function unknownKinds(known: readonly Known[]): Caution[] {
  const unknown = known.filter(({ substance }) => substance.family === undefined);
  if (unknown.length === 0) return [];
  const message = `no data on the family of ${listed(unknown)}: whether Raoult's law fits is not checked; give defineComponent a family and a formula`;
  return [{ code: "substance-unknown", severity: "note", kind: "data", message }];
}

const mostNames = 6;

function listed(known: readonly Known[]): string {
  const names = known.slice(0, mostNames).map(({ name }) => name);
  const more = known.length - names.length;
  return more > 0 ? `${names.join(", ")} and ${more} more` : names.join(", ");
}
