import type { Component } from "./component";
import { propertyInRange } from "./propertyEquation";

/** Viscosity of the liquid [Pa s] at T [K], outside its published range at the end of it; undefined without data. */
export function liquidViscosity(component: Component, temperature: number): number | undefined {
  return propertyInRange(component.liquidViscosity, temperature, component);
}

/** Surface tension against the own vapor [N/m] at T [K], outside its published range at the end of it; undefined without data. */
export function surfaceTension(component: Component, temperature: number): number | undefined {
  return propertyInRange(component.surfaceTension, temperature, component);
}
