/**
 * Every code that an `Issue` of a thrown error can carry, with its rule. Programs branch on the code;
 * people read the message. Codes are never renamed, only added.
 */
export const issueCodes = {
  "not-an-object": "an object with named fields was expected",
  "missing-field": "a required field is absent",
  "unknown-field": "a field name that the function does not know; the nearest known one is named",
  "conflicting-fields":
    "fields that exclude each other were given together, or none of a set of alternatives",
  "wrong-type": "a number, text, list or true/false was expected and something else came",
  "not-finite": "a number is NaN or infinite",
  "unknown-choice": "a text is not one of the allowed words",
  "unknown-unit": "the unit is not known, or is ambiguous",
  "wrong-dimension": "the unit measures another quantity",
  "implausible-bare-number": "a number without a unit that is almost certainly not in SI",
  "below-limit": "a number is below the least allowed value",
  "above-limit": "a number is above the largest allowed value",
  "length-mismatch": "lists or records that belong together differ in length or names",
  empty: "too few entries",
  "too-many": "more entries than are accepted",
  "composition-sum": "fractions do not add up to 1",
  "fraction-out-of-range": "a fraction is below 0 or above 1",
  "unknown-component": "no component of that name; the nearest are named",
  "duplicate-component": "the same component twice",
  "missing-component": "a component named elsewhere is absent here",
  "missing-property": "a property that the method needs is not known for a component",
  "pressure-not-positive": "absolute pressure must be above zero",
  "temperature-not-positive": "absolute temperature must be above zero",
  "above-critical":
    "a component is above its critical temperature, or the pressure above every critical pressure",
  "vapor-pressure-undefined":
    "the vapor-pressure equation has no value there (the pole of an Antoine equation, overflow)",
  "flow-not-positive": "a flow must be above zero",
  "volatility-not-positive": "a relative volatility or K-value must be above zero",
  "volatility-not-above-one": "the light component must be the more volatile one",
  "volatility-equal": "two components that must differ have the same volatility",
  "keys-equal": "light and heavy key are the same component",
  "keys-reversed": "the light key is less volatile than the heavy key",
  "key-absent": "a key component is not in the feed",
  "recovery-out-of-range": "a recovery must lie between 0 and 1, both excluded",
  "efficiency-out-of-range": "an efficiency must lie above 0 and not above the stated limit",
  "specification-infeasible": "no column meets the stated products",
  "reflux-below-minimum": "the reflux ratio does not exceed the minimum",
  "reflux-factor-not-above-one": "the multiple of the minimum reflux must exceed 1",
  "negative-boilup": "the stripping section would have no vapor",
  "negative-liquid": "a section would have no liquid",
  "feed-stage-infeasible": "no column can have its feed on that stage",
  "stage-out-of-range": "a stage number outside the column",
  "too-few-stages": "fewer stages than the minimum",
  "too-many-stages": "more stages than are counted one by one",
  "azeotrope-in-range": "the equilibrium curve meets the diagonal between the two products",
  "curve-not-valid": "an equilibrium curve must rise from (0,0) to (1,1) with x strictly increasing",
  "not-converged": "an iteration stopped before it met its tolerance",
  "file-not-readable": "a feed file that is missing or cannot be read",
  "file-format": "a feed file is not written as its format asks",
} as const;

/** Code of an issue; its meaning is `issueCodes[code]`. */
export type IssueCode = keyof typeof issueCodes;
