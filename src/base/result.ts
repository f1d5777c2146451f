import type { CautionCode } from "./cautionCodes";

/** How much a caution should weigh: worth knowing, worth checking, or not to be relied on. */
export type Severity = "note" | "check" | "stop";

/** What is doubtful: the method, the data behind it, or the safety of the thing itself. */
export type CautionKind = "method" | "data" | "hazard";

/** One statement of how far a result can be trusted. */
export interface Caution {
  /** Its meaning is `cautionCodes[code]`. */
  readonly code: CautionCode;
  readonly severity: Severity;
  readonly kind: CautionKind;
  readonly message: string;
  readonly value?: number;
  readonly limit?: number;
  readonly source?: string;
}

/** A method that produced a result, with its published source. */
export interface MethodUsed {
  readonly name: string;
  readonly source: string;
}

/** What every result carries beside its numbers. */
export interface Judged {
  readonly cautions: readonly Caution[];
  readonly methods: readonly MethodUsed[];
}

/** Component name (as typed) to a number: mole fractions, recoveries, volatilities. */
export type ByComponent = Readonly<Record<string, number>>;

const weight: Readonly<Record<Severity, number>> = { stop: 0, check: 1, note: 2 };

/** Gravest first, each code and message once; the order in which cautions are shown. */
export function sortCautions(...lists: readonly (readonly Caution[])[]): Caution[] {
  const seen = new Map<string, Caution>();
  for (const list of lists) {
    for (const caution of list) {
      const key = `${caution.code} ${caution.message}`;
      if (!seen.has(key)) seen.set(key, caution);
    }
  }
  return [...seen.values()].sort((a, b) => weight[a.severity] - weight[b.severity]);
}

/** Each method once, in the order of first use. */
export function collectMethods(...lists: readonly (readonly MethodUsed[])[]): MethodUsed[] {
  const seen = new Map<string, MethodUsed>();
  for (const list of lists) for (const method of list) seen.set(method.name, method);
  return [...seen.values()];
}

/** A record over `names` from values in the same order; safe for any name, `__proto__` included. */
export function byName<T>(names: readonly string[], values: ArrayLike<T>): Record<string, T> {
  const record: Record<string, T> = {};
  for (let i = 0; i < names.length; i++) {
    const name = names[i]!;
    if (name === "__proto__") {
      Object.defineProperty(record, name, {
        value: values[i],
        enumerable: true,
        configurable: true,
        writable: true,
      });
    } else record[name] = values[i]!;
  }
  return record;
}
