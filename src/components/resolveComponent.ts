import { shown } from "../base/check";
import type { Issue } from "../base/errors";
import type { Component } from "./component";
import { lookUp, namesOf, unknownComponent } from "./componentTable";

/** The user's own component of that name, else that of the built-in table; undefined after a reported fault. */
export function resolveComponent(
  faults: Issue[],
  path: string,
  name: string,
  ownComponents: readonly Component[] = [],
): Component | undefined {
  for (const own of ownComponents) if (own.name === name || own.id === name) return own;
  const found = ownComponents.find((own) => namesOf(own).includes(name)) ?? lookUp(name);
  if (found === undefined) faults.push(unknownComponent(path, name));
  return found;
}

/** A component given as such or by name. */
export function readComponent(faults: Issue[], path: string, value: unknown): Component | undefined {
  if (typeof value === "string") return resolveComponent(faults, path, value);
  if (isComponent(value)) return value;
  const code = value === undefined ? "missing-field" : "wrong-type";
  const message = `${path} must be a component's name, or what component() or defineComponent() gave, got ${shown(value)}`;
  faults.push({ code, path, message, value });
  return undefined;
}

const forms: ReadonlySet<unknown> = new Set(["antoine", "dippr101", "wagner25", "wagner36"]);

/** Whether a value has the parts of a component that the equations rely on. */
export function isComponent(value: unknown): value is Component {
  if (typeof value !== "object" || value === null) return false;
  const { kind, id, name, vaporPressure } = value as Partial<Component>;
  if (kind !== "component" || typeof id !== "string" || typeof name !== "string") return false;
  if (typeof vaporPressure !== "object" || vaporPressure === null || !forms.has(vaporPressure.form))
    return false;
  const { range } = vaporPressure;
  return (
    Array.isArray(range) && range.length === 2 && range.every(Number.isFinite) && hasConstants(vaporPressure)
  );
}

function hasConstants(block: Component["vaporPressure"]): boolean {
  switch (block.form) {
    case "antoine":
      return [block.A, block.B, block.C].every(Number.isFinite);
    case "dippr101":
      return [block.C1, block.C2, block.C3, block.C4, block.C5].every(Number.isFinite);
    default:
      return (
        Array.isArray(block.coefficients) &&
        [...block.coefficients, block.criticalTemperature, block.criticalPressure].every(Number.isFinite)
      );
  }
}

/** Reads the list of the user's own components; empty when absent. */
export function readOwnComponents(faults: Issue[], path: string, value: unknown): readonly Component[] {
  if (value === undefined) return [];
  if (!Array.isArray(value)) {
    const message = `${path} must be a list of components made by defineComponent, got ${shown(value)}`;
    faults.push({ code: "wrong-type", path, message, value });
    return [];
  }
  value.forEach((item: unknown, i) => {
    if (isComponent(item)) return;
    const message = `${path}[${i}] must be a component made by defineComponent, got ${shown(item)}`;
    faults.push({ code: "wrong-type", path: `${path}[${i}]`, message, value: item });
  });
  return value.filter(isComponent);
}
