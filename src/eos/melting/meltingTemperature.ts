import { InputError, ModelRangeError } from "../../errors.ts";
import { GPA } from "../../units/constants.ts";
import type { Source } from "../material.ts";

/**
 * Branch of a melting curve, valid from `fromPressure` up to the next branch.
 * Formula T = T0 ((P - P0)/a + 1)^c (Simon & Glatzel 1929, Z. anorg. allg. Chem. 178, 309); a power law (P/P0)^c is the
 *         case a = P0
 */
export interface SimonBranch {
  /** Solid phase that melts. */
  readonly phase: string;
  readonly fromPressure: number;
  /** [K] */
  readonly temperatureZero: number;
  /** [Pa] */
  readonly pressureZero: number;
  /** a [Pa] */
  readonly scale: number;
  /** c */
  readonly exponent: number;
}

/** A published melting curve, lowest branch first. SI. */
export interface MeltingCurve {
  readonly name: string;
  readonly title: string;
  readonly branches: readonly SimonBranch[];
  /** Pressures the data behind the curve cover [Pa]. */
  readonly calibrated: readonly [number, number];
  readonly source: Source;
}

/**
 * Melting temperature of the pure substance [K] at a pressure [Pa]; extrapolates above the data (`calibrated`).
 * Throws  ModelRangeError `melting-pressure` below the lowest branch
 * Checked test/eos/melting/meltingCurves.test.ts
 */
export function meltingTemperature(curve: MeltingCurve, pressure: number): number {
  const branch = curve.branches.findLast(({ fromPressure }) => pressure >= fromPressure);
  if (branch === undefined) {
    const minimum = curve.branches[0].fromPressure;
    throw new ModelRangeError(
      "melting-pressure",
      `The melting curve ${curve.name} begins at ${minimum / GPA} GPa; asked at ${pressure / GPA} GPa.`,
      { quantity: "pressure", value: pressure, minimum },
    );
  }
  return branch.temperatureZero * ((pressure - branch.pressureZero) / branch.scale + 1) ** branch.exponent;
}

/**
 * Pressure at which the pure substance melts at a temperature [K], so that it is solid above; 0 for anything colder
 * than the beginning of the curve, as if it went on straight down in pressure.
 * Checked test/eos/melting/meltingCurves.test.ts
 */
export function meltingPressure(curve: MeltingCurve, temperature: number): number {
  const { branches } = curve;
  if (temperature < meltingTemperature(curve, branches[0].fromPressure)) return 0;
  let i = branches.length - 1;
  while (i > 0 && temperature < meltingTemperature(curve, branches[i].fromPressure)) i--;
  const { fromPressure, temperatureZero, pressureZero, scale, exponent } = branches[i];
  const pressure = pressureZero + scale * ((temperature / temperatureZero) ** (1 / exponent) - 1);
  return Math.min(Math.max(pressure, fromPressure), branches[i + 1]?.fromPressure ?? Number.POSITIVE_INFINITY);
}

/**
 * Factor by which an ideal solution melts lower than the pure substance.
 * Formula 1/(1 - ln x) with x the mole fraction of the melting substance in the liquid
 * Source  Stixrude 2014, Phil. Trans. R. Soc. A 372, 20130076 (form from memory)
 * Throws  InputError `melting-mole-fraction` unless 0 < x <= 1
 * Checked test/eos/melting/meltingCurves.test.ts
 */
export function meltingDepression(moleFraction: number): number {
  if (!(moleFraction > 0 && moleFraction <= 1)) {
    throw new InputError(
      "melting-mole-fraction",
      `The mole fraction of the melting substance is ${moleFraction}; it must be above 0 and at most 1 (pure).`,
      { found: String(moleFraction) },
    );
  }
  return 1 / (1 - Math.log(moleFraction));
}
