import type { Dimension } from "../base/units";

/** How a field of a result reads in a table: its words, and the quantity it is. */
export interface FieldLabel {
  readonly label: string;
  readonly dimension?: Dimension;
  /** Shown with this many significant digits; four when absent. */
  readonly significant?: number;
  /** Heads a column of the component table when the field is a record by component. */
  readonly byComponent?: boolean;
}

const plain = (label: string): FieldLabel => ({ label });
const of = (label: string, dimension: Dimension): FieldLabel => ({ label, dimension });
const byComponent = (label: string, dimension?: Dimension): FieldLabel =>
  dimension === undefined ? { label, byComponent: true } : { label, dimension, byComponent: true };

/** Words and quantities of the fields that results carry. A field that is absent here is shown by its own name. */
export const fieldLabels: Readonly<Record<string, FieldLabel>> = {
  name: plain("name"),
  id: plain("id"),
  cas: plain("CAS number"),
  formula: plain("formula"),
  family: plain("family"),
  flow: of("molar flow", "molarFlow"),
  massFlow: of("mass flow", "massFlow"),
  molarMass: of("molar mass", "molarMass"),
  temperature: of("temperature", "temperature"),
  pressure: of("pressure", "pressure"),
  normalBoilingPoint: of("normal boiling point", "temperature"),
  boilingTemperature: byComponent("boiling temperature", "temperature"),
  temperatureRange: of("temperatures, lowest to highest", "temperature"),
  saturation: plain("saturation of the composition"),
  bubble: of("bubble point", "temperature"),
  dew: of("dew point", "temperature"),
  atLowest: byComponent("at the lowest temperature"),
  atHighest: byComponent("at the highest temperature"),
  criticalTemperature: of("critical temperature", "temperature"),
  criticalPressure: of("critical pressure", "pressure"),
  acentricFactor: plain("acentric factor"),
  q: plain("liquid fraction q"),
  vaporFraction: plain("vapor fraction"),
  phase: plain("phase"),
  composition: byComponent("mole fraction"),
  massComposition: byComponent("mass fraction"),
  componentFlows: byComponent("molar flow", "molarFlow"),
  liquid: byComponent("liquid x"),
  vapor: byComponent("vapor y"),
  kValues: byComponent("K = y/x"),
  values: byComponent("relative volatility"),
  distillateRecovery: byComponent("recovery in distillate"),
  lightKey: plain("light key"),
  heavyKey: plain("heavy key"),
  lightKeyRecovery: { label: "light key recovered in distillate", significant: 6 },
  heavyKeyRecovery: { label: "heavy key recovered in bottoms", significant: 6 },
  minimumStages: plain("minimum stages"),
  minimumReflux: plain("minimum reflux ratio"),
  minimumRefluxLimitedBy: plain("minimum reflux set by"),
  refluxRatio: plain("reflux ratio L/D"),
  refluxOverMinimum: plain("reflux over minimum"),
  stages: plain("equilibrium stages"),
  stagesBasis: plain("stages counted by"),
  gillilandStages: plain("stages by Gilliland's correlation"),
  stagesRange: plain("stages, low to high"),
  stagesWhole: plain("whole stages to build on"),
  feedStage: plain("feed stage from the top"),
  feedStages: plain("feed stages from the top"),
  rectifyingStages: plain("rectifying stages"),
  strippingStages: plain("stripping stages"),
  rectifyingOverStripping: plain("rectifying over stripping stages"),
  roots: plain("Underwood roots"),
  activeRoots: plain("roots that bind"),
  singleRootReflux: plain("minimum reflux from each single root"),
  distributing: plain("distributing components"),
  minimumVapor: plain("minimum vapor per mole of feed"),
  boilupRatio: plain("boilup ratio V/B"),
  distillateFlow: of("distillate", "molarFlow"),
  bottomsFlow: of("bottoms", "molarFlow"),
  distillate: plain("distillate"),
  bottoms: plain("bottoms"),
  sections: plain("flows in the sections, from the top"),
  flowBasis: plain("flows are"),
  steps: plain("compositions leaving each stage"),
  stage: plain("stage"),
  x: plain("liquid x"),
  y: plain("vapor y"),
  pinch: plain("pinch (x, y)"),
  relativeVolatility: plain("relative volatility"),
  correlation: plain("correlation"),
  top: byComponent("top"),
  feed: byComponent("feed"),
  bottom: byComponent("bottom"),
  mean: byComponent("mean"),
  drift: plain("relative volatility of the keys, top over bottom"),
};

/** "minimumReflux" as "minimum reflux", for fields without an entry. */
function spelledOut(field: string): string {
  return field.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
}

/** Label and quantity of a field. */
export function labelOf(field: string): FieldLabel {
  return Object.hasOwn(fieldLabels, field) ? fieldLabels[field]! : { label: spelledOut(field) };
}
