import { describe, expect, test } from "vitest";
import { defineComponent } from "../../src/components/defineComponent";
import { bubblePoint } from "../../src/equilibrium/bubblePoint";
import { dewPoint } from "../../src/equilibrium/dewPoint";
import { flash } from "../../src/equilibrium/flash";
import { rachfordRice } from "../../src/equilibrium/rachfordRice";
import { relativeVolatility } from "../../src/equilibrium/relativeVolatility";
import { antoineMixture, atVaporPressures, printedTemperature } from "./ownMixture";

/** Both within half a digit of what is printed, or the tolerance stated. */
function close(value: number, printed: number, tolerance: number): void {
  expect(Math.abs(value - printed)).toBeLessThanOrEqual(tolerance);
}

const mmHg = 133.322387415;
const celsius = 273.15;
const inCelsius = { temperatureUnit: "degC", pressureUnit: "mmHg", logBase: 10 } as const;

describe("phases of a binary from pure vapor pressures", () => {
  test.each<[string, Record<string, number>, number, number, number, number, number]>([
    [
      "Coulson & Richardson vol. 2, Example 11.1",
      { heptane: 106, toluene: 73.7 },
      101.3,
      0.87,
      0.854,
      0.894,
      6e-4,
    ],
    ["Geankoplis, Example 11.1-1", { benzene: 155.7, toluene: 63.3 }, 101.32, 0.5, 0.411, 0.632, 6e-4],
    [
      "Ghoshal, Sanyal & Datta, Example 6.10",
      { methanol: 53.32, water: 12.33 },
      40,
      0.8,
      0.675043,
      0.899832,
      1e-6,
    ],
  ])("%s", (_source, pressures, pressure, z, x, y, tolerance) => {
    const [light] = Object.keys(pressures);
    const kValues = Object.fromEntries(Object.entries(pressures).map(([name, p]) => [name, p / pressure]));
    const [first, second] = Object.keys(pressures);
    const split = rachfordRice({ composition: { [first!]: z, [second!]: 1 - z }, kValues });
    close(split.liquid[light!]!, x, tolerance);
    close(split.vapor[light!]!, y, tolerance);
  });
});

describe("benzene and toluene, Antoine constants of Coulson & Richardson vol. 2", () => {
  const constants = { benzene: [6.90565, 1211.033, 220.79], toluene: [6.95334, 1343.943, 219.377] } as const;
  const input = { ...antoineMixture(inCelsius, constants, [0.5, 0.5]), pressure: "101.3 kPa" } as const;
  const theirKelvin = 0.15; // the book adds 273

  test("Example 11.4: boils at 365.1 K", () => {
    close(bubblePoint(input).temperature - theirKelvin, 365.1, 0.1);
  });

  test("Example 11.5: condenses at 371.8 K by its printed sums (372.0 K, printed, is the last trial, not the root)", () => {
    const { temperature, liquid } = dewPoint(input);
    close(temperature - theirKelvin, 371.8, 0.1);
    close(liquid["benzene"]!, 0.2909246, 1e-6); // recomputed from the constants printed
  });

  test("de Nevers, Example 3.4: 64.518 torr at 20 degC, y 0.932483 (its toluene has C 219.337)", () => {
    const own = { ...constants, toluene: [6.95334, 1343.943, 219.337] } as const;
    const { pressure, vapor } = bubblePoint({
      ...antoineMixture(inCelsius, own, [0.8, 0.2]),
      temperature: "20 degC",
    });
    close(pressure / mmHg, 64.518358, 5e-4);
    close(vapor["benzene"]!, 0.932483, 2e-6);
  });
});

test("de Nevers, Example 8.3: acetone in water by Raoult's law, 96.406 degC, with a warning (measured 74.8 degC)", () => {
  const constants = { acetone: [7.02447, 1161, 224], water: [7.94917, 1657.462, 227.02] } as const;
  const result = bubblePoint({ ...antoineMixture(inCelsius, constants, [0.05, 0.95]), pressure: "760 mmHg" });
  close(result.temperature - celsius, 96.406, 0.002);
  close(result.vapor["acetone"]!, 0.165615, 2e-5);
  expect(result.cautions[0]).toMatchObject({ severity: "stop", code: "water-with-organic" });
});

test("Benitez, Example 3.1: 8.02 kPa at 300 K, y 0.688 (its kPa is 101.3/760 of a mmHg)", () => {
  const constants = { benzene: [15.9008, 2788.51, -52.36], toluene: [16.0137, 3096.52, -53.67] } as const;
  const form = { temperatureUnit: "K", pressureUnit: "mmHg", logBase: "e" } as const;
  const { pressure, vapor } = bubblePoint({
    ...antoineMixture(form, constants, [0.4, 0.6]),
    temperature: 300,
  });
  close(((pressure / mmHg) * 101.3) / 760, 8.02, 0.006);
  close(vapor["benzene"]!, 0.688, 6e-4);
});

test("Benitez, Example 6.1: 60 % of heptane and octane vaporized at 1 bar, 385.4 K", () => {
  const wagner = (name: string, critical: [number, number], coefficients: [number, number, number, number]) =>
    defineComponent({
      name,
      vaporPressure: {
        form: "wagner36",
        coefficients,
        criticalTemperature: critical[0],
        criticalPressure: critical[1],
        range: [250, 500],
        source: "Benitez, Example 6.1",
      },
    });
  const ownComponents = [
    wagner("heptane", [540.3, 27.4e5], [-7.675, 1.371, -3.536, -3.202]),
    wagner("octane", [568.8, 24.9e5], [-7.912, 1.38, -3.804, -4.501]),
  ];
  const composition = { heptane: 0.5, octane: 0.5 };
  const result = flash({ composition, ownComponents, pressure: "1 bar", vaporFraction: 0.6 });
  close(result.temperature, 385.4, 0.1);
  close(result.vapor["heptane"]!, 0.576, 6e-4);
  close(result.liquid["heptane"]!, 0.385, 6e-4);
});

describe("Narayanan, Example 8.8: acetone and acetonitrile", () => {
  const constants = {
    acetone: [14.5463, 2940.46, -35.93],
    acetonitrile: [14.2724, 2945.47, -49.15],
  } as const;
  const form = { temperatureUnit: "K", pressureUnit: "kPa", logBase: "e" } as const;
  const of = (x: number) => antoineMixture(form, constants, [x, 1 - x]);
  const within = 2e-5;

  test("(a) x 0.560806, y 0.734393 at 327 K and 65 kPa", () => {
    const { liquid, vapor } = flash({ ...of(0.65), temperature: 327, pressure: "65 kPa" });
    close(liquid["acetone"]!, 0.560806, within);
    close(vapor["acetone"]!, 0.734393, within);
  });

  test("(b) 330.3692 K for x 0.4 at 65 kPa (printed 330.4 from steps of 1 kPa)", () => {
    close(bubblePoint({ ...of(0.4), pressure: "65 kPa" }).temperature, 330.3692, 1e-4);
  });

  test("(c) 57.633467 kPa, y 0.590765 for x 0.4 at 327 K", () => {
    const { pressure, vapor } = bubblePoint({ ...of(0.4), temperature: 327 });
    close(pressure / 1e3, 57.633467, 57 * within);
    close(vapor["acetone"]!, 0.590765, within);
  });

  test("(d) 334.1553 K for y 0.4 at 65 kPa (printed 334.0 from steps of 2 K)", () => {
    close(dewPoint({ ...of(0.4), pressure: "65 kPa" }).temperature, 334.1553, 1e-4);
  });

  test("(e) 50.093199 kPa, x 0.235402 for y 0.4 at 327 K", () => {
    const { pressure, liquid } = dewPoint({ ...of(0.4), temperature: 327 });
    close(pressure / 1e3, 50.093199, 50 * within);
    close(liquid["acetone"]!, 0.235402, within);
  });

  test("(f) 19.816 % liquid for z 0.7 at 327 K and 65 kPa", () => {
    const { vaporFraction } = flash({ ...of(0.7), temperature: 327, pressure: "65 kPa" });
    close(100 * (1 - vaporFraction), 19.816, 0.05); // the book goes on with y rounded to 0.7344
  });
});

test("Narayanan, Example 8.7: vaporization begins at 94.7 kPa and ends at 77.208 kPa", () => {
  const input = {
    ...atVaporPressures({ benzene: 135.4, toluene: 54 }, [0.5, 0.5]),
    temperature: printedTemperature,
  };
  close(bubblePoint(input).pressure / 1e3, 94.7, 1e-4);
  close(dewPoint(input).pressure / 1e3, 77.208025, 1e-4);
});

describe("Smith, Van Ness & Abbott", () => {
  test("Example 10.4: K-values at 8.7 bar make the vapor condense, those at 26.54 bar the liquid boil", () => {
    const composition = { methane: 0.1, ethane: 0.2, propane: 0.7 };
    const at = (methane: number, ethane: number, propane: number) =>
      rachfordRice({ composition, kValues: { methane, ethane, propane } }).vaporFraction;
    close(at(16, 2.65, 0.762), 1, 0.005); // K-values read from a chart
    close(at(5.49, 1.1, 0.33), 0, 0.005);
    expect(at(20, 3.25, 0.92)).toBe(1); // 6.9 bar
    expect(at(13.2, 2.25, 0.65)).toBeLessThan(1); // 10.34 bar
    expect(at(5.25, 1.07, 0.32)).toBe(0); // 27.6 bar
  });

  test("Example 10.5: V 0.7364 (from memory; the reworking seen stops after one pass at 0.8789)", () => {
    const pressures = { acetone: 195.75, acetonitrile: 97.84, nitromethane: 50.32 };
    const input = atVaporPressures(pressures, [0.45, 0.35, 0.2]);
    const { vaporFraction, liquid, vapor } = flash({
      ...input,
      temperature: printedTemperature,
      pressure: "110 kPa",
    });
    close(vaporFraction, 0.7364, 5e-4);
    [0.5087, 0.3389, 0.1524].forEach((y, i) => close(Object.values(vapor)[i]!, y, 5e-4));
    [0.2859, 0.381, 0.3331].forEach((x, i) => close(Object.values(liquid)[i]!, x, 5e-4));
  });

  describe("Problem 10.1, benzene and toluene (constants and answers from memory)", () => {
    const constants = { benzene: [13.7819, 2726.81, 217.572], toluene: [13.932, 3056.96, 217.625] } as const;
    const form = { temperatureUnit: "degC", pressureUnit: "kPa", logBase: "e" } as const;
    const mixture = antoineMixture(form, constants, [0.33, 0.67]);

    test("(a), (b) pressures at 100 degC", () => {
      const bubble = bubblePoint({ ...mixture, temperature: "100 degC" });
      const dew = dewPoint({ ...mixture, temperature: "100 degC" });
      close(bubble.pressure / 1e3, 109.303, 0.01);
      close(bubble.vapor["benzene"]!, 0.545, 1e-3);
      close(dew.pressure / 1e3, 92.156, 0.01);
      close(dew.liquid["benzene"]!, 0.169, 1e-3);
    });

    test("(c), (d) temperatures at 120 kPa", () => {
      const bubble = bubblePoint({ ...mixture, pressure: "120 kPa" });
      const dew = dewPoint({ ...mixture, pressure: "120 kPa" });
      close(bubble.temperature - celsius, 103.307, 0.01);
      close(bubble.vapor["benzene"]!, 0.542, 1e-3);
      close(dew.temperature - celsius, 109.131, 0.01);
      close(dew.liquid["benzene"]!, 0.173, 1e-3);
    });

    test("(e), (f) phases at 105 degC and 120 kPa", () => {
      const { liquid, vapor, vaporFraction } = flash({
        ...mixture,
        temperature: "105 degC",
        pressure: "120 kPa",
      });
      close(liquid["benzene"]!, 0.282, 1e-3);
      close(vapor["benzene"]!, 0.484, 1e-3);
      close(vaporFraction, 0.238, 1e-3);
    });
  });
});

test("Treybal, Illustration 9.5: W/D 2.08 (the compositions of the reworking seen, 1, 0, 0, are not usable)", () => {
  const pressures = { benzene: 1370, toluene: 550, "o-xylene": 200 };
  const kValues = Object.fromEntries(Object.entries(pressures).map(([name, p]) => [name, p / 760]));
  const composition = { benzene: 0.5, toluene: 0.25, "o-xylene": 0.25 };
  const { vaporFraction, vapor } = rachfordRice({ composition, kValues });
  close((1 - vaporFraction) / vaporFraction, 2.08, 0.01);
  close(vapor["benzene"]!, 0.7147, 5e-5);
});

test("Geankoplis, Example 11.7-1: K of the reference component from its volatilities", () => {
  const composition = { nC4: 0.4, nC5: 0.25, nC6: 0.2, nC7: 0.15 };
  const reference = (nC4: number, nC5: number, nC6: number, nC7: number): number => {
    const { liquid, vapor } = rachfordRice({ composition, kValues: { nC4, nC5, nC6, nC7 } });
    return vapor["nC6"]! / liquid["nC6"]!;
  };
  close(reference(1.86, 0.71, 0.2815, 0.11), 0.2831, 1e-4); // 70 degC, just below the bubble point
  close(0.2 * reference(1.68, 0.63, 0.245, 0.093), 0.2 * 0.2745, 1e-4);
});

test("Narayanan, Example 8.22: between 377.6 and 388.8 K the last liquid goes (printed 388.8: a table read backwards)", () => {
  const composition = { propane: 0.25, "n-butane": 0.4, "n-pentane": 0.35 };
  const at = (propane: number, nButane: number, nPentane: number) =>
    rachfordRice({ composition, kValues: { propane, "n-butane": nButane, "n-pentane": nPentane } });
  expect(at(2, 0.78, 0.33).phase).toBe("liquid"); // 355.4 K
  expect(at(2.3, 0.9, 0.4).phase).toBe("two-phase"); // 366.5 K
  expect(at(2.6, 1.1, 0.5).phase).toBe("two-phase"); // 377.6 K
  expect(at(2.9, 1.3, 0.61).phase).toBe("vapor"); // 388.8 K
  const bubble = at(2.12, 0.85, 0.37); // 360.86 K; its y add up to 0.9995
  [0.53, 0.34, 0.1295].forEach((y, i) => close(Object.values(bubble.vapor)[i]!, y, 3e-4));
});

test("Kantor, course notebook 07.01: water boils at 25 degC under 23.756 mmHg (its vapor mass takes degC for K)", () => {
  const mixture = antoineMixture(inCelsius, { water: [8.10765, 1750.286, 235] }, [1]);
  close(bubblePoint({ ...mixture, temperature: "25 degC" }).pressure / mmHg, 23.756, 1e-3);
});

test("Koretsky, first example of chapter 8: 332.85 K (printed 317 K counts n-pentane twice)", () => {
  const constants = {
    "n-pentane": [9.2131, 2477.07, -39.94],
    cyclohexane: [9.1325, 2766.63, -50.5],
    "n-hexane": [9.2164, 2697.55, -48.78],
    "n-heptane": [9.2535, 2911.32, -56.51],
  } as const;
  const form = { temperatureUnit: "K", pressureUnit: "bar", logBase: "e" } as const;
  const mixture = antoineMixture(form, constants, [0.3, 0.3, 0.2, 0.2]);
  const { temperature, vapor } = bubblePoint({ ...mixture, pressure: "1 bar" });
  close(temperature, 332.85, 0.005);
  [0.6391576, 0.1541206, 0.1512112, 0.05551063].forEach((y, i) => close(Object.values(vapor)[i]!, y, 1e-6));
});

test("Koretsky, third example of chapter 8: a third vaporized at 0.31 bar, x 0.4, y 0.7", () => {
  const mixture = atVaporPressures({ a: 53, b: 16 }, [0.5, 0.5]);
  const result = flash({ ...mixture, temperature: printedTemperature, vaporFraction: 1 / 3 });
  close(result.pressure / 1e5, 0.31, 0.005);
  close(result.liquid["a"]!, 0.4, 0.006);
  close(result.vapor["a"]!, 0.7, 0.05);
  close(result.pressure / 1e5, 0.3094966, 1e-7); // recomputed
});

test("Ahuja, Example 3.3: 108.205 and 79.694 kPa (printed x 0.226/0.302/0.482: sums not reset between steps)", () => {
  const pressures = { acetone: 195.75, acetonitrile: 97.84, nitromethane: 50.32 };
  const input = { ...atVaporPressures(pressures, [0.3, 0.3, 0.4]), temperature: printedTemperature };
  close(bubblePoint(input).pressure / 1e3, 108.205, 1e-4);
  close(dewPoint(input).pressure / 1e3, 79.6944627367, 1e-4);
  const { liquid, vaporFraction } = flash({ ...input, pressure: "100 kPa" });
  [0.2430603, 0.3015938, 0.4553459].forEach((x, i) => close(Object.values(liquid)[i]!, x, 1e-6));
  close(vaporFraction, 0.2446596, 1e-6);
});

describe("relative volatility", () => {
  test.each([
    ["85 degC", 116.9, 46, 2.54],
    ["105 degC", 204.2, 86, 2.37],
  ])("Geankoplis, Example 11.3-1, %s", (_at, benzene, toluene, alpha) => {
    const mixture = atVaporPressures({ benzene, toluene }, [0.5, 0.5]);
    const { values } = relativeVolatility({
      ...mixture,
      heavyKey: "toluene",
      temperature: printedTemperature,
    });
    close(values["benzene"]!, alpha, 0.006);
  });

  test("de Nevers, Example 8.1: K 12.762 and 0.380947 of acetone in water, alpha 33.500691, from x 0.05, y 0.6381", () => {
    const kValues = { acetone: 12.762, water: 0.380947 };
    const { liquid, vapor } = rachfordRice({ composition: { acetone: 0.3, water: 0.7 }, kValues });
    close(liquid["acetone"]!, 0.05, 1e-6);
    close(vapor["acetone"]!, 0.6381, 1e-6);
    close((vapor["acetone"]! / liquid["acetone"]!) * (liquid["water"]! / vapor["water"]!), 33.500691, 4e-5);
  });

  test.each([
    [0.9, 0.783],
    [0.8217, 0.648],
    [0.7322, 0.522],
    [0.6483, 0.424],
    [0.5829, 0.359],
    [0.4949, 0.282],
    [0.3882, 0.202],
    [0.2784, 0.134],
    [0.1832, 0.082],
    [0.112, 0.048],
  ])("student design report (2026), alpha 2.5: y %d leaves x %d", (y, x) => {
    const mixture = atVaporPressures({ light: 250, heavy: 100 }, [y, 1 - y]);
    close(dewPoint({ ...mixture, temperature: printedTemperature }).liquid["light"]!, x, 8e-4);
  });
});
