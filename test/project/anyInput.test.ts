import fc from "fast-check";
import { afterAll, beforeAll, describe, expect, test, vi } from "vitest";
import * as rb from "../../kernel/index";
import { issueCodes } from "../../src/base/codes";
import { validInputs } from "./validInputs";

type Call = (...args: readonly unknown[]) => unknown;

const isClass = (value: unknown): boolean => typeof value === "function" && /^class\b/.test(String(value));
const functions = Object.entries<unknown>(rb)
  .filter(([, value]) => typeof value === "function" && !isClass(value))
  .map(([name, value]) => [name, value as Call] as const);

/** Functions that do something and give nothing back. */
const givesNothing = new Set(["show", "displayUnits"]);

/** Figures and tables refuse what is no result; whether a result is whole is not checked number by number. */
const drawsResult = (name: string): boolean => /Diagram$|^(stagesAgainstReflux|resultTable)$/.test(name);

const slowest = 1000; // ms

/** Values that a careless program sends. */
const odd = fc.oneof(
  fc.constantFrom<unknown[]>(
    null,
    undefined,
    "",
    "NaN",
    "0",
    " ",
    "1e999 bar",
    "-5 degC",
    "12 furlongs",
    "500 ppm",
  ),
  fc.constantFrom<unknown[]>(
    "1.3 bar",
    "95 degC",
    "120 kmol/h",
    "benzene",
    "toluene",
    "71-43-2",
    "__proto__",
    "kind",
  ),
  fc.constantFrom<unknown[]>(
    [],
    {},
    [[]],
    [1, 2],
    { length: 3 },
    true,
    false,
    [null],
    { a: 1 },
    { benzene: 1 },
  ),
  fc.constantFrom<unknown[]>(
    0,
    -0,
    1,
    -1,
    0.5,
    1.0000001,
    2,
    1e-9,
    1e-300,
    5e-324,
    1e9,
    1e300,
    -1e300,
    2 ** 53,
  ),
  fc.constantFrom<unknown[]>(Number.NaN, Infinity, -Infinity),
  fc.double({ noNaN: false }),
  fc.double({ min: 0, max: 1 }),
  fc.jsonValue({ maxDepth: 2 }),
);

interface Mutation {
  readonly where: number;
  readonly how: "replace" | "scale" | "delete" | "rename" | "add" | "copy";
  readonly value: unknown;
  readonly factor: number;
}

const mutation: fc.Arbitrary<Mutation> = fc.record({
  where: fc.nat(10_000),
  how: fc.constantFrom("replace", "replace", "scale", "delete", "rename", "add", "copy"),
  value: odd,
  factor: fc.constantFrom(-1, 0, 1e-12, 0.01, 0.5, 0.99, 1.01, 1.5, 3, 100, 1e12, 1e200),
});

type Bag = Record<string, unknown>;

function isBag(value: unknown): value is Bag {
  return typeof value === "object" && value !== null && !ArrayBuffer.isView(value);
}

/** Every place in a value that can be changed: the holder and the key. */
function places(value: unknown, found: [Bag, string][] = []): [Bag, string][] {
  if (!isBag(value)) return found;
  for (const key of Object.keys(value)) {
    found.push([value, key]);
    places(value[key], found);
  }
  return found;
}

/** Changes one place of the arguments. */
function mutate(args: unknown[], { where, how, value: shared, factor }: Mutation): void {
  const value = structuredClone(shared);
  const all = places(args);
  if (all.length === 0) return;
  const [holder, key] = all[where % all.length]!;
  const old = holder[key];
  if (how === "scale" && typeof old === "number") holder[key] = old * factor;
  else if (how === "scale" && ArrayBuffer.isView(old)) (old as Float64Array)[0]! *= factor;
  else if (how === "delete" && !Array.isArray(holder)) delete holder[key];
  else if (how === "rename" && !Array.isArray(holder)) {
    holder[`${key}s`] = old;
    delete holder[key];
  } else if (how === "add" && isBag(old)) old[typeof value === "string" ? value : "extra"] = value;
  else if (how === "copy") holder[key] = structuredClone(all[(where * 7 + 3) % all.length]![0]);
  else holder[key] = value;
}

/** A change of one number: another size, another fraction, or close to an end of its range. */
const numberChange = fc.record({
  where: fc.nat(10_000),
  value: fc.oneof(
    fc.double({ min: 0, max: 1, noNaN: true }),
    fc.constantFrom(0, 1e-12, 1e-6, 0.5, 1 - 1e-6, 1 - 1e-12, 1, 1 + 1e-9, 1.01, 2, 10, 1e3, -0.5, -2),
  ),
  exponent: fc.double({ min: -3, max: 3, noNaN: true }),
  scales: fc.boolean(),
});

type NumberChange = typeof numberChange extends fc.Arbitrary<infer T> ? T : never;

function changeNumber(args: unknown[], { where, value, exponent, scales }: NumberChange): void {
  const numbers = places(args).filter(([holder, key]) => typeof holder[key] === "number");
  if (numbers.length === 0) return;
  const [holder, key] = numbers[where % numbers.length]!;
  holder[key] = scales ? (holder[key] as number) * 10 ** exponent : value;
}

/** Scales every composition to add up to 1 again, so that more than the sum is put to the test. */
function scaleCompositions(value: unknown): void {
  for (const [holder, key] of places(value)) {
    const fractions = holder[key];
    if (!/^(composition|distillate|bottoms)$/.test(key) || !isBag(fractions)) continue;
    const sum = Object.values(fractions).reduce<number>((total, x) => total + (x as number), 0);
    for (const name of Object.keys(fractions)) fractions[name] = (fractions[name] as number) / sum;
  }
}

/** Freezes everything that can be, so that a function that changes its input throws. */
function freeze(value: unknown): void {
  if (!isBag(value)) return;
  Object.freeze(value);
  Object.values(value).forEach(freeze);
}

/** What in a result is not plain JSON: NaN, Infinity, undefined, functions, class instances. */
function notPlain(value: unknown, at = "result"): string[] {
  if (value === null || typeof value === "string" || typeof value === "boolean") return [];
  if (typeof value === "number") return Number.isFinite(value) ? [] : [`${at} is ${value}`];
  if (ArrayBuffer.isView(value)) return notPlain(Array.from(value as Float64Array), at);
  if (Array.isArray(value)) return value.flatMap((item, i) => notPlain(item, `${at}[${i}]`));
  const isRecord = typeof value === "object" && Object.getPrototypeOf(value) === Object.prototype;
  if (!isRecord) return [`${at} is ${typeof value}`];
  return Object.entries(value as Bag).flatMap(([key, item]) => notPlain(item, `${at}.${key}`));
}

/** What is wrong with how a call ended; empty when it answered plainly or refused with documented codes. */
function faultsOf(name: string, call: Call, args: readonly unknown[]): string[] {
  const started = performance.now();
  const faults = endOf(name, call, args);
  const took = performance.now() - started;
  if (took <= slowest) return faults;
  // once more, in case the machine was busy with something else
  const again = performance.now();
  endOf(name, call, args);
  const second = performance.now() - again;
  return second <= slowest ? faults : [...faults, `took ${Math.round(second)} ms`];
}

function endOf(name: string, call: Call, args: readonly unknown[]): string[] {
  try {
    const answer = call(...args);
    return givesNothing.has(name) && answer === undefined ? [] : notPlain(answer);
  } catch (error) {
    return refusalFaults(error);
  }
}

function refusalFaults(error: unknown): string[] {
  if (!(error instanceof rb.DesignInputError || error instanceof rb.DesignInfeasibleError)) {
    return [`threw ${String(error)} ${error instanceof Error ? (error.stack?.split("\n")[1] ?? "") : ""}`];
  }
  const wrong = error.issues.filter(
    (issue) =>
      !Object.hasOwn(issueCodes, issue.code) || issue.message.length < 10 || typeof issue.path !== "string",
  );
  return error.issues.length === 0 ? ["no issue"] : wrong.map((issue) => `issue ${JSON.stringify(issue)}`);
}

const settings = { seed: 20260601, numRuns: 500, endOnFailure: true };

beforeAll(() => {
  // the first unknown unit of a process loads the general unit library, about a second, once
  expect(() =>
    rb.boilingTemperature({ component: "benzene", pressure: "12 furlongs" as "12 bar" }),
  ).toThrow();
});

afterAll(() => {
  rb.displayUnits("metric");
});

test("every exported function has valid inputs to start from", () => {
  expect(functions.map(([name]) => name).filter((name) => !(name in validInputs))).toEqual([]);
  expect(Object.keys(validInputs).filter((name) => !functions.some(([known]) => known === name))).toEqual([]);
});

describe.each(functions.filter(([name]) => name in validInputs))("%s", (name, call) => {
  // what `show` prints is looked at elsewhere
  const silent = (): unknown => vi.spyOn(process.stdout, "write").mockImplementation(() => true);
  beforeAll(() => (name === "show" ? void silent() : undefined));
  afterAll(() => void vi.restoreAllMocks());

  test("answers its valid inputs, the same each time, and leaves them alone", () => {
    for (const args of validInputs[name]!()) {
      const copy = structuredClone(args);
      freeze(args);
      const answer = call(...args);
      if (!givesNothing.has(name)) expect(notPlain(answer)).toEqual([]);
      expect(call(...copy)).toEqual(answer);
      expect(copy).toEqual(args);
    }
  });

  test("answers or refuses whatever comes", () => {
    fc.assert(
      fc.property(fc.array(odd, { maxLength: 2 }), (args) => {
        expect(faultsOf(name, call, args)).toEqual([]);
      }),
      settings,
    );
  });

  if (drawsResult(name)) return;

  test("answers or refuses other numbers", () => {
    const rows = validInputs[name]!();
    const changed = fc.tuple(fc.nat(rows.length - 1), fc.array(numberChange, { minLength: 1, maxLength: 3 }));
    fc.assert(
      fc.property(changed, ([row, changes]) => {
        const args = structuredClone(rows[row]) as unknown[];
        for (const change of changes) changeNumber(args, change);
        scaleCompositions(args);
        freeze(args);
        expect(faultsOf(name, call, args)).toEqual([]);
      }),
      settings,
    );
  });

  test("answers or refuses valid inputs with up to three changes", () => {
    const rows = validInputs[name]!();
    const changed = fc.tuple(fc.nat(rows.length - 1), fc.array(mutation, { minLength: 1, maxLength: 3 }));
    fc.assert(
      fc.property(changed, ([row, mutations]) => {
        const args = structuredClone(rows[row]) as unknown[];
        for (const change of mutations) mutate(args, change);
        freeze(args);
        expect(faultsOf(name, call, args)).toEqual([]);
      }),
      settings,
    );
  });
});
