import type { Command } from "commander";
import { InputError } from "../errors.ts";
import type { Composition } from "../library/composition.ts";
import { EARTH_FLUX, GIGAYEAR } from "../units/constants.ts";
import { positiveNumber } from "./numberOptions.ts";

/** For planets with a gas envelope: flux and age in place of what its composition says or leaves open. */
export interface EnvelopeOptions {
  readonly fluxEarth?: number;
  readonly ageGyr?: number;
  readonly transitPressurePa?: number;
}

export function addEnvelopeOptions(command: Command): Command {
  return command
    .option("--flux-earth <flux>", "on gas envelopes, in units of the Earth's, instead of their own", positiveNumber)
    .option("--age-gyr <age>", "of gas envelopes, instead of their own", positiveNumber);
}

export function withEnvelopeOptions(composition: Composition, { fluxEarth, ageGyr }: EnvelopeOptions): Composition {
  const { envelope } = composition;
  if (envelope === undefined) return composition;
  return {
    ...composition,
    envelope: {
      ...envelope,
      ...(fluxEarth !== undefined && { flux: fluxEarth * EARTH_FLUX }),
      ...(ageGyr !== undefined && { age: ageGyr * GIGAYEAR }),
    },
  };
}

/** Throws InputError `envelope-options` where an option would go unheeded. */
export function requireEnvelope(compositions: readonly Composition[], options: EnvelopeOptions): void {
  const { fluxEarth, ageGyr, transitPressurePa } = options;
  const given = fluxEarth ?? ageGyr ?? transitPressurePa;
  if (given === undefined || compositions.some(({ envelope }) => envelope)) return;
  throw new InputError(
    "envelope-options",
    "--flux-earth, --age-gyr and --transit-pressure-pa are for compositions that end in a gas envelope; none of these does.",
  );
}
