import type { ByComponent, Judged } from "../base/result";
import type { Stream } from "../balance/stream";
import type { GillilandCorrelation } from "../shortcut/gillilandCorrelations";
import type { Curve } from "../shortcut/gillilandCurve";

/** Flows leaving the stages of a section [mol/s]. */
export interface Section {
  readonly liquid: number;
  readonly vapor: number;
}

/** What `shortcutDesign` gives. Stages are equilibrium stages from the top, the reboiler and a partial condenser included. */
export interface ShortcutDesign extends Judged {
  readonly kind: "shortcutDesign";
  readonly lightKey: string;
  readonly heavyKey: string;
  readonly lightKeyRecovery: number;
  readonly heavyKeyRecovery: number;
  /** Liquid fraction of the feed [-]. */
  readonly q: number;
  /** Absolute, at the top stage [Pa]; null when volatilities were given. */
  readonly pressure: number | null;
  readonly condenser: "total" | "partial";
  readonly correlation: GillilandCorrelation;
  readonly minimumStages: number;
  readonly minimumReflux: number;
  readonly refluxRatio: number;
  readonly refluxOverMinimum: number | null;
  readonly stages: number;
  readonly stagesBasis: "gilliland";
  readonly gillilandStages: number;
  /** Least and most over the correlations and both minimum refluxes; null: not bounded. */
  readonly stagesRange: readonly [number, number | null];
  readonly stagesWhole: number;
  /** Kirkbride's rectifying stages, fractional. */
  readonly feedStage: number;
  readonly rectifyingStages: number;
  readonly strippingStages: number;
  readonly boilupRatio: number;
  /** Underwood's roots, relative to the heavy key, falling. */
  readonly roots: readonly number[];
  /** Components other than the keys that reach both products at minimum reflux. */
  readonly distributing: readonly string[];
  /** Rectifying, then stripping section. */
  readonly sections: readonly [Section, Section];
  readonly distillate: Stream;
  readonly bottoms: Stream;
  /** Relative to the heavy key. */
  readonly relativeVolatility: {
    readonly top: ByComponent;
    readonly feed: ByComponent;
    readonly bottom: ByComponent;
    readonly mean: ByComponent;
  };
  readonly curves: {
    readonly stagesAgainstReflux: {
      readonly refluxRatio: readonly number[];
      readonly stages: readonly number[];
    };
    readonly gilliland: Curve & { readonly point: readonly [number, number] };
  };
}
