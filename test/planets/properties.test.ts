import fc from "fast-check";
import { describe, test } from "vitest";
import { properties } from "./properties.ts";

/** Fixed, so that a failure seen once is seen again; `npm run fuzz` tries others. */
const seed = 20_240_229;

describe("properties of the readers", () => {
  test.each(properties.map(({ name, property }) => [name, property] as const))("%s", async (_, property) => {
    await fc.assert(property, { seed, numRuns: 1000 });
  });
});
