/** IUPAC abridged standard atomic weights (2021) [g/mol] of the elements in the table. */
const atomicMass: Readonly<Record<string, number>> = {
  H: 1.008,
  C: 12.011,
  N: 14.007,
  O: 15.999,
  S: 32.06,
  Cl: 35.45,
  Ar: 39.948,
};

/** Number of atoms by element. */
export type Atoms = Record<string, number>;

export function atomsOfFormula(formula: string): Atoms {
  const atoms: Atoms = {};
  for (const [, element, count] of formula.matchAll(/([A-Z][a-z]?)(\d*)/g)) {
    atoms[element!] = (atoms[element!] ?? 0) + Number(count === "" ? 1 : count);
  }
  return atoms;
}

/** [g/mol] */
export function massOf(atoms: Atoms): number {
  return Object.entries(atoms).reduce((sum, [element, count]) => sum + count * atomicMass[element]!, 0);
}

/** Bonds that an atom has in all; the least that is enough holds. */
const valences: Readonly<Record<string, readonly number[]>> = {
  C: [4],
  N: [3, 5],
  O: [2],
  S: [2, 4, 6],
  Cl: [1],
};

interface Atom {
  readonly element: string;
  readonly hydrogens: number | undefined;
  bonds: number;
}

const token = /\[([A-Za-z][a-z]?)(?:@*)(H?)(\d*)[^\]]*\]|(Cl)|([BCNOSc-s])|([()=#\d/\\-])/g;

/** Atoms of a SMILES text, implied hydrogens included; enough of the notation for the molecules of the table. */
export function atomsOfSmiles(text: string): Atoms {
  const atoms: Atom[] = [];
  const branches: (Atom | undefined)[] = [];
  const rings = new Map<string, { atom: Atom; order: number }>();
  let last: Atom | undefined;
  let order = 1;
  const join = (a: Atom, b: Atom, bond: number): void => {
    a.bonds += bond;
    b.bonds += bond;
  };
  for (const [, bracket, h, count, chlorine, plain, mark] of text.matchAll(token)) {
    const name = bracket ?? chlorine ?? plain;
    if (name !== undefined) {
      const isAromatic = name === name.toLowerCase();
      const explicit = h === "H" ? Number(count === "" ? 1 : count) : 0;
      const atom: Atom = {
        element: name[0]!.toUpperCase() + name.slice(1),
        hydrogens: bracket === undefined ? undefined : explicit,
        bonds: isAromatic ? 1 : 0,
      };
      atoms.push(atom);
      if (last !== undefined) join(last, atom, order);
      last = atom;
      order = 1;
    } else if (mark === "(") branches.push(last);
    else if (mark === ")") last = branches.pop();
    else if (mark === "=") order = 2;
    else if (mark === "#") order = 3;
    else if (/\d/.test(mark!)) {
      const opened = rings.get(mark!);
      if (opened === undefined) rings.set(mark!, { atom: last!, order });
      else join(opened.atom, last!, Math.max(opened.order, order));
      if (opened !== undefined) rings.delete(mark!);
      order = 1;
    }
  }
  return count(atoms);
}

function count(atoms: readonly Atom[]): Atoms {
  const sum: Atoms = {};
  for (const { element, hydrogens, bonds } of atoms) {
    sum[element] = (sum[element] ?? 0) + 1;
    const implied = (valences[element] ?? [bonds]).find((valence) => valence >= bonds)! - bonds;
    const h = hydrogens ?? implied;
    if (h > 0) sum["H"] = (sum["H"] ?? 0) + h;
  }
  return sum;
}
