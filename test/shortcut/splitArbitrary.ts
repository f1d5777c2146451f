import fc from "fast-check";
import type { UnderwoodInput } from "../../src/shortcut/underwood";
import { records } from "./caseRecords";

const anyAmount = fc.oneof(
  { weight: 4, arbitrary: fc.double({ min: 0.05, max: 1, noNaN: true }) },
  { weight: 1, arbitrary: fc.double({ min: -7, max: -1, noNaN: true }).map((power) => 10 ** power) },
);

const anyLoss = fc.oneof(
  fc.double({ min: -6, max: -0.5, noNaN: true }).map((power) => 10 ** power),
  fc.double({ min: 1e-6, max: 1 - 1e-6, noNaN: true }),
);

/** Any split of 2 to 12 components c1, c2, ... of falling volatility that enriches the light key. */
export const anySplit: fc.Arbitrary<UnderwoodInput> = fc
  .integer({ min: 2, max: 12 })
  .chain((count) =>
    fc.record({
      steps: fc.array(fc.double({ min: 0.005, max: 9.2 / (count - 1), noNaN: true }), {
        minLength: count - 1,
        maxLength: count - 1,
      }),
      amounts: fc.array(anyAmount, { minLength: count, maxLength: count }),
      keys: fc.uniqueArray(fc.nat(count - 1), { minLength: 2, maxLength: 2 }),
      q: fc.double({ min: -1, max: 2, noNaN: true }),
      heavyInDistillate: anyLoss,
      lightInBottoms: anyLoss,
    }),
  )
  .filter(({ heavyInDistillate, lightInBottoms }) => heavyInDistillate + lightInBottoms < 0.999999)
  .map(({ steps, amounts, keys, q, heavyInDistillate, lightInBottoms }) => {
    const volatility = [1];
    for (const step of steps) volatility.unshift(volatility[0]! * Math.exp(step));
    const sum = amounts.reduce((total, amount) => total + amount, 0);
    const [light, heavy] = [...keys].sort((a, b) => a - b);
    return {
      ...records(
        amounts.map((amount) => amount / sum),
        volatility,
      ),
      q,
      lightKey: `c${light! + 1}`,
      heavyKey: `c${heavy! + 1}`,
      lightKeyRecovery: 1 - lightInBottoms,
      heavyKeyRecovery: 1 - heavyInDistillate,
    };
  });
