import type { Fields } from "../base/check";
import type { Issue } from "../base/errors";
import type { Caution } from "../base/result";
import { type Pressure, readQuantity } from "../base/units";

/** Pressures of a column as they are given: at the top stage, and the drops above and below it. */
export interface ColumnPressureInput {
  /** At the top stage, absolute [Pa], or text with a unit. */
  readonly pressure?: Pressure;
  /** At the bottom stage, absolute [Pa], or text with a unit; the top pressure when absent. */
  readonly bottomPressure?: Pressure;
  /** From the top stage to the condenser [Pa], or text with a unit. */
  readonly condenserPressureDrop?: Pressure;
}

/** Pressures along a column [Pa]. */
export interface ColumnPressures {
  readonly condenser: number;
  readonly top: number;
  readonly bottom: number;
}

export const pressureFields = ["pressure", "bottomPressure", "condenserPressureDrop"] as const;

/** Reads the pressures of a column; NaN members after a reported fault. */
export function readColumnPressures(faults: Issue[], fields: Fields): ColumnPressures {
  const top = readQuantity(faults, "pressure", fields["pressure"], "pressure");
  const bottom =
    fields["bottomPressure"] === undefined
      ? top
      : readQuantity(faults, "bottomPressure", fields["bottomPressure"], "pressure", {
          ...(top > 0 ? { atLeast: top } : {}),
          hint: "the pressure rises down a column",
        });
  const drop =
    fields["condenserPressureDrop"] === undefined
      ? 0
      : readQuantity(faults, "condenserPressureDrop", fields["condenserPressureDrop"], "pressureDifference", {
          atLeast: 0,
          ...(top > 0 ? { below: top } : {}),
        });
  return { condenser: top - drop, top, bottom };
}

/** Says so when one pressure was taken for the whole column. */
export function judgePressures({ top, bottom }: ColumnPressures): Caution[] {
  if (bottom !== top) return [];
  return [
    {
      code: "uniform-pressure",
      severity: "note",
      kind: "method",
      message: "one pressure is taken for the whole column; give bottomPressure when the drop is known",
      value: top,
    },
  ];
}
