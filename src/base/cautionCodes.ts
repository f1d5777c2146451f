/**
 * Every code that a `Caution` of a result can carry, with what it says. Programs branch on the code; people read the
 * message. Codes are never renamed, only added.
 */
export const cautionCodes = {
  // Raoult's law does not hold, or was not checked
  azeotrope: "a listed azeotrope between two of the components",
  "water-with-organic": "water with an organic substance: far from ideal, often two liquids",
  "water-with-inorganic": "water with an inorganic substance: far from ideal, often dissociating",
  "associating-vapor": "a carboxylic acid, whose vapor associates to dimers",
  "polar-with-hydrocarbon": "polar substances with hydrocarbons, often far from ideal",
  "elevated-pressure": "the vapor is no longer ideal at the pressure",
  "near-critical": "a component is close to its critical temperature",
  "substance-unknown": "no data on the kind of a substance, so that its ideality was not checked",
  "critical-temperature-unknown": "no critical temperature, so that the distance to it was not checked",
  // Data behind a number
  "vapor-pressure-preliminary": "a vapor-pressure equation on which published sets do not agree",
  "vapor-pressure-extrapolated": "a vapor-pressure equation outside its range",
  "heat-data-missing": "no heat capacity of a component",
  "heat-data-outside-range": "a heat taken at the end of its published range",
  "heat-of-vaporization-estimated": "a heat of vaporization estimated, none being published here",
  "vapor-fraction-indeterminate": "K-values so close to 1 that the vapor fraction is not determined",
  "balance-not-closed": "the products given do not add up to the feed",
  // Conditions
  "uniform-pressure": "one pressure was taken for the whole column",
  "feed-pressure-low": "the feed's pressure is below the column's",
  "feed-outside-two-phases":
    "a subcooled or superheated feed, whose best stage may lie beside the meeting point",
  "feed-stage-off-optimum": "the feed stage given costs stages",
  // Methods near their limits
  "close-boiling-keys": "a relative volatility of the keys near 1",
  "unequal-heats-of-vaporization": "molar heats of vaporization too far apart for constant molar overflow",
  "volatility-drift": "the relative volatility changes from top to bottom",
  "tangent-pinch": "an operating line touches the equilibrium curve away from the feed",
  "flow-vanishes-first": "a section would run out of liquid or vapor before Underwood's minimum is reached",
  "near-minimum-reflux": "the reflux ratio is close to its minimum",
  "outside-gilliland-data": "outside the columns that Gilliland's correlation rests on",
  "components-distribute": "other components than the keys reach both products at minimum reflux",
  "components-distribute-between-keys": "a component between the keys distributes, and the single roots part",
  "gilliland-with-distributing-component":
    "Gilliland's correlation with a component distributing between the keys",
  "reflux-below-single-root": "the reflux ratio lies below the largest single-root minimum",
  "stages-range-wide": "the correlations and both minimum refluxes part widely",
  // Hazards, screened from lists only
  flammable: "flammable substances",
  "peroxide-former": "substances that form explosive peroxides with air",
  polymerizes: "substances that may polymerize",
  carcinogen: "substances listed as carcinogens",
  "hazard-data-missing": "no hazard data on a substance",
} as const;

/** Code of a caution; its meaning is `cautionCodes[code]`. */
export type CautionCode = keyof typeof cautionCodes;
