import { InputError } from "../errors.ts";
import { type Abundances, pick } from "./abundances.ts";
import { molarMass } from "./formula.ts";
import type { MantleComposition } from "./mantleMineralogy.ts";

/** Mean and the interval that holds 68 %. */
export interface Interval {
  readonly mean: number;
  readonly low: number;
  readonly high: number;
}

export interface StarPlanet {
  readonly coreMassFraction: Interval;
  /** ln(core mass / mantle mass), taken as normal: what a prior for inference needs. */
  readonly logCoreToMantle: { readonly mean: number; readonly sigma: number };
  /** Mantle in the system MgO–FeO–SiO2, at the central abundances. */
  readonly mantle: MantleComposition;
  readonly magnesiumToSilicon: Interval;
}

/** Mass per atom in the mantle [kg/mol]: every cation with the oxygen that binds it. */
const OXIDES: Readonly<Record<string, number>> = {
  Mg: molarMass("MgO"),
  Si: molarMass("SiO2"),
  Al: molarMass("Al2O3") / 2,
  Ca: molarMass("CaO"),
};
/** Elements that go to the core as metal or sulphide. */
const METALS: Readonly<Record<string, number>> = { Ni: molarMass("Ni"), S: molarMass("S") };
const IRON = molarMass("Fe");
const IRON_OXIDE = molarMass("FeO");

/**
 * The rocky planet that a star's abundances imply if nothing but volatiles is lost: iron (with Ni and S, if given) to
 * the core, oxides to the mantle, and a stated share of the iron to the mantle as FeO.
 * Formula mean by quadrature over independent normal errors in log number; the 68 % interval takes ln(core/mantle), of
 *         which all is a function, as normal
 * Units   `mantleIronShare` = iron atoms in the mantle over all iron atoms
 * Throws  InputError `mantle-iron-share` unless 0 <= share < 1
 * Checked test/mineralogy/planetFromStar.test.ts
 */
export function planetFromStar(abundances: Abundances, mantleIronShare = 0): StarPlanet {
  if (!(mantleIronShare >= 0 && mantleIronShare < 1)) {
    throw new InputError(
      "mantle-iron-share",
      `The share of iron kept in the mantle is ${mantleIronShare}; it must be at least 0 and below 1, which would leave no core.`,
      { found: String(mantleIronShare) },
    );
  }
  const used = pick(abundances, ["Fe", ...Object.keys(OXIDES), ...Object.keys(METALS)]);
  const coreToMantle = propagate(used, (numbers) => logCoreToMantle(numbers, mantleIronShare));
  const magnesiumToSilicon = propagate(pick(abundances, ["Mg", "Si"]), ({ Mg, Si }) => Math.log(Mg / Si));
  const central = numbersAt(used, new Map());
  const mantleIron = mantleIronShare * central.Fe;
  return {
    coreMassFraction: interval(coreToMantle, (log) => 1 / (1 + Math.exp(-log))),
    logCoreToMantle: moments(coreToMantle),
    mantle: { magnesiumToSilicon: central.Mg / central.Si, ironNumber: mantleIron / (central.Mg + mantleIron) },
    magnesiumToSilicon: interval(magnesiumToSilicon, Math.exp),
  };
}

type Numbers = Readonly<Record<string, number>>;

function logCoreToMantle(numbers: Numbers, mantleIronShare: number): number {
  const mass = (weights: Readonly<Record<string, number>>): number =>
    Object.entries(weights).reduce((sum, [element, weight]) => sum + (numbers[element] ?? 0) * weight, 0);
  const core = mass(METALS) + (1 - mantleIronShare) * numbers.Fe * IRON;
  const mantle = mass(OXIDES) + mantleIronShare * numbers.Fe * IRON_OXIDE;
  return Math.log(core / mantle);
}

/** Weighted values of a quantity over the errors of the abundances. */
interface Sample {
  readonly value: number;
  readonly weight: number;
}

/** Nodes in standard deviations and weights of five-point Gauss–Hermite quadrature (roots of x⁵ - 10x³ + 15x). */
const SQRT10 = Math.sqrt(10);
const NODES = [0, Math.sqrt(5 - SQRT10), -Math.sqrt(5 - SQRT10), Math.sqrt(5 + SQRT10), -Math.sqrt(5 + SQRT10)];
const WEIGHTS = [8 / 15, (7 + 2 * SQRT10) / 60, (7 + 2 * SQRT10) / 60, (7 - 2 * SQRT10) / 60, (7 - 2 * SQRT10) / 60];

function propagate(abundances: Abundances, quantity: (numbers: Numbers) => number): Sample[] {
  let samples: { shifts: ReadonlyMap<string, number>; weight: number }[] = [{ shifts: new Map(), weight: 1 }];
  for (const [element, { sigma }] of Object.entries(abundances)) {
    if (sigma === 0) continue;
    samples = samples.flatMap(({ shifts, weight }) =>
      NODES.map((node, i) => ({ shifts: new Map(shifts).set(element, node * sigma), weight: weight * WEIGHTS[i] })),
    );
  }
  return samples.map(({ shifts, weight }) => ({ value: quantity(numbersAt(abundances, shifts)), weight }));
}

function numbersAt(abundances: Abundances, shifts: ReadonlyMap<string, number>): Numbers {
  return Object.fromEntries(
    Object.entries(abundances).map(([element, { logNumber }]) => [
      element,
      10 ** (logNumber + (shifts.get(element) ?? 0)),
    ]),
  );
}

function average(samples: readonly Sample[], f: (value: number) => number): number {
  return samples.reduce((sum, { value, weight }) => sum + weight * f(value), 0);
}

function moments(samples: readonly Sample[]): { mean: number; sigma: number } {
  const mean = average(samples, (value) => value);
  return { mean, sigma: Math.sqrt(average(samples, (value) => (value - mean) ** 2)) };
}

/** Mean of a transformed quantity by quadrature; interval by one standard deviation of the untransformed one. */
function interval(samples: readonly Sample[], transform: (value: number) => number): Interval {
  const { mean, sigma } = moments(samples);
  return { mean: average(samples, transform), low: transform(mean - sigma), high: transform(mean + sigma) };
}
