import type { Dimension, Unit } from "./unitTable";
import { findUnit, siUnit } from "./units";

/** The unit system in which tables, plots and reports show results. */
export type DisplayUnits = "SI" | "metric" | "US";

const metric: Readonly<Partial<Record<Dimension, string>>> = {
  pressure: "bar abs",
  pressureDifference: "kPa",
  temperature: "degC",
  temperatureDifference: "K",
  molarFlow: "kmol/h",
  massFlow: "kg/h",
  molarMass: "g/mol",
  molarEnergy: "kJ/mol",
  power: "kW",
  viscosity: "mPa s",
  surfaceTension: "mN/m",
};

const unitedStates: Readonly<Partial<Record<Dimension, string>>> = {
  pressure: "psi abs",
  pressureDifference: "psi",
  temperature: "degF",
  temperatureDifference: "degF",
  molarFlow: "lbmol/h",
  massFlow: "lb/h",
  molarMass: "lb/lbmol",
  density: "lb/ft3",
  molarEnergy: "Btu/lbmol",
  molarHeatCapacity: "Btu/(lbmol degF)",
  power: "MMBtu/h",
  length: "ft",
  area: "ft2",
  velocity: "ft/s",
  viscosity: "cP",
  surfaceTension: "dyn/cm",
};

const systems: Readonly<Record<DisplayUnits, Readonly<Partial<Record<Dimension, string>>>>> = {
  SI: {},
  metric,
  US: unitedStates,
};

/** The unit in which a system shows a dimension. */
export function displayUnit(dimension: Dimension, system: DisplayUnits): string {
  return systems[system][dimension] ?? siUnit[dimension];
}

/** An SI value in the display unit of its dimension. */
export function toDisplay(value: number, dimension: Dimension, system: DisplayUnits): number {
  const unit: Unit = findUnit(dimension, displayUnit(dimension, system))!;
  return (value - (unit.offset ?? 0)) / unit.factor;
}

/** A number for reading: about four significant digits, no exponent where a person would not write one. */
export function formatNumber(value: number, significant = 4): string {
  if (value === 0) return "0";
  const size = Math.abs(value);
  if (size < 1e-4 || size >= 1e7) return value.toExponential(significant - 2);
  const decimals = Math.max(0, significant - 1 - Math.floor(Math.log10(size)));
  return value.toFixed(Math.min(decimals, 8));
}
