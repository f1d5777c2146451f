/** Cases of five components for the speed comparison, drawn alike in TypeScript, C and Python. */
export interface ShortcutCases {
  readonly count: number;
  readonly components: number;
  /** Falling, relative to the heaviest component; `components` a case, like `fraction`. */
  readonly volatility: Float64Array;
  readonly fraction: Float64Array;
  readonly q: Float64Array;
  readonly lightKey: Int32Array;
  readonly lightKeyRecovery: Float64Array;
  readonly heavyKeyRecovery: Float64Array;
  readonly refluxOverMinimum: Float64Array;
}

/** Draws cases with the minimal standard generator (S. K. Park and K. W. Miller, Commun. ACM 31 (1988) 1192). */
export function drawShortcutCases(count: number): ShortcutCases {
  const components = 5;
  let state = 12345;
  const uniform = (): number => {
    state = (16807 * state) % 2147483647;
    return state / 2147483647;
  };
  const cases = {
    count,
    components,
    volatility: new Float64Array(count * components),
    fraction: new Float64Array(count * components),
    q: new Float64Array(count),
    lightKey: new Int32Array(count),
    lightKeyRecovery: new Float64Array(count),
    heavyKeyRecovery: new Float64Array(count),
    refluxOverMinimum: new Float64Array(count),
  };
  for (let c = 0; c < count; c++) {
    const at = c * components;
    const { volatility, fraction } = cases;
    volatility[at + components - 1] = 1;
    for (let i = components - 2; i >= 0; i--) {
      volatility[at + i] = volatility[at + i + 1]! * (1.15 + 1.35 * uniform());
    }
    let sum = 0;
    for (let i = 0; i < components; i++) sum += fraction[at + i] = 0.05 + uniform();
    for (let i = 0; i < components; i++) fraction[at + i] = fraction[at + i]! / sum;
    cases.q[c] = 1.25 * uniform();
    cases.lightKey[c] = Math.min(3, Math.floor(4 * uniform()));
    cases.lightKeyRecovery[c] = 0.9 + 0.0999 * uniform();
    cases.heavyKeyRecovery[c] = 0.9 + 0.0999 * uniform();
    cases.refluxOverMinimum[c] = 1.05 + 0.95 * uniform();
  }
  return cases;
}
