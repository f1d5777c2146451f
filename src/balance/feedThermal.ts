import { type Fields, readNumber } from "../base/check";
import type { Issue } from "../base/errors";
import { readQuantity } from "../base/units";
import { vaporFractionLimits } from "../equilibrium/flash";
import type { Mixture } from "../equilibrium/mixture";
import { readTemperature } from "../equilibrium/readTemperature";

/** Thermal condition of a feed as it was given; pressures absolute [Pa], temperatures [K]. */
export type FeedThermal =
  | { readonly given: "q"; readonly q: number }
  | { readonly given: "temperature"; readonly temperature: number; readonly pressure: number }
  | { readonly given: "vaporFraction"; readonly vaporFraction: number; readonly pressure: number };

/** No real feed comes near: superheated by 100 heats of vaporization, or subcooled by as much. */
export const liquidFractionLimits = {
  atLeast: -100,
  atMost: 100,
  hint: "q is the liquid fraction of the feed: 1 saturated liquid, 0 saturated vapor",
} as const;

const alternatives = "exactly one of q, temperature with pressure, vaporFraction with pressure";

/**
 * Reads the thermal condition of a feed. Undefined after a reported fault, or when none is given and none is `required`.
 * `isStream` marks a stream out of a result, which carries more than it takes; see `preferred`.
 */
export function readThermal(
  faults: Issue[],
  path: string,
  fields: Fields,
  mixture: Mixture | undefined,
  isStream: boolean,
  required: boolean,
): FeedThermal | undefined {
  const at = path === "input" ? "" : `${path}.`;
  const given = isStream ? preferred(fields) : onlyOne(faults, path, at, fields, required);
  if (given === undefined) return undefined;
  const before = faults.length;
  const thermal = readGiven(faults, at, fields, given, mixture);
  return faults.length > before ? undefined : thermal;
}

function readGiven(
  faults: Issue[],
  at: string,
  fields: Fields,
  given: FeedThermal["given"],
  mixture: Mixture | undefined,
): FeedThermal {
  if (given === "q") return { given, q: readNumber(faults, `${at}q`, fields["q"], liquidFractionLimits) };
  const pressure = readQuantity(faults, `${at}pressure`, fields["pressure"], "pressure");
  const path = `${at}${given}`;
  return given === "temperature"
    ? { given, temperature: readTemperature(faults, path, fields[given], mixture), pressure }
    : { given, vaporFraction: readNumber(faults, path, fields[given], vaporFractionLimits), pressure };
}

/** The one condition given; a fault when there is more than one, a pressure too many, or none where one is required. */
function onlyOne(
  faults: Issue[],
  path: string,
  at: string,
  fields: Fields,
  required: boolean,
): FeedThermal["given"] | undefined {
  const { q, temperature, vaporFraction, pressure } = fields;
  const count =
    Number(q !== undefined) + Number(temperature !== undefined) + Number(vaporFraction !== undefined);
  const spare = pressure !== undefined && temperature === undefined && vaporFraction === undefined;
  if (count === 1 && !spare)
    return q !== undefined ? "q" : temperature !== undefined ? "temperature" : "vaporFraction";
  if (count === 0 && !spare && !required) return undefined;
  const named = ["q", "temperature", "vaporFraction", "pressure"].filter(
    (name) => fields[name] !== undefined,
  );
  const got = named.length === 0 ? "none" : named.join(", ");
  const code = count === 0 && !spare ? "missing-field" : "conflicting-fields";
  const message = `${path} needs ${alternatives}, got ${got}`;
  faults.push({ code, path: `${at}${named[0] ?? "q"}`, message, value: named });
  return undefined;
}

/** What sets the state of a stream that carries several: q, a part vaporized, then temperature and pressure. */
function preferred({ q, temperature, vaporFraction, pressure }: Fields): FeedThermal["given"] | undefined {
  if (q !== undefined) return "q";
  if (pressure === undefined) return undefined;
  if (typeof vaporFraction === "number" && vaporFraction > 0 && vaporFraction < 1) return "vaporFraction";
  return temperature !== undefined
    ? "temperature"
    : vaporFraction !== undefined
      ? "vaporFraction"
      : undefined;
}
