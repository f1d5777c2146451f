import type { Judged } from "../base/result";

/** A property of a pure component at a state, in SI. */
export interface PropertyResult extends Judged {
  readonly kind: "vaporPressure" | "boilingTemperature";
  readonly value: number;
}
