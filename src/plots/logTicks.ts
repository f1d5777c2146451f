/** Ticks of a logarithmic axis between two powers of ten: 1, 2 and 5, or powers alone where there are many. */
export function logTicks(low: number, high: number): Readonly<Record<string, unknown>> {
  const steps = high - low < 2.6 ? [1, 2, 5] : [1];
  const values: number[] = [];
  const every = Math.max(1, Math.ceil((high - low) / 9));
  for (let power = every * Math.floor(low / every); power <= high; power += every) {
    for (const step of steps) {
      const value = Number(`${step}e${power}`);
      if (Math.log10(value) >= low && Math.log10(value) <= high) values.push(value);
    }
  }
  const isWide = low < -4.1 || high > 4.1;
  const text = (value: number): string =>
    isWide && value !== 1 ? `10<sup>${Math.round(Math.log10(value))}</sup>`.replace("-", "−") : String(value);
  return { tickmode: "array", tickvals: values, ticktext: values.map(text) };
}
