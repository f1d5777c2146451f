// Errors, cautions, units
export { issueCodes } from "./base/codes";
export type { IssueCode } from "./base/codes";
export { DesignInfeasibleError, DesignInputError } from "./base/errors";
export type { Issue } from "./base/errors";
export type { DisplayUnits } from "./base/displayUnits";
export type { ByComponent, Caution, Judged, MethodUsed } from "./base/result";
export type { ComponentFlow, MassFlow, MolarFlow, MolarMass, Pressure, Temperature } from "./base/units";

// Results as documents
export { resultTable } from "./study/resultTable";
export type { ResultTable, TableSection } from "./study/resultTable";
