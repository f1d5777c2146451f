import { readExactlyOne } from "../base/check";
import { DesignInputError, type Issue, refuseIfFaulty } from "../base/errors";
import { mixtureFields, readStateVariable, readMixtureInput, type StateInput } from "./equilibriumInput";
import { type Equilibrium, equilibriumOf } from "./equilibriumResult";
import { idealMixture, stateAtPressure, stateAtTemperature } from "./phaseState";

const known = new Set<string>([...mixtureFields, "pressure", "temperature"]);

/** The bubble point (vapor fraction 0) or the dew point (1) that an input asks for. */
export function saturatedPoint(input: StateInput, vaporFraction: 0 | 1): Equilibrium {
  const faults: Issue[] = [];
  const { fields, mixture } = readMixtureInput(faults, input, known);
  const given = readExactlyOne(faults, "input", fields, ["pressure", "temperature"]);
  const value = given === undefined ? Number.NaN : readStateVariable(faults, fields, given, mixture);
  refuseIfFaulty(faults);
  const compiled = idealMixture(mixture!);
  const origin = { path: given!, typed: fields[given!] };
  const solve = given === "pressure" ? stateAtPressure : stateAtTemperature;
  const state = solve(faults, compiled, value, vaporFraction, origin);
  if (state === undefined) throw new DesignInputError(faults);
  return equilibriumOf(compiled, state);
}
