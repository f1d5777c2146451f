import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Issue } from "../../src/base/errors";
import { feed, type Feed, type FeedInput } from "../../src/balance/feed";
import { readFeed } from "../../src/balance/readFeed";
import { stream } from "../../src/balance/stream";
import { component } from "../../src/components/componentTable";
import { defineComponent } from "../../src/components/defineComponent";
import { flash } from "../../src/equilibrium/flash";
import { expectAnswerOrRefusal, refusal } from "../shortcut/answerOrRefusal";

const composition = { benzene: 0.4, toluene: 0.6 };
const [benzene, toluene] = [component("benzene").molarMass!, component("toluene").molarMass!];

describe("amounts", () => {
  test("molar flow and mole fractions", () => {
    const result = feed({ flow: "120 kmol/h", composition, q: 1, name: "crude" });
    expect(result).toMatchObject({ kind: "feed", name: "crude", composition, q: 1 });
    expect(result.flow).toBeCloseTo(120e3 / 3600, 12);
    expect(result.molarMass).toBeCloseTo(0.4 * benzene + 0.6 * toluene, 14);
    expect(result.massFlow).toBeCloseTo(result.flow * result.molarMass!, 12);
    expect(result.componentFlows["benzene"]).toBeCloseTo(0.4 * result.flow, 12);
  });

  test("mass flow and mass fractions", () => {
    const {
      flow,
      composition: x,
      massFlow,
      massComposition,
    } = feed({
      massFlow: "9 t/h",
      composition,
      basis: "mass",
      q: 1,
    });
    const moles = [0.4 / benzene, 0.6 / toluene];
    expect(x["benzene"]).toBeCloseTo(moles[0]! / (moles[0]! + moles[1]!), 14);
    expect(flow).toBeCloseTo(2.5 * (moles[0]! + moles[1]!), 11);
    expect(massFlow).toBeCloseTo(2.5, 13);
    expect(massComposition!["benzene"]).toBeCloseTo(0.4, 14);
  });

  test("mass flow with mole fractions, molar flow with mass fractions", () => {
    const byMole = feed({ massFlow: 2.5, composition });
    expect(byMole.composition).toEqual(composition);
    expect(byMole.massFlow).toBeCloseTo(2.5, 13);
    const byMass = feed({ flow: 10, composition, basis: "mass" });
    expect(byMass.flow).toBe(10);
    expect(byMass.massComposition!["toluene"]).toBeCloseTo(0.6, 14);
  });

  test("component flows, molar and by mass together", () => {
    const { flow, componentFlows } = feed({
      componentFlows: { benzene: "36 kmol/h", toluene: "3.6 t/h", "p-xylene": 0 },
    });
    expect(componentFlows["benzene"]).toBeCloseTo(10, 12);
    expect(componentFlows["toluene"]).toBeCloseTo(1 / toluene, 11);
    expect(componentFlows["p-xylene"]).toBe(0);
    expect(flow).toBeCloseTo(10 + 1 / toluene, 11);
  });

  test("mass fractions turned to mole fractions and back", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1, noNaN: true }), (w) => {
        const given = { benzene: w, toluene: 1 - w };
        const {
          massComposition,
          molarMass,
          composition: x,
        } = feed({ flow: 1, composition: given, basis: "mass" });
        expect(Math.abs(massComposition!["benzene"]! - w)).toBeLessThan(1e-14);
        expect(molarMass).toBeCloseTo(x["benzene"]! * benzene + x["toluene"]! * toluene, 14);
      }),
      { numRuns: 200, seed: 5 },
    );
  });
});

describe("state", () => {
  test("temperature and pressure give the phases", () => {
    const result = feed({ flow: 1, composition, temperature: "97 degC", pressure: "1 atm" });
    const expected = flash({ composition, temperature: "97 degC", pressure: "1 atm" });
    expect(result).toMatchObject({
      phase: "two-phase",
      vaporFraction: expected.vaporFraction,
      pressure: 101325,
    });
    expect(result.q).toBeUndefined();
  });

  test("vapor fraction and pressure give the temperature", () => {
    const result = feed({ flow: 1, composition, vaporFraction: 0.25, pressure: "1 atm" });
    expect(result.temperature).toBe(
      flash({ composition, vaporFraction: 0.25, pressure: "1 atm" }).temperature,
    );
  });

  test("a mixture that Raoult's law does not fit is said to be one, once its state rests on it", () => {
    const wet = { ethanol: 0.5, water: 0.5 };
    expect(feed({ flow: 1, composition: wet, q: 1 }).cautions).toEqual([]);
    const [caution] = feed({ flow: 1, composition: wet, temperature: 350, pressure: 101325 }).cautions;
    expect(caution).toMatchObject({ severity: "stop", code: "azeotrope" });
  });
});

describe("a feed out of a result is a feed", () => {
  test.each<[string, FeedInput]>([
    ["q", { flow: "100 kmol/h", composition, q: 0.7, name: "crude" }],
    ["mass", { massFlow: "9.2 t/h", composition, basis: "mass", q: 1 }],
    ["subcooled", { flow: 3, composition, temperature: 320, pressure: "3 bar" }],
    ["two phases", { flow: 3, composition, temperature: 369, pressure: "1 atm" }],
    ["saturated", { flow: 3, composition, vaporFraction: 0, pressure: "1 atm" }],
    ["part vaporized", { flow: 3, composition, vaporFraction: 0.3, pressure: "1 atm" }],
    ["saturated vapor", { flow: 3, composition, vaporFraction: 1, pressure: "1 atm" }],
    ["one component, boiling", { flow: 3, composition: { benzene: 1 }, vaporFraction: 0, pressure: "1 atm" }],
    [
      "one component, condensing",
      { flow: 3, composition: { benzene: 1 }, vaporFraction: 1, pressure: "1 atm" },
    ],
    ["one component", { flow: 3, composition: { benzene: 1 }, vaporFraction: 0.3, pressure: "1 atm" }],
    ["no state", { componentFlows: { benzene: 1, toluene: 2 } }],
  ])("%s", (_state, input) => {
    const first = feed(input);
    const second = feed(JSON.parse(JSON.stringify(first)) as FeedInput);
    expect(Math.abs(second.flow / first.flow - 1)).toBeLessThan(1e-14);
    for (const field of ["temperature", "vaporFraction", "massFlow", "q"] as const) {
      if (first[field] === undefined) expect(second[field]).toBeUndefined();
      else expect(Math.abs(second[field]! - first[field])).toBeLessThan(1e-9 * Math.max(1, first[field]));
    }
    expect(second.phase).toBe(first.phase);
    expect(second.name).toBe(first.name);
  });

  test("a product stream too, with its own state or with q", () => {
    const names = Object.keys(composition);
    const product = stream(names, 2, Float64Array.of(0.4, 0.6), names.map(component), {
      ...pick(feed({ flow: 2, composition, vaporFraction: 0, pressure: "1 atm" })),
    });
    expect(feed(product).phase).toBe("liquid");
    expect(feed({ ...product, q: 1 }).q).toBe(1);
  });

  test.each<[string, object]>([
    ["massFlow", { massFlow: 1 }],
    ["massFlow", { massFlow: "9 t/h" }],
    ["componentFlows.benzene", { componentFlows: { benzene: 1, toluene: 1.8 } }],
    ["massComposition.toluene", { massComposition: { benzene: 0.5, toluene: 0.5 } }],
    ["temperature", { temperature: 380 }],
    ["vaporFraction", { temperature: 340 }],
    ["molarMass", { composition: { benzene: 0.9, toluene: 0.1 } }],
  ])("a changed one must be given anew: %s no longer agrees", (field, change) => {
    const base: FeedInput =
      field === "temperature"
        ? { flow: 3, composition, vaporFraction: 0.3, pressure: "1 atm" }
        : { flow: 3, composition, temperature: 420, pressure: "1 atm" };
    const changed = { ...feed(base), ...change };
    expect(refusal(() => feed(changed as never))).toContain(`conflicting-fields ${field}`);
  });
});

function pick({ temperature, pressure, vaporFraction }: Feed) {
  return { temperature: temperature!, pressure: pressure!, vaporFraction: vaporFraction! };
}

describe("refusals", () => {
  test.each<[object, string[]]>([
    [{ flow: 0, composition, q: 1 }, ["flow-not-positive flow"]],
    [{ flow: -100, composition, q: 1 }, ["flow-not-positive flow"]],
    [{ flow: 1e300, composition, q: 1 }, ["above-limit flow"]],
    [{ flow: "14.2 t/h", composition, q: 1 }, ["wrong-dimension flow"]],
    [{ composition, q: 1 }, ["missing-field flow"]],
    [{ flow: 1, massFlow: 1, composition, q: 1 }, ["conflicting-fields flow"]],
    [{ flow: 1, q: 1 }, ["missing-field composition"]],
    [{ flow: 1, composition: { benzene: 0.4, toluene: 0.5 }, q: 1 }, ["composition-sum composition"]],
    [{ flow: 1, composition: { benzene: 0.4, nothing: 0.6 } }, ["unknown-component composition.nothing"]],
    [{ componentFlows: { benzene: 1 }, composition, q: 1 }, ["conflicting-fields composition"]],
    [{ componentFlows: { benzene: 1, "71-43-2": 1 } }, ["duplicate-component componentFlows.71-43-2"]],
    [{ componentFlows: { benzene: "-1 t/h" } }, ["flow-not-positive componentFlows.benzene"]],
    [{ componentFlows: { benzene: 0, toluene: 0 } }, ["flow-not-positive componentFlows"]],
    [{ componentFlows: { benzene: 1e300 } }, ["above-limit componentFlows.benzene"]],
    [{ componentFlows: {} }, ["empty componentFlows"]],
    [{ flow: 1, composition, basis: "weight" }, ["unknown-choice basis"]],
    [{ flow: 1, composition, q: Infinity }, ["not-finite q"]],
    [{ flow: 1, composition, q: 1, temperature: 350, pressure: 1e5 }, ["conflicting-fields q"]],
    [{ flow: 1, composition, q: 1, pressure: 1e5 }, ["conflicting-fields q"]],
    [{ flow: 1, composition, pressure: 1e5 }, ["conflicting-fields pressure"]],
    [{ flow: 1, composition, temperature: 350 }, ["missing-field pressure"]],
    [{ flow: 1, composition, temperature: 95, pressure: 1e5 }, ["implausible-bare-number temperature"]],
    [{ flow: 1, composition, vaporFraction: 1.5, pressure: 1e5 }, ["fraction-out-of-range vaporFraction"]],
    [
      { flow: 1, composition, temperature: 600, pressure: 1e5 },
      ["above-critical temperature", "above-critical temperature"],
    ],
    [{ flow: 1, composition, name: "" }, ["wrong-type name"]],
    [{ flow: 1, composition, phase: "liquid" }, ["unknown-field phase"]],
  ])("%j", (input, expected) => {
    expect(refusal(() => feed(input as never))).toEqual(expected);
  });

  test("a mass of a component without a molar mass", () => {
    const own = defineComponent({ name: "own", vaporPressure: component("benzene").vaporPressure });
    const input = { composition: { own: 1 }, ownComponents: [own] };
    expect(refusal(() => feed({ ...input, massFlow: 1 }))).toEqual(["missing-property composition.own"]);
    expect(refusal(() => feed({ componentFlows: { own: "1 t/h" }, ownComponents: [own] }))).toEqual([
      "missing-property componentFlows.own",
    ]);
    expect(feed({ ...input, flow: 1 }).massFlow).toBeUndefined();
  });
});

describe("free labels", () => {
  const rules = { components: "free", thermalRequired: true } as const;
  const faultsOf = (value: unknown): string[] => {
    const faults: Issue[] = [];
    readFeed(faults, "feed", value, rules);
    return faults.map(({ code, path }) => `${code} ${path}`);
  };

  test("are not looked up", () => {
    const reading = readFeed([], "feed", { flow: 100, composition: { c1: 0.3, c2: 0.7 }, q: 1 }, rules)!;
    expect(reading).toMatchObject({ names: ["c1", "c2"], flow: 100, thermal: { given: "q", q: 1 } });
    expect(reading.mixture).toBeUndefined();
  });

  test("take the feed out of a result when it has q", () => {
    const reading = readFeed([], "feed", feed({ massFlow: 1, composition, q: 0.5 }), rules)!;
    expect(reading.thermal).toEqual({ given: "q", q: 0.5 });
  });

  test("of a changed result must be given anew as well", () => {
    const base = feed({ massFlow: 1, composition, q: 0.5 });
    expect(faultsOf({ ...base, massFlow: 2 })).toEqual(["conflicting-fields feed.massFlow"]);
    expect(faultsOf({ ...base, componentFlows: {} })).toEqual([
      "conflicting-fields feed.componentFlows.benzene",
      "conflicting-fields feed.componentFlows.toluene",
    ]);
  });

  test.each<[unknown, string[]]>([
    [{ massFlow: 1, composition: { c1: 1 }, q: 1 }, ["missing-property feed.massFlow"]],
    [{ flow: 1, composition: { c1: 1 }, basis: "mass", q: 1 }, ["missing-property feed.basis"]],
    [{ componentFlows: { c1: "1 t/h" }, q: 1 }, ["missing-property feed.componentFlows.c1"]],
    [{ flow: 1, composition: { c1: 1 }, vaporFraction: 0.5, pressure: 1e5 }, ["missing-field feed.q"]],
    [{ flow: 1, composition: { c1: 1 } }, ["missing-field feed.q"]],
    [undefined, ["missing-field feed"]],
    [[1], ["not-an-object feed"]],
  ])("%j", (value, expected) => {
    expect(faultsOf(value)).toEqual(expected);
  });
});

test("any JSON is answered or refused", () => {
  const value = fc.oneof(
    fc.double(),
    fc.jsonValue({ maxDepth: 1 }),
    fc.constantFrom("NaN", null, 1e308, 5e-324, -1, 1, 0.5, "1 bar", "1 t/h", "95 degC", composition, {
      benzene: 1,
    }),
  );
  const fields = fc.constantFrom(
    ..."kind name flow massFlow composition basis normalize componentFlows q temperature pressure vaporFraction molarMass massComposition phase".split(
      " ",
    ),
  );
  fc.assert(
    fc.property(fc.dictionary(fields, value), fc.boolean(), (input, isFeed) => {
      expectAnswerOrRefusal(() => feed(isFeed ? { ...input, kind: "feed", composition } : input));
    }),
    { numRuns: 1000, seed: 11 },
  );
});

describe("mass fractions turned into mole fractions", () => {
  const lightMoles = (light: string, heavy: string, w: number) =>
    feed({ massFlow: 1, basis: "mass", composition: { [light]: w, [heavy]: 1 - w } }).composition[light]!;

  test.each([
    [0.4, 0.44],
    [0.97, 0.974],
    [0.02, 0.0235],
  ])(
    "Seader and Henley, Separation Process Principles, exercise 7.13 (solutions): %d of benzene by mass is %d by mole",
    (w, x) => {
      expect(Math.abs(lightMoles("benzene", "toluene", w) - x)).toBeLessThan(0.0006);
    },
  );

  test("Treybal, Mass-Transfer Operations, Illustration 9.8 (p. 388): methanol-water, 50, 95 and 1 % by mass", () => {
    const expected = [0.36, 0.915, 0.00565];
    [0.5, 0.95, 0.01].forEach((w, i) => {
      expect(Math.abs(lightMoles("methanol", "water", w) - expected[i]!)).toBeLessThan(0.0007);
    });
  });
});
