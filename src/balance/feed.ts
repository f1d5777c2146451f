import { DesignInputError, type Issue } from "../base/errors";
import { type ByComponent, byName, type Judged } from "../base/result";
import type { ComponentFlow, MassFlow, MolarFlow, Pressure, Temperature } from "../base/units";
import type { Component } from "../components/component";
import { idealMixture, type PhaseState } from "../equilibrium/phaseState";
import { type Phase, phaseOf } from "../equilibrium/phaseSplit";
import { judgeIdealMixture } from "../equilibrium/raoultGuard";
import type { FeedReading } from "./feedAmounts";
import { feedState } from "./feedState";
import { readFeed } from "./readFeed";
import { type Stream, stream } from "./stream";

/** A feed as you know it: how much, of what, in which state. */
export interface FeedInput {
  readonly name?: string;
  /** [mol/s], or text with a unit; or `massFlow`, or `componentFlows`. */
  readonly flow?: MolarFlow;
  /** [kg/s], or text with a unit. */
  readonly massFlow?: MassFlow;
  /** Fractions by component name, by mole unless `basis` says otherwise. */
  readonly composition?: ByComponent;
  readonly basis?: "mole" | "mass";
  /** Scale the composition to the sum of 1. */
  readonly normalize?: boolean;
  /** Flow of each component: mol/s, or text with a molar or mass unit, also mixed. */
  readonly componentFlows?: Readonly<Record<string, ComponentFlow>>;
  /** Liquid fraction on the molar-overflow definition [-]: 1 saturated liquid, 0 saturated vapor. */
  readonly q?: number;
  /** [K], or text with a unit; with `pressure`. */
  readonly temperature?: Temperature;
  /** Absolute [Pa], or text with a unit; with `temperature` or `vaporFraction`. */
  readonly pressure?: Pressure;
  /** Moles of vapor per mole [-]; with `pressure`. */
  readonly vaporFraction?: number;
  readonly ownComponents?: readonly Component[];
}

/** A feed worked out: molar and mass figures, and its state as far as given. */
export interface Feed extends Stream, Judged {
  readonly kind: "feed";
  readonly name?: string;
  /** [mol/s] */
  readonly componentFlows: ByComponent;
  /** Liquid fraction [-], where given. */
  readonly q?: number;
  /** Where temperature or vapor fraction is given. */
  readonly phase?: Phase;
}

/**
 * Works a feed out from flow and composition, or from component flows, in moles or by mass.
 *
 *   x_i = (w_i/M_i)/sum(w/M),  flow = massFlow/sum(x M)
 *
 * With temperature and pressure, or vapor fraction and pressure, its phases follow by Raoult's law. The result is
 * accepted wherever a feed is.
 *
 * @param input.flow molar flow [mol/s or text with a unit], or `massFlow`, with `composition` and `basis`; or
 * @param input.componentFlows flow of each component [mol/s, or text with a molar or mass unit]
 * @param input.q liquid fraction [-]; or `temperature` and `pressure`; or `vaporFraction` and `pressure`
 * @returns flow [mol/s], mass flow [kg/s], molar mass [kg/mol], mole and mass fractions, component flows [mol/s],
 * and temperature [K], pressure [Pa], vapor fraction and phase as far as they follow
 * @throws DesignInputError for a wrong input, or as `flash` where Raoult's law has no answer
 *
 * Source: component balance, own; phases as `flash`.
 * @example feed({ massFlow: "9.2 t/h", composition: { benzene: 0.4, toluene: 0.6 }, basis: "mass", q: 1 }).composition.benzene // 0.440
 */
export function feed(input: FeedInput): Feed {
  const faults: Issue[] = [];
  const reading = readFeed(faults, "input", input, { components: "required", thermalRequired: false });
  const state = reading && stateOf(faults, reading);
  if (reading === undefined || faults.length > 0) throw new DesignInputError(faults);
  return feedResult(reading, state);
}

function stateOf(faults: Issue[], { mixture, thermal }: FeedReading): PhaseState | undefined {
  if (thermal === undefined || thermal.given === "q") return undefined;
  return feedState(faults, "", idealMixture(mixture!), thermal);
}

function feedResult(reading: FeedReading, state: PhaseState | undefined): Feed {
  const { names, flow, fractions, components, name, thermal, mixture } = reading;
  const judged = state
    ? judgeIdealMixture(mixture!, state.pressure, [state.temperature])
    : { cautions: [], methods: [] };
  return {
    kind: "feed",
    ...(name === undefined ? {} : { name }),
    ...stream(names, flow, fractions, components, state && conditionOf(state)),
    componentFlows: byName(
      names,
      fractions.map((x) => x * flow),
    ),
    ...(thermal?.given === "q" ? { q: thermal.q } : {}),
    ...(state === undefined ? {} : { phase: phaseOf(state.vaporFraction) }),
    ...judged,
  };
}

function conditionOf({
  temperature,
  pressure,
  vaporFraction,
}: PhaseState): Required<Pick<Stream, "temperature" | "pressure" | "vaporFraction">> {
  return { temperature, pressure, vaporFraction };
}
