import type { Component } from "./component";
import { propertyInRange } from "./propertyEquation";

/** Density of the saturated liquid [kg/m3] at T [K], outside its published range at the end of it; undefined without data. */
export function liquidDensity(component: Component, temperature: number): number | undefined {
  return propertyInRange(component.liquidDensity, temperature, component);
}

/** Molar volume of the saturated liquid [m3/mol] at T [K]; undefined when density or molar mass is not known. */
export function liquidMolarVolume(component: Component, temperature: number): number | undefined {
  const density = liquidDensity(component, temperature);
  const { molarMass } = component;
  return density === undefined || molarMass === undefined ? undefined : molarMass / density;
}
