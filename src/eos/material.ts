import type { EosCurve } from "./curve.ts";

/** Where a number comes from. */
export interface Source {
  readonly citation: string;
  readonly doi?: string;
  readonly note?: string;
}

/** One phase of a material, stable from `fromPressure` to `untilPressure` [Pa]. */
export interface Phase {
  readonly name: string;
  /** Name of the equation-of-state form, as in composition files. */
  readonly form: string;
  readonly curve: EosCurve;
  readonly fromPressure: number;
  /** Infinity for the last phase, even where its form breaks earlier (`curve.maxPressure`). */
  readonly untilPressure: number;
  /** Top of the data behind the parameters [Pa]; a result that used the phase beyond it is extrapolated. */
  readonly calibratedTo: number;
  readonly source: Source;
  /** What is mixed, if this is a mixture; the sources of its parts are its sources. */
  readonly components?: readonly { readonly material: string; readonly phase: Phase }[];
}

/** Where rock melts. Molten rock has no equation of state here: the solid's goes on, and a planet gets a note. */
export interface RockMelting {
  /** Name of the published curve. */
  readonly curve: string;
  /** Where that curve begins [Pa]; nothing is said below. */
  readonly fromPressure: number;
  /** Melting temperature [K] at a pressure [Pa]. */
  readonly temperatureAt: (pressure: number) => number;
}

/** A substance as a stack of phases, lowest pressure first, without gaps. */
export interface Material {
  readonly name: string;
  readonly title: string;
  readonly phases: readonly Phase[];
  /** Where what it is made of comes from, if its phases do not say. */
  readonly source?: Source;
  /** What it can be at one temperature or another, where that is more than `phases`. */
  readonly everyPhase?: readonly Pick<Phase, "name" | "form" | "source" | "components">[];
  readonly melting?: RockMelting;
  /**
   * For a substance whose equation of state knows temperature: its phases in a layer whose top is at this pressure
   * [Pa] and temperature [K], in the given mode. `phases` are then those of a cold planet.
   */
  readonly warmed?: (mode: TemperatureMode, topPressure: number, topTemperature: number) => readonly Phase[];
}

/** How temperature goes on below the top of a layer. */
export type TemperatureMode =
  | { readonly kind: "isothermal" | "adiabatic" }
  /** Given as a function of pressure [Pa → K], smooth between the pressures listed in `kinks`. */
  | { readonly kind: "table"; readonly temperatureAt: (pressure: number) => number; readonly kinks: readonly number[] };

/** The phase stable at a pressure [Pa]; on a boundary the denser one, above it. */
export function phaseAt({ phases }: Material, pressure: number): Phase {
  let i = phases.length - 1;
  while (i > 0 && pressure < phases[i].fromPressure) i--;
  return phases[i];
}

/** Density [kg m^-3] at a pressure [Pa]. Throws ModelRangeError `eos-pressure-range` where the form there ends. */
export function densityAt(material: Material, pressure: number): number {
  const { curve } = phaseAt(material, pressure);
  return curve.density(curve.coordinate(pressure));
}
