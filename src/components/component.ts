/** A vapor-pressure equation with its constants. P in Pa and T in K unless the Antoine units say otherwise. */
export type VaporPressureEquation =
  | {
      /** log P = A - B/(T + C), logarithm, T and P in the stated units. */
      readonly form: "antoine";
      readonly A: number;
      readonly B: number;
      readonly C: number;
      readonly logBase: 10 | "e";
      readonly temperatureUnit: "K" | "degC" | "degF";
      readonly pressureUnit: "Pa" | "kPa" | "bar" | "mmHg" | "psia";
    }
  | {
      /** ln(P/Pa) = C1 + C2/T + C3 ln T + C4 T^C5. */
      readonly form: "dippr101";
      readonly C1: number;
      readonly C2: number;
      readonly C3: number;
      readonly C4: number;
      readonly C5: number;
    }
  | {
      /**
       * ln(P/Pc) = (c1 t + c2 t^1.5 + c3 t^2.5 + c4 t^5)/Tr for "wagner25",
       * ln(P/Pc) = (c1 t + c2 t^1.5 + c3 t^3 + c4 t^6)/Tr for "wagner36"; t = 1 - Tr.
       */
      readonly form: "wagner25" | "wagner36";
      readonly coefficients: readonly [number, number, number, number];
      readonly criticalTemperature: number;
      readonly criticalPressure: number;
    };

/** A vapor-pressure equation with range [K], source, and how well it is known. */
export type VaporPressureBlock = VaporPressureEquation & {
  readonly range: readonly [number, number];
  readonly source: string;
  /**
   * A: within 1 % of a reference equation of state over 0.05-15 bar; B: at least three published sets, this one within
   * 1.5 % of their median; C: published sets agree over part of the range only; D: one set, or a short range.
   * Absent for equations that were not compared, as those of the user.
   */
  readonly grade?: "A" | "B" | "C" | "D";
  /** What the equation was compared with, and the largest deviation found. */
  readonly deviation?: string;
};

/** A temperature correlation of another property: equation name and constants as published. */
export interface PropertyBlock {
  /** One of those in propertyEquation.ts. */
  readonly equation: string;
  readonly constants: readonly number[];
  readonly criticalTemperature?: number;
  readonly range: readonly [number, number];
  readonly source: string;
}

/**
 * What screening lists say about a substance. A substance that was looked for and is in none of them has only the source
 * `noneListed`; one without any `Hazards` has no data.
 */
export interface Hazards {
  /** [K] */
  readonly flashPoint?: number;
  /** The lowest published [K]. */
  readonly autoignitionTemperature?: number;
  /** Mole fraction in air. */
  readonly lowerFlammabilityLimit?: number;
  /** Mole fraction in air. */
  readonly upperFlammabilityLimit?: number;
  /**
   * A: explosive levels of peroxides without concentration; B: on concentration, as by distillation; C: may polymerize
   * by them; D: forms them, not classed.
   */
  readonly peroxideClass?: "A" | "B" | "C" | "D";
  readonly polymerizes?: boolean;
  /** IARC group. */
  readonly carcinogenGroup?: "1" | "2A" | "2B" | "3";
  readonly sources: Readonly<Record<string, string>>;
}

/** A pure substance: constants (SI), property blocks with range and source. Absent means no data. */
export interface Component {
  readonly kind: "component";
  readonly id: string;
  readonly name: string;
  readonly cas?: string;
  /** Hill order: carbon, hydrogen, then by the alphabet. */
  readonly formula?: string;
  readonly family?: string;
  /** SMILES. */
  readonly structure?: string;
  readonly synonyms?: readonly string[];
  /** [kg/mol] */
  readonly molarMass?: number;
  /** [K] */
  readonly normalBoilingPoint?: number;
  /** [K] */
  readonly criticalTemperature?: number;
  /** [Pa] */
  readonly criticalPressure?: number;
  /** [m3/mol] */
  readonly criticalVolume?: number;
  readonly acentricFactor?: number;
  readonly rackettParameter?: number;
  readonly vaporPressure: VaporPressureBlock;
  readonly heatOfVaporization?: PropertyBlock;
  readonly liquidDensity?: PropertyBlock;
  readonly liquidHeatCapacity?: PropertyBlock;
  readonly idealGasHeatCapacity?: PropertyBlock;
  readonly liquidViscosity?: PropertyBlock;
  readonly surfaceTension?: PropertyBlock;
  readonly hazards?: Hazards;
  /** Published source of each constant and block, by field name. */
  readonly sources: Readonly<Record<string, string>>;
}
