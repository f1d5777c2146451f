import type { Issue } from "../base/errors";
import type { Component } from "../components/component";

/** Molar masses [kg/mol] of the components present; undefined after reporting those that are not known. */
export function molarMasses(
  faults: Issue[],
  path: string,
  names: readonly string[],
  components: readonly Component[],
  amounts: Float64Array,
): Float64Array | undefined {
  const before = faults.length;
  const masses = new Float64Array(names.length);
  for (let i = 0; i < names.length; i++) {
    const { molarMass } = components[i]!;
    if (molarMass === undefined && amounts[i] !== 0) {
      const message = `${path}.${names[i]!}: a mass needs the molar mass of ${names[i]!}, which is not known; give it in defineComponent, or amounts in moles`;
      faults.push({ code: "missing-property", path: `${path}.${names[i]!}`, message, value: names[i] });
    }
    masses[i] = molarMass ?? 1;
  }
  return faults.length > before ? undefined : masses;
}

/** Mole fractions from mass fractions w: (w/M)/sum(w/M). */
export function moleFractions(massFractions: Float64Array, masses: Float64Array): Float64Array {
  const moles = massFractions.map((w, i) => w / masses[i]!);
  const sum = moles.reduce((total, each) => total + each, 0);
  return moles.map((each) => each / sum);
}

/** sum(x M) [kg/mol] */
export function meanOf(fractions: Float64Array, masses: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < fractions.length; i++) sum += fractions[i]! * masses[i]!;
  return sum;
}

/** Says that labels without a component behind them have no mass. */
export function refuseMass(faults: Issue[], path: string, value: unknown): void {
  const message = `${path}: names that are free labels have no molar mass, so amounts must be molar; leave relativeVolatility out to use components, or give mol/s and mole fractions`;
  faults.push({ code: "missing-property", path, message, value });
}
