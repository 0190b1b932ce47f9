import type { Command } from "commander";
import type { Composition } from "../library/composition.ts";
import { EARTH_FLUX, GIGAYEAR } from "../units/constants.ts";
import { positiveNumber } from "./numberOptions.ts";

/** Where a planet with a gas envelope is, in place of what its composition says or leaves open. */
export interface EnvelopeOptions {
  readonly fluxEarth?: number;
  readonly ageGyr?: number;
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
