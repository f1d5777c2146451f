import type { Component } from "./component";

/** Lower case without spaces, commas, dots, quotes and hyphens: "1,2-Dichloroethane" and "1 2 dichloroethane" are one. */
export function simplified(name: string): string {
  return name.toLowerCase().replace(/[\s,_.'’\u2010-\u2015\u2032-]+/g, "");
}

/** Every name under which a component is found: id, name, synonyms, CAS number. */
export function namesOf({ id, name, synonyms, cas }: Component): string[] {
  const names = id === name ? [name, ...(synonyms ?? [])] : [id, name, ...(synonyms ?? [])];
  return cas === undefined ? names : [...names, cas];
}

const casNumber = /^(\d{2,7})-(\d\d)-(\d)$/;

/** Whether a text is a CAS number whose check digit is right: the digits from the right, weighted 1, 2, 3, ... */
export function isCasNumber(text: string): boolean {
  const parts = casNumber.exec(text);
  if (parts === null) return false;
  const digits = [...(parts[1]! + parts[2]!)].reverse();
  const sum = digits.reduce((total, digit, i) => total + (i + 1) * Number(digit), 0);
  return sum % 10 === Number(parts[3]);
}
