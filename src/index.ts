// Errors, cautions, units
export { issueCodes } from "./base/codes";
export type { IssueCode } from "./base/codes";
export { cautionCodes } from "./base/cautionCodes";
export type { CautionCode } from "./base/cautionCodes";
export { DesignInfeasibleError, DesignInputError } from "./base/errors";
export type { Issue } from "./base/errors";
export type { DisplayUnits } from "./base/displayUnits";
export type { ByComponent, Caution, Judged, MethodUsed } from "./base/result";
export type {
  ComponentFlow,
  MassFlow,
  MolarFlow,
  MolarMass,
  Pressure,
  PressureDifference,
  Temperature,
} from "./base/units";

// Components
export type { Component, Hazards, PropertyBlock, VaporPressureBlock } from "./components/component";
export { component } from "./components/componentTable";
export { findComponents } from "./components/findComponents";
export { defineComponent } from "./components/defineComponent";
export type { ComponentDefinition } from "./components/defineComponent";
export { vaporPressure } from "./components/vaporPressure";
export type { PropertyResult } from "./components/propertyResult";
export { boilingTemperature } from "./components/boilingTemperature";

// Equilibrium
export { bubblePoint } from "./equilibrium/bubblePoint";
export type { BubblePoint } from "./equilibrium/bubblePoint";
export { binaryEquilibrium } from "./equilibrium/binaryEquilibrium";
export type { BinaryEquilibrium } from "./equilibrium/binaryEquilibrium";
export { bubblePointSweep } from "./equilibrium/bubblePointSweep";
export { dewPoint } from "./equilibrium/dewPoint";
export { flash } from "./equilibrium/flash";
export { rachfordRice } from "./equilibrium/rachfordRice";
export { relativeVolatility } from "./equilibrium/relativeVolatility";
export type { RelativeVolatility } from "./equilibrium/relativeVolatility";
export { volatilityOverTemperature } from "./equilibrium/volatilityCurve";
export type { VolatilityOverTemperature } from "./equilibrium/volatilityCurve";
export type { VolatilityInput } from "./equilibrium/volatilityCurveInput";

// Feed
export { feed } from "./balance/feed";
export type { Feed, FeedInput } from "./balance/feed";
export type { Stream } from "./balance/stream";
export { feedThermalCondition } from "./column/feedThermalCondition";
export type { FeedThermalCondition } from "./column/feedThermalCondition";

// Two components on a diagram
export { mccabeThiele } from "./column/mccabeThiele";
export type { BinaryStage, McCabeThiele } from "./column/mccabeThiele";
export type { McCabeThieleInput } from "./column/mccabeThieleInput";
export { smoker } from "./staging/smoker";
export type { Smoker, SmokerInput } from "./staging/smoker";

// Many components by closed forms
export { fenske } from "./shortcut/fenske";
export type { FenskeInput, FenskeResult } from "./shortcut/fenske";
export { underwood } from "./shortcut/underwood";
export type { UnderwoodInput, UnderwoodResult } from "./shortcut/underwood";
export { gilliland } from "./shortcut/gilliland";
export type { GillilandInput, GillilandResult } from "./shortcut/gilliland";
export { kirkbride } from "./shortcut/kirkbride";
export type { KirkbrideInput, KirkbrideResult } from "./shortcut/kirkbride";
export { shortcutDesign } from "./column/shortcutDesign";
export type { ShortcutDesign } from "./column/shortcutDesignResult";
export type { ShortcutDesignInput } from "./column/designInput";

// Results as documents
export { resultTable } from "./study/resultTable";
export type { ResultTable, TableSection } from "./study/resultTable";

// Figures
export { equilibriumDiagram } from "./plots/equilibriumDiagram";
export type { Figure } from "./plots/figure";
export type { FigureOptions } from "./plots/figureInput";
export { gillilandDiagram } from "./plots/gillilandDiagram";
export { mccabeThieleDiagram } from "./plots/mccabeThieleDiagram";
export { stagesAgainstReflux } from "./plots/stagesAgainstReflux";
export { temperatureCompositionDiagram } from "./plots/temperatureCompositionDiagram";
export { volatilityDiagram } from "./plots/volatilityDiagram";
