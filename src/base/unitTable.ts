import { standardAtmosphere } from "./constants";

/** What a unit measures. A temperature is a point on a scale, a temperatureDifference an interval. */
export type Dimension =
  | "pressure"
  | "pressureDifference"
  | "temperature"
  | "temperatureDifference"
  | "molarFlow"
  | "massFlow"
  | "molarMass"
  | "density"
  | "molarEnergy"
  | "molarHeatCapacity"
  | "power"
  | "length"
  | "area"
  | "velocity"
  | "viscosity"
  | "surfaceTension";

/** SI value = typed value * factor + offset. */
export interface Unit {
  readonly factor: number;
  readonly offset?: number;
}

const psi = 6894.757293168361; // lbf/in2, from the exact pound and inch and standard gravity
const pound = 0.45359237; // kg, exact
const rankine = 5 / 9;
const hour = 3600;
const day = 86400;
const calorie = 4.184; // thermochemical
const britishThermalUnit = 1055.05585262; // International Table
const gauge = standardAtmosphere;

const pressureDifference = {
  Pa: { factor: 1 },
  kPa: { factor: 1e3 },
  MPa: { factor: 1e6 },
  hPa: { factor: 100 },
  bar: { factor: 1e5 },
  mbar: { factor: 100 },
  atm: { factor: standardAtmosphere },
  psi: { factor: psi },
  mmHg: { factor: 133.322387415 },
  torr: { factor: standardAtmosphere / 760 },
  "kgf/cm2": { factor: 98066.5 },
} as const satisfies Record<string, Unit>;

const temperatureDifference = {
  K: { factor: 1 },
  degC: { factor: 1 },
  degF: { factor: rankine },
  degR: { factor: rankine },
} as const satisfies Record<string, Unit>;

/** The units that are known without loading the general unit library, by dimension. */
export const unitTable = {
  pressureDifference,
  pressure: {
    ...pressureDifference,
    bara: { factor: 1e5 },
    barg: { factor: 1e5, offset: gauge },
    psia: { factor: psi },
    psig: { factor: psi, offset: gauge },
    kPag: { factor: 1e3, offset: gauge },
    kPaa: { factor: 1e3 },
    "bar abs": { factor: 1e5 },
    "bar gauge": { factor: 1e5, offset: gauge },
    "psi gauge": { factor: psi, offset: gauge },
    "psi abs": { factor: psi },
  },
  temperatureDifference,
  temperature: {
    K: { factor: 1 },
    degC: { factor: 1, offset: 273.15 },
    degF: { factor: rankine, offset: 459.67 * rankine },
    degR: { factor: rankine },
  },
  molarFlow: {
    "mol/s": { factor: 1 },
    "mol/min": { factor: 1 / 60 },
    "mol/h": { factor: 1 / hour },
    "kmol/s": { factor: 1e3 },
    "kmol/min": { factor: 1e3 / 60 },
    "kmol/h": { factor: 1e3 / hour },
    "kmol/d": { factor: 1e3 / day },
    "lbmol/h": { factor: (pound * 1e3) / hour },
    "lbmol/d": { factor: (pound * 1e3) / day },
  },
  massFlow: {
    "kg/s": { factor: 1 },
    "kg/min": { factor: 1 / 60 },
    "kg/h": { factor: 1 / hour },
    "kg/d": { factor: 1 / day },
    "g/s": { factor: 1e-3 },
    "g/h": { factor: 1e-3 / hour },
    "t/h": { factor: 1e3 / hour },
    "t/d": { factor: 1e3 / day },
    "tonne/h": { factor: 1e3 / hour },
    "tonne/d": { factor: 1e3 / day },
    "kt/y": { factor: 1e6 / (365.25 * day) },
    "lb/h": { factor: pound / hour },
    "lb/d": { factor: pound / day },
    "klb/h": { factor: (1e3 * pound) / hour },
    "short ton/h": { factor: (2000 * pound) / hour },
    "short ton/d": { factor: (2000 * pound) / day },
  },
  molarMass: {
    "kg/mol": { factor: 1 },
    "g/mol": { factor: 1e-3 },
    "kg/kmol": { factor: 1e-3 },
    "lb/lbmol": { factor: 1e-3 },
  },
  density: {
    "kg/m3": { factor: 1 },
    "g/cm3": { factor: 1e3 },
    "kg/L": { factor: 1e3 },
    "lb/ft3": { factor: pound / 0.3048 ** 3 },
  },
  molarEnergy: {
    "J/mol": { factor: 1 },
    "kJ/mol": { factor: 1e3 },
    "kJ/kmol": { factor: 1 },
    "MJ/kmol": { factor: 1e3 },
    "cal/mol": { factor: calorie },
    "kcal/mol": { factor: 1e3 * calorie },
    "Btu/lbmol": { factor: britishThermalUnit / (pound * 1e3) },
  },
  molarHeatCapacity: {
    "J/(mol K)": { factor: 1 },
    "kJ/(kmol K)": { factor: 1 },
    "cal/(mol K)": { factor: calorie },
    "Btu/(lbmol degF)": { factor: britishThermalUnit / (pound * 1e3) / rankine },
  },
  power: {
    W: { factor: 1 },
    kW: { factor: 1e3 },
    MW: { factor: 1e6 },
    "kJ/h": { factor: 1e3 / hour },
    "MJ/h": { factor: 1e6 / hour },
    "GJ/h": { factor: 1e9 / hour },
    "kcal/h": { factor: (1e3 * calorie) / hour },
    "Gcal/h": { factor: (1e9 * calorie) / hour },
    "Btu/h": { factor: britishThermalUnit / hour },
    "MMBtu/h": { factor: (1e6 * britishThermalUnit) / hour },
  },
  length: {
    m: { factor: 1 },
    mm: { factor: 1e-3 },
    cm: { factor: 1e-2 },
    in: { factor: 0.0254 },
    ft: { factor: 0.3048 },
  },
  area: { m2: { factor: 1 }, cm2: { factor: 1e-4 }, ft2: { factor: 0.3048 ** 2 } },
  velocity: { "m/s": { factor: 1 }, "ft/s": { factor: 0.3048 } },
  viscosity: { "Pa s": { factor: 1 }, "mPa s": { factor: 1e-3 }, cP: { factor: 1e-3 } },
  surfaceTension: { "N/m": { factor: 1 }, "mN/m": { factor: 1e-3 }, "dyn/cm": { factor: 1e-3 } },
} as const satisfies Record<Dimension, Record<string, Unit>>;

type UnitOf<D extends Dimension> = keyof (typeof unitTable)[D] & string;

/** A pressure: absolute, in Pa, or text with a unit, such as `"1.6 bar"` or `"25 psig"`. */
export type Pressure = number | `${number} ${UnitOf<"pressure">}`;
/** A pressure drop in Pa, or text with a unit, such as `"0.7 kPa"`. */
export type PressureDifference = number | `${number} ${UnitOf<"pressureDifference">}`;
/** A temperature in K, or text with a unit, such as `"95 degC"`. */
export type Temperature = number | `${number} ${UnitOf<"temperature">}`;
/** A molar flow in mol/s, or text with a unit, such as `"120 kmol/h"`. */
export type MolarFlow =
  number | `${number} ${UnitOf<"molarFlow">}` | `${number} ${"sm3/h" | "Nm3/h"} at ${string}`;
/** A mass flow in kg/s, or text with a unit, such as `"14.2 t/h"`. */
export type MassFlow = number | `${number} ${UnitOf<"massFlow">}`;
/** A component flow: mol/s as a number, or text with a molar or mass unit. */
export type ComponentFlow = MolarFlow | `${number} ${UnitOf<"massFlow">}`;
/** A molar mass in kg/mol, or text with a unit, such as `"92.14 g/mol"`. */
export type MolarMass = number | `${number} ${UnitOf<"molarMass">}`;
