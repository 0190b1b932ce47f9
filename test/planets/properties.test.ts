import fc from "fast-check";
import { describe, test } from "vitest";
import { properties } from "./properties.ts";

/**
 * Fixed, so that a failure seen once is seen again. `npm run fuzz` sets FUZZ_RUNS and, unless given, takes a new
 * FUZZ_SEED; fast-check prints the seed of a failure.
 */
const numRuns = Number(process.env.FUZZ_RUNS ?? 1000);
const seed = process.env.FUZZ_RUNS === undefined ? 20_240_229 : Number(process.env.FUZZ_SEED ?? Date.now() % 1e9);

describe("properties of the readers", () => {
  test.each(properties.map(({ name, property }) => [name, property] as const))(
    "%s",
    async (_, property) => fc.assert(property, { seed, numRuns }),
    Math.max(60_000, 60 * numRuns),
  );
});
