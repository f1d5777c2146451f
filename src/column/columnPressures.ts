import { type Fields, shown } from "../base/check";
import type { Issue } from "../base/errors";
import type { Caution } from "../base/result";
import { type Pressure, type PressureDifference, readQuantity } from "../base/units";

/** Pressures of a column as they are given: at the top stage, and the drops above and below it. */
export interface ColumnPressureInput {
  /** At the top stage, absolute [Pa], or text with a unit. */
  readonly pressure?: Pressure;
  /** At the bottom stage, absolute [Pa], or text with a unit; the top pressure when absent. */
  readonly bottomPressure?: Pressure;
  /** Or the drop a stage [Pa], or text with a unit: the bottom pressure then follows from the stages. */
  readonly pressureDropPerStage?: PressureDifference;
  /** From the top stage to the condenser [Pa], or text with a unit. */
  readonly condenserPressureDrop?: PressureDifference;
}

/** Pressures along a column [Pa]. */
export interface ColumnPressures {
  readonly condenser: number;
  readonly top: number;
  readonly bottom: number;
  /** From stage to stage; undefined when the bottom pressure does not depend on the stages. */
  readonly dropPerStage: number | undefined;
}

export const pressureFields = [
  "pressure",
  "bottomPressure",
  "pressureDropPerStage",
  "condenserPressureDrop",
] as const;

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
  const condenserDrop = readDrop(faults, "condenserPressureDrop", fields, top);
  const dropPerStage = readDrop(faults, "pressureDropPerStage", fields, top);
  if (dropPerStage !== undefined && fields["bottomPressure"] !== undefined) {
    const message = "pressureDropPerStage and bottomPressure say the same thing twice; give one of them";
    const value = shown(fields["pressureDropPerStage"]);
    faults.push({ code: "conflicting-fields", path: "pressureDropPerStage", message, value });
  }
  return { condenser: top - (condenserDrop ?? 0), top, bottom, dropPerStage };
}

/** A drop cannot eat up the top pressure. */
function readDrop(faults: Issue[], path: string, fields: Fields, top: number): number | undefined {
  if (fields[path] === undefined) return undefined;
  const limits = { atLeast: 0, ...(top > 0 ? { below: top } : {}) };
  return readQuantity(faults, path, fields[path], "pressureDifference", limits);
}

/** Refuses what goes with a pressure beside volatilities that are given. */
export function refuseBesideVolatility(faults: Issue[], fields: Fields): void {
  for (const field of [...pressureFields, "model", "ownComponents"]) {
    if (field === "pressure" || fields[field] === undefined) continue;
    const message = `${field} goes with pressure, but the volatilities are given by relativeVolatility; leave it out`;
    faults.push({ code: "conflicting-fields", path: field, message, value: shown(fields[field]) });
  }
}

/** Says so when one pressure was taken for the whole column. */
export function judgePressures({ top, bottom }: ColumnPressures): Caution[] {
  if (bottom !== top) return [];
  return [
    {
      code: "uniform-pressure",
      severity: "note",
      kind: "method",
      message:
        "one pressure is taken for the whole column; give bottomPressure or pressureDropPerStage when the drop is known",
      value: top,
    },
  ];
}
