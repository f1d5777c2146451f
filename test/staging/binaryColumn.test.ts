import fc from "fast-check";
import { expect, test } from "vitest";
import { type BinaryColumn, columnFlows, operatingVapor } from "../../src/staging/binaryColumn";

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });

const feeds = fc.array(
  fc.record({ flow: number(0.2, 5), lightFraction: number(0.2, 0.8), q: number(-0.5, 1.5) }),
  { minLength: 1, maxLength: 4 },
);
const columns: fc.Arbitrary<BinaryColumn> = fc.record({
  streams: feeds,
  distillateLightFraction: number(0.85, 0.99999),
  bottomsLightFraction: number(1e-6, 0.15),
  openSteam: fc.boolean(),
});

const runs = { numRuns: 300, seed: 20261203 };

test("all and light component balance, whatever the streams and the bottom", () => {
  fc.assert(
    fc.property(columns, number(0.5, 50), (column, reflux) => {
      const { distillate, bottoms, sections } = columnFlows(column, reflux);
      const steam = column.openSteam ? sections[sections.length - 1]!.vapor : 0;
      const fed = column.streams.reduce((sum, { flow }) => sum + flow, 0);
      const light = column.streams.reduce((sum, { flow, lightFraction }) => sum + flow * lightFraction, 0);
      expect(distillate + bottoms - steam).toBeCloseTo(fed, 10);
      const { distillateLightFraction: xD, bottomsLightFraction: xB } = column;
      expect(distillate * xD + bottoms * xB).toBeCloseTo(light, 10);
    }),
    runs,
  );
});

test("the first line starts on the diagonal at the distillate, the last ends at the bottoms", () => {
  fc.assert(
    fc.property(columns, number(5, 50), (column, reflux) => {
      const { sections } = columnFlows(column, reflux);
      const { distillateLightFraction: xD, bottomsLightFraction: xB } = column;
      expect(operatingVapor(sections[0]!, xD)).toBeCloseTo(xD, 12);
      const last = operatingVapor(sections[sections.length - 1]!, xB);
      expect(last).toBeCloseTo(column.openSteam ? 0 : xB, 10);
    }),
    runs,
  );
});

test("neighboring lines meet on the q-line of the stream between them", () => {
  fc.assert(
    fc.property(columns, number(5, 50), (column, reflux) => {
      const { sections, intersections } = columnFlows(column, reflux);
      intersections.forEach((x, k) => {
        const { q, lightFraction } = column.streams[k]!;
        const y = operatingVapor(sections[k]!, x);
        fc.pre(sections[k + 1]!.vapor > 0.01);
        expect(operatingVapor(sections[k + 1]!, x)).toBeCloseTo(y, 8);
        expect(q * x + (1 - q) * y).toBeCloseTo(lightFraction, 8);
      });
    }),
    runs,
  );
});
